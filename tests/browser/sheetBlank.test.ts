import { describe, expect, it } from 'vitest';
import { folderOf, written } from './commandLine.ts';
import { oneBrowser } from './oneBrowser.ts';
import { difference } from './sameFigures.ts';
import { demoText, dropFiles, openFolds, openSheet, paste, savedBy } from './sheetPage.ts';

const browser = oneBrowser();

/** Odd names of columns, decimal commas, and a second temperature, so that the reader cannot tell which one is meant. */
function oddWeather(): string {
  const rows = demoText('weather.csv')
    .split('\n')
    .slice(2, -1)
    .map((line) => line.split(','));
  const withComma = (value: number) => String(value).replace('.', ',');
  return [
    'when;T roof °C;T garden °C;rh',
    ...rows.map(
      ([stamp, t, rh]) =>
        `${stamp.replace('T', ' ')};${withComma(Number(t))};${withComma(Math.round(10 * Number(t) - 10) / 10)};${rh}`,
    ),
    '',
  ].join('\n');
}

// a list of points, as data sheets print them
const LISTED = [
  ['A-15/W35', '5,2', '2,38'],
  ['A-15/W45', '4,9', '2,06'],
  ['A-15/W55', '4,6', '1,79'],
  ['A-7/W35', '6,5', '2,92'],
  ['A-7/W45', '6,2', '2,48'],
  ['A-7/W55', '5,9', '2,12'],
  ['A2/W35', '8,0', '3,88'],
  ['A2/W45', '7,8', '3,18'],
  ['A2/W55', '7,5', '2,66'],
  ['A7/W35', '9,6', '4,65'],
  ['A7/W45', '9,2', '3,72'],
  ['A7/W55', '8,8', '3,07'],
]
  .map((cells) => cells.join('\t'))
  .join('\n');
// a table from a spreadsheet
const MAP_CAPACITY = '\t35\t45\t55\n-15\t5,2\t4,9\t4,6\n-7\t6,5\t6,2\t5,9\n2\t8,0\t7,8\t7,5\n7\t9,6\t9,2\t8,8';
const CAPACITY = '#f-unit-yaml-map-fullLoad-capacity';
const COP = '#f-unit-yaml-map-fullLoad-cop';

