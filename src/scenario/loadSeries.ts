import { hasErrors, type Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import { readSeries } from '../tariffs/readSeries.ts';
import { seriesMeans } from '../tariffs/seriesMeans.ts';
import { seriesReach } from '../tariffs/seriesReach.ts';
import type { SeriesKind, SeriesSettings, TimeSeries } from '../tariffs/timeSeries.ts';
import type { EntryPath } from './entries/pathText.ts';
import type { InputFiles, InputRole } from './inputFiles.ts';
import { textOf } from './yaml/textOf.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** A file of values over time that a scenario names, and how to read it. */
export interface NamedSeries {
  readonly file: string;
  readonly role: InputRole;
  /** Place of the file's name in the scenario. */
  readonly path: EntryPath;
  readonly settings: SeriesSettings;
  readonly kind: SeriesKind;
  /** Zone of stamps in local time; without it a file of such stamps is looked for, not read. */
  readonly zone: string | undefined;
}

/** Reads a file of values over time. */
export function namedSeries(
  yaml: YamlFile,
  named: NamedSeries,
  files: InputFiles,
): { series?: TimeSeries; problems: Problem[] } {
  const { input, problems } = files.readNamed(named.file, named.role, { yaml, path: named.path });
  if (input === undefined) return { problems };
  const { settings, kind, zone } = named;
  if (zone === undefined && settings.stamps === 'local') return { problems: [] };
  const { text, problems: textProblems } = textOf(input);
  if (text === undefined) return { problems: textProblems };
  return readSeries({ text, file: input.name, settings, kind, zone: zone ?? 'UTC' });
}

/**
 * Means of a series over every hour of a year, the year taken as periodic.
 *
 * @returns one value a step; or the problem that it does not hold the year
 */
export function hourlyMeans(
  series: TimeSeries,
  kind: SeriesKind,
  clock: CivilClock,
): { hours?: Float64Array; problems: Problem[] } {
  const means = seriesMeans(clock, series);
  const hours = new Float64Array(clock.hours);
  for (let i = 0; i < clock.hours; i++) hours[i] = means.meanOf(i, 0, 60);
  const problems = seriesReach(series, means, kind);
  return hasErrors(problems) ? { problems } : { hours, problems };
}
