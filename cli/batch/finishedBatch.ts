import { existsSync, realpathSync, statSync } from 'node:fs';
import { join } from 'node:path';
import type { Problem } from '../../src/core/problem.ts';
import { rowOfJsonLine, type ToldRow } from '../../src/report/batchJson.ts';
import type { BatchManifest } from '../../src/report/batchManifest.ts';
import { faultText } from '../faultWords.ts';
import type { FileIdentity } from '../fileIdentity.ts';
import { fileLines } from './fileLines.ts';
import { manifestIn } from './manifestFile.ts';
import { RESULT_FILES } from './resultsFiles.ts';

/** The manifest of a finished batch, or why the folder holds none. */
export function finishedBatch(folder: string): BatchManifest | Problem {
  const manifest = manifestIn(folder);
  if (manifest === undefined || !existsSync(join(folder, RESULT_FILES.lines))) {
    return { code: 'batch.no-results', severity: 'error', file: folder };
  }
  const options = manifest.axes.reduce((product, { values }) => product * values.length, 1);
  return options === manifest.options && options * manifest.homes === manifest.jobs
    ? manifest
    : differs(join(folder, RESULT_FILES.manifest), 'homes, axes and years do not go together');
}

function differs(file: string, found: string, line?: number): Problem {
  return { code: 'batch.results-differ', severity: 'error', file, found, ...(line === undefined ? {} : { line }) };
}

/**
 * The rows of a finished batch one after the other, so that memory holds any number of them.
 *
 * @returns rows in the order of their jobs; where the file is not what its manifest says, a problem as the last of them
 */
export function* rowsIn(folder: string, manifest: BatchManifest): Generator<ToldRow | Problem> {
  const file = join(folder, RESULT_FILES.lines);
  const axes = manifest.axes.map(({ name }) => name);
  let rows = 0;
  let lastJob = 0;
  for (const lines of readable(file)) {
    if (!Array.isArray(lines)) {
      yield lines;
      return;
    }
    for (const line of lines) {
      const row = rowOfJsonLine(line, axes);
      rows++;
      if (row === undefined || row.job <= lastJob || row.job > manifest.jobs) {
        yield differs(file, 'this line is no year of it', rows);
        return;
      }
      lastJob = row.job;
      yield row;
    }
  }
  if (rows !== manifest.rows) yield differs(file, `there are ${rows} years in place of ${manifest.rows}`);
}

/** Lines in groups; where the file cannot be read, the problem as the last of them. */
function* readable(file: string): Generator<string[] | Problem> {
  try {
    for (const group of fileLines(file)) yield group.toString('utf8').trimEnd().split('\n');
  } catch (fault) {
    yield { code: 'file.unreadable', severity: 'error', file, found: faultText(fault) };
  }
}

/** The files of results, to be held against outputs. */
export function resultIdentities(folder: string): FileIdentity[] {
  return Object.values(RESULT_FILES).flatMap((file) => {
    const name = join(folder, file);
    if (!existsSync(name)) return [];
    const { dev, ino } = statSync(name);
    return [{ name, path: realpathSync(name), inode: `${dev}:${ino}` }];
  });
}
