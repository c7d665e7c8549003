import type { Problem } from '../../core/problem.ts';
import { carnotCop } from '../../sim/carnot.ts';
import type { PerformanceTable } from '../../sim/performanceTable.ts';
import { type Level, pointAt, pointProblem } from './performance.ts';
import type { Grid } from './readGrid.ts';

/** How far a point may lie off the line between its outdoor neighbours, as a share of it (common practice, no source). */
const COP_TOLERANCE = 0.15;
/** Capacity has bends of its own, by control and by frost, so more is let pass (common practice, no source). */
const CAPACITY_TOLERANCE = 0.4;
/** COP may rise with the flow temperature by so much, for rounding in print. */
const RISE_TOLERANCE = 0.02;
/** Outdoor temperatures between which frost shows in integrated values, °C, and by how much (MODEL section 7). */
const FROST_RANGE = { coldest: -3, warmest: 6 };
const FROST_DIP = 0.02;

/** A value of one flow column: its place in the table, its outdoor temperature, itself. */
interface Point {
  readonly at: number;
  readonly outdoor: number;
  readonly value: number;
}

/**
 * Warnings of points that look mistyped: off the line of their outdoor neighbours while the others fit, or a COP that rises
 * with the flow temperature.
 */
export function mistypedPoints(level: Level): Problem[] {
  const { table, grids } = level;
  const eta = shareOfCarnot(table);
  const problems = table.flow.flatMap((_, column) => [
    ...suspect(grids.second, columnPoints(table, eta, column), COP_TOLERANCE, 'COP'),
    ...suspect(grids.capacity, columnPoints(table, table.capacity, column), CAPACITY_TOLERANCE, 'capacity'),
  ]);
  return [...problems, ...risingCop(level)];
}

/**
 * Warnings of rows near 0 °C that sag below the line between their neighbours: such values hold the loss by frost already.
 *
 * Reference: MODEL section 7; meant for units whose frost is found by humidity.
 */
export function integratedLooking(level: Level): Problem[] {
  const { table, grids } = level;
  const kinds = [
    { grid: grids.capacity, values: table.capacity, found: 'the capacity' },
    { grid: grids.second, values: shareOfCarnot(table), found: 'the COP' },
  ];
  return kinds.flatMap(({ grid, values, found }) => {
    const sagging = table.flow
      .flatMap((_, column) => offLine(columnPoints(table, values, column)))
      .filter(({ point, share }) => isNearFrost(point.outdoor) && share < -FROST_DIP);
    const worst = sagging.sort((a, b) => a.share - b.share)[0];
    if (worst === undefined) return [];
    const by = `${(-100 * worst.share).toFixed(0)} %`;
    return [
      pointProblem(grid, worst.point.at, { code: 'map.looks-integrated', severity: 'warning', found, allowed: by }),
    ];
  });
}

function isNearFrost(outdoor: number): boolean {
  return outdoor >= FROST_RANGE.coldest && outdoor <= FROST_RANGE.warmest;
}

function shareOfCarnot(table: PerformanceTable): (number | null)[] {
  return table.cop.map((cop, at) => (cop === null ? null : cop / carnotCop(...pointAt(table, at))));
}

function columnPoints(table: PerformanceTable, values: readonly (number | null)[], column: number): Point[] {
  return table.outdoor.flatMap((outdoor, row) => {
    const at = row * table.flow.length + column;
    const value = values[at];
    return typeof value === 'number' ? [{ at, outdoor, value }] : [];
  });
}

/** How far each point with neighbours on both sides lies off the line between them, as a share of the line. */
function offLine(points: readonly Point[]): { point: Point; share: number }[] {
  return points.slice(1, -1).flatMap((point, i) => {
    const before = points[i];
    const after = points[i + 2];
    if (before === undefined || after === undefined) return [];
    const part = (point.outdoor - before.outdoor) / (after.outdoor - before.outdoor);
    return [{ point, share: point.value / (before.value + (after.value - before.value) * part) - 1 }];
  });
}

/** The one point of a column whose absence lets all others fit; none where they fit, or where no single one explains it. */
function suspect(grid: Grid, points: readonly Point[], tolerance: number, found: string): Problem[] {
  const worstOf = (some: readonly Point[]) => Math.max(0, ...offLine(some).map(({ share }) => Math.abs(share)));
  if (worstOf(points) <= tolerance) return [];
  const culprits = points
    .map((point) => ({ point, worst: worstOf(points.filter((other) => other !== point)) }))
    .sort((a, b) => a.worst - b.worst);
  // Of three points the outer two always fit; the middle one is named, as it is the one off their line.
  const culprit = points.length === 3 ? points[1] : culprits[0]?.point;
  if (culprit === undefined || (culprits[0]?.worst ?? 1) > tolerance) return [];
  return [pointProblem(grid, culprit.at, { code: 'map.looks-mistyped', severity: 'warning', found })];
}

function risingCop(level: Level): Problem[] {
  const { table, grids } = level;
  const columns = table.flow.length;
  return table.outdoor.flatMap((_, row) => {
    for (let column = 1; column < columns; column++) {
      const at = row * columns + column;
      const cooler = table.cop[at - 1];
      const hotter = table.cop[at];
      if (typeof cooler === 'number' && typeof hotter === 'number' && hotter > cooler * (1 + RISE_TOLERANCE)) {
        const found = hotter.toFixed(2);
        return [
          pointProblem(grids.second, at, {
            code: 'map.rising-cop',
            severity: 'warning',
            found,
            allowed: cooler.toFixed(2),
          }),
        ];
      }
    }
    return [];
  });
}
