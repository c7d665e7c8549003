import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { compensatedSum } from '../../../../src/core/sum.ts';
import { read } from './syntheticYear.ts';

// Seattle-Tacoma hourly normals 1981–2010 (U.S. National Oceanic and Atmospheric Administration, public domain), as the
// package vega-datasets 3.2.1 carries them. 1 January 00:00 is missing. Not a real year: averages of thirty.
const text = readFileSync(
  new URL('../../../../node_modules/vega-datasets/data/seattle-weather-hourly-normals.csv', import.meta.url),
  'utf8',
);
const site = { zone: 'America/Los_Angeles', defaultOffsetMinutes: -480, altitude: 130 };

it('the published normals lack one hour, which is said', () => {
  const { series, problems } = read(text, {}, site);
  expect(series).toBeUndefined();
  expect(problems).toMatchObject([{ code: 'weather.absent-hours', found: '01-01 00:00 (1 hour)' }]);
});

it('the published normals are read whole where the missing hour may be filled', () => {
  const { series, problems, recognised } = read(text, { absentHours: 'fill' }, site);
  expect(problems).toEqual([]);
  expect(series?.hours).toBe(8760);
  expect(series?.offsetMinutes).toBe(-480);
  // Between 31 December 23:00 (4.3 °C, 1016.7 hPa) and 1 January 01:00 (4.0 °C, 1016.6 hPa) of the file.
  expect(series?.temperature[0]).toBeCloseTo(4.15, 12);
  expect(series?.pressure?.[0]).toBeCloseTo(101_665, 9);
  const unit = recognised.columns.find((column) => column.use === 'pressure');
  expect(unit).toMatchObject({ unit: 'hPa', unitDecidedBy: 'values', number: 2 });
});

it('the degree hours of the published normals are those computed apart from this project', () => {
  const { series } = read(text, { absentHours: 'fill' }, site);
  const degreeDays = compensatedSum(series!.temperature.map((t) => Math.max(0, 65 / 1.8 - 32 / 1.8 - t) / 24));
  // Base 65 °F = 18.333 °C: 2740.0 K·d, given with one decimal, with the missing hour taken as that of 01:00; one hour
  // interpolated instead moves it by less than 0.01.
  expect(Math.abs(degreeDays - 2740)).toBeLessThan(0.06);
});
