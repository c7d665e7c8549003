import { shown } from '../../core/problem.ts';

/** Keys and list positions that lead to an entry of a file. */
export type EntryPath = readonly (string | number)[];

/**
 * A path as messages show it.
 *
 * @param path keys, and positions in lists counted from 0
 * @returns keys joined by points, positions in brackets; keys of more than 40 characters cut
 * @example pathText(['house', 'days', 2, 'setPoint']) // 'house.days[2].setPoint'
 */
export function pathText(path: EntryPath): string {
  let text = '';
  for (const step of path) {
    if (typeof step === 'number') text += `[${step}]`;
    else text += text === '' ? shown(step, 40) : `.${shown(step, 40)}`;
  }
  return text;
}

/**
 * The path that a text in the notation of `pathText` shows.
 *
 * @example pathOfText('rates[0].from') // ['rates', 0, 'from']
 */
export function pathOfText(text: string): EntryPath {
  return [...text.matchAll(/\[(\d+)\]|[^.[\]]+/g)].map((match) =>
    match[1] === undefined ? match[0] : Number(match[1]),
  );
}
