import type { SeasonalFactor } from '../../sim/seasonalFactors.ts';
import { figure } from '../figures.ts';

/** Figures as a language writes them: its decimal sign, groups of three set apart by a thin space. */
export interface LocalFigures {
  number(value: number, decimals: number): string;
  kWh(value: number): string;
  money(value: number, currency: string): string;
  factor(value: SeasonalFactor): string;
  /** A share as per cent. */
  percent(share: number, decimals?: number): string;
  /** A change with its sign. */
  signed(value: number, decimals: number): string;
}

/** No-break space between a figure and its unit. */
const NO_BREAK = '\u00a0';

/**
 * Writes figures with the decimal sign of a language. Thousands are set apart by a thin space in every language, so that
 * no sign means one thing to one reader and another to the next (ISO 80000-1, 7.3).
 *
 * @example localFigures(',').kWh(12345.6) // '12\u202f346\u00a0kWh'
 */
export function localFigures(decimalSign: '.' | ','): LocalFigures {
  const number = (value: number, decimals: number) => figure(value, decimals).replace('.', decimalSign);
  return {
    number,
    kWh: (value) => `${number(value, 0)}${NO_BREAK}kWh`,
    money: (value, currency) => `${number(value, 0)}${NO_BREAK}${currency}`,
    factor: (value) => (value === 'no heat' ? '–' : number(value, 2)),
    percent: (share, decimals = 0) => `${number(100 * share, decimals)}${NO_BREAK}%`,
    signed: (value, decimals) => {
      const text = number(value, decimals);
      return value > 0 && /[1-9]/.test(text) ? `+${text}` : text;
    },
  };
}