describe('a blank start', () => {
  it('takes a house, a pasted map, a weather file and two tariffs, and answers as the command line does', async () => {
    const { context, page, complaints } = await openSheet(browser());
    await page.getByRole('button', { name: 'Begin a blank sheet' }).click();
    await page.locator('.faults').first().waitFor();
    expect(await page.getByText('This house is invented.').count()).toBe(0);
    const fill = (entry: string, text: string) => page.locator(`#f-house-yaml-${entry}`).fill(text);
    await fill('site-zone', 'Europe/Berlin');
    await fill('house-heatLoss-value', '180');
    await fill('house-design-outdoorTemperature', '-12');
    await fill('flowTemperature-flow', '50');
    await fill('flowTemperature-return', '42');

    // the contours of the map stand there before there is any answer
    await expect.poll(() => page.locator('.map .contour').count()).toBe(0);
    await paste(page, `${CAPACITY} td input`, LISTED);
    await page.locator('.map .contour').first().waitFor({ state: 'attached' });
    expect(await page.locator('.sentence').count()).toBe(0);
    expect(await page.locator(`${COP} tr:nth-child(3) td:nth-child(2) input`).inputValue()).toBe('2.92');
    await paste(page, `${CAPACITY} td input`, MAP_CAPACITY.replace('8,0', '80'));
    await page.locator(`${CAPACITY} [aria-invalid=true]`).waitFor();
    expect(await page.locator(`${CAPACITY} [aria-invalid=true]`).inputValue()).toBe('80');
    await page.locator(`${CAPACITY} [aria-invalid=true]`).fill('8');

    await dropFiles(page, { 'odd.csv': oddWeather() });
    await page
      .locator('#part-place .error')
      .filter({ hasText: 'more than one column could be the temperature' })
      .waitFor();
    await page.getByLabel('Column T garden °C holds').selectOption('temperature');
    await page.locator('#f-house-yaml-weather-read-stamps').selectOption('begin');
    await fill('weather-read-offset', '+01:00');
    await expect.poll(() => page.locator('#part-place .error').count(), { timeout: 5000 }).toBe(0);
    for (const [n, price] of [
      [1, '0,30'],
      [2, '0.26'],
    ] as const) {
      await page.getByRole('button', { name: 'Add a tariff' }).click();
      await page.locator(`#f-tariff-${n}-yaml-rates-0-price`).fill(price);
    }
    await expect.poll(() => page.locator('.bars li').count(), { timeout: 5000 }).toBe(2);

    const result = await savedBy(page, 'Result (JSON)');
    const text = (file: string) => page.locator(`#f-${file.replace(/\W/g, '-')}-text`).inputValue();
    const own = folderOf({
      'house.yaml': await text('house.yaml'),
      'unit.yaml': await text('unit.yaml'),
      'tariff-1.yaml': await text('tariff-1.yaml'),
      'tariff-2.yaml': await text('tariff-2.yaml'),
      'odd.csv': oddWeather(),
    });
    expect(difference(result.text, written(own, 'simulate', 'house.yaml', '--json', '-'))).toBeUndefined();
    const { costs } = JSON.parse(result.text);
    expect(costs[0].energy / costs[1].energy).toBeCloseTo(0.3 / 0.26, 9);

    // the draft is there after a reload, and goes on
    await page.getByText('A draft of the files is kept').waitFor();
    await page.reload();
    await page.locator('.sentence').first().waitFor();
    expect(await savedBy(page, 'Result (JSON)')).toEqual(result);
    const before = await page.locator('.sentence').first().innerText();
    await fill('house-heatLoss-value', '150');
    await expect.poll(() => page.locator('.sentence').first().innerText()).not.toBe(before);
    await page.getByRole('button', { name: 'Wipe the draft' }).click();
    await page.reload();
    await page.getByText('This house is invented.').waitFor();
    expect(complaints).toEqual([]);
    await context.close();
  });
});

describe('a sheet that is left for another one', () => {
  it('can be had back', async () => {
    const { context, page, complaints } = await openSheet(browser());
    const heatLoss = page.locator('#f-house-yaml-house-heatLoss-value');
    await heatLoss.fill('151');
    await page.getByText('A draft of the files is kept').waitFor();
    await page.getByRole('button', { name: 'Begin a blank sheet' }).click();
    await expect.poll(() => heatLoss.inputValue()).toBe('');
    await page.getByRole('button', { name: 'Back to the sheet before' }).click();
    await expect.poll(() => heatLoss.inputValue()).toBe('151');
    await page.locator('.sentence').first().waitFor();
    expect(complaints).toEqual([]);
    await context.close();
  });
});

describe('every field', () => {
  it('of a number is told what is wrong with it when it is broken, and is content when it is mended', async () => {
    const { context, page, complaints } = await openSheet(browser());
    await openFolds(page);
    const ids: string[] = await page.locator('input.figure').evaluateAll((fields) => fields.map(({ id }) => id));
    // the demo has six parts with numbers, a unit and four tariffs
    expect(ids.length).toBeGreaterThan(60);
    for (const id of ids) {
      const field = page.locator(`#${id}`);
      const filed = await field.inputValue();
      await field.fill('many');
      await page.locator(`#${id}-wrong .error`).first().waitFor();
      expect(await field.getAttribute('aria-invalid'), id).toBe('true');
      await field.fill(filed);
      await page.locator(`#${id}-wrong .error`).first().waitFor({ state: 'detached' });
    }
    await page.locator('.sentence').first().waitFor();
    expect(complaints).toEqual([]);
    await context.close();
  });
});
