import type { DeclaredPoint } from '../../sim/season/declaredSeason.ts';
import type { IdlePowers, SeasonCase } from '../../sim/season/seasonCase.ts';
import type { DeclaredIdlePowers, DeclaredSeason, Label } from '../labelSchema.ts';

/** A season as its label declares it, ready to be summed. Powers become kW. */
export function declaredCase(label: Label, season: DeclaredSeason, idle: DeclaredIdlePowers): SeasonCase {
  return {
    season: season.climate,
    application: season.application,
    designLoad: season.designLoad,
    operatingLimit: season.operatingLimit,
    reversible: label.reversible,
    idle: idleInKilowatts(idle),
  };
}

/** The declared points of a season, each temperature once, with the season's degradation where a point has none. */
export function declaredPoints({ points = [], degradation }: DeclaredSeason): DeclaredPoint[] {
  const first = points.filter((point, i) => points.findIndex(({ outdoor }) => outdoor === point.outdoor) === i);
  return first.map((point) => ({ ...point, degradation: point.degradation ?? degradation }));
}

/** Idle powers of a season, W: its own, else those of the whole label. */
export function idlePowersOf(label: Label, season: DeclaredSeason): DeclaredIdlePowers | undefined {
  return season.idlePowers ?? label.idlePowers;
}

/** Declared idle powers in kW. */
export function idleInKilowatts({ off, thermostatOff, standby, crankcase }: DeclaredIdlePowers): IdlePowers {
  return {
    off: off / 1000,
    thermostatOff: thermostatOff / 1000,
    standby: standby / 1000,
    crankcase: crankcase / 1000,
  };
}
