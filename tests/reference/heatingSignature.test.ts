import { uniformFloat64 } from 'pure-rand/distribution/uniformFloat64';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';
import { linearRegression, linearRegressionLine, rSquared, sampleStandardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { heatingSignature, heatLossOfSignature, type MeteredPeriod } from '../../src/sim/heatingSignature.ts';
import { studentT } from '../../src/sim/studentT.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Heat loss from meter readings');
const coverage = accuracy.comparison({
  what: 'how many of 100 years have the true heat loss within their 95 % interval, beside 95',
  source: 'invented years with noise, heat loss known',
  unit: 'years',
  allowed: 5,
  why: 'at least 90 of 100 years within',
});
const bias = accuracy.comparison({
  what: 'mean of the heat losses found',
  source: 'the same 100 years',
  unit: '%',
  allowed: 1.2,
  why: 'three standard errors of a mean of 100',
});
const line = accuracy.comparison({
  what: 'slope, base use and R² of the line at the base found',
  source: 'library simple-statistics',
  unit: '',
  allowed: 1e-10,
  why: 'the same sums in another order',
});
const quantiles = accuracy.comparison({
  what: 'two-sided quantiles of Student’s t',
  source: 'Abramowitz and Stegun 1964, table 26.10 (from memory)',
  unit: '',
  allowed: 0.0005001,
  why: 'three printed decimals',
});

/** Normal draws by Box and Muller 1958; small seeds lie close together in the generator, so they are spread and warmed up. */
function normalDraws(seed: number): () => number {
  const generator = xoroshiro128plus(Math.imul(seed + 1, 0x9e3779b1));
  for (let i = 0; i < 20; i++) uniformFloat64(generator);
  return () => {
    const radius = Math.sqrt(-2 * Math.log(1 - uniformFloat64(generator)));
    return radius * Math.cos(2 * Math.PI * uniformFloat64(generator));
  };
}

const DAYS_OF_MONTH = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
/** An invented home: 190 W/K, efficiency 0.9, heated below 15.3 °C, 9 kWh of gas a day for hot water. */
const home = { heatLoss: 190, efficiency: 0.9, base: 15.3, hotWater: 9 };

/** A year of weather with spells of some days, and the gas of its months; each day's use is off by some kWh by chance. */
function noisyYear(seed: number): MeteredPeriod[] {
  const normal = normalDraws(seed);
  const slope = (home.heatLoss * 24) / 1000 / home.efficiency;
  let spell = 0;
  let day = 0;
  return DAYS_OF_MONTH.map((days) => {
    let use = 0;
    const dayMeans = Float64Array.from({ length: days }, () => {
      spell = 0.8 * spell + 1.8 * normal();
      const mean = 9.5 - 9 * Math.cos((2 * Math.PI * (day++ - 17)) / 365) + spell;
      use += home.hotWater + slope * Math.max(0, home.base - mean) + 12 * normal();
      return mean;
    });
    return { use: Math.max(0, use), dayMeans };
  });
}

describe('the heat loss of an invented home of 190 W/K over 100 noisy years', () => {
  const years = Array.from({ length: 100 }, (_, seed) => {
    const result = heatingSignature(noisyYear(seed));
    if ('refused' in result) throw new Error(result.refused);
    return { signature: result.signature, loss: heatLossOfSignature(result.signature, home.efficiency) };
  });

  it('lies within its own 95 % interval in at least 90 of them', () => {
    const within = years.filter(({ loss }) => loss.low <= home.heatLoss && home.heatLoss <= loss.high).length;
    expect(within).toBeGreaterThanOrEqual(90);
    coverage.add(95 - within);
    // An interval that always holds it would say nothing: of 100 years some must miss. All 100 would be a chance of 0.6 %.
    expect(within).toBeLessThan(100);
  });

  it('would lie outside far more often if the search for the base temperature were not counted', () => {
    const within = years.filter(({ signature, loss }) => {
      const margin = (loss.high - loss.value) * (signature.slopeError / signature.slopeErrorWithBase);
      return Math.abs(loss.value - home.heatLoss) <= margin;
    }).length;
    expect(within).toBeLessThan(90);
  });

  it('is met on the average, and scatters as its standard error says', () => {
    const losses = years.map(({ loss }) => loss.value);
    const mean = losses.reduce((sum, loss) => sum + loss, 0) / losses.length;
    const scatter = sampleStandardDeviation(losses);
    // Three standard errors of a mean of 100.
    expect(Math.abs(mean - home.heatLoss)).toBeLessThan((3 * scatter) / 10);
    bias.add(100 * (mean / home.heatLoss - 1));
    const told = Math.sqrt(years.reduce((sum, { loss }) => sum + loss.standardErrorWithBase ** 2, 0) / years.length);
    // A standard deviation of 100 values is known to 7 %, that of 9 degrees of freedom each to less: 25 % is three of these.
    expect(Math.abs(told / scatter - 1)).toBeLessThan(0.25);
  });
});

describe('the line at the base temperature found', () => {
  it('is that of an independent library where all periods have equal days', () => {
    const normal = normalDraws(7);
    const periods = Array.from({ length: 12 }, (_, month) => {
      const dayMeans = new Float64Array(30).fill(9 - 10 * Math.cos((2 * Math.PI * month) / 12));
      const heating = 5 * Math.max(0, 15 - dayMeans[0]!);
      return { use: 30 * (8 + heating + 3 * normal()), dayMeans };
    });
    const result = heatingSignature(periods);
    if ('refused' in result) throw new Error(result.refused);
    const { signature } = result;
    const points = signature.periods.map(({ degreeDays, dailyUse }) => [degreeDays, dailyUse]);
    const { m, b } = linearRegression(points);
    expect(signature.slope).toBeCloseTo(m, 10);
    expect(signature.baseUse).toBeCloseTo(b, 10);
    expect(signature.rSquared).toBeCloseTo(rSquared(points, linearRegressionLine({ m, b })), 10);
    for (const difference of [signature.slope - m, signature.baseUse - b]) line.add(difference);
    line.add(signature.rSquared - rSquared(points, linearRegressionLine({ m, b })));
  });
});

describe('Student’s t', () => {
  // Two-sided quantiles of the usual tables, such as Abramowitz and Stegun 1964, table 26.10, to three decimals; from memory.
  const table: [share: number, degreesOfFreedom: number, t: number][] = [
    [0.95, 1, 12.706],
    [0.95, 2, 4.303],
    [0.95, 3, 3.182],
    [0.95, 4, 2.776],
    [0.95, 5, 2.571],
    [0.95, 8, 2.306],
    [0.95, 9, 2.262],
    [0.95, 10, 2.228],
    [0.95, 20, 2.086],
    [0.95, 30, 2.042],
    [0.95, 120, 1.98],
    [0.9, 9, 1.833],
    [0.99, 9, 3.25],
  ];

  it.each(table)('that a share of %d with %d degrees of freedom stays within is %d', (share, degreesOfFreedom, t) => {
    // The tables round to three decimals.
    expect(Math.abs(studentT(share, degreesOfFreedom) - t)).toBeLessThan(0.0005001);
    quantiles.add(studentT(share, degreesOfFreedom) - t);
  });
});
