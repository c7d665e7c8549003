import { visibleText } from '../../core/problem.ts';
import type { ReportInput } from './reportInput.ts';

/** The commands that make the report again and hold it against its files, a line each. */
export function reportCommands({ answer, words, date }: Pick<ReportInput, 'answer' | 'words' | 'date'>): string {
  const day = date === undefined ? '' : ` --date ${quotedWord(date)}`;
  const scenario = quotedWord(answer.loaded.file);
  return [
    `winterledger report ${scenario} --out report.html --language ${words.language}${day}`,
    `winterledger simulate ${scenario} --json result.json --hourly hours.csv`,
    'winterledger verify report.html',
    'sha256sum FILE',
  ].join('\n');
}

/**
 * A word of a command line, in quotes where a shell would take it apart.
 *
 * @example quotedWord("a b's") // "'a b'\\''s'"
 */
export function quotedWord(word: string): string {
  const visible = visibleText(word);
  return /^[\w./:@%+=,-]+$/.test(visible) ? visible : `'${visible.replaceAll("'", "'\\''")}'`;
}
