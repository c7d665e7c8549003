import type { Problem } from '../../src/core/problem.ts';
import type { FileSource, InputBytes } from '../../src/scenario/fileSource.ts';
import { sha256 } from './sha256.ts';

/** A file of the page: its path from the opened folder, and its bytes. */
export interface SheetFile {
  readonly name: string;
  readonly bytes: Uint8Array;
}

/** Largest file that the page takes, bytes. */
export const LARGEST_FILE = 200_000_000;

/**
 * Input files in memory, by their paths with `/`.
 *
 * A name is relative to the folder of the file that names it, as on a disk. Files that were dropped without their folders
 * are found by their own name, as long as only one has it.
 */
export class MemorySource implements FileSource {
  readonly #files: ReadonlyMap<string, SheetFile>;
  readonly #hashes: WeakMap<Uint8Array, string>;

  /**
   * @param files by their paths
   * @param hashes of bytes known from before; new ones are added
   */
  constructor(files: ReadonlyMap<string, SheetFile>, hashes: WeakMap<Uint8Array, string> = new WeakMap()) {
    this.#files = files;
    this.#hashes = hashes;
  }

  /** The file that a name means, absent where there is none. */
  find(name: string, from?: string): { readonly path: string; readonly file?: SheetFile } {
    const path = from === undefined ? joined('', name) : joined(folderOf(from), name);
    const exact = this.#files.get(path);
    if (exact !== undefined) return { path, file: exact };
    const alike = [...this.#files.values()].filter((file) => baseOf(file.name) === baseOf(path));
    return alike.length === 1 ? { path, file: alike[0] } : { path };
  }

  read(name: string, from?: string): InputBytes | Problem {
    const { path, file } = this.find(name, from);
    if (file === undefined) return { code: 'file.missing', severity: 'error', file: path };
    const known = this.#hashes.get(file.bytes) ?? sha256(file.bytes);
    this.#hashes.set(file.bytes, known);
    return { name: path, bytes: file.bytes, sha256: known };
  }
}

/** The folder of a path, without its last stroke; '' for none. */
export function folderOf(path: string): string {
  return path.slice(0, Math.max(0, path.lastIndexOf('/')));
}

/** The last part of a path. */
export function baseOf(path: string): string {
  return path.slice(path.lastIndexOf('/') + 1);
}

/**
 * A name seen from a folder, with `.` and `..` followed.
 *
 * @example joined('a/b', '../c.csv') // 'a/c.csv'
 */
export function joined(folder: string, name: string): string {
  const parts: string[] = [];
  for (const part of `${folder}/${name}`.split('/')) {
    if (part === '..' && parts.length > 0 && parts.at(-1) !== '..') parts.pop();
    else if (part !== '' && part !== '.') parts.push(part);
  }
  return parts.join('/');
}
