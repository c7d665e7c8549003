import { describe, expect, test } from 'vitest';
import * as z from 'zod';
import { readEntries } from '../../../../src/scenario/entries/readEntries.ts';
import { number } from '../../../../src/scenario/fields.ts';
import { inputOf } from '../memoryFiles.ts';

const schema = z.strictObject({
  a: number(0, 9, { says: 'First.', unit: 'kW' }).default(3),
  b: z
    .strictObject({ c: number(0, 9, { says: 'Second.' }).default(4), d: number(0, 9, { says: 'Third.' }).default(5) })
    .prefault({}),
  list: z.array(z.strictObject({ e: number(0, 9, { says: 'Fourth.' }).default(6), f: z.string() })).default([]),
  mode: z
    .discriminatedUnion('kind', [
      z.strictObject({ kind: z.literal('x') }),
      z.strictObject({ kind: z.literal('y'), g: number(0, 9, { says: 'Fifth.', unit: 'money/kWh' }).default(7) }),
    ])
    .describe('Mode.')
    .prefault({ kind: 'y' }),
  free: z.string().optional(),
});

function used(text: string) {
  const { entries } = readEntries(inputOf('x.yaml', text), schema);
  return entries?.defaults.map(({ path, value }) => [path, value]);
}

describe('defaults used', () => {
  test('are all named where nothing is given, sections by their values', () => {
    expect(used('free: x\n')).toEqual([
      ['a', 3],
      ['b.c', 4],
      ['b.d', 5],
      ['mode.kind', 'y'],
      ['mode.g', 7],
    ]);
  });

  test('are not named where the file gives the value, even the same one', () => {
    expect(used('a: 3\nb: { c: 4, d: 5 }\nmode: { kind: x }\n')).toEqual([]);
  });

  test('inside lists and chosen forms are named by their place', () => {
    expect(used('a: 1\nb: { c: 1, d: 1 }\nlist: [{ f: k }]\nmode: { kind: y }\n')).toEqual([
      ['list[0].e', 6],
      ['mode.g', 7],
    ]);
  });

  test('carry file, unit and the sentence of the schema', () => {
    const { entries } = readEntries(inputOf('x.yaml', 'free: x\n'), schema);
    expect(entries?.defaults[0]).toEqual({ file: 'x.yaml', path: 'a', value: 3, unit: 'kW', says: 'First.' });
    expect(entries?.defaults.at(-1)).toMatchObject({ unit: 'per kWh', says: 'Fifth.' });
  });
});
