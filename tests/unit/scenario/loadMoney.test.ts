import { describe, expect, test } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { type LoadedScenario, loadScenario } from '../../../src/scenario/loadScenario.ts';
import { bill } from '../../../src/tariffs/bill.ts';
import { clockOf, steadyUse, stepAt } from '../tariffs/sampleTariffs.ts';
import { memoryFiles } from './memoryFiles.ts';
import { sampleFiles, scenarioText, tariffText } from './sampleFiles.ts';

const berlin = clockOf('Europe/Berlin', 60);

/** The sample scenario with sections added, its list of tariffs replaced where one is given. */
function load(
  sections: string,
  files: Record<string, string> = {},
  { tariffs = 'tariffs: [tariff.yaml]', further = [] as string[] } = {},
) {
  const text = scenarioText.replace('tariffs: [tariff.yaml]', `${sections}\n${tariffs}`);
  return loadScenario('house.yaml', memoryFiles({ ...sampleFiles(), ...files, 'house.yaml': text }), further);
}

function loadedOf(result: ReturnType<typeof load>): LoadedScenario {
  if (result.loaded === undefined) throw new Error(result.problems.map(problemText).join('\n'));
  return result.loaded;
}

const said = ({ problems }: ReturnType<typeof load>) => problems.map(problemText).join('\n');
const sum = (column: Float64Array) => column.reduce((all, value) => all + value, 0);

/** A CSV of a value a step from an instant of UTC on, the value by number. */
function series(from: string, minutes: number, steps: number, value: (k: number) => number | string): string {
  const start = Date.parse(from);
  const rows = Array.from(
    { length: steps },
    (_, k) => `${new Date(start + k * minutes * 60_000).toISOString().slice(0, 16)}Z,${value(k)}`,
  );
  return `time,value\n${rows.join('\n')}\n`;
}

describe('the household', () => {
  test('takes nothing where none is entered', () => {
    expect(sum(loadedOf(load('')).household)).toBe(0);
  });

  test('by profile is on the scenario’s clock', () => {
    const { household } = loadedOf(load('household: { given: profile, kWhPerYear: 8760 }'));
    expect(household).toHaveLength(8760);
    expect(household[0]).toBe(1);
  });

  const meter = 'household: { given: meter, file: meter.csv, unit: Wh }';

  test('by meter adds its half-hours up to hours, in the unit that the file has', () => {
    // 100 Wh and 300 Wh in the half-hours of every hour: 0.4 kWh
    const file = series('2024-12-31T23:00Z', 30, 17_520, (k) => (k % 2 === 0 ? 100 : 300));
    const { household, inputs } = loadedOf(load(meter, { 'meter.csv': file }));
    expect(household[0]).toBeCloseTo(0.4, 12);
    expect(sum(household)).toBeCloseTo(3504, 8);
    expect(inputs.find(({ file: name }) => name === 'meter.csv')?.role).toBe('meter');
  });

  test('by meter lies at the right hours on the days on which the clocks change', () => {
    // one reading of 5 kWh in the hour after each change, at 01:00 UTC, stamped as the clock on the wall shows it
    const toLocal = new Intl.DateTimeFormat('sv-SE', {
      timeZone: 'Europe/Berlin',
      dateStyle: 'short',
      timeStyle: 'short',
    });
    const start = Date.UTC(2024, 11, 31, 23);
    const after = [Date.UTC(2025, 2, 30, 1), Date.UTC(2025, 9, 26, 1)];
    const rows = Array.from({ length: 8760 }, (_, k) => {
      const at = start + k * 3_600_000;
      return `${toLocal.format(at)},${after.includes(at) ? 5000 : 100}`;
    });
    const local = load(meter.replace('Wh }', 'Wh, stamps: local }'), { 'meter.csv': `time,Wh\n${rows.join('\n')}\n` });
    const { household } = loadedOf(local);
    const high = Array.from(household.keys()).filter((i) => household[i] === 5);
    // 03:00 on the wall in March, for 02:00 is skipped; the second 02:00 in October
    expect(high).toEqual([stepAt(berlin, '2025-03-30T03:00+02:00'), stepAt(berlin, '2025-10-26T02:00+01:00')]);
  });

  test('by meter takes the year as periodic', () => {
    // a year that begins on 1 July 2024: its second half is the first half of 2025, its first half stands in for the rest
    const file = series('2024-06-30T23:00Z', 60, 8760, (k) => (k < 4416 ? 100 : 200));
    const result = load(meter, { 'meter.csv': file });
    const { household } = loadedOf(result);
    expect([household[0], household[8759]]).toEqual([0.2, 0.1]);
    expect(said(result)).toContain('warning: for 4416 hours the reading of a year before or after was taken');
  });

  test('by meter is an error where the readings do not hold a year', () => {
    const file = series('2024-12-31T23:00Z', 60, 8000, () => 100);
    const result = load(meter, { 'meter.csv': file });
    expect(result.loaded).toBeUndefined();
    expect(said(result)).toContain('meter.csv  the reading series does not reach 2025-11-30T07:00Z');
  });

  test('by meter tells of readings that are none, and of a file that is not there', () => {
    const file = series('2024-12-31T23:00Z', 60, 8760, (k) => (k === 3 ? -5 : 100));
    expect(said(load(meter, { 'meter.csv': file }))).toContain('meter.csv:5:19  -5 is no reading');
    expect(said(load(meter))).toContain('meter.csv');
  });

  test('names what it assumes, and tells of shares that are all zero', () => {
    const zero = `[${Array(24).fill(0).join()}]`;
    const result = load(`household: { given: profile, kWhPerYear: 2000, shares: ${zero} }`);
    expect(said(result)).toContain('household.shares are all zero');
    expect(result.loaded).toBeUndefined();
  });
});

