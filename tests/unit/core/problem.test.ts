import { describe, expect, test } from 'vitest';
import { hasErrors, type Problem, shown, visibleText } from '../../../src/core/problem.ts';
import { problemCatalogue } from '../../../src/core/problems/catalogue.ts';
import { problemCure, problemSentence, problemText } from '../../../src/core/problemText.ts';

describe('text from a file in a message', () => {
  test('is cut to the length allowed, the cut marked', () => {
    expect(shown('a'.repeat(60))).toBe('a'.repeat(60));
    expect(shown('a'.repeat(61))).toBe(`${'a'.repeat(59)}…`);
    expect(shown('abcdef', 4)).toBe('abc…');
    expect([...shown('b'.repeat(10_000))]).toHaveLength(60);
  });

  test('may be anything', () => {
    expect([shown(1.5), shown(null), shown(undefined), shown(true), shown(['a', 'b'])]).toEqual([
      '1.5',
      'null',
      'undefined',
      'true',
      'a,b',
    ]);
  });

  test('shows what would not be seen, or would move the cursor or turn the line about', () => {
    expect(visibleText('a\u001b[31mb')).toBe('a\\u001b[31mb');
    expect(visibleText('a\r\n\tb\u0000')).toBe('a\\u000d\\u000a\\u0009b\\u0000');
    for (const code of [0x7f, 0x85, 0x9f, 0x200e, 0x200f, 0x2028, 0x2029, 0x202a, 0x202e, 0x2066, 0x2069, 0xfeff]) {
      expect(visibleText(String.fromCharCode(code))).toBe(`\\u${code.toString(16).padStart(4, '0')}`);
    }
  });

  test('leaves letters and signs of all languages as they are', () => {
    const text = 'Außentemperatur °C, 気温, “−5” … 🙂';
    expect(visibleText(text)).toBe(text);
  });

  test('is cut after it was made visible, so that no message grows beyond its length', () => {
    expect(shown('\u0000'.repeat(100))).toHaveLength(60);
  });
});

const problem: Problem = {
  code: 'entry.out-of-range',
  severity: 'error',
  file: 'house.yaml',
  line: 14,
  column: 11,
  path: 'heatPump.share',
  found: '4',
  allowed: 'a share lies between 0 and 1',
};

describe('a problem as text', () => {
  test('says where, what, and on the next line what to do', () => {
    const [first = '', second = '', ...more] = problemText(problem).split('\n');
    expect(first).toMatch(/^house\.yaml:14:11 {2}heatPump\.share .*4.*a share lies between 0 and 1/);
    expect(second).toBe(`    → ${problemCure(problem)}`);
    expect(more).toEqual([]);
    expect(first).toContain(problemSentence(problem));
  });

  test('leaves out of its place what is not known', () => {
    const { line, column, ...ofFile } = problem;
    expect(problemText(ofFile)).toMatch(/^house\.yaml {2}/);
    expect(problemText({ ...ofFile, line: 3 })).toMatch(/^house\.yaml:3 {2}/);
  });

  test('marks a warning', () => {
    expect(problemText({ ...problem, severity: 'warning' })).toMatch(/^house\.yaml:14:11 {2}warning: heatPump/);
  });

  test('takes the problem’s own hint before the advice of its kind', () => {
    expect(problemCure({ ...problem, hint: 'write 4 for 400 %' })).toBe('write 4 for 400 %');
    expect(problemText({ ...problem, hint: 'write 4' }).split('\n')[1]).toBe('    → write 4');
  });

  test('makes harmless whatever came from a file, wherever it stands', () => {
    const bad = '\u001b[31m\u202e';
    const text = problemText({ ...problem, file: bad, path: bad, found: bad, allowed: bad, hint: bad });
    // the two lines of the text itself are the only control character left
    expect(text.split('\n')).toHaveLength(2);
    expect(text).not.toContain('\u001b');
    expect(text).not.toContain('\u202e');
    expect(text.split('\\u001b[31m\\u202e').length - 1).toBeGreaterThanOrEqual(4);
  });

  test('leaves no place of a template open, in any kind of problem', () => {
    const kinds = Object.entries(problemCatalogue);
    expect(kinds.length).toBeGreaterThan(100);
    for (const [code, { says, cure }] of kinds) {
      for (const template of [says, cure]) {
        const names = [...template.matchAll(/\{(\w*)\}/g)].map(([, name]) => name);
        expect(
          names.filter((name) => !['path', 'found', 'allowed', 'unit'].includes(name ?? '')),
          code,
        ).toEqual([]);
      }
      expect(`${says} ${cure}`, code).not.toMatch(/\s$|\.\.|\bundefined\b/);
    }
  });
});

test('errors stop the work, warnings do not', () => {
  expect(hasErrors([])).toBe(false);
  expect(hasErrors([{ ...problem, severity: 'warning' }])).toBe(false);
  expect(hasErrors([{ ...problem, severity: 'warning' }, problem])).toBe(true);
});
