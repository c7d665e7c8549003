import * as z from 'zod';
import { costSchema } from './billSchema.ts';
import { breakEvenSchema, sensitivitySchema, wholeLifeResultSchema } from './comparisonSchema.ts';

const quantity = (says: string) => z.number().describe(says);
const count = (says: string) => z.int().min(0).describe(says);
const words = (says: string) => z.string().describe(says);

const seasonalFactor = z.union([z.number().min(0), z.literal('no heat')]);

const electricity = z
  .strictObject({
    heatPump: quantity('Compressor, fan and controls while the unit runs.'),
    backup: quantity('Electric backup heater and the heater in the cylinder; 0 with a fuel boiler as backup.'),
    circulation: quantity('Pump of the heating circuit.'),
    standby: quantity('Standby and crankcase heater while the compressor does nothing.'),
    total: quantity('All electricity of the heating: the four above.'),
  })
  .describe('Electricity by use, kWh.');

const electricityDetail = z
  .strictObject({
    heatPumpSpaceElectricity: quantity('Of the unit, for the rooms.'),
    heatPumpWaterElectricity: quantity('Of the unit, for hot water.'),
    backupElectricity: quantity('As electricity.backup.'),
    circulationElectricity: quantity('As electricity.circulation.'),
    standbyElectricity: quantity('Standby alone.'),
    crankcaseElectricity: quantity('Crankcase heater alone.'),
  })
  .describe('The same electricity, parted further, kWh.');

const hotWater = z
  .strictObject({
    hotWaterAsked: quantity('Heat of the hot water drawn, as asked.'),
    hotWaterServed: quantity('Of that, what the cylinder could give.'),
    hotWaterShort: quantity('Of that, what it could not.'),
    cylinderLoss: quantity('Standing loss of the cylinder.'),
  })
  .describe('Hot water, kWh; there only when the scenario has hot water.');

/** Keys that the year and each month have alike. */
const energies = {
  degreeDays: quantity('Heating degree days to the base of the house, by hours, K·d.'),
  spaceHeatNeed: quantity('Heat that the rooms need.'),
  heatPumpHeat: quantity('Heat of the heat pump, to the rooms and into the cylinder.'),
  heatPumpSpaceHeat: quantity('Of that, to the rooms.'),
  heatPumpWaterHeat: quantity('Of that, into the cylinder.'),
  backupHeat: quantity('Heat of the backup, to the rooms and into the cylinder.'),
  backupSpaceHeat: quantity('Of that, to the rooms.'),
  backupWaterHeat: quantity('Of that, into the cylinder.'),
  unmetHeat: quantity('Heat that the rooms needed and did not get; with mass a month of recovery may be negative.'),
  electricity,
  electricityDetail,
  fuel: quantity('Fuel of a boiler that is the backup, kWh on its calorific value.'),
  seasonalFactor: z
    .strictObject({ h2: seasonalFactor, h3: seasonalFactor, h4: seasonalFactor })
    .describe('Heat over input by boundary (SEPEMO-Build): unit, with backup, with pump.'),
  hotWater: hotWater.optional(),
};

const annual = z
  .strictObject({
    ...energies,
    heatingHours: count('Hours with a need of the rooms.'),
    backupHours: count('Hours in which the backup gives anything.'),
    backupHoursSpace: count('Hours in which it gives heat to the rooms.'),
    backupHoursWater: count('Hours in which it heats the cylinder.'),
    unmetHours: count('Hours in which the rooms did not get their heat.'),
    outsideMapHours: count('Hours of heat at a point colder, warmer or hotter than the table of the unit.'),
    belowLowestFlowHours: count('Hours of heat at a flow below the lowest of that table.'),
    flowAboveLimitHours: count('Hours in which the rooms asked for a hotter flow than the unit can give.'),
    cyclingHours: count('Hours in which the compressor runs below its lowest level, on and off.'),
    hotWaterShortHours: count('Hours in which hot water ran short.'),
    starts: quantity('Compressor starts: an estimate by rule of thumb, no measurement.'),
    kelvinHoursBelow: quantity(
      'Only a house with mass: kelvin-hours below the set point in hours with need.',
    ).optional(),
  })
  .describe('The year; energies in kWh.');

const monthly = z.strictObject({ month: z.int().min(1).max(12), ...energies });

