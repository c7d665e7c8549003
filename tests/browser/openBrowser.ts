import { mkdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { type Browser, chromium } from 'playwright-core';
import { unpackBrowser } from '../../cli/pdf/packagedBrowser.ts';

/** Tests and scripts run in the project's folder. */
const project = process.cwd();
const { version } = JSON.parse(
  readFileSync(join(project, 'node_modules/@sparticuz/chromium/package.json'), 'utf8'),
) as { version: string };

/** The arguments of the package's own Chromium bring it down at its second page, so these are ours. */
const ARGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/**
 * A Chromium: the one that CHROMIUM names, else the one of the development dependencies, unpacked once into a folder of its
 * version.
 */
export async function openBrowser(): Promise<Browser> {
  const named = process.env.CHROMIUM;
  if (named !== undefined) return chromium.launch({ executablePath: named, args: ARGS });
  const folder = join(project, `node_modules/.cache/chromium-${version}`);
  mkdirSync(folder, { recursive: true });
  const unpacked = await unpackBrowser(folder, () => import('@sparticuz/chromium'));
  if (unpacked === undefined) throw new Error('there is no Chromium: name one in CHROMIUM');
  const env = Object.entries({ ...process.env, ...unpacked.env }).filter(([, value]) => value !== undefined);
  return chromium.launch({ executablePath: unpacked.program, args: ARGS, env: Object.fromEntries(env) });
}
