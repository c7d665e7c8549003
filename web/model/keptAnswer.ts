import { hasErrors, type Problem } from '../../src/core/problem.ts';
import type { Answer } from '../../src/scenario/answer/answer.ts';
import { assumptionsOf } from '../../src/scenario/answer/assumptions.ts';
import { comparisonOf } from '../../src/scenario/answer/comparison.ts';
import { answerYear } from '../../src/scenario/answer/makeAnswer.ts';
import { warningsOf } from '../../src/scenario/answer/warnings.ts';
import { entryOf } from '../../src/scenario/entries/schemaField.ts';
import { type FileSource, isProblem } from '../../src/scenario/fileSource.ts';
import { inFileOrder } from '../../src/scenario/inFileOrder.ts';
import type { Kept } from '../../src/scenario/kept.ts';
import { type LoadedScenario, scenarioOf } from '../../src/scenario/loadScenario.ts';
import { KeptFiles } from './keptFiles.ts';

/**
 * The answer of a scenario, with what the weather, the unit and the tariffs become kept from the last time. It is that of
 * `loadScenario` and `makeAnswer`, which make everything anew; a test holds the two against each other.
 *
 * @param name of the scenario file
 * @param source of the files
 * @param kept from the last time, as long as no file but the scenario has changed
 */
export function keptAnswer(name: string, source: FileSource, kept: Kept): { answer?: Answer; problems: Problem[] } {
  const files = new KeptFiles(source, kept);
  const { input, problems: missing } = files.read(name, 'scenario');
  if (input === undefined) return { problems: missing };
  const { loaded: read, problems: unordered } = scenarioOf(input, files);
  const problems = inFileOrder(unordered);
  if (read === undefined) return { problems };
  const loaded = withMeterFiles(read, source);
  const { year, problems: ofYear } = answerYear(loaded, kept);
  if (year === undefined || hasErrors(ofYear)) return { problems: [...problems, ...ofYear] };
  const { costs, plan, totals } = year;
  const comparison = costs[0] && comparisonOf(loaded.scenario, totals, costs[0]);
  const core = { ...year, ...(comparison === undefined ? {} : { comparison }) };
  const answer = { ...core, warnings: warningsOf(core, problems), assumptions: assumptionsOf(loaded, plan) };
  return { answer, problems };
}

/** The record of a meter's and of carbon's file, which are not read again either. */
function withMeterFiles(loaded: LoadedScenario, source: FileSource): LoadedScenario {
  const { household, carbon } = loaded.scenario;
  const files = [
    { role: 'meter', file: household?.given === 'meter' ? household.file : undefined },
    { role: 'carbonFactors', file: carbonFile(carbon?.electricity) },
  ] as const;
  const missing = files.flatMap(({ role, file }) => {
    const read = file === undefined ? undefined : source.read(file, loaded.file);
    const known = loaded.inputs.some((input) => input.role === role);
    return read === undefined || isProblem(read) || known ? [] : [{ file: read.name, role, sha256: read.sha256 }];
  });
  return missing.length === 0 ? loaded : { ...loaded, inputs: [...loaded.inputs, ...missing] };
}

function carbonFile(electricity: unknown): string | undefined {
  const file = entryOf(electricity, 'file');
  return typeof file === 'string' ? file : undefined;
}
