import { type FiveQuantiles, fiveQuantiles } from '../../../batch/fiveQuantiles.ts';
import { criteria } from '../../../batch/ranking.ts';
import type { Markup } from '../../charts/markup.ts';
import { quantileBoxes } from '../../charts/quantileBoxes.ts';
import { stackedBars } from '../../charts/stackedBars.ts';
import type { Look } from '../../charts/texture.ts';
import { chartFigure } from '../chartFigure.ts';
import { figureColumns } from '../dataTable.ts';
import { type AxisSpread, axisSpreads } from './axisSpread.ts';
import type { BatchReportInput } from './batchReportInput.ts';
import { homeMedians } from './medianMap.ts';
import { edgeDecimals, type ValueClass, valueClasses } from './valueClasses.ts';
import { cellName, quantityOf, textName, written } from './writtenFigures.ts';

const YEARS: Look = { tone: 1, texture: 'plain' };
const HOMES: Look = { tone: 2, texture: 'rising' };
/** So many edges of classes find room below the bars. */
const MOST_EDGES = 7;

/** The spread at the values of each axis, a figure an axis. */
export function spreadFigures(input: BatchReportInput): Markup[] {
  return axisSpreads(input).flatMap((axis, i) => {
    const figure = spreadFigure(input, axis, i);
    return figure === undefined ? [] : [figure];
  });
}

function spreadFigure(input: BatchReportInput, { axis, size, values }: AxisSpread, i: number): Markup | undefined {
  const { words, figures, by, years } = input;
  const { spread: said, map } = words.batch;
  const sign = criteria[by].best === 'least' ? 1 : -1;
  const known = values.flatMap(({ name, spread }) => (spread === undefined ? [] : [{ name, ...spread }]));
  if (known.length === 0) return undefined;
  const best = known.reduce((first, other) => (sign * other.median < sign * first.median ? other : first));
  const title = said.title(textName(axis));
  const says = [
    said.says({ best: textName(best.name), median: written(input, best.median) }),
    ...(size > 1 ? [map.grouped({ axis: textName(axis), size: figures.number(size, 0) })] : []),
    ...(years.failed > 0 ? [said.unequal] : []),
  ].join(' ');
  return chartFigure({
    title,
    chart: quantileBoxes({
      ...{ id: `spread-${i + 1}`, title, description: says, quantity: quantityOf(input) },
      ...{ decimals: criteria[by].decimals, written: figures.number },
      boxes: known.map((box) => ({ ...box, name: textName(box.name) })),
    }),
    legend: [],
    says,
    table: {
      caption: said.caption({ axis: textName(axis), quantity: quantityOf(input) }),
      columns: figureColumns(textName(axis), quantileHeadings(input)),
      rows: values.map(({ name, spread }) => [cellName(name), ...quantileCells(input, spread)]),
    },
    figures: words.figures,
  });
}

function quantileHeadings({ words, figures }: BatchReportInput): string[] {
  const share = (value: number) => figures.percent(value);
  return [words.batch.years, share(0.05), share(0.25), words.batch.median, share(0.75), share(0.95)];
}

function quantileCells({ figures, by }: BatchReportInput, spread: FiveQuantiles | undefined): string[] {
  if (spread === undefined) return [figures.number(0, 0), '–', '–', '–', '–', '–'];
  const { count, q05, q25, median, q75, q95 } = spread;
  const cells = [q05, q25, median, q75, q95].map((value) => figures.number(value, criteria[by].decimals));
  return [figures.number(count, 0), ...cells];
}

/** The years by class of the criterion, and the homes where there are several with several options. */
export function histograms(input: BatchReportInput): Markup[] {
  const { years, by, words, manifest } = input;
  const { histogram: said } = words.batch;
  const quantity = quantityOf(input);
  const ofYears = histogram(input, years.figures[by], {
    ...{ id: 'years', title: said.years, counted: said.countOfYears, look: YEARS, more: '' },
    caption: said.caption(quantity),
  });
  if (manifest.homes < 2 || manifest.options < 2) return ofYears;
  return [
    ...ofYears,
    ...histogram(input, homeMedians(input).medians, {
      ...{ id: 'homes', title: said.homes, counted: said.countOfHomes, look: HOMES, more: said.homesSay },
      caption: said.homesCaption(quantity),
    }),
  ];
}

interface Histogram {
  readonly id: string;
  readonly title: string;
  readonly counted: string;
  readonly caption: string;
  readonly look: Look;
  /** What is said beside the figures. */
  readonly more: string;
}

function histogram(input: BatchReportInput, values: Float64Array, about: Histogram): Markup[] {
  const { words, figures } = input;
  const { histogram: said } = words.batch;
  const classes = valueClasses(values);
  const spread = fiveQuantiles(values);
  if (spread === undefined) return [];
  const decimals = classes.length > 1 ? edgeDecimals(classes) : criteria[input.by].decimals;
  const edge = (value: number) => figures.number(value, decimals);
  const range = ({ from, to }: ValueClass) => (from === to ? edge(from) : `${edge(from)} … ${edge(to)}`);
  const most = classes.reduce((high, other) => (other.count > high.count ? other : high));
  const facts = { low: written(input, spread.q05), high: written(input, spread.q95), most: range(most) };
  const says = [said.says(facts), ...(about.more === '' ? [] : [about.more])].join(' ');
  const every = Math.ceil(classes.length / MOST_EDGES);
  const chart = stackedBars({
    ...{ id: `histogram-${about.id}`, title: about.title, description: says, quantity: about.counted },
    ...{ categories: quantityOf(input), whole: true, written: figures.number },
    labels: classes.map(({ from }, i) => (i % every === 0 ? edge(from) : '')),
    series: [{ look: about.look, values: classes.map(({ count }) => count) }],
  });
  const table = {
    caption: about.caption,
    columns: figureColumns(said.class, [about.counted]),
    rows: classes.map((each) => [range(each), figures.number(each.count, 0)]),
  };
  return [chartFigure({ title: about.title, chart, legend: [], says, table, figures: words.figures })];
}
