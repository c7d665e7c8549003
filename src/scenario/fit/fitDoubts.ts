import type { Problem } from '../../core/problem.ts';
import { type HeatingSignature, HIGHEST_BASE, LOWEST_BASE } from '../../sim/heatingSignature.ts';

/** Fewer periods than these are called few: a year in steps of two months. Common practice, no source. */
const FEW_PERIODS = 6;
/** Periods with heating that a slope needs to be more than a line through two points. */
const FEW_HEATED = 3;
/** A period with at most this share of its days below the base lies outside the heating season. Ours. */
const MOST_COLD_OF_SUMMER = 0.5;
/**
 * Least R² and highest CV(RMSE) of a line that is believed. ASHRAE Guideline 14 (from memory) asks a CV(RMSE) of at most 15 %
 * of monthly calibrated models, and 20 to 30 % of whole-building baselines by their length; the 25 % and the R² of 0.75 used
 * here are ours, of that order: bills of homes scatter more than those of offices.
 */
export const LEAST_R_SQUARED = 0.75;
export const MOST_CV_RMSE = 0.25;
/** CV(RMSE) that ASHRAE Guideline 14 allows a calibrated model of monthly values (from memory). */
export const GUIDELINE_CV_RMSE = 0.15;
/** Heat loss that a heated home can have, W/K, and for each m² of floor. Common practice, no source. */
const LOSS_RANGE = [15, 5000] as const;
const LOSS_PER_AREA_RANGE = [0.15, 8] as const;

/** Kinds of doubts after which the line is not believed. */
const MISFITS: readonly Problem['code'][] = [
  'readings.poor-line',
  'readings.scatter',
  'readings.base-at-end',
  'readings.implausible-loss',
];

/** What a signature is judged by. */
export interface Judged {
  readonly signature: HeatingSignature;
  /** W/K */
  readonly heatLoss: number;
  /** m², where the scenario knows it. */
  readonly floorArea: number | undefined;
  /** Name of the file of readings. */
  readonly file: string;
}

/** Whether a signature with these doubts may be used. */
export function isBelieved(doubts: readonly Problem[]): boolean {
  return !doubts.some(({ code }) => MISFITS.includes(code));
}

/** What speaks against a signature, as warnings in the order of their weight. */
export function fitDoubts(judged: Judged): Problem[] {
  const { signature, file } = judged;
  const { periods, baseTemperature, rSquared, cvRmse } = signature;
  const doubts: Omit<Problem, 'file' | 'severity'>[] = [];
  if (rSquared < LEAST_R_SQUARED) {
    doubts.push({ code: 'readings.poor-line', found: down(rSquared, 2), allowed: String(LEAST_R_SQUARED) });
  }
  if (cvRmse > MOST_CV_RMSE) {
    doubts.push({ code: 'readings.scatter', found: `${up(100 * cvRmse)} %`, allowed: `${100 * MOST_CV_RMSE} %` });
  }
  if (baseTemperature === LOWEST_BASE || baseTemperature === HIGHEST_BASE) {
    const allowed = `${LOWEST_BASE} to ${HIGHEST_BASE} °C`;
    doubts.push({ code: 'readings.base-at-end', found: `${baseTemperature} °C`, allowed });
  }
  doubts.push(...implausibleLoss(judged));
  if (periods.length < FEW_PERIODS) {
    doubts.push({ code: 'readings.few-periods', found: `${periods.length} periods`, allowed: '12' });
  }
  const heated = periods.filter(({ degreeDays }) => degreeDays > 0).length;
  if (heated < FEW_HEATED) doubts.push({ code: 'readings.few-heated', found: `${heated} periods` });
  if (!periods.some(({ coldShare }) => coldShare <= MOST_COLD_OF_SUMMER)) doubts.push({ code: 'readings.no-summer' });
  return doubts.map((doubt) => ({ ...doubt, severity: 'warning', file }));
}

function implausibleLoss({ heatLoss, floorArea }: Judged): Omit<Problem, 'file' | 'severity'>[] {
  const code = 'readings.implausible-loss';
  if (!isWithin(heatLoss, LOSS_RANGE)) {
    return [{ code, found: String(Number(heatLoss.toPrecision(3))), unit: 'W/K', allowed: LOSS_RANGE.join(' to ') }];
  }
  if (floorArea === undefined || isWithin(heatLoss / floorArea, LOSS_PER_AREA_RANGE)) return [];
  const found = String(Number((heatLoss / floorArea).toPrecision(2)));
  return [{ code, found, unit: 'W/(m²·K)', allowed: LOSS_PER_AREA_RANGE.join(' to ') }];
}

function isWithin(value: number, [least, most]: readonly [number, number]): boolean {
  return value >= least && value <= most;
}

/** Rounded down, so that what lies just below a limit never shows as the limit. */
function down(value: number, decimals: number): string {
  const scale = 10 ** decimals;
  return String(Math.floor(value * scale) / scale);
}

function up(value: number): string {
  return String(Math.ceil(value));
}
