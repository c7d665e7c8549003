import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type Bill, bill } from '../../src/tariffs/bill.ts';
import type { CivilClock } from '../../src/tariffs/civilClock.ts';
import { composeYear } from '../../src/tariffs/composeYear.ts';
import type { PreparedTariff } from '../../src/tariffs/preparedTariff.ts';
import { prepareTariff } from '../../src/tariffs/prepareTariff.ts';
import type { PriceSeries, Tariff } from '../../src/tariffs/tariff.ts';
import { clock, plain, price, rate, rates, seriesOver, settings, tariff, timeText, use } from './drawnTariffs.ts';

// What is always true of bills (MODEL section 15), on tariffs, clocks and uses drawn at random with a fixed seed.
const RUNS = { seed: 20_251, numRuns: 60 };

// A bill is made of sums over at most 8784 hours of some kWh at prices below 2: totals stay below 1e5, and 1e-7 is
// 1e-12 of that, which leaves room for the order of additions and no room for a lost hour.
const DIGITS = 7;

function prepared(of: Tariff, on: CivilClock, series?: PriceSeries): PreparedTariff {
  const result = prepareTariff({ tariff: of, file: 't.yaml', series }, on);
  if (!result.prepared) throw new Error(result.problems.map((p) => `${p.code} ${p.found}`).join());
  return result.prepared;
}

function sumOf<T>(items: readonly T[], of: (item: T) => number): number {
  return items.reduce((sum, item) => sum + of(item), 0);
}

const SUMS = ['kWh', 'energy', 'standing', 'demand', 'taxes', 'taxesInside', 'credits', 'total'] as const;

function expectAddsUp(result: Bill, hours: number): void {
  const byRate = Object.values(result.byRate);
  expect(sumOf(byRate, (r) => r.cost)).toBeCloseTo(result.energy, DIGITS);
  expect(sumOf(byRate, (r) => r.kWh)).toBeCloseTo(result.kWh, DIGITS);
  expect(sumOf(byRate, (r) => r.hours)).toBeCloseTo(hours, DIGITS);
  for (const sum of SUMS) expect(sumOf(result.monthly, (month) => month[sum])).toBeCloseTo(result[sum], DIGITS);
  expect(sumOf(Object.values(result.byTax), (tax) => tax)).toBeCloseTo(result.taxes + result.taxesInside, DIGITS);
}

describe('a bill adds up', () => {
  test('cost by rate to the energy cost, months to the year, kWh to the use, hours to the year', () => {
    fc.assert(
      fc.property(tariff, clock, use, (t, c, e) => {
        const result = bill(prepared(t, c), e);
        expectAddsUp(result, 8760);
        expect(result.kWh).toBeCloseTo(
          sumOf([...e], (kWh) => kWh),
          DIGITS,
        );
      }),
      RUNS,
    );
  });

  test('with a price series on the rates', () => {
    fc.assert(
      fc.property(tariff, clock, use, fc.constantFrom(15, 60, 40), (t, c, e, stepMinutes) => {
        const series = seriesOver(c, stepMinutes, (k) => Math.sin(k));
        const result = bill(prepared({ ...t, series: settings }, c, series), e);
        expectAddsUp(result, 8760);
        // Without blocks the energy cost is the price column on the use.
        if (t.blocks) return;
        const { price: column } = prepared({ ...t, series: settings }, c, series);
        const cost = column.reduce((sum, p, i) => sum + p * e[i], 0);
        expect(result.energy).toBeCloseTo(cost, DIGITS);
      }),
      RUNS,
    );
  });

  test('with a change of supplier', () => {
    fc.assert(
      fc.property(tariff, tariff, clock, use, fc.integer({ min: 1, max: 12 }), (a, b, c, e, month) => {
        const from = `${String(month).padStart(2, '0')}-17`;
        const supplies = [
          { tariff: a, file: 'a.yaml' },
          { tariff: b, file: 'b.yaml', from },
        ];
        const { prepared: year } = composeYear(supplies, c);
        if (!year) throw new Error(from);
        expectAddsUp(bill(year, e), 8760);
      }),
      RUNS,
    );
  });

  test('and a change from a tariff to itself changes nothing but blocks and demand', () => {
    fc.assert(
      fc.property(tariff, clock, use, (t, c, e) => {
        const { blocks: _, demand: __, ...same } = t;
        const supplies = [
          { tariff: same, file: 'a.yaml' },
          { tariff: same, file: 'a.yaml', from: '08-09' },
        ];
        const { prepared: year } = composeYear(supplies, c);
        if (!year) throw new Error('not prepared');
        const [whole, changed] = [bill(prepared(same, c), e), bill(year, e)];
        for (const sum of SUMS) expect(changed[sum]).toBeCloseTo(whole[sum], DIGITS);
        for (const [name, { cost }] of Object.entries(whole.byRate)) {
          expect(changed.byRate[name].cost).toBeCloseTo(cost, DIGITS);
        }
      }),
      RUNS,
    );
  });
});

