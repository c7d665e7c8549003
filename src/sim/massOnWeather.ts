import type { PreparedWeather } from '../weather/series.ts';
import type { House } from './house.ts';
import type { MassParameters } from './lumpedHouse.ts';

/** The parts of annex C that follow from house and weather alone, by hour, °C. */
export interface MassOnWeather {
  /** Air temperature at rest less the part that comes from the mass. */
  readonly airAtRest: Float64Array;
  /** New mass temperature less the parts that come from the old one and from the heating. */
  readonly massAtRest: Float64Array;
}

/**
 * Prepares the hours of a lumped house: supply air is outdoor air, half the internal gains go to the air, the rest and
 * the sun of the hour to mass and surfaces.
 *
 * @param mass constants of the house
 * @param house its gains
 * @param weather prepared weather
 * @returns two columns of `weather.hours` entries
 *
 * Reference: ISO 13790:2008 annex C, equations C.1 to C.11; MODEL section 4.
 */
export function layMassOnWeather(mass: MassParameters, house: House, weather: PreparedWeather): MassOnWeather {
  const { hours, temperature, globalRadiation } = weather;
  const airAtRest = new Float64Array(hours);
  const massAtRest = new Float64Array(hours);
  const toAir = house.internalGains / 2;
  const surfaceSum = mass.hSurfaceMass + mass.hWindows + mass.h1;
  for (let i = 0; i < hours; i++) {
    const outdoor = temperature[i];
    const gains = toAir + (house.solarAperture * globalRadiation[i]) / 1000;
    const atSurface = mass.gainsToSurface * gains + (mass.hWindows + mass.h1) * outdoor + mass.airToSurface * toAir;
    const atMass = mass.gainsToMass * gains + mass.hMassOutdoor * outdoor + mass.surfaceToMass * atSurface;
    massAtRest[i] = atMass * mass.massPerHeat;
    const surface = (mass.hSurfaceMass * 0.5 * massAtRest[i] + atSurface) / surfaceSum;
    airAtRest[i] =
      mass.airToSurface * surface + (mass.hVentilation * outdoor + toAir) / (mass.hAirSurface + mass.hVentilation);
  }
  return { airAtRest, massAtRest };
}
