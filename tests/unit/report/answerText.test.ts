import { describe, expect, it } from 'vitest';
import { answerSentences } from '../../../src/report/answerSentences.ts';
import { answerText } from '../../../src/report/answerText.ts';
import { resultDocument } from '../../../src/report/resultDocument.ts';
import type { ResultDocument } from '../../../src/report/resultSchema.ts';
import { english } from '../../../src/report/words.ts';
import { demoAnswer } from './demoAnswer.ts';

const demo = resultDocument(demoAnswer(), '1');

/** The demo's document with figures that are easy to read in a sentence. */
function documentWith(annual: Partial<ResultDocument['annual']>, others: Partial<ResultDocument> = {}): ResultDocument {
  const energies = {
    heatPumpHeat: 9000,
    backupHeat: 1000,
    backupWaterHeat: 0,
    backupHours: 120,
    unmetHeat: 0,
    unmetHours: 0,
    electricity: { heatPump: 3000, backup: 1000, circulation: 0, standby: 0, total: 4000 },
    seasonalFactor: { h2: 3, h3: 2.5, h4: 2.5 },
  };
  return { ...demo, annual: { ...demo.annual, ...energies, ...annual }, ...others };
}

const costs = [
  { tariff: 'Flat', systemTotal: 1200, boilerTotal: 1500, saving: 300, currency: 'EUR' },
  { tariff: 'Night', systemTotal: 1100, boilerTotal: 1490, saving: 390, currency: 'EUR' },
].map((cost, i) => ({ ...demo.costs[i]!, ...cost }));

const said = (document: ResultDocument) => answerSentences(document, english).join(' ').replaceAll('\u202f', ' ');

describe('the answer in sentences', () => {
  it('says what is used, what is given, and what the seasonal factor means', () => {
    expect(said(documentWith({}))).toContain(
      'would use 4 000 kWh of electricity for 10 000 kWh of heat: a seasonal factor H4 of 2.50, so each kWh bought gives 2.50 kWh of heat.',
    );
  });

  it('counts the fuel of a hybrid beside its electricity', () => {
    expect(said(documentWith({ fuel: 1500 }))).toContain('4 000 kWh of electricity and 1 500 kWh of fuel for');
  });

  it('says how long and how much the backup gives, and of that for hot water', () => {
    expect(said(documentWith({}))).toContain(
      'would run in 120 hours and give 1 000 kWh, and no heat would be missing.',
    );
    expect(said(documentWith({ backupWaterHeat: 200 }))).toContain('give 1 000 kWh, 200 kWh of it for hot water');
    expect(said(documentWith({ backupHours: 1, backupHeat: 0.2 }))).toContain('give less than 1 kWh');
    expect(said(documentWith({ backupHours: 0, backupHeat: 0 }))).toContain('The backup would never run');
  });

  it('says what the rooms do not get', () => {
    expect(said(documentWith({ unmetHours: 30, unmetHeat: 45.4 }))).toContain(
      '; 45 kWh that the rooms need would be missing.',
    );
    expect(said(documentWith({ unmetHours: 1, unmetHeat: 0.1 }))).toContain('; less than 1 kWh that the rooms need');
  });

  it('says the cost on each tariff and compares the first with the boiler', () => {
    const { boiler } = demo;
    const text = said(documentWith({}, { costs, boiler }));
    expect(text).toContain(
      'would cost 1 200 EUR on Flat and 1 100 EUR on Night a year; the boiler for the same house 1 500 EUR, so on Flat the heat pump saves 300 EUR.',
    );
    const dearer = costs.map((cost) => ({ ...cost, boilerTotal: 1000, saving: -200 }));
    expect(said(documentWith({}, { costs: dearer, boiler }))).toContain('so on Flat the heat pump costs 200 EUR more.');
  });

  it('names the cheapest and the dearest of many tariffs', () => {
    const many = [900, 1300, 700, 1000, 1100].map((systemTotal, i) => ({ ...costs[0]!, systemTotal, tariff: `T${i}` }));
    expect(said(documentWith({}, { costs: many }))).toContain(
      'would cost from 700 EUR on T2 to 1 300 EUR on T1 a year',
    );
  });

  it('leaves the comparison out where there is no boiler, and the cost where there is no tariff', () => {
    const alone = costs.map(({ boilerTotal, saving, ...cost }) => cost);
    const { boiler, ...withoutBoiler } = documentWith({}, { costs: alone });
    expect(said(withoutBoiler)).toContain('a year. It would emit');
    expect(said({ ...withoutBoiler, costs: [] })).not.toContain('EUR');
    const boilerOnly = documentWith({}, { costs: [], boiler: { ...demo.boiler!, total: 1234 } });
    expect(said(boilerOnly)).toContain('The boiler for the same house would cost 1 234 EUR a year.');
  });

  it('says the carbon of both, or why it is not known', () => {
    const carbon = (heatPump: ResultDocument['carbon']['heatPump'], boiler: ResultDocument['carbon']['boiler']) =>
      said(documentWith({}, { carbon: { heatPump, boiler } }));
    expect(carbon(1200, 3000)).toContain('It would emit 1 200 kg of carbon dioxide, the boiler 3 000 kg.');
    expect(carbon(1200, 'no boiler')).toContain('It would emit 1 200 kg of carbon dioxide.');
    expect(carbon('no factor', 3000)).toContain('Its carbon dioxide is not known');
    expect(carbon('not asked', 'not asked')).not.toContain('carbon');
  });

  it('says so where no heat is given at all', () => {
    const none = documentWith({
      heatPumpHeat: 0,
      backupHeat: 0,
      backupHours: 0,
      seasonalFactor: { h2: 'no heat', h3: 'no heat', h4: 'no heat' },
    });
    expect(said(none)).toContain('No heat would be given in the year');
  });

  it('is two to four sentences long', () => {
    for (const document of [
      demo,
      documentWith({}, { costs: [], carbon: { heatPump: 'not asked', boiler: 'not asked' } }),
    ]) {
      const count = answerSentences(document, english).length;
      expect(count).toBeGreaterThanOrEqual(2);
      expect(count).toBeLessThanOrEqual(4);
    }
  });
});

