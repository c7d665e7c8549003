import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Browser, BrowserContext, Page } from 'playwright-core';

/** The built sheet, as a file. */
export const sheetFile = fileURLToPath(new URL('../../dist/sheet.html', import.meta.url));
const sheetAddress = new URL('../../dist/sheet.html', import.meta.url).href;

/** The folder of the invented house. */
export const demoFolder = fileURLToPath(new URL('../../data/demo', import.meta.url));

/** Text of a file of the demo. */
export function demoText(name: string): string {
  return readFileSync(`${demoFolder}/${name}`, 'utf8');
}

/** The sheet opened from its file, without any network, and whatever it asks for or complains of. */
export interface OpenedSheet {
  readonly context: BrowserContext;
  readonly page: Page;
  /** Addresses asked for, other than the page itself and its worker. */
  readonly asked: string[];
  readonly complaints: string[];
}

interface Manner {
  readonly width?: number;
  readonly colorScheme?: 'light' | 'dark';
  readonly reducedMotion?: 'reduce' | 'no-preference';
  readonly locale?: string;
}

/** Opens the sheet offline. */
export async function openSheet(browser: Browser, { width = 1280, ...manner }: Manner = {}): Promise<OpenedSheet> {
  const context = await browser.newContext({
    ...manner,
    viewport: { width, height: 900 },
    offline: true,
    acceptDownloads: true,
  });
  const page = await context.newPage();
  const asked: string[] = [];
  const complaints: string[] = [];
  page.on('request', (request) => {
    if (request.url() !== sheetAddress && !/^(?:blob|data):/.test(request.url())) asked.push(request.url());
  });
  page.on('pageerror', (fault) => complaints.push(String(fault)));
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  await page.goto(sheetAddress);
  await page.locator('.sentence').first().waitFor({ timeout: 15_000 });
  return { context, page, asked, complaints };
}

/** Bytes of what a button saves. */
export async function savedBy(page: Page, button: string): Promise<{ name: string; text: string }> {
  const [download] = await Promise.all([
    page.waitForEvent('download'),
    page.getByRole('button', { name: button }).click(),
  ]);
  return { name: download.suggestedFilename(), text: readFileSync(await download.path(), 'utf8') };
}

/** Drops files of these names and texts on the page. */
export async function dropFiles(page: Page, files: Readonly<Record<string, string>>): Promise<void> {
  const data = await page.evaluateHandle(`(() => {
    const transfer = new DataTransfer();
    for (const [name, text] of Object.entries(${JSON.stringify(files)})) transfer.items.add(new File([text], name));
    return transfer;
  })()`);
  await page.dispatchEvent('body', 'drop', { dataTransfer: data });
}

/** Pastes a text into a cell, as a spreadsheet puts it on the clipboard. */
export async function paste(page: Page, cell: string, text: string): Promise<void> {
  await page.evaluate(`(() => {
    const transfer = new DataTransfer();
    transfer.setData('text/plain', ${JSON.stringify(text)});
    const event = new ClipboardEvent('paste', { clipboardData: transfer, bubbles: true, cancelable: true });
    document.querySelector(${JSON.stringify(cell)}).dispatchEvent(event);
  })()`);
}

/** Opens every fold of the page. */
export async function openFolds(page: Page): Promise<void> {
  await page.evaluate("for (const fold of document.querySelectorAll('details')) fold.open = true;");
}
