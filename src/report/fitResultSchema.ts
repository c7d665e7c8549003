import * as z from 'zod';

const quantity = (says: string) => z.number().describe(says);
const count = (says: string) => z.int().min(0).describe(says);
const words = (says: string) => z.string().describe(says);
const day = (says: string) => z.iso.date().describe(says);

const period = z.strictObject({
  from: day('First day.'),
  to: day('Day of the reading that ends it, excluded.'),
  days: count('Its days.'),
  use: quantity('Energy metered, kWh.'),
  dailyUse: quantity('The same a day, kWh/d.'),
  degreeDays: quantity('Degree days a day to the base temperature, by daily means, K.'),
  onLine: quantity('Daily use by the line, kWh/d.'),
  residual: quantity('dailyUse − onLine.'),
});

/** The document that `fit --json` writes. */
export const fitResultSchema = z.strictObject({
  version: words('Version of the program.'),
  scenario: words('Name of the scenario.'),
  heatLoss: z
    .strictObject({
      value: quantity('Heat loss by the readings: slope · efficiency / 24.'),
      standardError: quantity('Its standard error, the base temperature taken as found.'),
      standardErrorWithBase: quantity(
        'Its standard error with the base temperature fitted beside it; the interval comes from this one.',
      ),
      low: quantity('Lower end of the 95 % interval.'),
      high: quantity('Upper end.'),
      entered: quantity('Heat loss that the scenario has now.'),
    })
    .describe('W/K.'),
  signature: z
    .strictObject({
      baseTemperature: quantity('Outdoor temperature below which the house is heated, °C.'),
      baseUse: quantity('Use that does not depend on the weather, kWh/d of the metered energy.'),
      slope: quantity('Metered energy a degree day, kWh.'),
      slopeErrorWithBase: quantity('Standard error of the slope with the base temperature fitted beside it.'),
      slopeError: quantity('Standard error of the slope if the base temperature were known.'),
      degreesOfFreedom: count('Periods less three.'),
      rSquared: quantity('R².'),
      cvRmse: quantity('CV(RMSE), as a share.'),
    })
    .describe('Daily use = baseUse + slope · degree days a day, weighted by days.'),
  believed: z.boolean().describe('Whether the line may be used.'),
  asked: z
    .strictObject({
      rSquared: quantity('Least R²: ours.'),
      cvRmse: quantity('Highest CV(RMSE): ours.'),
      guidelineCvRmse: quantity('CV(RMSE) that ASHRAE Guideline 14 asks of calibrated monthly models.'),
    })
    .describe('What the line is judged by.'),
  scenarioLines: z.array(z.string()).describe('Lines to put into the scenario; none where the line is not believed.'),
  doubts: z
    .array(z.strictObject({ code: words('Kind.'), text: words('What was seen.'), remedy: words('What to do.') }))
    .describe('What speaks against the line, the weightiest first.'),
  readings: z
    .strictObject({
      file: words('File of the readings.'),
      kind: z.enum(['reading', 'use', 'fill']).describe('What its values are.'),
      unit: words('Unit of its values.'),
      kWhPerUnit: quantity('Energy of one unit, kWh.'),
      efficiency: quantity('Efficiency for space heat.'),
      efficiencyFrom: z.enum(['readings', 'boiler']).describe('Section of the scenario that states it.'),
      rows: count('Readings in the file.'),
      estimated: count('Of those, estimated: no period begins or ends there.'),
      unused: z.array(z.strictObject({ from: day('First day.'), to: day('Excluded.') })).describe('Days of no period.'),
    })
    .describe('How the readings were understood.'),
  periods: z.array(period).min(4).describe('Each period held against the line.'),
  weather: z
    .strictObject({
      files: z
        .array(
          z.strictObject({ file: words('Name.'), recognised: z.array(z.string()).describe('How it was understood.') }),
        )
        .describe('Weather that the readings were held against.'),
      covers: words('Whole days that it holds.'),
      filledHours: count('Hours that were interpolated.'),
    })
    .describe('The weather of the readings.'),
  inputs: z
    .array(
      z.strictObject({ file: words('Name.'), role: words('What it is for.'), sha256: words('SHA-256 of its bytes.') }),
    )
    .describe('Every file that the result rests on.'),
});

/** A heat loss by readings as plain data. */
export type FitDocument = z.output<typeof fitResultSchema>;
