/** Letters shown on either side of a difference. */
const AROUND = 60;

/** First difference of two texts, with what stands around it; undefined where they are the same to the last byte. */
export function difference(text: string, expected: string): string | undefined {
  if (text === expected) return undefined;
  let at = 0;
  while (text[at] === expected[at]) at++;
  const around = (each: string) => each.slice(Math.max(0, at - AROUND), at + AROUND);
  return `'${around(text)}' is not '${around(expected)}'`;
}
