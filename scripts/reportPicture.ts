import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { DiskSource } from '../cli/diskSource.ts';
import packageFile from '../package.json' with { type: 'json' };
import { makeReport } from '../src/report/html/makeReport.ts';
import { reportPage } from '../src/report/html/reportPage.ts';
import { openBrowser } from '../tests/browser/openBrowser.ts';

/** Where the README finds it, and the part of the first page that it shows, px. */
const PICTURE = 'docs/pictures/report.png';
const WIDTH = 860;
const HEIGHT = 1090;
const SCALE = 0.8;

const settings = { language: 'en', date: undefined, version: packageFile.version } as const;
const { input } = makeReport('data/demo/house.yaml', new DiskSource(), settings);
if (input === undefined) throw new Error('the demo house has no report');
const folder = mkdtempSync(join(tmpdir(), 'winterledger-picture-'));
const html = join(folder, 'report.html');
writeFileSync(html, reportPage(input));
const browser = await openBrowser();
try {
  const page = await browser.newPage({ viewport: { width: WIDTH, height: HEIGHT }, deviceScaleFactor: SCALE });
  await page.goto(pathToFileURL(html).href);
  await page.screenshot({ path: PICTURE });
  console.log(PICTURE);
} finally {
  await browser.close();
  rmSync(folder, { recursive: true, force: true });
}
