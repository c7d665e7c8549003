import { MARK, type YearColumns } from './columns.ts';
import { AT } from './hourScratch.ts';
import { runAt } from './spaceHeat.ts';
import type { Backup, SourcePrices, YearPlan } from './yearPlan.ts';

/**
 * Heat of the backup for the rooms: the top-up above the unit's highest flow, and what the heat pump could neither give
 * nor leave waiting. What a boiler gives to hot water in the hour the rooms do not get.
 *
 * In the mode `cheapest` a boiler carries the hour where it is cheaper than the heat pump for what that could give.
 * Reference: MODEL section 10; with a lumped house the backup is asked only for what exceeds full capacity.
 */
export function runBackup(plan: YearPlan, c: YearColumns, i: number, hour: Float64Array): void {
  const { backup, sourcePrices } = plan;
  const available = availableBackup(backup, c, i);
  if (sourcePrices !== null && boilerIsCheaper(backup, sourcePrices, c, i)) {
    carryByBoiler(plan, c, i, available, hour);
    return;
  }
  const asked = askedOfBackup(c, i, hour);
  const given = Math.min(available, Math.max(0, asked));
  enterBackup(c, i, given, asked - given);
}

/** Power left for the rooms, kW: what a boiler gives to hot water they do not get. */
export function availableBackup(backup: Backup, c: YearColumns, i: number): number {
  return backup.isBoiler ? Math.max(0, backup.power - c.backupWaterHeat[i]) : backup.power;
}

/** Heat asked of the backup once the heat pump has given its part, kWh. */
export function askedOfBackup(c: YearColumns, i: number, hour: Float64Array): number {
  // in this order an hour that lacks nothing comes out at exactly zero
  return hour[AT.topUp] + (hour[AT.asked] - c.heatPumpSpaceHeat[i] - c.waitingHeat[i]);
}

/** Lacking heat below this is rounding, kWh. */
export const UNMET = 1e-10;

function enterBackup(c: YearColumns, i: number, given: number, lacking: number): void {
  c.backupSpaceHeat[i] = given;
  c.unmetHeat[i] = Math.max(0, lacking);
  if (given > 0) c.marks[i] |= MARK.backupForSpace;
  if (lacking > UNMET) c.marks[i] |= MARK.unmet;
}

/** Ties go to the heat pump; where it can give nothing there is nothing to compare. */
export function boilerIsCheaper(backup: Backup, prices: SourcePrices, c: YearColumns, i: number): boolean {
  if (c.heatPumpSpaceHeat[i] <= 0) return false;
  return costByHeatPump(prices, c, i) > costByBoiler(backup, prices, c, i);
}

/** Cost of what the heat pump could give, by itself and by the boiler; money, taxes in. */
export function costByHeatPump(prices: SourcePrices, c: YearColumns, i: number): number {
  return c.heatPumpSpaceElectricity[i] * prices.electricity[i];
}

/** Cost of the same heat by the boiler; money, taxes in. */
export function costByBoiler(backup: Backup, prices: SourcePrices, c: YearColumns, i: number): number {
  return (c.heatPumpSpaceHeat[i] / backup.efficiency) * prices.fuel;
}

/** The boiler carries top-up and demand as far as its power goes, the heat pump what is left; nothing waits. */
function carryByBoiler(plan: YearPlan, c: YearColumns, i: number, available: number, hour: Float64Array): void {
  const wanted = hour[AT.topUp] + hour[AT.asked];
  const byBoiler = Math.min(available, wanted);
  const left = Math.min(hour[AT.asked], wanted - byBoiler);
  runAt(plan, c, i, Math.min(left, hour[AT.canGive]), hour);
  c.waitingHeat[i] = 0;
  enterBackup(c, i, byBoiler, wanted - byBoiler - c.heatPumpSpaceHeat[i]);
}
