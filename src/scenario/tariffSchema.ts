import * as z from 'zod';
import { day, fileName, number, text, timeOfDay, weekdays } from './fields.ts';

/** Largest sum or price that is read: it keeps every total finite, in any currency. */
const HIGHEST_MONEY = 1e6;

/** A price per kWh may be negative. */
const price = (says: string, usual: string) =>
  number(-HIGHEST_MONEY, HIGHEST_MONEY, { says, unit: 'money/kWh', usual });

const charge = (says: string, unit: string, usual: string) => number(0, HIGHEST_MONEY, { says, unit, usual });

const yearlyDay = (says: string) =>
  z
    .string()
    .regex(/^(?:0[1-9]|1[0-2])-(?:0[1-9]|[12]\d|3[01])$/)
    .describe(says)
    .meta({ format: 'MM-DD' });

const rate = z
  .strictObject({
    name: text('What the bill calls this rate; rates of one name count as one.', 60),
    price: price('Price of a kilowatt-hour while the rate holds; it may be negative.', '0.10–0.60'),
    from: timeOfDay('Civil time at which it begins each day; left out, it begins at midnight.').optional(),
    to: timeOfDay('Civil time at which it ends; earlier than the beginning, it runs across midnight.').optional(),
    weekdays: weekdays(
      'Weekdays on which it holds, that of each minute also after midnight; left out, all.',
    ).optional(),
    months: z
      .array(z.int().min(1).max(12))
      .min(1)
      .max(12)
      .describe('Months in which it holds, 1 to 12; left out, all.')
      .optional(),
    dates: z
      .strictObject({
        from: yearlyDay('First day of the season.'),
        to: yearlyDay('Last day of the season, included; it may lie in the next year.'),
      })
      .describe('Season in which it holds, the same every year; left out, the whole year.')
      .optional(),
    holidays: z
      .enum(['only', 'never', 'also'])
      .describe(
        'Whether it holds only on holidays, never, or also whatever the weekday; left out, they are plain days.',
      )
      .optional(),
  })
  .describe('A price and when it holds; of the list the first rate that matches a minute prices it.');

const series = z
  .strictObject({
    file: fileName('CSV file with a column of stamps and one of prices, in one step of at most an hour.'),
    unit: z
      .enum(['perKWh', 'perMWh', 'centsPerKWh'])
      .describe('What the prices are stated in: money per kWh, money per MWh, or cents per kWh.'),
    stamps: z
      .enum(['withOffset', 'utc', 'local'])
      .describe("What a stamp without an offset means: a fault, UTC, or civil time of the site's zone.")
      .default('withOffset'),
    timeColumn: text('Name of the column of stamps; not needed in a file of two columns.').optional(),
    priceColumn: text('Name of the column of prices; not needed in a file of two columns.').optional(),
    decimal: z.enum(['point', 'comma']).describe('Decimal sign of the prices; left out, the file shows it.').optional(),
  })
  .describe('Prices that change over time; they add to the rates where both are given.');

const block = z
  .strictObject({
    upTo: number(0.001, 1e9, {
      says: 'Where the block ends, counted from the beginning of the period; left out in the last block.',
      unit: 'kWh',
      usual: '100–5000',
    }).optional(),
    price: price('Price of a kilowatt-hour in the block.', '0.05–0.60'),
  })
  .describe('One block.');

const blocks = z
  .strictObject({
    per: z.enum(['month', 'quarter', 'year']).describe('Civil period after which the blocks begin anew.'),
    prices: z.array(block).min(1).max(20).describe('The blocks in rising order.'),
  })
  .describe('Prices by amount, on all electricity of the bill; they add to rates and series where these are given.');

const standing = z
  .strictObject({
    perDay: charge('Charge for each day.', 'money/day', '0.1–1').optional(),
    perMonth: charge('Charge for each month.', 'money/month', '5–30').optional(),
    perYear: charge('Charge for the year.', 'money/year', '50–300').optional(),
  })
  .describe('Charges whatever is used; those given add up.');

const tax = z
  .strictObject({
    name: text('What the bill calls this tax.', 60),
    percent: number(0, 200, {
      says: 'Its share of energy, standing and demand charges.',
      unit: '%',
      usual: '0–25',
    }),
  })
  .describe('One tax.');

const credit = z
  .strictObject({
    name: text('What the bill calls this credit.', 60),
    amount: charge('Sum taken off each year.', 'money/year', '50–400'),
  })
  .describe('One credit.');

/** What may stand in a tariff file; its output is the `Tariff` of the tariffs' room. */
export const tariffSchema = z
  .strictObject({
    name: text('What results and reports call this tariff.', 60),
    currency: text('Currency of every sum in the file, for showing only.', 10).optional(),
    note: text('Where the prices come from and when; shown with the results.', 2000).optional(),
    rates: z
      .array(rate)
      .min(1)
      .max(50)
      .describe('Prices by civil time; together they must cover every minute of the year.')
      .optional(),
    series: series.optional(),
    blocks: blocks.optional(),
    standing: standing.optional(),
    demand: z
      .strictObject({
        perKW: charge("Price of each kilowatt of a civil month's highest hour.", 'money/kW', '1–15'),
      })
      .describe('Charge on the highest hourly power of each month, on all electricity of the bill.')
      .optional(),
    taxes: z
      .array(tax)
      .max(20)
      .describe('Taxes in per cent on energy, standing and demand charges; they add up.')
      .default([]),
    credits: z
      .array(credit)
      .max(20)
      .describe('Fixed sums taken off after tax; the bill may fall below zero.')
      .default([]),
    holidays: z
      .array(day('A holiday.'))
      .max(400)
      .describe("Holidays; they matter to rates that have 'holidays'.")
      .default([]),
    pricesStated: z
      .enum(['withTax', 'withoutTax'])
      .describe('Whether the taxes listed are inside all prices, or come on top of them.')
      .default('withoutTax'),
  })
  .describe('What a supplier asks for electricity.');
