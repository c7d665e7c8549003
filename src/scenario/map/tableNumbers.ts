const GAPS = new Set(['', '-', '--', '–', '—', '−', 'n/a', 'na', 'n.a.']);
const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?$/i;

/**
 * The value of a table's cell: a number with decimal point or comma, its unit kW passed over.
 *
 * @returns the number; null for a gap (empty, a dash, n/a); undefined for anything else
 * @example cellValue('4,5 kW') // 4.5
 */
export function cellValue(text: string): number | null | undefined {
  const word = text.trim();
  if (GAPS.has(word.toLowerCase())) return null;
  return plainNumber(word.replace(/\s*kW$/i, ''));
}

/** A temperature on an axis of a table, and the letter before it where one stands. */
export interface AxisNumber {
  readonly value: number;
  /** A air or L outdoors, W water or F flow; '' for none. */
  readonly letter: string;
}

/**
 * The temperature in a head or row label: `35`, `W35`, `35 °C`, `A-7`, `A−7`.
 *
 * Reference: EN 14511-1, notation of rating conditions such as A7/W35.
 * @example axisNumber('A−7')?.value // -7
 */
export function axisNumber(text: string): AxisNumber | undefined {
  const parts = /^([ALWF]?)\s*([^\s°℃]+?)\s*(?:°\s*C?|℃|C)?$/i.exec(text.trim());
  const value = parts === null ? undefined : plainNumber(parts[2] ?? '');
  return value === undefined ? undefined : { value, letter: (parts?.[1] ?? '').toUpperCase() };
}

function plainNumber(word: string): number | undefined {
  const written = word.replace(/^[−–](?=[\d.,])/, '-').replace(',', '.');
  if (!NUMBER.test(written)) return undefined;
  const value = Number(written);
  return Number.isFinite(value) ? value : undefined;
}
