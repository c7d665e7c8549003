import { HOURS_PER_DAY } from '../core/constants.ts';
import { compensatedSum } from '../core/sum.ts';
import { studentT } from './studentT.ts';
import { type WeightedLine, weightedLine } from './weightedLine.ts';

/** Base temperatures that are tried, °C, in tenths of a kelvin. Reference: MODEL section 13. */
export const LOWEST_BASE = 8;
export const HIGHEST_BASE = 22;
const STEPS_PER_KELVIN = 10;

/** Base temperature, slope and base use are fitted: so many degrees of freedom they take. */
const PARAMETERS = 3;
/** Below so many periods nothing is left to judge the line by. */
export const LEAST_PERIODS = PARAMETERS + 1;

/** Share of the cases that the interval holds. */
const CONFIDENCE = 0.95;

/** Errors that differ by less than this share of the total are equal but for rounding: the lower base wins. */
const TIE = 1e-12;
/** Where less of the degree days than this is not also explained by the base, the slope cannot be told. */
const LEAST_OWN_SHARE = 1e-9;

/** A variance of the use below this share of its square is noise of rounding. */
const FLAT = 1e-24;

/** Use between two reading days. */
export interface MeteredPeriod {
  /** kWh of fuel, at least 0. */
  readonly use: number;
  /** Mean outdoor temperature of each of its days, °C; at least one day. */
  readonly dayMeans: Float64Array;
}

/** A period held against the line. */
export interface PeriodOnLine {
  readonly days: number;
  /** kWh/d */
  readonly dailyUse: number;
  /** Degree days a day to the base found, K. */
  readonly degreeDays: number;
  /** Days with a mean below the base, as a share of all. */
  readonly coldShare: number;
  /** Daily use by the line, kWh/d. */
  readonly onLine: number;
  /** Daily use less that of the line, kWh/d. */
  readonly residual: number;
}

/** The line that metered use follows over the outdoor temperature. */
export interface HeatingSignature {
  /** Outdoor temperature below which the house is heated, °C. */
  readonly baseTemperature: number;
  /** Use that does not depend on the weather, kWh/d. */
  readonly baseUse: number;
  /** kWh a degree day. */
  readonly slope: number;
  /** Standard error of the slope with the base temperature fitted beside it, kWh a degree day. */
  readonly slopeErrorWithBase: number;
  /** Standard error of the slope if the base temperature were known: that of the line alone. */
  readonly slopeError: number;
  /** Half the width of the 95 % interval of the slope, kWh a degree day. */
  readonly slopeMargin: number;
  readonly degreesOfFreedom: number;
  readonly rSquared: number;
  /** Root mean square error over mean daily use. */
  readonly cvRmse: number;
  readonly periods: readonly PeriodOnLine[];
}

/** The signature, or why there is none. */
export type SignatureResult =
  | { readonly signature: HeatingSignature }
  | { readonly refused: 'fewPeriods' | 'noColdDays' | 'alike' }
  | { readonly refused: 'noSlope'; readonly slope: number };

/**
 * Three-parameter heating signature: mean daily use = base use + slope · mean degree days a day, the base temperature
 * searched from 8 to 22 °C in tenths for the least squared error weighted by days, the lowest at ties.
 *
 * The standard error counts the search for the base temperature as the third fitted parameter: the degree days are
 * first freed of what a shift of the base would do to them. Without that the interval is right in three cases of four only.
 *
 * @param periods of one house, in any order; a weight is the number of days
 * @returns the signature; a reason where there are fewer than four periods, no days below 22 °C, periods too alike to tell
 *   slope and base apart, or a use that does not rise as it gets colder
 * @example heatingSignature(fourPeriods) // base 15 °C, slope 5 kWh a degree day, base use 8 kWh/d
 *
 * Reference: ASHRAE Guideline 14, three-parameter heating model (variable-base degree days); MODEL sections 2 (`mean`)
 * and 13. Covariance of the three parameters by linearising at the fit: G. Seber, C. Wild, Nonlinear Regression (1989), ch. 2.
 */
export function heatingSignature(periods: readonly MeteredPeriod[]): SignatureResult {
  if (periods.length < LEAST_PERIODS) return { refused: 'fewPeriods' };
  const weight = Float64Array.from(periods, ({ dayMeans }) => dayMeans.length);
  const y = Float64Array.from(periods, ({ use, dayMeans }) => use / dayMeans.length);
  const best = bestLine(periods, y, weight);
  if (best === undefined) return { refused: hasColdDay(periods) ? 'alike' : 'noColdDays' };
  const { base, x, line } = best;
  if (!(line.slope > 0) || isFlat(line, weight)) return { refused: 'noSlope', slope: line.slope };
  const coldShares = Float64Array.from(periods, ({ dayMeans }) => shareBelow(dayMeans, base));
  const ownShare = shareNotExplained(x, coldShares, weight);
  if (ownShare < LEAST_OWN_SHARE) return { refused: 'alike' };
  const degreesOfFreedom = periods.length - PARAMETERS;
  const slopeError = Math.sqrt(line.residualSum / degreesOfFreedom / line.spread);
  const slopeErrorWithBase = slopeError / Math.sqrt(ownShare);
  const meanWeight = compensatedSum(weight) / weight.length;
  return {
    signature: {
      ...{ baseTemperature: base, baseUse: line.intercept, slope: line.slope, slopeErrorWithBase, slopeError },
      slopeMargin: studentT(CONFIDENCE, degreesOfFreedom) * slopeErrorWithBase,
      degreesOfFreedom,
      rSquared: 1 - line.residualSum / line.totalSum,
      cvRmse: Math.sqrt(line.residualSum / meanWeight / degreesOfFreedom) / line.meanY,
      periods: periods.map((_, i) => periodOnLine({ x, y, weight, coldShares, line }, i)),
    },
  };
}

