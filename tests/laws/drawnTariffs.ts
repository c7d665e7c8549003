import fc from 'fast-check';
import { type CivilClock, civilClock } from '../../src/tariffs/civilClock.ts';
import type { PriceSeries, Rate, Tariff } from '../../src/tariffs/tariff.ts';

// Tariffs, clocks and uses drawn at random.

function clockOf(zone: string, offsetMinutes: number, calendarYear = 2025): CivilClock {
  const { clock } = civilClock({ hours: 8760, offsetMinutes, zone, calendarYear });
  if (!clock) throw new Error(zone);
  return clock;
}

const clocks = [
  clockOf('Europe/Berlin', 60),
  clockOf('Europe/Berlin', 0, 2024),
  clockOf('America/St_Johns', -180),
  clockOf('Australia/Lord_Howe', 600),
  clockOf('Pacific/Auckland', 720),
];

export const price = fc.integer({ min: -20, max: 90 }).map((cents) => cents / 100);
const time = fc.integer({ min: 0, max: 287 }).map((fives) => timeText(5 * fives));
const weekday = fc.constantFrom('mon', 'tue', 'wed', 'thu', 'fri', 'sat', 'sun' as const);

export function timeText(minute: number): string {
  return `${String(Math.floor(minute / 60)).padStart(2, '0')}:${String(minute % 60).padStart(2, '0')}`;
}

export const rate: fc.Arbitrary<Rate> = fc
  .record(
    {
      name: fc.constantFrom('a', 'b', 'c'),
      price,
      from: time,
      to: time,
      weekdays: fc.uniqueArray(weekday, { minLength: 1 }),
      months: fc.uniqueArray(fc.integer({ min: 1, max: 12 }), { minLength: 1 }),
      holidays: fc.constantFrom('only', 'never', 'also' as const),
    },
    { requiredKeys: ['name', 'price'] },
  )
  .filter(({ from = '00:00', to = '24:00' }) => from !== to);

export const rates = fc
  .tuple(fc.array(rate, { maxLength: 5 }), price)
  .map(([some, p]) => [...some, { name: 'rest', price: p }]);

const blocks = fc
  .record({
    per: fc.constantFrom('month', 'quarter', 'year' as const),
    prices: fc.array(price, { minLength: 1, maxLength: 4 }),
  })
  .map(({ per, prices }) => ({
    per,
    prices: prices.map((p, i) => (i < prices.length - 1 ? { upTo: 150 * (i + 1), price: p } : { price: p })),
  }));

export const tariff: fc.Arbitrary<Tariff> = fc
  .record(
    {
      rates,
      blocks,
      standing: fc.record({ perDay: price, perMonth: price, perYear: price }),
      demand: fc.record({ perKW: fc.integer({ min: 1, max: 9 }) }),
      taxes: fc.array(fc.record({ name: fc.constantFrom('x', 'y'), percent: fc.integer({ min: 0, max: 30 }) }), {
        maxLength: 3,
      }),
      credits: fc.array(fc.record({ name: fc.constant('z'), amount: fc.integer({ min: 0, max: 400 }) }), {
        maxLength: 2,
      }),
      pricesStated: fc.constantFrom('withTax', 'withoutTax' as const),
    },
    { requiredKeys: ['rates', 'taxes', 'credits', 'pricesStated'] },
  )
  .map((parts) => ({ name: 'drawn', holidays: ['05-01', '12-25'], ...parts }));

/** Use of a year, kWh a step, from a seed: some hours at nothing, some high. */
export const use = fc.integer({ min: 1, max: 2 ** 30 }).map((seed) => {
  let state = seed;
  return Float64Array.from({ length: 8760 }, () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state < 2 ** 30 ? 0 : state / 2 ** 30;
  });
});

export const clock = fc.constantFrom(...clocks);

export const settings = { file: 'p.csv', unit: 'perKWh', stamps: 'utc' } as const;

/** A series that spans the year of a clock with a day to spare at both ends. */
export function seriesOver(of: CivilClock, stepMinutes: number, priceOf: (k: number) => number): PriceSeries {
  const startMinute = of.startMillis[0] / 60_000 - 1440;
  const count = Math.ceil((368 * 1440) / stepMinutes);
  return {
    file: 'p.csv',
    startMinute,
    stepMinutes,
    prices: Float64Array.from({ length: count }, (_, k) => priceOf(k)),
  };
}

/** A tariff of rates alone. */
export function plain(of: Rate[]): Tariff {
  return { name: 'drawn', rates: of, taxes: [], credits: [], holidays: ['05-01', '12-25'], pricesStated: 'withoutTax' };
}
