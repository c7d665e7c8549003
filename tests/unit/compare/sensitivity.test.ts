import { describe, expect, test } from 'vitest';
import { sensitivity } from '../../../src/compare/sensitivity.ts';
import type { WholeLifeTerms } from '../../../src/compare/wholeLife.ts';

/** A hybrid: of 1000 for electricity 100 are standing and demand charges, of 250 for fuel 50. */
const heatPump = { electricity: 1000, electricityEnergy: 900, fuel: 250, fuelEnergy: 200, service: 100 };
const boiler = { electricity: 30, electricityEnergy: 30, fuel: 1700, fuelEnergy: 1500, service: 150 };
const terms: WholeLifeTerms = {
  capital: 2000,
  grant: 0,
  replacedBoiler: 0,
  years: 10,
  discountRate: 0,
  electricityDrift: 0,
  fuelDrift: 0,
};

// Saving today: 1880 − 1350 = 530. Electricity weighs 900 − 30 = 870 against it, fuel 1500 − 200 = 1300 for it; a fifth of
// these is 174 and 260.
const savings = [
  [-0.2, -0.2, 530 + 174 - 260],
  [-0.2, 0, 530 + 174],
  [-0.2, 0.2, 530 + 174 + 260],
  [0, -0.2, 530 - 260],
  [0, 0, 530],
  [0, 0.2, 530 + 260],
  [0.2, -0.2, 530 - 174 - 260],
  [0.2, 0, 530 - 174],
  [0.2, 0.2, 530 - 174 + 260],
] as const;

describe('the table of other prices', () => {
  test('scales what the kilowatt-hours cost in both systems, and neither standing charges nor service', () => {
    const table = sensitivity(heatPump, boiler, undefined);
    expect(table).toHaveLength(9);
    savings.forEach(([electricityChange, fuelChange, saving], i) => {
      expect(table[i]).toMatchObject({ electricityChange, fuelChange });
      expect(table[i]?.annualSaving).toBeCloseTo(saving, 10);
    });
  });

  test('goes through the whole life where its terms are given', () => {
    const table = sensitivity(heatPump, boiler, terms);
    savings.forEach(([, , saving], i) => {
      expect(table[i]?.netPresentValue).toBeCloseTo(10 * saving - 2000, 9);
    });
  });

  test('lets the changed prices drift as today’s would', () => {
    const [first] = sensitivity(heatPump, boiler, { ...terms, years: 2, fuelDrift: 0.5 });
    // year 1: 444; year 2 has half of the fuel more: (1400 − 210)/2 = 595
    expect(first?.netPresentValue).toBeCloseTo(444 + 444 + 595 - 2000, 10);
  });

  test('has no net present value without terms', () => {
    expect(sensitivity(heatPump, boiler, undefined).some((row) => 'netPresentValue' in row)).toBe(false);
  });
});