describe('the printed answer', () => {
  const text = answerText(demo);

  it('keeps to 80 columns', () => {
    for (const line of text.split('\n')) expect([...line].length, line).toBeLessThanOrEqual(80);
  });

  it('has every tariff, every month and the year, with figures of the document', () => {
    const plain = text.replaceAll('\u202f', '');
    for (const month of english.months) expect(plain).toContain(`│ ${month}`);
    const row = plain.split('\n').find((line) => line.startsWith('│ Year'))!;
    const cells = row.split('│').map((cell) => cell.trim());
    const { spaceHeatNeed, heatPumpHeat, backupHeat, electricity, seasonalFactor } = demo.annual;
    const whole = [spaceHeatNeed, heatPumpHeat, backupHeat, electricity.total].map((value) => value.toFixed(0));
    expect(cells.slice(2, 7)).toEqual([...whole, Number(seasonalFactor.h4).toFixed(2)]);
    // once with the bill, once with the heating's part of it
    expect(plain.split('\n').filter((line) => /^│ (Flat|Night rate|Three bands|Half-hourly)/.test(line)).length).toBe(
      8,
    );
  });

  it('shows warnings with their remedy, and no heading where there are none', () => {
    expect(text).not.toContain(english.headings.warnings);
    const warnings = [{ code: 'x', text: 'The unit is small.', remedy: 'Take a larger one.' }];
    const warned = answerText({ ...demo, warnings });
    expect(warned).toContain('! The unit is small.\n  → Take a larger one.');
  });

  it('names defaults by section, files with the beginning of their hash, and how the weather was understood', () => {
    expect(text).toMatch(/\nflowTemperature: exponent = 1\.3; lowestFlow = 25 °C\n/);
    for (const { file, sha256 } of demo.inputs) expect(text).toContain(`${sha256.slice(0, 12)}  ${file}`);
    expect(text.replace(/\s+/g, ' ')).toContain('a stamp marks the beginning of its step');
    const mended = { ...demo.weather, repairs: [{ quantity: 'temperature', hours: 3, longest: 2, held: 0 }] };
    expect(answerText({ ...demo, weather: mended }).replace(/\s+/g, ' ')).toContain(
      '3 hours of temperature interpolated',
    );
  });

  it('ends with its cautions', () => {
    const end = text.trimEnd().split('\n\n').at(-1)!.replaceAll('\n', ' ');
    expect(end).toContain('an estimate and no guarantee');
    expect(end).toContain('refrigerant work need licensed people');
    expect(end).toContain('hot-water hygiene');
  });

  it('says its currency once where all tariffs share it, and in each cell where they do not', () => {
    expect(text).toContain('Cost of a year on each tariff, EUR');
    const mixed = [{ ...costs[0]! }, { ...costs[1]!, currency: 'CHF' }];
    const both = answerText({ ...demo, costs: mixed }).replaceAll('\u202f', '');
    expect(both).toContain('1200 EUR │');
    expect(both).toContain('1100 CHF │');
    expect(both).not.toContain('each tariff, ');
  });

  it('shows demand charges and credits only where there are any', () => {
    const names = [english.columns.demand, english.columns.credits];
    for (const name of names) expect(text).not.toContain(name);
    const charged = answerText({ ...demo, costs: [{ ...costs[0]!, demand: 50, credits: 20 }] });
    for (const name of names) expect(charged).toContain(name);
    expect(charged).toContain('−20');
  });

  it('makes text from files harmless', () => {
    const bad = '\u001b[31mred\u202e';
    const document = {
      ...demo,
      scenario: bad,
      heatPumpUnit: bad,
      costs: [{ ...costs[0]!, tariff: bad }],
      warnings: [{ code: 'x', text: bad, remedy: bad }],
      assumptions: [{ path: bad, text: bad }],
      weather: { ...demo.weather, file: bad },
      inputs: [{ file: bad, role: 'scenario', sha256: 'a'.repeat(64) }],
    };
    const printed = answerText(document);
    expect(printed).not.toContain('\u001b');
    expect(printed).not.toContain('\u202e');
    expect(printed.split('\\u001b[31mred\\u202e').length - 1).toBeGreaterThanOrEqual(9);
  });
});
