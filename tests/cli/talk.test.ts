import { describe, expect, it } from 'vitest';
import { mayColour } from '../../cli/mayColour.ts';
import { tellProblems } from '../../cli/tellProblems.ts';
import type { Problem } from '../../src/core/problem.ts';
import { problemText } from '../../src/core/problemText.ts';

const problems: Problem[] = [
  { code: 'file.missing', severity: 'error', file: 'a.yaml', line: 3, column: 7 },
  { code: 'file.empty', severity: 'warning', file: 'b.csv' },
];
const plain = problems.map((problem) => `${problemText(problem)}\n`).join('');

async function told(colour: boolean, which = problems): Promise<string> {
  let text = '';
  const stderr = {
    write: async (piece: string) => {
      text += piece;
    },
  };
  await tellProblems(which, { stdout: stderr, stderr, colour, version: '1' });
  return text;
}

describe('problems on standard error', () => {
  it('are two lines each: what and where, then the cure', async () => {
    expect(await told(false)).toBe(plain);
    expect(plain).toMatch(/^a\.yaml:3:7 {2}\S.*\n {4}→ .+\nb\.csv {2}warning: .+\n {4}→ .+\n$/);
  });

  it('are coloured on a terminal, and the same words are left when the colours are taken away', async () => {
    const text = await told(true);
    expect(text).toContain('\u001b[31ma.yaml');
    expect(text).toContain('\u001b[33mb.csv');
    // biome-ignore lint/suspicious/noControlCharactersInRegex: escape sequences are what this looks for
    expect(text.replace(/\u001b\[\d+m/g, '')).toBe(plain);
  });

  it('are silent when there are none', async () => {
    expect(await told(true, [])).toBe('');
  });
});

describe('colours', () => {
  it('are used on a terminal only, and not where the user asks for none', () => {
    const terminal = { isTTY: true };
    expect(mayColour(terminal, {})).toBe(true);
    expect(mayColour(terminal, { NO_COLOR: '' })).toBe(true);
    expect(mayColour(terminal, { NO_COLOR: '1' })).toBe(false);
    expect(mayColour(terminal, { TERM: 'dumb' })).toBe(false);
    expect(mayColour({}, {})).toBe(false);
  });
});
