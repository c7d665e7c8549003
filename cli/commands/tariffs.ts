import type { Problem } from '../../src/core/problem.ts';
import { documentText } from '../../src/report/documentText.ts';
import { tariffRankingDocument } from '../../src/report/tariffRankingDocument.ts';
import { tariffRankingText } from '../../src/report/tariffRankingText.ts';
import { makeAnswer } from '../../src/scenario/answer/makeAnswer.ts';
import { rankTariffs } from '../../src/scenario/answer/rankTariffs.ts';
import { loadScenario } from '../../src/scenario/loadScenario.ts';
import { DiskSource } from '../diskSource.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { type Outputs, withOutputs } from '../outputs.ts';
import { tellProblems } from '../tellProblems.ts';

/** Ranks the tariffs of a scenario, and those named beside it, on one simulated year. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const [scenario, ...further] = files;
  const { json } = options;
  return withOutputs([json], io, (outputs) => rank({ scenario, further, json, outputs }, io));
}

interface Asked {
  readonly scenario: string;
  readonly further: readonly string[];
  readonly json: string | undefined;
  readonly outputs: Outputs;
}

async function rank({ scenario, further, json, outputs }: Asked, io: Io): Promise<number> {
  const source = new DiskSource();
  const { loaded, problems } = loadScenario(scenario, source, further);
  const clashes = outputs.overInputs(source.identities);
  await tellProblems([...clashes, ...problems], io);
  if (loaded === undefined || clashes.length > 0) return EXIT.wrongInput;
  if (loaded.tariffs.length === 0) {
    const none: Problem = { code: 'tariff.none', severity: 'error', file: scenario };
    await tellProblems([none], io);
    return EXIT.wrongInput;
  }
  const made = makeAnswer(loaded, problems);
  await tellProblems(made.problems, io);
  if (made.answer === undefined) return EXIT.wrongInput;
  const document = tariffRankingDocument(made.answer, rankTariffs(made.answer), io.version);
  await outputs.write(json, [documentText(document)]);
  await outputs.finish();
  if (!outputs.takesStdout) await io.stdout.write(tariffRankingText(document));
  return EXIT.done;
}
