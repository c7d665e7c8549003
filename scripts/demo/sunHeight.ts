/** A place on earth. */
export interface Place {
  /** Latitude, ° north. */
  readonly latitude: number;
  /** Longitude, ° east. */
  readonly longitude: number;
}

const DEGREE = Math.PI / 180;

/**
 * Sine of the sun's height above the horizon in a common year.
 *
 * @param place latitude −90…90, longitude −180…180
 * @param utcHours hours since 1 January 00:00 UTC, fractions allowed; before and after the year it runs on
 * @returns −1…1; below zero the sun is down. Refraction is left out: it matters only within 1° of the horizon.
 *
 * Reference: NOAA Global Monitoring Division, General Solar Position Calculations (Fourier series of the equation of
 * time and of the declination); coefficients from memory, held to the equinoxes and solstices by the test.
 */
export function sineOfSunHeight(place: Place, utcHours: number): number {
  const year = (2 * Math.PI * (utcHours - 12)) / (365 * 24);
  const hourAngle = (utcHours % 24) * 15 + place.longitude + equationOfTime(year) / 4 - 180;
  const declination = sunDeclination(year);
  const latitude = place.latitude * DEGREE;
  return (
    Math.sin(latitude) * Math.sin(declination) +
    Math.cos(latitude) * Math.cos(declination) * Math.cos(hourAngle * DEGREE)
  );
}

/**
 * Sundial time less mean time, minutes.
 *
 * @param year angle of the year, radians, 0 at noon of 1 January
 * @example equationOfTime(0) // -2.9
 *
 * Reference: as `sineOfSunHeight`.
 */
export function equationOfTime(year: number): number {
  const firstOrder = 0.001868 * Math.cos(year) - 0.032077 * Math.sin(year);
  const secondOrder = -0.014615 * Math.cos(2 * year) - 0.040849 * Math.sin(2 * year);
  return 229.18 * (0.000075 + firstOrder + secondOrder);
}

function sunDeclination(year: number): number {
  const firstOrder = -0.399912 * Math.cos(year) + 0.070257 * Math.sin(year);
  const secondOrder = -0.006758 * Math.cos(2 * year) + 0.000907 * Math.sin(2 * year);
  const thirdOrder = -0.002697 * Math.cos(3 * year) + 0.00148 * Math.sin(3 * year);
  return 0.006918 + firstOrder + secondOrder + thirdOrder;
}
