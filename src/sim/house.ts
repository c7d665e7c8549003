import type { MassParameters } from './lumpedHouse.ts';

/** What the simulation needs to know of a house; kW and kW/K inside the core. */
export interface House {
  /** Heat loss H, kW/K, above 0. */
  readonly heatLoss: number;
  /** Design load Q_d = H·(θ_room,design − θ_design), kW, above 0. */
  readonly designLoad: number;
  /** Set point of each hour, °C. */
  readonly setPoint: Float64Array;
  /** Set point from which an entered base temperature is counted, °C. */
  readonly nominalSetPoint: number;
  /** Entered base temperature, °C; null where it follows from the gains. */
  readonly baseTemperature: number | null;
  /** Internal gains Φ_int, kW. */
  readonly internalGains: number;
  /** Effective solar aperture, m². */
  readonly solarAperture: number;
  /** No heating while the mean of the last 24 hours is at or above it, °C; +Infinity where there is no such limit. */
  readonly heatingLimit: number;
  /** The lumped model's constants; null for degree hours. */
  readonly mass: MassParameters | null;
}