describe('prices', () => {
  test('scaled by k scale the energy cost by k', () => {
    fc.assert(
      fc.property(tariff, clock, use, fc.integer({ min: 0, max: 8 }), (t, c, e, k) => {
        const scaled: Tariff = {
          ...t,
          rates: t.rates?.map((r) => ({ ...r, price: k * r.price })),
          blocks: t.blocks && { ...t.blocks, prices: t.blocks.prices.map((b) => ({ ...b, price: k * b.price })) },
        };
        expect(bill(prepared(scaled, c), e).energy).toBeCloseTo(k * bill(prepared(t, c), e).energy, DIGITS - 1);
      }),
      RUNS,
    );
  });

  test('of one hour change the cost of that hour alone', () => {
    fc.assert(
      fc.property(rates, clock, use, fc.integer({ min: 0, max: 8759 }), (r, c, e, hour) => {
        const before = seriesOver(c, 60, (k) => Math.sin(k));
        const instant = c.startMillis[hour] / 60_000;
        const at = (instant - before.startMinute) / 60;
        const prices = before.prices.slice();
        prices[at] += 1;
        const t = { ...plain(r), series: settings };
        const [old, changed] = [prepared(t, c, before), prepared(t, c, { ...before, prices })];
        const differ = Array.from(old.price.keys()).filter((i) => old.price[i] !== changed.price[i]);
        expect(differ).toEqual([hour]);
        expect(bill(changed, e).energy - bill(old, e).energy).toBeCloseTo(e[hour], DIGITS);
      }),
      RUNS,
    );
  });

  test('of a flat series cost what a flat rate costs', () => {
    fc.assert(
      fc.property(price, clock, use, fc.constantFrom(15, 30, 60, 25), (p, c, e, stepMinutes) => {
        const flat = bill(prepared(plain([{ name: 'x', price: p }]), c), e);
        const { rates: _, ...bare } = plain([]);
        const series = bill(
          prepared(
            { ...bare, series: settings },
            c,
            seriesOver(c, stepMinutes, () => p),
          ),
          e,
        );
        expect(series.energy).toBeCloseTo(flat.energy, DIGITS);
        for (const m of flat.monthly.keys()) {
          expect(series.monthly[m].energy).toBeCloseTo(flat.monthly[m].energy, DIGITS);
        }
      }),
      RUNS,
    );
  });

  test('of rates and series add', () => {
    fc.assert(
      fc.property(rates, clock, use, (r, c, e) => {
        const series = seriesOver(c, 30, (k) => Math.cos(k));
        const { rates: _, ...bare } = plain([]);
        const both = bill(prepared({ ...plain(r), series: settings }, c, series), e);
        const apart =
          bill(prepared(plain(r), c), e).energy + bill(prepared({ ...bare, series: settings }, c, series), e).energy;
        expect(both.energy).toBeCloseTo(apart, DIGITS);
      }),
      RUNS,
    );
  });
});

describe('rates', () => {
  test('that do not overlap may stand in any order', () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.integer({ min: 1, max: 287 }), { minLength: 1, maxLength: 5 }),
        clock,
        use,
        fc.nat(),
        (cuts, c, e, turn) => {
          const edges = [0, ...cuts.sort((a, b) => a - b), 288].map((fives) => timeText(5 * fives));
          const some = edges.slice(1).map((to, i) => ({ name: `r${i}`, price: 0.1 + i / 10, from: edges[i], to }));
          const by = turn % some.length;
          const turned = [...some.slice(by), ...some.slice(0, by)].reverse();
          const [one, other] = [bill(prepared(plain(some), c), e), bill(prepared(plain(turned), c), e)];
          expect(other.energy).toBeCloseTo(one.energy, DIGITS);
          for (const { name } of some) expect(other.byRate[name].cost).toBeCloseTo(one.byRate[name].cost, DIGITS);
        },
      ),
      RUNS,
    );
  });

  test('cut in two halves cost what the whole costs', () => {
    fc.assert(
      fc.property(rate, price, clock, use, fc.integer({ min: 1, max: 1439 }), (r, p, c, e, cut) => {
        const { from = '00:00', to = '24:00' } = r;
        const at = timeText(cut);
        const inside = from < to ? at > from && at < to : at > from || at < to;
        fc.pre(inside && to !== '00:00');
        const rest = { name: 'rest', price: p };
        const whole = bill(prepared(plain([r, rest]), c), e);
        const halves = bill(prepared(plain([{ ...r, to: at }, { ...r, from: at, to }, rest]), c), e);
        expect(halves.energy).toBeCloseTo(whole.energy, DIGITS);
        expect(halves.byRate[r.name]?.hours ?? 0).toBeCloseTo(whole.byRate[r.name].hours, DIGITS);
      }),
      RUNS,
    );
  });

  test('cover the year whatever the zone: without the last one the missing minutes and the priced ones make the year', () => {
    fc.assert(
      fc.property(rate, clock, (r, c) => {
        const { problems } = prepareTariff({ tariff: plain([r]), file: 't.yaml' }, c);
        const unpriced = problems.find((problem) => problem.code === 'tariff.unpriced');
        const minutes = Number(/in all (\d+) minutes/.exec(unpriced?.found ?? 'in all 0 minutes')?.[1]);
        const hours = prepared(
          plain([
            { ...r, name: 'it' },
            { name: 'rest', price: 0 },
          ]),
          c,
        ).hoursOfRate;
        expect(hours[0] * 60 + minutes).toBeCloseTo(8760 * 60, DIGITS);
      }),
      RUNS,
    );
  });
});

describe('the marginal price', () => {
  test('is what one kWh more costs, where there are neither blocks nor demand charges', () => {
    fc.assert(
      fc.property(tariff, clock, use, fc.integer({ min: 0, max: 8759 }), (t, c, e, hour) => {
        const { blocks: _, demand: __, ...same } = t;
        const ready = prepared(same, c);
        const more = e.slice();
        more[hour] += 1;
        expect(bill(ready, more).total - bill(ready, e).total).toBeCloseTo(ready.marginalPrice[hour], DIGITS);
      }),
      RUNS,
    );
  });
});
