import { type Criterion, criteria } from '../../../batch/ranking.ts';
import type { RampName } from '../../charts/colourRamp.ts';
import { columnRoom, heatMap, mostColumns, ROW_ROOM } from '../../charts/heatMap.ts';
import { type Markup, markup } from '../../charts/markup.ts';
import { textWidth } from '../../charts/textWidth.ts';
import { chartFigure } from '../chartFigure.ts';
import { figureColumns } from '../dataTable.ts';
import type { BatchReportInput } from './batchReportInput.ts';
import { type MapSide, type MedianMap, medianMap } from './medianMap.ts';
import { cellName, quantityOf, textName, written } from './writtenFigures.ts';

/** Letters of a title of a side. */
const LONGEST_TITLE = 30;

const RAMPS: Readonly<Record<Criterion, RampName>> = {
  cost: 'price',
  carbon: 'energy',
  seasonalFactor: 'warmth',
  backupHours: 'energy',
};

/** The map of medians as a figure; a sentence that says why where there is none. */
export function batchMap(input: BatchReportInput): Markup | string {
  const { words } = input;
  const { map: said } = words.batch;
  const map = medianMap(input, mostColumns(widestFigure(input)));
  if (map === 'noAxis' || map === 'oneAxis') return said[map];
  const best = bestCell(map, criteria[input.by].best === 'least' ? 1 : -1);
  if (best === undefined) return said.empty;
  const title = said.title({ down: sideName(input, map.down), across: sideName(input, map.across) });
  const says = said.says({
    ...{ quantity: quantityOf(input), best: written(input, best.value) },
    ...{ down: textName(map.down.names[best.row]), across: textName(map.across.names[best.column]) },
  });
  const down = keyed(map.down.names, ROW_ROOM, (i) => String(i + 1));
  const across = keyed(map.across.names, columnRoom(down.labels, map.across.names.length) - 3, letters);
  return chartFigure({
    title,
    chart: heatMap({
      ...{ id: 'medians', title, description: says, values: map.medians, ramp: RAMPS[input.by] },
      ...{ rows: down.labels, columns: across.labels },
      ...{ rowTitle: axisTitle(input, map.down), columnTitle: axisTitle(input, map.across) },
      ...{ decimals: criteria[input.by].decimals, written: input.figures.number },
    }),
    legend: [...across.legend, ...down.legend],
    says: [says, ...notes(input, map)].join(' '),
    table: tableOf(input, map),
    figures: words.figures,
  });
}

/** The longest figure of any year, as it is written: no median is longer. */
function widestFigure({ years, by, figures }: BatchReportInput): string {
  const most = years.figures[by].reduce((high, value) => Math.max(high, Math.abs(value) || 0), 0);
  const sign = years.figures[by].some((value) => value < 0) ? -1 : 1;
  return figures.number(sign * most, criteria[by].decimals);
}

function bestCell(
  { medians, across }: MedianMap,
  sign: number,
): { value: number; row: number; column: number } | undefined {
  const known = medians.flatMap((value, cell) => (value === undefined ? [] : [{ value, cell }]));
  if (known.length === 0) return undefined;
  const { value, cell } = known.reduce((best, other) => (sign * other.value < sign * best.value ? other : best));
  const width = across.names.length;
  return { value, row: Math.floor(cell / width), column: cell % width };
}

function sideName({ words }: BatchReportInput, { axis }: MapSide): string {
  return axis === undefined ? words.batch.map.homeGroups : textName(axis);
}

/** The name of a side as it fits beside the other. */
function axisTitle(input: BatchReportInput, side: MapSide): string {
  const name = [...sideName(input, side)];
  return name.length > LONGEST_TITLE ? `${name.slice(0, LONGEST_TITLE - 1).join('')}…` : name.join('');
}

function notes({ words, figures }: BatchReportInput, { down, across }: MedianMap): string[] {
  const { map: said } = words.batch;
  const grouped = [down, across].flatMap(({ axis, size }) =>
    axis === undefined || size === 1 ? [] : [said.grouped({ axis: textName(axis), size: figures.number(size, 0) })],
  );
  return across.axis === undefined ? [said.homesSay, ...grouped] : grouped;
}

/** Names as they stand in the drawing: as they are where all have room, else signs that a legend explains. */
function keyed(
  names: readonly string[],
  room: number,
  sign: (i: number) => string,
): { labels: string[]; legend: (readonly [Markup, string])[] } {
  const whole = names.map(textName);
  if (whole.every((name) => textWidth(name) <= room)) return { labels: whole, legend: [] };
  return { labels: names.map((_, i) => sign(i)), legend: whole.map((name, i) => [markup`<b>${sign(i)}</b>`, name]) };
}

const LETTERS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZ';

function letters(i: number): string {
  return LETTERS.charAt(i % LETTERS.length);
}

function tableOf(input: BatchReportInput, { down, across, medians }: MedianMap) {
  const { figures, words, by } = input;
  const width = across.names.length;
  const names = { down: sideName(input, down), across: sideName(input, across) };
  return {
    caption: words.batch.map.caption({ quantity: quantityOf(input), ...names }),
    columns: figureColumns(names.down, across.names.map(cellName)),
    rows: down.names.map((name, row) => [
      cellName(name),
      ...across.names.map((_, column) => {
        const value = medians[row * width + column];
        return value === undefined ? '–' : figures.number(value, criteria[by].decimals);
      }),
    ]),
  };
}
