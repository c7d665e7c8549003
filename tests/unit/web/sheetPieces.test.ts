import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parse } from 'yaml';
import { englishKeys } from '../../../src/report/language/english/keys.ts';
import { germanKeys } from '../../../src/report/language/german/keys.ts';
import { demoFiles } from '../../../web/model/demoFiles.ts';
import { keyNames } from '../../../web/model/keyNames.ts';
import { tableText } from '../../../web/model/mapTables.ts';
import { joined } from '../../../web/model/memorySource.ts';
import { isPastedTable, laidOn, listedPoints, pastedCells } from '../../../web/model/pastedTable.ts';
import { sha256 } from '../../../web/model/sha256.ts';
import { numberIn, writtenValue } from '../../../web/model/writtenValue.ts';
import { withEntry } from '../../../web/model/yamlEdit.ts';
import { hourOfClick } from '../../../web/view/hourOfClick.ts';

describe('SHA-256', () => {
  it('is that of the standard’s examples', () => {
    // FIPS 180-2, appendix B.1 and B.2
    const of = (text: string) => sha256(new TextEncoder().encode(text));
    expect(of('abc')).toBe('ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
    expect(of('abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq')).toBe(
      '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
    );
  });

  it('is that of the system for bytes of any length', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
        expect(sha256(bytes)).toBe(createHash('sha256').update(bytes).digest('hex'));
      }),
      { seed: 256 },
    );
  });
});

describe('the invented house of the page', () => {
  it.each(demoFiles)('has the bytes of data/demo: $name', ({ name, bytes }) => {
    const file = readFileSync(fileURLToPath(new URL(`../../../data/demo/${name}`, import.meta.url)));
    expect(file.equals(Buffer.from(bytes))).toBe(true);
  });
});

describe('an edit of a structured file', () => {
  it('changes one value in its place and nothing else', () => {
    const text = '# top\na: { b: 1, c: [1,2] } # behind\nd: x\n';
    expect(withEntry(text, ['a', 'b'], 2.5)).toBe('# top\na: { b: 2.5, c: [1,2] } # behind\nd: x\n');
    expect(withEntry(text, ['d'], 'a: b')).toBe('# top\na: { b: 1, c: [1,2] } # behind\nd: "a: b"\n');
  });

  it('makes sections on its way, and replaces what is no section', () => {
    expect(parse(withEntry('a:\n', ['a', 'b', 0, 'c'], 1) ?? '')).toEqual({ a: { b: [{ c: 1 }] } });
    expect(parse(withEntry('', ['a'], 'x') ?? '')).toEqual({ a: 'x' });
  });

  it('gives back any text that is written', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 40 }), fc.boolean(), (text, flow) => {
        const start = flow ? 'a: { b: old, c: 1 }\n' : 'a:\n  b: old\n  c: 1\n';
        expect(parse(withEntry(start, ['a', 'b'], text) ?? '')).toEqual({ a: { b: text, c: 1 } });
      }),
      { seed: 7 },
    );
  });

  it('leaves a text alone that cannot be parsed', () => {
    expect(withEntry('a: [1', ['a'], 2)).toBeUndefined();
  });
});

describe('a typed value', () => {
  it.each([
    ['1,5', 1.5],
    ['−12', -12],
    ['1 234,5', 1234.5],
    ['.5', 0.5],
  ])('%s is the number %d', (text, value) => {
    expect(numberIn(text)).toBe(value);
  });

  it.each(['1,2,3', '12 kW', '', '--1', 'NaN', '0x10'])('%s is no number', (text) => {
    expect(numberIn(text)).toBeUndefined();
  });

  it('is taken out when it is empty, and stays text where it is no number', () => {
    expect(writtenValue('  ', 'number')).toBeUndefined();
    expect(writtenValue('many', 'number')).toBe('many');
    expect(writtenValue('[[1, 2], [3, 4]]', 'values')).toEqual([
      [1, 2],
      [3, 4],
    ]);
  });
});

describe('a pasted table', () => {
  it('replaces the grid at its corner, and grows it elsewhere', () => {
    const pasted = pastedCells('\t35\t45\r\n-7\t5,1\t4,9\r\n');
    expect(pasted).toEqual([
      ['', '35', '45'],
      ['-7', '5,1', '4,9'],
    ]);
    expect(laidOn([['x']], pasted, [0, 0])).toEqual(pasted);
    expect(
      laidOn(
        [
          ['', '35'],
          ['2', '7'],
        ],
        [
          ['8', '9'],
          ['6', '5'],
        ],
        [1, 1],
      ),
    ).toEqual([
      ['', '35', ''],
      ['2', '8', '9'],
      ['', '6', '5'],
    ]);
    expect(
      tableText([
        ['', '35'],
        ['-7', '6,5'],
      ]),
    ).toBe('outdoor,  35\n     -7, 6.5\n');
  });
});

describe('a paste from a data sheet', () => {
  it.each([
    ['blanks, without a corner', '35 45\n-7 5,1 4,9'],
    ['blanks and units', '°C 35 45\n-7 5,1 kW 4,9 kW'],
    ['semicolons', ';35;45\n-7;5,1;4,9'],
    ['commas and blanks', 'x, 35, 45\n-7, 5,1, 4,9'],
  ])('may part its cells by %s', (_, text) => {
    const [head, row] = pastedCells(text);
    expect(head.slice(1)).toEqual(['35', '45']);
    expect(row).toEqual(['-7', '5,1', '4,9']);
  });

  it('of one column of decimal commas is one column', () => {
    expect(pastedCells('5,1\n4,9')).toEqual([['5,1'], ['4,9']]);
    expect(isPastedTable('5,1')).toBe(false);
    expect(isPastedTable('5,1\n4,9')).toBe(true);
  });

  it('may be a list of points, in any order, with COP behind the heat', () => {
    expect(listedPoints('A2/W35 8,0 3,9\nA−7/W35 6,5 2,9\nA2/W55 7,5 2,7')).toEqual([
      [
        ['', '35', '55'],
        ['−7', '6,5', ''],
        ['2', '8,0', '7,5'],
      ],
      [
        ['', '35', '55'],
        ['−7', '2,9', ''],
        ['2', '3,9', '2,7'],
      ],
    ]);
    expect(listedPoints('A7 / W35: 9.6 kW')?.[0]).toEqual([
      ['', '35'],
      ['7', '9.6'],
    ]);
    expect(listedPoints('35 45\n-7 5,1 4,9')).toBeUndefined();
  });
});

describe('names and places', () => {
  it('follow folders as a disk does', () => {
    expect(joined('a/b', '../c.csv')).toBe('a/c.csv');
    expect(joined('', './x/../y')).toBe('y');
    expect(joined('', '../y')).toBe('../y');
  });

  it('of keys are words', () => {
    expect(keyNames(englishKeys)('heatLoss')).toBe('Heat loss');
    expect(keyNames(germanKeys)('heatLoss')).toBe('Wärmeverlust');
    expect(keyNames(englishKeys)('W/m2')).toBe('W/m2');
  });

  it('of a click are the hour below it', () => {
    expect(hourOfClick(24, 109, 365)).toBe(0);
    expect(hourOfClick(24.5, 14.5, 365)).toBe(23);
    expect(hourOfClick(353.9, 15, 365)).toBe(8759);
    expect(hourOfClick(353.9, 15, 366)).toBe(8783);
    expect(hourOfClick(10, 50, 365)).toBeUndefined();
    expect(hourOfClick(100, 120, 365)).toBeUndefined();
  });
});
