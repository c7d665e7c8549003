import type { PreparedWeather } from '../weather/series.ts';
import type { House } from './house.ts';

/**
 * Space-heat need of every hour by degree hours, Q_i = H·max(0, θ_base,i − T_i).
 *
 * @param house heat loss in kW/K, set point and gains; an entered base temperature moves with the set point
 * @param weather prepared weather of as many hours as the set point has
 * @param need receives kW by hour, never negative; zero where the heating limit holds
 *
 * Reference: MODEL section 4, degree hours; the sun of a day is stored, so irradiance is the mean of hours i−23 … i.
 */
export function degreeHourNeed(house: House, weather: PreparedWeather, need: Float64Array): void {
  const { heatLoss, internalGains, heatingLimit } = house;
  const { temperature, trailingMeanTemperature, trailingMeanRadiation } = weather;
  const apertureKw = house.solarAperture / 1000;
  for (let i = 0; i < weather.hours; i++) {
    const base = baseTemperature(house, i, gainsOf(internalGains, apertureKw, trailingMeanRadiation[i]));
    const heating = trailingMeanTemperature[i] < heatingLimit;
    need[i] = heating ? heatLoss * Math.max(0, base - temperature[i]) : 0;
  }
}

/** Gains of a house, kW: internal ones in kW, and an aperture of `apertureKw`, m²/1000, in a radiation of W/m². */
export function gainsOf(internalGains: number, apertureKw: number, radiation: number): number {
  return internalGains + apertureKw * radiation;
}

/**
 * Base temperature of an hour, °C: the set point less what the gains carry, or as entered, moving with the set point.
 *
 * @param gains kW; counted only where no base is entered
 *
 * Reference: MODEL section 4.
 */
export function baseTemperature(house: House, i: number, gains: number): number {
  return house.baseTemperature === null
    ? house.setPoint[i] - gains / house.heatLoss
    : house.baseTemperature + (house.setPoint[i] - house.nominalSetPoint);
}
