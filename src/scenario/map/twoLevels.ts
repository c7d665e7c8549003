import type { Problem } from '../../core/problem.ts';
import type { PerformanceTable } from '../../sim/performanceTable.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { type Level, pointAt, pointProblem, pointsAboveCarnot } from './performance.ts';
import { pointName } from './readGrid.ts';

/**
 * The worst point at which a lowest level's COP, given as a multiple of full load, would pass the Carnot COP κ.
 *
 * @param share the multiple, above 0
 */
export function sharePointsAboveCarnot(yaml: YamlFile, full: PerformanceTable, share: number): Problem[] {
  const worst = pointsAboveCarnot(full, share).sort((a, b) => b.cop / b.most - a.cop / a.most)[0];
  if (worst === undefined) return [];
  const point = pointName(...pointAt(full, worst.at));
  return [
    yaml.problem(['map', 'lowestLevel', 'cop'], {
      code: 'map.lowest-above-carnot',
      found: `${share} × ${(worst.cop / share).toFixed(2)} at ${point}`,
      allowed: worst.most.toFixed(2),
    }),
  ];
}

/** Points that both levels give and at which the lowest has more capacity than full load. */
export function tablePointsAboveFull(full: PerformanceTable, lowest: Level): Problem[] {
  const { table, grids } = lowest;
  return table.capacity.flatMap((value, at) => {
    const [outdoor, flow] = pointAt(table, at);
    const row = full.outdoor.indexOf(outdoor);
    const column = full.flow.indexOf(flow);
    const most = row < 0 || column < 0 ? undefined : full.capacity[row * full.flow.length + column];
    if (value === null || typeof most !== 'number' || value <= most) return [];
    const fault = {
      code: 'map.lowest-above-full',
      severity: 'warning',
      found: String(value),
      allowed: String(most),
    } as const;
    return [pointProblem(grids.capacity, at, fault)];
  });
}
