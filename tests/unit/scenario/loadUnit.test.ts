import { describe, expect, test } from 'vitest';
import { loadUnit } from '../../../src/scenario/loadUnit.ts';
import { carnotCop } from '../../../src/sim/carnot.ts';
import { memoryFiles } from './memoryFiles.ts';
import { unitText } from './sampleFiles.ts';

const load = (text: string, others: Record<string, string> = {}) =>
  loadUnit('unit.yaml', memoryFiles({ 'unit.yaml': text, ...others }));
const codes = (text: string, others: Record<string, string> = {}) => load(text, others).problems.map((p) => p.code);

const block = (table: string) => `|\n${table.replace(/^/gm, '      ')}`;
const unitOf = (capacity: string, cop: string, rest = '') =>
  `name: u\nmap:\n  fullLoad:\n    capacity: ${block(capacity)}\n    cop: ${block(cop)}\n${rest}`;

/** COPs that are an even share of κ at all points, so that nothing is odd about them. */
function evenCops(outdoors: readonly number[], flows: readonly number[], share = 0.45): number[][] {
  return outdoors.map((outdoor) => flows.map((flow) => share * carnotCop(outdoor, flow)));
}

function tableText(
  outdoors: readonly number[],
  flows: readonly number[],
  values: readonly (readonly number[])[],
): string {
  const rows = outdoors.map((outdoor, i) => [outdoor, ...(values[i] ?? []).map((value) => value.toFixed(4))].join(';'));
  return [`x;${flows.join(';')}`, ...rows].join('\n');
}

const outdoors = [-15, -7, 2, 7, 12];
const flows = [35, 45, 55];
const evenCapacity = outdoors.map((outdoor) => flows.map((flow) => 10 + outdoor * 0.2 - flow * 0.02));

/** A unit over the even tables, some values of them changed. */
function evenUnit(
  changes: { capacity?: [number, number, number][]; cop?: [number, number, number][]; rest?: string } = {},
) {
  const capacity = evenCapacity.map((row) => [...row]);
  const cop = evenCops(outdoors, flows);
  for (const [row, column, factor] of changes.capacity ?? []) capacity[row]![column]! *= factor;
  for (const [row, column, factor] of changes.cop ?? []) cop[row]![column]! *= factor;
  return unitOf(tableText(outdoors, flows, capacity), tableText(outdoors, flows, cop), changes.rest);
}

describe('a unit', () => {
  test('is loaded with its tables in rising order and the defaults named', () => {
    const { loaded, defaults, problems } = load(unitText);
    expect(problems).toEqual([]);
    expect(loaded?.fullLoad).toMatchObject({ outdoor: [-15, -7, 2, 7], flow: [35, 45, 55] });
    expect(loaded?.fullLoad.capacity.slice(0, 3)).toEqual([5, 4.8, 4.6]);
    expect(loaded?.fullLoad.cop.at(-1)).toBe(2.8);
    expect(loaded).not.toHaveProperty('lowestLevel');
    expect(defaults.map(({ path, value }) => [path, value])).toEqual([
      ['map.lowestLevel.given', 'share'],
      ['map.lowestLevel.capacity', 0.3],
      ['map.lowestLevel.cop', 1],
      ['map.interpolation', 'carnotShare'],
      ['defrost.method', 'included'],
      ['cycling.method', 'degradation'],
      ['cycling.coefficient', 0.25],
      ['standbyPower', 0],
      ['crankcase.power', 0],
    ]);
  });

  test('is the same whatever the order of rows and columns', () => {
    const turned = unitOf('x 45 35\n2 7 7.5\n-7 6 6.5', 'x 35 45\n-7 2.9 2.4\n2 3.6 2.9');
    const straight = unitOf('x 35 45\n-7 6.5 6\n2 7.5 7', 'x 35 45\n-7 2.9 2.4\n2 3.6 2.9');
    expect(load(turned).loaded?.fullLoad).toEqual(load(straight).loaded?.fullLoad);
    expect(load(turned).loaded).toBeDefined();
  });

  test('may give input power instead of COP', () => {
    const text = unitOf('x 35\n-7 6\n2 8', 'x 35\n-7 2\n2 -').replace('cop:', 'inputPower:');
    const one = load(`${text}`);
    expect(one.problems.map((p) => p.code)).toEqual(['map.sparse-column']);
    expect(load(text.replace('2 -', '2 2.5')).loaded?.fullLoad.cop).toEqual([3, 3.2]);
  });

  test('may keep its tables in files, whose faults are told in those files', () => {
    const text = 'name: u\nmap: { fullLoad: { capacity: { file: c.csv }, cop: { file: d.csv } } }\n';
    const good = load(text, { 'c.csv': 'x;35\n-7;6\n2;7', 'd.csv': 'x;35\n-7;2,9\n2;3,6' });
    expect(good.loaded?.fullLoad.cop).toEqual([2.9, 3.6]);
    const bad = load(text, { 'c.csv': 'x;35\n-7;6\n2;7', 'd.csv': 'x;35\n-7;2,9\n2;360' });
    expect(bad.problems).toMatchObject([{ code: 'map.out-of-range', file: 'd.csv', line: 3, column: 3 }]);
    const none = load(text, { 'c.csv': 'x;35\n-7;6\n2;7' });
    expect(none.problems).toMatchObject([
      { code: 'file.missing', file: 'd.csv', line: 2, path: 'map.fullLoad.cop.file' },
    ]);
  });

  test('may give its lowest level by a table of its own', () => {
    const rest = `  lowestLevel:\n    given: table\n    capacity: ${block('x 35\n-7 2\n2 2.5')}\n    cop: ${block('x 35\n-7 3\n2 3.7')}\n`;
    const { loaded, problems } = load(unitText + rest);
    expect(problems).toEqual([]);
    expect(loaded?.lowestLevel).toEqual({ outdoor: [-7, 2], flow: [35], capacity: [2, 2.5], cop: [3, 3.7] });
  });

  test('has gaps where the tables have them', () => {
    const text = unitOf('x 35\n-7 6\n2 -\n7 8', 'x 35\n-7 2.9\n2 3.6\n7 4.2');
    expect(load(text).loaded?.fullLoad.capacity).toEqual([6, null, 8]);
  });
});

