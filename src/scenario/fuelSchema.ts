import * as z from 'zod';
import { number, text } from './fields.ts';

/** Largest price of a kWh, and largest sum, that is read: they keep every total finite, in any currency. */
const HIGHEST_PRICE = 1e6;
export const HIGHEST_SUM = 1e9;

const price = number(0, HIGHEST_PRICE, {
  says: 'Price of one kWh of fuel, before the taxes below.',
  unit: 'money/kWh',
  usual: '0.05–0.20',
});

const terms = {
  calorificValue: z
    .enum(['gross', 'net'])
    .describe(
      'Calorific value on which the price and the efficiency stand; both must stand on the same. Electricity and district heat know no difference.',
    )
    .default('gross'),
  standingPerYear: number(0, HIGHEST_SUM, {
    says: 'Standing charge of the fuel, before taxes.',
    unit: 'money/year',
  }).default(0),
  taxes: z
    .array(
      z.strictObject({ name: text('Name of the tax.'), percent: number(0, 200, { says: 'Its rate.', unit: '%' }) }),
    )
    .max(10)
    .describe('Taxes in per cent; they add up, on energy and standing charge.')
    .default([]),
  carbonFactor: number(0, 5, {
    says: 'Carbon of one kWh of fuel on that calorific value; from the regulation 2018/2066 for gas, oil and LPG when left out.',
    unit: 'kg/kWh',
  }).optional(),
};

/** A fuel with its price, as a hybrid uses it. */
export const fuelSchema = z.strictObject({
  kind: z
    .enum(['naturalGas', 'heatingOil', 'lpg', 'pellets', 'electricity', 'districtHeat', 'other'])
    .describe('What is bought; it sets the default carbon factor.'),
  price,
  ...terms,
});

const priced = z.strictObject({
  kind: z.literal(['naturalGas', 'heatingOil', 'lpg', 'pellets', 'districtHeat', 'other']),
  price,
  ...terms,
});

const electricity = z.strictObject({
  kind: z.literal('electricity'),
  price: number(0, HIGHEST_PRICE, {
    says: 'Price of one kWh on a contract of its own, before the taxes below; left out, the electricity is on the household’s tariff, hour by hour.',
    unit: 'money/kWh',
    usual: '0.15–0.40',
  }).optional(),
  ...terms,
});

/** What a boiler burns or draws: a fuel with its price, or electricity, which may be on the household's tariff. */
export const boilerFuelSchema = z
  .discriminatedUnion('kind', [priced, electricity])
  .describe('What is bought, and at what price; electricity without a price is on the household’s tariff.');
