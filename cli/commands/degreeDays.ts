import { hasErrors, type Problem } from '../../src/core/problem.ts';
import { degreeDaysDocument } from '../../src/report/degreeDaysDocument.ts';
import { degreeDaysText } from '../../src/report/degreeDaysText.ts';
import { documentText } from '../../src/report/documentText.ts';
import { weatherLines } from '../../src/report/weatherLines.ts';
import { InputFiles, type InputRecord } from '../../src/scenario/inputFiles.ts';
import { loadReadSettings, type ReadWeather, weatherFrom } from '../../src/scenario/loadWeather.ts';
import {
  coolingDegreeDays,
  type DegreeDayKind,
  type DegreeDayMethod,
  heatingDegreeDays,
} from '../../src/weather/degreeDays.ts';
import type { ReadSettings } from '../../src/weather/readSettings.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

/** Bases beyond these are slips of the pen, °C. */
const LOWEST_BASE = -50;
const HIGHEST_BASE = 50;

/** Counts the degree days of a weather file. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const base = baseOf(options.base ?? '');
  if (base === undefined) {
    const allowed = `a temperature from −50 to 50 °C, written like 15.5`;
    return wrongUse(`--base is '${options.base}'; it is ${allowed}`, 'degree-days', io);
  }
  const { read, json } = options;
  const kind = options.cooling === undefined ? 'heating' : 'cooling';
  return withOutputs([json], io, (outputs) =>
    count({ file: files[0], kind, base, method: methodOf(options.method), read, json, outputs }, io),
  );
}

function baseOf(text: string): number | undefined {
  const base = /^[-+]?\d+(\.\d+)?$/.test(text) ? Number(text) : Number.NaN;
  return base >= LOWEST_BASE && base <= HIGHEST_BASE ? base : undefined;
}

/** The command line admits no other words. */
function methodOf(word: string | undefined): DegreeDayMethod {
  switch (word) {
    case 'mean':
    case 'minmax':
    case 'fourcase':
    case 'threshold':
      return word;
    default:
      return 'hours';
  }
}

interface Asked {
  readonly file: string;
  readonly kind: DegreeDayKind;
  readonly base: number;
  readonly method: DegreeDayMethod;
  /** File of the read settings. */
  readonly read: string | undefined;
  readonly json: string | undefined;
  readonly outputs: Outputs;
}

async function count(asked: Asked, io: Io): Promise<number> {
  const { file, kind, base, method, read, json, outputs } = asked;
  const source = new DiskSource();
  const { weather, inputs, problems } = readFiles(file, read, source);
  const clashes = outputs.overInputs(source.identities);
  await tellProblems([...clashes, ...problems], io);
  if (weather === undefined || clashes.length > 0) return EXIT.wrongInput;
  const { series, recognised } = weather;
  const counted = kind === 'heating' ? heatingDegreeDays : coolingDegreeDays;
  const document = degreeDaysDocument({
    version: io.version,
    ...{ kind, base, method, inputs },
    degreeDays: counted(series.temperature, base, method),
    weather: { file, ...weatherLines(recognised) },
  });
  await outputs.write(json, [documentText(document)]);
  await outputs.finish();
  if (!outputs.takesStdout) await io.stdout.write(degreeDaysText(document));
  return EXIT.done;
}

interface WeatherFiles {
  readonly weather?: ReadWeather | undefined;
  readonly inputs: readonly InputRecord[];
  readonly problems: Problem[];
}

/** The weather file, read as its settings say; all problems of both. */
function readFiles(file: string, settingsFile: string | undefined, source: DiskSource): WeatherFiles {
  const files = new InputFiles(source);
  const read = settingsFile === undefined ? settled({}) : loadReadSettings(settingsFile, source);
  if (settingsFile !== undefined) files.read(settingsFile, 'read');
  const { input, problems } = files.read(file, 'weather');
  const found = [...read.problems, ...problems];
  if (input === undefined || read.settings === undefined) return { inputs: files.records, problems: found };
  const { read: weather, problems: faults } = weatherFrom(input, read.settings, {});
  found.push(...faults);
  return { weather: hasErrors(found) ? undefined : weather, inputs: files.records, problems: found };
}

function settled(settings: ReadSettings): { settings?: ReadSettings; problems: Problem[] } {
  return { settings, problems: [] };
}
