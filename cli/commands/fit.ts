import type { Problem } from '../../src/core/problem.ts';
import { documentText } from '../../src/report/documentText.ts';
import { fitDocument } from '../../src/report/fitDocument.ts';
import { fitText } from '../../src/report/fitText.ts';
import { type FitAnswer, fitAnswer } from '../../src/scenario/fit/fitAnswer.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { loadReadings, readingsProblems } from '../../src/scenario/readings/loadReadings.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

/** Finds the heat loss that meter readings of a house show. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { readings, json } = options;
  if (readings === undefined) return wrongUse('--readings FILE is missing: the meter readings (CSV)', 'fit', io);
  return withOutputs([json], io, (outputs) => fitHouse({ scenario: files[0], readings, json, outputs }, io));
}

interface Asked {
  readonly scenario: string;
  readonly readings: string;
  readonly json: string | undefined;
  readonly outputs: Outputs;
}

async function fitHouse({ scenario, readings, json, outputs }: Asked, io: Io): Promise<number> {
  const source = new DiskSource();
  const { answer, problems } = answerOf(scenario, readings, source);
  const clashes = outputs.overInputs(source.identities);
  await tellProblems([...clashes, ...problems], io);
  if (answer === undefined || clashes.length > 0) return EXIT.wrongInput;
  const document = fitDocument(answer, io.version);
  await outputs.write(json, [documentText(document)]);
  await outputs.finish();
  if (!outputs.takesStdout) await io.stdout.write(fitText(document));
  return EXIT.done;
}

/** The heat loss by the readings, and all problems of all files. */
function answerOf(scenario: string, readings: string, source: DiskSource): { answer?: FitAnswer; problems: Problem[] } {
  const house = loadScenario(scenario, source);
  if (house.loaded === undefined) return { problems: [...house.problems, ...readingsProblems(readings, source)] };
  const meter = loadReadings(readings, house.loaded, source);
  const problems = [...house.problems, ...meter.problems];
  if (meter.readings === undefined) return { problems };
  const fitted = fitAnswer(house.loaded, meter.readings);
  return { ...fitted, problems: [...problems, ...fitted.problems] };
}
