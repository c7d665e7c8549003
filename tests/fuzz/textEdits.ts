import fc from 'fast-check';
import { factor, hostileWord } from './hostileWords.ts';

/** A change of a text, small enough to be read in a report; `at` and `other` are places as shares of the whole. */
export type TextEdit = Readonly<{ at: number; other: number; word: string; factor: number; how: How }>;

type How = (typeof hows)[number];

const hows = [
  ...(['scale', 'scale', 'scale', 'replace', 'replace', 'number', 'put', 'cut', 'double', 'exchange'] as const),
  ...(['nest', 'cutLine', 'doubleLine', 'exchangeLines', 'indent', 'cutFrom', 'repeat'] as const),
];

/** A place, as a share of the whole. */
export const place = fc.double({ min: 0, max: 1, maxExcluded: true, noNaN: true });

export const textEdit: fc.Arbitrary<TextEdit> = fc.record({
  at: place,
  other: place,
  word: hostileWord,
  factor,
  how: fc.constantFrom(...hows),
});

/** Makes some changes to a text, one after the other. */
export function edited(text: string, edits: readonly TextEdit[]): string {
  return edits.reduce((changed, edit) => editedOnce(changed, edit), text);
}

const NUMBER = /(?<![\w.])-?\d+(?:\.\d+)?(?![\w.])/g;

/** Longest text that changes may make: longer ones are refused by size, which is tried by itself. */
const LONGEST = 400_000;

function editedOnce(text: string, edit: TextEdit): string {
  switch (edit.how) {
    case 'scale':
      return withNumber(text, edit.at, (number) => String(Number(number) * edit.factor));
    case 'number':
      return withNumber(text, edit.at, () => edit.word);
    case 'cutFrom':
      return text.slice(0, Math.floor(edit.at * text.length));
    case 'cutLine':
    case 'doubleLine':
    case 'exchangeLines':
    case 'indent':
      return withLines(text, edit);
    default:
      return withTokens(text, edit);
  }
}

function withNumber(text: string, at: number, change: (number: string) => string): string {
  const numbers = [...text.matchAll(NUMBER)];
  const chosen = numbers[Math.floor(at * numbers.length)];
  if (chosen === undefined) return text;
  return text.slice(0, chosen.index) + change(chosen[0]) + text.slice(chosen.index + chosen[0].length);
}

function withLines(text: string, { at, other, how, word }: TextEdit): string {
  const lines = text.split('\n');
  const [i, j] = [Math.floor(at * lines.length), Math.floor(other * lines.length)];
  const line = lines[i] ?? '';
  if (how === 'cutLine') lines.splice(i, 1);
  else if (how === 'doubleLine') lines.splice(i, 0, line);
  else if (how === 'indent') lines[i] = ' '.repeat(word.length % 7) + line.trimStart();
  else [lines[i], lines[j]] = [lines[j] ?? '', line];
  return lines.join('\n');
}

function withTokens(text: string, { at, other, how, word }: TextEdit): string {
  const tokens = text.split(/(?<=[\s:,;{}[\]])/);
  const [i, j] = [Math.floor(at * tokens.length), Math.floor(other * tokens.length)];
  const token = tokens[i] ?? '';
  if (how === 'cut') tokens[i] = '';
  else if (how === 'put') tokens[i] = word + token;
  else if (how === 'replace') tokens[i] = `${word}${/\s$/.exec(token)?.[0] ?? ''}`;
  else if (how === 'double') tokens[i] = token + token;
  else if (how === 'repeat') tokens[i] = (token + word).repeat(Math.floor(other * 200));
  else if (how === 'nest') tokens[i] = `${'['.repeat(Math.floor(other * 300))}${token}`;
  else [tokens[i], tokens[j]] = [tokens[j] ?? '', token];
  return tokens.join('').slice(0, LONGEST);
}
