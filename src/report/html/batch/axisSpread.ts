import { type FiveQuantiles, fiveQuantiles } from '../../../batch/fiveQuantiles.ts';
import { partedValues } from '../../../batch/partedValues.ts';
import { criteria } from '../../../batch/ranking.ts';
import { valueGroups, valueNames, valueOfJob, variedAxes } from './axisValues.ts';
import type { BatchReportInput } from './batchReportInput.ts';

/** Values of an axis that are set side by side; of an axis with more values neighbours stand together. */
const MOST_VALUES = 16;

type Input = Pick<BatchReportInput, 'manifest' | 'years' | 'by'>;

/** The spread of the criterion at a value of an axis. */
export interface ValueSpread {
  readonly name: string;
  /** Undefined where no year has the figure. */
  readonly spread: FiveQuantiles | undefined;
}

/** An axis with the spread at each of its values. */
export interface AxisSpread {
  readonly axis: string;
  /** Values that stand together. */
  readonly size: number;
  /** In the order of the plan. */
  readonly values: readonly ValueSpread[];
}

/**
 * How the criterion is spread at each value of each axis that is varied, over all else.
 *
 * @returns axes in the order of the plan
 */
export function axisSpreads(input: Input): AxisSpread[] {
  return inOrder(input).map((axis) => {
    const { names, size } = valueGroups(valueNames(input.manifest.axes[axis]), MOST_VALUES);
    const parts = partsBy(input, axis, size);
    const values = names.map((name, g) => ({ name, spread: fiveQuantiles(parts[g]) }));
    return { axis: input.manifest.axes[axis].name, size, values };
  });
}

/** The value of an axis that does best at the median. */
export interface BestValue {
  readonly axis: string;
  readonly name: string;
  readonly median: number;
}

/**
 * The best value of each axis that is varied, each value by itself.
 *
 * @returns axes in the order of the plan; one is left out where fewer than two of its values have the figure
 */
export function bestValues(input: Input): BestValue[] {
  const sign = criteria[input.by].best === 'least' ? 1 : -1;
  return inOrder(input).flatMap((axis) => {
    const names = valueNames(input.manifest.axes[axis]);
    const known = partsBy(input, axis, 1).flatMap((values, v) => {
      const median = fiveQuantiles(values)?.median;
      return median === undefined ? [] : [{ axis: input.manifest.axes[axis].name, name: names[v], median }];
    });
    if (known.length < 2) return [];
    return [known.reduce((best, other) => (sign * other.median < sign * best.median ? other : best))];
  });
}

function inOrder({ manifest }: Input): number[] {
  return variedAxes(manifest).sort((a, b) => a - b);
}

function partsBy({ manifest, years, by }: Input, axis: number, size: number): Float64Array[] {
  const valueAt = valueOfJob(manifest, axis);
  const groups = Math.ceil(manifest.axes[axis].values.length / size);
  return partedValues(years.figures[by], groups, (place) => Math.floor(valueAt(years.jobs[place]) / size));
}
