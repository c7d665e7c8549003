import type { Findings } from './findings.ts';

/** A line of this length holds no hour of weather: 1000 cells of 100 characters. */
const LONGEST_LINE = 100_000;
/** Several stations or years by the minute fit into this. */
const MOST_LINES = 5_000_000;

/**
 * Text with plain line ends and without a byte-order mark.
 *
 * @example plainLines('a\r\nb\rc') // 'a\nb\nc'
 */
export function plainLines(text: string): string {
  const bare = text.charCodeAt(0) === 0xfeff ? text.slice(1) : text;
  return bare.includes('\r') ? bare.replace(/\r\n?/g, '\n') : bare;
}

/**
 * Counts the lines of a text and refuses what is too large to be a table of weather.
 *
 * @param text with line feeds only
 * @param findings receives `weather.long-line` or `weather.too-many-lines`
 * @returns the number of lines
 */
export function measureText(text: string, findings: Findings): number {
  let lines = 0;
  let at = 0;
  while (at < text.length) {
    const end = text.indexOf('\n', at);
    const stop = end < 0 ? text.length : end;
    lines++;
    if (stop - at > LONGEST_LINE) {
      findings.add({
        code: 'weather.long-line',
        severity: 'error',
        line: lines,
        found: String(stop - at),
        allowed: String(LONGEST_LINE),
      });
    }
    at = stop + 1;
  }
  if (lines > MOST_LINES) {
    findings.add({
      code: 'weather.too-many-lines',
      severity: 'error',
      found: String(lines),
      allowed: String(MOST_LINES),
    });
  }
  return lines;
}
