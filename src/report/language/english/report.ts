import type { FormulaSource, Language } from '../languages.ts';
import { englishAuditor } from './auditor.ts';
import { englishBatch } from './batch.ts';
import { englishCommon } from './common.ts';
import { englishFormulas } from './formulas.ts';
import { englishProfessional } from './professional.ts';

/** Figures of a sentence, already written with their units. */
type Said = Readonly<Record<string, string>>;

/** Every word of the report, in English. */
export const english = {
  language: 'en' as Language,
  title: 'What a heat pump would do in this house',
  skip: 'To the answer',
  contents: 'Parts of this report',
  footer: (version: string) => `Made by Winterledger ${version}. An estimate, no guarantee.`,
  months: englishCommon.months,
  monthsShort: ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'],
  monthLetters: ['J', 'F', 'M', 'A', 'M', 'J', 'J', 'A', 'S', 'O', 'N', 'D'],
  month: englishCommon.month,
  year: englishCommon.year,
  figures: 'Figures',

  client: {
    title: 'The answer',
    use: ({ electricity, heat, factor }: Said) =>
      `In a year with this weather the heat pump would use ${electricity} of electricity to give ${heat} of heat: ${factor} kWh of heat for each kWh bought.`,
    useWithFuel: ({ electricity, fuel, heat, factor }: Said) =>
      `In a year with this weather the heat pump and its boiler would use ${electricity} of electricity and ${fuel} of fuel to give ${heat} of heat: ${factor} kWh of heat for each kWh bought.`,
    noHeat: (electricity: string) =>
      `In a year with this weather no heat is asked; the system would use ${electricity} of electricity standing by.`,
    cost: ({ cost, tariff }: Said) => `Heating would cost ${cost} a year on ${tariff}`,
    cheapest: ({ cost, tariff }: Said) => ` (${cost} on ${tariff}, the cheapest here)`,
    cheaper: ({ boiler, saving }: Said) =>
      `; the boiler would cost ${boiler}, so the heat pump saves ${saving} a year.`,
    dearer: ({ boiler, saving }: Said) =>
      `; the boiler would cost ${boiler}, so the heat pump costs ${saving} a year more.`,
    noTariff: 'What it costs is not said here, for no tariff is entered.',
    boilerAlone: (cost: string) =>
      `The boiler for the same house would cost ${cost} a year; no electricity tariff is entered to compare.`,
    backup: ({ hours, share }: Said) => `The backup would help in ${hours} hours and give ${share} of the heat`,
    noBackup: englishCommon.noBackup,
    cold: ({ hours, heat }: Said) => `, yet in ${hours} hours the rooms would lack heat, ${heat} in all.`,
    warm: ', and the rooms would lack no heat.',
    tiles: {
      electricity: 'Electricity a year',
      factor: 'Heat per kWh bought',
      cost: 'Heating a year',
      saved: 'Saved against the boiler',
      dearer: 'Dearer than the boiler',
      carbon: 'Carbon dioxide a year',
      backupHours: 'Hours with backup',
    },
    costTitle: 'What a year of heating costs',
    costNote: 'Running cost with taxes, fuel and service as entered; the boiler with its pump on the first tariff.',
    boiler: 'The boiler instead',
    changesTitle: 'What could change it most',
    changesCaption: (currency: string) => `More or less in a year, ${currency}`,
    changesCaptionEnergy: 'Electricity more in a year',
    change: 'If …',
    heatingCost: englishCommon.columns.heating,
    saving: 'Saving',
    nothingChanges: 'No heat is asked, so nothing is to be changed.',
    changes: {
      electricity: (share: string) => `electricity were ${share} dearer`,
      fuel: (share: string) => `fuel were ${share} dearer`,
      flow: (kelvin: string) => `the heating water ran ${kelvin} K hotter`,
      rooms: (kelvin: string) => `the rooms were ${kelvin} K warmer`,
    },
    warningsTitle: englishCommon.beforeYouSign,
    noWarnings: 'Nothing out of the ordinary was seen in the entries and in the result.',
    moreWarnings: (count: string) => `And ${count} more, in the part for the auditor.`,
    notTitle: 'What this is not',
    not: [
      'It is an estimate and no guarantee: weather, prices, settings and habits change it.',
      'Sizing, electrical supply and refrigerant work need licensed people; local codes decide.',
      'Hot water: legionella grow in lukewarm water, and water above about 60 °C scalds. Local codes decide on temperatures, hygiene runs and mixing valves.',
    ],
    date: 'Place and date',
    assessor: 'Assessor',
    client: 'Client',
    rests: 'Reckoned hour by hour for one year with the heat pump',
  },

  ...englishProfessional,
  ...englishAuditor,
  ...englishBatch,
  formulas: englishFormulas as readonly FormulaSource[],
};

/** The words of a report in one language; another language is one more object of this type. */
export type ReportWords = typeof english;
