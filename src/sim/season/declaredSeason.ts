import { standardSeasons } from '../../weather/seasonBins.ts';
import { type BinPerformance, type SeasonResult, seasonalSum } from './seasonalSum.ts';
import { cyclingCop, partLoadRatio, type SeasonCase } from './seasonCase.ts';

/** A declared point: outdoor temperature °C, capacity kW, COP, degradation C_c. */
export interface DeclaredPoint {
  readonly outdoor: number;
  readonly capacity: number;
  readonly cop: number;
  readonly degradation: number;
}

/**
 * Season from the points that a maker declares.
 *
 * @param seasonCase climate, design load, idle powers
 * @param points at least two outdoor temperatures
 * @param bivalent bivalent temperature T_biv, °C
 * @returns the season; the COP of a point is degraded by its own capacity ratio, then linear in outdoor temperature, held
 *   below the coldest and extended along the two warmest; capacity matters below T_biv only, linear from there to the
 *   coldest point at or above the operating limit
 *
 * Reference: EN 14825; MODEL section 14.
 */
export function declaredSeason(
  seasonCase: SeasonCase,
  points: readonly DeclaredPoint[],
  bivalent: number,
): SeasonResult {
  const { designTemperature } = standardSeasons[seasonCase.season];
  const loadAt = (outdoor: number) => seasonCase.designLoad * partLoadRatio(outdoor, designTemperature);
  const sorted = distinct(points).map((point) => ({
    ...point,
    cop: degraded(point, loadAt(point.outdoor)),
  }));
  const atBivalent = sorted.find((point) => point.outdoor === bivalent)?.capacity ?? loadAt(bivalent);
  const limit = sorted.find((point) => point.outdoor >= seasonCase.operatingLimit && point.outdoor < bivalent);
  return seasonalSum(seasonCase, (outdoor, load): BinPerformance => {
    const cop = copAt(sorted, outdoor);
    if (outdoor >= bivalent) return { capacity: Math.max(load, atBivalent), cop };
    if (limit === undefined || outdoor <= limit.outdoor) return { capacity: limit?.capacity ?? atBivalent, cop };
    const along = (bivalent - outdoor) / (bivalent - limit.outdoor);
    return { capacity: atBivalent + (limit.capacity - atBivalent) * along, cop };
  });
}

/** A unit whose capacity is at most so much above the part load runs through: the ±10 % rule of EN 14825 (from memory). */
const RUNS_THROUGH = 1.1;

function degraded({ cop, capacity, degradation }: DeclaredPoint, load: number): number {
  return capacity <= RUNS_THROUGH * load ? cop : cyclingCop(cop, load / capacity, degradation);
}

/** Points by rising temperature, each temperature once: makers repeat T_biv and TOL. */
function distinct(points: readonly DeclaredPoint[]): DeclaredPoint[] {
  const sorted = points.toSorted((a, b) => a.outdoor - b.outdoor);
  return sorted.filter((point, i) => point.outdoor !== sorted[i - 1]?.outdoor);
}

function copAt(sorted: readonly DeclaredPoint[], outdoor: number): number {
  if (outdoor <= sorted[0].outdoor) return sorted[0].cop;
  let next = sorted.findIndex((point) => point.outdoor >= outdoor);
  if (next === -1) next = sorted.length - 1;
  const a = sorted[next - 1];
  const b = sorted[next];
  return a.cop + ((b.cop - a.cop) * (outdoor - a.outdoor)) / (b.outdoor - a.outdoor);
}
