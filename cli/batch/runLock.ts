import { linkSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { hostname } from 'node:os';
import { join } from 'node:path';
import type { Problem } from '../../src/core/problem.ts';
import { faultCode } from '../faultWords.ts';
import { OutputFault } from '../outputFile.ts';

const LOCK = 'batch.lock';

/** Who writes into a folder. */
interface Holder {
  readonly pid: number;
  readonly host: string;
  /** When the process began, as the system counts; empty where it does not tell. Numbers of processes are used again. */
  readonly began: string;
}

/** The right to write into a folder of results; it is given back at the end, or found stale where its process has died. */
export class RunLock {
  readonly #path: string;
  #held = true;

  private constructor(path: string) {
    this.#path = path;
  }

  /**
   * Takes the right to write into a folder, which is made where it is not there.
   *
   * @returns the lock, or the problem that another run holds it
   * @throws OutputFault where the folder cannot be written
   */
  static take(folder: string): RunLock | Problem {
    const path = join(folder, LOCK);
    const own = join(folder, `${LOCK}.${process.pid}`);
    try {
      mkdirSync(folder, { recursive: true });
      writeFileSync(own, JSON.stringify(thisProcess()));
    } catch (fault) {
      throw new OutputFault(folder, fault);
    }
    try {
      if (linked(own, path)) return new RunLock(path);
      const holder = holderOf(path);
      if (holder !== undefined && isAlive(holder)) return busy(folder, path, holder);
      setAside(path, `${own}.stale`, holder);
      return linked(own, path) ? new RunLock(path) : busy(folder, path, holderOf(path));
    } finally {
      rmSync(own, { force: true });
    }
  }

  /** Gives the folder back. Never throws. */
  discard(): void {
    if (this.#held) rmSync(this.#path, { force: true });
    this.#held = false;
  }
}

/** Gives the lock its name unless that is taken: a link is made at once or not at all. */
function linked(own: string, path: string): boolean {
  try {
    linkSync(own, path);
    return true;
  } catch (fault) {
    if (faultCode(fault) === 'EEXIST') return false;
    throw new OutputFault(path, fault);
  }
}

/** Takes a stale lock away; one that was taken anew in the meantime is put back. */
function setAside(path: string, aside: string, stale: Holder | undefined): void {
  try {
    renameSync(path, aside);
    const taken = holderOf(aside);
    if (taken !== undefined && taken.pid !== stale?.pid) linked(aside, path);
    rmSync(aside, { force: true });
  } catch (fault) {
    if (faultCode(fault) !== 'ENOENT') throw fault;
  }
}

function thisProcess(): Holder {
  return { pid: process.pid, host: hostname(), began: beganAt(process.pid) };
}

function holderOf(path: string): Holder | undefined {
  try {
    const { pid, host, began } = JSON.parse(readFileSync(path, 'utf8')) as Partial<Holder>;
    return typeof pid === 'number' ? { pid, host: String(host), began: String(began) } : undefined;
  } catch {
    return undefined;
  }
}

/** Whether the process that holds a lock still runs; of another machine's process nothing is known, so it counts as running. */
function isAlive({ pid, host, began }: Holder): boolean {
  if (host !== hostname()) return true;
  if (pid === process.pid) return false;
  try {
    process.kill(pid, 0);
  } catch (fault) {
    return faultCode(fault) === 'EPERM';
  }
  return began === '' || beganAt(pid) === began;
}

/** When a process began, in the clock ticks of the system's own list of processes; empty where there is no such list. */
function beganAt(pid: number): string {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? '';
  } catch {
    return '';
  }
}

function busy(folder: string, path: string, holder: Holder | undefined): Problem {
  const found = holder === undefined ? 'unknown' : `process ${holder.pid} on ${holder.host}`;
  return { code: 'batch.folder-busy', severity: 'error', file: folder, found, path };
}
