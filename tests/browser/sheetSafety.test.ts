import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { oneBrowser } from './oneBrowser.ts';
import { demoText, dropFiles, openFolds, openSheet, sheetFile } from './sheetPage.ts';

const browser = oneBrowser();
const HOSTILE = '<img src=x onerror=document.title="in"></style><script>';

describe('the sheet', () => {
  it('shows hostile text of a scenario, a tariff, a unit and a weather file as text', async () => {
    const { context, page, asked, complaints } = await openSheet(browser());
    const named = (file: string) => demoText(file).replace(/^name: .*$/m, () => `name: ${JSON.stringify(HOSTILE)}`);
    await dropFiles(page, {
      'house.yaml': named('house.yaml').replace(/ {2}- tariffs\/(?!flat).*\n/g, ''),
      'weather.csv': demoText('weather.csv').replace('relative humidity %', () => `relative humidity % ${HOSTILE}`),
      'quarkenfels-8.yaml': named('units/quarkenfels-8.yaml'),
      'flat.yaml': named('tariffs/flat.yaml'),
    });
    await expect.poll(() => page.locator('.bars li').count(), { timeout: 5000 }).toBe(2);
    await openFolds(page);
    expect(await page.locator('#f-house-yaml-name').inputValue()).toBe(HOSTILE);
    expect(await page.locator('.bars').innerText()).toContain(HOSTILE);
    expect(await page.locator('.columns').innerText()).toContain('<img src=x onerror=');
    await page.locator('#f-house-yaml-currency').fill(HOSTILE);
    await page.locator('#f-house-yaml-currency-wrong .error').waitFor();
    expect(await page.locator('img, #sheet script, #sheet style').count()).toBe(0);
    expect(await page.title()).not.toBe('in');
    expect({ asked, complaints }).toEqual({ asked: [], complaints: [] });
    await context.close();
  });

  it('runs no script but its own, and may ask nobody for anything', async () => {
    const { context, page, asked } = await openSheet(browser());
    await page.evaluate(`
      const script = document.createElement('script');
      script.textContent = 'document.title = "ran"';
      document.body.append(script);
    `);
    expect(await page.title()).not.toBe('ran');
    const fetched = await page.evaluate("fetch('https://example.org/').then(() => 'came', () => 'refused')");
    expect(fetched).toBe('refused');
    expect(asked).toEqual([]);
    const policy = /http-equiv="Content-Security-Policy" content="([^"]*)"/.exec(readFileSync(sheetFile, 'utf8'))?.[1];
    expect(policy).toContain("default-src 'none'");
    expect(policy).toContain("connect-src 'none'");
    expect(policy).not.toMatch(/unsafe|\*|https?:/);
    await context.close();
  });

  it('keeps nothing in the browser but the draft, and that only once something was entered', async () => {
    const { context, page } = await openSheet(browser());
    const kept = () =>
      page.evaluate(`(async () => ({
        local: Object.keys(localStorage),
        session: Object.keys(sessionStorage),
        databases: (await indexedDB.databases()).length,
        cookies: document.cookie,
      }))()`);
    const nothing = { local: [] as string[], session: [], databases: 0, cookies: '' };
    await page.locator('.carpets').waitFor();
    await page.locator('.language select').selectOption('de');
    await page.getByRole('heading', { name: 'Die Antwort' }).waitFor();
    expect(await kept()).toEqual(nothing);
    await page.locator('#f-house-yaml-house-heatLoss-value').fill('150');
    await page.getByText('Ein Entwurf der Dateien liegt in diesem Browser.').waitFor();
    expect(await kept()).toEqual({ ...nothing, local: ['winterledger.sheet.draft'] });
    await page.getByRole('button', { name: 'Entwurf löschen' }).click();
    expect(await kept()).toEqual(nothing);
    await context.close();
  });
});
