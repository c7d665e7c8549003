import { expect } from 'vitest';
import type { Answer, TariffCost } from '../../src/scenario/answer/answer.ts';
import type { YearColumns } from '../../src/sim/columns.ts';
import type { BillSums } from '../../src/tariffs/bill.ts';

/** Rounding of a few additions of kWh, each as large as the largest of its year. */
const ROUNDING = 1e-9;

/** What MODEL section 15 says of every run: finite figures, balances, sums, no COP above Carnot's. */
export function expectSoundYear(answer: Answer): void {
  const { columns, plan } = answer;
  for (const [name, column] of Object.entries(columns)) {
    if (typeof column !== 'number') expect((column as Float64Array).every(Number.isFinite), name).toBe(true);
  }
  expectBalance(columns, plan.house.mass !== null);
  expectCarnot(answer);
  expectYearOfMonths(answer);
  for (const cost of answer.costs) expectSoundBill(cost);
}

function expectBalance(c: YearColumns, lumped: boolean): void {
  let heat = 0;
  let uses = 0;
  let largest = 1;
  for (let i = 0; i < c.hours; i++) {
    const waited = lumped || i === 0 ? 0 : c.waitingHeat[i - 1]!;
    const met = c.heatPumpSpaceHeat[i]! + c.backupSpaceHeat[i]! + c.unmetHeat[i]! + c.waitingHeat[i]!;
    heat = Math.max(heat, Math.abs(c.spaceHeatNeed[i]! + waited - met));
    const idle = c.circulationElectricity[i]! + c.standbyElectricity[i]! + c.crankcaseElectricity[i]!;
    const running = c.heatPumpSpaceElectricity[i]! + c.heatPumpWaterElectricity[i]!;
    const backup = c.fuel[i]! > 0 ? 0 : c.backupSpaceHeat[i]! + c.backupWaterHeat[i]!;
    uses = Math.max(uses, Math.abs(c.electricity[i]! - running - idle - backup));
    largest = Math.max(largest, c.spaceHeatNeed[i]!, c.electricity[i]!);
  }
  expect(heat, 'heat of an hour').toBeLessThanOrEqual(ROUNDING * largest);
  expect(uses, 'electricity of an hour').toBeLessThanOrEqual(ROUNDING * largest);
}

function expectCarnot({ columns: c, plan }: Answer): void {
  let most = 0;
  for (let i = 0; i < c.hours; i++) {
    const outdoor = plan.weather.temperature[i]!;
    const flow = Math.min(c.flowTemperature[i]!, plan.unitOnWeather.highestFlow[i]!);
    if (c.heatPumpSpaceElectricity[i]! <= 0 || flow <= outdoor) continue;
    const cop = c.heatPumpSpaceHeat[i]! / c.heatPumpSpaceElectricity[i]!;
    most = Math.max(most, cop / ((flow + 273.15) / (flow - outdoor)));
  }
  expect(most, 'share of the Carnot COP').toBeLessThanOrEqual(1);
}

function expectYearOfMonths({ totals: { annual, monthly } }: Answer): void {
  for (const [key, total] of Object.entries(annual)) {
    const months = monthly.map((month) => month[key as keyof typeof month]);
    const size = months.reduce((sum, value) => sum + Math.abs(value), 1);
    const sum = months.reduce((found, value) => found + value, 0);
    expect(Math.abs(sum - total), key).toBeLessThanOrEqual(ROUNDING * size);
  }
}

function expectSoundBill({ bill, householdBill }: TariffCost): void {
  for (const each of [bill, householdBill]) {
    const rates = Object.values(each.byRate).map(({ cost }) => cost);
    const size = rates.reduce((sum, cost) => sum + Math.abs(cost), 1 + Math.abs(each.energy));
    expect(Math.abs(rates.reduce((sum, cost) => sum + cost, 0) - each.energy)).toBeLessThanOrEqual(ROUNDING * size);
    expectTotal(each);
    for (const key of ['kWh', 'energy', 'standing', 'demand', 'taxes', 'total'] as const) {
      const months = each.monthly.map((month) => month[key]);
      const sizeOfMonths = months.reduce((sum, value) => sum + Math.abs(value), 1);
      const sum = months.reduce((found, value) => found + value, 0);
      expect(Math.abs(sum - each[key]), key).toBeLessThanOrEqual(ROUNDING * sizeOfMonths);
    }
  }
}

function expectTotal({ energy, standing, demand, taxes, credits, total }: BillSums): void {
  const size = [energy, standing, demand, taxes, credits].reduce((sum, part) => sum + Math.abs(part), 1);
  expect(Math.abs(energy + standing + demand + taxes - credits - total)).toBeLessThanOrEqual(ROUNDING * size);
}
