import { baseTemperature, degreeHourNeed, gainsOf } from '../degreeHours.ts';
import type { House } from '../house.ts';
import type { MassParameters } from '../lumpedHouse.ts';
import type { MassOnWeather } from '../massOnWeather.ts';
import { advanceRoom, airAtRest, needOfRoom } from '../roomWithMass.ts';
import type { Figures } from './figures.ts';
import type { HourAgain } from './hourAgain.ts';
import { type ExplainedStage, explainedStage, type Finding } from './stage.ts';

/** The house's heat loss is kW/K inside the core, and W/K wherever it is shown. */
const WATTS_PER_KILOWATT = 1000;

/** Space-heat need of the hour by either model of the house (MODEL section 4). */
export function needStage(again: HourAgain): ExplainedStage {
  const { mass } = again.plan.house;
  const { massOnWeather } = again.plan;
  if (mass !== null && massOnWeather !== null) return needWithMass(again, mass, massOnWeather);
  const { plan, c, i } = again;
  const { house, weather } = plan;
  degreeHourNeed(house, weather, c.spaceHeatNeed);
  const gains = gainsOf(house.internalGains, house.solarAperture / 1000, weather.trailingMeanRadiation[i]);
  return explainedStage('need', {
    figures: {
      setPoint: house.setPoint[i],
      ...(house.baseTemperature === null
        ? {
            internalGains: house.internalGains,
            solarAperture: house.solarAperture,
            gains,
            heatLoss: house.heatLoss * WATTS_PER_KILOWATT,
          }
        : {
            enteredBase: house.baseTemperature,
            nominalSetPoint: house.nominalSetPoint,
            heatLoss: house.heatLoss * WATTS_PER_KILOWATT,
          }),
      baseTemperature: baseTemperature(house, i, gains),
      ...limitFigures(house),
      spaceHeatNeed: c.spaceHeatNeed[i],
    },
    findings: needFindings(again),
    formulas: [
      house.baseTemperature === null ? 'baseFromGains' : 'baseEntered',
      'degreeHours',
      hasLimit(house) && 'heatingLimit',
    ],
  });
}

function needWithMass(again: HourAgain, mass: MassParameters, onWeather: MassOnWeather): ExplainedStage {
  const { plan, year, c, i } = again;
  const { house, weather } = plan;
  const before = year.massTemperature[i];
  c.massTemperature[i] = before;
  c.spaceHeatNeed[i] = needOfRoom(plan, mass, onWeather, i, before);
  return explainedStage('need', {
    figures: {
      setPoint: house.setPoint[i],
      internalGains: house.internalGains,
      sunGains: gainsOf(0, house.solarAperture / 1000, weather.globalRadiation[i]),
      ventilationConductance: mass.hVentilation,
      airSurfaceConductance: mass.hAirSurface,
      windowConductance: mass.hWindows,
      surfaceMassConductance: mass.hSurfaceMass,
      massOutdoorConductance: mass.hMassOutdoor,
      massCapacity: mass.capacity,
      massTemperature: before,
      airFromMass: mass.airFromMass,
      airFromWeather: onWeather.airAtRest[i],
      airAtRest: airAtRest(mass, onWeather, i, before),
      airPerHeat: mass.airPerHeat,
      ...limitFigures(house),
      spaceHeatNeed: c.spaceHeatNeed[i],
    },
    findings: needFindings(again),
    formulas: ['fiveResistances', 'airAtRest', 'needWithMass', hasLimit(house) && 'heatingLimit'],
  });
}

function hasLimit({ heatingLimit }: House): boolean {
  return Number.isFinite(heatingLimit);
}

function limitFigures(house: House): Figures {
  return hasLimit(house) ? { heatingLimit: house.heatingLimit } : {};
}

function needFindings({ plan, c, i }: HourAgain): (Finding | false)[] {
  const held = plan.weather.trailingMeanTemperature[i] >= plan.house.heatingLimit;
  return [held && 'heatingLimitHolds', !held && c.spaceHeatNeed[i] === 0 && 'noNeed'];
}

/** What the rooms of a house with mass make of the heat that was given; nothing with degree hours (MODEL section 4). */
export function roomStages({ plan, c, i }: HourAgain): ExplainedStage[] {
  const { massOnWeather: onWeather } = plan;
  const { mass } = plan.house;
  if (mass === null || onWeather === null) return [];
  const after = advanceRoom(mass, onWeather, c, i, c.massTemperature[i]);
  const stage = explainedStage('room', {
    figures: {
      deliveredHeat: c.heatPumpSpaceHeat[i] + c.backupSpaceHeat[i],
      indoorTemperature: c.indoorTemperature[i],
      massKept: mass.keep,
      massFromWeather: onWeather.massAtRest[i],
      massPerHeat: mass.massFromAirHeat,
      massTemperatureAfter: after,
    },
    formulas: ['roomAfter'],
  });
  return [stage];
}
