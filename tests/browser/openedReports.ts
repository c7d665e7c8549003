import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll } from 'vitest';
import { openBrowser } from './openBrowser.ts';

/** What a browser said of a page, and asked for, while it was open. */
export interface Opened {
  readonly page: Page;
  readonly said: string[];
  readonly asked: string[];
}

type Open = (name: string, width: number, colorScheme?: 'light' | 'dark') => Promise<Opened>;

/** Pages by their names, as files that a browser opens; both are gone after the tests of the file. */
export function openedReports(pages: Readonly<Record<string, string>>): Open {
  const folder = mkdtempSync(join(tmpdir(), 'winterledger-browser-test-'));
  let browser: Browser;
  beforeAll(async () => {
    for (const [name, page] of Object.entries(pages)) writeFileSync(join(folder, `${name}.html`), page);
    browser = await openBrowser();
  });
  afterAll(async () => {
    await browser?.close();
    rmSync(folder, { recursive: true, force: true });
  });
  return async (name, width, colorScheme = 'light') => {
    const context = await browser.newContext({ viewport: { width, height: 900 }, colorScheme });
    const page = await context.newPage();
    const said: string[] = [];
    const asked: string[] = [];
    page.on('console', (message) => said.push(message.text()));
    page.on('pageerror', (fault) => said.push(fault.message));
    page.on('request', (request) => asked.push(request.url()));
    await page.goto(pathToFileURL(join(folder, `${name}.html`)).href);
    return { page, said, asked };
  };
}
