import { MARK, type YearColumns } from './columns.ts';
import { cylinderCapacity, fullCylinder, reheatBelow, reheatWhereDue, SHORTFALL } from './hotWater.ts';
import type { HotWaterPlan } from './hotWaterPlan.ts';
import { CYLINDER } from './hourScratch.ts';
import type { YearPlan } from './yearPlan.ts';

/**
 * The hours `from` … `to` − 1 of the cylinder in one loop: the same as `heatHotWater`, to the last bit, with every column
 * at hand before it begins. Most hours only draw and lose; an hour in which a reheat is due is handed to the stage.
 *
 * @param from first hour; the cylinder starts there at its set point
 * @param to last hour, excluded
 *
 * Reference: MODEL section 8.
 */
export function runHotWater(plan: YearPlan, hotWater: HotWaterPlan, c: YearColumns, from: number, to: number): void {
  const { draw, coldWater, allowed, hygieneAsked, lossCoefficient, surroundingTemperature } = hotWater;
  const { hotWaterServed, hotWaterShort, cylinderLoss, cylinderTemperature, hotWaterShare } = c;
  const { heatPumpWaterHeat, heatPumpWaterElectricity, backupWaterHeat, marks } = c;
  const capacity = cylinderCapacity(hotWater);
  const begin = reheatBelow(hotWater);
  const state = fullCylinder(hotWater);
  for (let i = from; i < to; i++) {
    const first = state[CYLINDER.temperature];
    const asked = draw[i];
    const served = Math.min(asked, Math.max(0, capacity * (first - coldWater[i])));
    const loss = lossCoefficient * (first - surroundingTemperature);
    hotWaterServed[i] = served;
    hotWaterShort[i] = asked - served;
    cylinderLoss[i] = loss;
    marks[i] = asked - served > SHORTFALL ? MARK.hotWaterShort : 0;
    const after = first - (served + loss) / capacity;
    state[CYLINDER.temperature] = after;
    if (hygieneAsked[i] === 1) state[CYLINDER.hygienePending] = 1;
    const due = after < begin || state[CYLINDER.reheating] === 1 || state[CYLINDER.hygienePending] === 1;
    if (due && allowed[i] === 1) {
      reheatWhereDue(plan, hotWater, c, i, state);
    } else {
      hotWaterShare[i] = 0;
      heatPumpWaterHeat[i] = 0;
      heatPumpWaterElectricity[i] = 0;
      backupWaterHeat[i] = 0;
      cylinderTemperature[i] = after;
    }
  }
}
