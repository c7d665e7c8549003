import * as z from 'zod';
import { byRateSchema, taxesSchema } from './billSchema.ts';
import { resultSchema } from './resultSchema.ts';

const quantity = (says: string) => z.number().describe(says);
const words = (says: string) => z.string().describe(says);

const ranked = z.strictObject({
  rank: z.int().min(1).describe('Place among the tariffs of this ranking, from 1; equal totals share the lower one.'),
  tariff: words('Name of the tariff.'),
  file: words('Its file; of a change of supplier all of them.'),
  present: z.boolean().describe('Whether it is the present one, the first of the scenario.'),
  total: quantity('What the year costs: the whole bill of heating and household, and the fuel of a hybrid.'),
  bill: quantity('The whole bill.'),
  fuel: quantity('Fuel of a hybrid, with its standing charge and taxes.'),
  saving: z
    .union([z.number(), z.literal('not alike')])
    .describe('Total of the present tariff less this one; not alike where that states its taxes otherwise.'),
  kWh: quantity('Electricity on the bill.'),
  byRate: byRateSchema,
  dearestWeek: z
    .strictObject({
      from: words('First civil day of the week in the year, YYYY-MM-DD.'),
      to: words('Last one.'),
      kWh: quantity('Electricity of the week.'),
      cost: quantity('What it costs with its taxes, without standing and demand charges and credits.'),
    })
    .describe('Civil week, Monday to Sunday, in which the electricity of the bill costs most.'),
});

const neighbours = z.strictObject({
  cheaper: words('Name of the cheaper tariff.'),
  dearer: words('Name of the next dearer one.'),
  difference: quantity('What the year costs less on the cheaper one.'),
  change: z
    .union([z.number(), z.enum(['no electricity', 'no price'])])
    .describe('Share by which all kWh prices of the cheaper one may rise before both cost the same.'),
  meanPrice: quantity('Mean price of its kWh now, before taxes that come on top, money/kWh.').optional(),
  priceAtEquality: quantity('The same where both cost alike.').optional(),
});

/** The document that `tariffs --json` writes. */
export const tariffRankingSchema = z.strictObject({
  version: words('Version of the program.'),
  scenario: words('Name of the scenario.'),
  heatPumpUnit: words('Name of the heat-pump unit.'),
  currency: words('Currency of all sums, ISO 4217.'),
  present: words('Name of the present tariff, the first of the scenario.'),
  householdElectricity: quantity('Electricity of the household without the heating, kWh.'),
  heatingElectricity: quantity('Electricity of the heating in the run of the present tariff, kWh.'),
  rankings: z
    .array(
      z.strictObject({
        taxesStated: taxesSchema,
        tariffs: z.array(ranked).min(1).describe('The cheapest first.'),
        changesOfPlace: z.array(neighbours).describe('Each tariff and the next dearer one.'),
      }),
    )
    .describe('One for each way in which taxes are stated; that of the present tariff first.'),
  warnings: resultSchema.shape.warnings,
  assumptions: resultSchema.shape.assumptions,
  inputs: resultSchema.shape.inputs,
});

/** A ranking of tariffs as plain data. */
export type TariffRankingDocument = z.output<typeof tariffRankingSchema>;
