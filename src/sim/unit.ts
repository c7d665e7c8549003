import type { Polyline } from '../core/polyline.ts';
import type { HeatPumpMap } from './heatPumpMap.ts';

/** The lowest continuous level of a unit: a map of its own, or shares of full load (MODEL section 9). */
export type LowestLevel =
  | { readonly given: 'table'; readonly map: HeatPumpMap }
  | { readonly given: 'share'; readonly capacity: number; readonly cop: number };

/** How frost is accounted for (MODEL section 7). Losses are shares at A2/W35; factors are polylines over °C. */
export type Defrost =
  | { readonly method: 'included' }
  | { readonly method: 'humidity'; readonly capacityLoss: number; readonly copLoss: number }
  | { readonly method: 'table'; readonly capacity: Polyline; readonly cop: Polyline };

/** What running below the lowest level costs (MODEL section 9). Power in kW. */
export type Cycling =
  | { readonly method: 'degradation'; readonly coefficient: number }
  | { readonly method: 'offPower'; readonly power: number };

/** A heat-pump unit with its maps prepared; powers in kW, temperatures in °C. */
export interface HeatPumpUnit {
  readonly full: HeatPumpMap;
  readonly lowest: LowestLevel;
  readonly defrost: Defrost;
  readonly cycling: Cycling;
  /** The unit runs at this outdoor temperature and above it; −Infinity where no limit is given. */
  readonly lowestOutdoorTemperature: number;
  readonly highestFlow: Polyline;
  readonly standbyPower: number;
  readonly crankcasePower: number;
  /** The crankcase heater runs below this outdoor temperature; +Infinity where always. */
  readonly crankcaseBelow: number;
}
