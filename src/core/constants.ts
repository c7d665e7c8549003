/** Absolute zero below 0 °C, K. Reference: International System of Units, definition of the degree Celsius. */
export const KELVIN_AT_ZERO_CELSIUS = 273.15;

/** Heat capacity of water by volume, kWh/(L·K). Reference: MODEL section 8; 4.187 kJ/(kg·K) at 1 kg/L. */
export const WATER_HEAT_CAPACITY = 1.163e-3;

/** Heat capacity of air by volume, Wh/(m³·K), for ventilation losses. Reference: MODEL section 4; 0.33–0.34 in handbooks (from memory). */
export const AIR_HEAT_CAPACITY = 0.33;

/** Pressure of the standard atmosphere at sea level, Pa. Reference: ISO 2533. */
export const STANDARD_PRESSURE = 101_325;

/** Hours of a day. */
export const HOURS_PER_DAY = 24;

/** Hours of a common and of a leap year: the two lengths that a weather series may have. */
export const HOURS_OF_COMMON_YEAR = 8760;
export const HOURS_OF_LEAP_YEAR = 8784;
