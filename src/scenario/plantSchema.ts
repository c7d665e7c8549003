import * as z from 'zod';
import { fileName, number, polylinePoints, temperature, timeOfDay, weekdays } from './fields.ts';

const byEmitters = z.strictObject({
  method: z.literal('emitters'),
  flow: temperature(25, 90, 'Flow temperature at the design load.', '35–55'),
  return: temperature(20, 85, 'Return temperature at the design load.', '28–45'),
  roomTemperature: temperature(
    10,
    30,
    'Room temperature of the emitters; the design room temperature when left out.',
    '20',
  ).optional(),
  exponent: number(1, 1.6, { says: 'Exponent of the emitters: 1.3 radiators, 1.1 floor heating (EN 442).' }).default(
    1.3,
  ),
  lowestFlow: temperature(15, 90, 'Lowest flow temperature.', '25–35').default(25),
  highestFlow: temperature(20, 90, 'Highest flow temperature; the design flow when left out.').optional(),
});

const byCurve = z.strictObject({
  method: z.literal('curve'),
  points: polylinePoints('Flow temperature over outdoor temperature; held beyond its ends.', {
    least: 15,
    most: 90,
    unit: '°C',
  }),
});

const fixed = z.strictObject({
  method: z.literal('fixed'),
  flow: temperature(15, 90, 'Flow temperature in every hour.', '30–55'),
});

/** The three ways to set a flow temperature, for the heat pump and for a boiler of its own setting. */
export const flowTemperatureSchema = z
  .discriminatedUnion('method', [byEmitters, byCurve, fixed])
  .describe('How the flow temperature of an hour is set.');

const quietHours = z.strictObject({
  start: timeOfDay('Begin, civil time.'),
  end: timeOfDay('End, civil time; earlier than the begin means across midnight.'),
  weekdays: weekdays('Days of the week of the hours themselves, also after midnight; all when left out.').optional(),
  capacity: number(0, 1, {
    says: 'Share of the full capacity that may be used; the COP line stays.',
    usual: '0.5–0.8',
  }),
});

export const heatPumpSchema = z.strictObject({
  unit: fileName('File of the heat-pump unit.'),
  inUseAllowance: number(0, 0.6, {
    says: 'Share by which every COP is lowered for what a home does to a unit: settings, balancing, sensors.',
    usual: '0–0.2',
  }).default(0),
  quietHours: z
    .array(quietHours)
    .max(20)
    .describe('Hours of limited capacity for space heat; the first that fits holds.')
    .default([]),
});

export const circulationSchema = z.strictObject({
  pumpPower: number(0, 5000, {
    says: 'Electric power of the heating-circuit pump.',
    unit: 'W',
    usual: '10–80',
  }).default(0),
  waterContent: number(1, 100_000, {
    says: 'Water on which a short run of the compressor works; 20 L a kW of lowest level, at least 100 L, when left out.',
    unit: 'L',
    usual: '60–300',
  }).optional(),
});
