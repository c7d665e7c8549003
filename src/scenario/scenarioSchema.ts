import * as z from 'zod';
import { backupSchema } from './backupSchema.ts';
import { boilerSchema } from './boilerSchema.ts';
import { carbonSchema } from './carbonSchema.ts';
import { fileName, number, text } from './fields.ts';
import { readingsSchema } from './fitSchema.ts';
import { hotWaterSchema } from './hotWaterSchema.ts';
import { householdSchema } from './householdSchema.ts';
import { houseSchema } from './houseSchema.ts';
import { circulationSchema, flowTemperatureSchema, heatPumpSchema } from './plantSchema.ts';
import { readSchema } from './readSchema.ts';
import { tariffListSchema } from './tariffListSchema.ts';
import { wholeLifeSchema } from './wholeLifeSchema.ts';

const site = z.strictObject({
  zone: text('Civil time zone of the house, a name of the IANA database such as Europe/Berlin.', 60),
  altitude: number(-450, 6000, {
    says: 'Height above sea level; it sets the air pressure where the weather has none.',
    unit: 'm',
  }).default(0),
  calendarYear: number(1970, 2100, {
    says: 'Year on whose calendar the weather is laid: weekdays, holidays, clock changes, price series.',
  })
    .int()
    .default(2025),
});

const weather = z.strictObject({
  file: fileName('Hourly weather of one year as CSV.'),
  read: readSchema.describe('How to read it, where it is not recognised.').optional(),
  relativeHumidity: number(0, 100, { says: 'Constant used where the file has no humidity.', unit: '%' }).default(85),
});

/** One house: the file an assessor writes. */
export const scenarioSchema = z.strictObject({
  name: text('Name of the house or of the option.'),
  note: text('Anything the reader of the result should know.', 2000).optional(),
  currency: z
    .string()
    .regex(/^[A-Z]{3}$/)
    .describe('Currency of all prices, three letters of ISO 4217.')
    .meta({ format: 'as three capital letters, such as EUR' })
    .default('EUR'),
  site: site.describe('Where the house stands, and on which calendar the year is laid.'),
  weather: weather.describe('The outdoor air, hour by hour.'),
  house: houseSchema.describe('What the house loses, and which rooms are kept how warm.'),
  flowTemperature: flowTemperatureSchema,
  circulation: circulationSchema.describe('The heating circuit.').prefault({}),
  heatPump: heatPumpSchema.describe('The heat pump, and how it may run.'),
  backup: backupSchema.optional(),
  hotWater: hotWaterSchema.describe('Hot water from the same unit.').optional(),
  household: householdSchema.optional(),
  tariffs: tariffListSchema,
  boiler: boilerSchema.describe('The boiler that would be kept or bought instead.').optional(),
  carbon: carbonSchema.optional(),
  wholeLife: wholeLifeSchema.optional(),
  readings: readingsSchema.optional(),
});

export type Scenario = z.output<typeof scenarioSchema>;
