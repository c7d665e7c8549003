import * as z from 'zod';
import { number } from './fields.ts';
import { HIGHEST_SUM } from './fuelSchema.ts';

/** A drift of prices above inflation, per cent a year. */
const drift = (says: string) => number(-20, 30, { says, unit: '%/year', usual: '−2 to 4' }).default(0);

/** What the heat pump costs to buy and to keep, and how money and prices go on. */
export const wholeLifeSchema = z
  .strictObject({
    capital: number(0, HIGHEST_SUM, {
      says: 'What the heat pump costs installed, with all that belongs to it, before the grant.',
      unit: 'money',
      usual: '12000–35000',
    }),
    grant: number(0, HIGHEST_SUM, { says: 'Grant for it.', unit: 'money' }).default(0),
    replacedBoiler: number(0, HIGHEST_SUM, {
      says: 'What a new boiler would cost now that need not be bought; 0 if the old one could stay.',
      unit: 'money',
    }).default(0),
    years: number(1, 60, { says: 'Years looked at.', unit: 'years', usual: '15–25' }).int().default(20),
    discountRate: number(-5, 30, {
      says: 'Real discount rate: what money earns or costs above inflation.',
      unit: '%/year',
      usual: '1–5',
    }).default(3),
    electricityDrift: drift('How electricity grows dearer each year above inflation, with its standing charges.'),
    fuelDrift: drift('How fuel grows dearer each year above inflation, with its standing charge.'),
    servicePerYear: number(0, HIGHEST_SUM, {
      says: 'Service of the heat pump; it stays as it is.',
      unit: 'money/year',
      usual: '100–300',
    }).default(0),
  })
  .describe('Capital and terms of a comparison over the years; leave the section out to have none.');
