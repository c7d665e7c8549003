import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { problemText } from '../../../src/core/problemText.ts';
import { checkFile } from '../../../src/scenario/checkFile.ts';
import { loadScenario } from '../../../src/scenario/loadScenario.ts';
import { loadUnit } from '../../../src/scenario/loadUnit.ts';
import { memoryFiles } from './memoryFiles.ts';
import { lumpedText, sampleFiles, scenarioText, tariffText, unitText } from './sampleFiles.ts';

const SEED = 20250201;
/** Many runs on files without a weather year; few on whole scenarios, each of which reads one. */
const MANY = { seed: SEED, numRuns: 400 };

const odd = fc.constantFrom(
  ...['0', '-1', '1e400', '-1e400', '.nan', '.inf', '1e-320', '999999999999999999999', '"', "'", '[', ']', '{', '}'],
  ...[
    '&a',
    '*a',
    '!!map',
    '|',
    '>',
    '- ',
    ': ',
    '? ',
    '#',
    '%',
    '@',
    '`',
    '\t',
    '\n',
    '\r',
    '~',
    'null',
    'true',
    '---',
  ],
  ...[
    '__proto__',
    'constructor',
    'toString',
    '<<',
    '1,5',
    '400 %',
    '12:30',
    '2025-02-30',
    '[[[[[[',
    '\u0000',
    '\ufeff',
    '\u2028',
  ],
);

/** A text with a few pieces cut out, put in, doubled or exchanged. */
function mutated(text: string): fc.Arbitrary<string> {
  const tokens = text.split(/(?<=[\s:,{}[\]])/);
  const step = fc.record({
    at: fc.nat(tokens.length - 1),
    other: fc.nat(tokens.length - 1),
    how: fc.constantFrom('cut', 'put', 'replace', 'double', 'exchange', 'nest'),
    word: odd,
  });
  return fc.array(step, { minLength: 1, maxLength: 4 }).map((steps) => {
    const words = [...tokens];
    for (const { at, other, how, word } of steps) {
      const here = words[at] ?? '';
      if (how === 'cut') words[at] = '';
      else if (how === 'put') words[at] = word + here;
      else if (how === 'replace') words[at] = word;
      else if (how === 'double') words[at] = here + here;
      else if (how === 'nest') words[at] = `${'['.repeat(other)}${here}`;
      else [words[at], words[other]] = [words[other] ?? '', here];
    }
    return words.join('');
  });
}

/** A text with single bytes changed. */
function withBytes(text: string): fc.Arbitrary<Uint8Array> {
  const bytes = new TextEncoder().encode(text);
  const change = fc.record({ at: fc.nat(bytes.length - 1), byte: fc.nat(255) });
  return fc.array(change, { minLength: 1, maxLength: 6 }).map((changes) => {
    const copy = Uint8Array.from(bytes);
    for (const { at, byte } of changes) copy[at] = byte;
    return copy;
  });
}

