import { rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import type { Problem } from '../../src/core/problem.ts';
import type { BatchManifest } from '../../src/report/batchManifest.ts';
import { figure } from '../../src/report/figures.ts';
import { addPart, type FinishedPart, joinedManifest, missingParts, readParts } from '../batch/gatherParts.ts';
import { manifestIn } from '../batch/manifestFile.ts';
import { foreignFile, RESULT_FILES, ResultsWriter } from '../batch/resultsFiles.ts';
import { differenceOf, finishedIdentity, otherRun } from '../batch/runIdentity.ts';
import { RunLock } from '../batch/runLock.ts';
import { removeOnInterruption } from '../interruption.ts';
import { type CommandInput, EXIT, type Io } from '../io.ts';
import { tellProblems } from '../tellProblems.ts';
import { wrongUse } from '../wrongUse.ts';

/** Joins the parts of a batch, and says which are missing. */
export async function run({ files, options }: CommandInput, io: Io): Promise<number> {
  const { out } = options;
  if (out === undefined) return wrongUse("option '--out' is needed: the folder for the joined results", 'gather', io);
  if (files.some((folder) => resolve(folder) === resolve(out))) {
    return wrongUse(`'${out}' is one of the parts; the joined results need a folder of their own`, 'gather', io);
  }
  const { parts, problems } = readParts(files);
  if (problems.length > 0) {
    await tellProblems(problems, io);
    return EXIT.wrongInput;
  }
  const missing = missingParts(parts);
  const result = gather(
    parts,
    missing.map(({ part }) => part),
    out,
  );
  if ('code' in result) {
    await tellProblems([result], io);
    return EXIT.wrongInput;
  }
  await tellProblems(
    missing.map(({ part, jobs }) => ({
      code: 'batch.part-missing',
      severity: 'error',
      file: out,
      found: part,
      allowed: jobs,
    })),
    io,
  );
  const { rows, failed } = result;
  const bad = failed === 0 ? '' : `, ${figure(failed, 0)} of them with a problem`;
  await io.stdout.write(`${figure(rows, 0)} years of ${parts.length} parts${bad}\n`);
  await io.stdout.write(`${out}: ${Object.values(RESULT_FILES).join(', ')}\n`);
  return missing.length === 0 && failed === 0 ? EXIT.done : EXIT.partlyDone;
}

/** Writes the joined results. @throws OutputFault */
function gather(parts: readonly FinishedPart[], missing: readonly string[], out: string): BatchManifest | Problem {
  const lock = RunLock.take(out);
  if (!(lock instanceof RunLock)) return lock;
  removeOnInterruption(lock);
  const work = join(out, 'gathering');
  try {
    const manifest = joinedManifest(parts, missing);
    const occupied = occupation(out, manifest);
    if (occupied !== undefined) return occupied;
    const axes = manifest.axes.map(({ name }) => name);
    const writer = new ResultsWriter(out, work, {
      axes,
      homes: manifest.homesFile !== undefined,
      tariffs: manifest.tariffs,
    });
    for (const part of parts) {
      const fault = addPart(writer, part);
      if (fault !== undefined) return fault;
    }
    writer.finish(manifest);
    return manifest;
  } finally {
    rmSync(work, { recursive: true, force: true });
    lock.discard();
  }
}

/** Why the folder cannot take the results: it holds those of another batch. Its own, gathered before, are replaced. */
function occupation(out: string, manifest: BatchManifest): Problem | undefined {
  const there = manifestIn(out);
  if (there === undefined) {
    const foreign = foreignFile(out);
    return foreign === undefined
      ? undefined
      : { code: 'batch.foreign-file', severity: 'error', file: out, found: foreign };
  }
  const difference = differenceOf(
    finishedIdentity(there),
    finishedIdentity({ ...manifest, inputs: keyInputs(manifest) }),
  );
  return difference === undefined ? undefined : otherRun(out, 'finished results', difference);
}

/** The inputs that tell one batch from another. */
function keyInputs({ inputs }: BatchManifest): BatchManifest['inputs'] {
  return inputs.filter(({ role }) => role === 'plan' || role === 'homes');
}
