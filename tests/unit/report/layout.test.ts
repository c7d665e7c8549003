import { describe, expect, it } from 'vitest';
import { heading, table, wrapped } from '../../../src/report/layout.ts';

describe('wrapped text', () => {
  it('stays within 80 columns and loses no word', () => {
    const words = Array.from({ length: 60 }, (_, i) => 'abcdefghij'.slice(0, 1 + (i % 10)));
    const text = wrapped(words.join(' '), '! ', '  ');
    const lines = text.split('\n');
    expect(lines.length).toBeGreaterThan(3);
    for (const line of lines) expect(line.length).toBeLessThanOrEqual(80);
    // A line is broken only where the next word would not have fitted.
    lines.slice(0, -1).forEach((line, i) => {
      const next = lines[i + 1]!.slice(2).split(' ')[0]!;
      expect(line.length + 1 + next.length).toBeGreaterThan(80);
    });
    expect(lines.map((line) => line.slice(2)).join(' ')).toBe(words.join(' '));
    expect(lines[0]!.startsWith('! ')).toBe(true);
    expect(lines[1]!.startsWith('  ')).toBe(true);
  });

  it('is full at 80 columns and broken at 81', () => {
    const [forty, thirtyNine] = ['x'.repeat(40), 'y'.repeat(39)];
    expect(wrapped(`${forty} ${thirtyNine}`)).toBe(`${forty} ${thirtyNine}`);
    expect(wrapped(`${forty} ${forty}`)).toBe(`${forty}\n${forty}`);
  });

  it('gives a word that is longer than the line a line of its own', () => {
    const long = 'x'.repeat(100);
    expect(wrapped(`a ${long} b`)).toBe(`a\n${long}\nb`);
  });
});

describe('tables', () => {
  it('align every line and put figures to the right', () => {
    const text = table([
      { heading: 'Name', figures: false, cells: ['a', 'longer'] },
      { heading: 'kWh', figures: true, cells: ['1', '12345'] },
    ]);
    const lines = text.split('\n');
    expect(new Set(lines.map((line) => line.length)).size).toBe(1);
    expect(lines.some((line) => line.includes('│ a      │     1 │'))).toBe(true);
  });

  it('keep to 80 columns by breaking a long name at its blanks', () => {
    const name = Array.from({ length: 30 }, (_, i) => `word${i}`).join(' ');
    const text = table([
      { heading: 'Name', figures: false, cells: [name] },
      ...[1, 2, 3, 4].map((n) => ({ heading: `Column ${n}`, figures: true, cells: ['12345'] })),
    ]);
    expect(Math.max(...text.split('\n').map((line) => line.length))).toBe(80);
    const firstColumn = text.split('\n').map((line) => line.split('│')[1]?.trim() ?? '');
    expect(firstColumn.join(' ').replace(/ +/g, ' ')).toContain(name);
  });

  it('align with names in wide letters too', () => {
    const text = table([
      { heading: 'Name', figures: false, cells: ['東京', 'ab'] },
      { heading: 'kWh', figures: true, cells: ['1', '2'] },
    ]);
    // 東京 takes four columns of a terminal in two letters.
    const [wide, narrow] = ['東京', 'ab'].map((name) => text.split('\n').find((line) => line.includes(name))!);
    expect(narrow!.length - wide!.length).toBe(2);
  });
});

describe('headings', () => {
  it('have a line of their own length under them', () => {
    expect(heading('Abc')).toBe('Abc\n───');
  });
});
