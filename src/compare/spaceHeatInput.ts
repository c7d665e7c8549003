import { type Polyline, polylineAt } from '../core/polyline.ts';
import { emitterFlow, type FlowSetting, returnTemperature } from '../sim/flowTemperature.ts';

/** Efficiency of a condensing boiler: the colder the return, the more of the flue gas's water it condenses. */
export interface CondensingEfficiency {
  /** Efficiency over return temperature in °C, above 0; held beyond its ends. */
  readonly overReturn: Polyline;
  /** The boiler's own flow setting, never the heat pump's. */
  readonly flow: FlowSetting;
  /** Design load Q_d of the house, kW, above 0. */
  readonly designLoad: number;
}

/** Efficiency for space heat on the fuel's calorific value: constant, above 0, or by return temperature. */
export type SpaceHeatEfficiency = number | CondensingEfficiency;

/**
 * What a boiler takes to give the rooms their heat, hour by hour.
 *
 * @param efficiency constant, or by the return temperature that its own flow setting leads to
 * @param need space-heat need by hour, kWh, 0 or above; of as many hours as the flow setting has where that follows the
 *   weather
 * @returns need/η by hour, kWh on the calorific value of the efficiency; 0 in hours without need
 * @example spaceHeatInput(0.8, Float64Array.of(4)) // [5]
 *
 * Reference: MODEL sections 5 (flow and return at the share x = Q/Q_d of the design load, without the coupling to hot
 * water) and 12.
 */
export function spaceHeatInput(efficiency: SpaceHeatEfficiency, need: Float64Array): Float64Array {
  const input = new Float64Array(need.length);
  if (typeof efficiency === 'number') {
    for (let i = 0; i < need.length; i++) input[i] = need[i] / efficiency;
    return input;
  }
  const { overReturn, flow: setting, designLoad } = efficiency;
  for (let i = 0; i < need.length; i++) {
    if (need[i] <= 0) continue;
    const load = need[i] / designLoad;
    const flow = setting.set === null ? emitterFlow(setting, load) : setting.set[i];
    input[i] = need[i] / polylineAt(overReturn, returnTemperature(setting, flow, load));
  }
  return input;
}

/**
 * Efficiency for hot water where none is entered: that for space heat, and of a condensing boiler that at the hottest
 * return of its list, since a cylinder is charged with a hot return (common practice, no source).
 *
 * @example usualHotWaterEfficiency(0.9) // 0.9
 */
export function usualHotWaterEfficiency(efficiency: SpaceHeatEfficiency): number {
  return typeof efficiency === 'number' ? efficiency : polylineAt(efficiency.overReturn, Number.POSITIVE_INFINITY);
}
