import { describe, expect, it } from 'vitest';
import { answerText } from '../../../src/report/answerText.ts';
import { resultDocument } from '../../../src/report/resultDocument.ts';
import { demoAnswer } from './demoAnswer.ts';

const demo = resultDocument(demoAnswer(), '1');

describe('what homes have shown', () => {
  it('stands in the document with place and source: UK trial 2.80 and 2.93, second hand; German new buildings 2.8', () => {
    expect(demo.fieldStudies.map(({ place, factor }) => [place, factor])).toEqual([
      ['United Kingdom', 2.8],
      ['United Kingdom', 2.93],
      ['Germany', 2.8],
    ]);
    for (const { what, source } of demo.fieldStudies) {
      expect(what).toMatch(/\w{3}/);
      expect(source).toMatch(/\w{3}/);
    }
  });

  it('stands beside the seasonal factors in two lines, with the allowance that can be entered', () => {
    const lines = answerText(demo).split('\n');
    const at = lines.findIndex((line) => line.startsWith('Field studies of homes'));
    expect(lines.slice(at - 2, at).join(' ')).toMatch(/^Seasonal factors: .* H4 .* \(with pump\)\.$/);
    expect(lines.slice(at, at + 2).join(' ')).toBe(
      'Field studies of homes found 2.8, 2.93 (United Kingdom), 2.8 (Germany): ranges to think with, not targets. heatPump.inUseAllowance takes an allowance.',
    );
  });

  it('is left out of the text where there is no factor to set it beside', () => {
    const none = { h2: 'no heat', h3: 'no heat', h4: 'no heat' } as const;
    expect(answerText({ ...demo, annual: { ...demo.annual, seasonalFactor: none } })).not.toContain('Field studies');
  });
});
