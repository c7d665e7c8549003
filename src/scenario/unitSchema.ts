import * as z from 'zod';
import { fileName, number, polylinePoints, temperature, text } from './fields.ts';
import { labelSchema } from './labelSchema.ts';

const table = z
  .union([
    z.string().min(1).max(100_000).meta({ format: 'as a table behind “|”' }),
    z.strictObject({ file: fileName('CSV file of the table.') }),
  ])
  .describe(
    'A table as the maker prints it: first row flow temperatures, first column outdoor temperatures, in °C; a text block, or a file.',
  );

const fullLoad = z.strictObject({
  capacity: table.meta({ unit: 'kW' }),
  cop: table.optional(),
  inputPower: table.meta({ unit: 'kW' }).optional(),
});

const lowestTable = z.strictObject({
  given: z.literal('table'),
  capacity: table.meta({ unit: 'kW' }),
  cop: table.optional(),
  inputPower: table.meta({ unit: 'kW' }).optional(),
});

const lowestShare = z.strictObject({
  given: z.literal('share'),
  capacity: number(0.01, 1, {
    says: 'Lowest continuous capacity as a share of the full one; 1 is a single-speed unit.',
    usual: '0.2–0.5',
  }).default(0.3),
  cop: number(0.3, 2, {
    says: 'COP at the lowest level as a multiple of that at full load.',
    usual: '0.9–1.2',
  }).default(1),
});

const included = z.strictObject({ method: z.literal('included') });
const byHumidity = z.strictObject({
  method: z.literal('humidity'),
  capacityLoss: number(0, 0.5, {
    says: 'Capacity lost to frost between frost-free and integrated rating at A2/W35.',
    usual: '0.05–0.15',
  }).default(0.1),
  copLoss: number(0, 0.5, {
    says: 'COP lost to frost between frost-free and integrated rating at A2/W35.',
    usual: '0.05–0.2',
  }).default(0.12),
});
const byTable = z.strictObject({
  method: z.literal('table'),
  capacity: polylinePoints('Factor on the capacity over outdoor temperature; held beyond its ends.', {
    least: 0.3,
    most: 1,
  }),
  cop: polylinePoints('Factor on the COP over outdoor temperature; held beyond its ends.', { least: 0.3, most: 1 }),
});

const degradation = z.strictObject({
  method: z.literal('degradation'),
  coefficient: number(0, 1, {
    says: 'Loss of COP while it cycles, C_d (EN 14825 air-to-air, AHRI 210/240: 0.25).',
  }).default(0.25),
});
const offPower = z.strictObject({
  method: z.literal('offPower'),
  power: number(0, 2000, { says: 'Power drawn in the pauses while it cycles.', unit: 'W', usual: '10–60' }),
});

/** A heat-pump unit: the file that a maker's data sheet becomes. */
export const unitSchema = z.strictObject({
  name: text('Name of the unit.'),
  note: text('Where the values come from.', 2000).optional(),
  map: z
    .strictObject({
      fullLoad: fullLoad.describe('Capacity and COP, or capacity and input power, at full load.'),
      lowestLevel: z
        .discriminatedUnion('given', [lowestTable, lowestShare])
        .describe('The lowest continuous level: a table of its own, or a share of full load.')
        .prefault({ given: 'share' }),
      interpolation: z
        .enum(['carnotShare', 'linear'])
        .describe('Between the points: the share of the Carnot COP is linear, or the COP itself.')
        .default('carnotShare'),
    })
    .describe('What the unit gives and takes over outdoor and flow temperature.'),
  limits: z
    .strictObject({
      lowestOutdoorTemperature: temperature(-60, 10, 'Below it the unit does not run.', '−25 to −15').optional(),
      highestFlow: z
        .union([
          z.number().min(20).max(100),
          polylinePoints('Highest flow over outdoor temperature.', { least: 20, most: 100, unit: '°C' }),
        ])
        .describe(
          'Highest flow temperature, one number or over outdoor temperature; the highest of the map when left out.',
        )
        .meta({ unit: '°C' })
        .optional(),
    })
    .describe('Where the unit may run.')
    .prefault({}),
  defrost: z
    .discriminatedUnion('method', [included, byHumidity, byTable])
    .describe('Whether the map holds the loss by frost (integrated values of EN 14511), or how it is found.')
    .default({ method: 'included' }),
  cycling: z
    .discriminatedUnion('method', [degradation, offPower])
    .describe('What running below the lowest level costs.')
    .prefault({ method: 'degradation' }),
  standbyPower: number(0, 2000, { says: 'Power while the compressor does nothing.', unit: 'W', usual: '5–30' }).default(
    0,
  ),
  crankcase: z
    .strictObject({
      power: number(0, 2000, {
        says: 'Power of the crankcase heater while the compressor does nothing.',
        unit: 'W',
        usual: '0–60',
      }).default(0),
      belowTemperature: temperature(
        -50,
        40,
        'It runs below this outdoor temperature; always when left out.',
      ).optional(),
    })
    .describe('Crankcase heater.')
    .prefault({}),
  label: labelSchema.optional(),
});

export type Unit = z.output<typeof unitSchema>;
