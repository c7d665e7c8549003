import * as z from 'zod';

const words = (says: string) => z.string().describe(says);

const figure = z.strictObject({
  name: words('Name, as in docs/nomenclature.md; the columns of the hour keep theirs.'),
  label: words('What it is called in the formulas.'),
  value: z.number().describe('Every digit.'),
  unit: words('Unit; 1 where it has none.'),
});

const formula = z.strictObject({
  section: words('Section of docs/model.md.'),
  says: words('The formula in words.'),
  source: words('Where it is published, where it is.').optional(),
});

const stage = z.strictObject({
  stage: words('Name of the stage.'),
  title: words('The same in words.'),
  formulas: z.array(formula).describe('How the figures follow from one another.'),
  findings: z
    .array(z.strictObject({ finding: words('Name.'), says: words('In words.') }))
    .describe('What held in this hour; a stage without figures says here why.'),
  figures: z.array(figure).describe('In the order in which they follow from one another.'),
});

const tariff = z.strictObject({
  name: words('First tariff of the scenario.'),
  rate: words('Rate that holds at the beginning of the hour.'),
  price: z.number().describe('Mean price of the hour before taxes on top.').optional(),
  unit: words('Unit of the price.'),
});

/** The document that `explain --json` writes. */
export const explainSchema = z.strictObject({
  version: words('Version of the program.'),
  scenario: words('Name of the scenario.'),
  heatPumpUnit: words('Name of the heat-pump unit.'),
  hour: z
    .strictObject({
      asked: words('The time as it was asked.'),
      isBeginning: z.boolean().describe('Whether that is the beginning of the hour.'),
      civilTime: words('Beginning in civil time, ISO 8601 with offset.'),
      stamp: words('Beginning in the standard time of the weather, ISO 8601 with offset.'),
      weekday: z.int().min(1).max(7).describe('Weekday in civil time, 1 Monday to 7 Sunday.'),
      tariff: tariff.optional(),
    })
    .describe('The hour.'),
  stages: z.array(stage).describe('The stages of the hour in the order of the model.'),
  inputs: z
    .array(
      z.strictObject({ file: words('Name.'), role: words('What it is for.'), sha256: words('SHA-256 of its bytes.') }),
    )
    .describe('Every file that the result rests on.'),
});

/** One explained hour as plain data. */
export type ExplainDocument = z.output<typeof explainSchema>;
/** One stage in it. */
export type ExplainEntry = ExplainDocument['stages'][number];
