import { mapSeason } from '../../sim/season/mapSeason.ts';
import type { OutletPoints } from '../../sim/season/outletTemperature.ts';
import type { IdlePowers, SeasonCase } from '../../sim/season/seasonCase.ts';
import type { HeatPumpUnit } from '../../sim/unit.ts';
import type { Label } from '../labelSchema.ts';
import { idleInKilowatts } from './declaredCase.ts';
import type { Rating } from './seasonAnswer.ts';

/** Degradation coefficient where a label declares none. Reference: EN 14825; MODEL section 14. */
export const USUAL_DEGRADATION = 0.9;

/**
 * A season that no label declares, from the unit alone.
 *
 * @param label idle powers and whether the unit also cools, where the unit file has a label section
 * @returns the design load is what the map gives at the design temperature; the operating limit is that of the unit; without
 *   declared idle powers the unit's standby power counts in thermostat-off, standby and off mode
 */
export function undeclaredCase(
  rating: Rating,
  label: Label | undefined,
  unit: HeatPumpUnit,
  outlets: OutletPoints,
): SeasonCase {
  const bare: SeasonCase = {
    season: rating.climate,
    application: rating.application,
    designLoad: 1,
    operatingLimit: Number.NEGATIVE_INFINITY,
    reversible: label?.reversible ?? false,
    idle: label?.idlePowers === undefined ? idleOfUnit(unit) : idleInKilowatts(label.idlePowers),
  };
  // the coldest bin of a season is its design temperature
  const designLoad = mapSeason(bare, unit, outlets, USUAL_DEGRADATION).bins[0].capacity;
  return { ...bare, designLoad, operatingLimit: unit.lowestOutdoorTemperature };
}

function idleOfUnit({ standbyPower, crankcasePower }: HeatPumpUnit): IdlePowers {
  return { off: standbyPower, thermostatOff: standbyPower, standby: standbyPower, crankcase: crankcasePower };
}
