import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Problem } from '../../src/core/problem.ts';
import { removeOnInterruption } from '../interruption.ts';
import { BrowserPipe } from './browserPipe.ts';
import type { Browser } from './findBrowser.ts';

/** A browser that takes longer is taken for stuck, ms. */
const LONGEST = 60_000;

/** No window, no network, nothing remembered. */
const FLAGS = [
  '--headless',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-extensions',
  '--host-resolver-rules=MAP * ~NOTFOUND',
];

/** A4 by the page's own rules, without the browser's header and footer; with headings and tags for screen readers. */
const PRINTING = {
  preferCSSPageSize: true,
  displayHeaderFooter: false,
  generateTaggedPDF: true,
  generateDocumentOutline: true,
};

/**
 * Prints a page by a browser.
 *
 * @param page HTML that needs nothing beside itself
 * @param file of the PDF, for the problem
 * @returns the bytes of the PDF, or why it could not be printed
 */
export async function printPdf(page: string, chromium: Browser, file: string): Promise<Uint8Array | Problem> {
  const { program, env } = chromium;
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-print-'));
  const discard = () => rmSync(folder, { recursive: true, force: true, maxRetries: 3 });
  removeOnInterruption({ discard });
  // A browser refuses its sandbox to the superuser; the page holds no script and fetches nothing.
  const asRoot = process.getuid?.() === 0 ? ['--no-sandbox'] : [];
  let browser: BrowserPipe | undefined;
  try {
    const html = join(folder, 'report.html');
    writeFileSync(html, page);
    browser = new BrowserPipe(program, [...FLAGS, ...asRoot, `--user-data-dir=${join(folder, 'profile')}`], env);
    return await withinTime(bytesOf(browser, pathToFileURL(html).href));
  } catch (fault) {
    const found = fault instanceof Error ? fault.message : String(fault);
    return { code: 'report.browser-failed', severity: 'error', file, path: program, found };
  } finally {
    await browser?.close();
    discard();
  }
}

async function bytesOf(browser: BrowserPipe, address: string): Promise<Uint8Array> {
  const { targetId } = await browser.ask('Target.createTarget', { url: 'about:blank' });
  const { sessionId } = await browser.ask('Target.attachToTarget', { targetId, flatten: true });
  await browser.ask('Page.enable', {}, sessionId);
  const [{ errorText }] = await Promise.all([
    browser.ask('Page.navigate', { url: address }, sessionId),
    browser.happens('Page.loadEventFired'),
  ]);
  if (errorText !== undefined) throw new Error(errorText);
  const { data } = await browser.ask('Page.printToPDF', PRINTING, sessionId);
  return Buffer.from(data ?? '', 'base64');
}

function withinTime<T>(work: Promise<T>): Promise<T> {
  return new Promise((resolve, reject) => {
    const stuck = setTimeout(() => reject(new Error(`it took longer than ${LONGEST / 1000} s`)), LONGEST);
    work.then(resolve, reject).finally(() => clearTimeout(stuck));
  });
}