/** Heat loss by a signature, W/K. */
export interface MeteredHeatLoss {
  readonly value: number;
  /** By the slope's own standard error, as MODEL section 13 has it. */
  readonly standardError: number;
  /** With the base temperature fitted beside the slope: the interval comes from this one. */
  readonly standardErrorWithBase: number;
  /** Ends of the 95 % interval; the lower one may fall below 0 where the readings say next to nothing. */
  readonly low: number;
  readonly high: number;
}

/**
 * Heat loss of the house that was metered: slope · efficiency / 24.
 *
 * @param signature in kWh of fuel
 * @param efficiency of the boiler for space heat, above 0, on the calorific value of those kWh; 1 for electric heating
 * @returns W/K
 * @example heatLossOfSignature({ slope: 4.8, slopeError: 0.2, slopeErrorWithBase: 0.24, slopeMargin: 0.48 }, 0.9).value // 180
 *
 * Reference: MODEL section 13.
 */
export function heatLossOfSignature(
  signature: Pick<HeatingSignature, 'slope' | 'slopeError' | 'slopeErrorWithBase' | 'slopeMargin'>,
  efficiency: number,
): MeteredHeatLoss {
  const { slope, slopeError, slopeErrorWithBase, slopeMargin } = signature;
  const perSlope = (1000 * efficiency) / HOURS_PER_DAY;
  return {
    value: slope * perSlope,
    standardError: slopeError * perSlope,
    standardErrorWithBase: slopeErrorWithBase * perSlope,
    low: (slope - slopeMargin) * perSlope,
    high: (slope + slopeMargin) * perSlope,
  };
}

interface LineAtBase {
  readonly base: number;
  readonly x: Float64Array;
  readonly line: WeightedLine;
}

function bestLine(periods: readonly MeteredPeriod[], y: Float64Array, weight: Float64Array): LineAtBase | undefined {
  let best: LineAtBase | undefined;
  for (let tenths = LOWEST_BASE * STEPS_PER_KELVIN; tenths <= HIGHEST_BASE * STEPS_PER_KELVIN; tenths++) {
    const base = tenths / STEPS_PER_KELVIN;
    const x = Float64Array.from(periods, ({ dayMeans }) => degreeDaysPerDay(dayMeans, base));
    const line = weightedLine({ x, y, weight });
    if (line === undefined) continue;
    const tie = TIE * line.totalSum;
    if (best === undefined || line.residualSum < best.line.residualSum - tie) best = { base, x, line };
  }
  return best;
}

/** Whether the use is the same in all periods but for rounding. */
function isFlat({ totalSum, meanY }: WeightedLine, weight: Float64Array): boolean {
  return totalSum <= FLAT * compensatedSum(weight) * meanY * meanY;
}

function degreeDaysPerDay(dayMeans: Float64Array, base: number): number {
  return dayMeans.reduce((sum, mean) => sum + Math.max(0, base - mean), 0) / dayMeans.length;
}

/** How much the degree days of a period would grow for each kelvin of base. */
function shareBelow(dayMeans: Float64Array, base: number): number {
  return dayMeans.reduce((count, mean) => count + (mean < base ? 1 : 0), 0) / dayMeans.length;
}

/** Share of the spread of x that the other column does not explain. */
function shareNotExplained(x: Float64Array, by: Float64Array, weight: Float64Array): number {
  const line = weightedLine({ x: by, y: x, weight });
  return line === undefined || line.totalSum === 0 ? 1 : line.residualSum / line.totalSum;
}

function hasColdDay(periods: readonly MeteredPeriod[]): boolean {
  return periods.some(({ dayMeans }) => dayMeans.some((mean) => mean < HIGHEST_BASE));
}

interface FittedColumns {
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly weight: Float64Array;
  readonly coldShares: Float64Array;
  readonly line: WeightedLine;
}

function periodOnLine({ x, y, weight, coldShares, line }: FittedColumns, i: number): PeriodOnLine {
  const onLine = line.intercept + line.slope * x[i];
  return {
    days: weight[i],
    dailyUse: y[i],
    degreeDays: x[i],
    coldShare: coldShares[i],
    onLine,
    residual: y[i] - onLine,
  };
}
