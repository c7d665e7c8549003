import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { significant } from '../../../src/report/figures.ts';

describe('a figure with six significant digits', () => {
  it('has fewer where fewer are all it has', () => {
    expect([20, 0.29, 0, 101325, -13.2].map(significant)).toEqual(['20', '0.29', '0', '101325', '−13.2']);
  });

  it('is rounded to six, zeros at the end included', () => {
    expect([2 / 3, 0.3 + 0.06 + 1e-9, 221.7984, -0.05780346].map(significant)).toEqual([
      '0.666667',
      '0.360000',
      '221.798',
      '−0.0578035',
    ]);
  });

  it('is written with a power of ten where it is very small or very large', () => {
    expect(significant(1.234567e-9)).toBe('1.23457·10⁻⁹');
    expect(significant(-12345678)).toBe('−1.23457·10⁷');
    expect(significant(2e-7)).toBe('2·10⁻⁷');
  });

  it('is nearer than half of the sixth digit to any number', () => {
    const law = fc.property(fc.double({ min: -1e9, max: 1e9, noNaN: true }), (value) => {
      const [digits, exponent] = significant(value).replace('−', '-').split('·10');
      const power = [...(exponent ?? '⁰')].map((sign) => '⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(sign)).map((n) => (n < 0 ? '-' : n));
      const read = Number(`${digits}e${power.join('')}`);
      // half a unit of the sixth digit, which is at most 5e-6 of the number
      expect(Math.abs(read - value)).toBeLessThanOrEqual(5.01e-6 * Math.abs(value));
    });
    fc.assert(law, { seed: 20250215 });
  });
});
