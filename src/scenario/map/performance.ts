import type { Problem } from '../../core/problem.ts';
import { carnotCop } from '../../sim/carnot.ts';
import type { PerformanceTable } from '../../sim/performanceTable.ts';
import { listed, shownNumber } from '../entries/allowedText.ts';
import { type Grid, pointName } from './readGrid.ts';

/** The tables of one level: capacity, and one of COP and input power. */
export interface LevelGrids {
  readonly capacity: Grid;
  /** COP or input power, as `given` says. */
  readonly second: Grid;
  readonly given: 'cop' | 'inputPower';
}

/** A level's table with the grids it came from, for the places of later findings. */
export interface Level {
  readonly table: PerformanceTable;
  readonly grids: LevelGrids;
}

/**
 * Joins capacity with COP or input power into one table, and holds it against what physics allows.
 *
 * @returns the table where the axes agree and no point is impossible; a COP above the Carnot COP κ is an error
 *
 * Reference: MODEL section 6 for κ and for the least number of points of a column, section 15 for η ≤ 1.
 */
export function joinLevel(grids: LevelGrids): { level?: Level; problems: Problem[] } {
  const { capacity, second, given } = grids;
  const problems = axisProblems(capacity, second);
  if (problems.length > 0) return { problems };
  const { outdoor, flow } = capacity;
  const cop = second.values.map((value, i) => {
    const heat = capacity.values[i];
    if (given === 'cop' || value === null) return value;
    return typeof heat === 'number' ? heat / value : null;
  });
  const table: PerformanceTable = { outdoor, flow, capacity: capacity.values, cop };
  problems.push(...sparseColumns(grids, table), ...impossiblePoints(grids, table));
  return problems.length > 0 ? { problems } : { level: { table, grids }, problems };
}

/**
 * Points of a table whose COP is above κ.
 *
 * @param factor on every COP, for a lowest level given as a share of full load
 */
export function pointsAboveCarnot(table: PerformanceTable, factor = 1): { at: number; cop: number; most: number }[] {
  return table.cop.flatMap((value, at) => {
    if (value === null) return [];
    const most = carnotCop(...pointAt(table, at));
    return value * factor > most ? [{ at, cop: value * factor, most }] : [];
  });
}

/** Outdoor and flow temperature of an entry of a table, °C. */
export function pointAt(table: Pick<PerformanceTable, 'outdoor' | 'flow'>, at: number): [number, number] {
  const columns = table.flow.length;
  return [table.outdoor[Math.floor(at / columns)] ?? 0, table.flow[at % columns] ?? 0];
}

/** A problem at an entry of a grid. */
export function pointProblem(grid: Grid, at: number, fault: Pick<Problem, 'code'> & Partial<Problem>): Problem {
  const { file, path } = grid.source;
  return { severity: 'error', ...fault, file, ...grid.places[at], path: `${path}[${pointName(...pointAt(grid, at))}]` };
}

function axisProblems(capacity: Grid, second: Grid): Problem[] {
  const missing = [
    ...lacking('row', capacity.outdoor, second.outdoor),
    ...lacking('column', capacity.flow, second.flow),
  ];
  const surplus = [
    ...lacking('row', second.outdoor, capacity.outdoor),
    ...lacking('column', second.flow, capacity.flow),
  ];
  const { file, path } = second.source;
  const at = { severity: 'error', file, ...second.source.place(1, 1), path } as const;
  const name = capacity.source.path;
  return [
    ...(missing.length > 0
      ? [{ ...at, code: 'map.axes-differ', found: `lacks ${listed(missing)}`, allowed: name } as const]
      : []),
    ...(surplus.length > 0
      ? [{ ...at, code: 'map.axes-differ', found: `has ${listed(surplus)} more`, allowed: name } as const]
      : []),
  ];
}

function lacking(what: string, wanted: readonly number[], there: readonly number[]): string[] {
  return wanted.filter((value) => !there.includes(value)).map((value) => `the ${what} of ${shownNumber(value)} °C`);
}

function sparseColumns(grids: LevelGrids, table: PerformanceTable): Problem[] {
  const columns = table.flow.length;
  const isSparse = (values: readonly (number | null)[], column: number) =>
    values.filter((value, at) => at % columns === column && value !== null).length < 2;
  return table.flow.flatMap((flow, column) => {
    const found = `the column of ${shownNumber(flow)} °C`;
    const grid = isSparse(table.capacity, column) ? grids.capacity : grids.second;
    if (grid === grids.second && !isSparse(table.cop, column)) return [];
    return [{ ...pointProblem(grid, column, { code: 'map.sparse-column', found }), path: grid.source.path }];
  });
}

function impossiblePoints(grids: LevelGrids, table: PerformanceTable): Problem[] {
  if (grids.given === 'inputPower') {
    const idle = table.cop.flatMap((cop, at) => (cop !== null && cop <= 1 ? [at] : []));
    if (idle.length > 0) {
      return idle.map((at) =>
        pointProblem(grids.second, at, {
          code: 'map.input-above-capacity',
          found: String(grids.second.values[at]),
          allowed: String(table.capacity[at]),
        }),
      );
    }
  }
  return pointsAboveCarnot(table).map(({ at, cop, most }) =>
    pointProblem(grids.second, at, {
      code: 'map.above-carnot',
      found: cop.toFixed(2),
      allowed: most.toFixed(2),
    }),
  );
}
