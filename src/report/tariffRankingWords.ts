/** Figures of a sentence, already written with their units. */
type Said = Readonly<Record<string, string>>;

/** Every word of a ranking of tariffs, in English. Another language is one more object of the same type. */
export const englishTariffRanking = {
  title: (scenario: string) => `Tariffs for ${scenario}`,
  cheapest: ({ tariff, total, saving, present }: Said) =>
    `The year would cost least on ${tariff}: ${total}, ${saving} less than on ${present}, the present tariff.`,
  presentIsCheapest: ({ tariff, total }: Said) => `The year costs least on the present tariff, ${tariff}: ${total}.`,
  onBill: ({ all, heating, household }: Said) =>
    `On the bill are ${all}: ${heating} of the heating and ${household} of the household.`,
  ownRuns: 'The hybrid chooses its source by each tariff: further tariffs have runs of their own, and their own kWh.',
  withFuel: 'The totals hold the fuel of the hybrid.',
  headings: {
    inPrices: 'Taxes inside the prices',
    onTop: 'Taxes on top of the prices',
    notListed: 'Without any tax',
    mixed: 'Taxes stated in more than one way',
    rates: 'kWh in each rate',
  },
  notAlike: 'Tariffs that state their taxes in different ways are ranked apart: their bills are not alike.',
  columns: {
    tariff: 'Tariff',
    total: 'Year',
    saving: 'Saved',
    week: 'Dearest week',
    weekKWh: 'kWh',
    weekCost: 'Its cost',
  },
  presentMark: (tariff: string) => `${tariff} (present)`,
  withFile: ({ tariff, file }: Said) => `${tariff} [${file}]`,
  days: ({ from, to }: Said) => `${from} – ${to}`,
  daysOfMonth: ({ from, to }: Said) => (from === to ? from : `${from}–${to}`),
  date: ({ day, month }: Said) => `${day} ${month}`,
  weekNote:
    'Saved is against the present tariff. The dearest week runs from Monday to Sunday; its cost is that of its kWh with their taxes, without standing and demand charges.',
  rate: ({ rate, kWh }: Said) => `${rate} ${kWh}`,
  changeOfPlaces: ({ cheaper, dearer, change, now, equal }: Said) =>
    `${cheaper} and ${dearer} change places where every kWh price of ${cheaper} rises by ${change}: from ${now} to ${equal} on the mean, before taxes on top.`,
  noChangeOfPlaces: ({ cheaper, dearer }: Said) =>
    `No rise of its kWh prices would make ${cheaper} as dear as ${dearer}: they cost nothing in all.`,
  equal: ({ cheaper, dearer }: Said) => `${cheaper} and ${dearer} cost the same.`,
};

/** The words of a ranking in one language. */
export type TariffRankingWords = typeof englishTariffRanking;
