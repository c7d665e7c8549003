import * as z from 'zod';

const quantity = (says: string) => z.number().describe(says);
const words = (says: string) => z.string().describe(says);

/** Sums of a bill. */
export const billSums = {
  kWh: quantity('Electricity on the bill.'),
  energy: quantity('Rates, series and blocks.'),
  standing: quantity('Standing charges.'),
  demand: quantity('Charge for the highest power.'),
  taxes: quantity('Taxes that come on top.'),
  taxesInside: quantity('Taxes inside the prices as stated: a part of the sums before.'),
  credits: quantity('Fixed credits, positive.'),
  total: quantity('energy + standing + demand + taxes − credits.'),
};

/** kWh, hours and cost by rate; a bill's costs by rate add up to its energy. */
export const byRateSchema = z
  .record(
    z.string(),
    z.strictObject({
      kWh: quantity('Electricity in this rate.'),
      hours: quantity('Hours of the year in which it holds.'),
      cost: quantity('Energy cost, before taxes that come on top.'),
    }),
  )
  .describe('By name of the rate; the costs add up to energy.');

/** How the prices of a tariff stand to its taxes. */
export const taxesSchema = z
  .enum(['inPrices', 'onTop', 'notListed', 'mixed'])
  .describe(
    'Taxes inside the prices, on top of them, not listed at all, or in more than one way in the year; bills of different ways are not alike.',
  );

/** One tariff: the whole bill, the household's alone, the heating's part of it and the boiler's. */
export const costSchema = z.strictObject({
  tariff: words('Name of the tariff.'),
  file: words('Its file; of a change of supplier all of them.'),
  currency: words('Currency of all its sums.'),
  pricesStated: z
    .enum(['withTax', 'withoutTax', 'mixed'])
    .describe('Whether the prices of the file hold the taxes; mixed where those of two suppliers differ.'),
  taxesStated: taxesSchema,
  ...billSums,
  byRate: byRateSchema,
  byTax: z.record(z.string(), z.number()).describe('Taxes by name.'),
  monthly: z.array(z.strictObject(billSums)).length(12).describe('The same by civil month.'),
  household: z
    .strictObject({ ...billSums, byRate: byRateSchema })
    .describe('The bill of the household alone; the sums before are those of heating and household.'),
  systemElectricity: quantity('total less that of the household alone.'),
  systemFuel: quantity('Fuel of a hybrid, with its standing charge and taxes.'),
  systemService: quantity('Service of the heat pump as entered under wholeLife; 0 without.'),
  systemTotal: quantity('Running cost of the heating: the three above.'),
  boilerTotal: quantity('Running cost of the boiler on this tariff; there only with a boiler.').optional(),
  saving: quantity('boilerTotal − systemTotal, the middle of sensitivity; there only with a boiler.').optional(),
});
