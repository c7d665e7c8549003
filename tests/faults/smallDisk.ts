import { execFileSync } from 'node:child_process';
import { mkdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { onTestFinished } from 'vitest';

/** How a folder that can hold no result came about, and what the program then says. */
export interface BadFolder {
  readonly path: string;
  readonly says: string;
}

/**
 * A folder on a disk of 256 kB, less than an hourly file needs.
 *
 * @returns undefined where the system does not permit a disk to be mounted
 */
export function smallDisk(folder: string): BadFolder | undefined {
  const path = join(folder, 'small');
  mkdirSync(path);
  return mounted(path) ? { path, says: 'the disk is full' } : undefined;
}

/** A folder in which nothing may be written: on a disk that is read-only, or below a plain file where none can be mounted. */
export function readOnlyFolder(folder: string): BadFolder {
  const path = join(folder, 'readonly');
  mkdirSync(path);
  if (mounted(path)) {
    execFileSync('mount', ['-o', 'remount,ro', path]);
    return { path, says: 'the disk is read-only' };
  }
  writeFileSync(join(folder, 'plain'), '');
  return { path: join(folder, 'plain'), says: 'a part of its path is a file, not a folder' };
}

function mounted(path: string): boolean {
  try {
    execFileSync('mount', ['-t', 'tmpfs', '-o', 'size=256k', 'winterledger-test', path], { stdio: 'ignore' });
  } catch {
    return false;
  }
  onTestFinished(() => {
    execFileSync('umount', [path]);
  });
  return true;
}
