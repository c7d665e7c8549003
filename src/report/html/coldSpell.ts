import { columnSum } from '../../core/columnSum.ts';
import { together } from '../charts/chartFrame.ts';
import { lineChart } from '../charts/lineChart.ts';
import type { Markup } from '../charts/markup.ts';
import { lineSample, sample } from '../charts/texture.ts';
import { standardStamp } from '../hourStamps.ts';
import { chartFigure } from './chartFigure.ts';
import { figureColumns } from './dataTable.ts';
import type { ReportInput } from './reportInput.ts';

const DAY = 24;
const WEEK = 7 * DAY;

/**
 * The first hour of the coldest week: seven whole days of standard time with the lowest mean.
 *
 * @param temperature by hour, °C, at least a week
 * @returns a whole number of days, in hours; the earliest at ties
 */
export function coldestWeek(temperature: Float64Array): number {
  let best = 0;
  let least = Number.POSITIVE_INFINITY;
  for (let from = 0; from + WEEK <= temperature.length; from += DAY) {
    const sum = columnSum(temperature, from, from + WEEK);
    if (sum < least) {
      least = sum;
      best = from;
    }
  }
  return best;
}

/** The coldest week hour by hour: what the rooms need, what gives it, and the temperatures outside and of the flow. */
export function coldSpell(input: ReportInput): Markup {
  const { answer, words, figures } = input;
  const { cold: said } = words;
  const { columns: c, plan } = answer;
  const from = coldestWeek(plan.weather.temperature);
  const hours = Array.from({ length: WEEK }, (_, i) => from + i);
  const mean = columnSum(plan.weather.temperature, from, from + WEEK) / WEEK;
  const stamp = (hour: number) => standardStamp(answer.loaded.clock, hour).slice(5, 16).replace('T', ' ');
  const says = said.says({ from: stamp(from).slice(0, 5), mean: `${figures.number(mean, 1)} °C` });
  const chart = together([heatOfWeek(input, hours, says), temperaturesOfWeek(input, hours)]);
  return chartFigure({
    title: said.title,
    chart,
    legend: [
      [sample({ tone: 6, texture: 'plain' }), said.heatPump],
      [sample({ tone: 3, texture: 'plain' }), said.backup],
      [lineSample(3), said.need],
      [lineSample(2), said.flow],
      [lineSample(1), said.outdoor],
    ],
    says,
    table: {
      caption: said.caption,
      columns: figureColumns(said.hour, [
        `${said.outdoor}, °C`,
        `${said.flow}, °C`,
        `${said.need}, kWh`,
        `${said.heatPump}, kWh`,
        `${said.backup}, kWh`,
        `${said.electricity}, kWh`,
      ]),
      rows: hours.map((i) => [
        stamp(i),
        figures.number(plan.weather.temperature[i], 1),
        c.flowTemperature[i] === 0 ? '–' : figures.number(c.flowTemperature[i], 1),
        ...[c.spaceHeatNeed[i], c.heatPumpSpaceHeat[i], c.backupSpaceHeat[i], c.electricity[i]].map((value) =>
          figures.number(value, 2),
        ),
      ]),
    },
    figures: words.figures,
  });
}

/** Days of the week and its hours, with an end behind the last so that it is drawn too. */
function frameOf({ answer }: ReportInput, hours: readonly number[]) {
  const { clock } = answer.loaded;
  const days = Array.from({ length: 7 }, (_, day) => ({
    at: day * DAY,
    label: standardStamp(clock, hours[day * DAY]).slice(5, 10),
  }));
  const x = [...hours.map((_, i) => i), WEEK];
  const of = (column: ArrayLike<number>) => [...hours.map((i) => column[i]), column[hours[WEEK - 1]]];
  return { x, of, xTicks: days, xRange: [0, WEEK] as const, steps: true, marks: [], xTitle: '' };
}

function heatOfWeek(input: ReportInput, hours: readonly number[], description: string): Markup {
  const { answer, words, figures } = input;
  const { of, ...frame } = frameOf(input, hours);
  const { x } = frame;
  const heatPump = of(answer.columns.heatPumpSpaceHeat);
  const both = of(answer.columns.backupSpaceHeat).map((heat, i) => heat + heatPump[i]);
  return lineChart({
    ...frame,
    ...{ id: 'cold-heat', title: words.cold.heatTitle, description, yTitle: 'kW' },
    series: [
      { kind: 6, x, y: heatPump, from: x.map(() => 0) },
      { kind: 3, x, y: both, from: heatPump },
      { kind: 3, x, y: of(answer.columns.spaceHeatNeed) },
    ],
    written: figures.number,
  });
}

function temperaturesOfWeek(input: ReportInput, hours: readonly number[]): Markup {
  const { answer, words, figures } = input;
  const { of, ...frame } = frameOf(input, hours);
  const { x } = frame;
  const flow = of(answer.columns.flowTemperature);
  const asked = x.filter((_, i) => flow[i] > 0);
  return lineChart({
    ...frame,
    ...{ id: 'cold-temperatures', title: words.cold.temperaturesTitle, description: words.cold.temperaturesSay },
    ...{ yTitle: '°C', height: 150 },
    series: [
      { kind: 1, x, y: of(answer.plan.weather.temperature) },
      { kind: 2, x: asked, y: asked.map((i) => flow[i]) },
    ],
    written: figures.number,
  });
}
