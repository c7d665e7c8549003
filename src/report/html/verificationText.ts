import { shown, visibleText } from '../../core/problem.ts';
import { figure } from '../figures.ts';
import { wrapped } from '../layout.ts';
import type { HeldFigures, HeldFile } from './verification.ts';

/** What was found when a report was made again. */
export interface Verification {
  /** Name of the report. */
  readonly file: string;
  readonly scenario: string;
  /** Version that made it, and the present one. */
  readonly version: { readonly was: string; readonly is: string };
  readonly files: readonly HeldFile[];
  readonly figures: HeldFigures;
  /** First passage of the page that differs; absent where the page is the same, `not looked at` where files or figures differ. */
  readonly page: { readonly was: string; readonly is: string } | 'not looked at' | undefined;
}

/** So many differences are listed; the rest are counted. */
const MOST_LISTED = 40;
const LONGEST_PASSAGE = 100;

/** Whether all of a report holds. */
export function holds({ files, figures, page }: Verification): boolean {
  return files.every(({ held }) => held) && figures.differences.length === 0 && page === undefined;
}

/**
 * A verification as a person reads it: files, figures, page, then what it comes to.
 *
 * @returns lines with a final newline
 */
export function verificationText(verification: Verification): string {
  const { file, scenario, version } = verification;
  const made = `${visibleText(file)}: report on ${visibleText(scenario)}, made by Winterledger ${visibleText(version.was)}`;
  const now = version.was === version.is ? '.' : `, made again by Winterledger ${version.is}.`;
  const all = holds(verification) ? 'All of the report holds.' : 'The report does not hold.';
  return `${[wrapped(made + now), ...fileLines(verification), ...figureLines(verification), ...pageLines(verification), all].join('\n')}\n`;
}

function fileLines({ files }: Verification): string[] {
  const changed = files.filter(({ held }) => !held);
  if (changed.length === 0) return [`Files: all ${files.length} are as they were.`];
  return [
    `Files: ${changed.length} of ${files.length} are not as they were.`,
    ...changed.map(({ file }) => `  ${visibleText(file)}`),
  ];
}

function figureLines({ figures: { compared, differences } }: Verification): string[] {
  if (differences.length === 0) return [`Figures: all ${figure(compared, 0)} hold.`];
  const rest = differences.length - MOST_LISTED;
  return [
    `Figures: ${figure(differences.length, 0)} of ${figure(compared, 0)} differ.`,
    ...differences
      .slice(0, MOST_LISTED)
      .map(
        ({ path, was = 'nothing', is = 'nothing' }) =>
          `  ${shown(path, LONGEST_PASSAGE)}  ${shown(was)} → ${shown(is)}`,
      ),
    ...(rest > 0 ? [`  and ${figure(rest, 0)} more`] : []),
  ];
}

function pageLines({ page, version }: Verification): string[] {
  if (page === undefined) return ['Page: word for word as it is made now.'];
  if (page === 'not looked at') return ['Page: not looked at, for what it rests on differs.'];
  const other = version.was === version.is ? '' : ' The other version may word it otherwise.';
  return [
    wrapped(`Page: it is not as it is made now.${other}`),
    `  it says  ${shown(page.was, LONGEST_PASSAGE)}`,
    `  now      ${shown(page.is, LONGEST_PASSAGE)}`,
  ];
}
