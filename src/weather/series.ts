/** How the humidity column of a file is to be understood. */
export type HumidityKind = 'relative' | 'dewPoint' | 'wetBulb';

/**
 * One year of hourly weather as read: 8760 or 8784 regular hours in standard time with a fixed offset, beginning
 * 1 January 00:00; step i stands for the hour that begins at its stamp (MODEL section 1). Every value is finite.
 */
export interface WeatherSeries {
  readonly hours: number;
  /** Offset of the file's standard time from UTC, minutes (+60 for UTC+1). */
  readonly offsetMinutes: number;
  /** Outdoor dry-bulb temperature, °C. */
  readonly temperature: Float64Array;
  /** Relative humidity in % over liquid water, dew point in °C, or wet bulb in °C. */
  readonly humidity?: { readonly kind: HumidityKind; readonly values: Float64Array };
  /** Global horizontal irradiance, W/m². */
  readonly globalRadiation?: Float64Array;
  /** Station pressure, Pa. */
  readonly pressure?: Float64Array;
}

/** What depends on weather alone, computed once per series and used by every run (MODEL sections 1, 3, 4, 7). */
export interface PreparedWeather {
  readonly hours: number;
  readonly offsetMinutes: number;
  /** Outdoor dry-bulb temperature, °C. */
  readonly temperature: Float64Array;
  /** Mean outdoor temperature of hours i−23 … i, the year taken as periodic, °C. */
  readonly trailingMeanTemperature: Float64Array;
  /** Global horizontal irradiance of the hour, W/m²; zeros where the file has none. */
  readonly globalRadiation: Float64Array;
  /** Mean irradiance of hours i−23 … i, the year taken as periodic, W/m². */
  readonly trailingMeanRadiation: Float64Array;
  /** Whether the file had radiation. */
  readonly hasRadiation: boolean;
  /** Humidity ratio, kg water per kg dry air. */
  readonly humidityRatio: Float64Array;
  /** Air pressure, Pa. */
  readonly pressure: Float64Array;
  /** Frost index φ of MODEL section 7, 0 … 1.5, at a coil 8 K colder than the air. */
  readonly frostIndex: Float64Array;
  /** First step of each month of standard time, and the number of steps at the end: 13 entries. */
  readonly monthStart: Int32Array;
}
