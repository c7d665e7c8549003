import { closeSync, fchmodSync, openSync, realpathSync, renameSync, rmSync, type Stats, statSync } from 'node:fs';
import { type FileHandle, open } from 'node:fs/promises';
import { basename, dirname, join } from 'node:path';
import type { Problem } from '../src/core/problem.ts';
import { faultCode, faultText } from './faultWords.ts';
import type { FileIdentity } from './fileIdentity.ts';

/** A file that is being written beside its place, and takes its name only when it is whole. */
export interface OutputFile {
  readonly identity: FileIdentity;
  /** Adds text, or bytes. @throws OutputFault */
  write(piece: string | Uint8Array): Promise<void>;
  /** Ends the writing and gives the file its name. @throws OutputFault */
  finish(): Promise<void>;
  /** Removes what was written; nothing after `finish`. Never throws. */
  discard(): void;
}

/** A result that could not be written; the program ends with exit code 3. */
export class OutputFault extends Error {
  readonly problem: Problem;

  constructor(file: string, fault: unknown) {
    super(faultText(fault), { cause: fault });
    this.problem = unwritable(file, fault);
  }
}

/** Codes of a disk that takes no more. */
const FULL = ['ENOSPC', 'EDQUOT'];

function unwritable(file: string, fault: unknown): Problem {
  const hint = 'make room on the disk, or choose a folder on another one, and run it again';
  const cure = FULL.includes(faultCode(fault)) ? { hint } : {};
  return { code: 'file.unwritable', severity: 'error', file, found: faultText(fault), ...cure };
}

/**
 * Opens a file for a result, before any work is done.
 *
 * A regular file is written under a passing name in the same folder; a device or a pipe is written as it comes.
 *
 * @param name as the user gave it
 * @returns the open file, or why it cannot be written
 */
export async function openOutput(name: string): Promise<OutputFile | Problem> {
  try {
    const stats = statsOf(name);
    if (stats?.isDirectory() || /[/\\]$/.test(name)) return folderProblem(name);
    const path = stats === undefined ? join(realpathSync(dirname(name)), basename(name)) : realpathSync(name);
    const identity = { name, path, inode: stats === undefined ? undefined : `${stats.dev}:${stats.ino}` };
    if (stats !== undefined && !stats.isFile()) return new OpenedFile(identity, await open(name, 'w'));
    if (stats !== undefined) closeSync(openSync(path, 'r+'));
    const passing = join(dirname(path), passingName());
    const handle = await open(passing, 'wx');
    if (stats !== undefined) fchmodSync(handle.fd, stats.mode & 0o777);
    return new OpenedFile(identity, handle, passing);
  } catch (fault) {
    return unwritable(name, fault);
  }
}

function folderProblem(name: string): Problem {
  return { code: 'file.output-is-folder', severity: 'error', file: name, path: join(name, 'result.json') };
}

/** What stands at a name, links followed; nothing where it is free. */
function statsOf(name: string): Stats | undefined {
  try {
    return statSync(name);
  } catch (fault) {
    if (faultCode(fault) === 'ENOENT') return undefined;
    throw fault;
  }
}

let passingNames = 0;

function passingName(): string {
  passingNames++;
  return `.winterledger-${process.pid}-${passingNames}.tmp`;
}

class OpenedFile implements OutputFile {
  readonly identity: FileIdentity;
  readonly #handle: FileHandle;
  #passing: string | undefined;

  constructor(identity: FileIdentity, handle: FileHandle, passing?: string) {
    this.identity = identity;
    this.#handle = handle;
    this.#passing = passing;
  }

  async write(piece: string | Uint8Array): Promise<void> {
    await this.#tried(() => this.#handle.appendFile(piece));
  }

  async finish(): Promise<void> {
    await this.#tried(async () => {
      await this.#handle.close();
      if (this.#passing === undefined) return;
      renameSync(this.#passing, this.identity.path);
      this.#passing = undefined;
    });
  }

  discard(): void {
    if (this.#passing !== undefined) rmSync(this.#passing, { force: true });
    this.#passing = undefined;
    this.#handle.close().catch(() => {});
  }

  async #tried(act: () => Promise<void>): Promise<void> {
    try {
      await act();
    } catch (fault) {
      throw new OutputFault(this.identity.name, fault);
    }
  }
}
