import { WATER_HEAT_CAPACITY } from '../core/constants.ts';
import { MARK, type YearColumns } from './columns.ts';
import type { HotWaterPlan } from './hotWaterPlan.ts';
import { CYLINDER } from './hourScratch.ts';
import { marksOfPoint } from './mapMarks.ts';
import { readHour } from './mapOnWeather.ts';
import type { Backup, YearPlan } from './yearPlan.ts';

/** The condenser's flow lies so far above the cylinder's mean temperature, and the cylinder below the highest flow, K. */
const FLOW_ABOVE_CYLINDER = 5;
/** A shortfall below this is rounding, kWh. */
export const SHORTFALL = 1e-10;
/** A temperature counts as reached within so many kelvins: rounding only. */
const REACHED = 1e-9;

/**
 * Draws, losses and reheating of the cylinder, hour by hour; hot water has priority, so nothing of the space heating is
 * asked here.
 *
 * @param plan a plan with hot water
 * @param hotWater its hot-water part
 * @param c receives the hot-water columns of the hours `from` … `to` − 1
 * @param from first hour; the cylinder starts there at its set point
 * @param to last hour, excluded
 * @param state the cylinder at the first hour's beginning, by the places of CYLINDER; left as it is at the end
 *
 * Reference: MODEL section 8.
 */
export function heatHotWater(
  plan: YearPlan,
  hotWater: HotWaterPlan,
  c: YearColumns,
  from: number,
  to: number,
  state: Float64Array = fullCylinder(hotWater),
): void {
  for (let i = from; i < to; i++) {
    c.marks[i] = 0;
    drawAndLose(hotWater, c, i, state);
    reheatWhereDue(plan, hotWater, c, i, state);
  }
}

/** State of a cylinder at its set point, with nothing under way. */
export function fullCylinder(hotWater: HotWaterPlan): Float64Array {
  const state = new Float64Array(CYLINDER.size);
  state[CYLINDER.temperature] = hotWater.setPoint;
  return state;
}

/** Heat of a kelvin of the whole cylinder, kWh/K. */
export function cylinderCapacity(hotWater: HotWaterPlan): number {
  return hotWater.volume * WATER_HEAT_CAPACITY;
}

/** Heat above the cold water in a cylinder of a temperature in °C, kWh, never negative. */
export function storedHeat(hotWater: HotWaterPlan, i: number, temperature: number): number {
  return Math.max(0, cylinderCapacity(hotWater) * (temperature - hotWater.coldWater[i]));
}

/** Temperature below which a reheat begins, °C. */
export function reheatBelow(hotWater: HotWaterPlan): number {
  return hotWater.setPoint - hotWater.hysteresis;
}

/** Served is at most the heat stored above the cold water at the hour's beginning; the loss is from its first temperature. */
export function drawAndLose(hotWater: HotWaterPlan, c: YearColumns, i: number, state: Float64Array): void {
  const first = state[CYLINDER.temperature];
  const asked = hotWater.draw[i];
  const served = Math.min(asked, storedHeat(hotWater, i, first));
  const loss = hotWater.lossCoefficient * (first - hotWater.surroundingTemperature);
  c.hotWaterServed[i] = served;
  c.hotWaterShort[i] = asked - served;
  if (asked - served > SHORTFALL) c.marks[i] |= MARK.hotWaterShort;
  c.cylinderLoss[i] = loss;
  state[CYLINDER.temperature] = first - (served + loss) / cylinderCapacity(hotWater);
}

/** Reheats the cylinder in an hour in which it is due and allowed; the hour's draw and loss are behind. */
export function reheatWhereDue(
  plan: YearPlan,
  hotWater: HotWaterPlan,
  c: YearColumns,
  i: number,
  state: Float64Array,
): void {
  c.hotWaterShare[i] = 0;
  c.heatPumpWaterHeat[i] = 0;
  c.heatPumpWaterElectricity[i] = 0;
  c.backupWaterHeat[i] = 0;
  if (hotWater.hygieneAsked[i] === 1) state[CYLINDER.hygienePending] = 1;
  const due =
    state[CYLINDER.reheating] === 1 ||
    state[CYLINDER.hygienePending] === 1 ||
    state[CYLINDER.temperature] < reheatBelow(hotWater);
  if (due && hotWater.allowed[i] === 1) reheat(plan, hotWater, c, i, state);
  c.cylinderTemperature[i] = state[CYLINDER.temperature];
}

/** One hour of reheating: the heat pump as far as its flow reaches, then the heater or the boiler in the rest of the hour. */
function reheat(plan: YearPlan, hotWater: HotWaterPlan, c: YearColumns, i: number, state: Float64Array): void {
  const first = state[CYLINDER.temperature];
  const capacity = cylinderCapacity(hotWater);
  const target = state[CYLINDER.hygienePending] === 1 ? hotWater.hygieneTemperature : hotWater.setPoint;
  const { unitOnWeather, backup } = plan;
  let given = 0;
  let share = 0;
  let finished = true;
  const reach = Math.min(target, unitOnWeather.highestFlow[i] - FLOW_ABOVE_CYLINDER);
  state[CYLINDER.target] = target;
  state[CYLINDER.reach] = reach;
  if (plan.resting[i] === 0 && reach > first) {
    const flow = (first + reach) / 2 + FLOW_ABOVE_CYLINDER;
    const outdoor = plan.weather.temperature[i];
    readHour(unitOnWeather.full, i, outdoor, flow, state, CYLINDER.mapCapacity);
    const kW = state[CYLINDER.mapCapacity] * (1 - unitOnWeather.capacityLoss[i]);
    const cop = state[CYLINDER.mapCop] * (1 - unitOnWeather.copLoss[i]) * (1 - plan.inUseAllowance);
    state[CYLINDER.flow] = flow;
    state[CYLINDER.capacity] = kW;
    state[CYLINDER.cop] = cop;
    const wanted = capacity * (reach - first);
    finished = wanted <= kW;
    given = finished ? wanted : kW;
    share = finished ? wanted / kW : 1;
    c.heatPumpWaterHeat[i] = given;
    c.heatPumpWaterElectricity[i] = given / cop;
    c.hotWaterShare[i] = share;
    c.marks[i] |= marksOfPoint(unitOnWeather.unit.full, outdoor, flow);
  }
  const lacking = capacity * (target - first) - given;
  if (finished && lacking > 0) {
    c.backupWaterHeat[i] = Math.min(lacking, waterHeaterPower(backup, hotWater) * (1 - share));
    given += c.backupWaterHeat[i];
    if (c.backupWaterHeat[i] > 0) c.marks[i] |= MARK.backupForWater;
  }
  state[CYLINDER.temperature] = first + given / capacity;
  const reached = state[CYLINDER.temperature] >= target - REACHED;
  state[CYLINDER.reheating] = reached ? 0 : 1;
  if (reached) state[CYLINDER.hygienePending] = 0;
}

/** What heats the cylinder beside the heat pump, kW: the boiler of a hybrid, else the immersion heater. */
export function waterHeaterPower(backup: Backup, hotWater: HotWaterPlan): number {
  return backup.isBoiler ? backup.power : hotWater.immersionPower;
}
