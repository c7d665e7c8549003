import { runBackup } from './backup.ts';
import type { YearColumns } from './columns.ts';
import { AT } from './hourScratch.ts';
import { advanceRoom, needOfRoom } from './roomWithMass.ts';
import { findCapacity, giveSpaceHeat, markSpaceHeat, setFlow } from './spaceHeat.ts';
import type { YearPlan } from './yearPlan.ts';

/**
 * The hours `from` … `to` − 1 of the rooms, stage by stage as MODEL lists them. With degree hours the need is there
 * already and heat that was displaced waits for the next hour; in a lumped house the need of an hour follows from what
 * was really delivered before it.
 *
 * @param plan any plan
 * @param c the year; need (degree hours) and hot water are there already
 * @param from first hour; nothing waits from before
 * @param to last hour, excluded
 * @param massTemperature mass of a lumped house at the first hour's beginning, °C; 0 with degree hours
 * @returns mass at the end of the last hour, °C
 */
export function runRoomsByStages(
  plan: YearPlan,
  c: YearColumns,
  from: number,
  to: number,
  massTemperature: number,
): number {
  const { mass } = plan.house;
  const { massOnWeather } = plan;
  const hour = new Float64Array(AT.size);
  let waiting = 0;
  let temperature = massTemperature;
  for (let i = from; i < to; i++) {
    if (mass === null || massOnWeather === null) {
      heatHour(plan, c, i, waiting, hour);
      waiting = c.waitingHeat[i];
    } else {
      c.massTemperature[i] = temperature;
      c.spaceHeatNeed[i] = needOfRoom(plan, mass, massOnWeather, i, temperature);
      heatHour(plan, c, i, 0, hour);
      temperature = advanceRoom(mass, massOnWeather, c, i, temperature);
    }
  }
  return temperature;
}

/** The stages of one hour. */
function heatHour(plan: YearPlan, c: YearColumns, i: number, waiting: number, hour: Float64Array): void {
  if (c.spaceHeatNeed[i] === 0 && waiting === 0) {
    restHour(c, i);
    return;
  }
  setFlow(plan, c, i, waiting, hour);
  findCapacity(plan, c, i, hour);
  giveSpaceHeat(plan, c, i, waiting, hour);
  runBackup(plan, c, i, hour);
  markSpaceHeat(plan, c, i, hour);
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
