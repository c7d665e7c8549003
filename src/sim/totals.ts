import { columnSum } from '../core/columnSum.ts';
import { compensatedSum } from '../core/sum.ts';
import { MARK, MARK_COMBINATIONS, type YearColumns } from './columns.ts';
import type { YearPlan } from './yearPlan.ts';

/** Sums of a year or of a month; kWh, hours, K·h. */
export interface EnergyTotals {
  /** Need of the rooms; with a lumped house that of the second pass with unlimited heat. */
  readonly spaceHeatNeed: number;
  readonly heatPumpSpaceHeat: number;
  readonly heatPumpWaterHeat: number;
  readonly backupSpaceHeat: number;
  readonly backupWaterHeat: number;
  /** Lumped house: need less what was delivered, negative in a month of recovery. */
  readonly unmetHeat: number;
  readonly hotWaterAsked: number;
  readonly hotWaterShort: number;
  readonly cylinderLoss: number;
  readonly heatPumpSpaceElectricity: number;
  readonly heatPumpWaterElectricity: number;
  /** Electricity of an electric backup and of the heater in the cylinder; 0 with a boiler. */
  readonly backupElectricity: number;
  readonly circulationElectricity: number;
  readonly standbyElectricity: number;
  readonly crankcaseElectricity: number;
  /** All electricity of the heating system: the uses above, summed. */
  readonly electricity: number;
  /** Fuel of a boiler backup. */
  readonly fuel: number;
}

/** Hours of the year in which something held. */
export interface HourCounts {
  readonly backup: number;
  readonly backupForSpace: number;
  readonly backupForWater: number;
  readonly outsideMap: number;
  readonly belowLowestFlow: number;
  readonly flowAboveLimit: number;
  readonly cycling: number;
  readonly hotWaterShort: number;
  readonly heating: number;
  readonly unmet: number;
}

export interface YearTotals {
  readonly annual: EnergyTotals;
  /** Twelve months of standard time. */
  readonly monthly: readonly EnergyTotals[];
  readonly hours: HourCounts;
  /** Compressor starts, an estimate. */
  readonly starts: number;
  /** Lumped house: kelvin-hours below the set point in hours with need. */
  readonly kelvinHoursBelow: number;
}

/**
 * Months and year of a run; the year is the sum of its months.
 *
 * @param plan the plan that was run
 * @param c its columns
 */
export function totalsOf(plan: YearPlan, c: YearColumns): YearTotals {
  const monthly: EnergyTotals[] = [];
  for (let month = 0; month < 12; month++) {
    monthly.push(sumHours(plan, c, plan.weather.monthStart[month], plan.weather.monthStart[month + 1]));
  }
  return {
    annual: sumMonths(monthly),
    monthly,
    hours: countHours(c),
    starts: columnSum(c.starts, 0, c.hours),
    kelvinHoursBelow: plan.house.mass === null ? 0 : kelvinHoursBelow(plan, c),
  };
}

function sumHours(plan: YearPlan, c: YearColumns, from: number, to: number): EnergyTotals {
  const sum = (column: Float64Array) => columnSum(column, from, to);
  // columns that the plan leaves zero need no sum
  const ofWater = (column: Float64Array) => (plan.hotWater === null ? 0 : sum(column));
  const lumped = plan.house.mass !== null;
  const need = sum(lumped ? c.unlimitedNeed : c.spaceHeatNeed);
  const heatPumpSpaceHeat = sum(c.heatPumpSpaceHeat);
  const backupSpaceHeat = sum(c.backupSpaceHeat);
  const backupWaterHeat = ofWater(c.backupWaterHeat);
  const short = ofWater(c.hotWaterShort);
  const uses = {
    heatPumpSpaceElectricity: sum(c.heatPumpSpaceElectricity),
    heatPumpWaterElectricity: ofWater(c.heatPumpWaterElectricity),
    backupElectricity: plan.backup.isBoiler ? 0 : backupSpaceHeat + backupWaterHeat,
    circulationElectricity: sum(c.circulationElectricity),
    standbyElectricity: sum(c.standbyElectricity),
    crankcaseElectricity: sum(c.crankcaseElectricity),
  };
  return {
    spaceHeatNeed: need,
    heatPumpSpaceHeat,
    heatPumpWaterHeat: ofWater(c.heatPumpWaterHeat),
    backupSpaceHeat,
    backupWaterHeat,
    unmetHeat: lumped ? need - heatPumpSpaceHeat - backupSpaceHeat : sum(c.unmetHeat),
    hotWaterAsked: ofWater(c.hotWaterServed) + short,
    hotWaterShort: short,
    cylinderLoss: ofWater(c.cylinderLoss),
    ...uses,
    electricity: compensatedSum(Object.values(uses)),
    fuel: plan.backup.isBoiler ? sum(c.fuel) : 0,
  };
}

function sumMonths(monthly: readonly EnergyTotals[]): EnergyTotals {
  const total = (key: keyof EnergyTotals) => compensatedSum(monthly.map((month) => month[key]));
  return {
    spaceHeatNeed: total('spaceHeatNeed'),
    heatPumpSpaceHeat: total('heatPumpSpaceHeat'),
    heatPumpWaterHeat: total('heatPumpWaterHeat'),
    backupSpaceHeat: total('backupSpaceHeat'),
    backupWaterHeat: total('backupWaterHeat'),
    unmetHeat: total('unmetHeat'),
    hotWaterAsked: total('hotWaterAsked'),
    hotWaterShort: total('hotWaterShort'),
    cylinderLoss: total('cylinderLoss'),
    heatPumpSpaceElectricity: total('heatPumpSpaceElectricity'),
    heatPumpWaterElectricity: total('heatPumpWaterElectricity'),
    backupElectricity: total('backupElectricity'),
    circulationElectricity: total('circulationElectricity'),
    standbyElectricity: total('standbyElectricity'),
    crankcaseElectricity: total('crankcaseElectricity'),
    electricity: total('electricity'),
    fuel: total('fuel'),
  };
}

/** Hours by mark, from how often each combination of marks stands in the year. */
function countHours(c: YearColumns): HourCounts {
  const frequency = new Int32Array(MARK_COMBINATIONS);
  for (let i = 0; i < c.hours; i++) frequency[c.marks[i]]++;
  const met: number[] = [];
  for (let marks = 0; marks < MARK_COMBINATIONS; marks++) if (frequency[marks] > 0) met.push(marks);
  const count = (bits: number) => met.reduce((sum, marks) => sum + ((marks & bits) === 0 ? 0 : frequency[marks]), 0);
  return {
    backup: count(MARK.backupForSpace | MARK.backupForWater),
    backupForSpace: count(MARK.backupForSpace),
    backupForWater: count(MARK.backupForWater),
    outsideMap: count(MARK.outsideMap),
    belowLowestFlow: count(MARK.belowLowestFlow),
    flowAboveLimit: count(MARK.flowAboveLimit),
    cycling: count(MARK.cycling),
    hotWaterShort: count(MARK.hotWaterShort),
    heating: count(MARK.heating),
    unmet: count(MARK.unmet),
  };
}

function kelvinHoursBelow(plan: YearPlan, c: YearColumns): number {
  const { setPoint } = plan.house;
  let sum = 0;
  for (let i = 0; i < c.hours; i++) {
    if (c.spaceHeatNeed[i] > 0) sum += Math.max(0, setPoint[i] - c.indoorTemperature[i]);
  }
  return sum;
}
