import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';
import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from './openBrowser.ts';
import { difference } from './sameFigures.ts';
import { demoText, openSheet, savedBy } from './sheetPage.ts';

const demo = fileURLToPath(new URL('../../data/demo', import.meta.url));
const program = fileURLToPath(new URL('../../dist/main.js', import.meta.url));
const sheet = fileURLToPath(new URL('../../dist/sheet.html', import.meta.url));
const folder = mkdtempSync(join(tmpdir(), 'winterledger-sheet-test-'));

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(async () => {
  await browser?.close();
  rmSync(folder, { recursive: true, force: true });
});

/** What the command line writes, run in a folder. */
function written(where: string, ...words: string[]): string {
  return execFileSync(process.execPath, [program, ...words], {
    cwd: where,
    encoding: 'utf8',
    maxBuffer: 64 * 1024 * 1024,
  });
}

/** Files of the page, laid into a folder. */
function layFiles(where: string, files: Readonly<Record<string, string>>): void {
  for (const [name, text] of Object.entries(files)) {
    mkdirSync(dirname(join(where, name)), { recursive: true });
    writeFileSync(join(where, name), text);
  }
}

async function dropFile(page: Page, name: string, text: string): Promise<void> {
  const data = await page.evaluateHandle(`(() => {
    const transfer = new DataTransfer();
    transfer.items.add(new File([${JSON.stringify(text)}], ${JSON.stringify(name)}));
    return transfer;
  })()`);
  await page.dispatchEvent('body', 'drop', { dataTransfer: data });
}

async function fill(page: Page, id: string, text: string): Promise<void> {
  await page.locator(`#${id}`).fill(text);
}

/** The text of a file of the page, from the box that shows it whole. */
async function fileText(page: Page, id: string): Promise<string> {
  return page.locator(`#${id}`).inputValue();
}

describe('the page', () => {
  it('is at most 350 kB as it is sent', () => {
    expect(gzipSync(readFileSync(sheet)).length).toBeLessThanOrEqual(350_000);
    expect(statSync(sheet).size).toBeGreaterThan(100_000);
  });
});

