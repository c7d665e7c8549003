import { hasErrors } from '../../src/core/problem.ts';
import { answerText } from '../../src/report/answerText.ts';
import { documentText } from '../../src/report/documentText.ts';
import { hourlyCsv } from '../../src/report/hourlyCsv.ts';
import { resultDocument } from '../../src/report/resultDocument.ts';
import { hoursOfDay } from '../../src/report/terminal/hoursOfDay.ts';
import { english } from '../../src/report/words.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { tellProblems } from '../tellProblems.ts';

/** Simulates a scenario, prints the answer, and writes the results that were asked for. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { json, hourly } = options;
  return withOutputs([json, hourly], io, (outputs) => simulate(files[0], { json, hourly, outputs, io }));
}

interface Wanted {
  readonly json: string | undefined;
  readonly hourly: string | undefined;
  readonly outputs: Outputs;
  readonly io: Io;
}

async function simulate(scenario: string, { json, hourly, outputs, io }: Wanted): Promise<number> {
  const source = new DiskSource();
  const { loaded, problems } = loadScenario(scenario, source);
  const clashes = outputs.overInputs(source.identities);
  await tellProblems([...clashes, ...problems], io);
  if (loaded === undefined || clashes.length > 0) return EXIT.wrongInput;
  const made = makeAnswer(loaded, problems);
  await tellProblems(made.problems, io);
  if (made.answer === undefined || hasErrors(made.problems)) return EXIT.wrongInput;
  const document = resultDocument(made.answer, io.version);
  await outputs.write(json, [documentText(document)]);
  await outputs.write(hourly, hourlyCsv(made.answer));
  await outputs.finish();
  if (!outputs.takesStdout) {
    const pictures = io.pictures === true ? hoursOfDay(made.answer) : undefined;
    await io.stdout.write(answerText(document, english, pictures));
  }
  return EXIT.done;
}
