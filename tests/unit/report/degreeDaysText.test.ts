import { describe, expect, it } from 'vitest';
import { type DegreeDaysResult, degreeDaysDocument } from '../../../src/report/degreeDaysDocument.ts';
import { degreeDaysText } from '../../../src/report/degreeDaysText.ts';
import type { DegreeDayMethod } from '../../../src/weather/degreeDays.ts';

const monthly = [0, 0, 0, 1, 4, 20, 45.5, 30, 6, 0, 0, 0];
const asked = (changes: Partial<DegreeDaysResult>) =>
  degreeDaysDocument({
    version: '9.9.9',
    kind: 'heating',
    base: 15.5,
    method: 'hours',
    degreeDays: { annual: 106.5, monthly },
    weather: { file: 'a.csv', columns: ['temperature'], recognised: ['temperature: column 2'], repairs: [] },
    inputs: [],
    ...changes,
  });
/** The text with every line break as a blank. */
const flowing = (changes: Partial<DegreeDaysResult>) => degreeDaysText(asked(changes)).replace(/\s+/g, ' ');
const methods: readonly DegreeDayMethod[] = ['hours', 'mean', 'minmax', 'fourcase', 'threshold'];

describe('degree days as text', () => {
  it('names the kind and the base in its heading', () => {
    expect(flowing({})).toMatch(/^Heating degree days to 15\.5 °C, hours/);
    expect(flowing({ kind: 'cooling', base: 22 })).toMatch(/^Cooling degree days to 22\.0 °C, hours/);
  });

  it('says what counts: below the base for heating, above it for cooling', () => {
    for (const method of methods.filter((each) => each !== 'threshold' && each !== 'fourcase')) {
      expect(flowing({ method })).toContain('lies below the base');
      expect(flowing({ method, kind: 'cooling' })).toContain('lies above the base');
    }
    expect(flowing({ method: 'fourcase', kind: 'cooling' })).toContain('lies above the base');
  });

  // Eurostat, energy statistics: heating 15 and 18 °C, cooling 24 and 21 °C.
  it('names the limits of the European statistics of its kind, and no base', () => {
    expect(flowing({ method: 'threshold' })).toMatch(/^Heating degree days, threshold .* 15 °C or less .* 18 °C /);
    const cooling = flowing({ method: 'threshold', kind: 'cooling' });
    expect(cooling).toMatch(/^Cooling degree days, threshold .* 24 °C or more .* 21 °C /);
  });

  it('has lines of at most 80 columns, by any method', () => {
    for (const kind of ['heating', 'cooling'] as const) {
      const lines = methods.flatMap((method) => degreeDaysText(asked({ kind, method })).split('\n'));
      expect(lines.filter((line) => line.length > 80)).toEqual([]);
    }
  });
});

describe('degree days as JSON', () => {
  it('say their kind beside base and method', () => {
    const { kind, base, method } = asked({ kind: 'cooling', base: 22, method: 'mean' });
    expect({ kind, base, method }).toEqual({ kind: 'cooling', base: 22, method: 'mean' });
  });
});
