import { describe, expect, test } from 'vitest';
import {
  coolingDegreeDays,
  type DegreeDayMethod,
  heatingDegreeDays,
  heatingDegreeDaysFromDailyExtremes,
} from '../../../src/weather/degreeDays.ts';

const yearOf = (temperature: number, hours = 8760) => new Float64Array(hours).fill(temperature);
const everyMethod: readonly DegreeDayMethod[] = ['hours', 'mean', 'minmax', 'fourcase', 'threshold'];

describe('degree days', () => {
  test('a year of 5 °C lacks 10.5 K to 15.5 °C on each of its days', () => {
    for (const method of ['hours', 'mean', 'minmax', 'fourcase'] as const) {
      expect(heatingDegreeDays(yearOf(5), 15.5, method).annual).toBe(365 * 10.5);
    }
    expect(heatingDegreeDays(yearOf(5), 15.5, 'hours').annual).toBe(3832.5);
  });

  test('a year of daily extremes from 4 to 10 °C lacks 8.5 K by the middle of the extremes', () => {
    const days = { highest: new Float64Array(365).fill(10), lowest: new Float64Array(365).fill(4) };
    expect(heatingDegreeDaysFromDailyExtremes(days, 15.5, 'minmax').annual).toBe(3102.5);
  });

  test('a year of 30 °C is 8 K above 22 °C on each of its days', () => {
    for (const method of ['hours', 'mean', 'minmax', 'fourcase'] as const) {
      expect(coolingDegreeDays(yearOf(30), 22, method).annual).toBe(2920);
    }
  });

  test('a leap year has a 29 February, in February', () => {
    const { annual, monthly } = heatingDegreeDays(yearOf(5, 8784), 15, 'mean');
    expect(annual).toBe(3660);
    expect(monthly[1]).toBe(290);
    expect(monthly[2]).toBe(310);
  });

  test('a year at the base has none, by any method', () => {
    for (const method of everyMethod) {
      expect(heatingDegreeDays(yearOf(20), 20, method)).toEqual({ annual: 0, monthly: new Array(12).fill(0) });
      expect(coolingDegreeDays(yearOf(20), 20, method)).toEqual({ annual: 0, monthly: new Array(12).fill(0) });
    }
  });

  test('hours below the base count in `hours` and in no daily mean when the day is warm on the whole', () => {
    const temperature = Float64Array.from({ length: 8760 }, (_, i) => (i % 24 < 6 ? 12 : 24));
    expect(heatingDegreeDays(temperature, 16, 'hours').annual).toBe(365);
    expect(heatingDegreeDays(temperature, 16, 'mean').annual).toBe(0);
  });

  test('a day of readings in tenths whose mean is exactly 15 °C counts for the European statistics', () => {
    const dayOfTenths = [14.1, 14.3, 14.9, 15.1, 15.7, 15.9];
    const temperature = Float64Array.from({ length: 8760 }, (_, i) => dayOfTenths[i % 6] as number);
    expect(heatingDegreeDays(temperature, 18, 'threshold').annual).toBe(365 * 3);
  });

  test('asking does not change the temperatures', () => {
    const temperature = yearOf(5);
    coolingDegreeDays(temperature, 3, 'hours');
    expect(temperature).toEqual(yearOf(5));
  });
});
