import * as z from 'zod';
import { WEEKDAY_NAMES } from '../core/civilDate.ts';
import { number, temperature, timeOfDay, weekdays } from './fields.ts';

const shares = z
  .array(z.number().min(0).max(1000))
  .length(24)
  .describe('Shares of the day in the 24 civil hours; they are brought to a sum of one.');

const litres = z.strictObject({
  given: z.literal('litres'),
  litresPerDay: number(0, 100_000, {
    says: 'Water drawn in a day at the temperature of use.',
    unit: 'L',
    usual: '30–50 a person',
  }),
  useTemperature: temperature(30, 65, 'Temperature at the tap of these litres.', '40–60').default(40),
  shares: shares.optional(),
});

const profile = z.strictObject({
  given: z.literal('profile'),
  profile: z.enum(['S', 'M', 'L', 'XL']).describe('Tapping profile of regulation (EU) 814/2013, its kWh as printed.'),
});

const byCoefficient = z.strictObject({
  given: z.literal('coefficient'),
  value: number(0, 200, { says: 'Heat loss UA of the cylinder.', unit: 'W/K', usual: '1–3' }),
});

const byStandingLoss = z.strictObject({
  given: z.literal('standingLoss'),
  value: number(0, 100, {
    says: 'Heat lost in a day at 45 K above its surroundings.',
    unit: 'kWh/day',
    usual: '1–2.5',
  }),
});

export const hotWaterSchema = z.strictObject({
  volume: number(10, 100_000, { says: 'Water in the cylinder.', unit: 'L', usual: '150–300' }),
  setPoint: temperature(30, 80, 'Temperature to which the cylinder is reheated.', '48–55').default(50),
  hysteresis: number(0, 30, { says: 'Reheat begins so much below the set point.', unit: 'K', usual: '3–10' }).default(
    5,
  ),
  loss: z.discriminatedUnion('given', [byCoefficient, byStandingLoss]).describe('What the cylinder loses.'),
  surroundingTemperature: temperature(-10, 40, 'Temperature around the cylinder.', '10–20').default(15),
  draw: z.discriminatedUnion('given', [litres, profile]).describe('Hot water drawn.'),
  coldWater: z
    .strictObject({
      mean: temperature(0, 30, 'Mean temperature of the cold water.', '8–12').default(10),
      amplitude: number(0, 15, { says: 'Half the swing over the year.', unit: 'K', usual: '0–5' }).default(0),
      warmestDay: number(1, 366, { says: 'Day of the year on which it is warmest.', usual: '220–250' }).default(230),
    })
    .describe('Cold water.')
    .prefault({}),
  reheatWindows: z
    .array(
      z.strictObject({
        start: timeOfDay('Begin, civil time.'),
        end: timeOfDay('End, civil time; earlier than the begin means across midnight.'),
        weekdays: weekdays(
          'Days of the week of the hours themselves, also after midnight; all when left out.',
        ).optional(),
      }),
    )
    .max(20)
    .describe('When the cylinder may be reheated; always when there are none.')
    .default([]),
  hygiene: z
    .strictObject({
      weekday: z.enum(WEEKDAY_NAMES).describe('Day of the weekly run.'),
      hour: number(0, 23, { says: 'Civil hour at which it is asked for.' }).int(),
      temperature: temperature(50, 80, 'Temperature that is reached once.', '60').default(60),
    })
    .describe('Weekly run at a higher temperature against legionella; local codes say whether it is enough.')
    .optional(),
  immersionPower: number(0, 100, {
    says: 'Electric heater in the cylinder; a hybrid boiler takes its place.',
    unit: 'kW',
    usual: '2–3',
  }).default(3),
});
