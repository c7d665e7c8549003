import { hasErrors, type Problem } from '../core/problem.ts';
import type { CivilClock } from '../tariffs/civilClock.ts';
import type { Recognised } from '../weather/read/readWeather.ts';
import type { WeatherSeries } from '../weather/series.ts';
import { crossChecks } from './checks/crossChecks.ts';
import { explainSetBack } from './checks/setBackNeedsMass.ts';
import type { DefaultUsed } from './entries/defaultsUsed.ts';
import { type EntriesResult, readEntries } from './entries/readEntries.ts';
import type { FileSource, InputBytes } from './fileSource.ts';
import { furtherProblems } from './furtherProblems.ts';
import { inFileOrder } from './inFileOrder.ts';
import { InputFiles, type InputRecord } from './inputFiles.ts';
import type { ElectricityCarbon } from './loadCarbon.ts';
import type { LoadedTariff } from './loadTariffs.ts';
import type { LoadedUnit } from './loadUnit.ts';
import { type FileEntries, readFiles } from './readFiles.ts';
import { partsOf } from './scenarioParts.ts';
import { type Scenario, scenarioSchema } from './scenarioSchema.ts';

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
  if (own.entries === undefined) {
    return { problems: [...explainSetBack(yaml, own.problems), ...furtherProblems(yaml, files, further)] };
  }
  const scenario = own.entries.value;
  const { unit, weather, clock, money, problems: ofFiles } = readFiles(yaml, fileEntriesOf(scenario), files, further);
  const beside = { weather: weather.read, listed: money.listed, laid: money.laid };
  const problems = [...own.problems, ...crossChecks(yaml, partsOf(scenario), beside), ...ofFiles];
  if (hasErrors(problems) || unit.loaded === undefined || weather.read === undefined) return { problems };
  if (clock === undefined || money.household === undefined) return { problems };
  const loaded: LoadedScenario = {
    file: yaml.file,
    scenario,
    unit: unit.loaded,
    weather: weather.read,
    clock,
    tariffs: money.laid.filter((tariff) => tariff !== undefined),
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

function fileEntriesOf(scenario: Scenario): FileEntries {
  const { weather, heatPump, site, tariffs, household, carbon } = scenario;
  return { weather, unit: heatPump.unit, site, tariffs, household, carbon };
}
