import { mean } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { inventWeather } from '../../../scripts/demo/townWeather.ts';

const year = inventWeather('any seed');
const hours = Array.from({ length: 8760 }, (_, i) => i);

function meanAtHour(values: Float64Array, hour: number): number {
  return mean(hours.filter((i) => i % 24 === hour).map((i) => values[i]));
}

describe('invented weather', () => {
  it('is the same for the same seed and another for another', () => {
    expect(inventWeather('any seed')).toEqual(year);
    expect(inventWeather('another seed').temperature).not.toEqual(year.temperature);
  });

  it('is warmest in the afternoon and coldest about sunrise', () => {
    const day = hours.slice(0, 24).map((hour) => meanAtHour(year.temperature, hour));
    expect([13, 14, 15]).toContain(day.indexOf(Math.max(...day)));
    expect([4, 5]).toContain(day.indexOf(Math.min(...day)));
  });

  it('is damper by night than by day, and never above saturation', () => {
    expect(meanAtHour(year.relativeHumidity, 4)).toBeGreaterThan(meanAtHour(year.relativeHumidity, 14) + 10);
    expect(Math.max(...year.relativeHumidity)).toBeLessThanOrEqual(100);
  });

  it('is dark at midnight all year and bright at noon all year', () => {
    for (const i of hours.filter((hour) => hour % 24 === 0)) {
      expect(year.globalRadiation[i]).toBe(0);
      expect(year.globalRadiation[i + 12]).toBeGreaterThan(20);
    }
  });

  it('has its sun centred on the noon of its longitude', () => {
    const sum = year.globalRadiation.reduce((total, g) => total + g, 0);
    const centre = year.globalRadiation.reduce((total, g, i) => total + g * ((i % 24) + 0.5), 0) / sum;
    // 10.6° east in UTC+1: noon at 12:18 on the mean of the year; clouds move the centre by some minutes.
    expect(Math.abs(centre - (12 + (15 - 10.6) / 15))).toBeLessThan(0.2);
  });

  it('ends where it begins', () => {
    // From one hour to the next it changes by less than 3 K at any time, so also across the new year.
    for (const i of hours) {
      expect(Math.abs(year.temperature[(i + 1) % 8760] - year.temperature[i])).toBeLessThan(3);
    }
  });
});
