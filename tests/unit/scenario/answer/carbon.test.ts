import { describe, expect, test } from 'vitest';
import { assumptionNote } from '../../../../src/report/englishNotes.ts';
import { answerOf, there } from './sampleAnswer.ts';

const gas = 'boiler: { efficiency: 0.9, fuel: { kind: naturalGas, price: 0.1, calorificValue: net }, pumpPower: 60 }';
const byRate = (night: number, day: number) =>
  `carbon: { electricity: { given: byRate, factors: [{ rate: night, factor: ${night} }, { rate: day, factor: ${day} }] } }`;
// Products of sums of some ten thousand kWh.
const DIGITS = 6;

/** A factor for every hour of the year: one for the first half, one for the second. */
function halves(first: number, second: number): string {
  const start = Date.UTC(2024, 11, 31, 23);
  const rows = Array.from({ length: 8760 }, (_, k) => {
    const stamp = new Date(start + k * 3_600_000).toISOString().slice(0, 16);
    return `${stamp}Z,${k < 4380 ? first : second}`;
  });
  return `time,factor\n${rows.join('\n')}\n`;
}

const series = 'carbon: { electricity: { given: series, file: grid.csv, unit: kgPerKWh } }';

describe('the carbon of a year', () => {
  test('with one factor is that of all electricity, and the boiler’s of its fuel and its pump', () => {
    const { carbon, totals, boiler } = answerOf({ sections: `carbon: { electricity: 0.3 }\n${gas}` });
    expect(carbon?.heatPump).toBeCloseTo(totals.annual.electricity * 0.3, DIGITS);
    const { fuel, pumpElectricity } = there(boiler);
    // 56.1 t/TJ of natural gas on net calorific value, Regulation (EU) 2018/2066 annex VI
    expect(carbon?.boiler).toBeCloseTo(fuel * 0.20196 + pumpElectricity * 0.3, DIGITS);
  });

  test('by rate goes by the kWh of the heating in each rate', () => {
    const { carbon, costs } = answerOf({ sections: byRate(0.1, 0.5) });
    // without a household the bill is the heating's
    const { night, day } = there(costs[0]).bill.byRate;
    expect(carbon?.heatPump).toBeCloseTo(there(night).kWh * 0.1 + there(day).kWh * 0.5, DIGITS);
  });

  test('leaves the household out', () => {
    const household = 'household: { given: profile, kWhPerYear: 2500 }';
    const alone = answerOf({ sections: byRate(0.1, 0.5) }).carbon;
    expect(answerOf({ sections: `${household}\n${byRate(0.1, 0.5)}` }).carbon).toEqual(alone);
  });

  test('by a series goes hour by hour', () => {
    const { carbon, columns } = answerOf({ sections: series, files: { 'grid.csv': halves(0.2, 0.6) } });
    const expected = columns.electricity.reduce((sum, kWh, i) => sum + kWh * (i < 4380 ? 0.2 : 0.6), 0);
    expect(carbon?.heatPump).toBeCloseTo(expected, DIGITS);
  });

  test('counts a factor entered for the electricity of a boiler’s heat, and the common one for its pump', () => {
    const electric = 'boiler: { efficiency: 1, fuel: { kind: electricity, carbonFactor: 0.05 }, pumpPower: 60 }';
    const { carbon, boiler } = answerOf({ sections: `carbon: { electricity: 0.3 }\n${electric}` });
    const { heatElectricity, pumpElectricity } = there(boiler);
    expect(carbon?.boiler).toBeCloseTo(heatElectricity * 0.05 + pumpElectricity * 0.3, DIGITS);
    const common = answerOf({
      sections: `carbon: { electricity: 0.3 }\n${electric.replace(', carbonFactor: 0.05', '')}`,
    });
    expect(common.carbon?.boiler).toBeCloseTo((heatElectricity + pumpElectricity) * 0.3, DIGITS);
  });

  test('takes the one factor of electricity for electricity at a price of its own, and does not know it by the hour', () => {
    const own = 'boiler: { efficiency: 1, fuel: { kind: electricity, price: 0.2 } }';
    const { carbon, boiler } = answerOf({ sections: `carbon: { electricity: 0.3 }\n${own}` });
    expect(carbon?.boiler).toBeCloseTo(there(boiler).fuel * 0.3, DIGITS);
    expect(answerOf({ sections: `${byRate(0.1, 0.5)}\n${own}` }).carbon?.boiler).toBe('no factor');
  });

  test('is not known without a factor of the fuel, and not there where none is asked', () => {
    const pellets = 'boiler: { efficiency: 0.9, fuel: { kind: pellets, price: 0.08 } }';
    expect(answerOf({ sections: `carbon: { electricity: 0.3 }\n${pellets}` }).carbon?.boiler).toBe('no factor');
    expect(answerOf({ sections: 'carbon: { electricity: 0.3 }' }).carbon?.boiler).toBe('no boiler');
    expect(answerOf({ sections: pellets }).carbon).toBeUndefined();
  });

  test('names the published factors that it takes', () => {
    const texts = answerOf({ sections: `carbon: { electricity: 0.3 }\n${gas}` }).assumptions.map(assumptionNote);
    expect(texts.find(({ path }) => path === 'boiler.fuel.carbonFactor')?.text).toBe(
      '0.202 kg/kWh. Regulation (EU) 2018/2066, on net calorific value.',
    );
  });
});
