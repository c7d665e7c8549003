import { countAuxiliaries } from './auxiliaries.ts';
import { newColumns, type YearColumns } from './columns.ts';
import { degreeHourNeed } from './degreeHours.ts';
import { heatHotWater } from './hotWater.ts';
import { runRoomsByStages } from './roomsByStages.ts';
import { runRooms } from './roomsKernel.ts';
import { needWithUnlimitedHeat, START_UP_HOURS } from './roomWithMass.ts';
import { runHotWater } from './waterKernel.ts';
import type { YearPlan } from './yearPlan.ts';

/** How the hours of hot water and rooms are run; both ways leave the same columns, to the last bit. */
interface Loops {
  readonly hotWater: (plan: YearPlan, c: YearColumns, from: number, to: number) => void;
  readonly rooms: (plan: YearPlan, c: YearColumns, from: number, to: number, massTemperature: number) => number;
}

/** Each in one loop with everything at hand. */
const kernels: Loops = {
  hotWater: (plan, c, from, to) => {
    if (plan.hotWater !== null) runHotWater(plan, plan.hotWater, c, from, to);
  },
  rooms: runRooms,
};

/** Stage by stage, as MODEL lists them: the text to read, the mode `cheapest`, and what the loops are held against. */
const stages: Loops = {
  hotWater: (plan, c, from, to) => {
    if (plan.hotWater !== null) heatHotWater(plan, plan.hotWater, c, from, to);
  },
  rooms: runRoomsByStages,
};

/**
 * Simulates one year: need (MODEL section 4), hot water first (8), flow temperature (5), map and frost (6, 7), space heat
 * (9), backup (10), auxiliaries (11).
 *
 * @param plan everything prepared, all columns of one length
 * @param columns receives the year; handed in, the columns of an earlier run of the same length are used again
 * @returns the columns
 */
export function simulateYear(plan: YearPlan, columns: YearColumns = newColumns(plan.weather.hours)): YearColumns {
  return runYear(plan, columns, plan.sourcePrices === null ? kernels : stages);
}

/** The same year, stage by stage whatever the plan. */
export function simulateByStages(plan: YearPlan, columns: YearColumns = newColumns(plan.weather.hours)): YearColumns {
  return runYear(plan, columns, stages);
}

function runYear(plan: YearPlan, c: YearColumns, loops: Loops): YearColumns {
  const { hours } = c;
  const { mass } = plan.house;
  if (plan.hotWater === null) clearHotWater(c);
  if (mass !== null && plan.massOnWeather !== null) {
    needWithUnlimitedHeat(plan, mass, plan.massOnWeather, c);
    const start = hours - START_UP_HOURS;
    loops.hotWater(plan, c, start, hours);
    const atMass = loops.rooms(plan, c, start, hours, plan.house.setPoint[start]);
    c.marks.fill(0);
    loops.hotWater(plan, c, 0, hours);
    loops.rooms(plan, c, 0, hours, atMass);
  } else {
    clearMass(c);
    degreeHourNeed(plan.house, plan.weather, c.spaceHeatNeed);
    loops.hotWater(plan, c, 0, hours);
    loops.rooms(plan, c, 0, hours, 0);
  }
  countAuxiliaries(plan, c);
  return c;
}

/** Columns may come from a run that had hot water. */
function clearHotWater(c: YearColumns): void {
  c.hotWaterShare.fill(0);
  c.heatPumpWaterHeat.fill(0);
  c.heatPumpWaterElectricity.fill(0);
  c.backupWaterHeat.fill(0);
  c.hotWaterServed.fill(0);
  c.hotWaterShort.fill(0);
  c.cylinderLoss.fill(0);
  c.cylinderTemperature.fill(0);
  c.marks.fill(0);
}

/** Columns may come from a house with mass. */
function clearMass(c: YearColumns): void {
  c.indoorTemperature.fill(0);
  c.massTemperature.fill(0);
  c.unlimitedNeed.fill(0);
}
