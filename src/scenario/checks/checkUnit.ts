import type { Problem } from '../../core/problem.ts';
import { checkLabel } from '../season/checkLabel.ts';
import type { Unit } from '../unitSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { pointsOutOfOrder } from './contradictions.ts';

/** What does not go together in a unit file beside its tables. */
export function checkUnit(yaml: YamlFile, unit: Unit): Problem[] {
  const problems: Problem[] = [];
  const { highestFlow } = unit.limits;
  if (Array.isArray(highestFlow)) problems.push(...pointsOutOfOrder(yaml, ['limits', 'highestFlow'], highestFlow));
  if (unit.defrost.method === 'table') {
    problems.push(...pointsOutOfOrder(yaml, ['defrost', 'capacity'], unit.defrost.capacity));
    problems.push(...pointsOutOfOrder(yaml, ['defrost', 'cop'], unit.defrost.cop));
  }
  if (unit.label !== undefined) problems.push(...checkLabel(yaml, unit.label));
  return problems;
}
