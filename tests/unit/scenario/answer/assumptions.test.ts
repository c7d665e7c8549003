import { describe, expect, test } from 'vitest';
import { assumptionNote } from '../../../../src/report/englishNotes.ts';
import { defaultAssumption } from '../../../../src/scenario/answer/assumptions.ts';
import { sampleFiles } from '../sampleFiles.ts';
import { type Change, changedAnswer, houseWith, unitWith } from './changedAnswer.ts';

/** Texts of the assumptions at a path. */
const saidAt = (path: string, changes: readonly Change[] = [], files: Record<string, string> = {}) =>
  changedAnswer(changes, files)
    .assumptions.map(assumptionNote)
    .filter((assumption) => assumption.path === path)
    .map(({ text }) => text);

const read: Change = ['house.yaml', 'stamps: begin }', 'stamps: begin }\n  relativeHumidity: 78'];
const cylinder = (draw: string) =>
  houseWith(`hotWater:\n  volume: 200\n  loss: { given: coefficient, value: 1.5 }\n  draw: ${draw}`);
const boiler = (entries = '') =>
  `boiler:\n  efficiency: 0.9\n  fuel: { kind: naturalGas, price: 0.1, calorificValue: net }\n${entries}`;
const hybrid: Change = [
  'house.yaml',
  'backup: { source: electric, power: 6 }',
  'backup:\n  source: boiler\n  power: 15\n  efficiency: 0.9\n  fuel: { kind: heatingOil, price: 0.1 }\n  mode: { kind: cheapest }',
];

describe('what a result rests on', () => {
  test('holds every default that was used, with its unit and what it changes', () => {
    expect(saidAt('house.need.setPoint')).toEqual(['20 °C. Room temperature that is kept.']);
    expect(
      saidAt('house.need.setPoint', [['house.yaml', 'internalGains: 300', 'internalGains: 300\n    setPoint: 20']]),
    ).toEqual([]);
  });

  test('shows a default without a sentence by its value alone', () => {
    const used = { file: 'house.yaml', path: 'backup.mode.kind', value: 'parallel', says: '' };
    expect(assumptionNote(defaultAssumption(used))).toEqual({
      path: 'backup.mode.kind',
      text: 'parallel.',
    });
  });

  test('holds the humidity and the pressure that the weather file does not have', () => {
    const dry = sampleFiles()['weather.csv']!.replaceAll(/,[^,\n]*\n/g, '\n');
    expect(saidAt('weather.file', [read], { 'weather.csv': dry })).toEqual([
      'The file has no humidity: 78 % in every hour.',
      'The file has no pressure: the standard atmosphere at 100 m.',
    ]);
    const pressed = sampleFiles()['weather.csv']!.replaceAll('\n', ',1000\n').replace('%,1000', '%,pressure hPa');
    expect(saidAt('weather.file', [], { 'weather.csv': pressed })).toEqual([]);
  });

  test('holds how the base temperature comes about, unless it is entered', () => {
    const [text] = saidAt('house.need');
    expect(text).toBe(
      'The base temperature follows from set point, gains and heat loss; the house stores a day’s sun.',
    );
    expect(saidAt('house.need', [['house.yaml', 'internalGains: 300', 'baseTemperature: 16']])).toEqual([]);
  });

  test('holds the limits of the unit that its file leaves out', () => {
    expect(saidAt('limits.highestFlow')).toEqual(['55 °C, the highest flow of the unit’s map.']);
    expect(saidAt('limits.lowestOutdoorTemperature')).toEqual(['None is entered: the unit runs however cold it is.']);
    const entered = unitWith('limits: { highestFlow: 58, lowestOutdoorTemperature: -20 }');
    expect(saidAt('limits.highestFlow', [entered])).toEqual([]);
    expect(saidAt('limits.lowestOutdoorTemperature', [entered])).toEqual([]);
  });

  test('holds the water on which a short run works', () => {
    // 20 L for each of 0.3·8.0 kW are 48 L, less than 100
    const [text] = saidAt('circulation.waterContent');
    expect(text).toMatch(/^100 L, by rule of thumb \(20 L a kW, at least 100 L; common practice, no source\)/);
    expect(saidAt('circulation.waterContent', [houseWith('circulation: { waterContent: 70 }')])).toEqual([]);
  });

  test('holds how litres of hot water are spread over the day', () => {
    const path = 'hotWater.draw.shares';
    const litres = (more: string) => [cylinder(`{ given: litres, litresPerDay: 100${more} }`)];
    expect(saidAt(path, litres(''))).toEqual(['Spread over the day as in tapping profile M.']);
    expect(saidAt(path, litres(`, shares: [${new Array(24).fill(1).join(', ')}]`))).toEqual([]);
    expect(saidAt(path, [cylinder('{ given: profile, profile: M }')])).toEqual([]);
  });

  test('holds that there is no backup, where there is none', () => {
    expect(saidAt('backup', [['house.yaml', 'backup: { source: electric, power: 6 }\n', '']])).toEqual([
      'There is no backup heater.',
    ]);
    expect(saidAt('backup')).toEqual([]);
  });
});

