import { mean, sampleCorrelation, standardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { persistentNoise, smoothHours } from '../../../scripts/demo/persistentNoise.ts';
import { seededDraws } from '../../../scripts/demo/seededDraws.ts';

/** Normal draws that are zero but for the last of a year. */
function oneShockAtTheEnd(length: number) {
  let drawn = 0;
  return { uniform: () => 0, normal: () => (++drawn === length ? 1 : 0) };
}

describe('persistent noise', () => {
  it('has about mean 0, standard deviation 1 and the persistence that was asked', () => {
    const noise = Array.from(persistentNoise(seededDraws('noise'), 20_000, 0.8));
    // 20,000 steps of persistence 0.8 count as 20,000·0.2/1.8 = 2,200 free ones: standard errors about 0.02.
    expect(Math.abs(mean(noise))).toBeLessThan(0.08);
    expect(Math.abs(standardDeviation(noise) - 1)).toBeLessThan(0.08);
    expect(Math.abs(sampleCorrelation(noise.slice(1), noise.slice(0, -1)) - 0.8)).toBeLessThan(0.02);
  });

  it('goes on from the end of the year at its beginning', () => {
    const noise = persistentNoise(oneShockAtTheEnd(100), 100, 0.5);
    // A shock of √(1 − 0.5²) in the last step, halved in the first and again in the second.
    expect(noise[99]).toBeCloseTo(Math.sqrt(0.75), 12);
    expect(noise[0]).toBeCloseTo(Math.sqrt(0.75) / 2, 12);
    expect(noise[1]).toBeCloseTo(Math.sqrt(0.75) / 4, 12);
  });
});

describe('smooth hours', () => {
  it('follow a wave of eight days, also across the ends of the year', () => {
    const wave = (day: number) => Math.sin((2 * Math.PI * day) / 8);
    const hours = smoothHours(Float64Array.from({ length: 16 }, (_, day) => wave(day)));
    expect(hours.length).toBe(16 * 24);
    // A cubic through eight points a wave is off by less than 3 % of its height.
    hours.forEach((value, hour) => {
      expect(Math.abs(value - wave((hour + 0.5) / 24 - 0.5))).toBeLessThan(0.03);
    });
  });

  it('pass through the daily values at noon', () => {
    const hours = smoothHours(Float64Array.of(0, 0, 10, 0, 0));
    // Noon lies between two hours; the curve is even about the lone peak, so both are alike and just below it.
    expect(hours[2 * 24 + 11]).toBeCloseTo(hours[2 * 24 + 12], 12);
    expect(hours[2 * 24 + 12]).toBeGreaterThan(9.9);
    expect(hours[2 * 24 + 12]).toBeLessThan(10);
  });
});
