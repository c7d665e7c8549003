import type { Answer } from '../../scenario/answer/answer.ts';
import type { CivilClock } from '../../tariffs/civilClock.ts';

const HOURS = 24;

/** A tariff over the hours of the day. */
export interface DayOfPrices {
  readonly tariff: string;
  readonly currency: string;
  /** Mean of the year in each civil hour of the day: what one kWh more costs, taxes in. */
  readonly price: readonly number[];
}

/** The hours of the day in the mean of a year. */
export interface HoursOfDay {
  readonly tariffs: readonly DayOfPrices[];
  /** Electricity of the heating in each civil hour of the day, kWh a year. */
  readonly electricity: readonly number[];
}

/**
 * Prices and electricity by the civil hour of the day, for a strip of 24 cells. A tariff that is priced by blocks alone has no
 * price by the hour, and is left out.
 */
export function hoursOfDay({ loaded, columns }: Pick<Answer, 'loaded' | 'columns'>): HoursOfDay {
  const { clock, tariffs, scenario } = loaded;
  const count = sumsByHour(clock, () => 1);
  return {
    tariffs: tariffs
      .filter(({ prepared }) => !prepared.pricedByBlocksAlone)
      .map(({ name, currency, prepared }) => ({
        tariff: name,
        currency: currency ?? scenario.currency,
        price: sumsByHour(clock, (i) => prepared.marginalPrice[i]).map((sum, h) => sum / count[h]),
      })),
    electricity: sumsByHour(clock, (i) => columns.electricity[i]),
  };
}

function sumsByHour(clock: CivilClock, of: (step: number) => number): number[] {
  const sums = Array.from({ length: HOURS }, () => 0);
  for (let i = 0; i < clock.hours; i++) sums[Math.floor(clock.minuteOfDay[i] / 60)] += of(i);
  return sums;
}
