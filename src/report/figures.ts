/** Narrow no-break space between groups of three digits. */
const THIN = '\u202f';

/**
 * A number as the trade writes it: so many decimals, thousands set apart by a thin space, a true minus sign.
 *
 * @param value any finite number
 * @param decimals 0 … 6
 * @returns the text without a unit; what rounds to zero has no sign
 * @example figure(12345.678, 0) // '12\u202f346'
 */
export function figure(value: number, decimals: number): string {
  const [whole, fraction] = Math.abs(value).toFixed(decimals).split('.');
  const digits = `${whole.replace(/\B(?=(\d{3})+$)/g, THIN)}${fraction === undefined ? '' : `.${fraction}`}`;
  return value < 0 && /[1-9]/.test(digits) ? `−${digits}` : digits;
}

/** Energy, kWh: whole. @example kWh(1234.5) // '1\u202f235 kWh' */
export function kWh(value: number): string {
  return `${figure(value, 0)} kWh`;
}

/** Money: whole, with its currency. @example money(99.6, 'EUR') // '100 EUR' */
export function money(value: number, currency: string): string {
  return `${figure(value, 0)} ${currency}`;
}

/** A seasonal factor: two decimals; a dash where there is no heat. @example factor(3.216) // '3.22' */
export function factor(value: number | 'no heat'): string {
  return value === 'no heat' ? '–' : figure(value, 2);
}

const SIGNIFICANT = 6;
const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/**
 * A number with six significant digits, or fewer where fewer are all it has: enough to check a sum by hand.
 *
 * @param value any finite number
 * @returns the text without a unit and without groups; a trailing zero says that digits were left out
 * @example significant(2 / 3) // '0.666667'
 */
export function significant(value: number): string {
  const size = Math.abs(value);
  const rounded = size.toPrecision(SIGNIFICANT);
  const text = Number(rounded) === size ? String(size) : rounded;
  const [digits, exponent] = text.split('e');
  return `${value < 0 ? '−' : ''}${digits}${exponent === undefined ? '' : `·10${superscript(exponent)}`}`;
}

function superscript(exponent: string): string {
  return exponent
    .replace('+', '')
    .replace('-', '⁻')
    .replace(/\d/g, (digit) => SUPERSCRIPTS[Number(digit)]);
}
