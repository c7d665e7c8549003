import { AIR_HEAT_CAPACITY } from '../core/constants.ts';

/** A wall, roof, floor, window or door: area in m², U-value in W/(m²·K), factor on the temperature difference 0 … 1. */
export interface BuildingElement {
  readonly name: string;
  readonly kind: 'opaque' | 'window';
  readonly area: number;
  readonly uValue: number;
  readonly factor: number;
}

/** A joint with a loss of its own: length in m, psi in W/(m·K). */
export interface ThermalBridge {
  readonly name: string;
  readonly length: number;
  readonly psi: number;
}

/** Heat loss by the way it goes, W/K. */
export interface HeatLossParts {
  readonly windows: number;
  readonly opaque: number;
  readonly ventilation: number;
}

/**
 * Heat loss of a house from its elements, Σ U·A + Σ ψ·l + 0.33·n·V; bridges count with the opaque elements.
 *
 * @param elements areas and U-values
 * @param bridges lengths and ψ
 * @param ventilation volume V in m³ and air changes n in 1/h
 * @returns W/K by windows, opaque elements and ventilation
 * @example heatLossOfElements([{ name: 'wall', kind: 'opaque', area: 100, uValue: 0.5, factor: 1 }], [], { volume: 300, airChanges: 0.5 }) // { windows: 0, opaque: 50, ventilation: 49.5 }
 *
 * Reference: MODEL section 4.
 */
export function heatLossOfElements(
  elements: readonly BuildingElement[],
  bridges: readonly ThermalBridge[],
  ventilation: { readonly volume: number; readonly airChanges: number },
): HeatLossParts {
  let windows = 0;
  let opaque = 0;
  for (const { kind, area, uValue, factor } of elements) {
    const loss = area * uValue * factor;
    if (kind === 'window') windows += loss;
    else opaque += loss;
  }
  for (const { length, psi } of bridges) opaque += length * psi;
  return { windows, opaque, ventilation: AIR_HEAT_CAPACITY * ventilation.airChanges * ventilation.volume };
}

/**
 * Heat loss from a load at two temperatures.
 *
 * @param load kW, above 0
 * @param roomTemperature °C, above `outdoorTemperature`
 * @param outdoorTemperature °C
 * @returns W/K
 * @example heatLossOfLoad(6.4, 20, -12) // 200
 */
export function heatLossOfLoad(load: number, roomTemperature: number, outdoorTemperature: number): number {
  return (load * 1000) / (roomTemperature - outdoorTemperature);
}
