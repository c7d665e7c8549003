import { hasErrors, type Problem } from '../core/problem.ts';
import { type CivilClock, civilClock } from '../tariffs/civilClock.ts';
import type { PreparedTariff } from '../tariffs/preparedTariff.ts';
import type { Tariff } from '../tariffs/tariff.ts';
import type { Recognised } from '../weather/read/readWeather.ts';
import type { WeatherSeries } from '../weather/series.ts';
import { checkHouse } from './checks/checkHouse.ts';
import { checkPlant } from './checks/checkPlant.ts';
import { checkPrices } from './checks/checkPrices.ts';
import { checkSchedules } from './checks/checkSchedules.ts';
import { explainSetBack } from './checks/setBackNeedsMass.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { pathText } from './entries/pathText.ts';
import { readEntries } from './entries/readEntries.ts';
import type { FileSource, InputBytes } from './fileSource.ts';
import { inFileOrder } from './inFileOrder.ts';
import { InputFiles, type InputRecord } from './inputFiles.ts';
import { prepared, type ReadTariff, tariffOf } from './loadTariff.ts';
import { type LoadedUnit, unitOf } from './loadUnit.ts';
import { weatherOf } from './loadWeather.ts';
import { type Scenario, scenarioSchema } from './scenarioSchema.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** A scenario with every file that it names: sound, complete, the defaults used by name. */
export interface LoadedScenario {
  readonly file: string;
  readonly scenario: Scenario;
  readonly unit: LoadedUnit;
  readonly weather: { readonly file: string; readonly series: WeatherSeries; readonly recognised: Recognised };
  readonly clock: CivilClock;
  /** In the order of the scenario; the first is the present one. */
  readonly tariffs: readonly { readonly file: string; readonly tariff: Tariff; readonly prepared: PreparedTariff }[];
  readonly defaults: readonly DefaultUsed[];
  readonly inputs: readonly InputRecord[];
}

/**
 * Loads a scenario and every file that it names. Never throws; all problems of all files come at once.
 *
 * @param name of the scenario file, as the user gives it
 * @param source where files come from
 * @returns the scenario, unless a problem is an error; warnings come beside it
 */
export function loadScenario(name: string, source: FileSource): { loaded?: LoadedScenario; problems: Problem[] } {
  const files = new InputFiles(source);
  const read = files.read(name, 'scenario');
  if (read.input === undefined) return { problems: read.problems };
  const result = scenarioOf(read.input, files);
  return { ...result, problems: inFileOrder(result.problems) };
}

/** Loads a scenario from its bytes. */
export function scenarioOf(input: InputBytes, files: InputFiles): { loaded?: LoadedScenario; problems: Problem[] } {
  const own = readEntries(input, scenarioSchema);
  if (own.yaml === undefined) return { problems: own.problems };
  const { yaml } = own;
  if (own.entries === undefined) return { problems: explainSetBack(yaml, own.problems) };
  const scenario = own.entries.value;
  const weather = weatherOf(yaml, scenario, files);
  const unit = namedUnit(yaml, scenario, files);
  const tariffs = namedTariffs(yaml, scenario, files);
  const present = tariffs.read[0];
  const clock = clockOf(yaml, scenario, weather.read?.series);
  const laid = clock.clock === undefined ? [] : layTariffs(tariffs.read, clock.clock);
  const problems = [
    ...own.problems,
    ...checkHouse(yaml, scenario.house),
    ...checkPlant(yaml, scenario),
    ...checkSchedules(yaml, scenario, present?.tariff),
    ...checkPrices(yaml, scenario, tariffs.read, laid[0]?.prepared),
    ...unit.problems,
    ...weather.problems,
    ...sunWithoutRadiation(yaml, scenario, weather.read),
    ...clock.problems,
    ...tariffs.problems,
    ...laid.flatMap((each) => each.problems),
  ];
  if (hasErrors(problems) || unit.loaded === undefined || weather.read === undefined || clock.clock === undefined) {
    return { problems };
  }
  const loaded: LoadedScenario = {
    file: input.name,
    scenario,
    unit: unit.loaded,
    weather: weather.read,
    clock: clock.clock,
    tariffs: laid.flatMap(({ file, tariff, prepared: made }) => (made ? [{ file, tariff, prepared: made }] : [])),
    // the label is held against the map by a command of its own; no simulated year rests on it
    defaults: [
      ...usedBeside(own.entries.defaults, weather.read.series),
      ...unit.defaults.filter(({ path }) => !path.startsWith('label.')),
      ...tariffs.defaults,
    ],
    inputs: files.records,
  };
  return { loaded, problems };
}

/** The defaults without those that the weather file makes idle: it has humidity or pressure of its own. */
function usedBeside(defaults: readonly DefaultUsed[], series: WeatherSeries): DefaultUsed[] {
  const idle = new Set([
    ...(series.humidity === undefined ? [] : ['weather.relativeHumidity']),
    ...(series.pressure === undefined ? [] : ['site.altitude']),
  ]);
  return defaults.filter(({ path }) => !idle.has(path));
}

function namedUnit(yaml: YamlFile, scenario: Scenario, files: InputFiles) {
  const read = files.readNamed(scenario.heatPump.unit, 'unit', { yaml, path: ['heatPump', 'unit'] });
  if (read.input === undefined) return { loaded: undefined, defaults: [], problems: read.problems };
  return { loaded: undefined, ...unitOf(read.input, files) };
}

function namedTariffs(yaml: YamlFile, scenario: Scenario, files: InputFiles) {
  const results = scenario.tariffs.map((name, i) => {
    const named = files.readNamed(name, 'tariff', { yaml, path: ['tariffs', i] });
    if (named.input === undefined) return { defaults: [], problems: named.problems };
    return tariffOf(named.input, scenario.site.zone, files);
  });
  return {
    /** In the scenario's order, those with errors left out as undefined. */
    read: results.map((result) => ('read' in result ? result.read : undefined)),
    defaults: results.flatMap((result) => result.defaults),
    problems: results.flatMap((result) => result.problems),
  };
}

function layTariffs(tariffs: readonly (ReadTariff | undefined)[], clock: CivilClock) {
  return tariffs.flatMap((read) => {
    if (read === undefined) return [];
    return [{ file: read.yaml.file, tariff: read.tariff, ...prepared(read, clock) }];
  });
}

/** Civil time of the year; without the weather, that of 8760 hours in UTC, so that zone and tariffs are checked all the same. */
function clockOf(yaml: YamlFile, scenario: Scenario, series: WeatherSeries | undefined) {
  const { zone, calendarYear } = scenario.site;
  const { hours, offsetMinutes } = series ?? { hours: 8760, offsetMinutes: 0 };
  const { clock, problem } = civilClock({ hours, offsetMinutes, zone, calendarYear });
  if (problem === undefined) return { clock, problems: [] };
  const path = ['site', problem.path === 'zone' ? 'zone' : 'calendarYear'];
  const place = { file: yaml.file, ...yaml.place(path), path: pathText(path) };
  return { clock: undefined, problems: [{ ...problem, ...place }] };
}

function sunWithoutRadiation(
  yaml: YamlFile,
  scenario: Scenario,
  weather: LoadedScenario['weather'] | undefined,
): Problem[] {
  const { solarAperture } = scenario.house.need;
  if (weather === undefined || solarAperture === 0 || weather.series.globalRadiation !== undefined) return [];
  const path = ['house', 'need', 'solarAperture'];
  const fault = {
    code: 'scenario.sun-without-radiation',
    found: String(solarAperture),
    allowed: weather.file,
  } as const;
  return [yaml.problem(path, fault)];
}
