import { relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { DiskSource } from '../../../../cli/diskSource.ts';
import { makeReport } from '../../../../src/report/html/makeReport.ts';
import type { ReportInput } from '../../../../src/report/html/reportInput.ts';
import type { Language } from '../../../../src/report/language/languages.ts';
import type { FileSource } from '../../../../src/scenario/fileSource.ts';
import { memoryFiles } from '../../scenario/memoryFiles.ts';
import { lumpedText, sampleFiles, scenarioText } from '../../scenario/sampleFiles.ts';

const HOUSE = relative(process.cwd(), fileURLToPath(new URL('../../../../data/demo/house.yaml', import.meta.url)));
const VERSION = '1.2.3';

function made(name: string, source: FileSource, language: Language, date?: string): ReportInput {
  const { input, problems } = makeReport(name, source, { language, date, version: VERSION });
  if (input === undefined) throw new Error(JSON.stringify(problems));
  return input;
}

/** What the report of the demo is made of. */
export function demoReport(language: Language = 'en', date?: string): ReportInput {
  return made(HOUSE, new DiskSource(), language, date);
}

/**
 * What the report of a small house is made of.
 *
 * @param scenario its file
 * @param files other files than those of the sample
 */
export function sampleReport(
  scenario: string = scenarioText,
  files: Record<string, string> = {},
  language: Language = 'en',
): ReportInput {
  return made('house.yaml', memoryFiles(sampleFiles({ ...files, 'house.yaml': scenario })), language);
}

const BOILER = 'boiler:\n  efficiency: 0.9\n  fuel: { kind: naturalGas, price: 0.09 }\n';

/** Houses that lack something or have something more, by what it is. */
export const houses: Readonly<Record<string, string>> = {
  'no boiler and no hot water': scenarioText,
  'a boiler': scenarioText + BOILER,
  'no tariff': scenarioText.replace('tariffs: [tariff.yaml]', 'tariffs: []'),
  'no tariff, but a boiler': scenarioText.replace('tariffs: [tariff.yaml]', 'tariffs: []') + BOILER,
  'no backup': scenarioText.replace(/backup: .*\n/, ''),
  'no need of heat': scenarioText.replace('internalGains: 300', 'internalGains: 20000') + BOILER,
  'mass, hot water and a hybrid': lumpedText,
  'a unit far too small': scenarioText.replace('value: 180', 'value: 1500'),
};
