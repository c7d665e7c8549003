import { AxeBuilder } from '@axe-core/playwright';
import type { Page } from 'playwright-core';
import { describe, expect, it } from 'vitest';
import { oneBrowser } from './oneBrowser.ts';
import { openFolds, openSheet, savedBy } from './sheetPage.ts';

const browser = oneBrowser();

/** Unfolds all there is, and leaves some of what is alike: three rows of a table, one tariff, three stages of an hour. */
async function unfold(page: Page): Promise<void> {
  await openFolds(page);
  await page.evaluate(`
    const alike = [
      'tbody tr:nth-child(n + 4), .carpets > :nth-child(n + 2), #part-tariffs > details ~ details',
      '.explained > details ~ details ~ details ~ details',
    ].join();
    for (const part of document.querySelectorAll(alike)) part.remove();
  `);
}

/** What breaks a rule of accessibility. */
async function violationsOf(page: Page): Promise<string[]> {
  // the page has no frames, so that the rules run in it at once
  const { violations } = await new AxeBuilder({ page }).setLegacyMode().analyze();
  return violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html.slice(0, 200)}`));
}

const widthOf = (page: Page) => page.evaluate('document.documentElement.scrollWidth');

describe.each([
  ['English', 'en-GB', 'Explain this hour'],
  ['German', 'de-DE', 'Diese Stunde erklären'],
])('in %s, the page', (_, locale, explain) => {
  it('passes every rule of accessibility on a phone and on a desk, in the light and in the dark', async () => {
    const { context, page } = await openSheet(browser(), { locale, width: 360 });
    await page.locator('.carpets').waitFor();
    await page.getByRole('button', { name: explain }).click();
    await page.locator('.explained').waitFor();
    await unfold(page);
    for (const width of [360, 1280]) {
      await page.setViewportSize({ width, height: 900 });
      for (const colorScheme of ['light', 'dark'] as const) {
        await page.emulateMedia({ colorScheme });
        expect(await violationsOf(page), `${width} ${colorScheme}`).toEqual([]);
      }
      expect(await widthOf(page)).toBeLessThanOrEqual(width);
    }
    await context.close();
  });

  it('passes them where something is to be put right too', async () => {
    const { context, page } = await openSheet(browser(), { locale, width: 360, colorScheme: 'dark' });
    await page.locator('.doors button').first().click();
    await page.locator('.faults .error').first().waitFor();
    await unfold(page);
    expect(await violationsOf(page)).toEqual([]);
    expect(await widthOf(page)).toBeLessThanOrEqual(360);
    await context.close();
  });
});

describe('on paper, the page', () => {
  it('is the answer first, in dark ink on white, with nothing to press', async () => {
    // 210 mm less margins of 15 mm is 680 px at 96 to the inch
    const { context, page } = await openSheet(browser(), { width: 680, colorScheme: 'dark' });
    await page.locator('.carpets').waitFor();
    const ink = () => page.evaluate('getComputedStyle(document.body).color');
    const onScreen = await ink();
    await page.emulateMedia({ media: 'print' });
    expect(onScreen).toBe('rgb(232, 231, 225)');
    expect(await ink()).toBe('rgb(29, 37, 41)');
    expect(await widthOf(page)).toBeLessThanOrEqual(680);
    const pressed = page.locator('button:visible, .button:visible, input[type=range]:visible');
    expect(await pressed.count()).toBe(0);
    const top = (part: string) => page.locator(part).evaluate((part) => part.getBoundingClientRect().top);
    expect(await top('.answer')).toBeLessThan(await top('.entries'));
    // the answer is not cut where its pane ends on the screen
    const cut = await page.locator('.answer').evaluate((pane) => pane.scrollHeight - pane.clientHeight);
    expect(cut).toBeLessThanOrEqual(1);
    await context.close();
  });
});

describe('motion', () => {
  it('is left out where it is unwanted', async () => {
    const scrolling = 'getComputedStyle(document.documentElement).scrollBehavior';
    const { context, page } = await openSheet(browser(), { reducedMotion: 'no-preference' });
    expect(await page.evaluate(scrolling)).toBe('smooth');
    await page.emulateMedia({ reducedMotion: 'reduce' });
    expect(await page.evaluate(scrolling)).toBe('auto');
    const moving = await page.evaluate(`[...document.querySelectorAll('*')].filter((part) => {
      const { transitionDuration, animationName } = getComputedStyle(part);
      return transitionDuration !== '0s' || animationName !== 'none';
    }).length`);
    expect(moving).toBe(0);
    await context.close();
  });
});

/** Goes on by the tab key until a part has the focus. */
async function tabTo(page: Page, part: string): Promise<void> {
  for (let i = 0; i < 250; i++) {
    await page.keyboard.press('Tab');
    if (await page.evaluate(`document.activeElement.matches(${JSON.stringify(part)})`)) return;
  }
  throw new Error(`the tab key does not come to ${part}`);
}

describe('by keys alone', () => {
  it('one begins, enters, unfolds, tries a slider, has an hour explained, and saves', async () => {
    const { context, page, complaints } = await openSheet(browser());
    await page.locator('.carpets').waitFor();
    await page.keyboard.press('Tab');
    expect(await page.evaluate("document.activeElement.matches('.skip')")).toBe(true);
    await page.keyboard.press('Enter');
    await expect.poll(() => page.evaluate('document.activeElement.id')).toBe('answer');
    await tabTo(page, '#slider-heatLoss');
    await page.keyboard.press('ArrowRight');
    await expect.poll(() => page.locator('#slider-heatLoss').getAttribute('aria-valuetext')).toBe('+1');
    await tabTo(page, '.pick button');
    await page.keyboard.press('Enter');
    await page.locator('.explained h4').waitFor();
    await tabTo(page, 'footer button');
    const [download] = await Promise.all([page.waitForEvent('download'), page.keyboard.press('Enter')]);
    expect(download.suggestedFilename()).toBe('house.yaml');

    await page.reload();
    await page.locator('.sentence').first().waitFor();
    const before = await page.locator('.sentence').first().innerText();
    await tabTo(page, '#f-house-yaml-house-heatLoss-value');
    const outline = await page.evaluate('getComputedStyle(document.activeElement).outlineStyle');
    expect(outline).toBe('solid');
    await page.keyboard.press('Control+A');
    await page.keyboard.type('150');
    await expect.poll(() => page.locator('.sentence').first().innerText()).not.toBe(before);
    await tabTo(page, '#part-house summary');
    await page.keyboard.press('Enter');
    await expect.poll(() => page.locator('#part-house details[open]').count()).toBe(1);
    await tabTo(page, '#f-units-quarkenfels-8-yaml-map-fullLoad-cop tr:nth-child(2) td:nth-child(2) input');
    await page.keyboard.press('Control+A');
    await page.keyboard.type('9,9');
    await page.locator('#f-units-quarkenfels-8-yaml-map-fullLoad-cop [aria-invalid=true]').first().waitFor();
    expect((await savedBy(page, 'Scenario (YAML)')).text).toContain('value: 150');
    expect(complaints).toEqual([]);
    await context.close();
  });
});
