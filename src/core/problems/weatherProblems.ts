/** Problems of weather files. */
export const weatherProblems = {
  'weather.long-line': {
    says: 'this line has {found} characters; at most {allowed} are read',
    cure: 'this is no table with one hour a line: export the data again as CSV text',
  },
  'weather.too-many-lines': {
    says: 'the file has {found} lines; at most {allowed} are read',
    cure: 'cut the file to the station and the year that are wanted',
  },
  'weather.too-many-columns': {
    says: 'this line has {found} cells; at most {allowed} are read',
    cure: "check the delimiter (set 'delimiter'), or export fewer columns",
  },
  'weather.no-rows': {
    says: 'no rows of numbers were found',
    cure: "check the file; set 'delimiter', 'decimal' or 'skipLines' where it is unusual",
  },
  'weather.no-such-column': {
    says: '{path} is {found}, which the file does not have; it has {allowed}',
    cure: 'write the name as it stands in the header, or the number of the column counted from 1',
  },
  'weather.repeated-name': {
    says: '{path} is {found}, a name that the header gives more than once ({allowed})',
    cure: 'write the number of the column instead',
  },
  'weather.no-temperature': {
    says: 'no column for the outdoor temperature was recognised; the file has {found}',
    cure: "name it by 'columns: {temperature: …}', with its header or its number",
  },
  'weather.two-columns': {
    says: 'more than one column could be the {path}: {found}',
    cure: "choose one by 'columns: {{path}: …}'",
  },
  'weather.no-names': {
    says: 'the file has no header and several columns of numbers: {found}',
    cure: "say which is which by number, such as 'columns: {temperature: 2, relativeHumidity: 3}'",
  },
  'weather.column-holds-stamps': {
    says: 'the {path} should be here, but the column holds dates or times such as {found}',
    cure: "the names in the header seem exchanged: say by number which column is which under 'columns'",
  },
  'weather.column-not-numbers': {
    says: 'the {path} should be here, but the column holds text such as {found}',
    cure: "name another column under 'columns', or set 'decimal' if the decimal mark was mistaken",
  },
  'weather.column-implausible': {
    says: 'most values of the {path} are impossible, such as {found}; possible is {allowed}',
    cure: "name another column under 'columns', or the unit under 'units'",
  },
  'weather.unit-guessed': {
    says: 'the {path} is taken as {unit}: the header names no unit, and the values run {found}',
    cure: "state it under 'units' to be sure",
  },
  'weather.wide-row': {
    says: 'this line has {found} cells, the header or the other lines have {allowed}',
    cure: "is the comma a decimal mark here? Set 'delimiter' and 'decimal', or put such cells in quotes",
  },
  'weather.short-row': {
    says: 'this line has {found} cells; the columns in use need {allowed}',
    cure: 'complete the line, or remove it',
  },
  'weather.text-cell': {
    says: '{path} is {found}; a number is needed',
    cure: "correct the cell; if this marks a missing value, list it under 'missing'",
  },
  'weather.impossible-value': {
    says: '{path} is {found} {unit}; possible is {allowed}',
    cure: "correct the cell; if this marks a missing value, list it under 'missing'; or check the unit",
  },
  'weather.stamp': {
    says: '{path} is {found}, which is no date and time of the form {allowed}',
    cure: "correct the stamp, or state the form of all stamps by 'stampFormat'",
  },
  'weather.day-month-order': {
    says: 'the dates, such as {found}, may be day/month or month/day, and nothing in the file decides it',
    cure: "state it by 'stampFormat', such as 'dd/MM/yyyy HH:mm' or 'MM/dd/yyyy HH:mm'",
  },
  'weather.stamp-format': {
    says: '{path} is {found}; no stamp of the file has this form, the first is {allowed}',
    cure: 'use luxon tokens: yyyy year, MM month, dd day, HH hour, mm minute, ZZ offset; text in single quotes',
  },
  'weather.loose-format': {
    says: '{path} is {found}: it holds a part of varying length twice, or more than eight of them',
    cure: 'write parts of two digits as MM, dd, HH, mm and ss, and what always stands there in single quotes',
  },
  'weather.unread-stamps': {
    says: '{path} seems to hold the stamps, but {found} is of no form that is recognised',
    cure: "state the form by 'stampFormat', such as 'dd-MMM-yyyy HH:mm'",
  },
  'weather.some-offsets': {
    says: 'some stamps carry an offset from UTC, others such as {found} do not',
    cure: 'write all stamps with their offset, or all without',
  },
  'weather.row-count': {
    says: 'the file has no stamps and {found} rows; without stamps a whole year of {allowed} rows is needed',
    cure: "use a complete year, or a file with stamps; if it has stamps, name their column under 'columns'",
  },
  'weather.several-stations': {
    says: 'the file holds several stations: {found}',
    cure: "choose one by 'station: {column: {path}, value: …}'",
  },
  'weather.no-such-station': {
    says: 'the station {found} is not in the file; it has {allowed}',
    cure: "write the value as it stands in the file under 'station'",
  },
  'weather.several-years': {
    says: 'the file holds several years: {found}',
    cure: "choose one by 'year: …'",
  },
  'weather.no-such-year': {
    says: 'the year {found} is not in the file; it has {allowed}',
    cure: "choose one of these by 'year'",
  },
  'weather.coarse-step': {
    says: 'the rows are {found} apart; hourly or finer data is needed',
    cure: 'get hourly data: a heat pump cannot be judged from coarser means',
  },
  'weather.odd-step': {
    says: 'the rows are {found} apart, which does not divide the hour evenly',
    cure: 'use data in steps of 60, 30, 20, 15, 12, 10, 6, 5, 4, 3, 2 or 1 minutes',
  },
  'weather.off-step': {
    says: 'the stamp {found} is out of step with the others, which lie {allowed}',
    cure: 'correct the stamp',
  },
  'weather.clock-needs-zone': {
    says: "the stamps keep the local clock, but the site's time zone is not known",
    cure: "give the site its 'zone', such as Europe/Berlin",
  },
  'weather.unknown-zone': {
    says: 'the zone {found} is no time zone of the IANA list',
    cure: 'write it as area and city, such as Europe/Berlin or America/New_York',
  },
  'weather.clock-needs-year': {
    says: 'the stamps keep the local clock, but carry no year that would tell when the clock changes',
    cure: "use 'clock: standard' if they keep standard time, or a file whose stamps have years",
  },
  'weather.no-such-clock-time': {
    says: '{found} does not exist in {allowed}: the clock is put forward over it',
    cure: "correct the stamp; if the file keeps standard time all year, set 'clock: standard'",
  },
  'weather.duplicate': {
    says: '{found} stands here with other values than in line {allowed}',
    cure: 'remove one of the two lines',
  },
  'weather.repeated-row': {
    says: '{found} stands here a second time, with the same values as line {allowed}; one of them is used',
    cure: 'remove one of the two lines',
  },
  'weather.disorder': {
    says: 'the rows are not in the order of time; the first out of order is {found}; they were sorted',
    cure: 'check that the stamps are right',
  },
  'weather.absent-hours': {
    says: 'the file leaves out {found}',
    cure: "complete the file, or set 'absentHours: fill' to interpolate up to 6 hours on end",
  },
  'weather.part-year': {
    says: 'the file holds {found} of a year; missing: {allowed}',
    cure: 'a whole year is needed: get the missing part',
  },
  'weather.long-gap': {
    says: '{path} has no value for {found} after this line; at most {allowed} on end are interpolated',
    cure: 'complete the column from a neighbouring station, or leave the column out if it is not needed',
  },
  'weather.spike': {
    says: '{path} is {found} {unit} in this hour, {allowed} away from the hour before and the hour after',
    cure: 'check the value; it was used as it is',
  },
  'weather.looks-end-stamped': {
    says: 'the stamps run from {found}, as if each marked the end of its step; they were taken as the beginning',
    cure: "set 'stamps: end' or 'stamps: begin' to decide it",
  },
  'weather.more': {
    says: '{found} more of {path} are not listed',
    cure: 'correct those listed first; they often have one cause',
  },
} as const;
