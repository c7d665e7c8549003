import type { Problem } from '../../core/problem.ts';
import type { DefaultUsed } from '../entries/defaultsUsed.ts';
import type { FileSource } from '../fileSource.ts';
import { InputFiles, type InputRecord } from '../inputFiles.ts';
import { type LoadedUnit, unitOf } from '../loadUnit.ts';

/** A unit file read for the label check: the unit, its defaults, what is odd in it, and the files it rests on. */
export interface LoadedLabel {
  readonly unit: LoadedUnit;
  readonly defaults: readonly DefaultUsed[];
  readonly problems: readonly Problem[];
  readonly inputs: readonly InputRecord[];
}

/**
 * Loads a unit file for the label check.
 *
 * @param name of the file, as the user gives it
 * @param source where files come from
 * @returns nothing loaded where a problem is an error
 */
export function loadLabel(name: string, source: FileSource): { loaded?: LoadedLabel; problems: Problem[] } {
  const files = new InputFiles(source);
  const read = files.read(name, 'unit');
  if (read.input === undefined) return { problems: read.problems };
  const { loaded: unit, defaults, problems } = unitOf(read.input, files);
  if (unit === undefined) return { problems };
  return { loaded: { unit, defaults, problems, inputs: files.records }, problems };
}
