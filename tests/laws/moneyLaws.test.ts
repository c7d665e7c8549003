import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type AnnualCost, annualTotal, electricityCost } from '../../src/compare/annualCost.ts';
import { breakEvenFactor, breakEvenPrice } from '../../src/compare/breakEven.ts';
import { carbonByHour, carbonByRate } from '../../src/compare/carbon.ts';
import { sensitivity } from '../../src/compare/sensitivity.ts';
import { type Payback, type WholeLifeTerms, wholeLife } from '../../src/compare/wholeLife.ts';
import { bill } from '../../src/tariffs/bill.ts';
import type { CivilClock } from '../../src/tariffs/civilClock.ts';
import { prepareTariff } from '../../src/tariffs/prepareTariff.ts';
import type { Tariff } from '../../src/tariffs/tariff.ts';
import { clock, tariff, use } from './drawnTariffs.ts';

const RUNS = { seed: 20_250_102, numRuns: 200 };
/** Laws that make bills of a whole year. */
const FEW_RUNS = { seed: 20_250_103, numRuns: 25 };

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const cost: fc.Arbitrary<AnnualCost> = fc
  .record({
    electricityEnergy: between(0, 3000),
    electricityCharges: between(0, 300),
    fuelEnergy: between(0, 3000),
    fuelCharges: between(0, 300),
    service: between(0, 500),
  })
  .map(({ electricityEnergy, electricityCharges, fuelEnergy, fuelCharges, service }) => ({
    electricity: electricityEnergy + electricityCharges,
    electricityEnergy,
    fuel: fuelEnergy + fuelCharges,
    fuelEnergy,
    service,
  }));
const terms: fc.Arbitrary<WholeLifeTerms> = fc.record({
  capital: between(0, 30_000),
  grant: between(0, 10_000),
  replacedBoiler: between(0, 8000),
  years: fc.integer({ min: 1, max: 60 }),
  discountRate: between(-0.05, 0.3),
  electricityDrift: between(-0.2, 0.3),
  fuelDrift: between(-0.2, 0.3),
});
const steady = { electricityDrift: 0, fuelDrift: 0 };

/** Sums of sixty years round by some 1e-15 of their largest term. */
const rounding = (...terms: number[]) => 1e-12 * Math.max(1, ...terms.map(Math.abs));
/** A payback as a number that may be compared. */
const asYears = (payback: Payback) =>
  payback === 'at once' ? 0 : payback === 'never' ? Number.POSITIVE_INFINITY : payback;
const scaled = (of: AnnualCost, k: number): AnnualCost => ({
  electricity: k * of.electricity,
  electricityEnergy: k * of.electricityEnergy,
  fuel: k * of.fuel,
  fuelEnergy: k * of.fuelEnergy,
  service: k * of.service,
});

describe('the net present value', () => {
  test('without discount and drift is the plain sum of the savings less the net capital', () => {
    const law = fc.property(cost, cost, terms, (heatPump, boiler, drawn) => {
      const life = wholeLife(heatPump, boiler, { ...drawn, ...steady, discountRate: 0 });
      const saving = annualTotal(boiler) - annualTotal(heatPump);
      const expected = drawn.years * saving - (drawn.capital - drawn.grant - drawn.replacedBoiler);
      expect(Math.abs(life.netPresentValue - expected)).toBeLessThanOrEqual(rounding(1e5, expected));
    });
    fc.assert(law, RUNS);
  });

  test('falls as the discount rate rises, where every year saves', () => {
    const law = fc.property(cost, cost, terms, between(0.001, 0.2), (one, other, drawn, more) => {
      const [heatPump, boiler] = annualTotal(one) < annualTotal(other) ? [one, other] : [other, one];
      fc.pre(annualTotal(boiler) - annualTotal(heatPump) > 1);
      const at = (discountRate: number) => wholeLife(heatPump, boiler, { ...drawn, ...steady, discountRate });
      const low = at(drawn.discountRate).netPresentValue;
      expect(at(drawn.discountRate + more).netPresentValue).toBeLessThan(low);
    });
    fc.assert(law, RUNS);
  });

  test('is the balance of the last year, and every balance adds its year’s present value', () => {
    const law = fc.property(cost, cost, terms, (heatPump, boiler, drawn) => {
      const life = wholeLife(heatPump, boiler, drawn);
      const values = life.years.map(({ presentValue }) => presentValue);
      const sum = values.reduce((all, value) => all + value, -life.netCapital);
      expect(life.years).toHaveLength(drawn.years);
      expect(life.netPresentValue).toBe(life.years.at(-1)?.balance);
      expect(Math.abs(life.netPresentValue - sum)).toBeLessThanOrEqual(rounding(1e5, ...values));
    });
    fc.assert(law, RUNS);
  });

  test('changes its sign where heat pump and boiler change places and there is no capital', () => {
    const law = fc.property(cost, cost, terms, (one, other, drawn) => {
      const free = { ...drawn, capital: 0, grant: 0, replacedBoiler: 0 };
      const there = wholeLife(one, other, free).netPresentValue;
      expect(Math.abs(there + wholeLife(other, one, free).netPresentValue)).toBeLessThanOrEqual(rounding(there));
    });
    fc.assert(law, RUNS);
  });

  test('is a finite number, as are all years', () => {
    const law = fc.property(cost, cost, terms, (heatPump, boiler, drawn) => {
      const { years } = wholeLife(heatPump, boiler, drawn);
      expect(years.every((of) => Object.values(of).every(Number.isFinite))).toBe(true);
    });
    fc.assert(law, RUNS);
  });
});

