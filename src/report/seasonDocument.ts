import type { Deviation } from '../scenario/season/compareSeason.ts';
import { lowestPermitted } from '../scenario/season/lowestPermitted.ts';
import type { PointBesideMap } from '../scenario/season/mapAtPoints.ts';
import { outletHeld } from '../scenario/season/outletsOf.ts';
import type { CaseRating, MapRating, SeasonAnswer, SeasonRating } from '../scenario/season/seasonAnswer.ts';
import type { SeasonBinResult } from '../sim/season/seasonalSum.ts';
import { standardSeasons } from '../weather/seasonBins.ts';
import { assumptionNote, warningNote } from './englishNotes.ts';
import type { SeasonDocument, SeasonEntry } from './seasonSchema.ts';

/**
 * A label check as plain data, as `season --json` writes it.
 *
 * @param answer of one unit
 * @param version of the program
 * @returns full precision, keys in a fixed order; what is not there has a word instead
 */
export function seasonDocument(answer: SeasonAnswer, version: string): SeasonDocument {
  return {
    version,
    heatPumpUnit: answer.unitName,
    reversible: answer.reversible,
    seasons: answer.seasons.map((season) => entryOf(season, answer.reversible)),
    warnings: answer.warnings.map((warning) => ('problem' in warning ? warningNote(warning) : { ...warning })),
    assumptions: answer.assumptions.map((each) => ('used' in each ? assumptionNote(each) : { ...each })),
    inputs: answer.inputs.map(({ file, role, sha256 }) => ({ file, role, sha256 })),
  };
}

function entryOf(season: SeasonRating, reversible: boolean): SeasonEntry {
  const { climate, application, declared, map, points, comparison } = season;
  const { designTemperature, equivalentHours, idleHours } = standardSeasons[climate];
  const { off, thermostatOff, standby, crankcase } = idleHours[reversible ? 'reversible' : 'heatingOnly'];
  return {
    climate,
    application,
    designTemperature,
    equivalentHours,
    idleHours: { off, thermostatOff, standby, crankcase },
    lowestPermittedEfficiency: lowestPermitted(season) ?? 'none set',
    label: declared === undefined ? 'not declared' : labelOf(declared),
    map: map === undefined ? 'no outlet temperatures' : mapOf(map),
    points: points === undefined ? 'no points' : { ...ratingOf(points), bins: points.result.bins.map(binOf) },
    comparison: { map: deviationOf(comparison.map), points: deviationOf(comparison.points) },
    pointsBesideMap: season.pointsBesideMap.map(pointOf),
  };
}

function labelOf(declared: NonNullable<SeasonRating['declared']>): Exclude<SeasonEntry['label'], string> {
  const { designLoad, bivalentTemperature, operatingLimit, degradation, scop, efficiency } = declared;
  return {
    designLoad,
    bivalentTemperature,
    operatingLimit,
    degradation,
    ...(scop === undefined ? {} : { scop }),
    ...(efficiency === undefined ? {} : { efficiency }),
  };
}

function mapOf(map: MapRating): Exclude<SeasonEntry['map'], string> {
  const { degradation, outlets, hours, result } = map;
  return {
    ...ratingOf(map),
    degradation,
    outlets: outlets.map(([outdoor, outlet]) => ({ outdoor, outlet })),
    hoursOutsideMap: hours.outsideMap,
    hoursBelowLowestFlow: hours.belowLowestFlow,
    hoursAboveHighestFlow: hours.aboveHighestFlow,
    bins: result.bins.map((bin) => ({
      ...binOf(bin),
      outlet: outletHeld(outlets, bin.outdoor),
      capacity: bin.capacity,
    })),
  };
}

function ratingOf({ seasonCase, result }: CaseRating) {
  const { designLoad, operatingLimit, idle } = seasonCase;
  const { scop, scopOn, efficiency, heat, electricity, idleElectricity, bins } = result;
  return {
    scop,
    scopOn,
    efficiency,
    designLoad,
    operatingLimit: Number.isFinite(operatingLimit) ? operatingLimit : ('none' as const),
    idlePowers: {
      off: 1000 * idle.off,
      thermostatOff: 1000 * idle.thermostatOff,
      standby: 1000 * idle.standby,
      crankcase: 1000 * idle.crankcase,
    },
    heat,
    electricity,
    idleElectricity,
    supplementaryHeat: bins.reduce((sum, bin) => sum + bin.hours * bin.supplementary, 0),
  };
}

/** The capacity of declared points is left out: above T_biv it is not used. */
function binOf({ outdoor, hours, load, cop, supplementary, electricity }: SeasonBinResult) {
  const heatPump = load - supplementary;
  return {
    outdoor,
    hours,
    partLoad: load,
    heatPump,
    supplementary,
    cop: heatPump > 0 ? cop : ('no heat' as const),
    electricity,
  };
}

function deviationOf(deviation: Deviation | undefined): SeasonEntry['comparison']['map'] {
  if (deviation === undefined) return 'nothing to compare';
  const { of, against, found, expected, share, agrees } = deviation;
  return { of, against, found, expected, share, agrees };
}

function pointOf(point: PointBesideMap): SeasonEntry['pointsBesideMap'][number] {
  const { outdoor, outlet, load, declared, map, capacityDeviation, copDeviation } = point;
  return {
    outdoor,
    outlet,
    partLoad: load,
    capacity: declared.capacity,
    cop: declared.cop,
    degradation: declared.degradation,
    mapCapacity: map.capacity,
    mapCop: map.cop,
    capacityDeviation,
    copDeviation,
  };
}
