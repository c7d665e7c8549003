import { describe, expect, it } from 'vitest';
import { documentText } from '../../../src/report/documentText.ts';
import { resultDocument } from '../../../src/report/resultDocument.ts';
import { type ResultDocument, resultSchema } from '../../../src/report/resultSchema.ts';
import { demoAnswer, HOT_WATER, RESTING_IN_COLD, WITH_MASS } from './demoAnswer.ts';

const plain = resultDocument(demoAnswer(), '1.2.3');
const withWater = resultDocument(demoAnswer(HOT_WATER), '1.2.3');
const resting = resultDocument(demoAnswer(RESTING_IN_COLD), '1.2.3');
const withMass = resultDocument(demoAnswer(WITH_MASS), '1.2.3');
const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0);
/** Sums of some ten thousand kWh in double precision, added in another order. */
const ROUNDING = 1e-6;

describe('the result document', () => {
  it.each([
    ['the demo', plain],
    ['hot water', withWater],
    ['a house with mass', withMass],
  ])('is what its schema says: %s', (_, document) => {
    expect(resultSchema.safeParse(JSON.parse(documentText(document))).error).toBeUndefined();
  });

  it('says which program, scenario and unit it is of, and in which units its figures are', () => {
    expect(plain).toMatchObject({ version: '1.2.3', currency: 'EUR', units: { energy: 'kWh', degreeDays: 'K·d' } });
    expect(plain.scenario).toContain('Nebelquellingen');
    expect(plain.heatPumpUnit).toContain('Quarkenfels');
  });

  it.each([
    ['the demo', plain],
    ['hot water', withWater],
    ['a unit that rests in the cold', resting],
  ])('has electricity by use that adds up to the total, in the year and in every month: %s', (_, document) => {
    for (const { electricity, electricityDetail } of [document.annual, ...document.monthly]) {
      const { heatPump, backup, circulation, standby, total } = electricity;
      expect(Math.abs(heatPump + backup + circulation + standby - total)).toBeLessThan(ROUNDING);
      expect(Math.abs(sum(Object.values(electricityDetail)) - total)).toBeLessThan(ROUNDING);
    }
  });

  it('counts the crankcase heater as standing by, and shows it apart', () => {
    const { electricity, electricityDetail } = resting.annual;
    expect(electricityDetail.crankcaseElectricity).toBeGreaterThan(0);
    expect(electricity.standby).toBe(electricityDetail.standbyElectricity + electricityDetail.crankcaseElectricity);
  });

  it('has months that add up to the year in every energy', () => {
    const energies = (period: ResultDocument['monthly'][0] | ResultDocument['annual']) => [
      ...[period.degreeDays, period.spaceHeatNeed, period.heatPumpHeat, period.backupHeat, period.unmetHeat],
      ...Object.values(period.electricity),
      ...Object.values(period.hotWater ?? {}),
    ];
    const year = energies(withWater.annual);
    expect(year.length).toBe(14);
    year.forEach((total, i) => {
      expect(Math.abs(sum(withWater.monthly.map((month) => energies(month)[i]!)) - total)).toBeLessThan(ROUNDING);
    });
  });

  it('parts heat and seasonal factors as MODEL section 11 does', () => {
    const { annual } = withWater;
    expect(annual.heatPumpHeat).toBe(annual.heatPumpSpaceHeat + annual.heatPumpWaterHeat);
    expect(annual.backupHeat).toBe(annual.backupSpaceHeat + annual.backupWaterHeat);
    const { heatPump, backup, standby, circulation } = annual.electricity;
    const heat = annual.heatPumpHeat + annual.backupHeat;
    // Quotients of sums that are added in another order here.
    expect(annual.seasonalFactor.h2).toBeCloseTo(annual.heatPumpHeat / (heatPump + standby), 9);
    expect(annual.seasonalFactor.h3).toBeCloseTo(heat / (heatPump + standby + backup), 9);
    expect(annual.seasonalFactor.h4).toBeCloseTo(heat / (heatPump + standby + backup + circulation), 9);
  });

  it('shows hot water only where there is some', () => {
    expect(plain.annual.hotWater).toBeUndefined();
    const { hotWater } = withWater.annual;
    // Tapping profile L of Regulation (EU) 814/2013: 11.655 kWh a day, 365 days.
    expect(hotWater?.hotWaterAsked).toBeCloseTo(11.655 * 365, 6);
  });

  it('parts the hot water asked into served and not delivered', () => {
    const small: [string, string] = [HOT_WATER[0], HOT_WATER[1].replace('volume: 200', 'volume: 40')];
    const { annual } = resultDocument(demoAnswer(small), '1');
    expect(annual.hotWaterShortHours).toBeGreaterThan(0);
    const { hotWaterAsked, hotWaterServed, hotWaterShort } = annual.hotWater!;
    expect(hotWaterShort).toBeGreaterThan(1);
    expect(hotWaterServed + hotWaterShort).toBeCloseTo(hotWaterAsked, 9);
  });

  it('shows kelvin-hours below the set point only for a house with mass', () => {
    expect(plain.annual.kelvinHoursBelow).toBeUndefined();
    expect(withMass.annual.kelvinHoursBelow).toBeGreaterThanOrEqual(0);
  });

  it('has bills whose parts add up, by rate, by tax and by month', () => {
    expect(plain.costs.map(({ tariff }) => tariff)).toEqual([
      'Flat (invented)',
      'Night rate (invented)',
      'Three bands (invented)',
      'Half-hourly (invented)',
    ]);
    for (const cost of plain.costs) {
      const { energy, standing, demand, taxes, credits, total } = cost;
      expect(energy + standing + demand + taxes - credits).toBeCloseTo(total, 9);
      expect(sum(Object.values(cost.byRate).map((rate) => rate.cost))).toBeCloseTo(energy, 6);
      expect(sum(Object.values(cost.byRate).map((rate) => rate.hours))).toBeCloseTo(8760, 6);
      expect(sum(Object.values(cost.byTax))).toBeCloseTo(taxes, 6);
      expect(sum(cost.monthly.map((month) => month.total))).toBeCloseTo(total, 6);
      expect(cost.kWh).toBeCloseTo(plain.annual.electricity.total + cost.household.kWh, 6);
      expect(cost.systemElectricity).toBeCloseTo(total - cost.household.total, 9);
      expect(cost.systemElectricity + cost.systemFuel + cost.systemService).toBeCloseTo(cost.systemTotal, 9);
      expect(cost.saving).toBe(cost.boilerTotal! - cost.systemTotal);
    }
  });

  it('has a boiler whose parts add up to what it costs on the first tariff', () => {
    const { boiler } = plain;
    const { fuelCost, standing, taxes, service, electricityCost, total } = boiler!;
    expect(fuelCost + standing + taxes + service + Number(electricityCost)).toBeCloseTo(total, 9);
    expect(total).toBe(plain.costs[0]!.boilerTotal);
    // Efficiency 0.88 and a gas price of 0.095 EUR/kWh, as the scenario says.
    expect(boiler!.fuel).toBeCloseTo(plain.annual.spaceHeatNeed / 0.88, 6);
    expect(fuelCost).toBeCloseTo(boiler!.fuel * 0.095, 6);
  });

  it('has the household’s bill beside the whole one: its own kWh, standing charge and taxes', () => {
    for (const { household, standing, byRate } of plain.costs) {
      // 2900 kWh a year, as the scenario says
      expect(household.kWh).toBeCloseTo(2900, 8);
      expect(household.standing).toBe(standing);
      expect(sum(Object.values(household.byRate).map(({ kWh }) => kWh))).toBeCloseTo(2900, 8);
      expect(Object.keys(household.byRate)).toEqual(Object.keys(byRate));
    }
    const [flat] = plain.costs;
    // (2900 kWh at 0.29 and twelve months at 11.50) and 20 % tax
    expect(flat?.household.total).toBeCloseTo((2900 * 0.29 + 12 * 11.5) * 1.2, 6);
  });

  it('has break-even, other prices and the whole life of the first tariff', () => {
    const { costs, sensitivity, breakEven, wholeLife, annual } = plain;
    expect(sensitivity?.[4]?.annualSaving).toBe(costs[0]?.saving);
    expect(sensitivity?.[4]?.netPresentValue).toBe(wholeLife?.netPresentValue);
    // without a fuel beside it, heat over electricity is H4
    expect(breakEven?.heatOverElectricity).toBeCloseTo(Number(annual.seasonalFactor.h4), 9);
    // 24 500 less 8500 less 7800; service of 160 a year
    expect(wholeLife).toMatchObject({
      netCapital: 8200,
      discountRate: 0.03,
      electricityDrift: 0.005,
      fuelDrift: 0.015,
    });
    expect(costs[0]?.systemService).toBe(160);
    expect(wholeLife?.years).toHaveLength(20);
    expect(wholeLife?.years.at(-1)?.balance).toBe(wholeLife?.netPresentValue);
  });

  it('names the files with the SHA-256 of their bytes, in full', () => {
    expect(plain.inputs.map(({ role }) => role)).toEqual([
      'scenario',
      'weather',
      'unit',
      'tariff',
      'tariff',
      'tariff',
      'tariff',
      'priceSeries',
    ]);
    for (const { sha256 } of plain.inputs) expect(sha256).toMatch(/^[0-9a-f]{64}$/);
  });
});

