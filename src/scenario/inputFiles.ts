import type { Problem } from '../core/problem.ts';
import { type EntryPath, pathText } from './entries/pathText.ts';
import { type FileSource, type InputBytes, isProblem } from './fileSource.ts';
import type { Kept } from './kept.ts';
import type { YamlFile } from './yaml/yamlFile.ts';

/** What an input file is for. */
export type InputRole =
  | ('plan' | 'homes' | 'scenario' | 'unit' | 'table' | 'weather' | 'read' | 'readings')
  | ('tariff' | 'priceSeries' | 'meter' | 'carbonFactors');

/** A file that a result rests on. */
export interface InputRecord {
  readonly file: string;
  readonly role: InputRole;
  /** SHA-256 of its bytes, hexadecimal. */
  readonly sha256: string;
}

/** Reads the input files of one task and keeps the record of them. */
export class InputFiles {
  /** Where the scenarios of one batch keep what they have in common; absent for a scenario on its own. */
  readonly kept: Kept | undefined;
  readonly #source: FileSource;
  readonly #records: InputRecord[] = [];

  constructor(source: FileSource, kept?: Kept) {
    this.#source = source;
    this.kept = kept;
  }

  /** The files read so far, each once for every role. */
  get records(): InputRecord[] {
    return [...this.#records];
  }

  /** Reads a file that the user named. */
  read(name: string, role: InputRole): { input?: InputBytes; problems: Problem[] } {
    return this.#kept(this.#source.read(name), role);
  }

  /** Reads a file that another file names; a fault then tells where it is named. */
  readNamed(
    name: string,
    role: InputRole,
    by: { yaml: YamlFile; path: EntryPath },
  ): { input?: InputBytes; problems: Problem[] } {
    const owner = by.yaml.owner(by.path);
    const result = this.#source.read(name, owner);
    if (!isProblem(result)) return this.#kept(result, role);
    const hint = `named in ${owner} under ${pathText(by.path)}`;
    return { problems: [{ ...result, ...by.yaml.place(by.path), path: pathText(by.path), hint }] };
  }

  #kept(result: InputBytes | Problem, role: InputRole): { input?: InputBytes; problems: Problem[] } {
    if (isProblem(result)) return { problems: [result] };
    const known = this.#records.some((record) => record.file === result.name && record.role === role);
    if (!known) this.#records.push({ file: result.name, role, sha256: result.sha256 });
    return { input: result, problems: [] };
  }
}
