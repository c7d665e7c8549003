import { hasErrors } from '../../src/core/problem.ts';
import { documentText } from '../../src/report/documentText.ts';
import { askedHour } from '../../src/report/explainAsked.ts';
import { explainDocument } from '../../src/report/explainDocument.ts';
import { explainText } from '../../src/report/explainText.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

/** Simulates a scenario and shows how every figure of one hour comes about. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { at, json } = options;
  if (at === undefined) {
    return wrongUse('--at TIME is missing: the hour to explain, written like 2025-01-14T06:00', 'explain', io);
  }
  return withOutputs([json], io, (outputs) => explain({ scenario: files[0], at, json, outputs }, io));
}

interface Asked {
  readonly scenario: string;
  readonly at: string;
  readonly json: string | undefined;
  readonly outputs: Outputs;
}

async function explain({ scenario, at, json, outputs }: Asked, io: Io): Promise<number> {
  const source = new DiskSource();
  const { loaded, problems } = loadScenario(scenario, source);
  const found = loaded === undefined ? {} : askedHour(at, loaded.clock);
  const ofTime = found.problem === undefined ? [] : [found.problem];
  const clashes = outputs.overInputs(source.identities);
  await tellProblems([...clashes, ...problems, ...ofTime], io);
  if (loaded === undefined || found.asked === undefined || clashes.length > 0) return EXIT.wrongInput;
  const made = makeAnswer(loaded, problems);
  await tellProblems(made.problems, io);
  if (made.answer === undefined || hasErrors(made.problems)) return EXIT.wrongInput;
  const document = explainDocument(made.answer, { ...found.asked, text: at }, io.version);
  await outputs.write(json, [documentText(document)]);
  await outputs.finish();
  if (!outputs.takesStdout) await io.stdout.write(explainText(document));
  return EXIT.done;
}