describe('a first visit, from the file and without a network,', () => {
  it('shows the answer of the invented house, and saves what the command line writes', async () => {
    const { context, page, asked, complaints } = await openSheet(browser);
    const result = await savedBy(page, 'Result (JSON)');
    expect(difference(result.text, written(demo, 'simulate', 'house.yaml', '--json', '-'))).toBeUndefined();
    const hours = await savedBy(page, 'Every hour (CSV)');
    expect(difference(hours.text, written(demo, 'simulate', 'house.yaml', '--hourly', '-'))).toBeUndefined();
    const report = await savedBy(page, 'Report for the client (HTML)');
    expect(difference(report.text, written(demo, 'report', 'house.yaml', '--out', '-'))).toBeUndefined();
    const scenario = await savedBy(page, 'Scenario (YAML)');
    expect(scenario).toEqual({ name: 'house.yaml', text: demoText('house.yaml') });
    const { electricity } = JSON.parse(result.text).annual;
    const shown = Math.round(electricity.total)
      .toString()
      .replace(/\B(?=(\d{3})+$)/g, '\u202f');
    expect(await page.locator('.tiles').innerText()).toContain(shown);
    expect({ asked, complaints }).toEqual({ asked: [], complaints: [] });
    await context.close();
  });

  it('answers as one types, keeps comments, and says what is wrong at the field', async () => {
    const { context, page, complaints } = await openSheet(browser);
    const before = await page.locator('.sentence').first().innerText();
    await fill(page, 'f-house-yaml-house-heatLoss-value', '150,5');
    await expect.poll(() => page.locator('.sentence').first().innerText()).not.toBe(before);
    const { text } = await savedBy(page, 'Scenario (YAML)');
    expect(text).toBe(demoText('house.yaml').replace('value: 195', 'value: 150.5'));
    await fill(page, 'f-house-yaml-house-heatLoss-value', 'many');
    await page.locator('#f-house-yaml-house-heatLoss-value-wrong .error').waitFor();
    expect(await page.locator('#f-house-yaml-house-heatLoss-value-wrong').innerText()).toContain(
      "house.heatLoss.value is 'many'",
    );
    expect(await page.locator('#f-house-yaml-house-heatLoss-value').getAttribute('aria-invalid')).toBe('true');
    expect(await page.locator('.sentence').count()).toBe(0);
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('speaks German, with decimal commas in its fields', async () => {
    const { context, page, complaints } = await openSheet(browser);
    await page.locator('.language select').selectOption('de');
    await page.getByRole('heading', { name: 'Die Antwort' }).waitFor();
    expect(await page.locator('.sentence').first().innerText()).toContain('Wärmepumpe');
    expect(await page.locator('#f-house-yaml-house-need-solarAperture').inputValue()).toBe('2,5');
    const report = await savedBy(page, 'Bericht für den Auftraggeber (HTML)');
    expect(
      difference(report.text, written(demo, 'report', 'house.yaml', '--out', '-', '--language', 'de')),
    ).toBeUndefined();
    expect(complaints).toEqual([]);
    await context.close();
  });
});

/** Odd names of columns and a second temperature, so that the reader cannot tell which one is meant. */
function oddWeather(): string {
  const rows = demoText('weather.csv')
    .split('\n')
    .slice(2, -1)
    .map((line) => line.split(','));
  return [
    'when;T roof °C;T garden °C;rh',
    ...rows.map(([stamp, t, rh]) => `${stamp.replace('T', ' ')};${t};${Number(t) - 1};${rh}`),
    '',
  ].join('\n');
}

const MAP_CAPACITY =
  '\t35\t45\t55\n-15\t5,2\t4,9\t4,6\n-7\t6,5\t6,2\t5,9\n2\t8,0\t7,8\t7,5\n7\t9,6\t9,2\t8,8\n12\t10,2\t9,8\t9,4';
const MAP_COP =
  '\t35\t45\t55\n-15\t2,38\t2,06\t1,79\n-7\t2,92\t2,48\t2,12\n2\t3,88\t3,18\t2,66\n7\t4,65\t3,72\t3,07\n12\t5,35\t4,18\t3,42';

async function paste(page: Page, cell: string, text: string): Promise<void> {
  await page.evaluate(`(() => {
    const transfer = new DataTransfer();
    transfer.setData('text/plain', ${JSON.stringify(text)});
    const event = new ClipboardEvent('paste', { clipboardData: transfer, bubbles: true, cancelable: true });
    document.querySelector(${JSON.stringify(cell)}).dispatchEvent(event);
  })()`);
}

describe('a blank start', () => {
  it('takes a house, a pasted map, a weather file and two tariffs, and answers as the command line does', async () => {
    const { context, page, complaints } = await openSheet(browser);
    await page.getByRole('button', { name: 'Begin a blank sheet' }).click();
    await page.locator('.faults').first().waitFor();
    const house = 'f-house-yaml';
    await fill(page, `${house}-site-zone`, 'Europe/Berlin');
    await fill(page, `${house}-house-heatLoss-value`, '180');
    await fill(page, `${house}-house-design-outdoorTemperature`, '-12');
    await fill(page, `${house}-flowTemperature-flow`, '50');
    await fill(page, `${house}-flowTemperature-return`, '42');
    await paste(page, '#f-unit-yaml-map-fullLoad-capacity td input', MAP_CAPACITY);
    await paste(page, '#f-unit-yaml-map-fullLoad-cop td input', MAP_COP);
    await dropFile(page, 'odd.csv', oddWeather());
    await page
      .locator('#part-place .error')
      .filter({ hasText: 'more than one column could be the temperature' })
      .waitFor();
    await page.getByRole('button', { name: 'Add: How to read it' }).click();
    await page.getByRole('button', { name: 'Take out: How to read it' }).waitFor();
    for (const fold of await page.locator('#part-place summary').all()) await fold.click();
    await page.getByRole('button', { name: 'Add: Columns' }).click();
    await page.getByRole('button', { name: 'Take out: Columns' }).waitFor();
    for (const fold of await page.locator('#f-house-yaml-weather-read-columns summary').all()) await fold.click();
    await fill(page, `${house}-weather-read-columns-temperature`, 'T garden °C');
    await page.locator(`#${house}-weather-read-stamps`).selectOption('begin');
    await fill(page, `${house}-weather-read-offset`, '+01:00');
    for (const [n, price] of [
      [1, '0,30'],
      [2, '0.26'],
    ] as const) {
      await page.getByRole('button', { name: 'Add a tariff' }).click();
      await fill(page, `f-tariff-${n}-yaml-rates-0-price`, price);
    }
    await page.locator('.sentence').first().waitFor();
    expect(await page.locator('.bars li').count()).toBe(2);
    const result = await savedBy(page, 'Result (JSON)');
    const own = join(folder, 'blank');
    layFiles(own, {
      'house.yaml': await fileText(page, 'f-house-yaml-text'),
      'unit.yaml': await fileText(page, 'f-unit-yaml-text'),
      'tariff-1.yaml': await fileText(page, 'f-tariff-1-yaml-text'),
      'tariff-2.yaml': await fileText(page, 'f-tariff-2-yaml-text'),
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
    await page.getByRole('button', { name: 'Wipe the draft' }).click();
    await page.reload();
    await page.getByText('This house is invented.').waitFor();
    expect(complaints).toEqual([]);
    await context.close();
  });
});

describe('the sheet', () => {
  it('shows hostile text of a scenario as text', async () => {
    const { context, page, complaints } = await openSheet(browser);
    const hostile = '<img src=x onerror=alert(1)></style><script>document.title="got in"</script>';
    await dropFile(
      page,
      'house.yaml',
      demoText('house.yaml').replace(/^name: .*$/m, `name: ${JSON.stringify(hostile)}`),
    );
    await page.locator('.faults .error').first().waitFor();
    expect(await page.locator('#f-house-yaml-name').inputValue()).toBe(hostile);
    await fill(page, 'f-house-yaml-currency', hostile);
    await page.locator('#f-house-yaml-currency-wrong .error').waitFor();
    expect(await page.locator('img, main script').count()).toBe(0);
    expect(await page.title()).not.toContain('got in');
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('sets variants beside each other, and explains an hour that is clicked', async () => {
    const { context, page, complaints } = await openSheet(browser);
    const factors = page.locator('.whatif tbody tr').nth(1).locator('td');
    await expect
      .poll(() => factors.allTextContents())
      .toEqual([expect.stringMatching(/\d/), expect.stringMatching(/\d/)]);
    const slider = page.locator('.whatif input[type=range]').first();
    await slider.focus();
    for (let i = 0; i < 5; i++) await page.keyboard.press('ArrowLeft');
    // five arrows are five runs: the figure of the last one is the one that stays
    await page.getByText('Flow temperature, K −5').waitFor();
    await expect.poll(async () => new Set(await factors.allTextContents()).size).toBe(2);
    await page.getByRole('button', { name: 'Keep this variant' }).click();
    await expect.poll(async () => (await factors.allTextContents()).slice(1).join()).toMatch(/^(\d\.\d\d),\1$/);
    const [asFiled, now] = await factors.allTextContents();
    expect(Number(now)).toBeGreaterThan(Number(asFiled));
    const picture = page.locator('.carpets image').first();
    await picture.scrollIntoViewIfNeeded();
    await picture.click({ position: { x: 5, y: 5 } });
    await page.locator('.explained h4').waitFor();
    expect(await page.locator('.explained h4').innerText()).toMatch(/^2025-01-0\dT2[23]:00\+01:00$/);
    expect(complaints).toEqual([]);
    await context.close();
  });

  it.each([360, 1280])('fits a window %d wide, and passes every rule of accessibility', async (width) => {
    const { context, page } = await openSheet(browser, width);
    await page.locator('.carpets').waitFor();
    expect(await page.evaluate('document.documentElement.scrollWidth')).toBeLessThanOrEqual(width);
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes[0]?.html}`)).toEqual([]);
    await context.close();
  });
});