describe('what the money rests on', () => {
  test('holds that nothing but the heating is on the bill, or how a household is spread', () => {
    expect(saidAt('household')).toEqual([
      'No electricity of a household is entered: the bill is that of the heating alone.',
    ]);
    const entered = [houseWith('household: { given: profile, kWhPerYear: 3000 }')];
    expect(saidAt('household', entered)).toEqual([]);
    expect(saidAt('household.shares', entered)).toEqual(['Even over the hours of the day.']);
    expect(saidAt('household', [['house.yaml', '[tariff.yaml]', '[]']])).toEqual([]);
  });

  test('holds that the first tariff drives a hybrid and the others have runs of their own', () => {
    const second = sampleFiles()['tariff.yaml']!.replace('Test tariff', 'Other');
    const two: Change = ['house.yaml', '[tariff.yaml]', '[tariff.yaml, other.yaml]'];
    expect(saidAt('backup.mode', [hybrid, two], { 'other.yaml': second })).toEqual([
      'The first tariff drives the year; every further tariff has a run of its own, for its costs alone.',
    ]);
    expect(saidAt('backup.mode', [hybrid])).toEqual([]);
  });

  test('holds what the boiler does for hot water, unless it is entered', () => {
    const water =
      '\nhotWater:\n  volume: 200\n  loss: { given: coefficient, value: 1.5 }\n  draw: { given: profile, profile: M }';
    const plain = [houseWith(boiler() + water)];
    expect(saidAt('boiler.cylinderLoss', plain)).toEqual(['That of the heat pump’s run.']);
    expect(saidAt('boiler.hotWaterEfficiency', plain)).toEqual([
      'That for space heat, of a condensing boiler at its hottest return.',
    ]);
    const entered = [houseWith(boiler('  cylinderLoss: 600\n  hotWaterEfficiency: 0.8') + water)];
    expect(saidAt('boiler.cylinderLoss', entered)).toEqual([]);
    expect(saidAt('boiler.hotWaterEfficiency', entered)).toEqual([]);
    expect(saidAt('boiler.cylinderLoss', [houseWith(boiler())])).toEqual([]);
  });

  test('holds the published carbon of a fuel, of boiler and hybrid', () => {
    const carbon = houseWith(`${boiler()}carbon: { electricity: 0.3 }`);
    // Regulation (EU) 2018/2066 annex VI: 56.1 t/TJ, 0.20196 kg/kWh net; 74.1 t/TJ, 0.26676 kg/kWh net
    expect(saidAt('boiler.fuel.carbonFactor', [carbon])).toEqual([
      '0.202 kg/kWh. Regulation (EU) 2018/2066, on net calorific value.',
    ]);
    const [text] = saidAt('backup.fuel.carbonFactor', [hybrid, carbon]);
    expect(text).toMatch(/^0\.2\d\d kg\/kWh\. Regulation/);
    expect(saidAt('boiler.fuel.carbonFactor', [houseWith(boiler())])).toEqual([]);
  });
});
