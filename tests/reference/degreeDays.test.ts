import { describe, expect, test } from 'vitest';
import {
  coolingDegreeDays,
  heatingDegreeDays,
  heatingDegreeDaysFromDailyExtremes,
} from '../../src/weather/degreeDays.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Degree days by rule');
const uk = accuracy.comparison({
  what: 'UK rules for days that cross the base, 15.5 °C, over a year',
  source: 'rules of the UK Met Office (in CIBSE TM41, from memory), worked by hand',
  unit: 'K·d',
  allowed: 1e-9,
  why: 'sums of exact fractions',
});
const european = accuracy.comparison({
  what: 'threshold convention, heating and cooling, year and months',
  source: 'definition of Eurostat, worked by hand',
  unit: 'K·d',
  allowed: 1e-9,
  why: 'means of readings in tenths',
});

const FEBRUARY_DAYS = 28;
const DAYS = 365;

describe('the UK rules for days that cross the base', () => {
  // Source: UK Met Office rules for daily degree days (in CIBSE TM41, from memory), base 15.5 °C; values worked out from
  // the rules by hand.
  const table: [number, number, number][] = [
    [10, 2, 9.5],
    [15.5, 5.5, 5.0],
    [18, 8, 3.125],
    [22, 12, 0.875],
    [16, 14, 0.625],
    [20, 11, 1.125],
    [30, 10, 1.375],
    [25, 17, 0],
  ];

  test('a year of one kind of day has that day’s degree days 365 times', () => {
    for (const [highest, lowest, perDay] of table) {
      const days = { highest: new Array(DAYS).fill(highest), lowest: new Array(DAYS).fill(lowest) };
      const { annual, monthly } = heatingDegreeDaysFromDailyExtremes(days, 15.5, 'fourcase');
      // Rounding of 365 additions of exact binary fractions: none is expected, 1e-9 is generous.
      expect(Math.abs(annual - DAYS * perDay)).toBeLessThanOrEqual(1e-9);
      expect(Math.abs((monthly[1] as number) - FEBRUARY_DAYS * perDay)).toBeLessThanOrEqual(1e-9);
      uk.add(annual - DAYS * perDay);
    }
    expect(table).toHaveLength(8);
  });

  test('a year of hours is judged by the extremes of its days', () => {
    for (const [highest, lowest, perDay] of table) {
      // The extremes stand at 4 and 15 o'clock, everything else between them.
      const hours = Float64Array.from({ length: 8760 }, (_, i) => {
        if (i % 24 === 4) return lowest;
        return i % 24 === 15 ? highest : (highest + lowest) / 2;
      });
      expect(Math.abs(heatingDegreeDays(hours, 15.5, 'fourcase').annual - DAYS * perDay)).toBeLessThanOrEqual(1e-9);
      uk.add(heatingDegreeDays(hours, 15.5, 'fourcase').annual - DAYS * perDay);
    }
    expect(table).toHaveLength(8);
  });
});

describe('the convention of European statistics', () => {
  // Source: Eurostat, energy statistics, heating and cooling degree days: Σ (18 − mean) over days with a mean of at most
  // 15 °C, Σ (mean − 21) over days with a mean of at least 24 °C; the series is worked by hand.
  const year = new Float64Array(8760).fill(20);
  const setDay = (day: number, morning: number, evening: number) => {
    year.fill(morning, day * 24, day * 24 + 12);
    year.fill(evening, day * 24 + 12, day * 24 + 24);
  };
  setDay(0, 0, 10); // 1 January, mean 5: 13
  setDay(1, 14.9, 15.1); // 2 January, mean exactly 15: 3
  setDay(2, 15, 15.2); // 3 January, mean 15.1: none, though below 18
  setDay(58, -4, -2); // 28 February, mean −3: 21
  setDay(59, 9, 16); // 1 March, mean 12.5: 5.5
  setDay(200, 20, 28); // 20 July, mean exactly 24: 3
  setDay(201, 20, 27.9); // 21 July, mean 23.95: none
  setDay(202, 25, 35); // 22 July, mean 30: 9
  const noDays = [0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0];

  test('heating counts from 18 °C, on days of at most 15 °C only, whatever base is asked', () => {
    for (const base of [10, 15.5, 20]) {
      const { annual, monthly } = heatingDegreeDays(year, base, 'threshold');
      const expected = noDays.with(0, 16).with(1, 21).with(2, 5.5);
      // Means of readings in tenths are good to 1e-13.
      monthly.forEach((value, month) => {
        expect(Math.abs(value - (expected[month] as number))).toBeLessThanOrEqual(1e-9);
        european.add(value - (expected[month] as number));
      });
      expect(Math.abs(annual - 42.5)).toBeLessThanOrEqual(1e-9);
      european.add(annual - 42.5);
    }
  });

  test('cooling counts from 21 °C, on days of at least 24 °C only, whatever base is asked', () => {
    for (const base of [18, 26]) {
      const { annual, monthly } = coolingDegreeDays(year, base, 'threshold');
      expect(Math.abs(annual - 12)).toBeLessThanOrEqual(1e-9);
      european.add(annual - 12);
      expect(Math.abs((monthly[6] as number) - 12)).toBeLessThanOrEqual(1e-9);
    }
  });
});
