import { describe, expect, it } from 'vitest';
import { factor, figure, kWh, money } from '../../../src/report/figures.ts';

describe('figures', () => {
  it('sets thousands apart by a narrow no-break space', () => {
    expect(figure(1234567, 0)).toBe('1\u202f234\u202f567');
    expect(figure(999.4, 0)).toBe('999');
    expect(figure(999.6, 0)).toBe('1\u202f000');
  });

  it('leaves the digits behind the decimal point together', () => {
    expect(figure(1234.56789, 4)).toBe('1\u202f234.5679');
  });

  it('writes a true minus sign, and none before a zero', () => {
    expect(figure(-12.34, 1)).toBe('−12.3');
    expect(figure(-0.04, 1)).toBe('0.0');
    expect(figure(-0, 0)).toBe('0');
  });

  it('always bears its unit', () => {
    expect(kWh(1234.5)).toBe('1\u202f235 kWh');
    expect(money(99.6, 'EUR')).toBe('100 EUR');
  });

  it('gives seasonal factors two decimals, and a dash where there is no heat', () => {
    expect(factor(3.216)).toBe('3.22');
    expect(factor('no heat')).toBe('–');
  });
});
