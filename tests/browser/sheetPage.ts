import { readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import type { Browser, BrowserContext, Page } from 'playwright-core';

/** The built sheet, as a file. */
export const sheetAddress = new URL('../../dist/sheet.html', import.meta.url).href;

/** Text of a file of the demo. */
export function demoText(name: string): string {
  return readFileSync(fileURLToPath(new URL(`../../data/demo/${name}`, import.meta.url)), 'utf8');
}

/** The sheet opened from its file, without any network, and whatever it asks for or complains of. */
export interface OpenedSheet {
  readonly context: BrowserContext;
  readonly page: Page;
  /** Addresses asked for, other than the page itself and its worker. */
  readonly asked: string[];
  readonly complaints: string[];
}

/** Opens the sheet at a width, offline. */
export async function openSheet(browser: Browser, width = 1280): Promise<OpenedSheet> {
  const context = await browser.newContext({ viewport: { width, height: 900 }, offline: true, acceptDownloads: true });
  await context.grantPermissions(['clipboard-read', 'clipboard-write']).catch(() => undefined);
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
  await page.locator('.sentence').first().waitFor({ timeout: 8000 });
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
