/** Problems of tariff files, series of values over time (prices, meter readings, factors) and civil time. */
export const tariffProblems = {
  'clock.unknown-zone': {
    says: '{path} is {found}, which is no time zone of the IANA list',
    cure: 'write it as area and city, such as Europe/Berlin or America/New_York',
  },
  'clock.calendar-year': {
    says: '{path} is {found}; allowed is {allowed}',
    cure: 'write the year whose weekdays and clock changes are wanted',
  },
  'clock.common-year': {
    says: 'the weather has {found} hours, but {path} is a year without 29 February',
    cure: 'choose a leap year for the calendar, or a weather file of 8760 hours',
  },
  'clock.hours': {
    says: 'the weather has {found} hours; a year has {allowed}',
    cure: 'name a weather file that holds one whole year',
  },
  'tariff.none': {
    says: 'no tariff is named, neither in the scenario nor beside it',
    cure: 'name tariff files behind the scenario, or under tariffs in it',
  },
  'tariff.no-price': {
    says: 'this tariff has no price for electricity',
    cure: 'give rates, a price series or blocks',
  },
  'tariff.time-of-day': {
    says: '{path} is {found}, which is no time of day',
    cure: 'write hours and minutes in quotes, from 00:00 to 23:59; an end may be 24:00',
  },
  'tariff.no-such-date': {
    says: '{path} is {found}, a date that does not exist',
    cure: 'write YYYY-MM-DD, or MM-DD for every year',
  },
  'tariff.rate-without-time': {
    says: '{path} is {found}, the same as its beginning',
    cure: 'leave both times out for the whole day',
  },
  'tariff.unpriced': {
    says: 'no rate covers {found}',
    cure: 'put a rate without times and days at the end of the list: it takes whatever is left',
  },
  'tariff.rate-never-used': {
    says: '{path} ({found}) never applies in the year: other rates come first, or its days do not occur',
    cure: 'move it up in the list, change its times or days, or take it out',
  },
  'tariff.no-holidays': {
    says: '{path} is {found}, but no holiday is listed',
    cure: "list the dates under 'holidays'",
  },
  'tariff.holidays-of-other-years': {
    says: 'none of the dated holidays lies in the calendar year {allowed}; the first is {found}',
    cure: 'list the dates of that year, or write MM-DD for dates that return every year',
  },
  'tariff.block-order': {
    says: '{path} is {found}; allowed is {allowed}',
    cure: "let 'upTo' rise from block to block, and leave it out in the last one only",
  },
  'tariff.series-unread': {
    says: 'the price series {found} could not be used, so this tariff cannot be priced',
    cure: 'cure the faults of the series first',
  },
  'series.long-line': {
    says: 'this line has {found} characters; at most {allowed} are read',
    cure: 'this is no table with one value a line: export the data again as CSV text',
  },
  'series.too-many-lines': {
    says: 'the file has {found} lines; at most {allowed} are read',
    cure: "cut the file to the scenario's calendar year",
  },
  'series.quotes': {
    says: 'a quotation mark is not closed or stands in the wrong place',
    cure: 'put quotation marks at both ends of a cell, or at neither',
  },
  'series.column': {
    says: 'the column {found} of {path} is not there; the file has {allowed}',
    cure: 'name the columns: timeColumn and {unit}',
  },
  'series.empty': {
    says: 'the file has {found}; at least {allowed} are needed',
    cure: 'each line holds one stamp and one value',
  },
  'series.stamp': {
    says: '{found} is no stamp; allowed is {allowed}',
    cure: "give each stamp its offset, or say by the key 'stamps' that they are 'utc' or 'local'",
  },
  'series.no-such-time': {
    says: '{found} does not exist in {allowed}: the clocks were put forward over it',
    cure: 'take the line out, or write the stamps with their offset from UTC',
  },
  'series.value': {
    says: '{found} is no {unit}; allowed is {allowed}',
    cure: 'write a plain number, such as 0.2415; every stamp needs one',
  },
  'series.decimal': {
    says: 'the comma in {found} may divide decimals or thousands',
    cure: "say by the key 'decimal' that it is 'comma' or 'point', and write no thousands marks",
  },
  'series.step': {
    says: 'the {unit} are {found} apart; allowed is {allowed}',
    cure: 'use {unit} by the hour or finer, in steps of whole minutes',
  },
  'series.gap': {
    says: 'before {found} {unit} are missing: {allowed}',
    cure: 'complete the file; with a local clock, also the hour that occurs twice in autumn',
  },
  'series.repeat': {
    says: '{found} occurs a second time',
    cure: 'leave one {unit} for each stamp',
  },
  'series.disorder': {
    says: '{found} stands after a later stamp',
    cure: 'sort the lines by time',
  },
  'series.irregular': {
    says: '{found} is out of step; the {unit} are {allowed} apart',
    cure: 'keep one step throughout the file',
  },
  'series.more': {
    says: 'there are {found} more faults in this file',
    cure: 'cure those above first; they often have one cause',
  },
  'series.short': {
    says: 'the {unit} series does not reach {found}',
    cure: "use a series that holds the scenario's whole calendar year",
  },
  'series.of-other-year': {
    says: 'for {found} hours the {unit} of a year before or after was taken; the series holds {allowed}',
    cure: "use a series of the scenario's calendar year, or set the calendar year to that of the series",
  },
  'tariff.supplier-order': {
    says: '{path} is {found}; allowed is {allowed}',
    cure: 'list the suppliers in the order of the year, the first without a date',
  },
  'tariff.supplier-currency': {
    says: 'the currency is {found}, that of the supplier before is {allowed}',
    cure: 'state both tariffs in one currency',
  },
} as const;
