/** Problems of an hour that is asked for by its time. */
export const hourProblems = {
  'hour.unreadable': {
    says: "'{found}' is no date with a time of day that exists",
    cure: 'write it like 2025-01-14T06:00, with an offset such as +01:00 behind it where it is not civil time of the site',
  },
  'hour.twice': {
    says: '{found} occurs twice on that day, as the clocks go back',
    cure: 'write {allowed}',
  },
  'hour.skipped': {
    says: '{found} does not occur: the clocks go forward over it',
    cure: 'the hour after it is {allowed}',
  },
  'hour.other-year': {
    says: '{found} is not in the calendar year of the scenario, {allowed}',
    cure: 'write a time of that year, or another site.calendarYear in the scenario',
  },
  'hour.not-simulated': {
    says: '{found} is not among the simulated hours, {allowed}',
    cure: 'ask for one of these',
  },
} as const;
