import type { Problem } from '../core/problem.ts';
import { type EntryPath, pathText } from '../scenario/entries/pathText.ts';
import type { Fault, Place, YamlFile } from '../scenario/yaml/yamlFile.ts';
import { type Change, changeAt, withChanges } from './changes.ts';

/**
 * A base scenario with the changes of one job: to the loader a scenario like any other, whose problems stand where the
 * change is written.
 */
export class JobFile implements YamlFile {
  readonly file: string;
  readonly raw: unknown;
  readonly #base: YamlFile;
  readonly #changes: readonly Change[];

  /**
   * @param base the base scenario as written, or a job file that has some of the changes already
   * @param changes what is otherwise; the later wins
   */
  constructor(base: YamlFile, changes: readonly Change[]) {
    this.file = base.file;
    this.raw = withChanges(base.raw, changes);
    this.#base = base;
    this.#changes = changes;
  }

  owner(path: EntryPath): string {
    return changeAt(this.#changes, path)?.origin.file ?? this.#base.owner(path);
  }

  place(path: EntryPath): Place {
    const change = changeAt(this.#changes, path);
    return change === undefined ? this.#base.place(path) : placeOf(change);
  }

  keyPlace(path: EntryPath): Place {
    const change = changeAt(this.#changes, path);
    return change === undefined ? this.#base.keyPlace(path) : placeOf(change);
  }

  problem(path: EntryPath, fault: Fault): Problem {
    return { severity: 'error', ...fault, file: this.owner(path), ...this.place(path), path: pathText(path) };
  }

  keyProblem(path: EntryPath, fault: Fault): Problem {
    return { severity: 'error', ...fault, file: this.owner(path), ...this.keyPlace(path), path: pathText(path) };
  }

  textPlaces(path: EntryPath): (line: number, column: number) => Place {
    return this.#base.textPlaces(path);
  }

  isLiteralBlock(path: EntryPath): boolean {
    return this.#base.isLiteralBlock(path);
  }
}

function placeOf({ origin }: Change): Place {
  return { line: origin.line ?? 1, column: origin.column ?? 1 };
}
