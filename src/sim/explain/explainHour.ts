import type { YearColumns } from '../columns.ts';
import type { YearPlan } from '../yearPlan.ts';
import { type AirAsRead, airStage } from './explainAir.ts';
import { backupStages } from './explainBackup.ts';
import { flowStage } from './explainFlow.ts';
import { hotWaterStages } from './explainHotWater.ts';
import { inputStages } from './explainInputs.ts';
import { levelStages } from './explainLevels.ts';
import { needStage, roomStages } from './explainNeed.ts';
import { runningStages } from './explainRunning.ts';
import { hourAgain } from './hourAgain.ts';
import type { ExplainedStage } from './stage.ts';

/**
 * Every intermediate figure of one hour of a simulated year, stage by stage in the order of the model.
 *
 * The stages of that hour are run once more from what the hour before has left, by the same code as the year, so that each
 * figure is the one that the year was made of, to the last bit.
 *
 * @param plan the plan that was simulated
 * @param year its columns
 * @param i hour, 0 … hours − 1
 * @param air the air as the weather file has it
 * @returns the stages; each has figures, or a finding that says why there are none
 *
 * Reference: MODEL sections 3 to 11.
 */
export function explainHour(plan: YearPlan, year: YearColumns, i: number, air: AirAsRead): ExplainedStage[] {
  const again = hourAgain(plan, year, i);
  // in this order: each stage reads what those before it have left
  return [
    airStage(again, air),
    needStage(again),
    ...hotWaterStages(again),
    flowStage(again),
    ...levelStages(again),
    ...runningStages(again),
    ...backupStages(again),
    ...roomStages(again),
    ...inputStages(again),
  ];
}
