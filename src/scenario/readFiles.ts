import type { Problem } from '../core/problem.ts';
import { zoneOffsets } from '../core/zoneOffsets.ts';
import { type CivilClock, civilClock } from '../tariffs/civilClock.ts';
import type { WeatherSeries } from '../weather/series.ts';
import { pathText } from './entries/pathText.ts';
import type { InputFiles } from './inputFiles.ts';
import { KeptKind } from './kept.ts';
import { type LoadedMoney, type MoneyEntries, moneyOf } from './loadMoney.ts';
import { type UnitResult, unitOf } from './loadUnit.ts';
import { type ReadWeather, standardOffset, type WeatherEntries, type WeatherSite, weatherOf } from './loadWeather.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** What of a scenario its files are read by; what has faults is left out. */
export interface FileEntries extends Omit<MoneyEntries, 'zone'> {
  readonly weather: WeatherEntries['weather'] | undefined;
  readonly unit: string | undefined;
  readonly site: WeatherSite;
}

/** The files of a scenario, as far as they could be read. */
export interface FilesRead {
  readonly unit: UnitResult;
  readonly weather: { readonly read?: ReadWeather };
  readonly clock: CivilClock | undefined;
  readonly money: LoadedMoney;
  readonly problems: readonly Problem[];
}

/** Units and civil clocks of a batch: more than these in turn are rare, and each unit holds its tables. */
const units = new KeptKind<UnitResult>(64);
const clocks = new KeptKind<ReturnType<typeof civilClock>>(16);

/**
 * Reads the files that a scenario names, and lays them on its year.
 *
 * @param further tariff files to compare beside those of the scenario, as the user gives them
 */
export function readFiles(
  yaml: YamlFile,
  entries: FileEntries,
  files: InputFiles,
  further: readonly string[],
): FilesRead {
  const weather = readWeatherFile(yaml, entries, files);
  const unit = readUnit(yaml, entries.unit, files);
  const clock = clockOf(yaml, entries.site, weather.read?.series, files);
  // a year that has its civil clock has a zone that is known: asking for it anew would take longer than all that is kept
  const zone = clock.clock?.zone ?? knownZone(entries.site.zone);
  const money = moneyOf(yaml, { ...entries, zone }, files, { clock: clock.clock, further });
  const problems = [...unit.problems, ...weather.problems, ...clock.problems, ...money.problems];
  return { unit, weather, clock: clock.clock, money, problems };
}

function readUnit(yaml: YamlFile, unit: string | undefined, files: InputFiles): UnitResult {
  if (unit === undefined) return { defaults: [], problems: [] };
  const read = files.readNamed(unit, 'unit', { yaml, path: ['heatPump', 'unit'] });
  if (read.input === undefined) return { defaults: [], problems: read.problems };
  const { input } = read;
  return units.of(files.kept, input.name, () => unitOf(input, files));
}

/** What a reader of weather says of a site without a zone; the site itself is told of its zone. */
const ABOUT_ZONES = ['weather.clock-needs-zone', 'weather.unknown-zone'];

function readWeatherFile(yaml: YamlFile, { weather, site }: FileEntries, files: InputFiles) {
  if (weather === undefined) return { problems: [] };
  const made: { read?: ReadWeather; problems: Problem[] } = weatherOf(yaml, { weather, site }, files);
  if (made.problems.length === 0 || knownZone(site.zone) !== undefined) return made;
  return { ...made, problems: made.problems.filter(({ code }) => !ABOUT_ZONES.includes(code)) };
}

function knownZone(zone: string | undefined): string | undefined {
  return zone === undefined || zoneOffsets(zone, 0, 1) === undefined ? undefined : zone;
}

/**
 * Civil time of the year; without the weather, that of 8760 hours in the standard time of the zone, so that zone and tariffs
 * are checked all the same. Nothing where zone or year have faults.
 */
function clockOf(
  yaml: YamlFile,
  { zone, calendarYear }: WeatherSite,
  series: WeatherSeries | undefined,
  files: InputFiles,
): { clock?: CivilClock; problems: Problem[] } {
  if (zone === undefined || calendarYear === undefined) return { problems: [] };
  const { hours, offsetMinutes } = series ?? { hours: 8760, offsetMinutes: standardOffset(zone, calendarYear) };
  const asked = { hours, offsetMinutes, zone, calendarYear };
  const { clock, problem } = clocks.of(files.kept, JSON.stringify(asked), () => civilClock(asked));
  if (problem === undefined) return clock === undefined ? { problems: [] } : { clock, problems: [] };
  const path = ['site', problem.path === 'zone' ? 'zone' : 'calendarYear'];
  const place = { file: yaml.owner(path), ...yaml.place(path), path: pathText(path) };
  return { problems: [{ ...problem, ...place }] };
}
