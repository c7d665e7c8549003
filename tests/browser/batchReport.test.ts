import { AxeBuilder } from '@axe-core/playwright';
import { describe, expect, it } from 'vitest';
import { batchPage } from '../../src/report/html/batch/batchPage.ts';
import { sampleBatch } from '../unit/report/html/batch/batchReports.ts';
import { openedReports } from './openedReports.ts';

const strange = `בית <b>😀</b> ${'x'.repeat(200)}`;
const many = (name: string, count: number) => ({
  name,
  values: Array.from({ length: count }, (_, i) => `${name} ${i} with a name that is long`),
});
const pages: Readonly<Record<string, string>> = {
  english: batchPage(sampleBatch()),
  german: batchPage(sampleBatch({ language: 'de', by: 'seasonalFactor', date: '2025-03-31' })),
  'homes alone': batchPage(sampleBatch({ axes: [], by: 'backupHours' })),
  'many values': batchPage(
    sampleBatch({
      axes: [many('loss', 40), many('unit', 9)],
      year: (home, _, job) => ({ cost: 12_000 + home * 900 + ((job * 37) % 800), h4: 3, backupHours: home }),
    }),
  ),
  'strange names': batchPage(
    sampleBatch({
      plan: strange,
      axes: [
        { name: strange, values: [strange, 'b'] },
        { name: 'c', values: [`${strange}1`, `${strange}2`, true] },
      ],
      homeName: (home) => `${strange}${home}`,
    }),
  ),
};
const open = openedReports(pages);

describe.each(Object.keys(pages))('the report of a batch, %s,', (name) => {
  it.each([360, 1280])('fits a window %d wide, says nothing and asks for nothing', async (width) => {
    const { page, said, asked } = await open(name, width);
    expect(await page.evaluate('document.documentElement.scrollWidth')).toBeLessThanOrEqual(width);
    expect(said).toEqual([]);
    expect(asked.length).toBe(1);
    await page.context().close();
  });

  it('keeps every label of its drawings within them', async () => {
    const { page } = await open(name, 1280);
    const outside = await page.evaluate(`[...document.querySelectorAll('svg.chart text')].filter((text) => {
      const [inner, outer] = [text.getBoundingClientRect(), text.closest('svg').getBoundingClientRect()];
      return inner.left < outer.left - 1 || inner.right > outer.right + 1;
    }).map((text) => text.textContent)`);
    expect(outside).toEqual([]);
    await page.context().close();
  });
});

describe('the accessibility of the report of a batch', () => {
  it.each([
    ['english', 360, 'light'],
    ['english', 1280, 'dark'],
    ['many values', 360, 'dark'],
    ['many values', 1280, 'light'],
    ['strange names', 1280, 'light'],
  ] as const)('passes every rule, what is folded away included: %s, %d wide, %s', async (name, width, scheme) => {
    const { page } = await open(name, width, scheme);
    await page.evaluate("for (const fold of document.querySelectorAll('details')) fold.open = true;");
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
    expect(await page.evaluate('document.documentElement.scrollWidth')).toBeLessThanOrEqual(width);
    await page.context().close();
  });
});

describe('the report of a batch on paper', () => {
  it('fits a sheet of A4, in dark ink', async () => {
    // 210 mm less margins of 15 mm is 680 px at 96 to the inch.
    const { page } = await open('english', 680, 'dark');
    await page.emulateMedia({ media: 'print' });
    expect(await page.evaluate('document.documentElement.scrollWidth')).toBeLessThanOrEqual(680);
    expect(await page.evaluate('getComputedStyle(document.body).color')).toBe('rgb(27, 34, 40)');
    await page.context().close();
  });

  it('unfolds a chart’s figures by keys alone on the screen', async () => {
    const { page } = await open('english', 1280);
    const fold = page.locator('details').first();
    await fold.locator('summary').focus();
    await page.keyboard.press('Enter');
    expect(await fold.evaluate((details) => details.hasAttribute('open'))).toBe(true);
    await page.context().close();
  });
});
