import { countAuxiliaries } from './auxiliaries.ts';
import { runBackup } from './backup.ts';
import { newColumns, type YearColumns } from './columns.ts';
import { degreeHourNeed } from './degreeHours.ts';
import { heatHotWater } from './hotWater.ts';
import { AT } from './hourScratch.ts';
import type { MassParameters } from './lumpedHouse.ts';
import type { MassOnWeather } from './massOnWeather.ts';
import { advanceRoom, needOfRoom, needWithUnlimitedHeat, START_UP_HOURS } from './roomWithMass.ts';
import { findCapacity, giveSpaceHeat, setFlow } from './spaceHeat.ts';
import type { YearPlan } from './yearPlan.ts';

/**
 * Simulates one year, stage by stage as MODEL lists them: need (4), hot water first (8), flow temperature (5), map and
 * frost (6, 7), space heat (9), backup (10), auxiliaries (11).
 *
 * @param plan everything prepared, all columns of one length
 * @param columns receives the year; handed in, the columns of an earlier run of the same length are used again
 * @returns the columns
 */
export function simulateYear(plan: YearPlan, columns: YearColumns = newColumns(plan.weather.hours)): YearColumns {
  const { hours } = columns;
  const { mass } = plan.house;
  if (mass !== null && plan.massOnWeather !== null) {
    needWithUnlimitedHeat(plan, mass, plan.massOnWeather, columns);
    heatRoomsWithMass(plan, mass, plan.massOnWeather, columns);
  } else {
    columns.indoorTemperature.fill(0);
    columns.unlimitedNeed.fill(0);
    degreeHourNeed(plan.house, plan.weather, columns.spaceHeatNeed);
    prepareHotWater(plan, columns, 0, hours);
    heatRooms(plan, columns);
  }
  countAuxiliaries(plan, columns);
  return columns;
}

function prepareHotWater(plan: YearPlan, c: YearColumns, from: number, to: number): void {
  if (plan.hotWater === null) clearHotWater(c);
  else heatHotWater(plan, plan.hotWater, c, from, to);
}

/** Columns may come from a run that had hot water. */
function clearHotWater(c: YearColumns): void {
  for (const column of [
    c.hotWaterShare,
    c.heatPumpWaterHeat,
    c.heatPumpWaterElectricity,
    c.backupWaterHeat,
    c.hotWaterServed,
    c.hotWaterShort,
    c.cylinderLoss,
    c.cylinderTemperature,
    c.marks,
  ]) {
    column.fill(0);
  }
}

/** Degree hours: the need is known for every hour, and heat that was displaced waits for the next. */
function heatRooms(plan: YearPlan, c: YearColumns): void {
  const hour = new Float64Array(AT.size);
  let waiting = 0;
  for (let i = 0; i < c.hours; i++) {
    if (c.spaceHeatNeed[i] === 0 && waiting === 0) restHour(c, i);
    else heatHour(plan, c, i, waiting, hour);
    waiting = c.waitingHeat[i];
  }
}

/** Lumped house: the need of an hour follows from what was really delivered before it. */
function heatRoomsWithMass(plan: YearPlan, mass: MassParameters, onWeather: MassOnWeather, c: YearColumns): void {
  const hour = new Float64Array(AT.size);
  const start = c.hours - START_UP_HOURS;
  let temperature = plan.house.setPoint[start];
  const run = (from: number, to: number) => {
    prepareHotWater(plan, c, from, to);
    for (let i = from; i < to; i++) {
      c.spaceHeatNeed[i] = needOfRoom(plan, mass, onWeather, i, temperature);
      if (c.spaceHeatNeed[i] === 0) restHour(c, i);
      else heatHour(plan, c, i, 0, hour);
      temperature = advanceRoom(mass, onWeather, c, i, temperature);
    }
  };
  run(start, c.hours);
  run(0, c.hours);
}

/** The stages of one hour with space heat asked. */
function heatHour(plan: YearPlan, c: YearColumns, i: number, waiting: number, hour: Float64Array): void {
  setFlow(plan, c, i, waiting, hour);
  findCapacity(plan, c, i, hour);
  giveSpaceHeat(plan, c, i, waiting, hour);
  runBackup(plan, c, i, hour);
}

/** An hour in which no space heat is asked. */
function restHour(c: YearColumns, i: number): void {
  c.flowTemperature[i] = 0;
  c.capacity[i] = 0;
  c.heatPumpSpaceHeat[i] = 0;
  c.heatPumpSpaceElectricity[i] = 0;
  c.backupSpaceHeat[i] = 0;
  c.unmetHeat[i] = 0;
  c.waitingHeat[i] = 0;
  c.starts[i] = 0;
}
