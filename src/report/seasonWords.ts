/** Figures of a sentence, already written with their units. */
type Said = Readonly<Record<string, string>>;

/** Every word of the label check, in English. Another language is one more object of the same type. */
export const englishSeasons = {
  title: 'Label check',
  climates: { average: 'Average climate', warmer: 'Warmer climate', colder: 'Colder climate' },
  applications: { 35: 'low', 45: 'intermediate', 55: 'medium', 65: 'high' },
  ofSeason: ({ climate, application, level }: Said) => `${climate}, ${application} (${level} temperature)`,

  map: ({ scop, efficiency, electricity, load }: Said) =>
    `the map gives a SCOP of ${scop}, η_s ${efficiency}: ${electricity} of electricity a year for a heat load of ${load}`,
  noMap: 'the map cannot be rated without outlet temperatures',
  points: ({ scop, efficiency, electricity }: Said) =>
    `; the declared points give ${scop}, η_s ${efficiency}, ${electricity}`,
  label: (figures: string) => `; the label says ${figures}`,
  scop: (scop: string) => `SCOP ${scop}`,
  efficiency: (efficiency: string) => `η_s ${efficiency}`,
  agree: { label: 'Map and label agree within 8\u00a0%.', points: 'Map and declared points agree within 8\u00a0%.' },
  disagree: {
    label: (share: string) => `Map and label do NOT agree: ${share}, and 8\u00a0% is allowed.`,
    points: (share: string) => `Map and declared points do NOT agree: ${share}, and 8\u00a0% is allowed.`,
  },
  pointsAgree: 'The points meet their own label.',
  pointsDisagree: (share: string) => `The points do NOT meet their own label: ${share}, and 1\u00a0% is allowed.`,
  permitted: (lowest: string) => `At least ${lowest} is asked for since 26 September 2017 (Regulation (EU) 813/2013).`,

  headings: {
    points: (season: string) => `${season}: declared points beside the map`,
    bins: (season: string) => `${season}: bin by bin`,
  },
  pointsNote:
    'The map is read at the same outdoor and outlet temperature, at the part load or as near to it as it runs without a pause.',
  binsNote: 'Load and heater (electric, COP 1) in kW, electricity in kWh; COP with the loss by cycling.',
  columns: {
    outdoor: '°C',
    outlet: 'Outlet\n°C',
    load: 'Load\nkW',
    capacity: 'kW\ndeclared',
    mapCapacity: 'kW\nmap',
    off: 'off',
    cop: 'COP\ndeclared',
    mapCop: 'COP\nmap',
    hours: 'h',
    binMapCop: 'Map\nCOP',
    binMapHeater: 'Map\nheater',
    binMapElectricity: 'Map\nkWh',
    binPointsCop: 'Points\nCOP',
    binPointsHeater: 'Points\nheater',
    binPointsElectricity: 'Points\nkWh',
  },
};

/** The words of the label check in one language. */
export type SeasonWords = typeof englishSeasons;
