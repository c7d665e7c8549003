import { scaleLinear } from 'd3-scale';

/** How many values lie in a class, from its lower edge up to the next class. */
export interface ValueClass {
  readonly from: number;
  readonly to: number;
  readonly count: number;
}

/** Classes that are wished for; the edges are round numbers, so there may be half as many or twice. */
const WISHED = 14;
/** A value on an edge may lie a rounding below it. */
const ROUNDING = 1e-9;

/**
 * Values counted in classes with round edges.
 *
 * @param values any numbers; those that are NaN are left out
 * @returns every class from the least value to the greatest; one alone where all values are the same, none without values
 * @example valueClasses(Float64Array.of(1, 1, 1))[0].count // 3
 */
export function valueClasses(values: Float64Array): ValueClass[] {
  const known = values.filter((value) => !Number.isNaN(value));
  if (known.length === 0) return [];
  const least = known.reduce((low, value) => Math.min(low, value));
  const most = known.reduce((high, value) => Math.max(high, value));
  const ticks = scaleLinear().domain([least, most]).ticks(WISHED);
  const step = ticks.length > 1 ? ticks[1] - ticks[0] : 0;
  if (step <= 0) return [{ from: least, to: most, count: known.length }];
  const classOf = (value: number) => Math.floor(value / step + ROUNDING);
  const first = classOf(least);
  const counts = new Float64Array(classOf(most) - first + 1);
  for (const value of known) counts[classOf(value) - first]++;
  const edge = (k: number) => Number(((first + k) * step).toPrecision(12));
  return Array.from(counts, (count, k) => ({ from: edge(k), to: edge(k + 1), count }));
}

/**
 * Decimals that tell the edges of classes apart.
 *
 * @example edgeDecimals([{ from: 2.5, to: 2.75, count: 1 }]) // 2
 */
export function edgeDecimals(classes: readonly ValueClass[]): number {
  for (let decimals = 0; decimals < 6; decimals++) {
    const isExact = ({ from, to }: ValueClass) =>
      Math.abs(Number((to - from).toFixed(decimals)) - (to - from)) <= ROUNDING * (to - from);
    if (classes.every(isExact)) return decimals;
  }
  return 6;
}
