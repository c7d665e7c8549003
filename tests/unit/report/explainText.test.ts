import { describe, expect, it } from 'vitest';
import { explainDocument } from '../../../src/report/explainDocument.ts';
import { explainText } from '../../../src/report/explainText.ts';
import { significant } from '../../../src/report/figures.ts';
import { demoAnswer, HOT_WATER, RESTING_IN_COLD, WITH_MASS } from './demoAnswer.ts';

const demo = demoAnswer();
const cold = explainDocument(demo, { hour: 318, isBeginning: true, text: '2025-01-14T06:00' }, '1');
const text = explainText(cold);

describe('the printed hour', () => {
  it.each([
    ['the demo', [], 318],
    ['a house with mass and hot water', [HOT_WATER, WITH_MASS], 319],
    ['a unit that rests', [RESTING_IN_COLD], 318],
    ['summer', [], 4692],
  ] as const)('keeps to 80 columns: %s', (_, changes, hour) => {
    const answer = demoAnswer(...changes);
    const printed = explainText(explainDocument(answer, { hour, isBeginning: false, text: '2025-01-14T06:10' }, '1'));
    for (const line of printed.split('\n')) expect([...line].length, line).toBeLessThanOrEqual(80);
  });

  it('has every figure of the document with six digits and its unit', () => {
    const lines = text.split('\n');
    for (const { figures } of cold.stages) {
      for (const { label, value, unit } of figures) {
        const end = `${significant(value)}${unit === '1' ? '' : ` ${unit}`}`;
        expect(
          lines.some((line) => line.startsWith(`  ${label} `) && line.endsWith(` ${end}`)),
          label,
        ).toBe(true);
      }
    }
  });

  it('has every formula with its section and its source', () => {
    const plain = text.replace(/\s+/g, ' ');
    const formulas = cold.stages.flatMap((stage) => stage.formulas);
    expect(formulas.length).toBeGreaterThan(15);
    for (const { section, says, source } of formulas) {
      expect(plain).toContain(`section ${section}: ${says}${source === undefined ? '' : ` (${source})`}`);
    }
  });

  it('gives a stage that has nothing to do one line', () => {
    const summer = explainText(explainDocument(demo, { hour: 4692, isBeginning: true, text: 'x' }, '1'));
    expect(summer).toContain('\n\nFlow temperature: No space heat is asked: nothing to do.\n\n');
    expect(summer).toContain('\n\nHot water, draw and loss: The scenario has no hot water.\n\n');
  });

  it('says so where the time asked lies within the hour', () => {
    const within = { hour: 318, isBeginning: false, text: '2025-01-14T06:40' };
    const plain = explainText(explainDocument(demo, within, '1')).replace(/\s+/g, ' ');
    expect(plain).toContain(
      '2025-01-14T06:40 lies within this hour: it is explained from its beginning at 2025-01-14T06:00+01:00.',
    );
    expect(text).not.toContain('lies within');
  });

  it('says that the JSON document holds every digit', () => {
    expect(text.replace(/\s+/g, ' ')).toContain('simulate --hourly and explain --json hold every digit');
  });

  it('names rate and price, and no price where the hour has none', () => {
    expect(text.replace(/\s+/g, ' ')).toContain(
      'On Flat (invented) the rate all hours holds at its beginning; price 0.29',
    );
    const { price, ...unpriced } = cold.hour.tariff!;
    const plain = explainText({ ...cold, hour: { ...cold.hour, tariff: unpriced } }).replace(/\s+/g, ' ');
    expect(plain).toContain('the rate all hours holds at its beginning. Figures');
    const { tariff, ...untariffed } = cold.hour;
    expect(explainText({ ...cold, hour: untariffed })).not.toContain('(invented) the');
  });

  it('makes text from files harmless', () => {
    const bad = '\u001b[31mred\u202e';
    const tariff = { ...cold.hour.tariff!, name: bad, rate: bad };
    const hour = { ...cold.hour, asked: bad, isBeginning: false, tariff };
    const inputs = [{ file: bad, role: 'scenario', sha256: 'a'.repeat(64) }];
    const printed = explainText({ ...cold, scenario: bad, heatPumpUnit: bad, hour, inputs });
    expect(printed).not.toContain('\u001b');
    expect(printed).not.toContain('\u202e');
    expect(printed.split('\\u001b[31mred\\u202e').length - 1).toBe(6);
  });
});
