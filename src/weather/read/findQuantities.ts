import { shown } from '../../core/problem.ts';
import type { ReadSettings } from '../readSettings.ts';
import { cellKind } from './cellKinds.ts';
import { chosenColumn } from './chosenColumn.ts';
import { columnList, type UsedColumn } from './columnPlan.ts';
import { quantityOf } from './columnWords.ts';
import type { Findings } from './findings.ts';
import type { TableHead } from './header.ts';
import { type Quantity, quantityNames, quantityTexts } from './quantities.ts';

/** What the search for columns looks at. */
export interface ColumnSearch {
  readonly head: TableHead;
  /** The first rows of data. */
  readonly rows: readonly string[][];
  readonly settings: ReadSettings;
  readonly findings: Findings;
}

/**
 * The columns of temperature, humidity, radiation and pressure: by the settings, else by their names in the header;
 * without a header a single column of numbers is the temperature.
 *
 * @param search head and first rows
 * @param taken indices of columns that hold stamps
 * @returns the columns; of the humidities only the one that is used
 */
export function findQuantities(search: ColumnSearch, taken: ReadonlySet<number>): Map<Quantity, UsedColumn> {
  const found = new Map<Quantity, UsedColumn>();
  const chosen = search.settings.columns ?? {};
  for (const quantity of quantityNames) {
    const choice = chosen[quantity];
    if (choice === undefined || choice === false) continue;
    const index = chosenColumn(choice, search.head, { path: `columns.${quantity}`, findings: search.findings });
    if (index !== undefined) found.set(quantity, { index, how: 'settings' });
  }
  const chosenIndices = [...found.values()].map(({ index }) => index);
  if (search.head.headerRow < 0) findByPosition(search, new Set([...taken, ...chosenIndices]), found);
  // A name counts even where the cells look like stamps: the names may have been exchanged.
  else findByName(search, new Set(chosenIndices), found);
  keepOneHumidity(search, found);
  for (const [quantity, { index }] of found) checkContent(search, quantity, index);
  // Temperature first: its unit is also that of a dew point that names none.
  return new Map([...found].sort(([a], [b]) => quantityNames.indexOf(a) - quantityNames.indexOf(b)));
}

function findByPosition(search: ColumnSearch, used: ReadonlySet<number>, found: Map<Quantity, UsedColumn>): void {
  if (search.settings.columns?.temperature !== undefined) return;
  const numbers = search.head.kinds.flatMap((kind, index) => (kind === 'number' && !used.has(index) ? [index] : []));
  const [only] = numbers;
  if (numbers.length === 1 && only !== undefined) {
    found.set('temperature', { index: only, how: 'position' });
    return;
  }
  const row = search.rows[0] ?? [];
  const cells = numbers.slice(0, 12).map((index) => `column ${index + 1} (${shown(row[index] ?? '', 12)})`);
  search.findings.add({ code: 'weather.no-names', severity: 'error', found: cells.join(', ') });
}

function findByName(search: ColumnSearch, used: ReadonlySet<number>, found: Map<Quantity, UsedColumn>): void {
  const plain = new Map<Quantity, number[]>();
  const extremes: number[] = [];
  search.head.names.forEach((name, index) => {
    if (used.has(index)) return;
    const named = quantityOf(name) ?? quantityOf(search.head.texts[index] ?? '');
    if (named === undefined) return;
    if (!named.extreme) plain.set(named.quantity, [...(plain.get(named.quantity) ?? []), index]);
    else if (named.quantity === 'temperature') extremes.push(index);
  });
  for (const quantity of quantityNames) {
    if (search.settings.columns?.[quantity] !== undefined) continue;
    const candidates = plain.get(quantity) ?? (quantity === 'temperature' ? extremes : []);
    const [first] = candidates;
    if (candidates.length === 1 && first !== undefined && plain.has(quantity)) {
      found.set(quantity, { index: first, how: 'name' });
    } else if (candidates.length > 0) {
      reportSeveral(search, quantity, candidates);
    } else if (quantity === 'temperature') {
      const all = Array.from({ length: search.head.width }, (_, index) => index);
      search.findings.add({
        code: 'weather.no-temperature',
        severity: 'error',
        line: search.head.headerLine,
        found: columnList(all, search.head.names),
      });
    }
  }
}

function reportSeveral(search: ColumnSearch, quantity: Quantity, candidates: readonly number[]): void {
  const one = `columns: {${quantity}: ${(candidates[0] ?? 0) + 1}}`;
  const none = quantity === 'temperature' ? '' : `, or leave them out with 'columns: {${quantity}: false}'`;
  search.findings.add({
    code: 'weather.two-columns',
    severity: 'error',
    line: search.head.headerLine,
    path: quantityTexts[quantity].name,
    found: columnList(candidates, search.head.names),
    hint: `choose one, such as '${one}'${none}`,
  });
}

/** Relative humidity before dew point before wet bulb; a chosen column before a recognised one; none that is empty. */
function keepOneHumidity({ head }: ColumnSearch, found: Map<Quantity, UsedColumn>): void {
  const kinds = (['relativeHumidity', 'dewPoint', 'wetBulb'] as const).filter((kind) => found.has(kind));
  const filled = kinds.filter((kind) => head.kinds[found.get(kind)?.index ?? -1] !== 'blank');
  const best = kinds.find((kind) => found.get(kind)?.how === 'settings') ?? filled[0] ?? kinds[0];
  for (const kind of kinds) if (kind !== best) found.delete(kind);
}

/** One clear problem for a column that holds something else altogether, instead of one for each line. */
function checkContent({ head, rows, findings }: ColumnSearch, quantity: Quantity, index: number): void {
  const kind = head.kinds[index];
  if (kind === undefined || kind === 'number' || kind === 'blank') return;
  const cells = rows.map((row) => row[index] ?? '');
  const wanted = kind === 'text' ? ['text', 'stamp', 'date', 'time'] : [kind];
  const wrong = cells.filter((cell) => wanted.includes(cellKind(cell)));
  if (wrong.length <= 0.5 * cells.length) return;
  findings.add({
    code: kind === 'text' ? 'weather.column-not-numbers' : 'weather.column-holds-stamps',
    severity: 'error',
    line: head.firstLine,
    path: quantityTexts[quantity].name,
    found: `“${shown(wrong[0] ?? '', 30)}” in column ${index + 1}`,
  });
}
