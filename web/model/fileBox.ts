import { decodeText } from '../../src/core/decodeText.ts';
import type { EntryPath } from '../../src/scenario/entries/pathText.ts';
import { type FileKind, recogniseKind } from '../../src/scenario/recogniseKind.ts';
import { folderOf, MemorySource, type SheetFile } from './memorySource.ts';
import { type Written, withEntry } from './yamlEdit.ts';

/** The files of the page: the truth that everything else is made of. */
export class FileBox {
  #files = new Map<string, SheetFile>();
  readonly #hashes = new WeakMap<Uint8Array, string>();
  readonly #kinds = new WeakMap<Uint8Array, FileKind | 'none'>();
  readonly #changed = new Set<string>();
  readonly #changedSince = new Set<string>();
  /** Counts the changes of every file but the scenario. */
  othersChanged = 0;
  scenario = '';

  get list(): { name: string; size: number; changed: boolean }[] {
    return [...this.#files.values()].map(({ name, bytes }) => ({
      ...{ name, size: bytes.length, changed: this.#changed.has(name) },
    }));
  }

  get all(): readonly SheetFile[] {
    return [...this.#files.values()];
  }

  get source(): MemorySource {
    return new MemorySource(this.#files, this.#hashes);
  }

  has(name: string): boolean {
    return this.#files.has(name);
  }

  /** Files that hold a scenario, those that lie highest first. */
  get scenarios(): string[] {
    const depth = (name: string) => name.split('/').length;
    return this.all
      .filter((file) => this.#kindOf(file) === 'scenario')
      .map(({ name }) => name)
      .sort((a, b) => depth(a) - depth(b) || (a < b ? -1 : 1));
  }

  /** The kind of a file, which is looked for once. */
  #kindOf(file: SheetFile): FileKind | 'none' {
    const known = this.#kinds.get(file.bytes) ?? kindOf(file) ?? 'none';
    this.#kinds.set(file.bytes, known);
    return known;
  }

  /** Names of the files that have changed since this was asked last. */
  takeChanged(): ReadonlySet<string> {
    const names = new Set(this.#changedSince);
    this.#changedSince.clear();
    return names;
  }

  /** The files with others laid over them. */
  sourceOver(files: readonly SheetFile[]): MemorySource {
    return new MemorySource(
      new Map([...this.#files, ...files.map((file) => [file.name, file] as const)]),
      this.#hashes,
    );
  }

  /** Begins anew with these files; the scenario is the one that is given, else the one that lies highest. */
  replace(files: readonly SheetFile[], scenario?: string): void {
    for (const name of [...this.#files.keys(), ...files.map((file) => file.name)]) this.#changedSince.add(name);
    this.#files = new Map(files.map((file) => [file.name, file]));
    this.#changed.clear();
    this.othersChanged++;
    this.scenario = scenario ?? this.scenarios[0] ?? '';
  }

  put(file: SheetFile): void {
    this.#files.set(file.name, file);
    this.#changed.add(file.name);
    this.#changedSince.add(file.name);
    if (file.name !== this.scenario) this.othersChanged++;
  }

  text(name: string): string {
    const file = this.#files.get(name);
    return file === undefined ? '' : decodeText(file.bytes).text;
  }

  setText(name: string, text: string): void {
    this.put({ name, bytes: new TextEncoder().encode(text) });
  }

  /** Changes one entry of a structured file; nothing where the file cannot be parsed. */
  write(name: string, path: EntryPath, value: Written): void {
    const text = withEntry(this.text(name), path, value);
    if (text !== undefined) this.setText(name, text);
  }

  /** The path under which a name in the scenario is held. */
  pathOf(name: string): string {
    const { path, file } = this.source.find(name, this.scenario);
    return file?.name ?? path;
  }

  /** The name by which the scenario names a file that it holds. */
  nameFromScenario(path: string): string {
    const folder = folderOf(this.scenario);
    return folder !== '' && path.startsWith(`${folder}/`) ? path.slice(folder.length + 1) : path;
  }
}

/** What a file is, by what stands in it. */
export function kindOf(file: SheetFile): FileKind | undefined {
  return recogniseKind(startOf(file)).kind;
}

/** The beginning of a file, which shows what it is. */
export function startOf({ bytes }: SheetFile): string {
  return decodeText(bytes.subarray(0, 20_000)).text;
}
