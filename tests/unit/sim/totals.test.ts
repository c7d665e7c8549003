import { describe, expect, test } from 'vitest';
import { MARK, newColumns, type YearColumns } from '../../../src/sim/columns.ts';
import { massParameters } from '../../../src/sim/lumpedHouse.ts';
import { type EnergyTotals, totalsOf } from '../../../src/sim/totals.ts';
import { expectNear, HOURS, planOf } from './planBuilder.ts';

/** Columns of 1 kWh an hour, each with a figure of its own in the first hour of March. */
function columnsOf(hours = HOURS, march = 1416): YearColumns {
  const c = newColumns(hours);
  const columns = Object.values(c).filter((column) => column instanceof Float64Array);
  columns.forEach((column, at) => {
    column.fill(1);
    column[march] = 100 + at;
  });
  return c;
}

/** Where each sum of the year comes from. */
const sources: Partial<Record<keyof EnergyTotals, keyof YearColumns>> = {
  spaceHeatNeed: 'spaceHeatNeed',
  heatPumpSpaceHeat: 'heatPumpSpaceHeat',
  heatPumpWaterHeat: 'heatPumpWaterHeat',
  backupSpaceHeat: 'backupSpaceHeat',
  backupWaterHeat: 'backupWaterHeat',
  unmetHeat: 'unmetHeat',
  hotWaterShort: 'hotWaterShort',
  cylinderLoss: 'cylinderLoss',
  heatPumpSpaceElectricity: 'heatPumpSpaceElectricity',
  heatPumpWaterElectricity: 'heatPumpWaterElectricity',
  circulationElectricity: 'circulationElectricity',
  standbyElectricity: 'standbyElectricity',
  crankcaseElectricity: 'crankcaseElectricity',
  fuel: 'fuel',
};

describe('sums of a year', () => {
  test('stand in the months of standard time, each from its own column', () => {
    const c = columnsOf();
    const { annual, monthly } = totalsOf(planOf({ hotWater: {}, backup: { isBoiler: true } }), c);
    expect(monthly).toHaveLength(12);
    let compared = 0;
    for (const [total, source] of Object.entries(sources)) {
      const key = total as keyof EnergyTotals;
      const march = (c[source] as Float64Array)[1416]!;
      expectNear(annual[key], 8759 + march);
      expectNear(monthly[0]![key], 744);
      expectNear(monthly[1]![key], 672);
      expectNear(monthly[2]![key], 743 + march);
      expectNear(monthly[11]![key], 744);
      compared++;
    }
    expect(compared).toBe(14);
  });

  test('of a leap year have a February of 29 days', () => {
    const { monthly } = totalsOf(planOf({ hours: 8784 }), columnsOf(8784, 1440));
    expectNear(monthly[1]!.spaceHeatNeed, 696);
    expect(monthly[2]!.spaceHeatNeed).toBeGreaterThan(744);
  });

  test('of hot water asked are what was served and what was not', () => {
    const c = columnsOf();
    const { annual } = totalsOf(planOf({ hotWater: {} }), c);
    expectNear(annual.hotWaterAsked, 2 * 8759 + c.hotWaterServed[1416]! + c.hotWaterShort[1416]!);
  });

  test('of an electric backup are its heat, those of a boiler no electricity', () => {
    const c = columnsOf();
    const { annual } = totalsOf(planOf({ hotWater: {} }), c);
    expectNear(annual.backupElectricity, annual.backupSpaceHeat + annual.backupWaterHeat);
    expect(totalsOf(planOf({ backup: { isBoiler: true } }), c).annual.backupElectricity).toBe(0);
  });

  test('of electricity are the uses added up', () => {
    const { annual, monthly } = totalsOf(planOf(), columnsOf());
    for (const totals of [annual, ...monthly]) {
      expectNear(
        totals.electricity,
        totals.heatPumpSpaceElectricity +
          totals.heatPumpWaterElectricity +
          totals.backupElectricity +
          totals.circulationElectricity +
          totals.standbyElectricity +
          totals.crankcaseElectricity,
      );
    }
  });

  test('of starts count every hour', () => {
    const c = columnsOf();
    expectNear(totalsOf(planOf(), c).starts, 8759 + c.starts[1416]!);
  });
});

test('hours are counted by their marks, an hour of several marks once for each', () => {
  const c = newColumns(HOURS);
  c.marks.set([MARK.heating, MARK.heating | MARK.backupForSpace | MARK.backupForWater, MARK.backupForWater]);
  c.marks[5000] = MARK.outsideMap | MARK.belowLowestFlow | MARK.cycling | MARK.heating;
  c.marks[5001] = MARK.flowAboveLimit | MARK.unmet | MARK.hotWaterShort | MARK.belowLowestFlow;
  expect(totalsOf(planOf(), c).hours).toEqual({
    backup: 2,
    backupForSpace: 1,
    backupForWater: 2,
    outsideMap: 1,
    belowLowestFlow: 2,
    flowAboveLimit: 1,
    cycling: 1,
    hotWaterShort: 1,
    heating: 3,
    unmet: 1,
  });
});

describe('a lumped house', () => {
  const result = massParameters(100, 'medium', 200, { windows: 0.25, opaque: 0.5, ventilation: 0.25 });
  if (!('mass' in result)) throw new Error(result.reason);
  const plan = planOf({ house: { mass: result.mass } });

  test('needs what unlimited heat would give; unmet is that less what was delivered, by month also below zero', () => {
    const c = newColumns(HOURS);
    c.unlimitedNeed.fill(3);
    c.spaceHeatNeed.fill(9);
    c.heatPumpSpaceHeat.fill(2).fill(3.5, 744, 1416);
    c.backupSpaceHeat.fill(0.5);
    const { annual, monthly } = totalsOf(plan, c);
    expectNear(annual.spaceHeatNeed, 3 * 8760);
    expectNear(monthly[0]!.unmetHeat, 0.5 * 744);
    expectNear(monthly[1]!.unmetHeat, -672);
    expectNear(annual.unmetHeat, 0.5 * (8760 - 672) - 672);
  });

  test('counts the kelvin-hours below its set point in hours with a need', () => {
    const c = newColumns(HOURS);
    c.indoorTemperature.fill(20);
    c.indoorTemperature.set([18, 19.5, 21, 15]);
    c.spaceHeatNeed.set([1, 1, 1, 0]);
    expectNear(totalsOf(plan, c).kelvinHoursBelow, 2.5);
    expect(totalsOf(planOf(), c).kelvinHoursBelow).toBe(0);
  });
});
