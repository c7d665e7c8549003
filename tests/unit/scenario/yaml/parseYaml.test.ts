import { describe, expect, test } from 'vitest';
import { parseYaml } from '../../../../src/scenario/yaml/parseYaml.ts';
import { inputOf } from '../memoryFiles.ts';

const parse = (text: string | Uint8Array) => parseYaml(inputOf('x.yaml', text));
const faultsOf = (text: string | Uint8Array) =>
  parse(text).problems.map(({ code, line, column }) => [code, line, column]);

function sound(text: string | Uint8Array) {
  const parsed = parse(text);
  if (!('yaml' in parsed)) throw new Error(JSON.stringify(parsed.problems));
  return parsed.yaml;
}

describe('a YAML file', () => {
  test('is read as YAML 1.2: times, no and leading zeros stay what they are', () => {
    expect(sound('a: 12:30\nb: no\nc: 010\nd: 2025-02-01\ne: 1e3\n').raw).toEqual({
      a: '12:30',
      b: 'no',
      c: 10,
      d: '2025-02-01',
      e: 1000,
    });
  });

  test('may be in UTF-8 with a mark, UTF-16 or Windows-1252', () => {
    const utf16 = new Uint8Array([0xff, 0xfe, ...[...'a: é'].flatMap((c) => [c.charCodeAt(0), 0])]);
    expect(sound(new Uint8Array([0xef, 0xbb, 0xbf, 0x61, 0x3a, 0x20, 0x31])).raw).toEqual({ a: 1 });
    expect(sound(utf16).raw).toEqual({ a: 'é' });
    expect(sound(new Uint8Array([0x61, 0x3a, 0x20, 0xe9])).raw).toEqual({ a: 'é' });
  });

  test('takes dangerous keys as plain keys of its own', () => {
    const raw = sound('__proto__: { polluted: 1 }\nconstructor: 2\n').raw as object;
    expect(Object.keys(raw)).toEqual(['__proto__', 'constructor']);
    expect(Object.getPrototypeOf(raw)).toBe(Object.prototype);
    expect('polluted' in {}).toBe(false);
  });

  test('may use a few references, which are values like others', () => {
    expect(sound('a: &x { b: 1 }\nc: *x\n').raw).toEqual({ a: { b: 1 }, c: { b: 1 } });
  });

  test('does not merge keys', () => {
    expect(sound('<<: { a: 1 }\n').raw).toEqual({ '<<': { a: 1 } });
  });
});

describe('places in a YAML file', () => {
  const yaml = sound('a: 1\nb:\n  c: [x, { d: 2 }]\n  e: |\n\n    35 45\n    -7 3\nf: &r\n  g: 9\nh: *r\n');

  test.each([
    [['a'], 1, 4],
    [['b', 'c', 0], 3, 7],
    [['b', 'c', 1, 'd'], 3, 15],
    [['f', 'g'], 9, 6],
    [['h', 'g'], 9, 6],
  ])('of the value at %j is %d:%d', (path, line, column) => {
    expect(yaml.place(path)).toEqual({ line, column });
  });

  test('of a missing value is the key of the section that lacks it', () => {
    expect(yaml.place(['b', 'nothing', 'deeper'])).toEqual({ line: 2, column: 1 });
  });

  test('of a key is where the key begins', () => {
    expect(yaml.keyPlace(['b', 'c', 1, 'd'])).toEqual({ line: 3, column: 12 });
  });

  test('inside a literal block are those of its lines in the file', () => {
    const place = yaml.textPlaces(['b', 'e']);
    expect(place(2, 1)).toEqual({ line: 6, column: 5 });
    expect(place(3, 4)).toEqual({ line: 7, column: 8 });
  });

  test('inside a block with an indentation indicator count the blanks that the text keeps', () => {
    const place = sound('a: |2\n    35\n  -7 3\n').textPlaces(['a']);
    expect(place(1, 3)).toEqual({ line: 2, column: 5 });
    expect(place(2, 1)).toEqual({ line: 3, column: 3 });
  });

  test('inside other texts are that of the beginning', () => {
    const place = sound('a: "35 45\\n-7 3"\n').textPlaces(['a']);
    expect(place(2, 4)).toEqual({ line: 1, column: 4 });
  });
});

