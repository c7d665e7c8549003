import type { YearColumns } from './columns.ts';
import type { MassParameters } from './lumpedHouse.ts';
import type { MassOnWeather } from './massOnWeather.ts';
import type { YearPlan } from './yearPlan.ts';

/**
 * Heat that brings the air of a lumped house to its set point at once.
 *
 * @param massTemperature mass at the hour's beginning, °C
 * @returns kW, never negative; 0 where the heating limit holds
 *
 * Reference: ISO 13790:2008 annex C.4; MODEL section 4.
 */
export function needOfRoom(
  plan: YearPlan,
  mass: MassParameters,
  onWeather: MassOnWeather,
  i: number,
  massTemperature: number,
): number {
  if (plan.weather.trailingMeanTemperature[i] >= plan.house.heatingLimit) return 0;
  const atRest = mass.airFromMass * massTemperature + onWeather.airAtRest[i];
  return Math.max(0, (plan.house.setPoint[i] - atRest) / mass.airPerHeat);
}

/**
 * Mass temperature at the hour's end for the heat that was really given; enters the indoor temperature.
 *
 * @param heat delivered into the air, kW
 * @returns °C
 */
export function advanceRoom(
  mass: MassParameters,
  onWeather: MassOnWeather,
  c: YearColumns,
  i: number,
  massTemperature: number,
): number {
  const heat = c.heatPumpSpaceHeat[i] + c.backupSpaceHeat[i];
  c.indoorTemperature[i] = mass.airFromMass * massTemperature + onWeather.airAtRest[i] + mass.airPerHeat * heat;
  return mass.keep * massTemperature + onWeather.massAtRest[i] + mass.massFromAirHeat * heat;
}

/** Hours of the start-up before a year: the last 14 days of the series (MODEL section 4). */
export const START_UP_HOURS = 14 * 24;

/**
 * Second pass of a lumped house: the need if heat were unlimited, with a start-up of its own.
 *
 * @param c receives the column `unlimitedNeed`
 */
export function needWithUnlimitedHeat(
  plan: YearPlan,
  mass: MassParameters,
  onWeather: MassOnWeather,
  c: YearColumns,
): void {
  const { hours } = c;
  let temperature = plan.house.setPoint[hours - START_UP_HOURS];
  for (let step = -START_UP_HOURS; step < hours; step++) {
    const i = step < 0 ? step + hours : step;
    const need = needOfRoom(plan, mass, onWeather, i, temperature);
    temperature = mass.keep * temperature + onWeather.massAtRest[i] + mass.massFromAirHeat * need;
    c.unlimitedNeed[i] = need;
  }
}
