import * as z from 'zod';

function columnChoice(says: string) {
  return z.union([z.string().min(1).max(200), z.int().min(1).max(1000)]).describe(says);
}

function columnOrNone(says: string) {
  return z.union([z.string().min(1).max(200), z.int().min(1).max(1000), z.literal(false)]).describe(says);
}

const columns = z
  .strictObject({
    temperature: columnChoice('Column of the outdoor temperature, by its name in the header or its number.').optional(),
    relativeHumidity: columnOrNone('Column of the relative humidity; false leaves it unused.').optional(),
    dewPoint: columnOrNone('Column of the dew point, used where there is no relative humidity.').optional(),
    wetBulb: columnOrNone('Column of the wet bulb, used where there is neither humidity nor dew point.').optional(),
    globalRadiation: columnOrNone('Column of the global horizontal radiation; false leaves it unused.').optional(),
    pressure: columnOrNone('Column of the air pressure at the station; false leaves it unused.').optional(),
    stamp: columnChoice('Column that holds date and time together.').optional(),
    date: columnChoice('Column of the date, where the time has its own.').optional(),
    time: columnChoice('Column of the time of day.').optional(),
    year: columnChoice('Column of the year.').optional(),
    month: columnChoice('Column of the month, 1–12.').optional(),
    day: columnChoice('Column of the day of the month.').optional(),
    hour: columnChoice('Column of the hour, 0–23 or 1–24.').optional(),
    minute: columnChoice('Column of the minute.').optional(),
    hourOfYear: columnChoice('Column that counts the hours of the year, from 0 or from 1.').optional(),
  })
  .describe('Which column holds what; what is left out is recognised by the header.');

const units = z
  .strictObject({
    temperature: z
      .enum(['C', 'F', 'K', '0.1C'])
      .describe('Unit of temperature, dew point and wet bulb; 0.1C means tenths of a degree Celsius.')
      .optional(),
    relativeHumidity: z.enum(['percent', 'fraction']).describe('Whether humidity is in % or from 0 to 1.').optional(),
    globalRadiation: z
      .enum(['W/m2', 'Wh/m2', 'kWh/m2', 'kJ/m2', 'MJ/m2', 'J/cm2'])
      .describe('Unit of the radiation; energies are those of one step of the file.')
      .optional(),
    pressure: z.enum(['Pa', 'hPa', 'kPa', 'mmHg', 'inHg']).describe('Unit of the pressure; mbar is hPa.').optional(),
  })
  .describe('Units of the file, where its header does not name them.');

const station = z
  .strictObject({
    column: columnChoice('Column that names the station.'),
    value: z.union([z.string().min(1).max(200), z.number()]).describe('The station to read.'),
  })
  .describe('The one station to read of a file that holds several.');

/** Settings of the weather reader: a `read:` block of the scenario, or a file of its own. */
export const readSchema = z
  .strictObject({
    delimiter: z
      .enum(['comma', 'semicolon', 'tab', 'pipe', 'blanks'])
      .describe('What stands between the cells of a line.')
      .optional(),
    decimal: z.enum(['point', 'comma']).describe('The decimal mark of the numbers.').optional(),
    skipLines: z
      .int()
      .min(0)
      .max(10_000)
      .describe('Lines before the header, or before the first row where there is none.')
      .meta({ unit: 'lines', usual: '0–20' })
      .optional(),
    header: z.boolean().describe('Whether the file names its columns.').optional(),
    columns: columns.optional(),
    units: units.optional(),
    stampFormat: z
      .string()
      .min(1)
      .max(60)
      .describe('Form of unusual stamps in luxon tokens, such as dd-MMM-yyyy HH:mm.')
      .optional(),
    stamps: z
      .enum(['begin', 'end'])
      .describe('Whether a stamp marks the beginning or the end of its step; it shifts the year by one step.')
      .optional(),
    offset: z
      .union([
        z
          .string()
          .regex(/^[+-](?:0\d|1[0-4]):[0-5]\d$/)
          .meta({ format: "'+01:00'" }),
        z.int().min(-840).max(840),
      ])
      .describe("Offset of the file's standard time from UTC, as '+01:00' or in minutes.")
      .meta({ unit: 'min' })
      .optional(),
    clock: z
      .enum(['standard', 'local'])
      .describe("Whether the stamps keep standard time all year or follow the site's summer time.")
      .optional(),
    station: station.optional(),
    year: z.int().min(1800).max(2200).describe('The one year to read of a file that holds several.').optional(),
    missing: z
      .array(z.union([z.string().max(40), z.number()]))
      .max(20)
      .describe('Further marks of a missing value, besides the usual ones.')
      .optional(),
    absentHours: z
      .enum(['refuse', 'fill'])
      .default('refuse')
      .describe('Whether up to 6 hours on end that the file leaves out are refused or filled like blank cells.'),
  })
  .describe('How to read the weather file, where it does not say so itself.');
