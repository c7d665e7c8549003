import * as z from 'zod';

const quantity = (says: string) => z.number().describe(says);

const noElectricity = z.literal('no electricity');

/** Heat pump and boiler at equal cost. */
export const breakEvenSchema = z
  .strictObject({
    electricityPrice: z
      .union([z.number(), z.enum(['no electricity', 'not even free'])])
      .describe('Mean price of the heat pump’s kWh at which both cost the same in a year, taxes in, money/kWh.'),
    meanElectricityPrice: z
      .union([z.number(), noElectricity])
      .describe('The present one, with what it adds to standing and demand charges.'),
    seasonalFactor: z
      .union([z.number(), z.enum(['no electricity', 'no heat', 'no price', 'at no factor'])])
      .describe('Heat over electricity at which both cost the same at the present mean price.'),
    heatOverElectricity: z
      .union([z.number(), z.enum(['no electricity', 'no heat'])])
      .describe('The present one: H4 where no fuel is burnt beside.'),
  })
  .describe('Heat pump and boiler at equal cost on the first tariff; there only with a boiler and a tariff.');

const row = z.strictObject({
  electricityChange: quantity('Change of what a kWh of electricity costs, a share.'),
  fuelChange: quantity('Change of what a kWh of fuel costs, a share.'),
  annualSaving: quantity('Boiler less heat pump in the first year.'),
  netPresentValue: quantity('Over the years; there only with wholeLife.').optional(),
});

/** The first tariff at other energy prices. */
export const sensitivitySchema = z
  .array(row)
  .length(9)
  .describe('The first tariff at energy prices of −20, 0 and +20 %; there only with a boiler and a tariff.');

const payback = z.union([z.number(), z.enum(['at once', 'never'])]);

/** Heat pump against boiler over the years. */
export const wholeLifeResultSchema = z
  .strictObject({
    netCapital: quantity('Capital less grant less the boiler that need not be bought.'),
    netPresentValue: quantity('Present values of all years less the net capital.'),
    simplePayback: payback.describe('Net capital over the first year’s saving, years.'),
    discountedPayback: payback.describe('Years until the present values have paid the net capital.'),
    discountRate: quantity('Real, a share a year.'),
    electricityDrift: quantity('Real, a share a year.'),
    fuelDrift: quantity('Real, a share a year.'),
    years: z
      .array(
        z.strictObject({
          year: z.int().min(1),
          saving: quantity('Boiler less heat pump in that year, at its real prices.'),
          presentValue: quantity('Its worth today.'),
          balance: quantity('Present values up to this year, less the net capital.'),
        }),
      )
      .describe('Year by year.'),
  })
  .describe('Heat pump against boiler over the years, on the first tariff; there only where the scenario asks for it.');
