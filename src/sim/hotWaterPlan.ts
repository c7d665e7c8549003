/** What the hot-water stage needs, prepared; kW, kWh, L, °C. */
export interface HotWaterPlan {
  readonly volume: number;
  readonly setPoint: number;
  readonly hysteresis: number;
  /** Heat loss UA of the cylinder, kW/K. */
  readonly lossCoefficient: number;
  readonly surroundingTemperature: number;
  /** Draw asked, kWh by hour. */
  readonly draw: Float64Array;
  /** Cold-water temperature by hour, °C. */
  readonly coldWater: Float64Array;
  /** 1 in hours in which reheating is allowed. */
  readonly allowed: Uint8Array;
  /** 1 in the hours in which the hygiene run is asked for. */
  readonly hygieneAsked: Uint8Array;
  readonly hygieneTemperature: number;
  /** Electric heater in the cylinder, kW; not used where the backup is a boiler. */
  readonly immersionPower: number;
}
