import * as z from 'zod';

const quantity = (says: string) => z.number().describe(says);
const hours = (says: string) => z.int().min(0).describe(says);
const words = (says: string) => z.string().describe(says);

const idle = (unit: string) =>
  z.strictObject({
    off: quantity(`Off mode, ${unit}.`),
    thermostatOff: quantity(`Thermostat off, ${unit}.`),
    standby: quantity(`Standby mode, ${unit}.`),
    crankcase: quantity(`Crankcase heater, ${unit}.`),
  });

const bin = {
  outdoor: quantity('Outdoor temperature T_j, °C.'),
  hours: hours('Hours of the season at this temperature.'),
  partLoad: quantity('Part load, kW.'),
  heatPump: quantity('Of that, what the heat pump gives, kW.'),
  supplementary: quantity('Of that, what electric heat gives at COP 1, kW.'),
  cop: z.union([z.number(), z.literal('no heat')]).describe('COP of the heat pump with its loss by cycling.'),
  electricity: quantity('Electricity of these hours, kWh.'),
};

const rating = {
  scop: quantity('Seasonal coefficient of performance SCOP.'),
  scopOn: quantity('The same without idle electricity.'),
  efficiency: quantity('Seasonal space heating energy efficiency η_s, %.'),
  designLoad: quantity('Heat load P_design, kW.'),
  operatingLimit: z
    .union([z.number(), z.literal('none')])
    .describe('Outdoor temperature below which the heat pump gives nothing, °C.'),
  idlePowers: idle('W').describe('Idle powers counted.'),
  heat: quantity('Heat of the season Q_H, kWh.'),
  electricity: quantity('Electricity of a year Q_HE, kWh.'),
  idleElectricity: quantity('Of that, what is drawn while no heat is given, kWh.'),
  supplementaryHeat: quantity('Heat that electric supplementary heating gives in the bins, kWh.'),
};

const mapRating = z
  .strictObject({
    ...rating,
    degradation: quantity('Degradation coefficient C_c below the lowest level.'),
    outlets: z
      .array(z.strictObject({ outdoor: quantity('°C.'), outlet: quantity('°C.') }))
      .describe('Outlet temperatures, linear between.'),
    hoursOutsideMap: hours('Hours of heat colder, warmer or hotter than the table reaches.'),
    hoursBelowLowestFlow: hours('Hours of heat at an outlet below the lowest flow of the table.'),
    hoursAboveHighestFlow: hours('Hours of heat at an outlet above the highest flow of the unit.'),
    bins: z.array(
      z.strictObject({
        ...bin,
        outlet: quantity('Outlet temperature, °C.'),
        capacity: quantity('Capacity at full load, kW; 0 below the operating limit.'),
      }),
    ),
  })
  .describe('The season read from the map.');

const pointsRating = z
  .strictObject({ ...rating, bins: z.array(z.strictObject(bin)) })
  .describe('The season from the declared points.');

const deviation = z.union([
  z.strictObject({
    of: z.enum(['scop', 'efficiency']).describe('Figure compared.'),
    against: z.enum(['label', 'points']).describe('What it is held against: the label, or the SCOP of its points.'),
    found: quantity('Figure found.'),
    expected: quantity('Figure it is held against.'),
    share: quantity('found/expected − 1.'),
    agrees: z.boolean().describe('Whether it lies within the tolerance: map 8 %, points 1 %.'),
  }),
  z.literal('nothing to compare'),
]);

const besideMap = z.strictObject({
  outdoor: quantity('Outdoor temperature, °C.'),
  outlet: quantity('Outlet temperature of the season there, °C.'),
  partLoad: quantity('Part load, kW.'),
  capacity: quantity('Declared capacity, kW.'),
  cop: quantity('Declared COP.'),
  degradation: quantity('Degradation coefficient C_c.'),
  mapCapacity: quantity('Capacity at which the map meets the part load, or comes nearest to it, kW.'),
  mapCop: quantity('COP of the map there, while the compressor runs.'),
  capacityDeviation: quantity('capacity/mapCapacity − 1.'),
  copDeviation: quantity('cop/mapCop − 1.'),
});

const label = z
  .strictObject({
    designLoad: quantity('P_design, kW.'),
    bivalentTemperature: quantity('T_biv, °C.'),
    operatingLimit: quantity('TOL, °C.'),
    degradation: quantity('C_c.'),
    scop: quantity('SCOP.').optional(),
    efficiency: quantity('η_s, %.').optional(),
  })
  .describe('What the label declares.');

const season = z.strictObject({
  climate: z.enum(['average', 'warmer', 'colder']),
  application: z.literal([35, 45, 55, 65]).describe('Outlet temperature at the design temperature, °C.'),
  designTemperature: quantity('Design outdoor temperature, °C.'),
  equivalentHours: quantity('Hours at design load that need the heat of the season, h.'),
  idleHours: idle('h').describe('Hours without heat.'),
  lowestPermittedEfficiency: z
    .union([z.number(), z.literal('none set')])
    .describe('Lowest η_s on the European market since 26 September 2017, %.'),
  label: z.union([label, z.literal('not declared')]),
  map: z.union([mapRating, z.literal('no outlet temperatures')]),
  points: z.union([pointsRating, z.literal('no points')]),
  comparison: z.strictObject({ map: deviation, points: deviation }).describe('Map and points against the label.'),
  pointsBesideMap: z.array(besideMap).describe('Each declared point beside the map.'),
});

/** The document that `season --json` writes. */
export const seasonSchema = z.strictObject({
  version: words('Version of the program.'),
  heatPumpUnit: words('Name of the heat-pump unit.'),
  reversible: z.boolean().describe('Whether the unit also cools, which sets the idle hours.'),
  seasons: z.array(season).describe('In the order of climates and applications.'),
  warnings: z
    .array(
      z.strictObject({ code: words('Kind.'), text: words('What was seen.'), remedy: words('What usually helps.') }),
    )
    .describe('What to look at.'),
  assumptions: z
    .array(z.strictObject({ path: words('Place or rule.'), text: words('What was assumed.') }))
    .describe('Every default and every rule that the result rests on.'),
  inputs: z
    .array(
      z.strictObject({ file: words('Name.'), role: words('What it is for.'), sha256: words('SHA-256 of its bytes.') }),
    )
    .describe('Every file that the result rests on.'),
});

/** The label check of one unit as plain data. */
export type SeasonDocument = z.output<typeof seasonSchema>;
/** One climate and application in it. */
export type SeasonEntry = SeasonDocument['seasons'][number];
