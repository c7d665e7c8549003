import { WATER_HEAT_CAPACITY } from '../core/constants.ts';
import { MARK, type YearColumns } from './columns.ts';
import type { HotWaterPlan } from './hotWaterPlan.ts';
import { marksOfPoint } from './mapMarks.ts';
import { readHour } from './mapOnWeather.ts';
import type { YearPlan } from './yearPlan.ts';

/** The condenser's flow lies so far above the cylinder's mean temperature, and the cylinder below the highest flow, K. */
const FLOW_ABOVE_CYLINDER = 5;
/** A shortfall below this is rounding, kWh. */
const SHORTFALL = 1e-10;
/** A temperature counts as reached within so many kelvins: rounding only. */
const REACHED = 1e-9;

/** Places of the state that one hour hands to the next. */
const TEMPERATURE = 0;
const REHEATING = 1;
const HYGIENE_PENDING = 2;

/**
 * Draws, losses and reheating of the cylinder, hour by hour; hot water has priority, so nothing of the space heating is
 * asked here.
 *
 * @param plan a plan with hot water
 * @param hotWater its hot-water part
 * @param c receives the hot-water columns of the hours `from` … `to` − 1
 * @param from first hour; the cylinder starts there at its set point
 * @param to last hour, excluded
 *
 * Reference: MODEL section 8.
 */
export function heatHotWater(plan: YearPlan, hotWater: HotWaterPlan, c: YearColumns, from: number, to: number): void {
  const state = new Float64Array(3);
  const point = new Float64Array(2);
  state[TEMPERATURE] = hotWater.setPoint;
  for (let i = from; i < to; i++) {
    c.marks[i] = 0;
    drawAndLose(hotWater, c, i, state);
    c.hotWaterShare[i] = 0;
    c.heatPumpWaterHeat[i] = 0;
    c.heatPumpWaterElectricity[i] = 0;
    c.backupWaterHeat[i] = 0;
    if (hotWater.hygieneAsked[i] === 1) state[HYGIENE_PENDING] = 1;
    const due =
      state[REHEATING] === 1 ||
      state[HYGIENE_PENDING] === 1 ||
      state[TEMPERATURE] < hotWater.setPoint - hotWater.hysteresis;
    if (due && hotWater.allowed[i] === 1) reheat(plan, hotWater, c, i, state, point);
    c.cylinderTemperature[i] = state[TEMPERATURE];
  }
}

/** Served is at most the heat stored above the cold water at the hour's beginning; the loss is from its first temperature. */
function drawAndLose(hotWater: HotWaterPlan, c: YearColumns, i: number, state: Float64Array): void {
  const first = state[TEMPERATURE];
  const capacity = hotWater.volume * WATER_HEAT_CAPACITY;
  const asked = hotWater.draw[i];
  const served = Math.min(asked, Math.max(0, capacity * (first - hotWater.coldWater[i])));
  const loss = hotWater.lossCoefficient * (first - hotWater.surroundingTemperature);
  c.hotWaterServed[i] = served;
  c.hotWaterShort[i] = asked - served;
  if (asked - served > SHORTFALL) c.marks[i] |= MARK.hotWaterShort;
  c.cylinderLoss[i] = loss;
  state[TEMPERATURE] = first - (served + loss) / capacity;
}

/** One hour of reheating: the heat pump as far as its flow reaches, then the heater or the boiler in the rest of the hour. */
function reheat(
  plan: YearPlan,
  hotWater: HotWaterPlan,
  c: YearColumns,
  i: number,
  state: Float64Array,
  point: Float64Array,
): void {
  const first = state[TEMPERATURE];
  const capacity = hotWater.volume * WATER_HEAT_CAPACITY;
  const target = state[HYGIENE_PENDING] === 1 ? hotWater.hygieneTemperature : hotWater.setPoint;
  const { unitOnWeather, backup } = plan;
  let given = 0;
  let share = 0;
  let finished = true;
  const reach = Math.min(target, unitOnWeather.highestFlow[i] - FLOW_ABOVE_CYLINDER);
  if (plan.resting[i] === 0 && reach > first) {
    const flow = (first + reach) / 2 + FLOW_ABOVE_CYLINDER;
    const outdoor = plan.weather.temperature[i];
    readHour(unitOnWeather.full, i, outdoor, flow, point, 0);
    const kW = point[0] * (1 - unitOnWeather.capacityLoss[i]);
    const cop = point[1] * (1 - unitOnWeather.copLoss[i]) * (1 - plan.inUseAllowance);
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
    const power = backup.isBoiler ? backup.power : hotWater.immersionPower;
    c.backupWaterHeat[i] = Math.min(lacking, power * (1 - share));
    given += c.backupWaterHeat[i];
    if (c.backupWaterHeat[i] > 0) c.marks[i] |= MARK.backupForWater;
  }
  state[TEMPERATURE] = first + given / capacity;
  const reached = state[TEMPERATURE] >= target - REACHED;
  state[REHEATING] = reached ? 0 : 1;
  if (reached) state[HYGIENE_PENDING] = 0;
}
