import { hasErrors, type Problem } from '../../core/problem.ts';
import type { WeatherSeries } from '../series.ts';
import { createFindings } from './findings.ts';
import { measureText, plainLines } from './measureText.ts';
import type { ReadContext, Reading } from './readContext.ts';
import { readSeries } from './readSeries.ts';
import { readTable } from './readTable.ts';
import { readYear } from './readYear.ts';
import type { Recognised, Recognising } from './recognised.ts';
import { recognisedLines } from './recognisedLines.ts';

export type { ReadContext } from './readContext.ts';
export type { Recognised } from './recognised.ts';

/** A weather file as read: the series where it could be made, how the file was understood, and all problems. */
export interface WeatherReading {
  readonly series?: WeatherSeries;
  readonly recognised: Recognised;
  readonly problems: Problem[];
}

/**
 * Reads a year of weather from the text of a CSV file.
 *
 * @param text the decoded file; anything at all
 * @param context settings, zone, offset and altitude
 * @returns the series only where no error was found; every value in it is finite
 *
 * Reference: MODEL section 1.
 */
export function readWeather(text: string, context: ReadContext): WeatherReading {
  const findings = createFindings(context.file);
  const known: Recognising = { columns: [], filled: [], empty: [] };
  const series = readInto(text, context, { known, findings });
  const problems = findings.list();
  const recognised = { ...known, lines: recognisedLines(known) };
  return series === undefined || hasErrors(problems) ? { recognised, problems } : { series, recognised, problems };
}

function readInto(text: string, context: ReadContext, reading: Reading): WeatherSeries | undefined {
  const { findings } = reading;
  const plain = plainLines(text);
  if (plain.trim() === '') {
    findings.add({ code: 'file.empty', severity: 'error' });
    return undefined;
  }
  const lines = measureText(plain, findings);
  if (findings.failed()) return undefined;
  const table = readTable(plain, lines, { ...reading, settings: context.settings });
  if (table === undefined) return undefined;
  const year = readYear(table, context, reading);
  if (year === undefined) return undefined;
  return readSeries({ table, year, context, reading });
}
