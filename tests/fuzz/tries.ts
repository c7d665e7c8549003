import { hasErrors } from '../../src/core/problem.ts';
import { answerText } from '../../src/report/answerText.ts';
import { documentText } from '../../src/report/documentText.ts';
import { fitDocument } from '../../src/report/fitDocument.ts';
import { fitResultSchema } from '../../src/report/fitResultSchema.ts';
import { fitText } from '../../src/report/fitText.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import { resultSchema } from '../../src/report/resultSchema.ts';
import { seasonDocument } from '../../src/report/seasonDocument.ts';
import { seasonSchema } from '../../src/report/seasonSchema.ts';
import { seasonText } from '../../src/report/seasonText.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import { checkFile } from '../../src/scenario/checkFile.ts';
import { isProblem } from '../../src/scenario/fileSource.ts';
import { fitAnswer } from '../../src/scenario/fit/fitAnswer.ts';
import { InputFiles } from '../../src/scenario/inputFiles.ts';
import { type loadScenario, scenarioOf } from '../../src/scenario/loadScenario.ts';
import { loadReadSettings, weatherFrom } from '../../src/scenario/loadWeather.ts';
import { loadReadings } from '../../src/scenario/readings/loadReadings.ts';
import { loadLabel } from '../../src/scenario/season/loadLabel.ts';
import { makeSeasons } from '../../src/scenario/season/makeSeasons.ts';
import { heatingDegreeDays } from '../../src/weather/degreeDays.ts';
import type { HurtFiles } from './hurtFiles.ts';
import { expectAnswered, expectSoundProblems, expectSoundText } from './soundProblems.ts';
import { expectSoundYear } from './soundYear.ts';

// Each goes the whole way of a command on files of which one is hurt, and says whether there was a result.

/** `simulate` */
export function trySimulate(scenario: string, source: HurtFiles): boolean {
  const input = source.read(scenario);
  if (isProblem(input)) throw new Error('the scenario is there');
  const { loaded, problems } = scenarioOf(input, new InputFiles(source, source.kept));
  expectAnswered(loaded, problems, source.written);
  if (loaded === undefined) return false;
  const made = makeAnswer(loaded, problems);
  expectAnswered(made.answer, made.problems, source.written);
  if (made.answer === undefined) return false;
  expectSoundYear(made.answer);
  const document = resultDocument(made.answer, '0');
  resultSchema.parse(document);
  expectReadBack(document);
  expectSoundText(answerText(document), source.written);
  return true;
}

/** `check` */
export function tryCheck(name: string, source: HurtFiles): boolean {
  const { about, problems } = checkFile(name, source);
  expectSoundProblems(problems, source.written);
  for (const line of about) expectSoundText(line, source.written);
  return !hasErrors(problems);
}

/** `degree-days` */
export function tryDegreeDays(weather: string, settings: string | undefined, source: HurtFiles): boolean {
  const read = settings === undefined ? { settings: {}, problems: [] } : loadReadSettings(settings, source);
  expectAnswered(read.settings, read.problems, source.written);
  const input = source.read(weather);
  if (isProblem(input)) throw new Error('the weather is there');
  if (read.settings === undefined) return false;
  const found = weatherFrom(input, read.settings, {});
  expectAnswered(found.read, found.problems, source.written);
  for (const line of found.recognised?.lines ?? []) expectSoundText(line, source.written);
  if (found.read === undefined) return false;
  const { series } = found.read;
  const columns = [series.temperature, series.humidity?.values, series.globalRadiation, series.pressure];
  for (const column of columns) if (column?.every(Number.isFinite) === false) throw new Error('a value that is none');
  const { annual } = heatingDegreeDays(series.temperature, 15.5, 'hours');
  if (!(annual >= 0 && Number.isFinite(annual))) throw new Error(`${annual} degree days`);
  return true;
}

/** The readings of `fit` on a house that is loaded. */
export function tryReadings(
  loaded: NonNullable<ReturnType<typeof loadScenario>['loaded']>,
  readings: string,
  source: HurtFiles,
): boolean {
  const meter = loadReadings(readings, loaded, source);
  expectAnswered(meter.readings, meter.problems, source.written);
  if (meter.readings === undefined) return false;
  const { answer, problems } = fitAnswer(loaded, meter.readings);
  expectAnswered(answer, problems, source.written);
  if (answer === undefined) return false;
  const document = fitDocument(answer, '0');
  fitResultSchema.parse(document);
  expectReadBack(document);
  expectSoundText(fitText(document), source.written);
  return true;
}

/** `season` */
export function trySeason(unit: string, source: HurtFiles): boolean {
  const { loaded, problems } = loadLabel(unit, source);
  expectAnswered(loaded, problems, source.written);
  if (loaded === undefined) return false;
  const made = makeSeasons(loaded, { climate: undefined, application: undefined });
  expectAnswered(made.answer, made.problems, source.written);
  if (made.answer === undefined) return false;
  const document = seasonDocument(made.answer, '0');
  seasonSchema.parse(document);
  expectReadBack(document);
  expectSoundText(seasonText(document, { bins: true }), source.written);
  return true;
}

/** JSON writes what is no number as null: it would not be the same document when it is read again. */
function expectReadBack(document: object): void {
  const text = documentText(document);
  if (/:\s*null\b/.test(text)) throw new Error('a null in the document');
  JSON.parse(text);
}
