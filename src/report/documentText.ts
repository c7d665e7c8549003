/**
 * A document as JSON text: two spaces of indentation, keys in the order in which they were made, full precision.
 *
 * @param document plain data; a number that is not finite has no place in a result
 * @returns the text with a final newline
 * @throws RangeError at NaN or infinity, which JSON would turn into null without a word
 * @example documentText({ a: 1 }) // '{\n  "a": 1\n}\n'
 */
export function documentText(document: object): string {
  return `${JSON.stringify(document, onlyFinite, 2)}\n`;
}

function onlyFinite(key: string, value: unknown): unknown {
  if (typeof value === 'number' && !Number.isFinite(value)) throw new RangeError(`${key} is not a finite number`);
  return value;
}
