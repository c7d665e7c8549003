import type { Row } from './row.ts';
import { rowFigures, tariffFigures } from './rowColumns.ts';

/**
 * The figures of a row as numbers, in the order of `figureColumns`, behind the number of its job.
 *
 * @param tariffs most tariffs of any job
 * @returns NaN where the row has no such figure, or a word in its place
 */
export function figureValues({ job, result }: Pick<Row, 'job' | 'result'>, tariffs: number): number[] {
  const figures = rowFigures.map(({ name }) => asNumber(result?.figures[name]));
  const costs = Array.from({ length: tariffs }, (_, t) => tariffFigures.map((f) => asNumber(result?.tariffs[t]?.[f])));
  return [job, ...figures, ...costs.flat()];
}

function asNumber(value: number | string | undefined): number {
  return typeof value === 'number' ? value : Number.NaN;
}