const boiler = z
  .strictObject({
    fuel: quantity('Fuel for the same need, kWh on its calorific value; 0 where it heats by electricity of the bill.'),
    fuelCost: quantity('Its price, before taxes.'),
    standing: quantity('Standing charge of the fuel, before taxes.'),
    taxes: quantity('Taxes on both.'),
    service: quantity('Service.'),
    pumpElectricity: quantity('Electricity of its pump, kWh.'),
    heatElectricity: quantity(
      'Electricity of its heat where that is on the bill, kWh; 0 with a fuel of its own price.',
    ),
    electricityCost: z
      .union([z.number(), z.literal('no tariff')])
      .describe('What pump and heat add to the household’s bill on the first tariff.'),
    meanSpaceHeatEfficiency: z
      .union([z.number(), z.literal('no heat')])
      .describe('Space heat over what was taken for it, of the year.'),
    total: quantity('All of the above, in money.'),
  })
  .describe('The boiler that meets the whole need instead; there only when the scenario has one.');

const carbonMass = z.union([z.number(), z.enum(['no factor', 'no boiler', 'not asked'])]);

/** The result document that `--json` writes. */
export const resultSchema = z.strictObject({
  version: words('Version of the program.'),
  scenario: words('Name of the scenario.'),
  heatPumpUnit: words('Name of the heat-pump unit.'),
  currency: words('Currency of the scenario, ISO 4217.'),
  units: z.record(z.string(), z.string()).describe('Unit of every kind of figure in this document.'),
  annual,
  monthly: z.array(monthly).length(12).describe('Twelve months of standard time; energies in kWh.'),
  fieldStudies: z
    .array(
      z.strictObject({
        place: words('Country of the homes.'),
        factor: quantity('Seasonal factor that they showed.'),
        what: words('Which homes, and which figure of them.'),
        source: words('Where it is from.'),
      }),
    )
    .describe('What homes have shown, to be set beside H4: ranges to think with, not targets.'),
  costs: z.array(costSchema).describe('One entry a tariff, in the order of the scenario.'),
  boiler: boiler.optional(),
  breakEven: breakEvenSchema.optional(),
  sensitivity: sensitivitySchema.optional(),
  wholeLife: wholeLifeResultSchema.optional(),
  carbon: z.strictObject({ heatPump: carbonMass, boiler: carbonMass }).describe('Carbon dioxide of the year, kg.'),
  house: z
    .strictObject({
      heatLoss: quantity('Heat loss, W/K.'),
      designLoad: quantity('Heat load at design conditions, kW.'),
      heatLossPerArea: z.union([z.number(), z.literal('no floor area')]).describe('W/K a m² of heated floor.'),
      degreeDayBase: quantity('Base of the degree days, °C.'),
    })
    .describe('What the house comes to.'),
  assumptions: z
    .array(z.strictObject({ path: words('Place or rule.'), text: words('What was assumed.') }))
    .describe('Every default and every rule that the result rests on.'),
  warnings: z
    .array(
      z.strictObject({ code: words('Kind.'), text: words('What was seen.'), remedy: words('What usually helps.') }),
    )
    .describe('What to look at before signing.'),
  weather: z
    .strictObject({
      file: words('Weather file.'),
      columns: z.array(z.string()).describe('What its columns were taken for.'),
      rows: count('Rows that were read.').optional(),
      stepMinutes: quantity('Step of its rows, minutes.').optional(),
      stamps: z
        .enum(['begin', 'end'])
        .describe('Whether a stamp marks the beginning or the end of its step.')
        .optional(),
      offsetMinutes: quantity('Offset of its standard time from UTC, minutes.').optional(),
      recognised: z.array(z.string()).describe('How it was understood, in sentences.'),
      repairs: z
        .array(
          z.strictObject({
            quantity: words('Column.'),
            hours: count('Hours that were interpolated.'),
            longest: count('Hours of the longest gap.'),
            held: count('Values that were held at the end of what is possible.'),
          }),
        )
        .describe('What was mended in it.'),
    })
    .describe('The weather.'),
  inputs: z
    .array(
      z.strictObject({ file: words('Name.'), role: words('What it is for.'), sha256: words('SHA-256 of its bytes.') }),
    )
    .describe('Every file that the result rests on.'),
});

/** The result of one scenario as plain data. */
export type ResultDocument = z.output<typeof resultSchema>;
