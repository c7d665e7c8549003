import { describe, expect, it } from 'vitest';
import { comparisonSection } from '../../../src/report/comparisonSection.ts';
import { resultDocument } from '../../../src/report/resultDocument.ts';
import type { ResultDocument } from '../../../src/report/resultSchema.ts';
import { english } from '../../../src/report/words.ts';
import { demoAnswer } from './demoAnswer.ts';

const demo = resultDocument(demoAnswer(), '1');
const breakEven = {
  electricityPrice: 0.4567,
  meanElectricityPrice: 0.35,
  seasonalFactor: 2.5,
  heatOverElectricity: 3.2,
};
const wholeLife = {
  ...demo.wholeLife!,
  netCapital: 8000,
  netPresentValue: -1234,
  simplePayback: 11.26,
  discountedPayback: 14.04,
};

/** The section as a person reads it, its broken lines joined. */
function section(changes: Partial<ResultDocument> = {}): string {
  const text = comparisonSection({ ...demo, breakEven, wholeLife, ...changes }, english).join('\n');
  return text.replaceAll(/[\u202f\u00a0]/g, ' ').replace(/\n(?=[^│├└┌─])/g, ' ');
}

describe('the comparison with the boiler', () => {
  it('names the tariff it stands on', () => {
    expect(section()).toContain('Against the boiler, on Flat (invented), EUR');
  });

  it('says at which price and at which factor a year costs the same', () => {
    expect(section()).toContain(
      'where the heat pump’s electricity costs 0.457 EUR/kWh on the mean (now 0.350 EUR/kWh), or where each kWh of electricity gives 2.50 kWh of heat (now 3.20).',
    );
  });

  it('says why there is no such price or factor', () => {
    expect(section({ breakEven: { ...breakEven, electricityPrice: 'not even free' } })).toContain(
      'Even with free electricity a year with the heat pump would cost more',
    );
    expect(section({ breakEven: { ...breakEven, electricityPrice: 'no electricity' } })).toContain(
      'takes no electricity',
    );
    const noFactor = section({ breakEven: { ...breakEven, seasonalFactor: 'no price' } });
    expect(noFactor).toContain('(now 0.350 EUR/kWh).');
    expect(noFactor).not.toContain('or where');
  });

  it('says what the years come to, and when the capital is paid back', () => {
    const text = section();
    expect(text).toContain('Over 20 years at 3.0 % a year: net capital 8 000 EUR, net present value −1 234 EUR.');
    expect(text).toContain('Payback: simple after 11.3 years; discounted after 14.0 years.');
    const never = section({ wholeLife: { ...wholeLife, simplePayback: 'never', discountedPayback: 'never' } });
    expect(never).toContain('Payback: simple never; discounted never within 20 years.');
    const late = section({ wholeLife: { ...wholeLife, simplePayback: 141, discountedPayback: 'never' } });
    expect(late.replace(/\s+/g, ' ')).toContain(
      'simple after 141.0 years, longer than what is looked at; discounted never',
    );
    const atOnce = section({ wholeLife: { ...wholeLife, simplePayback: 'at once', discountedPayback: 'at once' } });
    expect(atOnce).toContain('simple at once, for there is no capital to be paid back');
  });

  it('has a table of other prices: electricity down the side, fuel along the top', () => {
    const rows = demo.sensitivity!.map((row, i) => ({ ...row, annualSaving: 100 * i, netPresentValue: -100 * i }));
    const lines = section({ sensitivity: rows }).split('\n');
    const cells = (name: string) =>
      lines
        .find((line) => line.includes(name))!
        .split('│')
        .map((cell) => cell.trim())
        .slice(1, -1);
    expect(cells('fuel as now')).toEqual(['', 'fuel −20 %', 'fuel as now', 'fuel +20 %']);
    expect(cells('electricity −20 %')).toEqual(['electricity −20 %', '0 / 0', '100 / −100', '200 / −200']);
    expect(cells('electricity as now')).toEqual(['electricity as now', '300 / −300', '400 / −400', '500 / −500']);
    expect(cells('electricity +20 %')).toEqual(['electricity +20 %', '600 / −600', '700 / −700', '800 / −800']);
  });

  it('has savings alone in it where no whole life is asked for', () => {
    const { wholeLife: _, ...without } = demo;
    const sensitivity = demo.sensitivity!.map(({ netPresentValue, ...row }) => row);
    const text = comparisonSection({ ...without, sensitivity }, english).join('\n');
    expect(text).not.toContain('net present value');
    expect(text).not.toContain(' / ');
    expect(text).not.toContain('Payback');
  });

  it('is not there without a boiler or a tariff', () => {
    const { sensitivity, breakEven: _, ...alone } = demo;
    expect(comparisonSection(alone, english)).toEqual([]);
    expect(comparisonSection({ ...demo, costs: [] }, english)).toEqual([]);
  });
});
