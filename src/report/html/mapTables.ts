import type { PerformanceTable } from '../../sim/performanceTable.ts';
import { type Markup, markup, type Piece } from '../charts/markup.ts';
import { dataTable, figureColumns } from './dataTable.ts';
import type { ReportInput } from './reportInput.ts';

/** Hours and heat to the rooms beyond an edge of the entered table. */
export interface Beyond {
  readonly hours: number;
  /** kWh */
  readonly heat: number;
}

/**
 * Hours in which the unit heats the rooms at a point outside the entered full-load table, by the edge that it lies beyond.
 *
 * @param answer of one scenario
 * @returns an hour beyond two edges counts at both
 */
export function beyondEdges({ columns: c, plan }: ReportInput['answer']) {
  const { outdoor, flow } = plan.unitOnWeather.unit.full;
  const { highestFlow } = plan.unitOnWeather;
  const { temperature } = plan.weather;
  const given = (i: number) => Math.min(c.flowTemperature[i], highestFlow[i]);
  const hours = Array.from(c.heatPumpSpaceHeat.keys()).filter((i) => c.heatPumpSpaceHeat[i] > 0);
  const count = (lies: (hour: number) => boolean): Beyond => {
    const inside = hours.filter(lies);
    return { hours: inside.length, heat: inside.reduce((sum, i) => sum + c.heatPumpSpaceHeat[i], 0) };
  };
  return {
    colder: count((i) => temperature[i] < outdoor[0]),
    warmer: count((i) => temperature[i] > outdoor[outdoor.length - 1]),
    hotter: count((i) => given(i) > flow[flow.length - 1]),
    cooler: count((i) => given(i) < flow[0]),
  };
}

/** The map as entered, level by level, and how much of the year lies outside it. */
export function mapTables(input: ReportInput): Markup[] {
  const { answer, words } = input;
  const { unit } = answer.loaded;
  const { map: said } = words;
  const levels = [{ table: unit.fullLoad, name: said.fullLoad }];
  if (unit.lowestLevel !== undefined) levels.push({ table: unit.lowestLevel, name: said.lowestLevel });
  return [
    ...levels.flatMap(({ table, name }) => [
      pointsTable(input, table, 'capacity', said.capacity(name)),
      pointsTable(input, table, 'cop', said.cop(name)),
    ]),
    edgesTable(input),
  ];
}

function pointsTable(
  { words, figures }: ReportInput,
  table: PerformanceTable,
  quantity: 'capacity' | 'cop',
  caption: string,
): Markup {
  const { map: said } = words;
  const { outdoor, flow } = table;
  const cell = (value: number | null): Piece =>
    value === null ? markup`<span class="gap">${said.gap}</span>` : figures.number(value, 2);
  return dataTable({
    caption,
    columns: figureColumns(
      said.outdoor,
      flow.map((temperature) => `${figures.number(temperature, 0)} °C`),
    ),
    rows: outdoor.map((temperature, row) => [
      `${figures.number(temperature, 0)} °C`,
      ...flow.map((_, column) => cell(table[quantity][row * flow.length + column])),
    ]),
  });
}

function edgesTable({ answer, words, figures }: ReportInput): Markup {
  const { map: said } = words;
  const { outdoor, flow } = answer.plan.unitOnWeather.unit.full;
  const beyond = beyondEdges(answer);
  const temperature = (value: number) => `${figures.number(value, 0)} °C`;
  const rows: [keyof typeof beyond, string][] = [
    ['colder', said.colder(temperature(outdoor[0]))],
    ['warmer', said.warmer(temperature(outdoor[outdoor.length - 1]))],
    ['hotter', said.hotter(temperature(flow[flow.length - 1]))],
    ['cooler', said.cooler(temperature(flow[0]))],
  ];
  return dataTable({
    caption: said.beyond,
    columns: figureColumns(said.edge, [said.hours, said.heat, said.rule]).map((column, i) =>
      i === 3 ? { ...column, figures: false } : column,
    ),
    rows: rows.map(([edge, name]) => [
      beyond[edge].hours > 0 ? markup`<b>▲ ${name}</b>` : name,
      figures.number(beyond[edge].hours, 0),
      figures.number(beyond[edge].heat, 0),
      said.rules[edge],
    ]),
  });
}
