import { newColumns } from './columns.ts';
import { fullCylinder, heatHotWater } from './hotWater.ts';
import { CYLINDER } from './hourScratch.ts';
import type { YearPlan } from './yearPlan.ts';

/**
 * The flow at which the heat pump heats the cylinder, hour by hour. The year's columns do not hold it, so the cylinder, of
 * which nothing else is asked, is run once more.
 *
 * @param plan that was run
 * @returns °C by hour; NaN where the heat pump does not heat the cylinder, in every hour without hot water
 *
 * Reference: MODEL section 8: halfway between first temperature and what the heat pump reaches, and 5 K above.
 */
export function waterFlowTemperatures(plan: YearPlan): Float64Array {
  const { hours } = plan.weather;
  const flow = new Float64Array(hours).fill(Number.NaN);
  const { hotWater } = plan;
  if (hotWater === null) return flow;
  const columns = newColumns(hours);
  const state = fullCylinder(hotWater);
  for (let i = 0; i < hours; i++) {
    heatHotWater(plan, hotWater, columns, i, i + 1, state);
    if (columns.heatPumpWaterHeat[i] > 0) flow[i] = state[CYLINDER.flow];
  }
  return flow;
}
