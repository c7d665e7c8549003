import type { ReadSettings } from '../readSettings.ts';
import { chosenColumn } from './chosenColumn.ts';
import type { ColumnPlan, StampColumns, UsedColumn } from './columnPlan.ts';
import { namesStation } from './columnWords.ts';
import type { Findings } from './findings.ts';
import { type ColumnSearch, findQuantities } from './findQuantities.ts';
import { findStamps } from './findStamps.ts';
import { findHead, type TableHead } from './header.ts';
import { quantityTexts } from './quantities.ts';
import { type RawRows, readRows } from './readRows.ts';
import type { RecognisedColumn, Recognising } from './recognised.ts';
import { type CellText, openCells, previewRows } from './rows.ts';

/** The table of a file: its columns found, its rows read. */
export interface WeatherTable {
  readonly cells: CellText;
  readonly head: TableHead;
  readonly plan: ColumnPlan;
  readonly raw: RawRows;
}

/** Settings, and where the reading collects what it finds. */
interface TableReading {
  readonly settings: ReadSettings;
  readonly known: Recognising;
  readonly findings: Findings;
}

/**
 * Finds delimiter, header and columns of a text, and reads its rows.
 *
 * @param text with line feeds only
 * @param lines number of its lines
 * @returns nothing where columns or rows were not found, which is a problem
 */
export function readTable(text: string, lines: number, reading: TableReading): WeatherTable | undefined {
  const { settings, known, findings } = reading;
  const cells = openCells(text, settings);
  known.delimiter = cells.delimiter;
  known.decimal = cells.decimal;
  const rows = previewRows(cells);
  const head = findHead(rows, settings);
  if (head === undefined) {
    findings.add({ code: 'weather.no-rows', severity: 'error' });
    return undefined;
  }
  known.header = head.headerRow >= 0;
  if (head.headerRow >= 0) known.headerLine = head.headerLine;
  known.linesSkipped = (head.headerRow >= 0 ? head.headerLine : head.firstLine) - 1;
  const data = rows.slice(head.firstRow).filter((row) => row.some((cell) => cell.trim() !== ''));
  const plan = planColumns({ head, rows: data, settings, findings });
  known.columns = listColumns(plan, head);
  if (findings.failed()) return undefined;
  const raw = readRows(cells, { head, plan, settings, lines, findings });
  known.rowsRead = raw.count;
  known.footerRows = raw.footerRows;
  known.station = raw.station;
  if (findings.failed('weather.several-stations') || findings.failed('weather.no-such-station')) return undefined;
  if (raw.count === 0) {
    findings.add({ code: 'weather.no-rows', severity: 'error' });
    return undefined;
  }
  return { cells, head, plan, raw };
}

function planColumns(search: ColumnSearch): ColumnPlan {
  const stamps = findStamps(search);
  const taken = new Set(stampList(stamps).map(([, { index }]) => index));
  const station = findStation(search);
  if (station !== undefined) taken.add(station.index);
  return { stamps, station, quantities: findQuantities(search, taken) };
}

function findStation({ head, settings, findings }: ColumnSearch): UsedColumn | undefined {
  if (settings.station !== undefined) {
    const index = chosenColumn(settings.station.column, head, { path: 'station.column', findings });
    return index === undefined ? undefined : { index, how: 'settings' };
  }
  const index = head.names.findIndex(namesStation);
  return index < 0 ? undefined : { index, how: 'name' };
}

function stampList(stamps: StampColumns): [string, UsedColumn][] {
  return Object.entries(stamps).filter((entry): entry is [string, UsedColumn] => entry[1] !== undefined);
}

const stampWords: Readonly<Record<string, string>> = { hourOfYear: 'hour of the year', stamp: 'stamp' };

function listColumns({ stamps, quantities }: ColumnPlan, head: TableHead): RecognisedColumn[] {
  const column = (use: string, { index, how }: UsedColumn): RecognisedColumn => {
    const name = head.names[index];
    return { use, number: index + 1, ...(name ? { name } : {}), decidedBy: how };
  };
  return [
    ...stampList(stamps).map(([role, used]) => column(stampWords[role] ?? role, used)),
    ...[...quantities].map(([quantity, used]) => column(quantityTexts[quantity].name, used)),
  ];
}