describe('the paybacks', () => {
  test('are never shorter for more capital', () => {
    const law = fc.property(cost, cost, terms, between(0, 20_000), (heatPump, boiler, drawn, more) => {
      const less = wholeLife(heatPump, boiler, drawn);
      const dearer = wholeLife(heatPump, boiler, { ...drawn, capital: drawn.capital + more });
      const slack = 1e-9;
      expect(asYears(dearer.simplePayback)).toBeGreaterThanOrEqual(asYears(less.simplePayback) * (1 - slack));
      expect(asYears(dearer.discountedPayback)).toBeGreaterThanOrEqual(asYears(less.discountedPayback) * (1 - slack));
    });
    fc.assert(law, RUNS);
  });

  test('are the same without discount and drift, as far as the years reach', () => {
    const law = fc.property(cost, cost, terms, (heatPump, boiler, drawn) => {
      const life = wholeLife(heatPump, boiler, { ...drawn, ...steady, discountRate: 0 });
      const simple = asYears(life.simplePayback);
      // at the very end of the last year rounding decides between a number and 'never'
      fc.pre(Math.abs(simple - drawn.years) > 1e-6);
      const expected = simple > drawn.years ? Number.POSITIVE_INFINITY : simple;
      const found = asYears(life.discountedPayback);
      expect(found === expected || Math.abs(found - expected) <= 1e-8).toBe(true);
    });
    fc.assert(law, RUNS);
  });

  test('take longer with discount than without', () => {
    const law = fc.property(cost, cost, terms, between(0, 0.3), (heatPump, boiler, drawn, discountRate) => {
      const life = wholeLife(heatPump, boiler, { ...drawn, ...steady, discountRate });
      expect(asYears(life.discountedPayback)).toBeGreaterThanOrEqual(asYears(life.simplePayback) * (1 - 1e-9));
    });
    fc.assert(law, RUNS);
  });

  test('come by the last year exactly where the balance is ever above zero', () => {
    const law = fc.property(cost, cost, terms, (heatPump, boiler, drawn) => {
      const life = wholeLife(heatPump, boiler, drawn);
      const paid = life.netCapital <= 0 || life.years.some(({ balance }) => balance >= 0);
      expect(asYears(life.discountedPayback) <= drawn.years).toBe(paid);
    });
    fc.assert(law, RUNS);
  });

  test('stay as they are, and the net present value scales, where all money is counted in another currency', () => {
    const law = fc.property(cost, cost, terms, fc.constantFrom(0.25, 2, 128), (heatPump, boiler, drawn, k) => {
      const money = { capital: k * drawn.capital, grant: k * drawn.grant, replacedBoiler: k * drawn.replacedBoiler };
      const life = wholeLife(heatPump, boiler, drawn);
      const other = wholeLife(scaled(heatPump, k), scaled(boiler, k), { ...drawn, ...money });
      // powers of two scale without rounding
      expect(other.netPresentValue).toBe(k * life.netPresentValue);
      expect(other.simplePayback).toBe(life.simplePayback);
      expect(other.discountedPayback).toBe(life.discountedPayback);
    });
    fc.assert(law, RUNS);
  });
});

