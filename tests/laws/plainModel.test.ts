import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { MARK, type YearColumns } from '../../src/sim/columns.ts';
import { type SeasonalFactor, seasonalFactors } from '../../src/sim/seasonalFactors.ts';
import { type HourCounts, totalsOf } from '../../src/sim/totals.ts';
import { simulateYear } from '../../src/sim/year.ts';
import { caseForms, inventCase } from '../oracle/inventedCase.ts';
import type { PlainCase } from '../oracle/plainCase.ts';
import { plainColumn, plainTotal, productMarks } from '../oracle/plainColumns.ts';
import { seenIn, situations } from '../oracle/plainSituations.ts';
import { plainTotals } from '../oracle/plainTotals.ts';
import { type PlainYear, plainYear } from '../oracle/plainYear.ts';
import { productPlan } from '../oracle/productPlan.ts';

const SEED = 20_250_102;

/**
 * Both models compute in double precision from the same numbers, in another order of operations: an hour's figures of
 * some ten units may part by some hundred roundings of 1e-16, and a year's sums of some 1e4 by that in proportion. 1e-9
 * kWh is far above that and far below any change of a formula.
 */
const TOLERANCE = 1e-9;

/** Figures by name, of one hour or of the whole year. */
type Figures = Map<string, number>;

/** Every column and mark of every hour, as the product has it. */
function productHours(c: YearColumns): Figures[] {
  return Array.from({ length: c.hours }, (_, i) => {
    const figures: Figures = new Map();
    for (const column of Object.keys(plainColumn))
      figures.set(column, c[column as keyof typeof plainColumn][i] as number);
    figures.set('unlimitedNeed', c.unlimitedNeed[i] as number);
    for (const [mark, bit] of Object.entries(MARK)) figures.set(mark, ((c.marks[i] as number) & bit) === 0 ? 0 : 1);
    return figures;
  });
}

/** The same from the plain model. */
function plainHours(plain: PlainCase, year: PlainYear): Figures[] {
  return year.hours.map((hour, i) => {
    const figures: Figures = new Map();
    for (const [column, value] of Object.entries(plainColumn)) figures.set(column, value(hour));
    figures.set('unlimitedNeed', year.unlimitedNeed[i] ?? 0);
    for (const [mark, holds] of Object.entries(productMarks(plain, hour, i))) figures.set(mark, holds ? 1 : 0);
    return figures;
  });
}

/** Sums, seasonal factors, hour counts, starts and kelvin-hours of the year and its months, as the product has them. */
function productSums(plain: PlainCase, c: YearColumns): Figures[] {
  const totals = totalsOf(productPlan(plain), c);
  const numberOf = (factor: SeasonalFactor) => (factor === 'no heat' ? 0 : factor);
  const sums = [totals.annual, ...totals.monthly].map((span) => {
    const { h2, h3, h4 } = seasonalFactors(span);
    const factors = { h2: numberOf(h2), h3: numberOf(h3), h4: numberOf(h4) };
    return new Map(Object.entries({ ...span, ...factors }));
  });
  const { starts, kelvinHoursBelow } = totals;
  return [...sums, new Map(Object.entries({ ...totals.hours, starts, kelvinHoursBelow }))];
}

/** The same from the plain model. */
function plainSums(plain: PlainCase, year: PlainYear): Figures[] {
  const { monthStart } = plain.weather;
  const spans = [[0, year.hours.length], ...monthStart.slice(1).map((end, month) => [monthStart[month], end])];
  const sums = spans.map(([from, to]) => {
    const own = plainTotals(plain, year, from as number, to as number);
    const figures: Figures = new Map();
    for (const [total, ownName] of Object.entries(plainTotal)) figures.set(total, own[ownName] ?? Number.NaN);
    return figures
      .set('h2', own.h2 ?? 0)
      .set('h3', own.h3 ?? 0)
      .set('h4', own.h4 ?? 0);
  });
  return [...sums, new Map(Object.entries(plainCounts(plain, year)))];
}

