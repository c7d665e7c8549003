import { visibleText } from '../../src/core/problem.ts';
import { findHead } from '../../src/weather/read/header.ts';
import { quantityTexts } from '../../src/weather/read/quantities.ts';
import type { Recognised } from '../../src/weather/read/recognised.ts';
import { openCells, previewRows } from '../../src/weather/read/rows.ts';
import type { ReadSettings } from '../../src/weather/readSettings.ts';

/** What a column of a weather file may be used for: keys of `weather.read.columns`. */
export const COLUMN_USES = [
  ...(['stamp', 'temperature', 'relativeHumidity', 'dewPoint', 'wetBulb', 'globalRadiation', 'pressure'] as const),
  ...(['date', 'time', 'year', 'month', 'day', 'hour', 'minute', 'hourOfYear'] as const),
];
export type ColumnUse = (typeof COLUMN_USES)[number];

/** Those that may be left unused although the file has them. */
export const MAY_BE_UNUSED: ReadonlySet<string> = new Set([
  ...['relativeHumidity', 'dewPoint', 'wetBulb', 'globalRadiation', 'pressure'],
]);

/** One column of a weather file as the page shows it. */
export interface WeatherColumn {
  /** Name in the header; '' where it has none. */
  readonly name: string;
  /** How the settings name it: by its name where no other column has that, else by its number from 1. */
  readonly key: string | number;
  readonly use?: ColumnUse;
  /** Its first cells as they stand. */
  readonly samples: readonly string[];
}

/** Lines that are looked at; a header lies within the first ones. */
const LOOKED_AT = 200;
const SAMPLES = 3;
const MOST_COLUMNS = 60;
/** Longest name that the settings take. */
const LONGEST_KEY = 200;

/**
 * The columns of a weather file, and what each was taken for.
 *
 * @param text of the file
 * @param settings how to read it
 * @param recognised how it was understood, as far as it was
 * @returns none where no table is found in it
 */
export function weatherColumns(
  text: string,
  settings: ReadSettings,
  recognised: Pick<Recognised, 'columns' | 'delimiter' | 'decimal'> | undefined,
): WeatherColumn[] {
  const start = text.replace(/\r\n?/g, '\n').split('\n', LOOKED_AT).join('\n');
  const { delimiter, decimal } = { ...recognised, ...settings };
  const rows = previewRows(openCells(start, { delimiter, decimal }));
  const head = findHead(rows, settings);
  if (head === undefined) return [];
  const samples = rows.slice(head.firstRow, head.firstRow + SAMPLES);
  const uses = new Map(recognised?.columns.map(({ number, use }) => [number, useOf(use)]));
  return Array.from({ length: Math.min(head.width, MOST_COLUMNS) }, (_, i) => {
    const name = head.names[i] ?? '';
    const isAlone = name !== '' && head.names.filter((other) => other === name).length === 1;
    const use = uses.get(i + 1);
    return {
      name: visibleText(name.slice(0, 60)),
      key: isAlone && name.length <= LONGEST_KEY && !/^\d+$/.test(name) ? name : i + 1,
      ...(use === undefined ? {} : { use }),
      samples: samples.map((row) => visibleText((row[i] ?? '').trim().slice(0, 40))),
    };
  });
}

/** The key of a use that the reader names in words. */
function useOf(words: string): ColumnUse | undefined {
  return COLUMN_USES.find((use) => words === wordsOf(use));
}

function wordsOf(use: ColumnUse): string {
  if (use === 'hourOfYear') return 'hour of the year';
  return Object.hasOwn(quantityTexts, use) ? quantityTexts[use as keyof typeof quantityTexts].name : use;
}
