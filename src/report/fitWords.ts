/** Figures of a sentence, already written with their units. */
type Said = Readonly<Record<string, string>>;

/** Every word of a heat loss by readings, in English. Another language is one more object of the same type. */
export const englishFit = {
  title: (scenario: string) => `Heat loss by meter readings: ${scenario}`,
  loss: ({ value, error, low, high }: Said) =>
    `By its readings the house loses ${value} (standard error ${error}; with the uncertainty of the base temperature it lies between ${low} and ${high} with 95 % confidence).`,
  within: (entered: string) => `The ${entered} of the scenario lie within.`,
  outside: (entered: string) => `The ${entered} of the scenario lie outside.`,
  base: ({ base, use }: Said) =>
    `It is heated below ${base} outdoors. Whatever the weather, ${use} a day are metered: hot water, cooking, losses of the boiler.`,
  line: ({ rSquared, cvRmse }: Said) => `R² is ${rSquared} and CV(RMSE) ${cvRmse}`,
  asked: ({ rSquared, cvRmse, guideline }: Said) =>
    `; asked here: at least ${rSquared} and at most ${cvRmse}, our limits. ASHRAE Guideline 14 asks a CV(RMSE) of ${guideline} of calibrated monthly models (from memory).`,
  notBelieved: 'The line does not fit, and its heat loss should not be used: see below why that may be.',
  headings: {
    lines: 'Put this into the scenario',
    doubts: 'What speaks against it',
    periods: 'Period by period, a day',
    readings: 'How the readings were understood',
    weather: 'Weather of the readings',
    inputs: 'Files this rests on (beginning of their SHA-256)',
  },
  columns: {
    period: 'From – to',
    days: 'Days',
    use: 'kWh',
    degreeDays: 'K·d',
    onLine: 'Line',
    residual: 'Difference',
  },
  kinds: {
    reading: 'readings of a meter',
    use: 'use since the date before',
    fill: 'fills of a tank, each taken as the use since the fill before: it was filled to the same level',
  },
  rows: ({ rows, kind, unit }: Said) => `${rows} rows: ${kind}, in ${unit}`,
  factor: ({ unit, factor }: Said) => `one ${unit} is ${factor}`,
  efficiency: {
    readings: (efficiency: string) => `efficiency for space heat ${efficiency}, as the scenario says under readings`,
    boiler: (efficiency: string) =>
      `efficiency for space heat ${efficiency}, that of the scenario’s boiler: if another boiler was metered, set readings.efficiency`,
  },
  estimated: (count: string) => `${count} estimated: the periods before and after are taken as one`,
  unused: (list: string) => `days of no period: ${list}`,
  to: ' to ',
  covers: ({ file, days }: Said) => `${file} holds ${days}`,
  filled: (hours: string) => `${hours} hours interpolated`,
  takenByDate:
    'The dates were taken at their word: a typical year that was given the stamps of one year would make the result worthless',
  cautions: [
    'The line takes sun and inner gains as the same on all days, and counts what a second heater gives as a smaller loss.',
    'Degree days are those of daily means; the interval counts chance alone, not a wrong efficiency or calorific value.',
  ],
};

/** The words in one language. */
export type FitWords = typeof englishFit;