describe('carbon factors', () => {
  const carbon = (unit: string) => `carbon: { electricity: { given: series, file: grid.csv, unit: ${unit} } }`;

  test('come as one factor, or by rate', () => {
    expect(loadedOf(load('carbon: { electricity: 0.3 }')).carbon).toEqual({ given: 'constant', factor: 0.3 });
    const factors = [
      { rate: 'night', factor: 0.2 },
      { rate: 'day', factor: 0.4 },
    ];
    const text = `carbon: { electricity: { given: byRate, factors: ${JSON.stringify(factors)} } }`;
    expect(loadedOf(load(text)).carbon).toEqual({ given: 'byRate', factors });
  });

  test('come by the hour as means of a finer series, from grams too', () => {
    const file = series('2024-12-31T23:00Z', 15, 4 * 8760, (k) => 100 * (k % 4));
    const { carbon: read, inputs } = loadedOf(load(carbon('gPerKWh'), { 'grid.csv': file }));
    if (read?.given !== 'byHour') throw new Error('not by the hour');
    // 0, 100, 200, 300 g in the quarters: 150 g on the mean
    expect(read.factors.every((factor) => Math.abs(factor - 0.15) < 1e-15)).toBe(true);
    expect(inputs.find(({ file: name }) => name === 'grid.csv')?.role).toBe('carbonFactors');
  });

  test('of a series are refused outside what is possible, and where they do not hold the year', () => {
    const grams = series('2024-12-31T23:00Z', 60, 8760, () => 300);
    expect(said(load(carbon('kgPerKWh'), { 'grid.csv': grams }))).toContain('300 is no factor');
    const short = series('2024-12-31T23:00Z', 60, 3000, () => 300);
    expect(said(load(carbon('gPerKWh'), { 'grid.csv': short }))).toContain('the factor series does not reach');
  });
});

