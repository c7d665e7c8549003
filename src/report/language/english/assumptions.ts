import type { AssumptionWords } from '../assumptionWords.ts';

/** What a result rests on, in English. */
export const englishAssumptions: AssumptionWords = {
  ofDefault: ({ value, unit, says }) => `${String(value)}${unit === undefined ? '' : ` ${unit}`}. ${says}`.trimEnd(),
  rules: {
    'weather.no-humidity': ({ humidity }) => `The file has no humidity: ${humidity} % in every hour.`,
    'weather.no-pressure': ({ altitude }) => `The file has no pressure: the standard atmosphere at ${altitude} m.`,
    'house.base-from-gains': () =>
      'The base temperature follows from set point, gains and heat loss; the house stores a day’s sun.',
    'limits.flow-of-map': ({ flow }) => `${flow} °C, the highest flow of the unit’s map.`,
    'limits.no-lowest-outdoor': () => 'None is entered: the unit runs however cold it is.',
    'circulation.water-by-rule': ({ water }) =>
      `${water.toFixed(0)} L, by rule of thumb (20 L a kW, at least 100 L; common practice, no source). Only the estimate of starts depends on it.`,
    'hot-water.profile-of-day': () => 'Spread over the day as in tapping profile M.',
    'backup.none': () => 'There is no backup heater.',
    'backup.first-tariff-drives': () =>
      'The first tariff drives the year; every further tariff has a run of its own, for its costs alone.',
    'household.none': () => 'No electricity of a household is entered: the bill is that of the heating alone.',
    'household.even': () => 'Even over the hours of the day.',
    'boiler.cylinder-loss': () => 'That of the heat pump’s run.',
    'boiler.hot-water-efficiency': () => 'That for space heat, of a condensing boiler at its hottest return.',
    'fuel.published-factor': ({ factor, calorificValue }) =>
      `${factor.toFixed(3)} kg/kWh. Regulation (EU) 2018/2066, on ${calorificValue} calorific value.`,
  },
};
