import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { hourColumns } from '../../../src/report/hourColumns.ts';
import { hourlyCsv } from '../../../src/report/hourlyCsv.ts';
import type { Answer } from '../../../src/scenario/answer/answer.ts';
import { demoAnswer, HOT_WATER, WITH_MASS } from './demoAnswer.ts';

const plain = demoAnswer();
const namesOf = (answer: Answer) => hourColumns(answer).map(({ name }) => name);

/** The CSV as a reader sees it: header and rows of text. */
function tableOf(answer: Answer): { names: string[]; rows: string[][] } {
  const [names, ...rows] = Papa.parse<string[]>([...hourlyCsv(answer)].join(''), { skipEmptyLines: true }).data;
  return { names: names!, rows };
}

describe('the hourly CSV', () => {
  const { names, rows } = tableOf(plain);
  const column = (name: string) => names.findIndex((each) => each.startsWith(`${name} [`));

  it('has a row an hour in order, all as wide as the header', () => {
    expect(rows.length).toBe(8760);
    expect(rows.every((row) => row.length === names.length)).toBe(true);
    expect(rows[0]!.slice(0, 2)).toEqual(['2025-01-01T00:00+01:00', '2025-01-01T00:00+01:00']);
    const instants = rows.map((row) => Date.parse(row[0]!));
    expect(instants.slice(1).every((instant, i) => instant - instants[i]! === 3_600_000)).toBe(true);
    expect(rows.every((row, i) => Date.parse(row[1]!) === instants[i])).toBe(true);
  });

  it('has every number in full precision', () => {
    for (const { name, values, blank } of hourColumns(plain)) {
      const at = column(name);
      const wrong = rows.filter((row, hour) => (blank?.(hour) ? row[at] !== '' : Number(row[at]) !== values[hour]));
      expect(wrong.length, name).toBe(0);
    }
  });

  it('leaves flow temperature and capacity blank where the rooms ask for no heat, and only there', () => {
    const quiet = rows.filter((_, hour) => plain.columns.spaceHeatNeed[hour] === 0);
    expect(quiet.length).toBeGreaterThan(100);
    expect(quiet.every((row) => row[column('flowTemperature')] === '' && row[column('capacity')] === '')).toBe(true);
    const asked = rows.filter((_, hour) => plain.columns.spaceHeatNeed[hour]! > 0);
    expect(asked.every((row) => Number(row[column('flowTemperature')]) > 20)).toBe(true);
  });

  it('has the price and the rate of the first tariff, before tax', () => {
    expect(names).toContain('price [EUR/kWh]');
    // The flat tariff of the demo asks 0.29 EUR/kWh before tax at all hours.
    expect(new Set(rows.map((row) => row[column('price')]))).toEqual(new Set(['0.29']));
    expect(new Set(rows.map((row) => row[names.indexOf('rate')]))).toEqual(new Set(['all hours']));
  });

  it('marks the hours that the totals count', () => {
    const counted = (name: string) => rows.filter((row) => row[column(name)] === '1').length;
    const { hours } = plain.totals;
    expect(counted('cycling')).toBe(hours.cycling);
    expect(counted('cycling')).toBeGreaterThan(0);
    expect(counted('belowLowestFlow')).toBe(hours.belowLowestFlow);
    expect(counted('outsideMap')).toBe(hours.outsideMap);
    expect(counted('flowAboveLimit')).toBe(hours.flowAboveLimit);
  });

  it('comes in pieces that are small beside the whole, the same each time', () => {
    const pieces = [...hourlyCsv(plain)];
    const whole = pieces.join('');
    expect(Math.max(...pieces.map((piece) => piece.length))).toBeLessThan(whole.length / 10);
    expect([...hourlyCsv(plain)].join('')).toBe(whole);
    expect(whole.endsWith('\n')).toBe(true);
    expect(whole).not.toContain('\r');
  });
});

describe('the columns of the hourly CSV', () => {
  it('are those of what the run has', () => {
    const withWater = namesOf(demoAnswer(HOT_WATER));
    const withMass = namesOf(demoAnswer(WITH_MASS));
    const plainNames = namesOf(plain);
    expect(withWater.filter((name) => !plainNames.includes(name)).sort()).toEqual([
      'backupWaterHeat',
      'cylinderLoss',
      'cylinderTemperature',
      'heatPumpWaterElectricity',
      'heatPumpWaterHeat',
      'hotWaterServed',
      'hotWaterShare',
      'hotWaterShort',
    ]);
    expect(withMass.filter((name) => !plainNames.includes(name)).sort()).toEqual([
      'indoorTemperature',
      'massTemperature',
      'unlimitedNeed',
    ]);
    expect(new Set(withWater).size).toBe(withWater.length);
  });

  it('hold every column of the simulation in one run or another', () => {
    const boiler: [string, string] = [
      'backup:\n  source: electric\n  power: 6\n',
      'backup:\n  source: boiler\n  power: 6\n  efficiency: 0.9\n  fuel: { kind: naturalGas, price: 0.1 }\n',
    ];
    const all = namesOf(demoAnswer(HOT_WATER, WITH_MASS, boiler));
    const { hours, marks, ...columns } = plain.columns;
    expect(Object.keys(columns).filter((name) => !all.includes(name))).toEqual([]);
  });
});

describe('text in the hourly CSV', () => {
  const withRate = (name: string): Answer => {
    const [first, ...others] = plain.loaded.tariffs;
    const prepared = { ...first!.prepared, rateNames: [name] };
    return { ...plain, loaded: { ...plain.loaded, tariffs: [{ ...first!, prepared }, ...others] } };
  };
  const rateOf = (name: string) => tableOf(withRate(name)).rows[0]![2];

  it.each(['=1+1', '+1+1', '@x', '-x'])('cannot start a formula in a spreadsheet: %s', (name) => {
    expect(rateOf(name)).toBe(`'${name}`);
  });

  it('is kept whole with commas, quotes and line breaks made visible', () => {
    expect(rateOf('day, "dear"\nnight')).toBe('day, "dear"\\u000anight');
  });
});
