import { describe, expect, test } from 'vitest';
import { frostIndex } from '../../src/weather/frostIndex.ts';
import {
  humidityRatio,
  humidityRatioFromDewPoint,
  humidityRatioFromRelativeHumidity,
} from '../../src/weather/humidAir/humidityRatio.ts';
import {
  saturationPressureOverIce,
  saturationPressureOverWater,
} from '../../src/weather/humidAir/saturationPressure.ts';
import { standardPressure } from '../../src/weather/humidAir/standardPressure.ts';
import { humidityRatioFromWetBulb } from '../../src/weather/humidAir/wetBulb.ts';
import { accuracySection } from './accuracyRecord.ts';
import { psychrometricsLibrary as library } from './psychrometricsLibrary.ts';

const accuracy = accuracySection(import.meta.url, 'Humid air beside a library');
const saturation = accuracy.comparison({
  what: 'saturation pressure over ice and water, −60 … 100 °C',
  source: 'library psychrolib 1.1.1',
  unit: '%',
  allowed: 1e-9,
  why: 'the same equations',
});
const ratios = accuracy.comparison({
  what: 'humidity ratio from vapour pressure, relative humidity and dew point, 75 … 104 kPa',
  source: 'library psychrolib 1.1.1',
  unit: '%',
  allowed: 1e-9,
  why: 'the same equations',
});
const wetBulbs = accuracy.comparison({
  what: 'humidity ratio from the wet bulb, on ice and on water',
  source: 'library psychrolib 1.1.1',
  unit: '%',
  allowed: 1e-7,
  why: 'near-dry air is the difference of larger numbers',
});
const back = accuracy.comparison({
  what: 'humidity from the dew point and wet bulb that the library finds',
  source: 'library psychrolib 1.1.1',
  unit: '%',
  allowed: 0.03,
  why: 'the library stops its search within 0.001 K',
});
const altitudes = accuracy.comparison({
  what: 'pressure of the standard atmosphere, −400 … 4000 m',
  source: 'library psychrolib 1.1.1',
  unit: '%',
  allowed: 2e-4,
  why: 'the library writes the exponent as 5.2559',
});
const frost = accuracy.comparison({
  what: 'frost index, −24.75 … 7.75 °C, at two altitudes',
  source: 'the same index put together from the library',
  unit: '',
  allowed: 1e-10,
  why: 'a difference of nearby ratios',
});

// Source of every expected value here: the published library psychrolib 1.1.1, which implements the ASHRAE Handbook
// Fundamentals 2017, chapter 1, in SI units. It changes from ice to water at the triple point, 0.01 °C.

/** The same equations with the same printed constants differ by the rounding of the arithmetic alone. */
const SAME_EQUATION = 1e-11;
const PRESSURES = [75_000, 90_000, 101_325, 104_000];

/** Steps from `from` to `to`, both included. */
function grid(from: number, to: number, step: number): number[] {
  return Array.from({ length: Math.round((to - from) / step) + 1 }, (_, i) => from + i * step);
}

/** Largest relative difference of pairs (ours, theirs), and how many there were. */
function compare(pairs: readonly (readonly [number, number])[]): { rows: number; worst: number } {
  const differences = pairs.map(([ours, theirs]) => Math.abs(ours / theirs - 1));
  return { rows: pairs.length, worst: Math.max(...differences) };
}

