import { askedOfBackup, availableBackup, costByBoiler, costByHeatPump, runBackup } from '../backup.ts';
import { AT } from '../hourScratch.ts';
import { isOnlyOffer, rateStage } from './explainRunning.ts';
import type { Figures } from './figures.ts';
import { asksSpaceHeat, type HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage, idleStage } from './stage.ts';

/** Heat of the backup for the rooms, and what a cheaper boiler leaves to the heat pump (MODEL section 10). */
export function backupStages(again: HourAgain): ExplainedStage[] {
  if (!asksSpaceHeat(again)) return [idleStage('backup', 'noHeatAsked')];
  const { plan, c, i, hour } = again;
  const carries = isOnlyOffer(again);
  const costs = comparedCosts(again);
  const asked = askedOfBackup(c, i, hour);
  const backupAvailable = availableBackup(plan.backup, c, i);
  runBackup(plan, c, i, hour);
  const stage = explainedStage('backup', {
    figures: {
      ...costs,
      topUp: hour[AT.topUp],
      ...(carries ? { askedOfHeatPump: hour[AT.asked] } : { backupAsked: Math.max(0, asked) }),
      backupAvailable,
      backupSpaceHeat: c.backupSpaceHeat[i],
      ...(carries ? { heatPumpSpaceHeat: c.heatPumpSpaceHeat[i], waitingHeat: c.waitingHeat[i] } : {}),
      unmetHeat: c.unmetHeat[i],
    },
    findings: [
      carries && 'boilerCarries',
      !carries && costs.costByBoiler !== undefined && 'heatPumpCheaper',
      !carries && asked <= 0 && 'noBackupNeeded',
      c.unmetHeat[i] > 0 && 'unmet',
    ],
    formulas: [costs.costByBoiler !== undefined && 'cheapest', carries ? 'boilerCarries' : 'backupParallel'],
  });
  return carries ? [stage, rateStage(again, 'rateLeft')] : [stage];
}

/** Both costs of what the heat pump could give; nothing where they are not compared. */
function comparedCosts({ plan, c, i }: HourAgain): Figures {
  const { sourcePrices: prices, backup } = plan;
  if (prices === null || c.heatPumpSpaceHeat[i] <= 0) return {};
  return {
    electricityPrice: prices.electricity[i],
    costByHeatPump: costByHeatPump(prices, c, i),
    backupEfficiency: backup.efficiency,
    fuelPrice: prices.fuel,
    costByBoiler: costByBoiler(backup, prices, c, i),
  };
}
