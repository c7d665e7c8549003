import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type HeatingSignature, heatingSignature, type MeteredPeriod } from '../../src/sim/heatingSignature.ts';

const run = { seed: 20_251, numRuns: 60 };

/** Months of a year with some weather; base in tenths, slope and base use of a home. */
const homes = fc
  .record({
    warmth: fc.array(fc.double({ min: -3, max: 3, noNaN: true }), { minLength: 12, maxLength: 12 }),
    base: fc.integer({ min: 110, max: 190 }).map((tenths) => tenths / 10),
    slope: fc.double({ min: 0.5, max: 20, noNaN: true }),
    baseUse: fc.double({ min: 0, max: 40, noNaN: true }),
    errors: fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 12, maxLength: 12 }),
  })
  .map((home) => ({
    ...home,
    months: home.warmth.map((shift, month) =>
      Float64Array.from({ length: 28 + (month % 4) }, (_, day) => {
        const season = 9 - 11 * Math.cos((2 * Math.PI * month) / 12);
        return season + shift + 4 * Math.sin(day);
      }),
    ),
  }));

type Home = typeof homes extends fc.Arbitrary<infer T> ? T : never;

/** Metered use of a home, each period off its line by a share of its errors. */
function metered({ months, base, slope, baseUse, errors }: Home, share: number): MeteredPeriod[] {
  return months.map((dayMeans, i) => {
    const cold = dayMeans.reduce((sum, mean) => sum + Math.max(0, base - mean), 0);
    return { use: baseUse * dayMeans.length + slope * cold * (1 + share * errors[i]!) + 1, dayMeans };
  });
}

function signatureOf(periods: MeteredPeriod[]): HeatingSignature {
  const result = heatingSignature(periods);
  if ('refused' in result) throw new Error(result.refused);
  return result.signature;
}

/** Equal but for the rounding of sums in another order. */
function expectAlike(a: HeatingSignature, b: HeatingSignature, scale = 1): void {
  expect(b.baseTemperature).toBe(a.baseTemperature);
  const close = (x: number, y: number, size: number) => expect(Math.abs(x - y)).toBeLessThanOrEqual(1e-9 * size);
  close(b.slope, a.slope * scale, a.slope * scale);
  close(b.baseUse, a.baseUse * scale, (Math.abs(a.baseUse) + a.slope) * scale);
  close(b.slopeErrorWithBase, a.slopeErrorWithBase * scale, a.slope * scale);
  close(b.rSquared, a.rSquared, 1);
  close(b.cvRmse, a.cvRmse, 1);
}

describe('a heating signature', () => {
  it('finds the line of readings without error', () => {
    fc.assert(
      fc.property(homes, (home) => {
        const { baseTemperature, slope, rSquared, slopeErrorWithBase } = signatureOf(
          metered({ ...home, baseUse: home.baseUse }, 0).map((period) => ({ ...period, use: period.use - 1 })),
        );
        expect(baseTemperature).toBe(home.base);
        expect(Math.abs(slope - home.slope)).toBeLessThan(1e-7 * home.slope);
        expect(rSquared).toBeGreaterThan(1 - 1e-9);
        expect(slopeErrorWithBase).toBeLessThan(1e-5 * home.slope);
      }),
      run,
    );
  });

  it('does not depend on the order of the readings', () => {
    fc.assert(
      fc.property(homes, fc.shuffledSubarray([...Array(12).keys()], { minLength: 12 }), (home, order) => {
        const periods = metered(home, 0.3);
        const shuffled = order.map((i) => periods[i]!);
        expectAlike(signatureOf(periods), signatureOf(shuffled));
      }),
      run,
    );
  });

  it('scales with the unit of the readings', () => {
    fc.assert(
      fc.property(homes, fc.double({ min: 0.01, max: 1000, noNaN: true }), (home, factor) => {
        const periods = metered(home, 0.3);
        const scaled = periods.map(({ use, dayMeans }) => ({ use: use * factor, dayMeans }));
        expectAlike(signatureOf(periods), signatureOf(scaled), factor);
      }),
      run,
    );
  });

  it('takes a use that is the same every day as base use alone', () => {
    fc.assert(
      fc.property(homes, fc.double({ min: 0, max: 100, noNaN: true }), (home, more) => {
        const periods = metered(home, 0.3);
        const raised = periods.map(({ use, dayMeans }) => ({ use: use + more * dayMeans.length, dayMeans }));
        const [a, b] = [signatureOf(periods), signatureOf(raised)];
        expect(b.baseTemperature).toBe(a.baseTemperature);
        expect(Math.abs(b.slope - a.slope)).toBeLessThan(1e-9 * (a.slope + more));
        expect(Math.abs(b.baseUse - a.baseUse - more)).toBeLessThan(1e-9 * (a.slope * 20 + Math.abs(a.baseUse) + more));
      }),
      run,
    );
  });

  it('leaves residuals that add up to nothing, by days', () => {
    fc.assert(
      fc.property(homes, (home) => {
        const { periods } = signatureOf(metered(home, 0.5));
        const sum = periods.reduce((all, { residual, days }) => all + residual * days, 0);
        const size = periods.reduce((all, { dailyUse, days }) => all + dailyUse * days, 0);
        expect(Math.abs(sum)).toBeLessThan(1e-11 * size);
      }),
      run,
    );
  });

  it('gives finite figures, or a reason, whatever the readings are', () => {
    const anyPeriod = fc.record({
      use: fc.oneof(fc.constant(0), fc.double({ min: 0, max: 1e9, noNaN: true })),
      dayMeans: fc
        .array(fc.oneof(fc.constantFrom(8, 22, 5), fc.double({ min: -60, max: 50, noNaN: true })), {
          minLength: 1,
          maxLength: 8,
        })
        .map((means) => Float64Array.from(means)),
    });
    let refused = 0;
    let found = 0;
    fc.assert(
      fc.property(fc.array(anyPeriod, { maxLength: 9 }), (periods) => {
        const result = heatingSignature(periods);
        if ('refused' in result) {
          refused++;
          return;
        }
        found++;
        const { periods: onLine, ...figures } = result.signature;
        for (const value of Object.values(figures)) expect(value).toSatisfy(Number.isFinite);
        for (const period of onLine)
          for (const value of Object.values(period)) expect(value).toSatisfy(Number.isFinite);
        expect(figures.slope).toBeGreaterThan(0);
        expect(figures.slopeErrorWithBase).toBeGreaterThanOrEqual(figures.slopeError);
      }),
      { seed: 20_251, numRuns: 1000 },
    );
    expect(refused).toBeGreaterThan(50);
    expect(found).toBeGreaterThan(50);
  });
});
