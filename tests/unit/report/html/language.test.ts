import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { quotedWord } from '../../../../src/report/html/reportCommands.ts';
import { english } from '../../../../src/report/language/english/report.ts';
import { german } from '../../../../src/report/language/german/report.ts';
import { localFigures } from '../../../../src/report/language/localFigures.ts';

/** Every sentence of a language by its place; one with gaps is written with their names in them. */
function sentencesOf(words: object, place = ''): Map<string, string> {
  const named = new Proxy({}, { get: (_, name) => (typeof name === 'symbol' ? () => '{gap}' : `{${name}}`) });
  return new Map(
    Object.entries(words).flatMap(([key, value]): [string, string][] => {
      const path = `${place}${key}`;
      if (typeof value === 'function') return [[path, String(value(named))]];
      return typeof value === 'object' ? [...sentencesOf(value, `${path}.`)] : [[path, String(value)]];
    }),
  );
}

describe('the languages of the report', () => {
  const [one, other] = [sentencesOf(english), sentencesOf(german)];
  // What a warning means in plain words is needed only where its own text is in another language.
  const shared = (places: Iterable<string>) => [...places].filter((place) => !place.startsWith('plainWarnings.'));

  it('say the same things', () => {
    expect(shared(other.keys()).sort()).toEqual(shared(one.keys()).sort());
    expect(one.size).toBeGreaterThan(200);
  });

  it('have the same figures in each sentence', () => {
    const gaps = (text: string | undefined) => [...(text ?? '').matchAll(/\{\w+\}/g)].map(([gap]) => gap).sort();
    for (const place of shared(one.keys())) expect(gaps(other.get(place)), place).toEqual(gaps(one.get(place)));
  });

  it('leave no sentence of prose in the other language', () => {
    const prose = shared(one.keys()).filter((place) => (one.get(place)?.match(/[a-z]{2,} /g) ?? []).length > 2);
    expect(prose.length).toBeGreaterThan(60);
    expect(prose.filter((place) => one.get(place) === other.get(place))).toEqual([]);
  });
});

describe('the formulas of the report', () => {
  const rows = readFileSync(new URL('../../../../docs/model.md', import.meta.url), 'utf8')
    .split('\n')
    .filter((line) => /^\| \d+ /.test(line))
    .map((line) => line.slice(2, -2).split(' | '));

  it('are those of the model’s page that a simulated year rests on', () => {
    // Sections 14 and 15 are the label's seasons and what tests hold: no year rests on them.
    const needed = rows.filter(([section]) => Number.parseInt(section!, 10) <= 12);
    const written = english.formulas.map(({ section, what, source }) => [section, what, source]);
    expect(written).toEqual(needed.map((row) => row.map((cell) => cell.replaceAll("'", '’'))));
    expect(german.formulas.map(({ section }) => Number.parseInt(section, 10))).toEqual(
      english.formulas.map(({ section }) => Number.parseInt(section, 10)),
    );
  });
});

describe('figures of a language', () => {
  const de = localFigures(',');

  it('have its decimal sign, and thin spaces between thousands', () => {
    expect(de.number(12345.678, 2)).toBe('12\u202f345,68');
    expect(localFigures('.').number(12345.678, 2)).toBe('12\u202f345.68');
    expect(de.kWh(12345.6)).toBe('12\u202f346\u00a0kWh');
    expect(de.percent(0.1234, 1)).toBe('12,3\u00a0%');
    expect(de.factor('no heat')).toBe('–');
  });

  it('have a sign where they are changes, and none at zero', () => {
    expect([de.signed(5, 0), de.signed(-5, 0), de.signed(0.2, 0), de.signed(-0.2, 0)]).toEqual(['+5', '−5', '0', '0']);
  });
});

describe('a word of a command line', () => {
  it.each([
    ['data/demo/house.yaml', 'data/demo/house.yaml'],
    ["a b's", "'a b'\\''s'"],
    ['$(x)', "'$(x)'"],
    ['a\nb', "'a\\u000ab'"],
  ])('%j is written as %s', (word, written) => {
    expect(quotedWord(word)).toBe(written);
  });
});