describe('a change of supplier', () => {
  const dear = tariffText.replace('Test tariff', 'Dear').replace('0.2', '0.4').replace('0.3', '0.6');
  const change = (from: string, name = '') =>
    `tariffs: [{ ${name}supplies: [{ file: tariff.yaml }, { file: dear.yaml, from: ${from} }] }]`;
  const files = { 'dear.yaml': dear };

  test('prices each day by the tariff in force', () => {
    const [tariff] = loadedOf(load('', files, { tariffs: change('07-01') })).tariffs;
    expect(tariff?.prepared.price[stepAt(berlin, '2025-06-30T23:00+02:00')]).toBe(0.2);
    expect(tariff?.prepared.price[stepAt(berlin, '2025-07-01T00:00+02:00')]).toBe(0.4);
    expect(tariff).toMatchObject({ name: 'Test tariff, then Dear', file: 'tariff.yaml, then dear.yaml' });
  });

  test('may have a name of its own', () => {
    const [tariff] = loadedOf(load('', files, { tariffs: change('07-01', 'name: Switch in summer, ') })).tariffs;
    expect(tariff?.name).toBe('Switch in summer');
    expect(tariff?.prepared.name).toBe('Switch in summer');
  });

  test('to the same tariff changes nothing', () => {
    const tariffs = `tariffs: [tariff.yaml, { supplies: [{ file: tariff.yaml }, { file: tariff.yaml, from: 05-17 }] }]`;
    const [whole, halves] = loadedOf(load('', {}, { tariffs })).tariffs.map(({ prepared }) =>
      bill(prepared, steadyUse(berlin)),
    );
    // sums of 8760 hours in another order
    expect(halves?.total).toBeCloseTo(whole?.total ?? Number.NaN, 7);
    expect(halves?.byRate.night?.kWh).toBeCloseTo(whole?.byRate.night?.kWh ?? Number.NaN, 7);
  });

  test('tells of dates that do not go, with the place in the scenario', () => {
    const twice = load('', files, { tariffs: change('2024-07-01') });
    expect(said(twice)).toContain('house.yaml:21:');
    expect(said(twice)).toContain(
      'tariffs[0].supplies[1].from is 2024-07-01; allowed is a date of the calendar year 2025',
    );
    expect(said(load('', files, { tariffs: change('02-30') }))).toContain('02-30, a date that does not exist');
  });

  test('tells of a fault of any of its files', () => {
    const result = load('', { 'dear.yaml': 'name: x\n' }, { tariffs: change('07-01') });
    expect(said(result)).toContain('dear.yaml');
    expect(result.loaded).toBeUndefined();
    expect(said(load('', {}, { tariffs: change('07-01') }))).toContain(
      'named in house.yaml under tariffs[0].supplies[1].file',
    );
  });

  test('gives set points and carbon the rates of all its suppliers', () => {
    const byRate = (rates: string[]) =>
      `carbon: { electricity: { given: byRate, factors: [${rates.map((rate) => `{ rate: ${rate}, factor: 0.2 }`).join()}] } }`;
    const evening = { 'dear.yaml': dear.replace('night', 'evening') };
    expect(load(byRate(['night', 'evening', 'day']), evening, { tariffs: change('07-01') }).problems).toEqual([]);
    const lacking = load(byRate(['night', 'day']), evening, { tariffs: change('07-01') });
    expect(said(lacking)).toContain("lack the rate 'evening'");
  });
});

describe('tariffs named beside the scenario', () => {
  const other = tariffText.replace('Test tariff', 'Other');

  test('come after its own', () => {
    const { tariffs } = loadedOf(load('', { 'other.yaml': other }, { further: ['other.yaml'] }));
    expect(tariffs.map(({ name }) => name)).toEqual(['Test tariff', 'Other']);
  });

  test('are left out where they are one of its own, or named twice', () => {
    const further = ['copy.yaml', 'other.yaml', 'other.yaml'];
    const { tariffs } = loadedOf(load('', { 'other.yaml': other, 'copy.yaml': tariffText }, { further }));
    expect(tariffs.map(({ file }) => file)).toEqual(['tariff.yaml', 'other.yaml']);
  });

  test('are told of like its own: faults, currency, taxes', () => {
    expect(said(load('', {}, { further: ['nix.yaml'] }))).toContain('nix.yaml');
    const pounds = { 'other.yaml': other.replace('EUR', 'GBP') };
    expect(said(load('', pounds, { further: ['other.yaml'] }))).toContain('other.yaml:2:11  currency is GBP');
    const taxed = { 'other.yaml': `${other}pricesStated: withTax\n` };
    expect(said(load('', taxed, { further: ['other.yaml'] }))).toContain(
      'other.yaml:6:15  warning: the prices of this tariff hold the taxes',
    );
  });
});
