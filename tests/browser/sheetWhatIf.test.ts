import { describe, expect, it } from 'vitest';
import { oneBrowser } from './oneBrowser.ts';
import { demoText, dropFiles, openSheet } from './sheetPage.ts';

const browser = oneBrowser();

describe('what if', () => {
  it('sets variants beside each other with their differences, four at most', async () => {
    const { context, page, complaints } = await openSheet(browser());
    const factors = page.locator('.whatif tbody tr').nth(1).locator('td');
    const texts = async () => (await factors.allInnerTexts()).map((text) => text.split(/\s+/));
    await expect.poll(async () => (await texts()).map(([figure]) => figure).join()).toMatch(/^(\d\.\d\d),\1$/);
    const slider = page.getByRole('slider', { name: 'Flow temperature' });
    await slider.focus();
    for (let i = 0; i < 5; i++) await page.keyboard.press('ArrowLeft');
    // five arrows are five runs: the figure of the last one is the one that stays
    await expect.poll(() => slider.getAttribute('aria-valuetext')).toBe('−5');
    await page.getByRole('button', { name: 'Keep this variant' }).click();
    await expect
      .poll(async () => (await texts()).slice(1).join(), { timeout: 5000 })
      .toMatch(/^(\d\.\d\d,\+0\.\d\d),\1$/);
    const [[asFiled], [now, more]] = await texts();
    // figures of two decimals each: their difference may be one off in the last
    expect(Math.abs(Number(now) - Number(asFiled) - Number(more))).toBeLessThan(0.0101);
    for (let i = 0; i < 4; i++) await page.getByRole('button', { name: 'Keep this variant' }).click();
    await expect.poll(() => factors.count()).toBe(6);
    expect(complaints).toEqual([]);
    await context.close();
  });
});

/** The demo’s weather on the year 2024: the day before 29 February once more. */
function leapYear(): string {
  const text = demoText('weather.csv').replaceAll('2025-', '2024-');
  const day = text.split('\n').filter((line) => line.startsWith('2024-02-28'));
  const leapDay = day.map((line) => line.replace('02-28', '02-29'));
  return text.replace('2024-03-01', `${leapDay.join('\n')}\n2024-03-01`);
}

async function clickFirst(
  page: Awaited<ReturnType<typeof openSheet>>['page'],
  place: 'begin' | 'end',
): Promise<string> {
  const picture = page.locator('.carpets image').first();
  await picture.scrollIntoViewIfNeeded();
  const box = await picture.boundingBox();
  if (box === null) throw new Error('there is no picture');
  // the first hours of the year are at the bottom left, the last ones at the top right; a browser cuts places to whole pixels
  const position = place === 'begin' ? { x: 1, y: box.height - 2 } : { x: box.width - 0.3, y: 2 };
  await picture.click({ position });
  await page.locator('.explained h4').waitFor();
  return page.locator('.explained h4').innerText();
}

describe('an hour that is clicked in a picture', () => {
  it('is explained', async () => {
    const { context, page, complaints } = await openSheet(browser());
    expect(await clickFirst(page, 'begin')).toBe('2025-01-01T00:00+01:00');
    await expect.poll(async () => [await clickFirst(page, 'end')]).toEqual(['2025-12-31T23:00+01:00']);
    // the same hour by the fields, which need no pointer
    await page.getByLabel('Day of the year').fill('1');
    await page.locator('.pick').getByLabel('Hour', { exact: true }).fill('0');
    await page.keyboard.press('Enter');
    await expect.poll(() => page.locator('.explained h4').innerText()).toBe('2025-01-01T00:00+01:00');
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('is the right one in a leap year too', async () => {
    const { context, page, complaints } = await openSheet(browser());
    await dropFiles(page, {
      'house.yaml': demoText('house.yaml')
        .replace('calendarYear: 2025', 'calendarYear: 2024')
        .replace(/ {2}- tariffs\/(?!flat).*\n/g, ''),
      'weather.csv': leapYear(),
      'quarkenfels-8.yaml': demoText('units/quarkenfels-8.yaml'),
      'flat.yaml': demoText('tariffs/flat.yaml'),
    });
    await expect.poll(() => page.locator('.bars li').count(), { timeout: 5000 }).toBe(2);
    expect(await page.getByLabel('Day of the year').getAttribute('max')).toBe('366');
    expect(await clickFirst(page, 'begin')).toBe('2024-01-01T00:00+01:00');
    await expect.poll(async () => [await clickFirst(page, 'end')]).toEqual(['2024-12-31T23:00+01:00']);
    expect(complaints).toEqual([]);
    await context.close();
  });
});
