import { accessSync, constants, mkdtempSync, rmSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { delimiter, join } from 'node:path';
import { unpackBrowser } from './packagedBrowser.ts';

/** A Chromium that can print. */
export interface Browser {
  readonly program: string;
  /** What its environment needs beside ours. */
  readonly env: Readonly<Record<string, string>>;
  /** Removes what was unpacked for it. */
  readonly leave: () => void;
}

type Environment = Readonly<Record<string, string | undefined>>;

/** It is there in a development tree only, so the program is built without it. */
const PACKAGE = '@sparticuz/chromium';
const NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable', 'chrome', 'microsoft-edge'];

/**
 * A Chromium on this machine: the one that CHROMIUM names, one on the path, or the one of the package in a development
 * tree.
 *
 * @returns nothing where there is none; a name in CHROMIUM that is no program is taken for none too
 */
export async function findBrowser(env: Environment): Promise<Browser | undefined> {
  const named = env.CHROMIUM;
  if (named !== undefined && named !== '') return isProgram(named) ? installed(named) : undefined;
  const folders = (env.PATH ?? '').split(delimiter).filter((folder) => folder !== '');
  const programs = folders.flatMap((folder) => NAMES.map((name) => join(folder, name)));
  const found = programs.find(isProgram);
  return found === undefined ? packaged() : installed(found);
}

function installed(program: string): Browser {
  return { program, env: {}, leave: () => {} };
}

function isProgram(path: string): boolean {
  try {
    accessSync(path, constants.X_OK);
    return statSync(path).isFile();
  } catch {
    return false;
  }
}

/** The package takes whatever lies in its folder for its own, so it gets a new one each time. */
async function packaged(): Promise<Browser | undefined> {
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-browser-'));
  const leave = () => rmSync(folder, { recursive: true, force: true, maxRetries: 3 });
  const unpacked = await unpackBrowser(folder, () => import(PACKAGE));
  if (unpacked !== undefined) return { ...unpacked, leave };
  leave();
  return undefined;
}
