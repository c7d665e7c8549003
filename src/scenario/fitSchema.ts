import * as z from 'zod';
import { fileName, number } from './fields.ts';
import { readSchema } from './readSchema.ts';

/** How meter readings of a house become heat. */
export const readingsSchema = z
  .strictObject({
    kWhPerUnit: number(0.001, 100_000, {
      says: 'Energy of one unit of the meter or tank, on the calorific value on which the efficiency stands; needed where the readings are not in kWh.',
      unit: 'kWh',
      usual: '8–12 a m³ of natural gas, 10 a litre of heating oil',
    }).optional(),
    efficiency: number(0.3, 1.1, {
      says: 'Seasonal efficiency for space heat of what was metered, 1 for electric heating; that of the boiler of this file when left out.',
      usual: '0.7–0.95',
    }).optional(),
    decimal: z
      .enum(['point', 'comma'])
      .describe('Decimal mark of the readings, where the file does not show it.')
      .optional(),
    weather: z
      .array(fileName('Hourly weather of the time of the readings, as CSV: one year, several, or a part of one.'))
      .min(1)
      .max(20)
      .describe('Weather that was measured while the meter ran; the weather of this file when left out.')
      .optional(),
    // A year is not chosen here, and hours that the files leave out are dealt with by the day.
    read: readSchema
      .omit({ year: true, absentHours: true })
      .describe('How to read those weather files, where it is not recognised.')
      .optional(),
  })
  .describe('How meter readings of this house become heat, for “fit”; nothing in it changes a simulated year.');

/** What a scenario says of its readings. */
export type ReadingsEntry = z.output<typeof readingsSchema>;
