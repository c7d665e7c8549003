import { type Problem, shown } from '../../core/problem.ts';

/** What a table holds, and what is wrong with a cell of it. */
export interface Quantity {
  readonly name: 'capacity' | 'cop' | 'inputPower';
  /** The fault of a cell by its text and its number; undefined where there is none. */
  faultOf(text: string, value: number | null | undefined): CellFault | undefined;
}

type CellFault = Pick<Problem, 'code' | 'found' | 'allowed' | 'hint'>;

/** Heating capacity, kW. */
export const capacityQuantity: Quantity = {
  name: 'capacity',
  faultOf: (text, value) =>
    powerFault(text, value, { least: 0.05, allowed: 'a capacity lies between 0.05 and 1000 kW' }),
};

/** Electric input power, kW. */
export const inputPowerQuantity: Quantity = {
  name: 'inputPower',
  faultOf: (text, value) =>
    powerFault(text, value, { least: 0.01, allowed: 'an input power lies between 0.01 and 1000 kW' }),
};

const LEAST_COP = 0.5;
const MOST_COP = 12;

/** COP: heat given per electricity taken. */
export const copQuantity: Quantity = {
  name: 'cop',
  faultOf: (text, value) => {
    const allowed = `a COP lies between ${LEAST_COP} and ${MOST_COP}`;
    const percent = percentOf(text, value);
    if (value === null || (value !== undefined && value >= LEAST_COP && value <= MOST_COP)) return undefined;
    const hint =
      percent !== undefined && percent >= 50 && percent <= MOST_COP * 100
        ? `write ${plain(percent / 100)} for ${plain(percent)} %`
        : 'heat given per electricity taken: write 4 for 400 %';
    return value === undefined
      ? { code: 'map.not-a-number', found: `'${shown(text)}'`, allowed, hint }
      : { code: 'map.out-of-range', found: plain(value), allowed, hint };
  },
};

function powerFault(
  text: string,
  value: number | null | undefined,
  range: { least: number; allowed: string },
): CellFault | undefined {
  const { least, allowed } = range;
  if (value === null || (value !== undefined && value >= least && value <= 1000)) return undefined;
  if (value === undefined) {
    const watts = /^([\d.]+)\s*W$/.exec(text.trim());
    const hint = watts ? { hint: `write ${plain(Number(watts[1]) / 1000)} for ${watts[1]} W` } : {};
    return { code: 'map.not-a-number', found: `'${shown(text)}'`, allowed, ...hint };
  }
  const hint = value > 1000 ? { hint: `the table is in kW: write ${plain(value / 1000)} for ${plain(value)} W` } : {};
  return { code: 'map.out-of-range', found: plain(value), allowed, ...hint };
}

function percentOf(text: string, value: number | null | undefined): number | undefined {
  if (typeof value === 'number') return value;
  const percent = /^(\d+(?:[.,]\d+)?)\s*%$/.exec(text.trim());
  return percent ? Number((percent[1] ?? '').replace(',', '.')) : undefined;
}

/** A number without the digits that binary fractions add. */
function plain(value: number): string {
  return String(Number(value.toPrecision(12)));
}
