/** Problems of meter readings, and doubts about the heat loss that follows from them. */
export const readingProblems = {
  'readings.no-rows': {
    says: 'no readings were found',
    cure: 'write a line of names, such as “date;reading kWh”, and a line for each reading below it',
  },
  'readings.long-line': {
    says: 'this line has {found} characters; at most {allowed} are read',
    cure: 'this is no table with one reading a line: export the data again as CSV text',
  },
  'readings.too-many-lines': {
    says: 'the file has {found} lines; at most {allowed} are read',
    cure: 'one reading a day is enough; cut the file to the last years',
  },
  'readings.no-names': {
    says: 'the first line has {found} where the names of the columns should be',
    cure: 'add a line of names above it, such as “date;reading kWh”',
  },
  'readings.no-column': {
    says: 'no column for the {path} was recognised; the first line has {found}',
    cure: 'name it in the first line: “date”, and one of “reading” (of the meter), “use” (since the date before) or “fill” (of a tank)',
  },
  'readings.two-columns': {
    says: 'more than one column could be the {path}: {found}',
    cure: 'keep one of them, or give the others another name',
  },
  'readings.no-unit': {
    says: '{path} names no unit, and the scenario gives no energy of one unit',
    cure: 'write the unit into the name of the column, such as “reading kWh” or “reading m³”, or set readings.kWhPerUnit in the scenario',
  },
  'readings.needs-factor': {
    says: '{path} is in {found}, but the energy of one {found} is not known',
    cure: 'set readings.kWhPerUnit in the scenario: for gas the calorific value from the bill (with its state number), for heating oil about 10 kWh a litre',
  },
  'readings.two-units': {
    says: '{path} is in {found}, but readings.kWhPerUnit is {allowed}',
    cure: 'take readings.kWhPerUnit out of the scenario, or correct the unit in the name of the column',
  },
  'readings.no-efficiency': {
    says: 'the efficiency with which the metered energy became heat is not known',
    cure: 'set readings.efficiency in the scenario, such as 0.85 for an old condensing boiler on gross calorific value, or describe its boiler',
  },
  'readings.date': {
    says: 'the date is {found}; a date is written {allowed}',
    cure: 'correct the date',
  },
  'readings.day-month-order': {
    says: 'the dates, such as {found}, may be day/month or month/day, and nothing in the file decides it',
    cure: 'write them as year-month-day, such as 2024-03-31, or as day.month.year, such as 31.3.2024',
  },
  'readings.disorder': {
    says: 'the date {found} comes after {allowed}, which stands in the line before',
    cure: 'put the readings in the order of their dates',
  },
  'readings.same-day': {
    says: '{found} stands here a second time; first in line {allowed}',
    cure: 'keep one of the two, or add fills of one day; a new meter is marked in a column “exchange”',
  },
  'readings.value': {
    says: '{path} is {found}; {allowed}',
    cure: 'correct the cell; where there was no reading, take the line out',
  },
  'readings.decimal': {
    says: 'the values, such as {found}, may be thousands or have three decimals, and nothing in the file decides it',
    cure: 'write them without marks of thousands, or set readings.decimal in the scenario',
  },
  'readings.mark': {
    says: '{path} is {found}; {allowed}',
    cure: 'write x where it holds, and nothing where it does not',
  },
  'readings.falls': {
    says: 'the reading falls to {found}, from {allowed}',
    cure: 'correct the slip of the pen; if the meter was exchanged, write the last reading of the old one and the first of the new one on two lines, and mark the second in a column “exchange”',
  },
  'readings.more': { says: '{found} more problems are not listed', cure: 'correct those listed first' },

  'readings.weather-undated': {
    says: 'the stamps carry no year, so it is not known when this weather was',
    cure: 'name the weather that was measured while the meter ran, under readings.weather in the scenario; a typical year does not serve',
  },
  'readings.weather-typical': {
    says: 'the file puts months of {found} different years together: a typical year, not the weather of the readings',
    cure: 'name the weather that was measured while the meter ran, under readings.weather in the scenario',
  },
  'readings.weather-twice': {
    says: '{found} stands here with another value than in line {allowed}',
    cure: 'remove one of the two lines',
  },
  'readings.weather-missing': {
    says: 'the weather does not cover {found}; it holds {allowed}',
    cure: 'name the weather that was measured while the meter ran, under readings.weather in the scenario; several files and parts of years are allowed, a typical year does not serve',
  },

  'readings.too-few-periods': {
    says: '{found} between readings; below {allowed} nothing can be said',
    cure: 'take readings for a year, one a month',
  },
  'readings.no-cold-days': {
    says: 'no period has a day below {allowed}: there was no heating to be measured',
    cure: 'add readings of a winter',
  },
  'readings.alike': {
    says: 'the periods are too alike: heat loss and base temperature cannot be told apart',
    cure: 'add readings of other seasons: deep winter, spring and summer',
  },
  'readings.no-slope': {
    says: 'the use does not rise as it gets colder: {found} {unit} a degree day',
    cure: 'check that this meter feeds the heating, the dates, and that the weather is that of the place and the time',
  },

  'readings.few-periods': {
    says: '{found} between readings are few; a year of monthly readings gives {allowed}',
    cure: 'take the interval in earnest, and read the meter on',
  },
  'readings.few-heated': {
    says: 'only {found} with heating; three or more show the slope',
    cure: 'add readings of the heating season',
  },
  'readings.no-summer': {
    says: 'no period lies outside the heating season: hot water and base temperature rest on the line alone',
    cure: 'add readings of a summer',
  },
  'readings.poor-line': {
    says: 'R² is {found}; at least {allowed} is asked: the use does not follow the outdoor temperature',
    cure: 'look for another heater (stove, electric), absence, rooms heated at times, works on house or boiler, wrong dates, or weather of another place',
  },
  'readings.scatter': {
    says: 'CV(RMSE) is {found}; at most {allowed} is asked: the periods scatter widely about the line',
    cure: 'look at the periods with the largest difference: a reading that was estimated, absence, another heater, works on house or boiler',
  },
  'readings.base-at-end': {
    says: 'the base temperature is {found}, an end of the range that is searched ({allowed})',
    cure: 'the line has no bend where a house has one: look for readings that were estimated, summer use that is no hot water, or a meter that feeds other things',
  },
  'readings.implausible-loss': {
    says: 'the heat loss comes to {found} {unit}; houses lie within {allowed}',
    cure: 'check unit and energy of the readings, and the floor area',
  },
} as const;
