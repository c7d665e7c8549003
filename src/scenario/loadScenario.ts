import { hasErrors, type Problem } from '../core/problem.ts';
import { type CivilClock, civilClock } from '../tariffs/civilClock.ts';
import type { Recognised } from '../weather/read/readWeather.ts';
import type { WeatherSeries } from '../weather/series.ts';
import { checkHouse } from './checks/checkHouse.ts';
import { checkPlant } from './checks/checkPlant.ts';
import { checkSchedules } from './checks/checkSchedules.ts';
import { explainSetBack } from './checks/setBackNeedsMass.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { pathText } from './entries/pathText.ts';
import { type EntriesResult, readEntries } from './entries/readEntries.ts';
import type { FileSource, InputBytes } from './fileSource.ts';
import { inFileOrder } from './inFileOrder.ts';
import { InputFiles, type InputRecord } from './inputFiles.ts';
import { KeptKind } from './kept.ts';
import type { ElectricityCarbon } from './loadCarbon.ts';
import { moneyOf } from './loadMoney.ts';
import type { LoadedTariff } from './loadTariffs.ts';
import { type LoadedUnit, type UnitResult, unitOf } from './loadUnit.ts';
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
  readonly tariffs: readonly LoadedTariff[];
  /** Electricity of the household without the heating, kWh a step. */
  readonly household: Float64Array;
  /** Absent where no carbon factor of electricity is entered. */
  readonly carbon?: ElectricityCarbon;
  readonly defaults: readonly DefaultUsed[];
  readonly inputs: readonly InputRecord[];
}

/**
 * Loads a scenario and every file that it names. Never throws; all problems of all files come at once.
 *
 * @param name of the scenario file, as the user gives it
 * @param source where files come from
 * @param further tariff files to compare beside those of the scenario, as the user gives them
 * @returns the scenario, unless a problem is an error; warnings come beside it
 */
export function loadScenario(
  name: string,
  source: FileSource,
  further: readonly string[] = [],
): { loaded?: LoadedScenario; problems: Problem[] } {
  const files = new InputFiles(source);
  const read = files.read(name, 'scenario');
  if (read.input === undefined) return { problems: read.problems };
  const result = scenarioOf(read.input, files, further);
  return { ...result, problems: inFileOrder(result.problems) };
}

/** Loads a scenario from its bytes. */
export function scenarioOf(
  input: InputBytes,
  files: InputFiles,
  further: readonly string[] = [],
): { loaded?: LoadedScenario; problems: Problem[] } {
  return scenarioFrom(readEntries(input, scenarioSchema), files, further);
}

/** Loads a scenario that is held against its schema already, whatever its values were made of. */
export function scenarioFrom(
  own: EntriesResult<Scenario>,
  files: InputFiles,
  further: readonly string[] = [],
): { loaded?: LoadedScenario; problems: Problem[] } {
  if (own.yaml === undefined) return { problems: own.problems };
  const { yaml } = own;
  if (own.entries === undefined) return { problems: explainSetBack(yaml, own.problems) };
  const scenario = own.entries.value;
  const weather = weatherOf(yaml, scenario, files);
  const unit = namedUnit(yaml, scenario, files);
  const clock = clockOf(yaml, scenario, weather.read?.series, files);
  const money = moneyOf(yaml, scenario, files, { clock: clock.clock, further });
  const problems = [
    ...own.problems,
    ...checkHouse(yaml, scenario.house),
    ...checkPlant(yaml, scenario),
    ...checkSchedules(yaml, scenario, money.presentRates),
    ...unit.problems,
    ...weather.problems,
    ...sunWithoutRadiation(yaml, scenario, weather.read),
    ...clock.problems,
    ...money.problems,
  ];
  if (hasErrors(problems) || unit.loaded === undefined || weather.read === undefined) return { problems };
  if (clock.clock === undefined || money.household === undefined) return { problems };
  const loaded: LoadedScenario = {
    file: yaml.file,
    scenario,
    unit: unit.loaded,
    weather: weather.read,
    clock: clock.clock,
    tariffs: money.tariffs,
    household: money.household,
    ...(money.carbon === undefined ? {} : { carbon: money.carbon }),
    // the label is held against the map by a command of its own; no simulated year rests on it
    defaults: [
      ...usedBeside(own.entries.defaults, weather.read.series),
      ...unit.defaults.filter(({ path }) => !path.startsWith('label.')),
      ...money.defaults,
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

/** Units and civil clocks of a batch: more than these in turn are rare, and each unit holds its tables. */
const units = new KeptKind<UnitResult>(64);
const clocks = new KeptKind<ReturnType<typeof civilClock>>(16);

function namedUnit(yaml: YamlFile, scenario: Scenario, files: InputFiles) {
  const read = files.readNamed(scenario.heatPump.unit, 'unit', { yaml, path: ['heatPump', 'unit'] });
  if (read.input === undefined) return { loaded: undefined, defaults: [], problems: read.problems };
  const { input } = read;
  return { loaded: undefined, ...units.of(files.kept, input.name, () => unitOf(input, files)) };
}

/** Civil time of the year; without the weather, that of 8760 hours in UTC, so that zone and tariffs are checked all the same. */
function clockOf(yaml: YamlFile, scenario: Scenario, series: WeatherSeries | undefined, files: InputFiles) {
  const { zone, calendarYear } = scenario.site;
  const { hours, offsetMinutes } = series ?? { hours: 8760, offsetMinutes: 0 };
  const asked = { hours, offsetMinutes, zone, calendarYear };
  const { clock, problem } = clocks.of(files.kept, JSON.stringify(asked), () => civilClock(asked));
  if (problem === undefined) return { clock, problems: [] };
  const path = ['site', problem.path === 'zone' ? 'zone' : 'calendarYear'];
  const place = { file: yaml.owner(path), ...yaml.place(path), path: pathText(path) };
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
