import type { Browser } from 'playwright-core';
import { afterAll, beforeAll } from 'vitest';
import { openBrowser } from './openBrowser.ts';

/** A browser for the tests of one file; it is closed behind them. */
export function oneBrowser(): () => Browser {
  let browser: Browser | undefined;
  beforeAll(async () => {
    browser = await openBrowser();
  });
  afterAll(async () => {
    await browser?.close();
  });
  return () => {
    if (browser === undefined) throw new Error('the browser is not open yet');
    return browser;
  };
}
