import { describe, expect, test } from 'vitest';
import { heatingDegreeDays, heatingDegreeDaysFromDailyExtremes } from '../../src/weather/degreeDays.ts';
import { accuracySection } from './accuracyRecord.ts';
import { dailyExtremesOf, seattleHourlyNormals } from './stationFiles.ts';

const accuracy = accuracySection(import.meta.url, 'Degree days of weather stations');
const ofNormals = accuracy.comparison({
  what: 'degree days of the hourly normals of Seattle-Tacoma, two bases, three methods, and months',
  source: 'NOAA normals 1981–2010, worked out from the same file apart from this project',
  unit: 'K·d',
  allowed: 0.05 + 1e-9,
  why: 'half of the last printed digit',
});
const monthsOfNormals = accuracy.comparison({
  what: 'months of those normals but July and August, base 65 °F',
  source: 'degree days published by NOAA for the same station and years',
  unit: '%',
  allowed: 10,
  why: 'means of degree days are not degree days of means: 10 % in May and September, 5 % in the other eight months',
});
const yearOfNormals = accuracy.comparison({
  what: 'year of those normals, base 65 °F',
  source: 'the same publication, 4697 °F·d',
  unit: '%',
  allowed: 1.5,
  why: 'that it is 1.4 % more is the figure that the test holds, to 0.05 %',
});
const ofExtremes = accuracy.comparison({
  what: 'degree days of daily extremes, Seattle and New York, 2012–2015, two bases',
  source: 'NOAA GHCN daily, worked out from the files apart from this project',
  unit: 'K·d',
  allowed: 0.05 + 1e-9,
  why: 'half of the last printed digit',
});

/** 65 °F, the base of the US convention, °C. */
const US_BASE = (65 - 32) / 1.8;
/** Half of the last printed digit of figures given to a tenth, with room for binary fractions at the tie. */
const HALF_A_TENTH = 0.05 + 1e-9;

describe('the NOAA hourly normals of Seattle-Tacoma, 1981–2010', () => {
  const normals = seattleHourlyNormals();

  // Source: worked out from the same file apart from this project.
  test.each([
    { base: US_BASE, method: 'mean', expected: 2646.5 },
    { base: US_BASE, method: 'hours', expected: 2740.0 },
    { base: US_BASE, method: 'minmax', expected: 2547.9 },
    { base: 15.5, method: 'mean', expected: 1800.3 },
    { base: 15.5, method: 'hours', expected: 1879.8 },
    { base: 15.5, method: 'minmax', expected: 1717.1 },
  ] as const)('have $expected K·d below $base °C by the method $method', ({ base, method, expected }) => {
    expect(Math.abs(heatingDegreeDays(normals, base, method).annual - expected)).toBeLessThanOrEqual(HALF_A_TENTH);
    ofNormals.add(heatingDegreeDays(normals, base, method).annual - expected);
  });

  test('have the monthly degree days worked out apart from this project', () => {
    const expected = [401.2, 342.2, 328.3, 255.6, 168.7, 83.1, 10.6, 5.3, 79.8, 219.9, 330.3, 421.4];
    const { monthly } = heatingDegreeDays(normals, US_BASE, 'mean');
    expect(monthly).toHaveLength(12);
    monthly.forEach((value, month) => {
      expect(Math.abs(value - (expected[month] as number))).toBeLessThanOrEqual(HALF_A_TENTH);
      ofNormals.add(value - (expected[month] as number));
    });
  });

  test('come near the degree days that were published for the same station and years', () => {
    // Source: NOAA 1981–2010 climate normals, heating degree days of Seattle-Tacoma, base 65 °F, °F·d, January … December,
    // in the reprint of the city's utility. They are means of thirty years' degree days; ours are degree days of thirty
    // years' mean hours. The two differ wherever a month has days on both sides of the base, so:
    // July and August cannot be compared (averaging hides the cool days); May, June and September lie up to 10 % apart,
    // May and September alone above 5 %; the months of winter within 5 %.
    const published = [711, 605, 574, 440, 285, 144, 49, 36, 132, 380, 586, 755];
    const { annual, monthly } = heatingDegreeDays(normals, US_BASE, 'mean');
    const inFahrenheit = monthly.map((value) => value * 1.8);
    const allowed = [0.05, 0.05, 0.05, 0.05, 0.1, 0.05, null, null, 0.1, 0.05, 0.05, 0.05];
    let compared = 0;
    allowed.forEach((share, month) => {
      if (share === null) return;
      const expected = published[month] as number;
      expect(Math.abs((inFahrenheit[month] as number) / expected - 1), `month ${month + 1}`).toBeLessThanOrEqual(share);
      monthsOfNormals.add(100 * ((inFahrenheit[month] as number) / expected - 1));
      compared++;
    });
    expect(compared).toBe(10);
    // That July and August are left out is not for comfort: the file's 29 °F·d are a third of the published 85.
    expect(Math.round((inFahrenheit[6] as number) + (inFahrenheit[7] as number))).toBe(29);
    // The year: 4763 against 4697 published, 1.4 % more.
    expect(Math.abs((annual * 1.8) / 4697 - 1.014)).toBeLessThanOrEqual(0.0005);
    yearOfNormals.add(100 * ((annual * 1.8) / 4697 - 1));
  });
});

describe('daily extremes of real years', () => {
  // Source: NOAA GHCN daily, Seattle and New York; degree days worked out from the files apart from this project.
  const years = [2012, 2013, 2014, 2015];
  const figures = [
    { place: 'Seattle', file: 'weather.csv', base: US_BASE, expected: [2671.5, 2472.1, 2201.7, 2150.8] },
    { place: 'New York', file: 'weather.csv', base: US_BASE, expected: [2284.5, 2700.9, 2784.5, 2544.2] },
    { place: 'Seattle', file: 'weather.csv', base: 15.5, expected: [1835.2, 1729.8, 1466.4, 1408.8] },
    { place: 'New York', file: 'weather.csv', base: 15.5, expected: [1666.2, 2049.6, 2153.2, 1930.5] },
    { place: undefined, file: 'seattle-weather.csv', base: US_BASE, expected: [2671.5, 2472.1, 2201.7, 2150.8] },
    { place: undefined, file: 'seattle-weather.csv', base: 15.5, expected: [1835.2, 1729.8, 1466.4, 1408.8] },
  ];

  test.each(figures)('$file, $place, below $base °C: the four years have their degree days', (figure) => {
    let rows = 0;
    years.forEach((year, i) => {
      const days = dailyExtremesOf(figure.file, year, figure.place);
      rows += days.highest.length;
      const { annual } = heatingDegreeDaysFromDailyExtremes(days, figure.base, 'minmax');
      expect(Math.abs(annual - (figure.expected[i] as number)), `${year}`).toBeLessThanOrEqual(HALF_A_TENTH);
      ofExtremes.add(annual - (figure.expected[i] as number));
    });
    // Three common years and the leap year 2012, no day missing.
    expect(rows).toBe(1461);
  });

  test('a leap year’s 29 February belongs to February', () => {
    const days = dailyExtremesOf('seattle-weather.csv', 2012);
    const february = days.highest
      .slice(31, 60)
      .map((highest, i) => US_BASE - (highest + (days.lowest[31 + i] as number)) / 2);
    // No day of that February reached the base, so its degree days are a plain sum.
    expect(Math.min(...february)).toBeGreaterThan(0);
    expect(february).toHaveLength(29);
    const sum = february.reduce((total, value) => total + value, 0);
    expect(heatingDegreeDaysFromDailyExtremes(days, US_BASE, 'minmax').monthly[1]).toBeCloseTo(sum, 9);
  });
});
