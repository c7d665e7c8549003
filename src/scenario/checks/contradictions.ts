import type { Problem } from '../../core/problem.ts';
import { shownNumber } from '../entries/allowedText.ts';
import type { EntryPath } from '../entries/pathText.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';

/** A bound that another entry sets: what it is in words, its value in °C. */
export interface Bound {
  readonly name: string;
  readonly value: number;
}

/** A temperature that must lie above another entry's. */
export function notAbove(yaml: YamlFile, path: EntryPath, value: number, bound: Bound): Problem[] {
  return value > bound.value ? [] : [contradiction(yaml, path, value, `it must lie above ${boundText(bound)}`)];
}

/** A temperature that must not lie below another entry's. */
export function below(yaml: YamlFile, path: EntryPath, value: number, bound: Bound): Problem[] {
  return value >= bound.value ? [] : [contradiction(yaml, path, value, `it must not lie below ${boundText(bound)}`)];
}

/** A temperature that must lie below another entry's. */
export function notBelow(yaml: YamlFile, path: EntryPath, value: number, bound: Bound): Problem[] {
  return value < bound.value ? [] : [contradiction(yaml, path, value, `it must lie below ${boundText(bound)}`)];
}

/** Points of a polyline whose temperature does not rise. */
export function pointsOutOfOrder(
  yaml: YamlFile,
  path: EntryPath,
  points: readonly (readonly [number, number])[],
): Problem[] {
  return points.flatMap(([x], i) => {
    const before = points[i - 1]?.[0];
    if (before === undefined || x > before) return [];
    const found = `${shownNumber(x)} °C`;
    const allowed = `${shownNumber(before)} °C`;
    return [yaml.problem([...path, i], { code: 'scenario.points-not-rising', found, allowed })];
  });
}

function contradiction(yaml: YamlFile, path: EntryPath, value: number, allowed: string): Problem {
  return yaml.problem(path, { code: 'scenario.contradiction', found: `${shownNumber(value)} °C`, allowed });
}

function boundText({ name, value }: Bound): string {
  return `${name} (${shownNumber(value)} °C)`;
}
