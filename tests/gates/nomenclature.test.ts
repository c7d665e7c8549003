import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { distribution } from '../../src/batch/distribution.ts';
import { rowFigures, tariffFigures } from '../../src/batch/rowColumns.ts';
import { batchHeader, summaryHeader } from '../../src/report/batchCsv.ts';
import { rankDocument } from '../../src/report/batchRankText.ts';
import { hourColumns } from '../../src/report/hourColumns.ts';
import { hourlyCsv } from '../../src/report/hourlyCsv.ts';
import { resultSchema } from '../../src/report/resultSchema.ts';
import { english } from '../../src/report/words.ts';
import { demoAnswer, HOT_WATER, WITH_MASS } from '../unit/report/demoAnswer.ts';

const page = readFileSync(new URL('../../docs/nomenclature.md', import.meta.url), 'utf8');
const BATCH = '## In a batch\n';
const sections = page.split(/^(?=## )/m);
const rows = sections
  .filter((section) => !section.startsWith(BATCH))
  .join('')
  .split('\n')
  .filter((line) => line.startsWith('| ') && !line.startsWith('| Term'))
  .map((line) =>
    line
      .slice(2, -2)
      .split(' | ')
      .map((cell) => cell.trim()),
  )
  .map(([term, symbol, unit, code, csv, json, label]) => ({ term, symbol, unit, code, csv, json, label }));
const inTicks = (text: string | undefined) => [...(text ?? '').matchAll(/`([^`]+)`/g)].map((match) => match[1]!);

const boiler: [string, string] = [
  'backup:\n  source: electric\n  power: 6\n',
  'backup:\n  source: boiler\n  power: 6\n  efficiency: 0.9\n  fuel: { kind: naturalGas, price: 0.1 }\n',
];
const answer = demoAnswer(HOT_WATER, WITH_MASS, boiler);

/** Paths of all figures below a part of the result schema: `annual.electricity.total`. */
function figuresOf(schema: z.core.$ZodType, path: string): string[] {
  if (schema instanceof z.ZodOptional) return figuresOf(schema.def.innerType, path);
  if (schema instanceof z.ZodObject) {
    return Object.entries(schema.shape).flatMap(([key, entry]) => figuresOf(entry, `${path}.${key}`));
  }
  // months have the keys of their year
  if (schema instanceof z.ZodArray) return path.endsWith('.monthly') ? [] : figuresOf(schema.def.element, `${path}[]`);
  if (schema instanceof z.ZodNumber) return [path];
  if (schema instanceof z.ZodUnion) {
    return schema.options.some((option) => option instanceof z.ZodNumber) ? [path] : [];
  }
  return [];
}

const {
  annual,
  costs,
  boiler: boilerEntry,
  breakEven,
  sensitivity,
  wholeLife,
  carbon,
  house,
  fieldStudies,
} = resultSchema.shape;
const figures = [
  ...figuresOf(annual, 'annual'),
  ...figuresOf(costs.def.element, 'costs[]'),
  ...figuresOf(boilerEntry, 'boiler'),
  ...figuresOf(breakEven, 'breakEven'),
  ...figuresOf(sensitivity, 'sensitivity'),
  ...figuresOf(wholeLife, 'wholeLife'),
  ...figuresOf(carbon, 'carbon'),
  ...figuresOf(house, 'house'),
  ...figuresOf(fieldStudies.def.element, 'fieldStudies[]'),
];

describe('the nomenclature', () => {
  it('has every column of the hourly CSV, and no other', () => {
    const [header] = hourlyCsv(answer);
    const names = header!
      .trim()
      .split(',')
      .map((name) => name.replace(/ \[.*/, ''));
    expect(names.length).toBeGreaterThan(25);
    expect(rows.flatMap(({ csv }) => inTicks(csv)).sort()).toEqual(names.sort());
  });

  it('gives each column the unit that the CSV gives it', () => {
    for (const { name, unit } of hourColumns(answer)) {
      const row = rows.find(({ csv }) => csv === `\`${name}\``)!;
      const expected = unit === '0 or 1' ? 'h' : unit.replace('EUR', 'money');
      expect(row.unit, name).toBe(expected);
    }
  });

  it('has every figure of the JSON document, and no other', () => {
    expect(figures.length).toBeGreaterThan(60);
    expect(rows.flatMap(({ json }) => inTicks(json)).sort()).toEqual([...figures].sort());
  });

  it('has one row a quantity', () => {
    const terms = rows.map(({ term }) => term);
    expect(new Set(terms).size).toBe(terms.length);
  });

  it('names labels that the report has', () => {
    const words = JSON.stringify(english, (_, value) => (typeof value === 'function' ? String(value) : value));
    const labels = rows.map(({ label }) => label!).filter((label) => label !== '');
    expect(labels.length).toBeGreaterThan(20);
    for (const label of labels) {
      for (const part of label.split(/…|: /)) expect(words, label).toContain(part.trim());
    }
  });
});

const batchRows = (sections.find((section) => section.startsWith(BATCH)) ?? '')
  .split('\n')
  .filter((line) => line.startsWith('| `'))
  .map((line) => line.slice(2, -2).split(' | '))
  .map(([name, where, unit, means]) => ({
    name: inTicks(name)[0]!,
    where: inTicks(where)[0]!,
    unit: unit!.trim(),
    means,
  }));
const namedIn = (where: string) => batchRows.filter((row) => row.where === where).map(({ name }) => name);

/** Paths of all values in a document: `bestRows[].job`. */
function pathsOf(value: unknown, path: string): string[] {
  if (Array.isArray(value)) return value.flatMap((each) => pathsOf(each, `${path}[]`));
  if (typeof value !== 'object' || value === null) return [path];
  return Object.entries(value).flatMap(([key, each]) => pathsOf(each, path === '' ? key : `${path}.${key}`));
}

describe('the nomenclature of a batch', () => {
  it('has every column of results.csv with its unit in their order, but for the axes', () => {
    const header = batchHeader({ axes: [], homes: true, tariffs: 1 }).trim().split(',');
    const written = batchRows
      .filter(({ where }) => where === 'results.csv')
      .map(({ name, unit }) => (unit === '' ? name : `${name} [${unit}]`));
    expect(header.length).toBeGreaterThan(30);
    expect(written).toEqual(header);
  });

  it('has every column of summary.csv', () => {
    expect(namedIn('summary.csv')).toEqual(summaryHeader().trim().split(','));
  });

  it('has every key of a ranking', () => {
    const spread = distribution(Float64Array.of(1, 2));
    if (spread === undefined) throw new Error('two values have a spread');
    const row = { job: 1, home: 'A', axes: [1], value: 1 };
    const values = [{ value: 1, spread }];
    const result = { spread, best: [row], worst: [row], axes: [{ axis: 'a', values }] };
    const document = rankDocument({ by: 'cost', axes: ['a'], rows: 2, unranked: 0, result }, '1');
    // the axes of a row stand under their own names
    const paths = pathsOf(document, '').map((path) => path.replace(/Rows\[\]\.axes\.a$/, 'Rows[].axes'));
    expect(namedIn('rank --json').sort()).toEqual(paths.sort());
  });

  it('gives each figure the term and the unit that it has elsewhere', () => {
    const figures = [...rowFigures.map(({ name }) => name), ...tariffFigures.map((name) => `tariff1.${name}`)];
    for (const figure of figures) {
      const { means, unit } = batchRows.find(({ name, where }) => name === figure && where === 'results.csv')!;
      expect(rows.find(({ term }) => term === means)?.unit, figure).toBe(unit);
    }
  });
});
