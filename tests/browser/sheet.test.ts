import { readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { folderOf, written } from './commandLine.ts';
import { oneBrowser } from './oneBrowser.ts';
import { difference } from './sameFigures.ts';
import { demoFolder, demoText, dropFiles, openSheet, savedBy, sheetFile } from './sheetPage.ts';

const browser = oneBrowser();

describe('the page', () => {
  it('is at most 350 kB as it is sent', () => {
    expect(gzipSync(readFileSync(sheetFile)).length).toBeLessThanOrEqual(350_000);
    expect(statSync(sheetFile).size).toBeGreaterThan(100_000);
  });
});

describe('a first visit, from the file and without a network,', () => {
  it('shows the answer of the invented house, and saves what the command line writes', async () => {
    const { context, page, asked, complaints } = await openSheet(browser());
    await page.getByText('This house is invented.').waitFor();
    const result = await savedBy(page, 'Result (JSON)');
    expect(difference(result.text, written(demoFolder, 'simulate', 'house.yaml', '--json', '-'))).toBeUndefined();
    const hours = await savedBy(page, 'Every hour (CSV)');
    expect(difference(hours.text, written(demoFolder, 'simulate', 'house.yaml', '--hourly', '-'))).toBeUndefined();
    const report = await savedBy(page, 'Report for the client (HTML)');
    expect(difference(report.text, written(demoFolder, 'report', 'house.yaml', '--out', '-'))).toBeUndefined();
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

  it('answers as one types, and keeps comments and order in what it saves', async () => {
    const { context, page, complaints } = await openSheet(browser());
    const before = await page.locator('.sentence').first().innerText();
    await page.locator('#f-house-yaml-house-heatLoss-value').fill('150,5');
    await expect.poll(() => page.locator('.sentence').first().innerText()).not.toBe(before);
    // the live region tells the sentence that stands there once typing has stopped
    await expect
      .poll(() => page.locator('.answer > [role=status]').textContent(), { timeout: 5000 })
      .toContain(await page.locator('.sentence').first().innerText());
    const { text } = await savedBy(page, 'Scenario (YAML)');
    expect(text).toBe(demoText('house.yaml').replace('value: 195', 'value: 150.5'));
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('speaks German to a German browser, with decimal commas in its fields', async () => {
    const { context, page, complaints } = await openSheet(browser(), { locale: 'de-DE' });
    await page.getByRole('heading', { name: 'Die Antwort' }).waitFor();
    expect(await page.evaluate('document.documentElement.lang')).toBe('de');
    expect(await page.locator('.sentence').first().innerText()).toContain('Wärmepumpe');
    expect(await page.locator('#f-house-yaml-house-need-solarAperture').inputValue()).toBe('2,5');
    const report = await savedBy(page, 'Bericht für den Auftraggeber (HTML)');
    const expected = written(demoFolder, 'report', 'house.yaml', '--out', '-', '--language', 'de');
    expect(difference(report.text, expected)).toBeUndefined();
    await page.locator('.language select').selectOption('en');
    await page.getByRole('heading', { name: 'The answer' }).waitFor();
    expect(complaints).toEqual([]);
    await context.close();
  });
});

/** A house in a folder of its own, with a map in a file of its own. */
function houseOfFolders(): string {
  const unit = demoText('units/quarkenfels-8.yaml');
  const [, block = ''] = /fullLoad:[\s\S]*?capacity: \|\n((?: {6}.*\n)+)/.exec(unit) ?? [];
  return folderOf({
    'visit/own.yaml': demoText('house.yaml').replace('value: 195', 'value: 171'),
    'visit/variants/draughty.yaml': demoText('house.yaml')
      .replace('value: 195', 'value: 240')
      .replaceAll(/(weather.csv|units\/|tariffs\/)/g, '../$1'),
    'visit/weather.csv': demoText('weather.csv'),
    'visit/units/quarkenfels-8.yaml': unit.replace(`capacity: |\n${block}`, 'capacity: { file: heat.csv }\n'),
    'visit/units/heat.csv': block.replaceAll(/^ +/gm, ''),
    ...Object.fromEntries(
      ['flat.yaml', 'night.yaml', 'three-band.yaml', 'half-hourly.yaml', 'prices.csv'].map((name) => [
        `visit/tariffs/${name}`,
        demoText(`tariffs/${name}`),
      ]),
    ),
  });
}

describe('a folder of files', () => {
  const folder = houseOfFolders();
  const result = () => written(join(folder, 'visit'), 'simulate', 'own.yaml', '--json', '-');

  it('is opened as a whole where it is chosen, and its map in a file of its own is a grid too', async () => {
    const { context, page, complaints } = await openSheet(browser());
    await page.locator('input[webkitdirectory]').setInputFiles(join(folder, 'visit'));
    await page.locator('#f-own-yaml-house-heatLoss-value').waitFor();
    expect(difference((await savedBy(page, 'Result (JSON)')).text, result())).toBeUndefined();
    // of two scenarios the one that lies highest is shown first
    await page.getByLabel('Scenario, of those opened together').selectOption('variants/draughty.yaml');
    await expect.poll(() => page.locator('#f-variants-draughty-yaml-house-heatLoss-value').count()).toBe(1);
    await page.locator('.sentence').first().waitFor();
    const draughty = written(join(folder, 'visit'), 'simulate', 'variants/draughty.yaml', '--json', '-');
    expect(difference((await savedBy(page, 'Result (JSON)')).text, draughty)).toBeUndefined();
    const grid = '#f-units-quarkenfels-8-yaml-map-fullLoad-capacity';
    expect(await page.locator(`${grid} p`).first().innerText()).toBe('units/heat.csv');
    await page.locator(`${grid} tr:nth-child(4) td:nth-child(2) input`).fill('1,1');
    await page.locator(`${grid} .warning`).first().waitFor();
    expect(await page.locator('footer li', { hasText: 'units/heat.csv' }).innerText()).toContain('changed');
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('is opened as a whole where it is dropped', async () => {
    const { context, page, complaints } = await openSheet(browser());
    const session = await context.newCDPSession(page);
    const data = { items: [], files: [join(folder, 'visit')], dragOperationsMask: 1 };
    const drag = (type: 'dragEnter' | 'dragOver' | 'drop') =>
      session.send('Input.dispatchDragEvent', { type, x: 300, y: 300, data });
    await drag('dragEnter');
    await drag('dragOver');
    await page.locator('.dropping').waitFor();
    // the page has to have answered that it takes the drop before it comes
    await drag('dragOver');
    await page.evaluate('new Promise(requestAnimationFrame)');
    await drag('drop');
    await page.locator('#f-own-yaml-house-heatLoss-value').waitFor();
    await page.locator('.sentence').first().waitFor();
    expect(difference((await savedBy(page, 'Result (JSON)')).text, result())).toBeUndefined();
    expect(await page.locator('.dropping').count()).toBe(0);
    expect(complaints).toEqual([]);
    await context.close();
  });
});

describe('dropped files', () => {
  it('of another house show in the field that was being typed into', async () => {
    const { context, page, complaints } = await openSheet(browser());
    const heatLoss = page.locator('#f-house-yaml-house-heatLoss-value');
    await heatLoss.fill('150');
    await dropFiles(page, { 'house.yaml': demoText('house.yaml').replace('value: 195', 'value: 171') });
    await expect.poll(() => heatLoss.inputValue()).toBe('171');
    expect(complaints).toEqual([]);
    await context.close();
  });

  it('of prices make a tariff that asks what they are stated in', async () => {
    const { context, page, complaints } = await openSheet(browser());
    await dropFiles(page, { 'market.csv': demoText('tariffs/prices.csv') });
    await page.locator('#f-tariff-1-yaml-series-unit').selectOption('perKWh');
    await expect.poll(() => page.locator('.bars li').count()).toBe(6);
    expect(await page.locator('#f-tariff-1-yaml-series-file').inputValue()).toBe('market.csv');
    expect(complaints).toEqual([]);
    await context.close();
  });
});
