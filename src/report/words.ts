import { englishCommon } from './language/english/common.ts';

/** Figures of a sentence, already written with their units. */
type Said = Readonly<Record<string, string>>;

/**
 * Every word that a report is made of, in English. Another language is one more object of the same type.
 */
export const english = {
  of: 'Unit',
  months: englishCommon.months,
  year: englishCommon.year,
  headings: {
    costs: 'Cost of a year on each tariff',
    comparison: (tariff: string) => `Against the boiler, on ${tariff}`,
    months: 'Month by month, kWh',
    hoursOfDay: (unit: string) => `What one kWh more costs by the hour of the day, in the mean of the year${unit}`,
    warnings: englishCommon.beforeYouSign,
    assumptions: englishCommon.assumed,
    weather: 'How the weather file was understood',
    inputs: 'Files this rests on (beginning of their SHA-256)',
  },
  columns: {
    ...englishCommon.columns,
    ...englishCommon.monthColumns,
    taxes: 'Taxes',
    bill: 'Bill',
    month: englishCommon.month,
    need: 'Need',
    factor: 'H4',
  },
  heatingByHour: 'Heating takes',
  billNote: (household: string) => `The bill is that of the heating and of ${household} of the household together.`,
  billNoteAlone: 'The bill is that of the heating alone: no electricity of a household is entered.',
  costsNote:
    'Heating is the bill less that of the household alone, with the fuel of a hybrid and the service entered for it.',

  use: ({ electricity, heat, factor }: Said) =>
    `In a year the heat pump and its backup would use ${electricity} for ${heat} of heat: a seasonal factor H4 of ${factor}, so each kWh bought gives ${factor} kWh of heat.`,
  useWithFuel: ({ electricity, fuel, heat, factor }: Said) =>
    `In a year the heat pump and its boiler would use ${electricity} of electricity and ${fuel} of fuel for ${heat} of heat: a seasonal factor H4 of ${factor}, so each kWh bought, fuel included, gives ${factor} kWh of heat.`,
  electricityOf: (amount: string) => `${amount} of electricity`,
  noHeat: (electricity: string) =>
    `No heat would be given in the year; the system would use ${electricity} of electricity standing by.`,

  backup: ({ hours, heat }: Said) => `The backup would run in ${hours} hours and give ${heat}`,
  backupForWater: (heat: string) => `, ${heat} of it for hot water`,
  noBackup: englishCommon.noBackup,
  unmet: (heat: string) => `; ${heat} that the rooms need would be missing.`,
  lessThanOne: 'less than 1 kWh',
  noUnmet: ', and no heat would be missing.',

  costs: (list: string) => `The heating would cost ${list} a year`,
  costOn: ({ cost, tariff }: Said) => `${cost} on ${tariff}`,
  costsFromTo: ({ least, most, cheapest, dearest }: Said) => `from ${least} on ${cheapest} to ${most} on ${dearest}`,
  and: ' and ',
  boilerCosts: (cost: string) => `; the boiler for the same house ${cost}`,
  cheaper: ({ saving, tariff }: Said) => `, so on ${tariff} the heat pump saves ${saving}.`,
  dearer: ({ saving, tariff }: Said) => `, so on ${tariff} the heat pump costs ${saving} more.`,
  boilerAlone: (cost: string) => `The boiler for the same house would cost ${cost} a year.`,

  breakEvenPrice: ({ price, now }: Said) =>
    `A year costs the same on both where the heat pump’s electricity costs ${price} on the mean (now ${now})`,
  breakEvenFactor: ({ factor, now }: Said) =>
    `, or where each kWh of electricity gives ${factor} kWh of heat (now ${now}).`,
  noBreakEvenFactor: '.',
  notEvenFree: 'Even with free electricity a year with the heat pump would cost more than with the boiler.',
  noElectricity: 'The heat pump takes no electricity, so no price of it would make both cost the same.',
  wholeLife: ({ years, rate, capital, value }: Said) =>
    `Over ${years} years at ${rate} a year: net capital ${capital}, net present value ${value}.`,
  payback: ({ simple, discounted }: Said) => `Payback: simple ${simple}; discounted ${discounted}.`,
  paybackYears: (years: string) => `after ${years} years`,
  paybackBeyondLife: ', longer than what is looked at',
  paybackAtOnce: 'at once, for there is no capital to be paid back',
  paybackNever: { simple: 'never', discounted: (years: string) => `never within ${years} years` },
  sensitivity: 'Saved in a year where a kWh costs more or less than now:',
  sensitivityOverLife:
    'Saved in a year where a kWh costs more or less than now, and behind the stroke the net present value:',
  electricityAt: (change: string) => `electricity ${change}`,
  fuelAt: (change: string) => `fuel ${change}`,
  asNow: 'as now',

  carbon: (mass: string) => `It would emit ${mass} of carbon dioxide`,
  carbonOfBoiler: (mass: string) => `, the boiler ${mass}`,
  noCarbonFactor: 'Its carbon dioxide is not known: a carbon factor of the fuel is missing.',

  house: ({ heatLoss, designLoad }: Said) => `House: heat loss ${heatLoss}, design load ${designLoad}.`,
  housePerArea: (loss: string) => `Per area of floor that is ${loss}.`,
  starts: (count: string) => `About ${count} compressor starts a year, an estimate.`,
  outside: ({ outside, below }: Said) => `Hours outside the unit’s table: ${outside}; below its lowest flow: ${below}.`,
  hotWater: ({ asked, short, loss }: Said) =>
    `Hot water: ${asked} asked, ${short} of it not delivered; the cylinder loses ${loss}.`,
  factors: ({ h2, h3, h4 }: Said) =>
    `Seasonal factors: H2 ${h2} (unit alone), H3 ${h3} (with backup), H4 ${h4} (with pump).`,
  fieldStudies: (list: string) =>
    `Field studies of homes found ${list}: ranges to think with, not targets. heatPump.inUseAllowance takes an allowance.`,
  fieldStudy: ({ factors, place }: Said) => `${factors} (${place})`,

  degreeDays: {
    kinds: { heating: 'Heating degree days', cooling: 'Cooling degree days' },
    title: ({ kind, base, method }: Said) =>
      method === 'threshold' ? `${kind}, threshold` : `${kind} to ${base}, ${method}`,
    column: 'K·d',
    methods: {
      heating: {
        hours: 'Each hour counts by what it lies below the base (ISO 15927-6).',
        mean: 'Each day counts by what its mean lies below the base.',
        minmax: 'Each day counts by what the middle of its extremes lies below the base (the US convention).',
        fourcase: 'Each day counts by its extremes, with rules for days that cross the base (the UK convention).',
        threshold:
          'Days with a mean of 15 °C or less count by their distance to 18 °C (European statistics); no base is used.',
      },
      cooling: {
        hours: 'Each hour counts by what it lies above the base, as ISO 15927-6 counts what lies below.',
        mean: 'Each day counts by what its mean lies above the base.',
        minmax: 'Each day counts by what the middle of its extremes lies above the base (the US convention).',
        fourcase:
          'Each day counts by what of its extremes lies above the base, with rules for days that cross it (the UK convention).',
        threshold:
          'Days with a mean of 24 °C or more count by their distance to 21 °C (European statistics); no base is used.',
      },
    },
  },

  weather: {
    columns: (list: string) => `columns ${list}`,
    rows: ({ rows, step }: Said) => `${rows} rows, one every ${step}`,
    minutes: (count: string) => `${count} min`,
    stamps: { begin: 'a stamp marks the beginning of its step', end: 'a stamp marks the end of its step' },
    offset: (offset: string) => `standard time ${offset}`,
    repaired: ({ hours, column }: Said) => `${hours} hours of ${column} interpolated`,
  },

  cautions: [
    'This is an estimate and no guarantee: weather, settings and habits change it.',
    'Sizing, electrical supply and refrigerant work need licensed people.',
    'Local codes decide on hot-water hygiene.',
  ],
};

/** The words of a report in one language. */
export type Words = typeof english;