/** Either something was loaded, or an error tells why; every problem names its file and can be worded. */
function expectAnswer(result: { loaded?: unknown; problems: readonly Parameters<typeof problemText>[0][] }): void {
  const { loaded, problems } = result;
  expect(loaded !== undefined || problems.some((p) => p.severity === 'error')).toBe(true);
  for (const problem of problems) {
    expect(problem.file).not.toBe('');
    const text = problemText(problem);
    expect(text).not.toMatch(/undefined|\[object|\{\w+\}/);
    // biome-ignore lint/suspicious/noControlCharactersInRegex: control characters are what must not reach the terminal
    expect(text.replace('\n    →', '')).not.toMatch(/[\u0000-\u001f\u007f]/);
    const wholeFile = ['yaml.not-text', 'file.empty', 'file.missing', 'file.too-large'].includes(problem.code);
    if (!wholeFile) expect(problem.line).toBeGreaterThan(0);
  }
}

describe('whatever stands in a file, nothing is thrown and the fault has its place', () => {
  test('in a unit with words changed', () => {
    fc.assert(
      fc.property(mutated(unitText), (text) => {
        const { loaded, problems } = loadUnit('unit.yaml', memoryFiles({ 'unit.yaml': text }));
        expectAnswer({ loaded, problems });
      }),
      MANY,
    );
  });

  test('in a unit with bytes changed', () => {
    fc.assert(
      fc.property(withBytes(unitText), (bytes) => {
        const { loaded, problems } = loadUnit('unit.yaml', memoryFiles({ 'unit.yaml': bytes }));
        expectAnswer({ loaded, problems });
      }),
      MANY,
    );
  });

  test('in a table of any words', () => {
    const cell = fc.oneof(
      odd,
      fc.double().map(String),
      fc.string({ maxLength: 8 }),
      fc.constantFrom('35', '-7', 'A7', ';', ',', '\t', ' '),
    );
    fc.assert(
      fc.property(fc.array(cell, { maxLength: 40 }), fc.constantFrom(' ', ';', ',', '\t', '\n'), (cells, delimiter) => {
        const files = {
          'unit.yaml': 'name: u\nmap: { fullLoad: { capacity: { file: c }, cop: { file: c } } }\n',
          c: cells.join(delimiter),
        };
        const { loaded, problems } = loadUnit('unit.yaml', memoryFiles(files));
        expectAnswer({ loaded, problems });
      }),
      MANY,
    );
  });

  test('in a scenario whose other files are missing', () => {
    fc.assert(
      fc.property(fc.oneof(mutated(scenarioText), mutated(lumpedText)), (text) => {
        expectAnswer(loadScenario('house.yaml', memoryFiles({ 'house.yaml': text, 'tariff.yaml': tariffText })));
      }),
      MANY,
    );
  });

  test('in a scenario with all its files', () => {
    fc.assert(
      fc.property(fc.oneof(mutated(scenarioText), mutated(lumpedText)), (text) => {
        expectAnswer(loadScenario('house.yaml', memoryFiles(sampleFiles({ 'house.yaml': text }))));
      }),
      { seed: SEED, numRuns: 40 },
    );
  });

  test('in any bytes at all', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), (bytes) => {
        expectAnswer(loadScenario('x', memoryFiles({ x: bytes })));
        const { problems } = checkFile('x', memoryFiles({ x: bytes }));
        for (const problem of problems) expect(problemText(problem)).not.toMatch(/undefined|\[object/);
      }),
      MANY,
    );
  });
});

describe('large and deep files end quickly in a problem', () => {
  test.each([
    ['brackets', `a: ${'['.repeat(300_000)}`, 'yaml.too-deep'],
    ['indentation', Array.from({ length: 1000 }, (_, i) => `${' '.repeat(i)}a:`).join('\n'), 'yaml.too-deep'],
    ['list marks', '- '.repeat(300_000), 'yaml.too-deep'],
    ['references', `a: &a x\nb: [${'*a, '.repeat(100_000)}]`, 'yaml.alias'],
    ['unknown keys', Array.from({ length: 50_000 }, (_, i) => `k${i}: 1`).join('\n'), 'entry.unknown-key'],
    ['wrong entries', `name: [${'1, '.repeat(300_000)}]`, 'entry.wrong-kind'],
  ])('of %s', (_, text, code) => {
    const { problems } = loadScenario('x', memoryFiles({ x: text }));
    expect(problems.map((p) => p.code)).toContain(code);
    expect(problems.length).toBeLessThanOrEqual(100);
  });

  test('of table rows', () => {
    const files = {
      'unit.yaml': 'name: u\nmap: { fullLoad: { capacity: { file: c }, cop: { file: d } } }\n',
      c: `x;35\n${'1;2\n'.repeat(20_000)}`,
      d: `x;35\n${'1;2\n'.repeat(30_000)}`,
    };
    const { problems } = loadUnit('unit.yaml', memoryFiles(files));
    expect(problems.map((p) => p.code)).toEqual(expect.arrayContaining(['map.repeated', 'map.more', 'file.too-large']));
  });
});
