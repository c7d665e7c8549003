import { hasErrors, type Problem } from '../../core/problem.ts';
import type { MeteredPeriod } from '../../sim/heatingSignature.ts';
import type { ReadSettings } from '../../weather/readSettings.ts';
import { type FileSource, type InputBytes, isProblem } from '../fileSource.ts';
import type { ReadingsEntry } from '../fitSchema.ts';
import { inFileOrder } from '../inFileOrder.ts';
import type { InputRecord } from '../inputFiles.ts';
import type { LoadedScenario } from '../loadScenario.ts';
import { standardOffset } from '../loadWeather.ts';
import { textOf } from '../yaml/textOf.ts';
import { type DatedTemperatures, datedTemperatures } from './datedTemperatures.ts';
import { type MeterEnergy, meterEnergy } from './meterEnergy.ts';
import { type MeterPeriod, type MeterPeriods, meterPeriods } from './meterPeriods.ts';
import { dayText } from './readingDates.ts';
import { type MeterFile, readMeter } from './readMeter.ts';
import { coveredText, meansBetween, type WeatherDays, weatherDays } from './weatherDays.ts';

/** A weather file that the readings are held against. */
export interface WeatherOfReadings {
  readonly file: string;
  /** How it was understood, in sentences. */
  readonly lines: readonly string[];
}

/** Meter readings with the weather of their time. */
export interface LoadedReadings {
  readonly file: string;
  readonly meter: MeterFile;
  readonly energy: MeterEnergy;
  readonly made: MeterPeriods;
  /** One for each of `made.periods`, in kWh. */
  readonly metered: readonly MeteredPeriod[];
  readonly weather: { readonly files: readonly WeatherOfReadings[]; readonly days: WeatherDays };
  /** The readings, their weather and the scenario. */
  readonly inputs: readonly InputRecord[];
}

/**
 * Loads meter readings and the weather of their time. Never throws; all problems come at once.
 *
 * @param name of the file of readings, as the user gives it
 * @param loaded the scenario of the house, whose section `readings` says how they become heat
 * @param source where files come from
 * @returns the readings, unless a problem is an error; warnings come beside them
 */
export function loadReadings(
  name: string,
  loaded: LoadedScenario,
  source: FileSource,
): { readings?: LoadedReadings; problems: Problem[] } {
  const entry = loaded.scenario.readings ?? {};
  const inputs: InputRecord[] = [];
  const meter = meterOf(source.read(name), entry, inputs);
  const energy = meterEnergy(meter.file, { entry, boiler: loaded.scenario.boiler, scenarioFile: loaded.file, name });
  const weather = weatherOfReadings(loaded, source, inputs);
  const problems = [...meter.problems, ...energy.problems, ...weather.problems];
  if (hasErrors(problems) || meter.file === undefined || energy.energy === undefined || weather.days === undefined) {
    return { problems: inFileOrder(problems) };
  }
  const { made, problems: faults } = meterPeriods(meter.file, name);
  if (made === undefined) return { problems: inFileOrder([...problems, ...faults]) };
  const held = onWeather(made.periods, weather.days, { file: name, kWhPerUnit: energy.energy.kWhPerUnit });
  if (held.metered === undefined) return { problems: inFileOrder([...problems, ...held.problems]) };
  const readings = {
    ...{ file: name, meter: meter.file, energy: energy.energy, made, metered: held.metered },
    weather: { files: weather.files, days: weather.days },
    inputs: [...inputs, ...loaded.inputs.filter(({ role }) => role === 'scenario')],
  };
  return { readings, problems };
}

/** What is wrong with a file of readings by itself, where the scenario that it belongs to is not sound. */
export function readingsProblems(name: string, source: FileSource): Problem[] {
  return inFileOrder(meterOf(source.read(name), {}, []).problems);
}

function meterOf(
  result: InputBytes | Problem,
  { decimal }: ReadingsEntry,
  inputs: InputRecord[],
): { file?: MeterFile; problems: Problem[] } {
  if (isProblem(result)) return { problems: [result] };
  inputs.push({ file: result.name, role: 'readings', sha256: result.sha256 });
  const { text, problems } = textOf(result);
  if (text === undefined) return { problems };
  const read = readMeter(text, result.name, decimal);
  return read.meter === undefined ? { problems: read.problems } : { file: read.meter, problems: read.problems };
}

/** The weather of the readings: the files named for them, else that of the scenario. */
function weatherOfReadings(loaded: LoadedScenario, source: FileSource, inputs: InputRecord[]) {
  const { scenario } = loaded;
  const { site } = scenario;
  const named = scenario.readings?.weather;
  const settings: ReadSettings = (named === undefined ? scenario.weather.read : scenario.readings?.read) ?? {};
  const problems: Problem[] = [];
  const files: WeatherOfReadings[] = [];
  const dated: DatedTemperatures[] = [];
  for (const name of named ?? [scenario.weather.file]) {
    const input = source.read(name, loaded.file);
    if (isProblem(input)) {
      const where = named === undefined ? 'weather.file' : 'readings.weather';
      problems.push({ ...input, path: where, hint: `named in ${loaded.file} under ${where}` });
      continue;
    }
    inputs.push({ file: input.name, role: 'weather', sha256: input.sha256 });
    const { text, problems: textProblems } = textOf(input);
    problems.push(...textProblems);
    if (text === undefined) continue;
    const read = datedTemperatures(text, {
      ...{ file: input.name, settings, zone: site.zone, altitude: site.altitude },
      defaultOffsetMinutes: standardOffset(site.zone, site.calendarYear),
    });
    problems.push(...read.problems);
    files.push({ file: input.name, lines: read.lines });
    if (read.dated !== undefined) dated.push(read.dated);
  }
  return hasErrors(problems) ? { files, problems } : { files, days: weatherDays(dated), problems };
}

/** Periods with their weather; one problem names those whose weather is missing. */
function onWeather(
  periods: readonly MeterPeriod[],
  days: WeatherDays,
  { file, kWhPerUnit }: { file: string; kWhPerUnit: number },
): { metered?: MeteredPeriod[]; problems: Problem[] } {
  const metered: MeteredPeriod[] = [];
  const bare: MeterPeriod[] = [];
  for (const period of periods) {
    const dayMeans = meansBetween(days, period.fromDay, period.toDay);
    if (dayMeans === undefined) bare.push(period);
    else metered.push({ use: period.amount * kWhPerUnit, dayMeans });
  }
  const [first] = bare;
  if (first === undefined) return { metered, problems: [] };
  const span = `${dayText(first.fromDay)} to ${dayText(first.toDay - 1)}`;
  const found = bare.length === 1 ? `the period ${span}` : `${bare.length} periods, the first ${span}`;
  const allowed = coveredText(days);
  return {
    problems: [{ code: 'readings.weather-missing', severity: 'error', file, line: first.line, found, allowed }],
  };
}