/** MODEL sections 6, 8, 9 and 10: hours in which something held, starts, and kelvin-hours below set point in hours with need. */
function plainCounts(plain: PlainCase, year: PlainYear) {
  const marks = year.hours.map((hour, i) => productMarks(plain, hour, i));
  const count = (holds: (mark: (typeof marks)[number]) => boolean) => marks.filter(holds).length;
  const hours: Record<keyof HourCounts, number> = {
    backup: count((mark) => mark.backupForSpace || mark.backupForWater),
    backupForSpace: count((mark) => mark.backupForSpace),
    backupForWater: count((mark) => mark.backupForWater),
    outsideMap: count((mark) => mark.outsideMap),
    belowLowestFlow: count((mark) => mark.belowLowestFlow),
    flowAboveLimit: count((mark) => mark.flowAboveLimit),
    cycling: count((mark) => mark.cycling),
    hotWaterShort: count((mark) => mark.hotWaterShort),
    heating: count((mark) => mark.heating),
    unmet: count((mark) => mark.unmet),
  };
  let starts = 0;
  let kelvinHoursBelow = 0;
  year.hours.forEach(({ heat, air, need }, i) => {
    starts += heat?.run.starts ?? 0;
    if (air !== null && need > 0) kelvinHoursBelow += Math.max(0, (plain.house.setPoint[i] as number) - air);
  });
  return { ...hours, starts, kelvinHoursBelow };
}

/**
 * The same case, some hundred roundings away. Where heat waits and the flow is above the unit's limit, what waits lowers
 * the heat pump's part of the next hour by more than itself, so that a rounding may grow from hour to hour: there two
 * right models part, and so does the plain model from itself.
 */
function hairsBreadthAway(plain: PlainCase): PlainCase {
  const { house } = plain;
  const hair = 1 + 1e-13;
  return { ...plain, house: { ...house, heatLoss: house.heatLoss * hair, designLoad: house.designLoad / hair } };
}

/** The figures of the product that part from the plain model by more than that parts from itself a hair's breadth away. */
function disagreements(product: Figures[], own: Figures[], shifted: () => Figures[]): string[] {
  const allowed = (figure: number, doubt: number) => TOLERANCE * Math.max(1, Math.abs(figure)) + doubt;
  const partsBy = (i: number, name: string, doubt: number) => {
    const figure = own[i]?.get(name) ?? Number.NaN;
    return !(Math.abs((product[i]?.get(name) ?? Number.NaN) - figure) <= allowed(figure, doubt));
  };
  const parting = own.flatMap((figures, i) =>
    [...figures.keys()].filter((name) => partsBy(i, name, 0)).map((name) => ({ i, name })),
  );
  if (parting.length === 0) return [];
  const beside = shifted();
  return parting
    .filter(({ i, name }) => {
      const doubt = Math.abs((beside[i]?.get(name) ?? Number.NaN) - (own[i]?.get(name) ?? Number.NaN));
      return partsBy(i, name, 10 * doubt);
    })
    .map(({ i, name }) => `${name} [${i}]: product ${product[i]?.get(name)}, plain model ${own[i]?.get(name)}`);
}

/** So many hours of each situation must have been compared. */
const ENOUGH = 5;

/** Counts the hours of each situation, no further than is enough. */
function countSituations(plain: PlainCase, year: PlainYear, met: Map<string, number>): void {
  for (let i = 0; i < year.hours.length; i++) {
    const seen = seenIn(plain, year, i);
    for (const [situation, hours] of met) {
      if (hours < ENOUGH && situations[situation]?.(seen)) met.set(situation, hours + 1);
    }
  }
}

describe('the product held against a plain model written from the physics page alone', () => {
  test('agrees in every column and mark of every hour, through every situation that the model knows', () => {
    const met = new Map(Object.keys(situations).map((situation) => [situation, 0]));
    const agrees = fc.property(caseForms, (forms) => {
      const plain = inventCase(forms);
      const year = plainYear(plain);
      const product = productHours(simulateYear(productPlan(plain)));
      const shifted = () => plainHours(plain, plainYear(hairsBreadthAway(plain)));
      expect(disagreements(product, plainHours(plain, year), shifted).slice(0, 5)).toEqual([]);
      countSituations(plain, year, met);
    });
    fc.assert(agrees, { seed: SEED, numRuns: 150 });
    expect([...met].filter(([, hours]) => hours < ENOUGH)).toEqual([]);
  });

  test('agrees in every sum, seasonal factor and hour count of the year and its months', () => {
    const agrees = fc.property(caseForms, (forms) => {
      const plain = inventCase(forms);
      const product = productSums(plain, simulateYear(productPlan(plain)));
      const shifted = () => plainSums(plain, plainYear(hairsBreadthAway(plain)));
      expect(disagreements(product, plainSums(plain, plainYear(plain)), shifted).slice(0, 5)).toEqual([]);
    });
    fc.assert(agrees, { seed: SEED + 1, numRuns: 80 });
  });
});
