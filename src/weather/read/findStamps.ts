import { shown } from '../../core/problem.ts';
import type { CellKind } from './cellKinds.ts';
import { chosenColumn } from './chosenColumn.ts';
import { columnLabel, type StampColumns, type UsedColumn } from './columnPlan.ts';
import { namesStamp, offsetOfHeader, type StampRole, stampRoleOf } from './columnWords.ts';
import type { ColumnSearch } from './findQuantities.ts';
import { formProblem, hasForm } from './formattedStamps.ts';
import { scanStamp } from './scanStamp.ts';

const ROLES = ['stamp', 'date', 'time', 'year', 'month', 'day', 'hour', 'minute', 'hourOfYear'] as const;

/**
 * The columns that make up the stamps: by the settings, else by what their cells look like and, for numbers, their names.
 *
 * @returns nothing but absent members where the rows carry no stamps
 */
export function findStamps(search: ColumnSearch): StampColumns {
  const chosen = search.settings.columns ?? {};
  const stamps: { -readonly [Role in keyof StampColumns]: StampColumns[Role] } = {};
  let any = false;
  for (const role of ROLES) {
    const choice = chosen[role];
    if (choice === undefined) continue;
    any = true;
    const index = chosenColumn(choice, search.head, { path: `columns.${role}`, findings: search.findings });
    if (index !== undefined) stamps[role] = { index, how: 'settings' };
  }
  if (any) return stamps;
  const found = findByForm(search) ?? findByContent(search) ?? findByName(search) ?? findUnnamedParts(search);
  if (found === undefined) reportUnread(search);
  return found ?? {};
}

/** The first column whose cells have the form that the settings state. */
function findByForm({ head, rows, settings }: ColumnSearch): StampColumns | undefined {
  const form = settings.stampFormat;
  const [first] = rows;
  if (form === undefined || first === undefined) return undefined;
  const index = first.findIndex((cell, column) => head.kinds[column] !== 'number' && hasForm(cell, form));
  return index < 0 ? undefined : { stamp: used(index) };
}

/** A form that fits no column is a mistake; and a column that is called a date or a time, but is not understood, must not be taken for none. */
function reportUnread({ head, rows, settings, findings }: ColumnSearch): void {
  if (settings.stampFormat !== undefined) {
    findings.add(formProblem(settings.stampFormat, rows[0]?.[0] ?? ''));
    return;
  }
  const index = head.names.findIndex((name, column) => head.kinds[column] === 'text' && namesStamp(name));
  if (index < 0) return;
  findings.add({
    code: 'weather.unread-stamps',
    severity: 'error',
    line: head.firstLine,
    path: columnLabel(index, head.names),
    found: `“${shown(rows[0]?.[index] ?? '', 40)}”`,
  });
}

function findByContent(search: ColumnSearch): StampColumns | undefined {
  const named = namedParts(search);
  const time = byKind(search, 'time')[0];
  const stamps = byKind(search, 'stamp');
  const hasTime = time !== undefined || named.hour !== undefined;
  const whole = stamps.filter((index) => !hasTime || !isAlwaysMidnight(search, index));
  const best = whole.find((index) => offsetOfHeader(search.head.texts[index] ?? '') !== undefined) ?? whole[0];
  if (best !== undefined) return { stamp: used(best) };
  const date = byKind(search, 'date')[0] ?? stamps[0];
  if (date === undefined) return undefined;
  if (time !== undefined) return { date: used(date), time: used(time) };
  if (named.hour !== undefined) return { date: used(date), hour: named.hour, minute: named.minute };
  return { stamp: used(date) };
}

function byKind({ head }: ColumnSearch, wanted: CellKind): number[] {
  return head.kinds.flatMap((kind, index) => (kind === wanted ? [index] : []));
}

function used(index: number): UsedColumn {
  return { index, how: 'content' };
}

/** Some programs write a date as a stamp of midnight, and the time in its own column. */
function isAlwaysMidnight({ rows }: ColumnSearch, index: number): boolean {
  const parts = { order: 'none' as const, year: 0, first: 0, second: 0, minute: 0, offset: 0 };
  return rows.length > 1 && rows.every((row) => !scanStamp(row[index]?.trim() ?? '', parts) || parts.minute === 0);
}

function findByName(search: ColumnSearch): StampColumns | undefined {
  const { year, month, day, hour, minute, hourOfYear } = namedParts(search);
  if (month !== undefined && day !== undefined && hour !== undefined) return { year, month, day, hour, minute };
  const counted = hourOfYear ?? hour ?? unnamedIndex(search);
  if (counted === undefined || !countsUp(search, counted.index)) return undefined;
  return { hourOfYear: counted };
}

/** Columns of numbers whose names stand for parts of a stamp; the first of each. */
function namedParts({ head }: ColumnSearch): { readonly [Role in StampRole]?: UsedColumn } {
  const parts: { [Role in StampRole]?: UsedColumn } = {};
  head.names.forEach((name, index) => {
    if (head.kinds[index] !== 'number') return;
    const role = stampRoleOf(name);
    if (role !== undefined) parts[role] ??= { index, how: 'name' };
  });
  return parts;
}

/** The first column, where it has no name or the file has no header. */
function unnamedIndex({ head }: ColumnSearch): UsedColumn | undefined {
  return head.kinds[0] === 'number' && (head.names[0] ?? '') === '' ? { index: 0, how: 'content' } : undefined;
}

/** Whether a column counts from 0 or 1 (or from half a step) beyond the 24 hours of a day. */
function countsUp({ rows }: ColumnSearch, index: number): boolean {
  const values = rows.map((row) => Number((row[index] ?? '').trim().replace(',', '.')));
  const [first, second] = values;
  if (first === undefined || second === undefined || first < 0 || first > 2) return false;
  const step = second - first;
  if (!(step > 0 && step <= 1)) return false;
  const last = values[values.length - 1] ?? 0;
  return last > 24 && values.every((value, i) => i === 0 || value > (values[i - 1] ?? 0));
}

/** Year, month, day and hour in the first four columns of a file without a header. */
function findUnnamedParts({ head, rows }: ColumnSearch): StampColumns | undefined {
  if (head.headerRow >= 0) return undefined;
  const limits = [
    [1800, 2200],
    [1, 12],
    [1, 31],
    [0, 24],
  ] as const;
  const fits = limits.every(([least, most], column) =>
    rows.every(
      (row) => /^\s*\d+\s*$/.test(row[column] ?? '') && Number(row[column]) >= least && Number(row[column]) <= most,
    ),
  );
  if (!fits || new Set(rows.map((row) => Number(row[3]))).size < 23) return undefined;
  return { year: used(0), month: used(1), day: used(2), hour: used(3) };
}
