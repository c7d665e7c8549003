import type { PreparedWeather } from '../weather/series.ts';
import type { FlowSetting } from './flowTemperature.ts';
import type { HotWaterPlan } from './hotWaterPlan.ts';
import type { House } from './house.ts';
import type { MassOnWeather } from './massOnWeather.ts';
import type { UnitOnWeather } from './unitOnWeather.ts';

/** What helps the heat pump; power in kW. */
export interface Backup {
  readonly power: number;
  /** A fuel boiler (hybrid) rather than an electric heater. */
  readonly isBoiler: boolean;
  /** Efficiency for space heat and for hot water; 1 for an electric heater. */
  readonly efficiency: number;
  readonly hotWaterEfficiency: number;
}

/** Prices that the cheaper source of an hour is found with: per kWh, taxes in. */
export interface SourcePrices {
  readonly electricity: Float64Array;
  readonly fuel: number;
}

/** Everything one run needs, prepared; powers in kW, columns of `weather.hours` entries. */
export interface YearPlan {
  readonly weather: PreparedWeather;
  readonly house: House;
  /** Only with a lumped house. */
  readonly massOnWeather: MassOnWeather | null;
  readonly flow: FlowSetting;
  readonly unitOnWeather: UnitOnWeather;
  /** 1 where the heat pump rests: too cold for it, or below the switch temperature of an alternative backup. */
  readonly resting: Uint8Array;
  /** Share of the full capacity that quiet hours leave for space heat; null where there are none. */
  readonly quietShare: Float64Array | null;
  /** Share by which every COP is lowered. */
  readonly inUseAllowance: number;
  /** Water on which a short run works, L. */
  readonly cycleWater: number;
  readonly circulationPower: number;
  readonly backup: Backup;
  /** Only in the mode `cheapest`. */
  readonly sourcePrices: SourcePrices | null;
  readonly hotWater: HotWaterPlan | null;
}
