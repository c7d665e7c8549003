/** What is marked of an hour, one bit each. */
export const MARK = {
  /** Heat was given at a point colder, warmer or hotter than the full-load grid. */
  outsideMap: 1,
  /** Heat was given at a flow below the lowest column of the full-load grid. */
  belowLowestFlow: 2,
  /** The flow asked for space heat was above the unit's limit. */
  flowAboveLimit: 4,
  /** The compressor cycled below its lowest level. */
  cycling: 8,
  /** The backup gave space heat, or heat into the cylinder. */
  backupForSpace: 16,
  backupForWater: 32,
  /** Hot water ran short. */
  hotWaterShort: 64,
  /** Heat asked of the backup could not be given. */
  unmet: 128,
  /** Space heat was needed. */
  heating: 256,
} as const;

/** Marks an hour may bear: every combination of the bits. */
export const MARK_COMBINATIONS = 512;

/**
 * A year in columns of one entry an hour; kW ≡ kWh per step. Every column is finite; a column that a run does not use
 * stays zero.
 */
export interface YearColumns {
  readonly hours: number;
  /** Space-heat need Q, kWh. */
  readonly spaceHeatNeed: Float64Array;
  /** Flow temperature asked for space heat, °C; 0 in hours in which none is asked. */
  readonly flowTemperature: Float64Array;
  /** Full capacity for space heat after frost loss, kW; 0 in hours in which none is asked. */
  readonly capacity: Float64Array;
  readonly heatPumpSpaceHeat: Float64Array;
  readonly heatPumpSpaceElectricity: Float64Array;
  readonly backupSpaceHeat: Float64Array;
  /** Heat asked of the backup that it could not give, kWh. */
  readonly unmetHeat: Float64Array;
  /** Degree hours: heat waiting for the next hour (D). Lumped house: heat that the room waits for in this hour. */
  readonly waitingHeat: Float64Array;
  /** Compressor starts, an estimate. */
  readonly starts: Float64Array;
  /** Share τ of the hour that hot water takes. */
  readonly hotWaterShare: Float64Array;
  readonly heatPumpWaterHeat: Float64Array;
  readonly heatPumpWaterElectricity: Float64Array;
  readonly backupWaterHeat: Float64Array;
  readonly hotWaterServed: Float64Array;
  readonly hotWaterShort: Float64Array;
  readonly cylinderLoss: Float64Array;
  /** Cylinder temperature at the end of the hour, °C. */
  readonly cylinderTemperature: Float64Array;
  readonly circulationElectricity: Float64Array;
  readonly standbyElectricity: Float64Array;
  readonly crankcaseElectricity: Float64Array;
  /** All electricity of the heating system, kWh. */
  readonly electricity: Float64Array;
  /** Fuel of a boiler backup, kWh on the calorific value of its efficiency. */
  readonly fuel: Float64Array;
  /** Mean indoor air temperature of the lumped house, °C. */
  readonly indoorTemperature: Float64Array;
  /** Mass of the lumped house at the hour's beginning, °C. */
  readonly massTemperature: Float64Array;
  /** Need of the lumped house if heat were unlimited, kWh (second pass). */
  readonly unlimitedNeed: Float64Array;
  /** Bits of MARK. */
  readonly marks: Uint16Array;
}

/**
 * Columns for a year, all zero. They may be used again for another run of the same length.
 *
 * @param hours 8760 or 8784
 */
export function newColumns(hours: number): YearColumns {
  const column = () => new Float64Array(hours);
  return {
    hours,
    spaceHeatNeed: column(),
    flowTemperature: column(),
    capacity: column(),
    heatPumpSpaceHeat: column(),
    heatPumpSpaceElectricity: column(),
    backupSpaceHeat: column(),
    unmetHeat: column(),
    waitingHeat: column(),
    starts: column(),
    hotWaterShare: column(),
    heatPumpWaterHeat: column(),
    heatPumpWaterElectricity: column(),
    backupWaterHeat: column(),
    hotWaterServed: column(),
    hotWaterShort: column(),
    cylinderLoss: column(),
    cylinderTemperature: column(),
    circulationElectricity: column(),
    standbyElectricity: column(),
    crankcaseElectricity: column(),
    electricity: column(),
    fuel: column(),
    indoorTemperature: column(),
    massTemperature: column(),
    unlimitedNeed: column(),
    marks: new Uint16Array(hours),
  };
}
