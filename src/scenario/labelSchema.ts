import * as z from 'zod';
import { number, polylinePoints, temperature } from './fields.ts';

const power = (says: string, usual?: string) =>
  number(0, 2000, usual === undefined ? { says, unit: 'W' } : { says, unit: 'W', usual });

const climate = z
  .enum(['average', 'warmer', 'colder'])
  .describe('Reference heating season of the label: the climate it stands for.');
const application = z
  .literal([35, 45, 55, 65])
  .describe('Water temperature of the rating at the design temperature: 35 low, 45 intermediate, 55 medium, 65 high.')
  .meta({ unit: '°C' });

const idlePowers = z
  .strictObject({
    off: power('Power in off mode.', '5–20'),
    thermostatOff: power('Power while the thermostat asks for no heat.', '5–60'),
    standby: power('Power in standby mode.', '5–20'),
    crankcase: power('Power of the crankcase heater.', '0–60'),
  })
  .describe('What the unit draws when it gives no heat, as the label or the data sheet declares it.');

const degradation = (says: string) => number(0, 1, { says, usual: '0.9–1' });

const point = z.strictObject({
  outdoor: temperature(-50, 15, 'Outdoor temperature of the point.', '−22 to 12'),
  capacity: number(0.05, 1000, { says: 'Declared heating capacity.', unit: 'kW' }),
  cop: number(0.5, 12, { says: 'Declared COP at that capacity.', usual: '1.5–9' }),
  degradation: degradation('Degradation coefficient C_c of this point, where it is not that of the season.').optional(),
});

const season = z.strictObject({
  climate,
  application,
  designLoad: number(0.1, 1000, { says: 'Declared heat load P_design.', unit: 'kW', usual: '3–16' }),
  bivalentTemperature: temperature(
    -50,
    15,
    'Bivalent temperature T_biv: down to it the unit carries the load alone.',
    '−10 to 2',
  ),
  operatingLimit: temperature(-60, 15, 'Operating limit TOL: below it the unit gives no heat.', '−25 to −10'),
  degradation: degradation(
    'Degradation coefficient C_c: what starting and stopping leaves of the COP; 1 is no loss (EN 14825: 0.9).',
  ).default(0.9),
  scop: number(1, 12, { says: 'Declared SCOP.', usual: '2.8–5.5' }).optional(),
  efficiency: number(30, 500, {
    says: 'Declared seasonal space heating energy efficiency η_s.',
    unit: '%',
    usual: '110–220',
  }).optional(),
  idlePowers: idlePowers.optional(),
  points: z.array(point).max(20).describe('Declared capacity and COP over outdoor temperature.').optional(),
});

const outlets = z.strictObject({
  climate,
  application,
  points: polylinePoints(
    'Water outlet temperature over outdoor temperature, for the temperatures above the design temperature.',
    { least: 15, most: 100, unit: '°C' },
  ),
});

/** What the energy label and its data sheet declare of a unit. */
export const labelSchema = z
  .strictObject({
    reversible: z
      .boolean()
      .describe('Whether the unit also cools; it sets the hours in which it idles.')
      .default(false),
    idlePowers: idlePowers.optional(),
    seasons: z.array(season).max(12).describe('What is declared for each climate and application.').default([]),
    outlets: z
      .array(outlets)
      .max(12)
      .describe('Outlet temperatures of a climate and application that are not kept in the program, or that differ.')
      .default([]),
  })
  .describe(
    'What the energy label and its data sheet declare; it is held against the map and changes no simulated year.',
  );

/** The label section of a unit file. */
export type Label = z.output<typeof labelSchema>;
/** What a label declares for one climate and application. */
export type DeclaredSeason = Label['seasons'][number];
/** Idle powers as declared, W. */
export type DeclaredIdlePowers = NonNullable<Label['idlePowers']>;
