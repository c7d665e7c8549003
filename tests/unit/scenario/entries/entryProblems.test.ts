import { describe, expect, test } from 'vitest';
import * as z from 'zod';
import { problemText } from '../../../../src/core/problemText.ts';
import { pathOfText, pathText } from '../../../../src/scenario/entries/pathText.ts';
import { readEntries } from '../../../../src/scenario/entries/readEntries.ts';
import { number, temperature } from '../../../../src/scenario/fields.ts';
import { inputOf } from '../memoryFiles.ts';

const share = number(0, 1, { says: 'A share.' });
const schema = z.strictObject({
  name: z.string().min(1).max(20).describe('A name.'),
  outdoor: temperature(-50, 15, 'Outdoor temperature.').optional(),
  power: number(0, 50, { says: 'A power.', unit: 'kW' }).optional(),
  share: share.optional(),
  psi: number(-1, 3, { says: 'A linear loss.' }).optional(),
  hour: number(0, 23, { says: 'An hour.' }).int().optional(),
  days: z
    .array(z.enum(['mon', 'tue']))
    .min(1)
    .max(2)
    .optional(),
  time: z
    .string()
    .regex(/^\d\d:\d\d$/)
    .meta({ format: 'HH:MM' })
    .optional(),
  date: z
    .string()
    .regex(/^\d{4}-\d\d-\d\d$/)
    .meta({ format: 'YYYY-MM-DD or MM-DD' })
    .optional(),
  loss: z
    .discriminatedUnion('given', [
      z.strictObject({ given: z.literal('load'), value: number(1, 50, { says: 'Load.', unit: 'kW' }) }),
      z.strictObject({ given: z.literal('parts'), roof: share }),
    ])
    .describe('What is lost.')
    .optional(),
  limit: z.union([z.number().min(20).max(100), z.array(z.tuple([z.number(), z.number()])).min(1)]).optional(),
  on: z.boolean().optional(),
});

/** All messages for a file, each on one line. */
function messages(text: string): string[] {
  return readEntries(inputOf('x.yaml', text), schema).problems.map((problem) =>
    problemText(problem).replace('\n    → ', ' → '),
  );
}

/** The one message for a line added to a sound file. */
function message(line: string): string {
  const found = messages(`name: n\n${line}\n`);
  expect(found).toHaveLength(1);
  return found[0] ?? '';
}

describe('a value out of range', () => {
  test('is told with what was found, both ends of the range and the unit', () => {
    expect(message('outdoor: 40')).toBe(
      'x.yaml:2:10  outdoor is 40; a temperature lies between −50 and 15 °C → check the value and its unit',
    );
  });

  test.each([
    ['share: 80', 'write 0.8 for 80 %'],
    ['power: 6000', 'write 6 for 6000 W'],
    ['power: .inf', 'not a finite number'],
    ['power: .nan', 'not a finite number'],
    ['hour: 2.5', 'a whole number between 0 and 23'],
    ['hour: 1e30', 'a whole number between 0 and 23'],
    ['limit: 10', 'it lies between 20 and 100'],
  ])('%s: %s', (line, text) => {
    expect(message(line)).toContain(text);
  });

  test('gets no advice about per cent where the number is below the range', () => {
    expect(message('psi: 50')).toContain('write 0.5 for 50 %');
    expect(message('psi: -50')).not.toContain('%');
  });
});

describe('a value of the wrong kind', () => {
  test.each([
    ["power: '6,5'", "power is '6,5'", 'write 6.5, with a decimal point'],
    ["power: '6'", "power is '6'", 'write 6, as a plain number'],
    ['power: 6 kW', "power is '6 kW'", 'write 6, without a unit; the unit is kW'],
    ['share: 5 %', "share is '5 %'", 'write 0.05 for 5 %'],
    ['power: much', "power is 'much'", 'write a number; the unit is kW'],
    ['power: [6]', 'power is a list of 1', 'write one number'],
    ['loss: 5', 'loss is 5', 'write its keys on the lines below, indented'],
    ['days: mon', "days is 'mon'", 'write a list'],
    ['time: 7', 'time is 7', "write '07:00'"],
    ['limit: high', "limit is 'high'", 'or it is a list'],
    ['on: 1', 'on is 1', 'it is true or false'],
  ])('%s: %s; %s', (line, found, cure) => {
    const text = message(line);
    expect(text).toContain(found);
    expect(text).toContain(cure);
  });

  test('a number for a text is put in quotes', () => {
    expect(messages('name: 12\n')).toEqual([
      "x.yaml:1:7  name is 12; it is a text of at most 20 letters → put it in quotes: '12'",
    ]);
  });
});

