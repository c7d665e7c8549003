import fc from 'fast-check';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { type Axis, optionCount, valueIndices, valuesOfOption } from '../../src/batch/axes.ts';
import { type Change, withChanges } from '../../src/batch/changes.ts';
import { CsvRecords } from '../../src/batch/csvRecords.ts';
import { distribution } from '../../src/batch/distribution.ts';
import { homeOf, homesHeader } from '../../src/batch/homesTable.ts';
import { Ranking } from '../../src/batch/ranking.ts';
import type { Row } from '../../src/batch/row.ts';
import { batchHeader, batchLine } from '../../src/report/batchCsv.ts';
import { batchJsonLine, rowOfJsonLine } from '../../src/report/batchJson.ts';

const SEED = { seed: 20_250_101, numRuns: 200 };
const origin = { file: 'plan.yaml' };

const axes = fc.array(fc.integer({ min: 1, max: 5 }), { minLength: 1, maxLength: 4 }).map((lengths) =>
  lengths.map(
    (length, a): Axis => ({
      name: `axis ${a}`,
      values: Array.from({ length }, (_, v) => ({ label: v, changes: [{ path: [`key${a}`], value: v, origin }] })),
    }),
  ),
);

describe('the options of any axes', () => {
  it('are every combination of their values, each once', () => {
    fc.assert(
      fc.property(axes, (drawn) => {
        const count = optionCount(drawn);
        const seen = new Set(Array.from({ length: count }, (_, k) => valueIndices(drawn, k).join()));
        expect(seen.size).toBe(count);
        expect(valuesOfOption(drawn, count - 1).map(({ label }) => label)).toEqual(
          drawn.map(({ values }) => values.length - 1),
        );
      }),
      SEED,
    );
  });

  it('change their own entries, in whatever order they are applied', () => {
    fc.assert(
      fc.property(axes, fc.nat(), (drawn, n) => {
        const changes = valuesOfOption(drawn, n % optionCount(drawn)).flatMap((value) => value.changes);
        const raw = Object.freeze({ base: 1 });
        expect(withChanges(raw, changes)).toEqual(withChanges(raw, changes.toReversed()));
        expect(withChanges(raw, changes)).toMatchObject(raw);
      }),
      SEED,
    );
  });
});

const path = fc.array(fc.oneof(fc.constantFrom('a', 'b', 'c'), fc.nat({ max: 2 })), { minLength: 1, maxLength: 4 });

describe('a change of any scenario', () => {
  it('stands at its place afterwards, and leaves the original as it was', () => {
    fc.assert(
      fc.property(fc.jsonValue(), path, fc.integer(), (raw, at, value) => {
        const before = JSON.stringify(raw);
        const change: Change = { path: at, value, origin };
        const after = withChanges(raw, [change]);
        expect(at.reduce<unknown>((inner, step) => (inner as Record<string | number, unknown>)[step], after)).toBe(
          value,
        );
        expect(JSON.stringify(raw)).toBe(before);
      }),
      SEED,
    );
  });
});

const cell = fc.string({ unit: fc.constantFrom('a', 'ü', '"', ',', ';', '\n', ' ', '=', '7'), maxLength: 8 });

describe('any table of homes', () => {
  it('is read to the cells that were written, wherever its bytes are cut', () => {
    const rows = fc.array(fc.tuple(cell, cell), { minLength: 1, maxLength: 8 });
    fc.assert(
      fc.property(rows, fc.nat(), (cells, n) => {
        const text = Papa.unparse([['home', 'name'], ...cells], { newline: '\n', quotes: true });
        const bytes = new TextEncoder().encode(text);
        const cut = n % bytes.length;
        const records = new CsvRecords();
        const [first, ...found] = [
          ...records.push(bytes.subarray(0, cut)),
          ...records.push(bytes.subarray(cut)),
          ...records.end(),
        ];
        const { header } = homesHeader(first!, 'homes.csv', 'home');
        const homes = found.map((record, i) => homeOf(header!, record, i + 1));
        expect(homes.map(({ name, changes }) => [name, changes[0]?.value ?? ''])).toEqual(
          cells.map(([name, value], i) => [name.trim() || `home ${i + 1}`, value.trim()]),
        );
      }),
      SEED,
    );
  });
});

const label = fc.oneof(fc.string({ maxLength: 12 }), fc.double({ noNaN: true, noDefaultInfinity: true }), fc.boolean());
const figure = fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e9, max: 1e9 });
const row: fc.Arbitrary<Row> = fc.record({
  job: fc.integer({ min: 1 }),
  home: fc.string({ maxLength: 20 }),
  axes: fc.tuple(label),
  result: fc.record({
    currency: fc.constant('EUR'),
    figures: fc.record({ electricity: figure, h4: fc.oneof(figure, fc.constant('no heat')) }),
    tariffs: fc.array(fc.record({ name: fc.string(), total: figure, systemTotal: figure }), { maxLength: 2 }),
    warnings: fc.array(fc.constantFrom('size.far-under', 'map.outside')),
  }),
  problems: fc.constant([]),
});

describe('any row of results', () => {
  const shape = { axes: ['axis'], homes: false, tariffs: 2 };

  it('has as many cells as there are columns, none of them a formula, all on one line', () => {
    const columns = Papa.parse<string[]>(batchHeader(shape).trimEnd()).data[0]!.length;
    fc.assert(
      fc.property(row, (drawn) => {
        const line = batchLine(drawn, shape);
        expect(line.indexOf('\n')).toBe(line.length - 1);
        const cells = Papa.parse<string[]>(line.slice(0, -1), { delimiter: ',' }).data[0]!;
        expect(cells).toHaveLength(columns);
        for (const text of cells) expect(text).toMatch(/^(?:[^=+\-@\t\r]|-[\d.]+(?:e[+-]?\d+)?$|$)/);
      }),
      SEED,
    );
  });

  it('is read back from its line of JSON to the last digit', () => {
    fc.assert(
      fc.property(row, ({ problems, ...drawn }) => {
        // JSON knows no minus zero
        const plain = JSON.parse(JSON.stringify(drawn));
        const { problems: told, ...read } = rowOfJsonLine(batchJsonLine({ ...drawn, problems }, ['axis']), ['axis'])!;
        expect(read).toEqual(plain);
        expect(told.map(({ code }) => code)).toEqual(problems.map(({ code }) => code));
      }),
      SEED,
    );
  });
});

describe('any values', () => {
  const values = fc.array(figure, { minLength: 1, maxLength: 60 });

  it('have quantiles that rise, between the least and the most', () => {
    fc.assert(
      fc.property(values, (drawn) => {
        const { least, q10, q25, median, q75, q90, most } = distribution(Float64Array.from(drawn))!;
        const rising = [least, q10, q25, median, q75, q90, most];
        expect(rising).toEqual(rising.toSorted((a, b) => a - b));
        expect([least, most]).toEqual([Math.min(...drawn), Math.max(...drawn)]);
      }),
      SEED,
    );
  });

  it('are ranked as sorting all of them would rank them', () => {
    fc.assert(
      fc.property(values, fc.integer({ min: 1, max: 8 }), (drawn, top) => {
        const ranking = new Ranking('cost', [], top);
        for (const [i, value] of drawn.entries()) ranking.add({ job: i + 1, home: '', axes: [], value });
        const { best, worst } = ranking.result();
        const sorted = drawn.toSorted((a, b) => a - b);
        expect(best.map(({ value }) => value)).toEqual(sorted.slice(0, top));
        expect(worst.map(({ value }) => value)).toEqual(sorted.toReversed().slice(0, top));
      }),
      SEED,
    );
  });
});
