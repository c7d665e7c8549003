import { AxeBuilder } from '@axe-core/playwright';
import { describe, expect, it } from 'vitest';
import { reportPage } from '../../src/report/html/reportPage.ts';
import { demoReport, houses, sampleReport } from '../unit/report/html/reportsOf.ts';
import { scenarioText } from '../unit/scenario/sampleFiles.ts';
import { openedReports } from './openedReports.ts';

const right = JSON.stringify(`בית <b>😀</b> ${'x'.repeat(40)}`);
const pages: Readonly<Record<string, string>> = {
  english: reportPage(demoReport('en')),
  german: reportPage(demoReport('de', '2025-03-31')),
  hybrid: reportPage(sampleReport(houses['mass, hot water and a hybrid'])),
  'without heat': reportPage(sampleReport(houses['no need of heat'])),
  'a house of a strange name': reportPage(sampleReport(scenarioText.replace('Test house', right))),
};

const open = openedReports(pages);

describe.each(Object.keys(pages))('the report, %s,', (name) => {
  it.each([360, 1280])('fits a window %d wide, says nothing and asks for nothing', async (width) => {
    const { page, said, asked } = await open(name, width);
    const wide = await page.evaluate('document.documentElement.scrollWidth');
    expect(wide).toBeLessThanOrEqual(width);
    expect(said).toEqual([]);
    expect(asked.filter((address) => !address.startsWith('data:')).length).toBe(1);
    await page.context().close();
  });
});

describe('the accessibility of the report', () => {
  it.each([
    ['english', 'light'],
    ['english', 'dark'],
    ['hybrid', 'light'],
    ['a house of a strange name', 'dark'],
  ] as const)('passes every rule, what is folded away included: %s, %s', async (name, scheme) => {
    const { page } = await open(name, 1280, scheme);
    // Rows of a table are alike: three of each say as much as thousands, in a tenth of the time.
    await page.evaluate(`
      for (const fold of document.querySelectorAll('details')) fold.open = true;
      for (const row of document.querySelectorAll('tbody tr:nth-child(n + 4)')) row.remove();
    `);
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
    await page.context().close();
  });
});

describe('the report of the demo', () => {
  it.each(['english', 'german'])('has its first page on one sheet of A4, %s', async (name) => {
    // 210 mm less margins of 15 mm is 680 px at 96 to the inch; 297 mm less 14 mm at either end is 1016 px.
    const { page } = await open(name, 680);
    await page.emulateMedia({ media: 'print' });
    const bottom = await page.locator('.sheet').evaluate((sheet) => sheet.getBoundingClientRect().bottom);
    expect(bottom).toBeLessThan(1016);
    const wide = await page.evaluate('document.documentElement.scrollWidth');
    expect(wide).toBeLessThanOrEqual(680);
    await page.context().close();
  });

  it('prints dark ink on white, also where the screen is dark', async () => {
    const { page } = await open('english', 680, 'dark');
    const ink = () => page.evaluate('getComputedStyle(document.body).color');
    const onScreen = await ink();
    await page.emulateMedia({ media: 'print' });
    expect(onScreen).toBe('rgb(233, 230, 223)');
    expect(await ink()).toBe('rgb(27, 34, 40)');
    await page.context().close();
  });

  it('unfolds a chart’s figures by keys alone', async () => {
    const { page } = await open('english', 1280);
    const fold = page.locator('details').first();
    await fold.locator('summary').focus();
    await page.keyboard.press('Enter');
    expect(await fold.evaluate((details) => details.hasAttribute('open'))).toBe(true);
    await page.context().close();
  });

  it('draws every picture', async () => {
    const { page } = await open('english', 1280);
    const shot = await page.locator('svg.chart').nth(1).screenshot();
    // A carpet is a picture of many colours: as PNG it does not shrink to the few kB of an empty frame.
    expect(shot.length).toBeGreaterThan(8000);
    await page.context().close();
  });

  it('runs no script, not even one that is put into it', async () => {
    const { page, said } = await open('english', 1280);
    await page.evaluate(`
      const script = document.createElement('script');
      script.textContent = 'document.title = "ran"';
      document.body.append(script);
    `);
    expect(await page.title()).not.toBe('ran');
    expect(said.join()).toContain('Content Security Policy');
    await page.context().close();
  });
});
