import { describe, expect, test } from 'vitest';
import { type Boiler, type BoilerNeed, boilerYear } from '../../../src/compare/boiler.ts';
import { emitterSetting, type FlowSetting } from '../../../src/sim/flowTemperature.ts';

const boiler: Boiler = {
  efficiency: 0.8,
  hotWaterEfficiency: 0.5,
  fuel: {
    kind: 'naturalGas',
    price: 0.1,
    calorificValue: 'gross',
    standingPerYear: 120,
    taxes: [{ name: 'VAT', percent: 10 }],
  },
  pumpPower: 0.06,
  servicePerYear: 180,
};

/** 10,000 kWh of space heat in 5000 hours of 2 kWh. */
const need: BoilerNeed = {
  spaceHeat: new Float64Array(8760).fill(2, 0, 5000),
  hotWater: 0,
  hotWaterByHour: new Float64Array(8760),
  cylinderLoss: 0,
};

const emitters = emitterSetting({
  flow: 60,
  return: 50,
  roomTemperature: 20,
  exponent: 1.3,
  lowestFlow: 25,
  highestFlow: 60,
});

describe('a year with the boiler', () => {
  test('burns the space heat over its efficiency', () => {
    expect(boilerYear(boiler, need).fuel).toBe(12_500);
  });

  test('burns hot water asked and the cylinder’s loss over its efficiency for hot water', () => {
    // (2000 + 500)/0.5 more
    expect(boilerYear(boiler, { ...need, hotWater: 2000, cylinderLoss: 500 }).fuel).toBe(17_500);
  });

  test('costs its fuel with standing charge and taxes; service stands apart', () => {
    const year = boilerYear(boiler, need);
    // (1250 + 120)·1.1
    expect(Math.abs(year.cost.total - 1507)).toBeLessThanOrEqual(1e-9);
    expect(year.service).toBe(180);
  });

  test('runs its pump in hours with a need for space heat, and in no other', () => {
    const { electricity: pump, pumpElectricity } = boilerYear(boiler, { ...need, hotWater: 2000 });
    expect([pump[0], pump[4999], pump[5000], pump[8759]]).toEqual([0.06, 0.06, 0, 0]);
    // 5000 hours of 60 W
    expect(Math.abs(pumpElectricity - 300)).toBeLessThanOrEqual(1e-9);
    expect(Math.abs(pump.reduce((sum, kWh) => sum + kWh, 0) - 300)).toBeLessThanOrEqual(1e-9);
  });
});

describe('a condensing boiler', () => {
  test('burns each hour’s heat at the efficiency of its return', () => {
    // fixed flow of 60 °C, 5 K of spread: x = 2/4 gives a return of 57.5 °C, a quarter of the way from 55 to 65 °C
    const flow: FlowSetting = { ...emitters, set: new Float64Array(8760).fill(60), spread: 5 };
    const efficiency = { overReturn: { at: [55, 65], value: [0.9, 0.86] }, flow, designLoad: 4 };
    const year = boilerYear({ ...boiler, efficiency }, { ...need, hotWater: 500 });
    // 10,000/0.89 + 500/0.5; a sum of 5000 hours rounds by some 1e-12 of itself
    expect(Math.abs(year.fuel - 10_000 / 0.89 - 1000)).toBeLessThanOrEqual(1e-7);
    // of the rooms alone
    expect(year.meanSpaceHeatEfficiency).toBeCloseTo(0.89, 12);
  });

  test('has no mean efficiency in a year without heat', () => {
    const still = { ...need, spaceHeat: new Float64Array(8760) };
    expect(boilerYear(boiler, still).meanSpaceHeatEfficiency).toBe('no heat');
  });
});

describe('electric heating on the household’s tariff', () => {
  const electric: Boiler = {
    ...boiler,
    efficiency: 0.8,
    fuel: { kind: 'electricity', calorificValue: 'gross', standingPerYear: 0, taxes: [] },
  };
  // 100 kWh of hot water, all at the hour 6000; 438 kWh of loss are 0.05 kWh an hour
  const hotWaterByHour = new Float64Array(8760).fill(100, 6000, 6001);
  const asked: BoilerNeed = { ...need, hotWater: 100, hotWaterByHour, cylinderLoss: 438 };

  test('puts its electricity on the bill in the hours in which heat is needed', () => {
    const { electricity } = boilerYear(electric, asked);
    // rooms: 0.06 + 2/0.8, loss: 0.05/0.5; hot water: 100/0.5
    expect(electricity[0]).toBeCloseTo(0.06 + 2.5 + 0.1, 12);
    expect(electricity[5000]).toBeCloseTo(0.1, 12);
    expect(electricity[6000]).toBeCloseTo(200 + 0.1, 12);
  });

  test('has the loss of the cylinder in the hours in which it is lost, where these are known', () => {
    const cylinderLossByHour = new Float64Array(8760).fill(0.438, 0, 1000);
    const { electricity } = boilerYear(electric, { ...asked, cylinderLossByHour });
    expect(electricity[0]).toBeCloseTo(0.06 + 2.5 + 0.438 / 0.5, 12);
    expect(electricity[5000]).toBe(0);
  });

  test('takes over the year what the bill’s hours add up to, and buys no fuel', () => {
    const year = boilerYear(electric, asked);
    // 10,000/0.8 + (100 + 438)/0.5
    expect(Math.abs(year.heatElectricity - 13_576)).toBeLessThanOrEqual(1e-8);
    const onBill = year.electricity.reduce((sum, kWh) => sum + kWh, 0);
    expect(Math.abs(onBill - 13_576 - 300)).toBeLessThanOrEqual(1e-7);
    expect(year.fuel).toBe(0);
    expect(year.cost.total).toBe(0);
  });

  test('still pays a standing charge of its own, with the taxes on it', () => {
    const fuel = { ...electric.fuel, standingPerYear: 50, taxes: [{ name: 'VAT', percent: 20 }] };
    expect(boilerYear({ ...electric, fuel }, asked).cost.total).toBeCloseTo(60, 12);
  });

  test('at a price of its own is bought as a fuel, and only the pump is on the household’s bill', () => {
    const year = boilerYear({ ...electric, fuel: { ...electric.fuel, price: 0.2 } }, asked);
    expect(Math.abs(year.cost.total - 0.2 * 13_576)).toBeLessThanOrEqual(1e-8);
    expect(year.heatElectricity).toBe(0);
    expect(year.electricity[0]).toBe(0.06);
  });
});
