import { type Problem, shown } from '../../core/problem.ts';
import { shownNumber } from '../entries/allowedText.ts';
import type { Place } from '../yaml/yamlFile.ts';
import { type SplitTable, splitTable, type TableCell } from './splitTable.ts';
import { axisNumber, cellValue } from './tableNumbers.ts';
import type { Quantity } from './tableQuantities.ts';

/** A table's text and where it stands. */
export interface TableText {
  readonly file: string;
  /** Path of the table, such as map.fullLoad.cop. */
  readonly path: string;
  readonly text: string;
  /** Place in the file of a line and column of the text. */
  readonly place: (line: number, column: number) => Place;
}

/** A table read: both axes strictly rising, values row-major outdoor × flow, a gap is null. */
export interface Grid {
  readonly source: TableText;
  readonly outdoor: readonly number[];
  readonly flow: readonly number[];
  readonly values: readonly (number | null)[];
  /** Place of each value in the file. */
  readonly places: readonly Place[];
}

/** Faults of one kind listed of one table; more have one cause. */
const MOST_LISTED = 5;

interface AxisEntry {
  readonly value: number;
  readonly cell: TableCell;
  /** Position in the table as written. */
  readonly at: number;
}

/**
 * Reads a table of one quantity over outdoor and flow temperature, in whatever order its rows and columns stand.
 *
 * @param source the table's text
 * @param quantity what it holds, and the range of its values
 * @returns the grid where it is sound, and what is wrong or odd, each at its cell
 */
export function readGrid(source: TableText, quantity: Quantity): { grid?: Grid; problems: Problem[] } {
  const table = splitTable(source.text);
  const firstCell = table.flows[0] ?? { text: '', line: 1, column: 1 };
  if (table.flows.length === 0 || table.rows.length === 0) {
    return { problems: [gridProblem(source, firstCell, { code: 'map.no-table' })] };
  }
  const flows = axis(source, table.flows, 'flow');
  const outdoors = axis(
    source,
    table.rows.map((row) => row.label),
    'outdoor',
  );
  const problems = [...flows.problems, ...outdoors.problems, ...raggedRows(source, table)];
  if (problems.some((p) => p.severity === 'error')) return { problems };
  const cells = outdoors.entries.flatMap((row) =>
    flows.entries.map((column) => ({ row, column, cell: (table.rows[row.at]?.cells ?? [])[column.at] ?? row.cell })),
  );
  const faults = cells.flatMap(({ row, column, cell }) => {
    const fault = quantity.faultOf(cell.text, cellValue(cell.text));
    return fault === undefined ? [] : [gridProblem(source, cell, fault, pointName(row.value, column.value))];
  });
  problems.push(...firstOnes(source, faults));
  if (faults.length > 0) return { problems };
  const grid: Grid = {
    source,
    outdoor: outdoors.entries.map((entry) => entry.value),
    flow: flows.entries.map((entry) => entry.value),
    values: cells.map(({ cell }) => cellValue(cell.text) ?? null),
    places: cells.map(({ cell }) => source.place(cell.line, cell.column)),
  };
  return { grid, problems };
}

/** A point of a map in the notation of EN 14511, such as A-7/W35. */
export function pointName(outdoor: number, flow: number): string {
  return `A${outdoor}/W${flow}`;
}

const axes = {
  outdoor: { least: -50, most: 50, letters: 'AL', allowed: 'an outdoor temperature lies between −50 and 50 °C' },
  flow: { least: 15, most: 100, letters: 'WF', allowed: 'a flow temperature lies between 15 and 100 °C' },
} as const;

function axis(source: TableText, cells: readonly TableCell[], kind: keyof typeof axes) {
  const { least, most, letters, allowed } = axes[kind];
  const problems: Problem[] = [];
  const entries: AxisEntry[] = [];
  cells.forEach((cell, at) => {
    const number = axisNumber(cell.text);
    const fits =
      number !== undefined && number.value >= least && number.value <= most && letters.includes(number.letter);
    if (!fits) {
      problems.push(gridProblem(source, cell, { code: 'map.axis', found: `'${shown(cell.text)}'`, allowed }));
      return;
    }
    const twin = entries.find((entry) => entry.value === number.value);
    if (twin) {
      const first = source.place(twin.cell.line, twin.cell.column);
      const where = kind === 'outdoor' ? `line ${first.line}` : `column ${first.column} of that line`;
      const found = `the ${kind} temperature ${shownNumber(number.value)} °C`;
      problems.push(gridProblem(source, cell, { code: 'map.repeated', found, allowed: where }));
    }
    entries.push({ value: number.value, cell, at });
  });
  const order = disordered(entries);
  if (order) problems.push(gridProblem(source, order.cell, { code: 'map.unsorted', found: kind }));
  return { entries: entries.sort((a, b) => a.value - b.value), problems: firstOnes(source, problems) };
}

/** The first temperature out of an order that otherwise rises or falls; tables are printed either way. */
function disordered(entries: readonly AxisEntry[]): AxisEntry | undefined {
  const sign = Math.sign((entries[1]?.value ?? 0) - (entries[0]?.value ?? 0));
  return entries.find((entry, i) => i > 0 && (entry.value - (entries[i - 1]?.value ?? 0)) * sign < 0);
}

function raggedRows(source: TableText, table: SplitTable): Problem[] {
  return table.rows
    .filter((row) => row.cells.length !== table.flows.length)
    .slice(0, MOST_LISTED)
    .map(({ label, cells }) =>
      gridProblem(source, label, {
        code: 'map.ragged',
        found: `${cells.length}`,
        allowed: `${table.flows.length}`,
      }),
    );
}

function firstOnes(source: TableText, faults: readonly Problem[]): Problem[] {
  const rest = faults.length - MOST_LISTED;
  if (rest <= 0) return [...faults];
  const last = faults[MOST_LISTED];
  const place = { line: last?.line ?? 1, column: last?.column ?? 1 };
  const more: Problem = {
    code: 'map.more',
    severity: 'error',
    file: source.file,
    ...place,
    path: source.path,
    found: `${rest}`,
  };
  return [...faults.slice(0, MOST_LISTED), more];
}

/** A problem at a cell of a table; the point, where given, joins the path. */
function gridProblem(
  source: TableText,
  cell: TableCell,
  fault: Pick<Problem, 'code'> & Partial<Problem>,
  point?: string,
): Problem {
  const severity = fault.code === 'map.unsorted' ? 'warning' : 'error';
  const path = point === undefined ? source.path : `${source.path}[${point}]`;
  return { severity, ...fault, file: source.file, ...source.place(cell.line, cell.column), path };
}
