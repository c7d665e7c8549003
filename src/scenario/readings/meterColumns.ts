import { shown } from '../../core/problem.ts';
import { cellKind } from '../../weather/read/cellKinds.ts';
import { columnList } from '../../weather/read/columnPlan.ts';
import type { MeterTable } from './meterTable.ts';
import type { ReadingFaults } from './readingFaults.ts';

/** What the values are: readings of a meter, use since the date before, or fills of a tank. */
export type ReadingKind = 'reading' | 'use' | 'fill';

/** Units that a header may name. */
export type MeterUnit = 'kWh' | 'MWh' | 'm³' | 'litre';

/** Which column holds what; indices count from 0. */
export interface MeterColumns {
  readonly date: number;
  readonly value: number;
  readonly kind: ReadingKind;
  readonly estimated: number | undefined;
  readonly exchange: number | undefined;
  /** Unit in the name of the values. */
  readonly unit: MeterUnit | undefined;
}

type Role = ReadingKind | 'date' | 'estimated' | 'exchange';

/** Words of headers, in the languages of most such files; the first that fits decides. */
const roleWords: readonly (readonly [Role, RegExp])[] = [
  ['exchange', /exchang|new meter|replac|wechsel|tausch/i],
  ['estimated', /estimat|sch[aä]tz/i],
  ['date', /\b(?:date|day)\b|datum|fecha|^data$|^tag$/i],
  ['reading', /reading|\bindex\b|stand\b|counter|lectura|lettura/i],
  ['use', /\buse[ds]?\b|usage|consum|verbrauch|verbruik|consommation/i],
  ['fill', /\bfill|deliver|liefer|tank|livraison/i],
];

const unitWords: readonly (readonly [MeterUnit, RegExp])[] = [
  ['MWh', /mwh/i],
  ['kWh', /kwh/i],
  ['m³', /m³|\bm3\b|cubic met/i],
  ['litre', /lit(?:re|er)|\bl\b/i],
];

const valueKinds = ['reading', 'use', 'fill'] as const;

/**
 * Finds the columns of a table of readings by their names. Where a reading stands beside a use, the reading counts.
 *
 * @returns nothing where date or values are not found or not clear, which is a fault
 */
export function meterColumns(table: MeterTable, faults: ReadingFaults): MeterColumns | undefined {
  const roles = table.names.map((name) => roleWords.find(([, words]) => words.test(name))?.[0]);
  const only = (wanted: Role) => onlyColumn({ table, roles, wanted, faults });
  if (table.names.some(isDate)) {
    const found = shown(table.names.join(', '), 120);
    faults.add({ code: 'readings.no-names', line: table.headerLine, found });
    return undefined;
  }
  const kinds = valueKinds.filter((kind) => roles.includes(kind));
  const kind = kinds.includes('reading') ? 'reading' : kinds[0];
  if (kind !== 'reading' && kinds.length > 1) reportSeveral(table, roles, faults);
  if (kind === undefined) reportNone(table, 'reading, the use or the fill', faults);
  if (!roles.includes('date')) reportNone(table, 'date', faults);
  const [date, estimated, exchange] = [only('date'), only('estimated'), only('exchange')];
  const value = kind === undefined ? undefined : only(kind);
  if (kind === undefined || date === undefined || value === undefined || faults.any()) return undefined;
  const unit = unitWords.find(([, words]) => words.test(table.names[value]))?.[0];
  return { date, value, kind, estimated, exchange, unit };
}

function isDate(name: string): boolean {
  const kind = cellKind(name);
  return kind === 'date' || kind === 'stamp';
}

interface ColumnSearch {
  readonly table: MeterTable;
  readonly roles: readonly (Role | undefined)[];
  readonly wanted: Role;
  readonly faults: ReadingFaults;
}

function onlyColumn({ table, roles, wanted, faults }: ColumnSearch): number | undefined {
  const found = roles.flatMap((role, i) => (role === wanted ? [i] : []));
  if (found.length > 1) {
    const columns = columnList(found, table.names);
    faults.add({ code: 'readings.two-columns', line: table.headerLine, path: wanted, found: columns });
  }
  return found[0];
}

function reportSeveral(table: MeterTable, roles: ColumnSearch['roles'], faults: ReadingFaults): void {
  const found = roles.flatMap((role, i) => (role === 'use' || role === 'fill' ? [i] : []));
  const columns = columnList(found, table.names);
  faults.add({ code: 'readings.two-columns', line: table.headerLine, path: 'use or the fill', found: columns });
}

function reportNone({ names, headerLine }: MeterTable, path: string, faults: ReadingFaults): void {
  faults.add({ code: 'readings.no-column', line: headerLine, path, found: shown(names.join(', '), 120) });
}
