import { type Polyline, polylineAt } from '../core/polyline.ts';
import { type FixedPower, fixedPower, powerOf } from '../core/power.ts';
import type { PreparedWeather } from '../weather/series.ts';

/** Spread between flow and return where it does not follow from the emitters, K (MODEL section 5). */
const USUAL_SPREAD = 5;
/** The return is found for at least this share of the design load. */
export const LEAST_RETURN_LOAD = 0.2;

/** How the flow temperature is set, ready to run; temperatures in °C, spread in K. */
export interface FlowSetting {
  /** Flow of each hour where it follows from the weather alone (`fixed`, `curve`); null for emitters. */
  readonly set: Float64Array | null;
  readonly roomTemperature: number;
  /** Mean over-temperature of the emitters at design, (flow + return)/2 − room, K. */
  readonly overTemperature: number;
  /** The power 1/n of the emitters' exponent n. */
  readonly inverseExponent: FixedPower;
  readonly spread: number;
  readonly lowest: number;
  readonly highest: number;
}

/** Emitters at their design load, °C, with exponent n (EN 442: 1.3 radiators, 1.1 floor heating). */
export interface Emitters {
  readonly flow: number;
  readonly return: number;
  readonly roomTemperature: number;
  readonly exponent: number;
  readonly lowestFlow: number;
  readonly highestFlow: number;
}

/**
 * A flow setting for emitters.
 *
 * @param emitters design temperatures with (flow + return)/2 above the room, flow above return
 * @returns the setting
 */
export function emitterSetting(emitters: Emitters): FlowSetting {
  return {
    set: null,
    roomTemperature: emitters.roomTemperature,
    overTemperature: (emitters.flow + emitters.return) / 2 - emitters.roomTemperature,
    inverseExponent: fixedPower(1 / emitters.exponent),
    spread: emitters.flow - emitters.return,
    lowest: emitters.lowestFlow,
    highest: emitters.highestFlow,
  };
}

/**
 * A flow setting that follows from the outdoor temperature: a curve, its ends held, or one fixed value.
 *
 * @param curve flow over outdoor temperature, °C; one point for a fixed flow
 * @param weather prepared weather
 * @returns the setting with its column
 */
export function curveSetting(curve: Polyline, weather: PreparedWeather): FlowSetting {
  return {
    set: weather.temperature.map((outdoor) => polylineAt(curve, outdoor)),
    roomTemperature: 0,
    overTemperature: 0,
    inverseExponent: fixedPower(1),
    spread: USUAL_SPREAD,
    lowest: 0,
    highest: 0,
  };
}

/**
 * Flow temperature of emitters at a share of their design load.
 *
 * @param setting an emitter setting
 * @param load share x of the design load, 0 or above
 * @returns room + ΔT_m·x^(1/n) + x·s/2, held between lowest and highest, °C
 * @example emitterFlow(emitterSetting({ flow: 55, return: 45, roomTemperature: 20, exponent: 1.3, lowestFlow: 25, highestFlow: 55 }), 1) // 55
 *
 * Reference: EN 442-2, characteristic equation Φ = K·ΔT^n; MODEL section 5.
 */
export function emitterFlow(setting: FlowSetting, load: number): number {
  const flow =
    setting.roomTemperature +
    setting.overTemperature * powerOf(setting.inverseExponent, load) +
    (load * setting.spread) / 2;
  return Math.min(Math.max(flow, setting.lowest), setting.highest);
}

/**
 * Return temperature that belongs to a flow temperature.
 *
 * @param setting any setting
 * @param flow °C
 * @param load share x of the design load
 * @returns flow − clamp(x, 0.2, 1)·s, °C
 *
 * Reference: MODEL section 5.
 */
export function returnTemperature(setting: FlowSetting, flow: number, load: number): number {
  return flow - Math.min(Math.max(load, LEAST_RETURN_LOAD), 1) * setting.spread;
}

/**
 * Share of the design load that sets the flow of an hour.
 *
 * With emitters, an hour that hot water shortens, or that carries heat left waiting, runs its emitters harder: with what
 * is asked spread over what is left of the hour, at most the design load or the need where that is higher.
 *
 * @param need space-heat need Q, kW
 * @param waiting heat left from the hour before, kWh; counts only where no quiet limit holds or hot water runs
 * @param hotWaterShare share τ of the hour that hot water takes, 0 … 1
 * @param designLoad Q_d, kW
 * @returns x, dimensionless
 *
 * Reference: MODEL section 5.
 */
export function emitterLoad(need: number, waiting: number, hotWaterShare: number, designLoad: number): number {
  const load = need / designLoad;
  if (hotWaterShare >= 1) return load;
  return Math.min(Math.max(1, load), (need + waiting) / ((1 - hotWaterShare) * designLoad));
}
