import * as z from 'zod';
import { day, number, temperature, text, timeOfDay, weekdays } from './fields.ts';

const coefficient = z.strictObject({
  given: z.literal('coefficient'),
  value: number(1, 100_000, { says: 'Heat loss of the whole house.', unit: 'W/K', usual: '60–400' }),
});

const load = z.strictObject({
  given: z.literal('load'),
  value: number(0.1, 5000, { says: 'Heat load at the two temperatures below.', unit: 'kW', usual: '3–16' }),
  outdoorTemperature: temperature(-50, 15, 'Outdoor temperature of that load.', '−16 to 0'),
  roomTemperature: temperature(10, 30, 'Room temperature of that load.', '18–22').default(20),
});

const element = z.strictObject({
  name: text('Name of the wall, roof, floor, window or door.'),
  kind: z
    .enum(['opaque', 'window'])
    .describe('Windows and glazed doors lose heat without storing it; the lumped model needs to know which.')
    .default('opaque'),
  area: number(0.01, 100_000, { says: 'Area, outside measure.', unit: 'm²' }),
  uValue: number(0.05, 7, { says: 'U-value.', unit: 'W/(m²·K)', usual: '0.1–2.8' }),
  factor: number(0, 1, {
    says: 'Share of the temperature difference that it sees: 1 to outdoors, less to ground or an unheated room.',
    usual: '0.5–1',
  }).default(1),
});

const thermalBridge = z.strictObject({
  name: text('Name of the joint.'),
  length: number(0, 100_000, { says: 'Length of the joint.', unit: 'm' }),
  psi: number(-1, 3, { says: 'Linear loss ψ of the joint.', unit: 'W/(m·K)', usual: '0.01–0.5' }),
});

const elements = z.strictObject({
  given: z.literal('elements'),
  elements: z.array(element).min(1).max(500).describe('Everything that parts the heated rooms from outdoors.'),
  thermalBridges: z.array(thermalBridge).max(500).describe('Joints with a loss of their own.').default([]),
  ventilation: z
    .strictObject({
      volume: number(1, 1_000_000, { says: 'Heated air volume V.', unit: 'm³' }),
      airChanges: number(0, 10, {
        says: 'Air changes n, less what a heat exchanger gives back.',
        unit: '1/h',
        usual: '0.3–1',
      }),
    })
    .describe('Loss by air: 0.33·n·V.'),
});

export const heatLossSchema = z
  .discriminatedUnion('given', [coefficient, load, elements])
  .describe('What the house loses: as a coefficient, as a load at two temperatures, or from its elements.');

const gains = {
  internalGains: number(0, 100_000, {
    says: 'Heat from people, light and appliances.',
    unit: 'W',
    usual: '2–5 a m² of floor',
  }).default(0),
  solarAperture: number(0, 1000, {
    says: 'Effective area that takes in the global radiation of the weather file.',
    unit: 'm²',
    usual: '0–8',
  }).default(0),
  heatingLimit: temperature(
    0,
    30,
    'No heating while the mean of the last 24 hours is at or above it.',
    '12–17',
  ).optional(),
};

const setPointDays = z.strictObject({
  name: text('Name of the rule, such as weekend or holiday away.'),
  setPoint: temperature(5, 30, 'Room temperature on those days.', '12–22'),
  weekdays: weekdays('Days of the week on which it holds; all when left out.').optional(),
  from: day('First day.').optional(),
  to: day('Last day, included.').optional(),
});

const degreeHours = z.strictObject({
  model: z.literal('degreeHours'),
  setPoint: temperature(5, 30, 'Room temperature that is kept.', '19–22').default(20),
  baseTemperature: temperature(
    0,
    30,
    'Outdoor temperature above which no heat is needed; leave it out to have it follow from the gains.',
    '12–18',
  ).optional(),
  ...gains,
  days: z
    .array(setPointDays)
    .max(100)
    .describe('Other room temperatures for whole days; the first rule that fits wins.')
    .default([]),
});

const setPointHours = z.strictObject({
  name: text('Name of the rule, such as night or pre-heat.'),
  setPoint: temperature(5, 30, 'Room temperature while it holds.', '15–22').optional(),
  raise: number(-10, 10, {
    says: 'Instead of a temperature: so much warmer (or cooler, below zero) than the set point.',
    unit: 'K',
  }).optional(),
  start: timeOfDay('Begin, civil time.').optional(),
  end: timeOfDay('End, civil time; earlier than the begin means across midnight.').optional(),
  weekdays: weekdays('Days of the week on which it holds; all when left out.').optional(),
  from: day('First day.').optional(),
  to: day('Last day, included.').optional(),
  rate: text('Only while the first tariff is in the rate of this name.').optional(),
});

const lumped = z.strictObject({
  model: z.literal('lumped'),
  setPoint: temperature(5, 30, 'Room temperature that is kept.', '19–22').default(20),
  massClass: z
    .enum(['veryLight', 'light', 'medium', 'heavy', 'veryHeavy'])
    .describe('Heat storage of the building, ISO 13790 table 12.')
    .default('medium'),
  lossShares: z
    .strictObject({
      windows: number(0, 1, { says: 'Share of the heat loss through windows.' }),
      opaque: number(0, 1, { says: 'Share through walls, roof and floor.' }),
      ventilation: number(0, 1, { says: 'Share by air.' }),
    })
    .describe('How the heat loss is parted; follows from the elements where those are given.')
    .optional(),
  ...gains,
  schedule: z
    .array(setPointHours)
    .max(100)
    .describe('Other room temperatures by the hour; the first rule that fits wins.')
    .default([]),
});

export const houseSchema = z.strictObject({
  heatLoss: heatLossSchema,
  floorArea: number(5, 1_000_000, {
    says: 'Heated floor area; needed by the lumped model, and for W/m².',
    unit: 'm²',
  }).optional(),
  design: z
    .strictObject({
      outdoorTemperature: temperature(-50, 15, 'Outdoor temperature for which the heating is sized.', '−16 to 0'),
      roomTemperature: temperature(10, 30, 'Room temperature for which the heating is sized.', '20–21').default(20),
    })
    .describe('Design conditions; with the heat loss they give the design load.'),
  need: z
    .discriminatedUnion('model', [degreeHours, lumped])
    .describe('How the heat need of an hour is found: degree hours, or a house with mass (ISO 13790 hourly method).'),
});