describe('break-even', () => {
  const year = fc.record({ cost, electricity: between(100, 10_000), heat: between(100, 40_000) });

  test('at its price both cost the same', () => {
    const law = fc.property(year, cost, (heatPump, boiler) => {
      const price = breakEvenPrice(heatPump, boiler);
      if (typeof price !== 'number') {
        expect(annualTotal({ ...heatPump.cost, electricity: 0 })).toBeGreaterThan(annualTotal(boiler) - 1e-9);
        return;
      }
      const there = annualTotal({ ...heatPump.cost, electricity: price * heatPump.electricity });
      expect(Math.abs(there - annualTotal(boiler))).toBeLessThanOrEqual(rounding(there));
    });
    fc.assert(law, RUNS);
  });

  test('at its factor both cost the same, at the present mean price', () => {
    const law = fc.property(year, cost, (heatPump, boiler) => {
      const factor = breakEvenFactor(heatPump, boiler);
      fc.pre(typeof factor === 'number');
      const meanPrice = heatPump.cost.electricity / heatPump.electricity;
      const electricity = (heatPump.heat / Number(factor)) * meanPrice;
      const there = annualTotal({ ...heatPump.cost, electricity });
      expect(Math.abs(there - annualTotal(boiler))).toBeLessThanOrEqual(rounding(1e4, there));
    });
    fc.assert(law, RUNS);
  });

  test('the heat pump saves exactly where its price is below the one, and its heat over electricity above the other', () => {
    const law = fc.property(year, cost, (heatPump, boiler) => {
      const saving = annualTotal(boiler) - annualTotal(heatPump.cost);
      const price = breakEvenPrice(heatPump, boiler);
      const factor = breakEvenFactor(heatPump, boiler);
      fc.pre(Math.abs(saving) > 1e-6 && typeof price === 'number' && typeof factor === 'number');
      expect(heatPump.cost.electricity / heatPump.electricity < Number(price)).toBe(saving > 0);
      expect(heatPump.heat / heatPump.electricity > Number(factor)).toBe(saving > 0);
    });
    fc.assert(law, RUNS);
  });
});

describe('the table of other prices', () => {
  test('holds today’s saving and net present value in its middle', () => {
    const law = fc.property(cost, cost, terms, (heatPump, boiler, drawn) => {
      const middle = sensitivity(heatPump, boiler, drawn)[4];
      expect(middle?.annualSaving).toBe(annualTotal(boiler) - annualTotal(heatPump));
      expect(middle?.netPresentValue).toBe(wholeLife(heatPump, boiler, drawn).netPresentValue);
    });
    fc.assert(law, RUNS);
  });

  test('is straight in either price: opposite rows lie as far from the middle', () => {
    const law = fc.property(cost, cost, (heatPump, boiler) => {
      const saving = sensitivity(heatPump, boiler, undefined).map(({ annualSaving }) => annualSaving);
      const middle = saving[4] as number;
      for (let i = 0; i < 4; i++) {
        const mean = ((saving[i] as number) + (saving[8 - i] as number)) / 2;
        expect(Math.abs(mean - middle)).toBeLessThanOrEqual(rounding(1e4));
      }
    });
    fc.assert(law, RUNS);
  });
});

/** The bill of a drawn tariff with every price of a kilowatt-hour times k. */
function billAt(drawn: Tariff, k: number, on: CivilClock, electricity: Float64Array) {
  const times = <T extends { readonly price: number }>(each: T): T => ({ ...each, price: k * each.price });
  const blocks = drawn.blocks && { ...drawn.blocks, prices: drawn.blocks.prices.map(times) };
  const priced = { ...drawn, rates: (drawn.rates ?? []).map(times), ...(blocks === undefined ? {} : { blocks }) };
  const { prepared } = prepareTariff({ tariff: priced, file: 'drawn.yaml' }, on);
  if (prepared === undefined) throw new Error('not prepared');
  return bill(prepared, electricity);
}

test('of a system’s electricity the energy part is what grows with the price of a kilowatt-hour', () => {
  const law = fc.property(tariff, clock, use, use, between(0.1, 3), (drawn, on, household, system, k) => {
    const all = household.map((kWh, i) => kWh + (system[i] as number));
    const costAt = (factor: number) =>
      electricityCost(billAt(drawn, factor, on, all), billAt(drawn, factor, on, household));
    const today = costAt(1);
    const then = costAt(k);
    const grown = today.electricity + (k - 1) * today.electricityEnergy;
    // bills of some thousands of money, whose months may cancel to nearly nothing before taxes are shared
    expect(Math.abs(then.electricity - grown)).toBeLessThanOrEqual(1e-7);
    expect(Math.abs(then.electricityEnergy - k * today.electricityEnergy)).toBeLessThanOrEqual(1e-7);
  });
  fc.assert(law, FEW_RUNS);
});

test('carbon is the same by one factor, by equal factors of all rates, and by a level series', () => {
  const law = fc.property(tariff, clock, use, between(0, 1), (drawn, on, electricity, factor) => {
    const { prepared } = prepareTariff({ tariff: drawn, file: 'drawn.yaml' }, on);
    if (prepared === undefined) throw new Error('not prepared');
    const factors = prepared.rateNames.map((rate) => ({ rate, factor }));
    const expected = electricity.reduce((sum, kWh) => sum + kWh, 0) * factor;
    const byRate = carbonByRate(electricity, prepared, factors);
    const byHour = carbonByHour(
      electricity,
      electricity.map(() => factor),
    );
    // sums over 8760 hours of up to 1 kWh
    expect(Math.abs(Number(byRate) - expected)).toBeLessThanOrEqual(1e-8);
    expect(Math.abs(byHour - expected)).toBeLessThanOrEqual(1e-8);
  });
  fc.assert(law, FEW_RUNS);
});
