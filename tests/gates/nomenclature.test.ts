import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import * as z from 'zod';
import { hourColumns } from '../../src/report/hourColumns.ts';
import { hourlyCsv } from '../../src/report/hourlyCsv.ts';
import { resultSchema } from '../../src/report/resultSchema.ts';
import { english } from '../../src/report/words.ts';
import { demoAnswer, HOT_WATER, WITH_MASS } from '../unit/report/demoAnswer.ts';

const page = readFileSync(new URL('../../docs/nomenclature.md', import.meta.url), 'utf8');
const rows = page
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
