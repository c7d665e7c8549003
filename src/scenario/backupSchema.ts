import * as z from 'zod';
import { number, temperature } from './fields.ts';
import { fuelSchema } from './fuelSchema.ts';

const power = number(0, 5000, { says: 'Heat that the backup can give.', unit: 'kW', usual: '3–9 electric' });
const parallel = z.strictObject({ kind: z.literal('parallel') });
const alternative = z.strictObject({
  kind: z.literal('alternative'),
  switchTemperature: temperature(
    -30,
    20,
    'Below this outdoor temperature the heat pump rests and the backup carries all.',
    '−5 to 5',
  ),
});
const cheapest = z.strictObject({ kind: z.literal('cheapest') });

const electric = z.strictObject({
  source: z.literal('electric'),
  power,
  mode: z
    .discriminatedUnion('kind', [parallel, alternative])
    .describe('When the backup runs.')
    .default({ kind: 'parallel' }),
});

const boiler = z.strictObject({
  source: z.literal('boiler'),
  power,
  efficiency: number(0.3, 1.1, {
    says: 'Efficiency for space heat, on the calorific value named in the fuel.',
    usual: '0.8–0.95',
  }),
  hotWaterEfficiency: number(0.3, 1.1, {
    says: 'Efficiency for hot water; that for space heat when left out.',
    usual: '0.7–0.9',
  }).optional(),
  fuel: fuelSchema,
  mode: z
    .discriminatedUnion('kind', [parallel, alternative, cheapest])
    .describe('When the boiler runs; cheapest compares both sources each hour on the first tariff.')
    .default({ kind: 'parallel' }),
});

export const backupSchema = z
  .discriminatedUnion('source', [electric, boiler])
  .describe('What helps when the heat pump cannot carry the house: an electric heater, or a fuel boiler (a hybrid).');
