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
  readFrostFree(onWeather, i, outdoor, flow, hour);
  const { capacityLoss, copLoss } = onWeather;
  const level = frostShareOfLowest(onWeather, hour);
  hour[AT.capacity] *= 1 - capacityLoss[i];
  hour[AT.cop] *= 1 - copLoss[i];
  hour[AT.lowestCapacity] *= 1 - capacityLoss[i] * level;
  hour[AT.lowestCop] *= 1 - copLoss[i] * level;
}

/** The same without frost loss. */
export function readFrostFree(
  onWeather: UnitOnWeather,
  i: number,
  outdoor: number,
  flow: number,
  hour: Float64Array,
): void {
  const { unit } = onWeather;
  readHour(onWeather.full, i, outdoor, flow, hour, AT.capacity);
  if (onWeather.lowest !== null) {
    readHour(onWeather.lowest, i, outdoor, flow, hour, AT.lowestCapacity);
  } else if (unit.lowest.given === 'share') {
    hour[AT.lowestCapacity] = unit.lowest.capacity * hour[AT.capacity];
    hour[AT.lowestCop] = unit.lowest.cop * hour[AT.cop];
  }
}

/** Share of the frost loss that the lowest level has: its coil is less cold, so `humidity` takes less there. */
export function frostShareOfLowest(onWeather: UnitOnWeather, frostFree: Float64Array): number {
  return onWeather.lossFollowsLevel ? frostFree[AT.lowestCapacity] / frostFree[AT.capacity] : 1;
}
