import { describe, expect, test } from 'vitest';
import { bill } from '../../src/tariffs/bill.ts';
import { billWeeks } from '../../src/tariffs/billWeeks.ts';
import { readPriceSeries } from '../../src/tariffs/readPriceSeries.ts';
import { clockOf, prepared, stepAt, tariffOf } from '../unit/tariffs/sampleTariffs.ts';
import { accuracySection } from './accuracyRecord.ts';

const byHand = accuracySection(import.meta.url, 'Half-hourly prices').comparison({
  what: 'energy cost of three days of London, the two clock changes among them, and the bill of the year',
  source: 'priced by hand',
  unit: 'money',
  allowed: 5e-10,
  why: 'sums of a few products',
});

// A year of half-hourly prices in the civil time of London, priced by hand on three days: a plain one and the two on which
// the clocks change (30 March 2025 01:00 UTC forward, 26 October 2025 01:00 UTC back). All prices are invented.

/** Prices of the half-hours that the three days use, by civil stamp; of a stamp that occurs twice in its order. */
const priced: Record<string, number[]> = {
  '2025-01-14T06:00': [0.12],
  '2025-01-14T06:30': [0.16],
  '2025-01-14T17:00': [0.4],
  '2025-01-14T17:30': [0.46],
  '2025-03-30T00:00': [0.1],
  '2025-03-30T00:30': [0.06],
  '2025-03-30T02:00': [0.2],
  '2025-03-30T02:30': [0.24],
  '2025-10-26T01:00': [0.11, 0.15],
  '2025-10-26T01:30': [0.13, 0.19],
  '2025-10-26T02:00': [-0.02],
  '2025-10-26T02:30': [0.04],
};
/** Any other half-hour; none of it is used. */
const OTHER = 0.3;

const london = clockOf('Europe/London', 0);
const toLocal = new Intl.DateTimeFormat('sv-SE', { timeZone: 'Europe/London', dateStyle: 'short', timeStyle: 'short' });

/** The price file: every half-hour of the civil year, as London's clocks show it. */
function priceFile(): string {
  const passes = new Map<string, number>();
  const lines = ['time,price'];
  for (let at = Date.UTC(2025, 0, 1); at < Date.UTC(2026, 0, 1); at += 1_800_000) {
    const stamp = toLocal.format(at).replace(' ', 'T');
    const pass = passes.get(stamp) ?? 0;
    passes.set(stamp, pass + 1);
    lines.push(`${stamp},${priced[stamp]?.[pass] ?? OTHER}`);
  }
  return lines.join('\n');
}

const settings = { file: 'prices.csv', unit: 'perKWh', stamps: 'local' } as const;
const { series } = readPriceSeries({ text: priceFile(), file: 'prices.csv', settings, zone: 'Europe/London' });
const tariff = prepared(
  tariffOf({ series: settings, standing: { perDay: 0.4 }, taxes: [{ name: 'VAT', percent: 5 }] }),
  london,
  series,
);

const use = new Float64Array(8760);
use[stepAt(london, '2025-01-14T06:00Z')] = 2;
use[stepAt(london, '2025-01-14T17:00Z')] = 1.5;
use[stepAt(london, '2025-03-30T00:00Z')] = 1;
use[stepAt(london, '2025-03-30T01:00Z')] = 2; // 02:00 on the wall: the hour from 01:00 does not exist
use[stepAt(london, '2025-10-26T00:00Z')] = 1; // 01:00 on the wall, first pass
use[stepAt(london, '2025-10-26T01:00Z')] = 3; // 01:00 on the wall again
use[stepAt(london, '2025-10-26T02:00Z')] = 4; // 02:00 on the wall

// An hour's price is the mean of its two half-hours:
// 14 January   06:00 2 kWh · (0.12 + 0.16)/2 = 0.28;  17:00 1.5 kWh · (0.40 + 0.46)/2 = 0.645          together 0.925
// 30 March     00:00 1 kWh · (0.10 + 0.06)/2 = 0.08;  02:00 2 kWh · (0.20 + 0.24)/2 = 0.44             together 0.52
// 26 October   01:00 1 kWh · (0.11 + 0.13)/2 = 0.12;  again 3 kWh · (0.15 + 0.19)/2 = 0.51;
//              02:00 4 kWh · (−0.02 + 0.04)/2 = 0.04                                                   together 0.67
const JANUARY = 0.925;
const MARCH = 0.52;
const OCTOBER = 0.67;
// Sums of a few products: rounding is some 1e-16.
const DIGITS = 12;

describe('a half-hourly year', () => {
  const made = bill(tariff, use);

  test('costs on each day what it costs by hand', () => {
    expect(made.monthly[0]?.energy).toBeCloseTo(JANUARY, DIGITS);
    expect(made.monthly[2]?.energy).toBeCloseTo(MARCH, DIGITS);
    expect(made.monthly[9]?.energy).toBeCloseTo(OCTOBER, DIGITS);
    [JANUARY, MARCH, OCTOBER].forEach((cost, i) => {
      byHand.add((made.monthly[[0, 2, 9][i] as number]?.energy ?? Number.NaN) - cost);
    });
  });

  test('costs in all the three days, the standing charge of 365 days, and the tax on both', () => {
    // energy 0.925 + 0.52 + 0.67 = 2.115; standing 365 · 0.40 = 146; 5 % of 148.115 = 7.40575
    expect(made.energy).toBeCloseTo(2.115, DIGITS);
    expect(made.standing).toBeCloseTo(146, 9);
    expect(made.taxes).toBeCloseTo(7.40575, 9);
    expect(made.total).toBeCloseTo(155.52075, 9);
    byHand.add(made.total - 155.52075);
    expect(made.kWh).toBeCloseTo(14.5, DIGITS);
  });

  test('puts the days into their weeks, with the tax on the energy', () => {
    // 14 January 2025 is a Tuesday, 30 March and 26 October are Sundays.
    const weeks = billWeeks(tariff, use, made).filter(({ kWh }) => kWh > 0);
    expect(weeks.map(({ from, to, kWh }) => [from, to, kWh])).toEqual([
      ['2025-01-13', '2025-01-19', 3.5],
      ['2025-03-24', '2025-03-30', 3],
      ['2025-10-20', '2025-10-26', 8],
    ]);
    const costs = [JANUARY, MARCH, OCTOBER].map((energy) => 1.05 * energy);
    weeks.forEach(({ cost }, i) => {
      expect(cost).toBeCloseTo(costs[i] as number, DIGITS);
    });
  });
});
