/** Width of a letter of the labels, and of a sign of a script with wide signs. */
const LETTER = 5.9;
const WIDE = 11;
/** From here on signs may be as wide as high: Asian scripts, symbols, pictures. */
const FIRST_WIDE = 0x2e80;

/**
 * About how wide a label is, in the units of the drawings.
 *
 * @example textWidth('ab') // 11.8
 */
export function textWidth(text: string): number {
  return [...text].reduce((sum, sign) => sum + ((sign.codePointAt(0) ?? 0) < FIRST_WIDE ? LETTER : WIDE), 0);
}
