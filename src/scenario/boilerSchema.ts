import * as z from 'zod';
import { number, temperature } from './fields.ts';
import { boilerFuelSchema, HIGHEST_SUM } from './fuelSchema.ts';
import { flowTemperatureSchema } from './plantSchema.ts';

const constant = number(0.3, 1.1, {
  says: 'Seasonal efficiency for space heat, on the calorific value named in the fuel.',
  usual: '0.75–0.95',
});

const condensing = z.strictObject({
  byReturnTemperature: z
    .array(z.tuple([temperature(5, 95, 'Return temperature.'), number(0.3, 1.1, { says: 'Efficiency there.' })]))
    .min(1)
    .max(50)
    .describe(
      'Efficiency for space heat over return temperature, on the calorific value named in the fuel; held beyond its ends.',
    )
    .meta({ usual: '[[30, 0.97], [50, 0.91], [60, 0.88]] on gross' }),
  flowTemperature: flowTemperatureSchema.describe(
    'How the boiler’s own flow temperature is set; it need not be the heat pump’s, and is not taken from it.',
  ),
});

/** The boiler that the heat pump is held against. */
export const boilerSchema = z.strictObject({
  efficiency: z
    .union([constant, condensing])
    .describe('Efficiency for space heat: one value, or by return temperature for a condensing boiler.'),
  hotWaterEfficiency: number(0.3, 1.1, {
    says: 'Efficiency for hot water; when left out that for space heat, by return temperature the one at the hottest return listed.',
    usual: '0.6–0.85',
  }).optional(),
  fuel: boilerFuelSchema,
  cylinderLoss: number(0, 20_000, {
    says: 'Standing loss of the cylinder that the boiler would heat; that of the heat pump’s run when left out.',
    unit: 'kWh/year',
    usual: '300–900',
  }).optional(),
  pumpPower: number(0, 5000, {
    says: 'Electric power of its pump and fan while it heats.',
    unit: 'W',
    usual: '30–100',
  }).default(0),
  servicePerYear: number(0, HIGHEST_SUM, { says: 'Service and chimney sweep.', unit: 'money/year' }).default(0),
});
