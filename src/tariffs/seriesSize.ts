import type { Problem } from '../core/problem.ts';

/** More than the minutes of a leap year, 527 040. */
const MOST_LINES = 600_000;

/** Characters of a line; one of values over time needs about forty. */
const LONGEST_LINE = 10_000;

const LINE_FEED = 10;
const CARRIAGE_RETURN = 13;

/**
 * Looks through a text before it is taken apart, so that none can use up memory or time.
 *
 * @param text any text
 * @param file its name, for the problem
 * @returns the problem of a text that is too long, or of its first line that is; undefined for none
 * @example seriesSize('time,price', 'a.csv') // undefined
 */
export function seriesSize(text: string, file: string): Problem | undefined {
  let lines = 0;
  for (let begin = 0; begin < text.length; ) {
    const end = endOfLine(text, begin);
    lines++;
    if (end - begin > LONGEST_LINE) {
      const found = String(end - begin);
      return {
        code: 'series.long-line',
        severity: 'error',
        file,
        line: lines,
        found,
        allowed: String(LONGEST_LINE),
      };
    }
    const isPair = text.charCodeAt(end) === CARRIAGE_RETURN && text.charCodeAt(end + 1) === LINE_FEED;
    begin = end + (isPair ? 2 : 1);
  }
  if (lines <= MOST_LINES) return undefined;
  const found = String(lines);
  return { code: 'series.too-many-lines', severity: 'error', file, found, allowed: String(MOST_LINES) };
}

function endOfLine(text: string, begin: number): number {
  let end = begin;
  for (; end < text.length; end++) {
    const code = text.charCodeAt(end);
    if (code === LINE_FEED || code === CARRIAGE_RETURN) return end;
  }
  return end;
}
