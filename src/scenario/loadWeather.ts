import { dayNumber, MINUTES_PER_DAY } from '../core/civilDate.ts';
import type { Problem } from '../core/problem.ts';
import { zoneOffsets } from '../core/zoneOffsets.ts';
import { type Recognised, readWeather } from '../weather/read/readWeather.ts';
import type { ReadSettings } from '../weather/readSettings.ts';
import type { WeatherSeries } from '../weather/series.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { readEntries } from './entries/readEntries.ts';
import type { FileSource, InputBytes } from './fileSource.ts';
import { InputFiles } from './inputFiles.ts';
import { KeptKind } from './kept.ts';
import { readSchema } from './readSchema.ts';
import type { Scenario } from './scenarioSchema.ts';
import { textOf } from './yaml/textOf.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** A weather file read, and how it was understood. */
export interface ReadWeather {
  readonly file: string;
  readonly series: WeatherSeries;
  readonly recognised: Recognised;
}

/** Where the weather is used, as far as that helps to understand its file. */
export interface WeatherSite {
  readonly zone?: string | undefined;
  /** m above sea level. */
  readonly altitude?: number | undefined;
  readonly calendarYear?: number | undefined;
}

/**
 * Reads a weather file from its bytes.
 *
 * @param input the file
 * @param settings how to read it, where it does not say so itself
 * @param site stamps without any offset are taken in the standard time of its zone, in UTC where no zone is known
 */
export function weatherFrom(
  input: InputBytes,
  settings: ReadSettings,
  site: WeatherSite,
): { read?: ReadWeather; recognised?: Recognised; problems: Problem[] } {
  const { text, problems: textProblems } = textOf(input);
  if (text === undefined) return { problems: textProblems };
  const { series, recognised, problems } = readWeather(text, {
    file: input.name,
    settings,
    zone: site.zone,
    defaultOffsetMinutes: standardOffset(site.zone, site.calendarYear ?? 2025),
    altitude: site.altitude ?? 0,
  });
  if (series === undefined) return { recognised, problems };
  return { read: { file: input.name, series, recognised }, recognised, problems };
}

/** What came of reading a weather file. */
export type WeatherResult = ReturnType<typeof weatherFrom>;

/** Weather files of a batch; each holds a year in a few columns. */
export const weathers = new KeptKind<WeatherResult>(64);

/** What of a scenario its weather is read by. */
export interface WeatherEntries {
  readonly weather: Pick<Scenario['weather'], 'file' | 'read'>;
  readonly site: WeatherSite;
}

/** Reads the weather file that a scenario names; what is not known of its site is left out. */
export function weatherOf(
  yaml: YamlFile,
  { weather, site: { zone, altitude, calendarYear } }: WeatherEntries,
  files: InputFiles,
): { read?: ReadWeather; problems: Problem[] } {
  const site = { zone, altitude, calendarYear };
  const named = files.readNamed(weather.file, 'weather', { yaml, path: ['weather', 'file'] });
  if (named.input === undefined) return { problems: named.problems };
  const { input } = named;
  const key = JSON.stringify([input.name, weather.read, site]);
  return weathers.of(files.kept, key, () => weatherFrom(input, weather.read ?? {}, site));
}

/** Offset of a zone's standard time from UTC, minutes: the least of a year, summer time lying ahead of it. */
export function standardOffset(zone: string | undefined, year: number): number {
  const [from, to] = [dayNumber(year, 1, 1), dayNumber(year + 1, 1, 1)].map((day) => day * MINUTES_PER_DAY);
  const spans = zone === undefined ? undefined : zoneOffsets(zone, from ?? 0, to ?? 0);
  return spans === undefined ? 0 : Math.min(...spans.map((span) => span.offsetMinutes));
}

/**
 * Loads settings for reading a weather file from a file of their own.
 *
 * @param name of the file, as the user gives it
 * @param source where files come from
 */
export function loadReadSettings(
  name: string,
  source: FileSource,
): { settings?: ReadSettings; defaults: DefaultUsed[]; problems: Problem[] } {
  const { input, problems } = new InputFiles(source).read(name, 'read');
  if (input === undefined) return { defaults: [], problems };
  const read = readEntries(input, readSchema);
  if (read.entries === undefined) return { defaults: [], problems: read.problems };
  return { settings: read.entries.value, defaults: read.entries.defaults, problems: read.problems };
}
