import { shown } from '../../../core/problem.ts';
import type { BatchManifest } from '../../batchManifest.ts';

type Axis = BatchManifest['axes'][number];

/** Which value of an axis a job takes, counted from 0. */
export type ValueOfJob = (job: number) => number;

/**
 * How the value of an axis follows from the number of a job: the last axis changes first, the homes last.
 *
 * @param axis place of the axis in the manifest
 * @example valueOfJob({ axes: [{ name: 'a', values: [1, 2] }, { name: 'b', values: [5, 6, 7] }] }, 0)(4) // 1
 */
export function valueOfJob({ axes }: Pick<BatchManifest, 'axes'>, axis: number): ValueOfJob {
  const repeat = axes.slice(axis + 1).reduce((product, { values }) => product * values.length, 1);
  const count = axes[axis].values.length;
  return (job) => Math.floor((job - 1) / repeat) % count;
}

/** The homes of a batch that have years. */
export interface HomesOfYears {
  readonly count: number;
  /** Which home each year is of, counted from 0 in the order of the plan. */
  readonly of: Int32Array;
}

/**
 * Which home each year is of.
 *
 * @param jobs numbers of the jobs, each greater than the one before it
 * @param options years of a home
 * @example homesOfYears(Float64Array.of(1, 2, 5), 2).count // 2
 */
export function homesOfYears(jobs: Float64Array, options: number): HomesOfYears {
  const of = new Int32Array(jobs.length);
  let [count, last] = [0, -1];
  for (let place = 0; place < jobs.length; place++) {
    const home = Math.floor((jobs[place] - 1) / options);
    if (home !== last) count++;
    last = home;
    of[place] = count - 1;
  }
  return { count, of };
}

/** Places of the axes that have more than one value, the one with the most first; of equals the earlier one. */
export function variedAxes({ axes }: Pick<BatchManifest, 'axes'>): number[] {
  return axes
    .map((_, axis) => axis)
    .filter((axis) => axes[axis].values.length > 1)
    .sort((a, b) => axes[b].values.length - axes[a].values.length);
}

const FILE_NAME = /^(?:.*\/)?([^/]+)\.(?:yaml|yml|csv)$/i;

/**
 * Values of an axis as they are written: names of files without their folder and ending, where that still tells them apart.
 *
 * @example valueNames({ name: 'unit', values: ['units/a-8.yaml', 'units/b-6.yaml'] }) // ['a-8', 'b-6']
 */
export function valueNames({ values }: Axis): string[] {
  const whole = values.map(String);
  const short = whole.map((value) => FILE_NAME.exec(value)?.[1] ?? value);
  return new Set(short).size === whole.length ? short : whole;
}

/** Letters of the first and the last name of a group. */
const LONGEST_END = 18;

/** Neighbouring values of an axis that are drawn as one. */
export interface ValueGroups {
  readonly names: readonly string[];
  /** How many values stand together; the last group may hold fewer. */
  readonly size: number;
}

/**
 * Values of an axis in so few groups of neighbours that they can be drawn.
 *
 * @param names of the values, in their order
 * @param most groups, at least 1
 * @returns a group is called by its first and its last value
 * @example valueGroups(['1', '2', '3', '4', '5'], 3).names // ['1 … 2', '3 … 4', '5']
 */
export function valueGroups(names: readonly string[], most: number): ValueGroups {
  const size = Math.max(1, Math.ceil(names.length / most));
  const groups = Array.from({ length: Math.ceil(names.length / size) }, (_, g) => {
    const [first, last] = [names[g * size], names[Math.min((g + 1) * size, names.length) - 1]];
    return first === last ? first : `${shown(first, LONGEST_END)} … ${shown(last, LONGEST_END)}`;
  });
  return { names: groups, size };
}