describe('a text in the wrong form', () => {
  test.each([
    ['time: 7:30', "write '07:30'"],
    ['date: 2025-1-5', 'write 2025-01-05'],
    ['date: 5.1.2025', 'write 2025-01-05'],
    ['date: soon', 'it is written YYYY-MM-DD or MM-DD'],
  ])('%s: %s', (line, cure) => {
    expect(message(line)).toContain(cure);
  });
});

describe('a missing or empty value', () => {
  test('is told at the section that lacks it, with what it is', () => {
    expect(messages('power: 5\nloss:\n  given: load\n')).toEqual([
      'x.yaml:1:1  name is missing; it is a text of at most 20 letters → add it: A name.',
      'x.yaml:2:1  loss.value is missing; a power lies between 1 and 50 kW → add it: Load.',
    ]);
  });

  test('is told where the key stands without a value', () => {
    expect(message('power:')).toContain('power has no value; a power lies between 0 and 50 kW');
    expect(message('on: ""')).toContain('on has no value');
  });

  test('is not told again where a mistyped key explains it', () => {
    expect(messages('nam: n\n')).toEqual(['x.yaml:1:1  nam is not known here → perhaps name is meant']);
  });
});

describe('a choice', () => {
  test('out of a list is told with the nearest word', () => {
    expect(message('days: [monday]')).toContain("days[0] is 'monday'; it is one of mon and tue → perhaps mon is meant");
  });

  test('of a form is told with all forms', () => {
    expect(message('loss: { given: lod, value: 3 }')).toContain(
      "loss.given is 'lod'; it is one of load and parts → perhaps load is meant",
    );
    expect(message('loss: { value: 3 }')).toContain('loss.given is missing; it is one of load and parts');
  });
});

describe('an unknown key', () => {
  test('is told with the nearest known key of its own section', () => {
    expect(message('loss: { given: load, valu: 3, value: 3 }')).toContain(
      'loss.valu is not known here → perhaps value is meant',
    );
  });

  test('without a near one is told with all that are known', () => {
    expect(message('loss: { given: load, colour: red, value: 3 }')).toContain('known here: given and value');
  });

  test('of another form is told with the form that it belongs to', () => {
    expect(message('loss: { given: load, value: 3, roof: 1 }')).toContain('roof goes with given: parts');
  });

  test('may be called __proto__ or constructor', () => {
    expect(messages('name: n\n__proto__: 1\nconstructor: 2\n').map((text) => text.split('→')[0])).toEqual([
      'x.yaml:2:1  __proto__ is not known here ',
      'x.yaml:3:1  constructor is not known here ',
    ]);
  });

  test('is shown harmless and cut', () => {
    const text = message(`"\\u001b[31m${'k'.repeat(100)}": 1`);
    expect(text).toContain('\\u001b');
    expect(text).not.toContain('k'.repeat(60));
  });
});

describe('a list', () => {
  test('of the wrong length is told with both', () => {
    expect(message('days: []')).toContain('days has 0 entries; it is a list of 1 to 2 entries');
    expect(message('limit: [[1]]')).toContain('limit[0] has 1 entry; it is a list of 2 numbers');
  });
});

describe('many faults', () => {
  test('are listed at once, from top to bottom', () => {
    const lines = messages('share: 7\npower: x\nnaem: n\nhour: 30\n').map((text) => text.slice(0, 9));
    expect(lines).toEqual(['x.yaml:1:', 'x.yaml:2:', 'x.yaml:3:', 'x.yaml:4:']);
  });

  test('are cut at a hundred', () => {
    expect(messages(Array.from({ length: 5000 }, (_, i) => `key${i}: 1\n`).join(''))).toHaveLength(100);
  });
});

describe('a path', () => {
  test('is shown with points and brackets, and read back', () => {
    const path = ['house', 'days', 2, 'setPoint'];
    expect(pathText(path)).toBe('house.days[2].setPoint');
    expect(pathOfText('house.days[2].setPoint')).toEqual(path);
  });
});
