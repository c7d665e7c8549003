import type { EnergyTotals } from './totals.ts';

/** A seasonal factor, or the reason why there is none. */
export type SeasonalFactor = number | 'no heat';

/** Seasonal factors by boundary, for space heat and heat into the cylinder together. */
export interface SeasonalFactors {
  /** The unit alone: its heat over its electricity with standby and crankcase heater. */
  readonly h2: SeasonalFactor;
  /** With the backup: all heat over all input; a boiler's fuel counts as input beside electricity. */
  readonly h3: SeasonalFactor;
  /** H3 with the heating-circuit pump. */
  readonly h4: SeasonalFactor;
}

/**
 * Seasonal factors of a year or a month.
 *
 * @param totals sums in kWh
 * @returns H2, H3, H4, dimensionless; 'no heat' where nothing was given or taken
 *
 * Reference: boundaries of the SEPEMO-Build project, as taken up by Decision 2013/114/EU; MODEL section 11. H1 cannot be
 * had from a map whose COP holds the fan.
 */
export function seasonalFactors(totals: EnergyTotals): SeasonalFactors {
  const byHeatPump = totals.heatPumpSpaceHeat + totals.heatPumpWaterHeat;
  const byBackup = totals.backupSpaceHeat + totals.backupWaterHeat;
  const unit =
    totals.heatPumpSpaceElectricity +
    totals.heatPumpWaterElectricity +
    totals.standbyElectricity +
    totals.crankcaseElectricity;
  const withBackup = unit + totals.backupElectricity + totals.fuel;
  return {
    h2: factor(byHeatPump, unit),
    h3: factor(byHeatPump + byBackup, withBackup),
    h4: factor(byHeatPump + byBackup, withBackup + totals.circulationElectricity),
  };
}

function factor(heat: number, input: number): SeasonalFactor {
  return heat > 0 && input > 0 ? heat / input : 'no heat';
}
