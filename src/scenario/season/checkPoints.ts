import { hasErrors, type Problem } from '../../core/problem.ts';
import { carnotCop } from '../../sim/carnot.ts';
import { declaredSeason } from '../../sim/season/declaredSeason.ts';
import { partLoadRatio } from '../../sim/season/seasonCase.ts';
import { standardSeasons } from '../../weather/seasonBins.ts';
import { shownNumber } from '../entries/allowedText.ts';
import { type EntryPath, pathText } from '../entries/pathText.ts';
import type { DeclaredIdlePowers, DeclaredSeason, Label } from '../labelSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { declaredCase, declaredPoints } from './declaredCase.ts';
import { outletHeld, outletsOf } from './outletsOf.ts';

/** A capacity at or above T_biv may fall so far short of the part load: the ±10 % of EN 14825 (from memory). */
const SHORT_OF_LOAD = 0.9;

interface Declared {
  readonly label: Label;
  readonly season: DeclaredSeason;
  readonly idle: DeclaredIdlePowers;
}

/**
 * What is wrong with the declared points of a season, so that none is summed that could not be.
 *
 * @param path of the season
 * @returns a COP above the Carnot COP κ at the season's outlet temperature is an error (MODEL section 15)
 */
export function checkPoints(yaml: YamlFile, path: EntryPath, declared: Declared): Problem[] {
  const list: EntryPath = [...path, 'points'];
  const problems = [
    ...repeatedPoints(yaml, list, declared.season),
    ...fewPoints(yaml, list, declared.season),
    ...aboveCarnot(yaml, list, declared),
    ...shortCapacity(yaml, list, declared.season),
  ];
  return hasErrors(problems) ? problems : [...problems, ...fallingCop(yaml, list, declared)];
}

function repeatedPoints(yaml: YamlFile, list: EntryPath, { points = [], degradation }: DeclaredSeason): Problem[] {
  return points.flatMap((point, i) => {
    const first = points.findIndex(({ outdoor }) => outdoor === point.outdoor);
    const other = points[first];
    const same =
      point.capacity === other.capacity &&
      point.cop === other.cop &&
      (point.degradation ?? degradation) === (other.degradation ?? degradation);
    if (same) return [];
    const found = `at ${shownNumber(point.outdoor)} °C`;
    return [yaml.problem([...list, i], { code: 'label.repeated-point', found, allowed: pathText([...list, first]) })];
  });
}

function fewPoints(yaml: YamlFile, list: EntryPath, season: DeclaredSeason): Problem[] {
  const count = declaredPoints(season).length;
  if (count >= 2) return [];
  return [yaml.problem(list, { code: 'label.few-points', found: count === 0 ? 'no point' : 'one' })];
}

/** Where the outlet temperature is not known there is nothing to hold a COP against but the range of the schema. */
function aboveCarnot(yaml: YamlFile, list: EntryPath, { label, season }: Declared): Problem[] {
  const outlets = outletsOf(label, season.climate, season.application);
  // an outlet list without a point above the design temperature is refused in its own place
  if (outlets === undefined || outlets.length < 2) return [];
  return (season.points ?? []).flatMap(({ outdoor, cop }, i) => {
    const most = carnotCop(outdoor, outletHeld(outlets, outdoor));
    if (!(cop > most)) return [];
    const found = cop.toFixed(2);
    return [yaml.problem([...list, i, 'cop'], { code: 'label.above-carnot', found, allowed: most.toFixed(2) })];
  });
}

function shortCapacity(yaml: YamlFile, list: EntryPath, season: DeclaredSeason): Problem[] {
  const { designTemperature } = standardSeasons[season.climate];
  return (season.points ?? []).flatMap(({ outdoor, capacity }, i) => {
    const load = season.designLoad * partLoadRatio(outdoor, designTemperature);
    if (outdoor < season.bivalentTemperature || capacity >= SHORT_OF_LOAD * load) return [];
    return [
      yaml.problem([...list, i, 'capacity'], {
        code: 'label.capacity-below-load',
        severity: 'warning',
        found: shownNumber(capacity),
        allowed: load.toFixed(2),
      }),
    ];
  });
}

/** The two warmest points are extended to the warmest bin; points that fall steeply reach nothing there. */
function fallingCop(yaml: YamlFile, list: EntryPath, { label, season, idle }: Declared): Problem[] {
  const { bivalentTemperature } = season;
  const { bins } = declaredSeason(declaredCase(label, season, idle), declaredPoints(season), bivalentTemperature);
  return bins.every(({ cop }) => cop > 0) ? [] : [yaml.problem(list, { code: 'label.cop-falls-off' })];
}
