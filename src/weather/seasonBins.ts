/** The three reference heating seasons of the European energy label. */
export type SeasonName = 'average' | 'warmer' | 'colder';

/** Hours of a season at one outdoor temperature, °C. */
interface SeasonBin {
  readonly temperature: number;
  readonly hours: number;
}

/** Hours a year in which the unit is on but gives no heat, by what it does then. */
interface IdleHours {
  readonly thermostatOff: number;
  readonly standby: number;
  readonly off: number;
  readonly crankcase: number;
}

/** One reference heating season: climate and idle hours. */
export interface StandardSeason {
  /** Design outdoor temperature, °C. */
  readonly designTemperature: number;
  /** Hours at each outdoor temperature, from the coldest up, in steps of 1 K. */
  readonly bins: readonly SeasonBin[];
  /** Hours at design load that would need the heat of the whole season, as published and rounded, h. */
  readonly equivalentHours: number;
  /** Idle hours of units that only heat, and of those that also cool, h. */
  readonly idleHours: { readonly heatingOnly: IdleHours; readonly reversible: IdleHours };
}

/**
 * The reference heating seasons. No heat is needed in them from 16 °C upwards.
 *
 * Reference: bins, Regulation (EU) 811/2013 annex VII table 12 and 813/2013 annex III table 5 (average); equivalent
 * hours, the same and EN 14825; idle hours, Regulation (EU) 206/2012 annex II table 4, as printed there (the crankcase
 * hours of units that only heat look as if those of `warmer` and `colder` had exchanged their thermostat-off part).
 *
 * @example standardSeasons.average.bins[0] // { temperature: -10, hours: 1 }
 */
export const standardSeasons: Readonly<Record<SeasonName, StandardSeason>> = {
  average: {
    designTemperature: -10,
    bins: binsFrom(
      -10,
      [
        1, 25, 23, 24, 27, 68, 91, 89, 165, 173, 240, 280, 320, 357, 356, 303, 330, 326, 348, 335, 315, 215, 169, 151,
        105, 74,
      ],
    ),
    equivalentHours: 2066,
    idleHours: {
      heatingOnly: { thermostatOff: 179, standby: 0, off: 3672, crankcase: 3851 },
      reversible: { thermostatOff: 179, standby: 0, off: 0, crankcase: 179 },
    },
  },
  warmer: {
    designTemperature: 2,
    bins: binsFrom(2, [3, 22, 63, 63, 175, 162, 259, 360, 428, 430, 503, 444, 384, 294]),
    equivalentHours: 1336,
    idleHours: {
      heatingOnly: { thermostatOff: 755, standby: 0, off: 4345, crankcase: 4476 },
      reversible: { thermostatOff: 755, standby: 0, off: 0, crankcase: 755 },
    },
  },
  colder: {
    designTemperature: -22,
    bins: binsFrom(
      -22,
      [
        1, 6, 13, 17, 19, 26, 39, 41, 35, 52, 37, 41, 43, 54, 90, 125, 169, 195, 278, 306, 454, 385, 490, 533, 380, 228,
        261, 279, 229, 269, 233, 230, 243, 191, 146, 150, 97, 61,
      ],
    ),
    equivalentHours: 2465,
    idleHours: {
      heatingOnly: { thermostatOff: 131, standby: 0, off: 2189, crankcase: 2944 },
      reversible: { thermostatOff: 131, standby: 0, off: 0, crankcase: 131 },
    },
  },
};

function binsFrom(coldest: number, hours: readonly number[]): SeasonBin[] {
  return hours.map((count, step) => ({ temperature: coldest + step, hours: count }));
}
