import { visibleText } from '../../core/problem.ts';
import { type Markup, markup } from '../charts/markup.ts';

/** Text from a file, in a direction of its own: a name that runs from right to left leaves its surroundings alone. */
export function named(text: string): Markup {
  return markup`<bdi>${visibleText(text)}</bdi>`;
}

/** Text of several lines from a file, as it stands there. */
export function quoted(text: string): Markup {
  const lines = text.split(/\r?\n/).map((line) => line.split('\t').map(visibleText).join('\t'));
  return markup`<pre dir="auto">${lines.join('\n')}</pre>`;
}

/** A sentence that the program has in English only, marked as such. */
export function inEnglish(text: string): Markup {
  return markup`<span lang="en" dir="ltr">${named(text)}</span>`;
}

const LONGEST_IN_CHART = 28;

/** A name for a drawing, cut to what has room there; the whole of it stands in the table beside. */
export function shortName(text: string): string {
  const letters = [...visibleText(text)];
  return letters.length > LONGEST_IN_CHART ? `${letters.slice(0, LONGEST_IN_CHART - 1).join('')}…` : letters.join('');
}
