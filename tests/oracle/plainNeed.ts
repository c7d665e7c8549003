import { meanOfLastDay, type PlainCase } from './plainCase.ts';

/** MODEL section 4, heating limit: whether heating is stopped in hour i. */
export function heatingStopped({ house, weather }: PlainCase, i: number): boolean {
  return house.heatingLimit !== null && meanOfLastDay(weather.temperature, i) >= house.heatingLimit;
}

/** MODEL section 4, degree hours: base temperature of hour i, °C. */
export function baseTemperature({ house, weather }: PlainCase, i: number): number {
  if (house.enteredBase !== null) {
    return house.enteredBase.base + (house.setPoint[i] - house.enteredBase.atSetPoint);
  }
  const gains = house.internalGains + house.solarAperture * meanOfLastDay(weather.irradiance, i);
  return house.setPoint[i] - gains / house.heatLoss;
}

/** MODEL section 4, degree hours: need of hour i, kWh. */
export function degreeHourNeed(plain: PlainCase, i: number): number {
  if (heatingStopped(plain, i)) return 0;
  const below = Math.max(0, baseTemperature(plain, i) - plain.weather.temperature[i]);
  return (plain.house.heatLoss * below) / 1000;
}
