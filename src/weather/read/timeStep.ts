import type { Findings } from './findings.ts';

const MINUTES_PER_HOUR = 60;

/** How the rows follow each other. */
export interface RowOrder {
  /** Minutes between most neighbouring rows. */
  readonly step: number;
  /** Whether the file runs backwards in time. */
  readonly backwards: boolean;
}

/** From one row to the next, minutes: negative where the file runs backwards. */
export function strideOf({ step, backwards }: RowOrder): number {
  return backwards ? -step : step;
}

/**
 * The step of the rows: the commonest distance between neighbours, so that jumps between the months of a typical year,
 * gaps and clock changes do not matter.
 *
 * @param minutes stamps in the order of the file; NaN where one could not be read
 * @returns nothing where no two neighbouring stamps differ
 * @example findRowOrder(Float64Array.of(0, 60, 120))?.step // 60
 */
export function findRowOrder(minutes: Float64Array): RowOrder | undefined {
  const counts = new Map<number, number>();
  for (let i = 1; i < minutes.length; i++) {
    const distance = (minutes[i] as number) - (minutes[i - 1] as number);
    if (distance !== 0 && !Number.isNaN(distance)) counts.set(distance, (counts.get(distance) ?? 0) + 1);
  }
  let commonest: number | undefined;
  let most = 0;
  for (const [distance, count] of counts) {
    if (count <= most) continue;
    commonest = distance;
    most = count;
  }
  return commonest === undefined ? undefined : { step: Math.abs(commonest), backwards: commonest < 0 };
}

/**
 * Whether a step can be laid on hours, with a problem if it cannot.
 *
 * @param step minutes; allowed are 60 and its whole parts
 */
export function isUsableStep(step: number, findings: Findings): boolean {
  if (step > MINUTES_PER_HOUR) {
    findings.add({ code: 'weather.coarse-step', severity: 'error', found: stepText(step) });
    return false;
  }
  if (MINUTES_PER_HOUR % step !== 0) {
    findings.add({ code: 'weather.odd-step', severity: 'error', found: stepText(step) });
    return false;
  }
  return true;
}

/** A step for people. */
export function stepText(minutes: number): string {
  if (minutes % 1440 === 0) return minutes === 1440 ? '1 day' : `${minutes / 1440} days`;
  if (minutes % 60 === 0) return minutes === 60 ? '1 hour' : `${minutes / 60} hours`;
  return minutes === 1 ? '1 minute' : `${minutes} minutes`;
}
