import { newColumns, type YearColumns } from '../columns.ts';
import { AT } from '../hourScratch.ts';
import type { YearPlan } from '../yearPlan.ts';

/** An hour of a simulated year that is run once more, stage by stage, so that each stage's figures can be read. */
export interface HourAgain {
  readonly plan: YearPlan;
  /** The simulated year; only read. */
  readonly year: YearColumns;
  readonly i: number;
  /** Columns of the second run; the stages fill the entry `i`. */
  readonly c: YearColumns;
  /** Scratch of the stages, by the places of AT. */
  readonly hour: Float64Array;
  /** Heat left from the hour before, kWh; always 0 with a house with mass. */
  readonly waiting: number;
}

/**
 * Makes an hour ready to be run once more.
 *
 * @param plan the plan that was simulated
 * @param year its columns
 * @param i 0 … hours − 1
 */
export function hourAgain(plan: YearPlan, year: YearColumns, i: number): HourAgain {
  const waiting = plan.house.mass === null && i > 0 ? year.waitingHeat[i - 1] : 0;
  return { plan, year, i, c: newColumns(year.hours), hour: new Float64Array(AT.size), waiting };
}

/** Whether any space heat is asked in the hour: of its own need, or waiting from the hour before. */
export function asksSpaceHeat({ c, i, waiting }: HourAgain): boolean {
  return c.spaceHeatNeed[i] > 0 || waiting > 0;
}
