/** What stands in the files of a blank start, in English. */
export const englishBlank = {
  house: 'New house',
  houseSays: 'A house, entered in the sheet. Comments may be added anywhere; they stay.',
  weatherSays: 'Hourly weather of one year.',
  tariffsSay: 'Electricity tariffs to compare; the first is the present one.',
  unit: 'New unit',
  unitSays: 'A heat-pump unit, as its data sheet prints it.',
  capacitySays: 'Heat, kW',
  copSays: 'Heat out per unit of electricity in',
  tariff: (number: number) => `Tariff ${number}`,
  ratesSay: 'The first rate that fits a minute prices it; one without times takes what is left.',
  allHours: 'all hours',
};

/** What stands in the files of a blank start, in one language. */
export type BlankWords = typeof englishBlank;