describe('a cell in a block', () => {
  test('is told at its line and column of the unit file', () => {
    const { problems } = load(unitText.replace('A7       4.2  3.3  2.8', 'A7       4.2  330  2.8'));
    expect(problems).toMatchObject([
      { code: 'map.out-of-range', line: 15, column: 21, path: 'map.fullLoad.cop[A7/W45]', hint: 'write 3.3 for 330 %' },
    ]);
  });
});

describe('tables that do not belong together', () => {
  test('because neither or both of COP and input power are given', () => {
    expect(codes(`name: u\nmap:\n  fullLoad:\n    capacity: ${block('x 35\n-7 6\n2 7')}\n`)).toEqual([
      'map.which-second',
    ]);
    const both = unitOf('x 35\n-7 6\n2 7', 'x 35\n-7 2.9\n2 3.6', `    inputPower: ${block('x 35\n-7 2\n2 2')}\n`);
    expect(codes(both)).toEqual(['map.which-second']);
  });

  test('because of their temperatures, which are named', () => {
    const { problems } = load(unitOf('x 35 45\n-7 6 5\n2 7 6', 'x 35 55\n-7 2.9 2\n7 3.6 2.5'));
    expect(problems.map((p) => p.found)).toEqual([
      'lacks the row of 2 °C and the column of 45 °C',
      'has the row of 7 °C and the column of 55 °C more',
    ]);
  });

  test('because a column has fewer than two points', () => {
    const { problems } = load(unitOf('x 35 45\n-7 6 5\n2 7 6', 'x 35 45\n-7 2.9 -\n2 3.6 2.9'));
    expect(problems).toMatchObject([
      { code: 'map.sparse-column', path: 'map.fullLoad.cop', found: 'the column of 45 °C' },
    ]);
  });

  test('because the input is not below the capacity', () => {
    const text = unitOf('x 35\n-7 6\n2 7', 'x 35\n-7 6\n2 2').replace('cop:', 'inputPower:');
    expect(load(text).problems).toMatchObject([
      { code: 'map.input-above-capacity', line: 10, found: '6', allowed: '6' },
    ]);
  });
});

