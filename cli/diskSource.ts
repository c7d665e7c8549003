import { createHash } from 'node:crypto';
import { closeSync, constants, fstatSync, openSync, readSync, realpathSync, type Stats, statSync } from 'node:fs';
import { dirname, isAbsolute, join, resolve } from 'node:path';
import type { Problem } from '../src/core/problem.ts';
import type { FileSource, InputBytes } from '../src/scenario/fileSource.ts';
import { faultCode, faultText } from './faultWords.ts';
import type { FileIdentity } from './fileIdentity.ts';

const MEGABYTE = 1_000_000;
/** Largest files that are read, bytes: structured files, and tables of hours. */
const LARGEST_YAML = MEGABYTE;
const LARGEST_TABLE = 200 * MEGABYTE;

/**
 * Input files on the disk: regular files only, up to a size, each read once, links followed.
 *
 * A name is relative to the folder of the file that names it; one that the user gives, to the working folder.
 */
export class DiskSource implements FileSource {
  readonly #results = new Map<string, InputBytes | Problem>();
  readonly #identities: FileIdentity[] = [];

  /** What was read so far, to be held against the outputs. */
  get identities(): readonly FileIdentity[] {
    return this.#identities;
  }

  read(name: string, from?: string): InputBytes | Problem {
    const file = from === undefined || isAbsolute(name) ? name : join(dirname(from), name);
    const key = resolve(file);
    const known = this.#results.get(key);
    if (known !== undefined) return { ...known, ...('code' in known ? { file } : { name: file }) };
    const result = this.#readNew(file);
    this.#results.set(key, result);
    return result;
  }

  #readNew(file: string): InputBytes | Problem {
    try {
      const before = refusal(file, statSync(file));
      if (before !== undefined) return before;
      // The file may have changed since: what is opened is looked at again, and opening never waits for a writer.
      const handle = openSync(file, constants.O_RDONLY | (constants.O_NONBLOCK ?? 0));
      try {
        const stats = fstatSync(handle);
        const changed = refusal(file, stats);
        if (changed !== undefined) return changed;
        const bytes = readWhole(handle, stats.size, largestOf(file));
        if (bytes === undefined) return tooLarge(file, stats.size);
        this.#identities.push({ name: file, path: realpathSync(file), inode: `${stats.dev}:${stats.ino}` });
        return { name: file, bytes, sha256: createHash('sha256').update(bytes).digest('hex') };
      } finally {
        closeSync(handle);
      }
    } catch (fault) {
      return problemOf(file, fault);
    }
  }
}

function largestOf(file: string): number {
  return /\.ya?ml$/i.test(file) ? LARGEST_YAML : LARGEST_TABLE;
}

/** Why a file is not opened. */
function refusal(file: string, stats: Stats): Problem | undefined {
  if (!stats.isFile()) return { code: 'file.not-a-file', severity: 'error', file, found: kindOf(stats) };
  return stats.size > largestOf(file) ? tooLarge(file, stats.size) : undefined;
}

function tooLarge(file: string, size: number): Problem {
  const largest = largestOf(file);
  const found = `${(Math.max(size, largest) / MEGABYTE).toFixed(1)} MB`;
  return { code: 'file.too-large', severity: 'error', file, found, allowed: `${largest / MEGABYTE} MB` };
}

function kindOf(stats: Stats): string {
  if (stats.isDirectory()) return 'a folder';
  if (stats.isFIFO()) return 'a pipe';
  if (stats.isSocket()) return 'a socket';
  return 'a device';
}

/** All bytes up to the end, which the size only foretells; nothing where there are more than `most`. */
function readWhole(handle: number, size: number, most: number): Uint8Array | undefined {
  let bytes = new Uint8Array(size + 1);
  let length = 0;
  for (;;) {
    const count = readSync(handle, bytes, length, bytes.length - length, null);
    length += count;
    if (length > most) return undefined;
    if (count === 0) return bytes.subarray(0, length);
    if (length === bytes.length) {
      const longer = new Uint8Array(2 * length);
      longer.set(bytes);
      bytes = longer;
    }
  }
}

function problemOf(file: string, fault: unknown): Problem {
  const missing = ['ENOENT', 'ENOTDIR', 'ENAMETOOLONG', 'ERR_INVALID_ARG_VALUE'].includes(faultCode(fault));
  if (missing) return { code: 'file.missing', severity: 'error', file };
  return { code: 'file.unreadable', severity: 'error', file, found: faultText(fault) };
}
