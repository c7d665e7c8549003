import type { Problem } from '../../core/problem.ts';
import { type SeasonName, standardSeasons } from '../../weather/seasonBins.ts';
import { pointsOutOfOrder } from '../checks/contradictions.ts';
import { shownNumber } from '../entries/allowedText.ts';
import { type EntryPath, pathText } from '../entries/pathText.ts';
import type { DeclaredSeason, Label } from '../labelSchema.ts';
import type { Fault, YamlFile } from '../yaml/yamlFile.ts';
import { checkPoints } from './checkPoints.ts';
import { idlePowersOf } from './declaredCase.ts';

/**
 * Highest bivalent temperature and operating limit that a rating may have, °C.
 *
 * Reference: Regulation (EU) 813/2013 annex III and its table of declared values.
 */
const HIGHEST_BIVALENT: Readonly<Record<SeasonName, number>> = { average: 2, warmer: 7, colder: -7 };
const HIGHEST_LIMIT: Readonly<Record<SeasonName, number>> = { average: -7, warmer: 2, colder: -15 };

/** What does not go together in the label section of a unit file. */
export function checkLabel(yaml: YamlFile, label: Label): Problem[] {
  return [
    ...repeated(yaml, 'seasons', label.seasons),
    ...repeated(yaml, 'outlets', label.outlets),
    ...label.seasons.flatMap((season, i) => checkSeason(yaml, ['label', 'seasons', i], { label, season })),
    ...label.outlets.flatMap((outlets, i) => checkOutlets(yaml, ['label', 'outlets', i], outlets)),
  ];
}

function checkSeason(yaml: YamlFile, path: EntryPath, at: { label: Label; season: DeclaredSeason }): Problem[] {
  const { label, season } = at;
  const { climate, bivalentTemperature, operatingLimit } = season;
  const bivalent: EntryPath = [...path, 'bivalentTemperature'];
  const limit: EntryPath = [...path, 'operatingLimit'];
  const problems: Problem[] = [];
  const told = (where: EntryPath, fault: Fault) => problems.push(yaml.problem(where, fault));
  if (bivalentTemperature < operatingLimit) {
    const found = degrees(bivalentTemperature);
    told(bivalent, { code: 'label.bivalent-below-limit', found, allowed: degrees(operatingLimit) });
  }
  if (bivalentTemperature > HIGHEST_BIVALENT[climate]) {
    const allowed = degrees(HIGHEST_BIVALENT[climate]);
    const found = degrees(bivalentTemperature);
    told(bivalent, { code: 'label.bivalent-too-warm', severity: 'warning', found, allowed });
  }
  if (operatingLimit > HIGHEST_LIMIT[climate]) {
    const allowed = degrees(HIGHEST_LIMIT[climate]);
    const found = degrees(operatingLimit);
    told(limit, { code: 'label.limit-too-warm', severity: 'warning', found, allowed });
  }
  const idle = idlePowersOf(label, season);
  if (idle === undefined) problems.push(yaml.problem(path, { code: 'label.needs-idle-powers' }));
  else if (season.points !== undefined) problems.push(...checkPoints(yaml, path, { label, season, idle }));
  return problems;
}

function checkOutlets(yaml: YamlFile, path: EntryPath, outlets: Label['outlets'][number]): Problem[] {
  const { climate, application, points } = outlets;
  const design = standardSeasons[climate].designTemperature;
  const problems = pointsOutOfOrder(yaml, [...path, 'points'], points);
  const allowed = degrees(design);
  points.forEach(([outdoor, outlet], i) => {
    if (outdoor > design || (outdoor === design && outlet === application)) return;
    const found = degrees(outdoor);
    problems.push(yaml.problem([...path, 'points', i], { code: 'label.outlet-at-design', found, allowed }));
  });
  if (!points.some(([outdoor]) => outdoor > design)) {
    problems.push(yaml.problem([...path, 'points'], { code: 'label.no-outlet-points', allowed }));
  }
  return problems;
}

function repeated(
  yaml: YamlFile,
  list: 'seasons' | 'outlets',
  entries: readonly Pick<DeclaredSeason, 'climate' | 'application'>[],
): Problem[] {
  return entries.flatMap(({ climate, application }, i) => {
    const first = entries.findIndex((each) => each.climate === climate && each.application === application);
    if (first === i) return [];
    const allowed = pathText(['label', list, first]);
    const found = `${climate} ${application} °C`;
    return [yaml.problem(['label', list, i], { code: 'label.repeated-season', found, allowed })];
  });
}

function degrees(value: number): string {
  return `${shownNumber(value)} °C`;
}