describe('against the psychrometrics library', () => {
  test('saturation pressure agrees over ice and over water', () => {
    const ice = compare(grid(-60, 0, 0.5).map((t) => [saturationPressureOverIce(t), library.GetSatVapPres(t)]));
    const water = compare(grid(0.5, 100, 0.5).map((t) => [saturationPressureOverWater(t), library.GetSatVapPres(t)]));
    for (const { worst, rows } of [ice, water]) saturation.add(100 * worst, rows);
    expect(ice.rows).toBe(121);
    expect(water.rows).toBe(200);
    expect(ice.worst).toBeLessThan(SAME_EQUATION);
    expect(water.worst).toBeLessThan(SAME_EQUATION);
  });

  test('the humidity ratio agrees from vapour pressure, relative humidity and dew point', () => {
    const vapour = PRESSURES.flatMap((p) =>
      grid(50, 5000, 50).map((pv) => [humidityRatio(pv, p), library.GetHumRatioFromVapPres(pv, p)] as const),
    );
    const relative = PRESSURES.flatMap((p) =>
      grid(0.5, 40, 0.5).flatMap((t) =>
        grid(5, 100, 5).map((rh) => {
          const theirs = library.GetHumRatioFromRelHum(t, rh / 100, p);
          return [humidityRatioFromRelativeHumidity(t, rh, p), theirs] as const;
        }),
      ),
    );
    const dewPoint = PRESSURES.flatMap((p) =>
      grid(0.5, 30, 0.5).map(
        (td) => [humidityRatioFromDewPoint(td + 5, td, p), library.GetHumRatioFromTDewPoint(td, p)] as const,
      ),
    );
    for (const { worst, rows } of [vapour, relative, dewPoint].map(compare)) ratios.add(100 * worst, rows);
    expect([compare(vapour).rows, compare(relative).rows, compare(dewPoint).rows]).toEqual([400, 6400, 240]);
    expect(compare(vapour).worst).toBeLessThan(SAME_EQUATION);
    expect(compare(relative).worst).toBeLessThan(SAME_EQUATION);
    expect(compare(dewPoint).worst).toBeLessThan(SAME_EQUATION);
  });

  test('the humidity ratio agrees from the wet bulb, on ice and on water', () => {
    const pairs = PRESSURES.flatMap((p) =>
      grid(-30.25, 29.75, 0.5).flatMap((wet) =>
        [0, 0.5, 1, 2].map((depression) => {
          const theirs = library.GetHumRatioFromTWetBulb(wet + depression, wet, p);
          return [humidityRatioFromWetBulb(wet + depression, wet, p), theirs] as const;
        }),
      ),
    );
    // Where the library meets its least ratio of 1e-7 the air is dry for us too: those rows are no comparison.
    const moist = pairs.filter(([, theirs]) => theirs > 1e-6);
    expect(pairs).toHaveLength(1936);
    expect(moist.length).toBeGreaterThan(1700);
    expect(pairs.filter(([ours, theirs]) => theirs <= 1e-6 && ours > 1e-6)).toEqual([]);
    // Near-dry air is the difference of two larger numbers, which costs two more digits.
    expect(compare(moist).worst).toBeLessThan(100 * SAME_EQUATION);
    wetBulbs.add(100 * compare(moist).worst, moist.length);
  });

  test('a dew point and a wet bulb found by the library lead back to the humidity they came from', () => {
    // From 8 °C up, so that no dew point is below zero, where the library's is a frost point.
    const cases = grid(8, 36, 2).flatMap((t) => [60, 75, 90].map((rh) => ({ t, rh })));
    for (const { t, rh } of cases) {
      const ratio = humidityRatioFromRelativeHumidity(t, rh, 101_325);
      const dewPoint = library.GetTDewPointFromRelHum(t, rh / 100);
      const wetBulb = library.GetTWetBulbFromHumRatio(t, ratio, 101_325);
      // 0.03 %: the library stops its search within 0.001 K, worth 0.01 % of the vapour pressure at a dew point and, by
      // the psychrometer's slope of 0.0008 per K on a ratio of 0.004, 0.02 % at a wet bulb.
      expect(Math.abs(humidityRatioFromDewPoint(t, dewPoint, 101_325) / ratio - 1)).toBeLessThan(3e-4);
      expect(Math.abs(humidityRatioFromWetBulb(t, wetBulb, 101_325) / ratio - 1)).toBeLessThan(3e-4);
      back.add(100 * (humidityRatioFromDewPoint(t, dewPoint, 101_325) / ratio - 1));
      back.add(100 * (humidityRatioFromWetBulb(t, wetBulb, 101_325) / ratio - 1));
    }
    expect(cases).toHaveLength(45);
  });

  test('the pressure of the standard atmosphere agrees', () => {
    const pairs = grid(-400, 4000, 100).map((z) => [standardPressure(z), library.GetStandardAtmPressure(z)] as const);
    expect(compare(pairs).rows).toBe(45);
    // The library writes the exponent as 5.2559 instead of 5.25588: 2e-5 · ln(1 − 0.0902) = 1.9e-6 at 4000 m.
    expect(compare(pairs).worst).toBeLessThan(2e-6);
    altitudes.add(100 * compare(pairs).worst, pairs.length);
  });

  test('the frost index agrees with the same index put together from the library', () => {
    const cases = [80_000, 101_325].flatMap((p) =>
      grid(-24.75, 7.75, 0.5).flatMap((t) => [0.2, 0.5, 0.7, 0.84, 1].map((share) => ({ p, t, share }))),
    );
    const humid = cases.map(({ p, t, share }) => {
      // Vapour as a share of saturation over ice below the triple point, so that the library can say it.
      const ratio = library.GetHumRatioFromRelHum(t, share, p);
      const settling = Math.max(0, ratio - library.GetHumRatioFromTDewPoint(t - 8, p));
      const reference = library.GetHumRatioFromRelHum(2, 0.84, p) - library.GetHumRatioFromTDewPoint(-6, p);
      const staying = Math.min(1, (8 - t) / 6);
      return { ours: frostIndex(t, ratio, p), theirs: Math.min(1.5, (staying * settling) / reference) };
    });
    expect(humid).toHaveLength(660);
    expect(humid.filter(({ theirs }) => theirs > 0 && theirs < 1.5).length).toBeGreaterThan(400);
    // The index is a difference of nearby ratios: rounding of 1e-11 counts in full, not as a share.
    for (const { ours, theirs } of humid) expect(Math.abs(ours - theirs)).toBeLessThan(1e-10);
    for (const { ours, theirs } of humid) frost.add(ours - theirs);
  });
});
