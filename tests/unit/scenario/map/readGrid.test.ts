import { describe, expect, test } from 'vitest';
import { readGrid, type TableText } from '../../../../src/scenario/map/readGrid.ts';
import { axisNumber, cellValue } from '../../../../src/scenario/map/tableNumbers.ts';
import { capacityQuantity, copQuantity } from '../../../../src/scenario/map/tableQuantities.ts';

const source = (text: string): TableText => ({
  file: 'unit.yaml',
  path: 'map.capacity',
  text,
  place: (line, column) => ({ line, column }),
});
const read = (text: string) => readGrid(source(text), capacityQuantity);
const faults = (text: string) => read(text).problems.map(({ code, line, column }) => [code, line, column]);

/** −7 and 7 °C outdoors, 35 and 55 °C flow, however it is written. */
const grid = { outdoor: [-7, 7], flow: [35, 55], values: [6.5, 6, 9.5, null] };

describe('a table', () => {
  test.each([
    ['blanks', '     35   55\n-7   6.5  6.0\n7    9.5  -'],
    ['blanks and a corner of several words', 'outdoor \\ flow 35 55\n-7 6.5 6.0\n7 9.5 n/a'],
    ['blanks and decimal commas', 'kW 35 55\n-7 6,5 6,0\n7 9,5 –'],
    ['blanks and units', 'x 35 °C 55 °C\n-7 °C 6.5 kW 6 kW\n7 °C 9.5 kW -'],
    ['tabs', '\t35\t55\n-7\t6.5\t6.0\n7\t9.5\t'],
    ['tabs without a corner cell', '35\t55\n-7\t6.5\t6.0\n7\t9.5\t-'],
    ['semicolons', 'kW;35;55\n-7;6,5;6,0\n7;9,5;'],
    ['semicolons, one too many on each line', 'kW;35;55;\n-7;6,5;6,0;\n7;9,5;-;'],
    ['commas', ',35,55\n-7,6.5,6.0\n7,9.5,n/a'],
    ['commas and blanks', 'x,  35,  55\n-7, 6.5, 6.0\n 7, 9.5, -'],
    ['commas and quoted decimal commas', 'x,35,55\n-7,"6,5","6,0"\n7,"9,5",-'],
    ['the notation of EN 14511', 'kW W35 W55\nA-7 6.5 6\nA7 9.5 -'],
    ['true minus signs', 'kW W35 W55\nA−7 6.5 6\nA7 9.5 −'],
    ['comments and empty lines', '# kW\n\nx 35 55\n\n-7 6.5 6\n# warm\n7 9.5 -\n'],
    ['lines ending in CR LF', 'x;35;55\r\n-7;6.5;6\r\n7;9.5;-\r\n'],
    ['rows from warm to cold', 'x 35 55\n7 9.5 -\n-7 6.5 6'],
    ['columns from hot to cool', 'x 55 35\n-7 6 6.5\n7 - 9.5'],
  ])('with %s is read alike', (_, text) => {
    const result = read(text);
    expect(result.problems).toEqual([]);
    expect(result.grid).toMatchObject(grid);
  });

  test('of one flow column is read with any delimiter', () => {
    for (const text of ['35\n-7 6.5\n7 9.5', 'x 35\n-7 6.5\n7 9.5', 'x;35\n-7;6,5\n7;9,5', 'x,35\n-7,6.5\n7,9.5']) {
      expect(read(text).grid).toMatchObject({ outdoor: [-7, 7], flow: [35], values: [6.5, 9.5] });
    }
  });

  test('whose commas part cells of whole numbers is not read as decimals', () => {
    expect(read('x,35,55\n-7,6,5\n7,9,8').grid).toMatchObject({ values: [6, 5, 9, 8] });
  });

  test('keeps the place of every value through the sorting', () => {
    const { grid: found } = read('x;55;35\n7;8;9.5\n-7;6;6.5');
    expect(found?.values).toEqual([6.5, 6, 9.5, 8]);
    expect(found?.places).toEqual([
      { line: 3, column: 6 },
      { line: 3, column: 4 },
      { line: 2, column: 5 },
      { line: 2, column: 3 },
    ]);
  });

  test('in disorder is sorted with a warning at the temperature out of order', () => {
    const { problems, grid: found } = read('x 35\n-7 6\n12 9\n2 7');
    expect(problems).toMatchObject([{ code: 'map.unsorted', severity: 'warning', line: 4, column: 1 }]);
    expect(found?.outdoor).toEqual([-7, 2, 12]);
  });
});