describe('what is not there', () => {
  const TARIFFS = `tariffs:
  - tariffs/flat.yaml
  - tariffs/night.yaml
  - tariffs/three-band.yaml
  - tariffs/half-hourly.yaml
`;
  const BACKUP = `backup:
  source: electric
  power: 6
  mode: { kind: parallel }
`;

  const WHOLE_LIFE = `wholeLife:
  capital: 24500
  grant: 8500
  replacedBoiler: 7800
  years: 20
  discountRate: 3
  electricityDrift: 0.5
  fuelDrift: 1.5
  servicePerYear: 160
`;

  it('has a word instead of a number', () => {
    const document = resultDocument(demoAnswer([TARIFFS, ''], [WHOLE_LIFE, ''], ['  floorArea: 138\n', '']), '1');
    expect(document.sensitivity).toBeUndefined();
    expect(document.breakEven).toBeUndefined();
    expect(document.costs).toEqual([]);
    expect(document.boiler?.electricityCost).toBe('no tariff');
    const { fuelCost, standing, taxes, service, total } = document.boiler!;
    expect(total).toBeCloseTo(fuelCost + standing + taxes + service, 9);
    expect(document.house.heatLossPerArea).toBe('no floor area');
  });

  it('has a word instead of carbon', () => {
    expect(resultDocument(demoAnswer(['carbon: { electricity: 0.30 }', '']), '1').carbon).toEqual({
      heatPump: 'not asked',
      boiler: 'not asked',
    });
  });

  it('has a word instead of a seasonal factor in a month without heat', () => {
    // With a heating limit of 0 °C no heat is asked in July.
    const document = resultDocument(demoAnswer(['    setPoint: 20\n', '    setPoint: 20\n    heatingLimit: 0\n']), '1');
    expect(document.monthly[6]!.seasonalFactor).toEqual({ h2: 'no heat', h3: 'no heat', h4: 'no heat' });
    expect(resultSchema.safeParse(document).error).toBeUndefined();
  });

  it('shows up as unmet heat when the backup is taken away', () => {
    const { annual } = resultDocument(demoAnswer([BACKUP, '']), '1');
    expect(annual.backupHeat).toBe(0);
    expect(annual.unmetHeat).toBeGreaterThan(0);
    expect(annual.heatPumpHeat + annual.unmetHeat).toBeCloseTo(annual.spaceHeatNeed, 6);
  });
});
