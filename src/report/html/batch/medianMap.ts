import { fiveQuantiles } from '../../../batch/fiveQuantiles.ts';
import { partedValues } from '../../../batch/partedValues.ts';
import { type HomesOfYears, homesOfYears, valueGroups, valueNames, valueOfJob, variedAxes } from './axisValues.ts';
import type { BatchReportInput } from './batchReportInput.ts';

/** Homes stand in so many groups at most, by their own median. */
const HOME_GROUPS = 5;
/** Rows of the map at most; of an axis with more values neighbours stand together. */
const MOST_ROWS = 24;

type Input = Pick<BatchReportInput, 'manifest' | 'years' | 'by' | 'axes'>;

/** One side of the map. */
export interface MapSide {
  /** Name of the axis; undefined for groups of homes. */
  readonly axis: string | undefined;
  readonly names: readonly string[];
  /** Values of the axis that stand together. */
  readonly size: number;
}

/** Medians by two things. */
export interface MedianMap {
  readonly down: MapSide;
  readonly across: MapSide;
  /** Row by row; undefined where no year has the figure. */
  readonly medians: readonly (number | undefined)[];
}

/** Why there is no map: one axis alone is varied, or none. */
export type NoMap = 'oneAxis' | 'noAxis';

/** A side, and the group of each year along it; −1 where a year is in none. */
interface Side {
  readonly side: MapSide;
  readonly groupOf: (place: number) => number;
}

/**
 * The median of the criterion by two axes, or by an axis and groups of homes, over all else.
 *
 * @param input of the report; the axes with most values are taken where it names none
 * @param columns most groups side by side, at least 1
 * @returns why there is none where the batch varies too little
 */
export function medianMap(input: Input, columns: number): MedianMap | NoMap {
  const [first, second] = chosenAxes(input);
  if (first === undefined) return 'noAxis';
  const down = axisSide(input, first, MOST_ROWS);
  const across = second === undefined ? homeSide(input) : axisSide(input, second, columns);
  if (across === undefined) return 'oneAxis';
  const width = across.side.names.length;
  const cells = partedValues(input.years.figures[input.by], down.side.names.length * width, (place) => {
    const column = across.groupOf(place);
    return column < 0 ? -1 : down.groupOf(place) * width + column;
  });
  return { down: down.side, across: across.side, medians: cells.map((values) => fiveQuantiles(values)?.median) };
}

function chosenAxes({ manifest, axes }: Input): number[] {
  if (axes === undefined) return variedAxes(manifest);
  return axes.map((name) => manifest.axes.findIndex((axis) => axis.name === name)).filter((axis) => axis >= 0);
}

function axisSide({ manifest, years }: Input, axis: number, most: number): Side {
  const { names, size } = valueGroups(valueNames(manifest.axes[axis]), most);
  const valueAt = valueOfJob(manifest, axis);
  return {
    side: { axis: manifest.axes[axis].name, names, size },
    groupOf: (place) => Math.floor(valueAt(years.jobs[place]) / size),
  };
}

/** Homes in groups of equal number, the least median first; undefined where there is one home. */
function homeSide(input: Input): Side | undefined {
  const { medians, homes } = homeMedians(input);
  const order = [...medians.keys()].filter((home) => !Number.isNaN(medians[home]));
  if (order.length < 2) return undefined;
  order.sort((a, b) => medians[a] - medians[b]);
  const groups = Math.min(HOME_GROUPS, order.length);
  const groupOfHome = new Int8Array(medians.length).fill(-1);
  for (const [rank, home] of order.entries()) groupOfHome[home] = Math.floor((rank * groups) / order.length);
  const names = Array.from({ length: groups }, (_, g) => `${g + 1}/${groups}`);
  return { side: { axis: undefined, names, size: 1 }, groupOf: (place) => groupOfHome[homes.of[place]] };
}

/**
 * The median of the criterion in each home, over its options.
 *
 * @returns one a home that has years, in the order of the plan; NaN where no year of the home has the figure
 */
export function homeMedians({ manifest, years, by }: Omit<Input, 'axes'>): {
  readonly medians: Float64Array;
  readonly homes: HomesOfYears;
} {
  const homes = homesOfYears(years.jobs, manifest.options);
  const parts = partedValues(years.figures[by], homes.count, (place) => homes.of[place]);
  return { medians: Float64Array.from(parts, (values) => fiveQuantiles(values)?.median ?? Number.NaN), homes };
}