describe('a fault in a table', () => {
  test.each([
    ['', [['map.no-table', 1, 1]]],
    ['words only', [['map.no-table', 1, 1]]],
    ['x 35 55\n-7 6 5\n7 8', [['map.ragged', 3, 1]]],
    ['x 35 35\n-7 6 5\n7 8 7', [['map.repeated', 1, 6]]],
    ['x 35\n-7 6\n-7 5', [['map.repeated', 3, 1]]],
    ['x 5 55\n-7 6 5\n7 8 7', [['map.axis', 1, 3]]],
    ['x 35 55\n-70 6 5\n7 8 7', [['map.axis', 2, 1]]],
    ['x W35 A7\n-7 6 5\n7 8 7', [['map.axis', 1, 7]]],
    ['x 35 55\n-7 6 5\nwarm 8 7', [['map.axis', 3, 1]]],
    [
      'x 35 55\n-7 6 0\n7 8 2000',
      [
        ['map.out-of-range', 2, 6],
        ['map.out-of-range', 3, 5],
      ],
    ],
    ['x 35 55\n-7 6 1.2.3\n7 8 7', [['map.not-a-number', 2, 6]]],
    ['x 35 55\n-7 6 1e999\n7 8 7', [['map.not-a-number', 2, 6]]],
  ])('%j is told at its cell', (text, found) => {
    expect(faults(text)).toEqual(found);
  });

  test('names the point, and the first of two equal temperatures', () => {
    expect(read('x 35 55\n-7 6 5\n7 8 0').problems[0]?.path).toBe('map.capacity[A7/W55]');
    expect(read('x 35\n-7 6\n2 7\n-7 5').problems.find((p) => p.code === 'map.repeated')?.allowed).toBe('line 2');
  });

  test('told five times is counted from then on', () => {
    const rows = Array.from({ length: 8 }, (_, i) => `${i} ${i + 1}000`).join('\n');
    const { problems } = read(`x 35\n${rows}`);
    expect(problems.map((p) => p.code)).toEqual([...Array(5).fill('map.out-of-range'), 'map.more']);
    // 1000 is allowed, 2000 … 8000 are not: seven, five of them listed.
    expect(problems.at(-1)?.found).toBe('2');
  });
});

describe('advice for a cell', () => {
  const hint = (cell: string, quantity = capacityQuantity) =>
    readGrid(source(`x;35\n-7;${cell}\n7;3`), quantity).problems[0]?.hint;

  test.each([
    ['6500', 'write 6.5 for 6500 W'],
    ['6500 W', 'write 6.5 for 6500 W'],
  ])('of a capacity %s: %s', (cell, text) => {
    expect(hint(cell)).toContain(text);
  });

  test.each([
    ['400 %', 'write 4 for 400 %'],
    ['345', 'write 3.45 for 345 %'],
    ['0.4', 'write 4 for 400 %'],
  ])('of a COP %s: %s', (cell, text) => {
    expect(hint(cell, copQuantity)).toContain(text);
  });
});

describe('numbers of a table', () => {
  test.each([
    ['4,5 kW', 4.5],
    ['−4.5', -4.5],
    ['-', null],
    ['N/A', null],
    ['', null],
    ['4.5.6', undefined],
    ['abc', undefined],
    ['Infinity', undefined],
  ])('the cell %j is %s', (text, value) => {
    expect(cellValue(text)).toBe(value);
  });

  test.each([
    ['35', 35, ''],
    ['W35', 35, 'W'],
    ['35 °C', 35, ''],
    ['35°C', 35, ''],
    ['A−7', -7, 'A'],
    ['a-7', -7, 'A'],
    ['L2', 2, 'L'],
    ['-7,5', -7.5, ''],
  ])('the label %j is %d', (text, value, letter) => {
    expect(axisNumber(text)).toEqual({ value, letter });
  });

  test.each(['', 'W', 'outdoor', '35/45', 'A7/W35'])('the label %j is no temperature', (text) => {
    expect(axisNumber(text)).toBeUndefined();
  });
});
