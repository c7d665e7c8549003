import { KELVIN_AT_ZERO_CELSIUS } from '../core/constants.ts';

/** Kelvins by which condensing lies above the flow, and evaporating below the outdoor air (MODEL section 6). */
const CONDENSER_APPROACH = 3;
const EVAPORATOR_APPROACH = 7;

/** Least temperature lift that κ sees, K: keeps it bounded where air is nearly as warm as the flow (MODEL section 6). */
export const LEAST_LIFT = 15;

/** What is added to the flow for the absolute condensing temperature, and to flow less air for the lift, K. */
export const CONDENSING_OFFSET = CONDENSER_APPROACH + KELVIN_AT_ZERO_CELSIUS;
export const LIFT_OFFSET = CONDENSER_APPROACH + EVAPORATOR_APPROACH;

/**
 * Carnot COP with approach temperatures, the yardstick κ of the map.
 *
 * @param outdoor outdoor temperature T, °C, any
 * @param flow flow temperature F, °C, above −276
 * @returns κ(T, F) = (F + 3 + 273.15) / max(F − T + 10, 15), dimensionless
 * @example carnotCop(7, 35) // 311.15 / 38 = 8.188…
 *
 * Reference: Carnot's law; approach temperatures as fixed in MODEL section 6.
 */
export function carnotCop(outdoor: number, flow: number): number {
  return (flow + CONDENSING_OFFSET) / Math.max(flow - outdoor + LIFT_OFFSET, LEAST_LIFT);
}

/**
 * Plain Carnot COP between air and flow, the bound that no real COP may pass.
 *
 * @param outdoor outdoor temperature, °C
 * @param flow flow temperature, °C
 * @returns (F + 273.15) / (F − T); Number.MAX_VALUE where the flow is not warmer than the air
 * @example plainCarnotCop(0, 50) // 6.463
 */
export function plainCarnotCop(outdoor: number, flow: number): number {
  return flow > outdoor ? (flow + KELVIN_AT_ZERO_CELSIUS) / (flow - outdoor) : Number.MAX_VALUE;
}
