import type { Rating } from './seasonAnswer.ts';

/**
 * Lowest seasonal efficiency that a unit may have on the European market since 26 September 2017, %.
 *
 * @returns η_s of low- (35 °C) and medium-temperature (55 °C) applications in the average climate, for which alone it is set
 * @example lowestPermitted({ climate: 'average', application: 35 }) // 125
 *
 * Reference: Regulation (EU) 813/2013 annex II.
 */
export function lowestPermitted({ climate, application }: Rating): number | undefined {
  if (climate !== 'average') return undefined;
  if (application === 35) return 125;
  return application === 55 ? 110 : undefined;
}
