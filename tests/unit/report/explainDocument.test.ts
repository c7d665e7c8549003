import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { documentText } from '../../../src/report/documentText.ts';
import { explainDocument } from '../../../src/report/explainDocument.ts';
import { formulaWords } from '../../../src/report/explainFormulas.ts';
import { figureLabels } from '../../../src/report/explainLabels.ts';
import { type ExplainDocument, explainSchema } from '../../../src/report/explainSchema.ts';
import { englishExplained } from '../../../src/report/explainWords.ts';
import { hourlyCsv } from '../../../src/report/hourlyCsv.ts';
import type { Answer } from '../../../src/scenario/answer/answer.ts';
import { type FigureName, figureUnits } from '../../../src/sim/explain/figures.ts';
import { demoAnswer, HOT_WATER, RESTING_IN_COLD, WITH_MASS } from './demoAnswer.ts';

const explained = (answer: Answer, hour: number, text = 'asked') =>
  explainDocument(answer, { hour, isBeginning: true, text }, '1.2.3');
const figure = (document: ExplainDocument, stage: string, name: FigureName) =>
  document.stages.find((each) => each.stage === stage)?.figures.find((each) => each.name === name);

const demo = demoAnswer();
const withWater = demoAnswer(HOT_WATER, WITH_MASS);
/** 06:00 on 14 January, of a year that begins in standard time. */
const COLD_MORNING = 13 * 24 + 6;
/** Noon on 15 July. */
const SUMMER_NOON = 195 * 24 + 12;

