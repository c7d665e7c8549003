import type { Problem } from '../../core/problem.ts';
import { declaredSeason } from '../../sim/season/declaredSeason.ts';
import type { OutletPoints } from '../../sim/season/outletTemperature.ts';
import type { SeasonCase } from '../../sim/season/seasonCase.ts';
import type { HeatPumpUnit } from '../../sim/unit.ts';
import type { DeclaredSeason, Label } from '../labelSchema.ts';
import { prepareUnit } from '../prepare/prepareUnit.ts';
import { chooseRatings, type Wanted } from './chooseRatings.ts';
import { compareSeason } from './compareSeason.ts';
import { declaredCase, declaredPoints, idlePowersOf } from './declaredCase.ts';
import type { LoadedLabel } from './loadLabel.ts';
import { mapAtPoints } from './mapAtPoints.ts';
import { knownOutlets, outletsOf } from './outletsOf.ts';
import { rateMap } from './rateMap.ts';
import type { CaseRating, Rating, SeasonAnswer, SeasonRating } from './seasonAnswer.ts';
import { seasonAssumptions } from './seasonAssumptions.ts';
import { seasonWarnings } from './seasonWarnings.ts';
import { USUAL_DEGRADATION, undeclaredCase } from './undeclaredCase.ts';

/**
 * Rates a unit in the reference seasons from its map and from its declared points, and holds both against its label.
 *
 * @param loaded a unit file without errors
 * @param wanted climate and application, where they were chosen
 * @returns the answer; an error where nothing can be said of a climate and application because its outlet temperatures are
 *   not known, a warning where only the map cannot be rated
 */
export function makeSeasons(loaded: LoadedLabel, wanted: Wanted): { answer?: SeasonAnswer; problems: Problem[] } {
  const { label } = loaded.unit.unit;
  const unit = prepareUnit(loaded.unit);
  const seasons = chooseRatings(label, wanted).map((rating) => rate(rating, label, unit));
  const problems = seasons.flatMap((season) => unknownOutlets(season, loaded.unit.file));
  if (problems.some(({ severity }) => severity === 'error')) return { problems };
  const answer: SeasonAnswer = {
    unitName: loaded.unit.unit.name,
    reversible: label?.reversible ?? false,
    seasons,
    warnings: seasonWarnings(seasons, [...loaded.problems, ...problems]),
    assumptions: seasonAssumptions(loaded, seasons),
    inputs: loaded.inputs,
  };
  return { answer, problems };
}

function rate({ climate, application }: Rating, label: Label | undefined, unit: HeatPumpUnit): SeasonRating {
  const declared = label?.seasons.find((each) => each.climate === climate && each.application === application);
  const outlets = outletsOf(label, climate, application);
  const entered = label && declared && caseOf(label, declared);
  const rated = (at: OutletPoints) => entered ?? undeclaredCase({ climate, application }, label, unit, at);
  const map = outlets && rateMap(rated(outlets), unit, outlets, declared?.degradation ?? USUAL_DEGRADATION);
  const points = entered && declared && ratePoints(entered, declared);
  return {
    climate,
    application,
    ...(declared ? { declared } : {}),
    ...(map ? { map } : {}),
    ...(points ? { points } : {}),
    pointsBesideMap: declared?.points && outlets ? besideMap(declared, outlets, unit) : [],
    comparison: compareSeason(map?.result, points?.result, declared),
  };
}

function ratePoints(seasonCase: SeasonCase, declared: DeclaredSeason): CaseRating | undefined {
  if (declared.points === undefined) return undefined;
  const points = declaredPoints(declared);
  return { seasonCase, result: declaredSeason(seasonCase, points, declared.bivalentTemperature) };
}

/** The loader refuses a season without idle powers. */
function caseOf(label: Label, declared: DeclaredSeason): SeasonCase | undefined {
  const idle = idlePowersOf(label, declared);
  return idle && declaredCase(label, declared, idle);
}

function besideMap(declared: DeclaredSeason, outlets: OutletPoints, unit: HeatPumpUnit) {
  const { climate, designLoad } = declared;
  return mapAtPoints(declaredPoints(declared), { climate, designLoad, outlets }, unit);
}

function unknownOutlets({ climate, application, map, points }: SeasonRating, file: string): Problem[] {
  if (map !== undefined) return [];
  return [
    {
      code: 'label.unknown-outlets',
      severity: points === undefined ? 'error' : 'warning',
      file,
      path: 'label.outlets',
      found: `the ${climate} climate with ${application} °C`,
      allowed: knownOutlets(),
    },
  ];
}
