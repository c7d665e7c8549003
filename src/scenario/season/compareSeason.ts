import type { SeasonResult } from '../../sim/season/seasonalSum.ts';
import type { DeclaredSeason } from '../labelSchema.ts';

/** Share by which a measured efficiency may miss the declared one. Reference: Regulation (EU) 813/2013 annex IV (from memory). */
export const LABEL_TOLERANCE = 0.08;

/** Declared points sum to their own label within rounding; more than this share is a slip (common practice, no source). */
export const POINTS_TOLERANCE = 0.01;

/** How far one way of rating lies from what it is held against. */
export interface Deviation {
  readonly of: 'scop' | 'efficiency';
  readonly against: 'label' | 'points';
  /** The figures compared. */
  readonly found: number;
  readonly expected: number;
  /** found/expected − 1. */
  readonly share: number;
  readonly agrees: boolean;
}

/** Map and declared points against the label; absent where there is nothing to compare. */
export interface Comparison {
  readonly map?: Deviation;
  readonly points?: Deviation;
}

/**
 * Holds a season from the map and one from declared points against the label.
 *
 * @returns of SCOP and η_s, where the label gives both, the one that lies farther off; a map without a declared figure is
 *   held against the SCOP of the points
 */
export function compareSeason(
  map: SeasonResult | undefined,
  points: SeasonResult | undefined,
  declared: DeclaredSeason | undefined,
): Comparison {
  const ofPoints = points && farthest(deviations(points, declared, POINTS_TOLERANCE));
  const ofMap =
    map &&
    (farthest(deviations(map, declared, LABEL_TOLERANCE)) ??
      (points && deviation('scop', 'points', { found: map.scop, expected: points.scop, tolerance: LABEL_TOLERANCE })));
  return { ...(ofMap ? { map: ofMap } : {}), ...(ofPoints ? { points: ofPoints } : {}) };
}

function deviations(result: SeasonResult, declared: DeclaredSeason | undefined, tolerance: number): Deviation[] {
  const { scop, efficiency } = declared ?? {};
  const list: Deviation[] = [];
  if (scop !== undefined) list.push(deviation('scop', 'label', { found: result.scop, expected: scop, tolerance }));
  if (efficiency !== undefined) {
    list.push(deviation('efficiency', 'label', { found: result.efficiency, expected: efficiency, tolerance }));
  }
  return list;
}

function deviation(
  of: Deviation['of'],
  against: Deviation['against'],
  { found, expected, tolerance }: { found: number; expected: number; tolerance: number },
): Deviation {
  const share = found / expected - 1;
  return { of, against, found, expected, share, agrees: Math.abs(share) <= tolerance };
}

function farthest(list: readonly Deviation[]): Deviation | undefined {
  return list.toSorted((a, b) => Math.abs(b.share) - Math.abs(a.share))[0];
}
