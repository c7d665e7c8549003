import Papa from 'papaparse';
import type { Distribution } from '../batch/distribution.ts';
import type { Row } from '../batch/row.ts';
import { type figureColumns, rowFigures, tariffColumn, tariffFigures } from '../batch/rowColumns.ts';
import { type Problem, visibleText } from '../core/problem.ts';
import { problemSentence } from '../core/problemText.ts';

/** Text that a spreadsheet would take for a formula gets an apostrophe before it; a number as text does not. */
const FORMULA_START = /^[=+@\t\r]|^-(?![\d.]+$)/;

/** What a batch's table of results looks like. */
export interface TableShape {
  /** Names of the axes. */
  readonly axes: readonly string[];
  /** Whether there is a table of homes. */
  readonly homes: boolean;
  /** Most tariffs of any job. */
  readonly tariffs: number;
}

type Cell = string | number | boolean | null;

/** The names of the columns, units in brackets, as one line. */
export function batchHeader({ axes, homes, tariffs }: TableShape): string {
  const named = ({ name, unit }: { name: string; unit: string }) => `${name} [${unit}]`;
  const costs = Array.from({ length: tariffs }, (_, t) => [
    `tariff${t + 1}`,
    ...tariffFigures.map((figure) => named({ name: tariffColumn(t, figure), unit: 'money' })),
  ]);
  return csvLine([
    ...['job', 'home', ...(homes ? ['homesLine'] : [])],
    ...axes.map(visibleText),
    ...rowFigures.map(named),
    ...['currency', ...costs.flat()],
    ...['warnings', 'warningCodes', 'problemCodes', 'problems', 'problemPlaces'],
  ]);
}

/**
 * A row as one line of CSV: comma, decimal point, numbers in full precision, no line ends within cells.
 *
 * @returns a cell is empty where the row has no such figure; a row that failed has its problems in the last three
 */
export function batchLine(row: Row, { homes, tariffs }: TableShape): string {
  const { result, problems } = row;
  const costs = Array.from({ length: tariffs }, (_, t): Cell[] => {
    const tariff = result?.tariffs[t];
    return [tariff === undefined ? null : visibleText(tariff.name), ...tariffFigures.map((f) => tariff?.[f] ?? null)];
  });
  return csvLine([
    ...[row.job, visibleText(row.home), ...(homes ? [row.homesLine ?? null] : [])],
    ...row.axes.map((label) => (typeof label === 'string' ? visibleText(label) : label)),
    ...rowFigures.map(({ name }) => result?.figures[name] ?? null),
    ...[result?.currency ?? null, ...costs.flat()],
    ...[result?.warnings.length ?? null, result?.warnings.join(' ') ?? null],
    problems.map(({ code }) => code).join(' '),
    problems.map(problemSentence).join('; '),
    problems.map(placeText).join('; '),
  ]);
}

/** Where a problem stands: 'homes.csv:17:5'. */
export function placeText({ file, line, column }: Problem): string {
  return visibleText([file, line, column].filter((part) => part !== undefined).join(':'));
}

/** Part of a table of distributions: which rows it is about. */
export interface SummaryGroup {
  /** 'all', or the name of an axis. */
  readonly axis: string;
  readonly value: Cell;
}

const SPREAD = ['count', 'mean', 'least', 'q10', 'q25', 'median', 'q75', 'q90', 'most'] as const;

/** The names of the columns of the summary, as one line. */
export function summaryHeader(): string {
  return csvLine(['figure', 'unit', 'axis', 'value', ...SPREAD]);
}

/** One figure over one group of rows, as a line of the summary. */
export function summaryLine(
  figure: ReturnType<typeof figureColumns>[number],
  { axis, value }: SummaryGroup,
  spread: Distribution,
): string {
  const cells = SPREAD.map((name) => spread[name]);
  const shownValue = typeof value === 'string' ? visibleText(value) : value;
  return csvLine([figure.name, figure.unit, visibleText(axis), shownValue, ...cells]);
}

function csvLine(cells: readonly Cell[]): string {
  return `${Papa.unparse([[...cells]], { newline: '\n', escapeFormulae: FORMULA_START })}\n`;
}
