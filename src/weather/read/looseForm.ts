/** Parts of a form that hold numbers of varying length, or any letters: in the tokens of the luxon library. */
const VARYING = /^(?:[yMLdoHhmqsSuWz]|yy|kk|yyyyy)$/;

const MOST_VARYING = 8;

/**
 * Whether a form leaves so much open that a stamp could be read by it in more ways than there is time to try: a part of
 * varying length stands in it twice, or there are more than eight of them.
 *
 * @param format tokens of the luxon library, without quoted text
 * @example isLooseForm('d/M/y H:m') // false
 */
export function isLooseForm(format: string): boolean {
  const tokens = [...format.matchAll(/([A-Za-z])\1*/g)].map(([token]) => token).filter((token) => VARYING.test(token));
  return tokens.length > MOST_VARYING || new Set(tokens).size < tokens.length;
}