describe('a file that cannot be used', () => {
  test.each([
    ['', [['file.empty', undefined, undefined]]],
    [' \n\n', [['file.empty', undefined, undefined]]],
    ['# only a comment\n', [['yaml.no-keys', 1, 1]]],
    ['- a\n- b\n', [['yaml.no-keys', 1, 1]]],
    ['just words\n', [['yaml.no-keys', 1, 1]]],
    ['a: 1\n---\nb: 2\n', [['yaml.several-documents', 2, 1]]],
    ['a: 1\n\tb: 2\n', [['yaml.syntax', 2, 1]]],
    ['a: !!binary xx\n', [['yaml.tag', 1, 4]]],
    ['a: *x\n', [['yaml.alias', 1, 4]]],
    ['a: &x [*x]\n', [['yaml.alias', 1, 8]]],
    ['? [a]\n: 1\n', [['yaml.key-not-a-word', 1, 3]]],
  ])('%j is refused with its place', (text, faults) => {
    expect(faultsOf(text)).toEqual(faults);
  });

  test('is refused for every repeated key and every bad line at once', () => {
    expect(faultsOf('a: 1\na: 2\nb: { c: 1, c: 2 }\n')).toEqual([
      ['yaml.repeated-key', 2, 1],
      ['yaml.repeated-key', 3, 12],
    ]);
    expect(faultsOf('a: @x\nb: c: d\n')).toEqual([
      ['yaml.syntax', 1, 4],
      ['yaml.syntax', 2, 4],
    ]);
  });

  test('is refused above 1 MB, unread', () => {
    const problem = parse(`a: ${'x'.repeat(1_000_000)}`).problems[0];
    expect(problem).toMatchObject({ code: 'file.too-large', allowed: '1 MB' });
  });

  test('is refused where it is no text', () => {
    expect(faultsOf(new Uint8Array([0x50, 0x4b, 3, 4, 0, 0]))).toEqual([['yaml.not-text', undefined, undefined]]);
  });

  test.each(['[', '{a: ', '- '])('is refused above 64 levels of %j, before the parser sees it', (opening) => {
    expect(faultsOf(`a: ${opening.repeat(65)}`)[0]?.[0]).not.toBe(undefined);
    expect(faultsOf(`a:\n ${opening.repeat(20_000)}`)).toEqual([['yaml.too-deep', 2, expect.any(Number)]]);
  });

  test('is refused for references by which a small file becomes a large one', () => {
    const level = (name: string, of: string) => `${name}: &${name} [${Array(9).fill(of).join(', ')}]\n`;
    const bomb = level('a', '1') + level('b', '*a') + level('c', '*b') + level('d', '*c');
    expect(faultsOf(bomb).map(([code]) => code)).toEqual(['yaml.alias']);
    expect(faultsOf(`a: &a 1\nb: [${Array(101).fill('*a').join(', ')}]\n`)).toEqual([
      ['yaml.alias', 2, expect.any(Number)],
    ]);
  });

  test('is refused quickly however many keys it has', () => {
    const text = Array.from({ length: 50_000 }, (_, i) => `k${i}: 1\n`).join('');
    expect(Object.keys(sound(text).raw as object)).toHaveLength(50_000);
  });
});

describe('advice for a syntax fault', () => {
  const hintOf = (text: string) => parse(text).problems[0]?.hint;

  test('tells of the tab, the colon and the quotes', () => {
    expect(hintOf('a: 1\n\tb: 2\n')).toMatch(/spaces/);
    expect(hintOf('name: Müller: house\n')).toMatch(/colon in quotes/);
    expect(hintOf('a: @x\n')).toMatch(/double quotes/);
  });

  test('tells how to write a table whose corner is blank', () => {
    expect(hintOf('capacity: |\n       35 45\n  -7   3 4\nb: 1\n')).toMatch(/corner/);
  });
});
