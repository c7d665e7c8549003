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
  const atRest = airAtRest(mass, onWeather, i, massTemperature);
  return Math.max(0, (plan.house.setPoint[i] - atRest) / mass.airPerHeat);
}

/** Air of a lumped house that is not heated in the hour, °C; the mass at the hour's beginning in °C. */
export function airAtRest(mass: MassParameters, onWeather: MassOnWeather, i: number, massTemperature: number): number {
  return mass.airFromMass * massTemperature + onWeather.airAtRest[i];
}

/**
 * Mass temperature at the hour's end for the heat that was really given; enters the indoor temperature.
 *
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
  c.indoorTemperature[i] = airAtRest(mass, onWeather, i, massTemperature) + mass.airPerHeat * heat;
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
