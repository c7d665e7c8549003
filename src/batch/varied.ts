import type { Problem } from '../core/problem.ts';
import { type EntryPath, pathOfText, pathText } from '../scenario/entries/pathText.ts';
import { entryOf } from '../scenario/entries/schemaField.ts';
import type { BatchPlan } from './batchPlan.ts';
import { overlap } from './changes.ts';
import type { HomesHeader } from './homesTable.ts';
import { namesFile, scenarioPlace } from './scenarioPlaces.ts';

/** Every place that axes or homes may say otherwise than the base scenario. */
export function variedPlaces({ axes }: BatchPlan, header: HomesHeader | undefined): EntryPath[] {
  const byAxes = axes.flatMap(({ values }) => values.flatMap(({ changes }) => changes.map(({ path }) => path)));
  const once = new Map(byAxes.map((path) => [pathText(path), path]));
  return [...once.values(), ...(header?.columns.map(({ place }) => place.path) ?? [])];
}

/**
 * Faults of one job that every job would have, since nothing varied can mend them: they stop the batch before it begins.
 *
 * @param problems of a job, or of the base scenario alone
 * @param own files in which jobs are written: base scenario, plan, table of homes
 */
export function faultsOfAll(
  problems: readonly Problem[],
  varied: readonly EntryPath[],
  own: readonly string[],
): Problem[] {
  const filesVary = varied.some((path) => {
    const place = scenarioPlace(pathText(path));
    return 'path' in place && (namesFile(place) || place.fields.length === 0 || path.length === 1);
  });
  return problems.filter(({ severity, code, file, path }) => {
    if (severity !== 'error') return false;
    const at = path === undefined ? [] : pathOfText(path);
    if (code.startsWith('file.')) return !varied.some((each) => overlap(each, at));
    if (!own.includes(file)) return !filesVary;
    return code.startsWith('entry.') && !varied.some((each) => overlap(each, at));
  });
}

/** Most tariffs that any job of a plan can have. */
export function mostTariffs(plan: BatchPlan, header: HomesHeader | undefined): number {
  const base = entryOf(plan.base.raw, 'tariffs');
  const changes = plan.axes.flatMap(({ values }) => values.flatMap(({ changes: each }) => each));
  const counts = changes.map(({ path, value }) => countAt(path, Array.isArray(value) ? value.length : 0));
  const byHomes = header?.columns.map(({ place }) => countAt(place.path, 0)) ?? [];
  return Math.min(50, Math.max(Array.isArray(base) ? base.length : 0, ...counts, ...byHomes));
}

function countAt([section, position]: EntryPath, length: number): number {
  if (section !== 'tariffs') return 0;
  return typeof position === 'number' ? position + 1 : length;
}
