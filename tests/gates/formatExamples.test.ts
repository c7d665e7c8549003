import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { checkFile } from '../../src/scenario/checkFile.ts';
import { memoryFiles } from '../unit/scenario/memoryFiles.ts';

const EXAMPLE = /\*\*`([\w.-]+)`\*\*\n\n```(?:yaml|csv)\n([\s\S]*?)```/g;

/** Every example of the docs by the name that stands above it. */
const examples = new Map(
  [...readFileSync('docs/formats.md', 'utf8').matchAll(EXAMPLE)].map(([, name = '', text = '']) => [name, text]),
);

/** A table that ends in `…` goes on hour by hour to the end of 2025, its values over again. */
function continued(text: string): string {
  if (!text.endsWith('…\n')) return text;
  const [header = '', ...rows] = text.replace('…\n', '').trim().split('\n');
  const start = rows[0]?.split(',')[0] ?? '';
  const zone = start.endsWith('Z') ? 'Z' : '';
  const first = Date.parse(zone === '' ? `${start}Z` : start);
  const lines = [header];
  for (let at = first, i = 0; at < Date.UTC(2026, 0, 1); at += 3_600_000, i++) {
    const [, ...values] = (rows[i % rows.length] ?? '').split(',');
    lines.push([`${new Date(at).toISOString().slice(0, 16)}${zone}`, ...values].join(','));
  }
  return lines.join('\n');
}

const files = memoryFiles(Object.fromEntries([...examples].map(([name, text]) => [name, continued(text)])));

describe('the examples of the docs', () => {
  test.each([
    ['house.yaml', 'scenario'],
    ['set-back.yaml', 'scenario'],
    ['money.yaml', 'scenario'],
    ['unit.yaml', 'unit'],
    ['unit-from-files.yaml', 'unit'],
    ['unit-with-label.yaml', 'unit'],
    ['night.yaml', 'tariff'],
    ['dynamic.yaml', 'tariff'],
    ['read.yaml', 'read'],
    ['plan.yaml', 'plan'],
    ['weather.csv', 'weather'],
    ['prices.csv', 'priceSeries'],
  ])('%s is a sound %s', (name, kind) => {
    const checked = checkFile(name, files);
    expect(checked.problems).toEqual([]);
    expect(checked.kind).toBe(kind);
  });

  test('are all named above, or named by one of these', () => {
    expect([...examples.keys()].sort()).toEqual(
      ['capacity.csv', 'dynamic.yaml', 'homes.csv', 'house.yaml', 'household.csv', 'input.csv'].concat([
        'money.yaml',
        'night.yaml',
        'plan.yaml',
        'prices.csv',
        'read.yaml',
        'set-back.yaml',
        'unit-from-files.yaml',
        'unit-with-label.yaml',
        'unit.yaml',
        'weather.csv',
      ]),
    );
  });

  test('leave no block of YAML or CSV in the docs unchecked', () => {
    const blocks = readFileSync('docs/formats.md', 'utf8').match(/```(?:yaml|csv)\n/g) ?? [];
    expect(blocks).toHaveLength(examples.size);
  });
});
