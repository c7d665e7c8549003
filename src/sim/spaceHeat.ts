import { MARK, type YearColumns } from './columns.ts';
import { emitterFlow, emitterLoad, returnTemperature } from './flowTemperature.ts';
import { AT } from './hourScratch.ts';
import { readLevels } from './levels.ts';
import { marksOfPoint } from './mapMarks.ts';
import { priceRate } from './partLoad.ts';
import type { YearPlan } from './yearPlan.ts';

/** Heat may wait for at most so many hours of the design load (MODEL section 9). */
export const WAITING_HOURS = 2;

/**
 * Flow temperature of the hour.
 *
 * @param waiting heat left from the hour before, kWh
 *
 * Reference: MODEL section 5.
 */
export function setFlow(plan: YearPlan, c: YearColumns, i: number, waiting: number, hour: Float64Array): void {
  const { flow, house } = plan;
  const need = c.spaceHeatNeed[i];
  if (need > 0) c.marks[i] |= MARK.heating;
  if (flow.set !== null) {
    hour[AT.load] = need / house.designLoad;
    c.flowTemperature[i] = flow.set[i];
    return;
  }
  const share = c.hotWaterShare[i];
  const limited = plan.quietShare !== null && plan.quietShare[i] < 1;
  const harder = share > 0 || (waiting > 0 && !limited);
  hour[AT.load] = harder ? emitterLoad(need, waiting, share, house.designLoad) : need / house.designLoad;
  c.flowTemperature[i] = emitterFlow(flow, hour[AT.load]);
}

/**
 * Capacity and COP of both levels at the hour's outdoor and flow temperature, after frost loss; nothing where the unit
 * rests.
 *
 * Reference: MODEL sections 6, 7 and 9.
 */
export function findCapacity(plan: YearPlan, c: YearColumns, i: number, hour: Float64Array): void {
  if (plan.resting[i] === 1) {
    hour[AT.capacity] = 0;
    c.capacity[i] = 0;
    return;
  }
  const flow = Math.min(c.flowTemperature[i], plan.unitOnWeather.highestFlow[i]);
  readLevels(plan.unitOnWeather, i, plan.weather.temperature[i], flow, hour);
  c.capacity[i] = hour[AT.capacity];
}

/**
 * Space heat that the heat pump gives, after hot water has had its share of the hour; what it displaced waits.
 *
 * @param waiting heat left from the hour before, kWh; always 0 with a lumped house
 *
 * Leaves in the scratch what was asked, what could be given, and the top-up that is the backup's. Reference: MODEL section 9.
 */
export function giveSpaceHeat(plan: YearPlan, c: YearColumns, i: number, waiting: number, hour: Float64Array): void {
  const need = c.spaceHeatNeed[i];
  const flow = c.flowTemperature[i];
  const highest = plan.unitOnWeather.highestFlow[i];
  let carried = need;
  if (flow > highest) {
    const back = returnTemperature(plan.flow, flow, hour[AT.load]);
    carried = need * shareThroughLimit(highest, flow, back);
    if (need > 0) c.marks[i] |= MARK.flowAboveLimit;
  }
  const free = 1 - c.hotWaterShare[i];
  const full = hour[AT.capacity];
  const canGive = (plan.quietShare === null ? full : full * plan.quietShare[i]) * free;
  const asked = carried + waiting;
  const given = Math.min(asked, canGive);
  hour[AT.topUp] = need - carried;
  hour[AT.asked] = asked;
  hour[AT.canGive] = canGive;
  c.waitingHeat[i] = leftWaiting(plan, c, i, asked - given, displacedHeat(waiting, full, canGive));
  runAt(plan, c, i, given, hour);
}

/** Share of the need that a highest flow carries where a hotter one is asked; the three temperatures in °C. */
export function shareThroughLimit(highest: number, flow: number, back: number): number {
  return Math.min(Math.max((highest - back) / (flow - back), 0), 1);
}

/** Most that hot water and quiet hours can have displaced, kWh: what waited, and full capacity less what can be given. */
export function displacedHeat(waiting: number, full: number, canGive: number): number {
  return waiting + full - canGive;
}

/** Heat that waits: with degree hours for the next hour, with mass it is what the room waits for in this one. */
function leftWaiting(plan: YearPlan, c: YearColumns, i: number, lacking: number, displaced: number): number {
  if (plan.house.mass !== null) return Math.min(lacking, displaced);
  if (plan.resting[i] === 1 || i === c.hours - 1) return 0;
  return Math.min(lacking, plan.house.designLoad * WAITING_HOURS, displaced);
}

/**
 * Enters a rate of the heat pump into the columns: heat, electricity and starts.
 *
 * @param given heat of the hour, kWh
 */
export function runAt(plan: YearPlan, c: YearColumns, i: number, given: number, hour: Float64Array): void {
  c.heatPumpSpaceHeat[i] = given;
  c.heatPumpSpaceElectricity[i] = 0;
  c.starts[i] = 0;
  if (given <= 0) return;
  priceRate(plan, given, 1 - c.hotWaterShare[i], hour);
  c.heatPumpSpaceElectricity[i] = hour[AT.electricity];
  c.starts[i] = hour[AT.starts];
}

/** A rate so little below the lowest level is the lowest level: rounding only. */
export const ROUNDING = 1e-9;

/**
 * Marks the hour for the heat that the heat pump gives in the end, once it is settled what a cheaper boiler takes over.
 *
 * Reference: MODEL sections 6 (hours outside the grid) and 9 (cycling).
 */
export function markSpaceHeat(plan: YearPlan, c: YearColumns, i: number, hour: Float64Array): void {
  const given = c.heatPumpSpaceHeat[i];
  if (given <= 0) return;
  const least = Math.min(hour[AT.lowestCapacity], hour[AT.capacity]);
  if (given / (1 - c.hotWaterShare[i]) < least * (1 - ROUNDING)) c.marks[i] |= MARK.cycling;
  const flow = Math.min(c.flowTemperature[i], plan.unitOnWeather.highestFlow[i]);
  c.marks[i] |= marksOfPoint(plan.unitOnWeather.unit.full, plan.weather.temperature[i], flow);
}
