import { AT } from './hourScratch.ts';
import { readHour } from './mapOnWeather.ts';
import type { UnitOnWeather } from './unitOnWeather.ts';

/**
 * Capacity and COP of both levels of a unit at a point, after frost loss.
 *
 * @param onWeather the unit laid on its weather
 * @param i hour, for the frost loss
 * @param outdoor outdoor temperature, °C
 * @param flow flow temperature, °C
 * @param hour scratch that receives capacity (kW) and COP of full load and of the lowest level
 *
 * Reference: MODEL sections 6, 7 and 9.
 */
export function readLevels(
  onWeather: UnitOnWeather,
  i: number,
  outdoor: number,
  flow: number,
  hour: Float64Array,
): void {
  const { unit, capacityLoss, copLoss, lossFollowsLevel } = onWeather;
  readHour(onWeather.full, i, outdoor, flow, hour, AT.capacity);
  const frostFree = hour[AT.capacity];
  if (onWeather.lowest !== null) {
    readHour(onWeather.lowest, i, outdoor, flow, hour, AT.lowestCapacity);
  } else if (unit.lowest.given === 'share') {
    hour[AT.lowestCapacity] = unit.lowest.capacity * frostFree;
    hour[AT.lowestCop] = unit.lowest.cop * hour[AT.cop];
  }
  // at a lower level the coil is less cold, so `humidity` takes less there
  const level = lossFollowsLevel ? hour[AT.lowestCapacity] / frostFree : 1;
  hour[AT.capacity] = frostFree * (1 - capacityLoss[i]);
  hour[AT.cop] *= 1 - copLoss[i];
  hour[AT.lowestCapacity] *= 1 - capacityLoss[i] * level;
  hour[AT.lowestCop] *= 1 - copLoss[i] * level;
}