describe('the document of an explained hour', () => {
  it.each([
    ['the demo in the cold', demo, COLD_MORNING],
    ['the demo in summer', demo, SUMMER_NOON],
    ['a house with mass and hot water', withWater, COLD_MORNING],
    ['a unit that rests', demoAnswer(RESTING_IN_COLD), COLD_MORNING],
  ])('is what its schema says: %s', (_, answer, hour) => {
    expect(explainSchema.safeParse(JSON.parse(documentText(explained(answer, hour)))).error).toBeUndefined();
  });

  it('says which hour it is of, in both times, with weekday and rate', () => {
    const { hour } = explained(demo, SUMMER_NOON, '2025-07-15T13:00');
    expect(hour).toEqual({
      asked: '2025-07-15T13:00',
      isBeginning: true,
      civilTime: '2025-07-15T13:00+02:00',
      stamp: '2025-07-15T12:00+01:00',
      weekday: 2,
      tariff: { name: 'Flat (invented)', rate: 'all hours', price: 0.29, unit: 'EUR/kWh' },
    });
  });

  it('has the digits of the hourly table, every one', () => {
    const [header = '', ...pieces] = hourlyCsv(withWater);
    const names = header
      .trim()
      .split(',')
      .map((name) => name.replace(/ \[.*/, ''));
    const rows = pieces.join('').split('\n');
    let compared = 0;
    for (const hour of [COLD_MORNING, COLD_MORNING + 1, SUMMER_NOON, 8759]) {
      const row = new Map(rows[hour]!.split(',').map((cell, i) => [names[i], cell]));
      for (const { stage, figures } of explained(withWater, hour).stages) {
        for (const { name, value } of figures) {
          const cell = row.get(name);
          if (cell === undefined) continue;
          expect(JSON.stringify(value), `${stage}: ${name}`).toBe(cell);
          compared++;
        }
      }
    }
    expect(compared).toBeGreaterThan(100);
  });

  it('has cost and carbon of the hour: 0.29 EUR and 20 % on top, 0.30 kg a kWh', () => {
    const document = explained(demo, COLD_MORNING);
    const kWh = demo.columns.electricity[COLD_MORNING]!;
    expect(figure(document, 'money', 'energyCost')).toMatchObject({ unit: 'EUR' });
    expect(figure(document, 'money', 'energyCost')?.value).toBeCloseTo(kWh * 0.29, 12);
    expect(figure(document, 'money', 'taxedCost')?.value).toBeCloseTo(kWh * 0.29 * 1.2, 12);
    expect(figure(document, 'money', 'carbon')?.value).toBeCloseTo(kWh * 0.3, 12);
  });

  it('has the air as the file has it', () => {
    const { humidity, temperature } = demo.loaded.weather.series;
    expect(figure(explained(demo, 5), 'air', 'relativeHumidity')?.value).toBe(humidity!.values[5]);
    expect(figure(explained(demo, 5), 'air', 'outdoorTemperature')?.value).toBe(temperature[5]);
  });

  it('says what the file does not have', () => {
    const { humidity, pressure, ...series } = demo.loaded.weather.series;
    const bare: Answer = { ...demo, loaded: { ...demo.loaded, weather: { ...demo.loaded.weather, series } } };
    const air = explained(bare, 5).stages[0]!;
    expect(air.findings.map(({ finding }) => finding)).toEqual(
      expect.arrayContaining(['humidityAssumed', 'pressureAssumed']),
    );
    expect(air.figures.find(({ name }) => name === 'relativeHumidity')?.value).toBe(85);
  });

  it('names the files it rests on', () => {
    expect(explained(demo, 0).inputs).toEqual(
      demo.loaded.inputs.map(({ file, role, sha256 }) => ({ file, role, sha256 })),
    );
  });
});

describe('the money of an explained hour', () => {
  const money = (answer: Answer) => explained(answer, COLD_MORNING).stages.find(({ stage }) => stage === 'money')!;
  const findings = (answer: Answer) => money(answer).findings.map(({ finding }) => finding);
  const changed = (loaded: Partial<Answer['loaded']>): Answer => ({ ...demo, loaded: { ...demo.loaded, ...loaded } });
  const HYBRID: [string, string] = [
    'backup:\n  source: electric\n  power: 6\n',
    'backup:\n  source: boiler\n  power: 6\n  efficiency: 0.9\n  fuel: { kind: naturalGas, price: 0.1, calorificValue: net, taxes: [{ name: VAT, percent: 20 }] }\n',
  ];

  it('has fuel and its carbon with a hybrid: 0.12 a kWh, 0.20196 kg a kWh net (Regulation 2018/2066 annex VI)', () => {
    const hybrid = demoAnswer(HYBRID);
    const fuel = hybrid.columns.fuel[COLD_MORNING]!;
    expect(fuel).toBeGreaterThan(0.5);
    const value = (name: string) => money(hybrid).figures.find((each) => each.name === name)?.value;
    expect(value('fuelCost')).toBeCloseTo(fuel * 0.12, 12);
    expect(value('carbon')).toBeCloseTo(hybrid.columns.electricity[COLD_MORNING]! * 0.3 + fuel * 0.20196, 12);
    const pellets = demoAnswer([HYBRID[0], HYBRID[1].replace('naturalGas', 'pellets')]);
    expect(findings(pellets)).toEqual(['noCarbonFactor']);
  });

  it('says so where there is no tariff, or no price of an hour, or blocks on top', () => {
    const { prepared, ...first } = demo.loaded.tariffs[0]!;
    expect(findings(changed({ tariffs: [] }))).toEqual(['noTariff']);
    expect(
      findings(changed({ tariffs: [{ ...first, prepared: { ...prepared, pricedByBlocksAlone: true } }] })),
    ).toEqual(['pricedByBlocks']);
    const blocks = { per: 'year', steps: [] } as never;
    const parts = prepared.parts.map((part) => ({ ...part, blocks }));
    expect(findings(changed({ tariffs: [{ ...first, prepared: { ...prepared, parts } }] }))).toEqual(['blocksNotSeen']);
  });

  it('shows no carbon where its factor is not constant', () => {
    const byHour = changed({ carbon: { given: 'byHour', factors: new Float64Array(8760).fill(0.3) } });
    expect(findings(byHour)).toEqual(['carbonByHour']);
    expect(money(byHour).figures.some(({ name }) => name === 'carbon')).toBe(false);
  });
});

describe('the words of an explained hour', () => {
  it('name every figure otherwise', () => {
    const labels = Object.values(figureLabels);
    expect(new Set(labels).size).toBe(labels.length);
  });

  it('name a section of the model for every formula', () => {
    for (const { section, says } of Object.values(formulaWords)) {
      expect(section).toMatch(/^([3-9]|1[0-2])$/);
      expect(says).toMatch(/\w{3}/);
    }
  });

  it('end every finding as a sentence', () => {
    for (const text of Object.values(englishExplained.findings)) expect(text).toMatch(/^[A-Z].*\.$/);
  });
});

describe('the nomenclature', () => {
  const rows = readFileSync(new URL('../../../docs/nomenclature.md', import.meta.url), 'utf8')
    .split('\n')
    .filter((line) => line.startsWith('| '))
    .map((line) =>
      line
        .slice(2, -2)
        .split(' | ')
        .map((cell) => cell.trim()),
    );

  it.each(Object.entries(figureUnits))('has %s, in %s', (name, unit) => {
    const named = rows.filter((row) => row[3] === `\`${name}\`` || row[4] === `\`${name}\``);
    expect(named).toHaveLength(1);
    expect(named[0]![2]).toBe(unit);
  });
});