describe('a COP above the Carnot COP κ', () => {
  // κ(−7, 35) = 311.15/52 = 5.98, κ(2, 35) = 311.15/43 = 7.24 (MODEL section 6).
  test('is an error at its cell', () => {
    expect(codes(unitOf('x 35\n-7 6\n2 7', 'x 35\n-7 5.98\n2 7.23'))).toEqual([]);
    const { problems, loaded } = load(unitOf('x 35\n-7 6\n2 7', 'x 35\n-7 5.99\n2 7.24'));
    expect(problems).toMatchObject([
      { code: 'map.above-carnot', severity: 'error', line: 10, found: '5.99', allowed: '5.98' },
      { code: 'map.above-carnot', line: 11, found: '7.24', allowed: '7.24' },
    ]);
    expect(loaded).toBeUndefined();
  });

  test('counts at the lowest level too, by its share and by its table', () => {
    const share = '  lowestLevel: { given: share, cop: 2 }\n';
    const { problems } = load(unitText + share);
    // The worst is A7/W35: 2 × 4.2 = 8.4 above 8.19.
    expect(problems).toMatchObject([{ code: 'map.lowest-above-carnot', found: '2 × 4.20 at A7/W35', allowed: '8.19' }]);
    const table = `  lowestLevel:\n    given: table\n    capacity: ${block('x 35\n-7 2\n2 2')}\n    cop: ${block('x 35\n-7 6\n2 4')}\n`;
    expect(codes(unitText + table)).toEqual(['map.above-carnot']);
  });
});

describe('warnings', () => {
  test('are none for even tables', () => {
    expect(load(evenUnit()).problems).toEqual([]);
    expect(load(evenUnit({ rest: 'defrost: { method: humidity }\n' })).problems).toEqual([]);
  });

  test.each([
    [0, 'A-15'],
    [1, 'A-7'],
    [2, 'A2'],
    [3, 'A7'],
    [4, 'A12'],
  ])('name the one COP that looks mistyped, in row %d', (row, name) => {
    const { problems, loaded } = load(evenUnit({ cop: [[row, 1, 0.6]] }));
    const odd = problems.filter((p) => p.code === 'map.looks-mistyped');
    expect(odd).toMatchObject([{ severity: 'warning', path: `map.fullLoad.cop[${name}/W45]`, found: 'COP' }]);
    expect(loaded).toBeDefined();
  });

  test('name a capacity that jumps', () => {
    expect(load(evenUnit({ capacity: [[2, 0, 1.6]] })).problems).toMatchObject([
      { code: 'map.looks-mistyped', path: 'map.fullLoad.capacity[A2/W35]', found: 'capacity' },
    ]);
  });

  test('let pass what stays within 15 % of the line', () => {
    expect(load(evenUnit({ cop: [[2, 1, 0.9]] })).problems).toEqual([]);
  });

  test('name no single point where several are off', () => {
    const { problems } = load(
      evenUnit({
        cop: [
          [1, 1, 0.6],
          [3, 1, 0.6],
        ],
      }),
    );
    expect(problems.filter((p) => p.code === 'map.looks-mistyped')).toEqual([]);
  });

  test('name a COP that rises with the flow temperature', () => {
    const text = unitOf('x 35 45\n-7 6 6\n2 7 7', 'x 35 45\n-7 2.4 2.9\n2 3.6 2.9');
    expect(load(text).problems).toMatchObject([
      { code: 'map.rising-cop', path: 'map.fullLoad.cop[A-7/W45]', found: '2.90', allowed: '2.40' },
    ]);
  });

  test('tell of integrated-looking rows only where frost is found by humidity', () => {
    const sag = {
      cop: [[2, 0, 0.97] as [number, number, number]],
      capacity: [[2, 1, 0.95] as [number, number, number]],
    };
    expect(load(evenUnit(sag)).problems).toEqual([]);
    const { problems } = load(evenUnit({ ...sag, rest: 'defrost: { method: humidity }\n' }));
    expect(problems).toMatchObject([
      { code: 'map.looks-integrated', path: 'map.fullLoad.capacity[A2/W45]', allowed: '5 %' },
      { code: 'map.looks-integrated', path: 'map.fullLoad.cop[A2/W35]', allowed: '3 %' },
    ]);
    const slight = evenUnit({ cop: [[2, 0, 0.985]], rest: 'defrost: { method: humidity }\n' });
    expect(load(slight).problems).toEqual([]);
    const cold = evenUnit({ cop: [[1, 0, 0.95]], rest: 'defrost: { method: humidity }\n' });
    expect(load(cold).problems).toEqual([]);
  });

  test('tell of a lowest level above full load', () => {
    const rest = `  lowestLevel:\n    given: table\n    capacity: ${block('x 35\n-7 7\n2 2')}\n    cop: ${block('x 35\n-7 3\n2 3.7')}\n`;
    expect(load(unitText + rest).problems).toMatchObject([
      { code: 'map.lowest-above-full', severity: 'warning', found: '7', allowed: '6', line: 20 },
    ]);
  });
});
