import { waterFlowTemperatures } from '../../sim/waterFlow.ts';
import { densityField } from '../charts/densityField.ts';
import { type Markup, markup } from '../charts/markup.ts';
import { chartFigure } from './chartFigure.ts';
import { COP_LEVELS, copField, wholeFives } from './copContours.ts';
import { figureColumns } from './dataTable.ts';
import type { ReportInput } from './reportInput.ts';

/** Edge of a cell, K. */
const CELL = 2;

/** Heat of the unit by cell of outdoor and flow temperature; kWh. */
export interface HeatCell {
  /** Colder and lower edge, °C. */
  readonly x: number;
  readonly y: number;
  readonly amount: number;
}

/**
 * Where the year is spent: the unit's heat by outdoor temperature and the flow that it gives, to the rooms or the cylinder.
 *
 * @returns cells of 2 K × 2 K that hold heat, coldest first; their sum is all heat of the unit
 */
export function heatCells({ columns: c, plan }: ReportInput['answer']): HeatCell[] {
  const { highestFlow } = plan.unitOnWeather;
  const waterFlow = waterFlowTemperatures(plan);
  const cells = new Map<string, HeatCell>();
  const add = (outdoor: number, flow: number, heat: number) => {
    const x = CELL * Math.floor(outdoor / CELL);
    const y = CELL * Math.floor(flow / CELL);
    const key = `${x} ${y}`;
    cells.set(key, { x, y, amount: (cells.get(key)?.amount ?? 0) + heat });
  };
  for (let i = 0; i < c.hours; i++) {
    const outdoor = plan.weather.temperature[i];
    if (c.heatPumpSpaceHeat[i] > 0) {
      add(outdoor, Math.min(c.flowTemperature[i], highestFlow[i]), c.heatPumpSpaceHeat[i]);
    }
    if (c.heatPumpWaterHeat[i] > 0) add(outdoor, waterFlow[i], c.heatPumpWaterHeat[i]);
  }
  return [...cells.values()].sort((a, b) => a.x - b.x || a.y - b.y);
}

/** The field with the unit's COP over it; a sentence where the unit gives no heat. */
export function whereSpent(input: ReportInput): Markup {
  const { answer, words, figures } = input;
  const { spent: said } = words;
  const cells = heatCells(answer);
  if (cells.length === 0) return markup`<p>${said.none}</p>`;
  const { outdoor, flow } = answer.plan.unitOnWeather.unit.full;
  const xRange = wholeFives([...cells.map(({ x }) => x), ...cells.map(({ x }) => x + CELL), outdoor[0]]);
  const yRange = wholeFives([...cells.flatMap(({ y }) => [y, y + CELL]), ...flow]);
  const { fullLoad } = answer.loaded.unit;
  const points = fullLoad.cop.flatMap((cop, i): [number, number][] => {
    const row = Math.floor(i / flow.length);
    return cop === null || outdoor[row] > xRange[1] ? [] : [[outdoor[row], flow[i % flow.length]]];
  });
  const middle = cells.reduce((best, cell) => (cell.amount > best.amount ? cell : best));
  const edge = (from: number) => `${figures.number(from, 0)}\u00a0…\u00a0${figures.number(from + CELL, 0)}\u00a0°C`;
  const says = said.says({
    outdoor: edge(middle.x),
    flow: edge(middle.y),
  });
  return chartFigure({
    title: said.title,
    chart: densityField({
      ...{ id: 'where-spent', title: said.title, description: says, cells, cellWidth: CELL, cellHeight: CELL },
      ...{
        contours: copField(answer.plan.unitOnWeather.unit.full, xRange, yRange),
        levels: COP_LEVELS,
        points,
        xRange,
        yRange,
      },
      written: figures.number,
      ...{ xTitle: said.outdoor, yTitle: said.flow },
    }),
    legend: [],
    says: `${says} ${said.reading}`,
    table: heatTable(cells, input),
    figures: words.figures,
  });
}

function heatTable(cells: readonly HeatCell[], { words, figures }: ReportInput) {
  const flows = [...new Set(cells.map(({ y }) => y))].sort((a, b) => a - b);
  const outdoors = [...new Set(cells.map(({ x }) => x))];
  const edge = (from: number) => `${figures.number(from, 0)} … ${figures.number(from + CELL, 0)} °C`;
  return {
    caption: words.spent.caption,
    columns: figureColumns(words.spent.outdoor, flows.map(edge)),
    rows: outdoors.map((x) => [
      edge(x),
      ...flows.map((y) => {
        const cell = cells.find((known) => known.x === x && known.y === y);
        return cell === undefined ? '' : figures.number(cell.amount, 0);
      }),
    ]),
  };
}
