/** Character codes of the two decimal marks. */
export const DECIMAL_POINT = 46;
export const DECIMAL_COMMA = 44;

const ZERO = 48;
const MOST_EXACT_DIGITS = 15;
const POWERS = Array.from({ length: 23 }, (_, exponent) => Number(`1e${exponent}`));

/**
 * The number that a cell holds, without the looseness of the language's own conversion.
 *
 * Up to 15 digits the result is exact: whole digits and a power of ten up to 10^22 are exact numbers, and their one
 * division rounds correctly.
 *
 * @param cell text; blanks around it, a Unicode minus and an exponent are understood, marks of thousands are not
 * @param mark code of the decimal mark, 46 for the point or 44 for the comma
 * @returns a finite number, or NaN where the cell holds none; the caller must not let it pass
 * @example parseNumber('−3,5', 44) // -3.5
 */
export function parseNumber(cell: string, mark: number): number {
  let end = cell.length;
  let i = 0;
  while (i < end && isBlank(cell.charCodeAt(i))) i++;
  while (end > i && isBlank(cell.charCodeAt(end - 1))) end--;
  const sign = signOf(cell.charCodeAt(i));
  const first = sign === 0 ? i : i + 1;
  let mantissa = 0;
  let digits = 0;
  let decimals = -1;
  for (i = first; i < end; i++) {
    const code = cell.charCodeAt(i);
    const digit = code - ZERO;
    if (digit >= 0 && digit <= 9) {
      mantissa = mantissa * 10 + digit;
      digits++;
    } else if (code === mark && decimals < 0) decimals = digits;
    else break;
  }
  // `5.` is a number of some programs, `5,` is the end of a cell.
  if (digits === 0 || (decimals === digits && mark === DECIMAL_COMMA)) return Number.NaN;
  if (i < end || digits > MOST_EXACT_DIGITS) return parseLongNumber(cell.slice(first, end), mark, sign);
  const value = decimals < 0 ? mantissa : mantissa / (POWERS[digits - decimals] as number);
  return sign < 0 ? -value : value;
}

/** Numbers with an exponent or with many digits: rare, so the language's own conversion serves. */
function parseLongNumber(unsigned: string, mark: number, sign: number): number {
  const pattern =
    mark === DECIMAL_COMMA ? /^(?:\d+,?\d*|,\d+)(?:e[+-]?\d{1,3})?$/i : /^(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d{1,3})?$/i;
  if (unsigned.length > 60 || !pattern.test(unsigned)) return Number.NaN;
  const value = Number(unsigned.replace(',', '.'));
  if (!Number.isFinite(value)) return Number.NaN;
  return sign < 0 ? -value : value;
}

function signOf(code: number): number {
  if (code === 45 || code === 0x2212 || code === 0x2013) return -1;
  return code === 43 ? 1 : 0;
}

function isBlank(code: number): boolean {
  return code === 32 || code === 9 || code === 13 || code === 10 || code === 0xa0 || code === 0x202f || code === 0x2009;
}
