import { describe, expect, test } from 'vitest';
import { heatingDegreeDays } from '../../src/weather/degreeDays.ts';
import { type SeasonName, standardSeasons } from '../../src/weather/seasonBins.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Reference seasons');
const binHours = accuracy.comparison({
  what: 'heating hours of the three reference seasons, sums of their bins',
  source: 'Regulation (EU) 811/2013 annex VII table 12, 813/2013 annex III table 5',
  unit: 'h',
  allowed: 0,
  why: 'printed whole',
});
const equivalent = accuracy.comparison({
  what: 'hours at design load of the three seasons, as weather',
  source: 'worked out from the printed tables apart from this project',
  unit: 'h',
  allowed: 0.005,
  why: 'half of the last digit',
});

/** A year of hours in which each bin's temperature stands for its hours, and the rest is too warm to heat. */
function yearOf(season: SeasonName): Float64Array {
  const temperature = new Float64Array(8760).fill(20);
  let step = 0;
  for (const bin of standardSeasons[season].bins) {
    temperature.fill(bin.temperature, step, step + bin.hours);
    step += bin.hours;
  }
  return temperature;
}

// Source: Regulation (EU) 811/2013 annex VII table 12; Regulation (EU) 813/2013 annex III table 5 (average).
// The unrounded hours are Σ (16 − T)·hours / (16 − design temperature), worked out from the printed tables apart from
// this project; the whole ones are printed.
describe.each([
  { season: 'average', design: -10, hours: 4910, bins: 26, unrounded: 2065.62, printed: 2066 },
  { season: 'warmer', design: 2, hours: 3590, bins: 14, unrounded: 1335.79, printed: 1336 },
  { season: 'colder', design: -22, hours: 6446, bins: 38, unrounded: 2464.76, printed: 2465 },
] as const)('the $season reference season', ({ season, design, hours, bins, unrounded, printed }) => {
  test('has the published number of heating hours, from the design temperature to 15 °C in steps of 1 K', () => {
    const table = standardSeasons[season].bins;
    expect(standardSeasons[season].designTemperature).toBe(design);
    expect(table).toHaveLength(bins);
    expect(table.map((bin) => bin.temperature)).toEqual(Array.from({ length: bins }, (_, i) => design + i));
    expect(table.reduce((sum, bin) => sum + bin.hours, 0)).toBe(hours);
    binHours.add(table.reduce((sum, bin) => sum + bin.hours, 0) - hours);
  });

  test('needs, as weather, the published hours at design load', () => {
    const degreeHours = 24 * heatingDegreeDays(yearOf(season), 16, 'hours').annual;
    // Half of the last digit of the figure worked out from the tables: temperatures and hours are whole numbers.
    expect(Math.abs(degreeHours / (16 - design) - unrounded)).toBeLessThanOrEqual(0.005);
    equivalent.add(degreeHours / (16 - design) - unrounded);
    expect(Math.round(degreeHours / (16 - design))).toBe(printed);
    expect(standardSeasons[season].equivalentHours).toBe(printed);
  });
});

test('the idle hours are those of the air-conditioner regulation that the heat-pump standard shares', () => {
  // Source: Regulation (EU) 206/2012 annex II table 4, as printed: thermostat off, standby, off, crankcase heater.
  const asRow = (season: SeasonName, kind: 'heatingOnly' | 'reversible') => {
    const { thermostatOff, standby, off, crankcase } = standardSeasons[season].idleHours[kind];
    return [thermostatOff, standby, off, crankcase];
  };
  expect(asRow('average', 'heatingOnly')).toEqual([179, 0, 3672, 3851]);
  expect(asRow('average', 'reversible')).toEqual([179, 0, 0, 179]);
  expect(asRow('warmer', 'heatingOnly')).toEqual([755, 0, 4345, 4476]);
  expect(asRow('warmer', 'reversible')).toEqual([755, 0, 0, 755]);
  expect(asRow('colder', 'heatingOnly')).toEqual([131, 0, 2189, 2944]);
  expect(asRow('colder', 'reversible')).toEqual([131, 0, 0, 131]);
});
