import type { Problem } from '../../core/problem.ts';
import { type EntryPath, pathText } from '../entries/pathText.ts';
import { entryOf } from '../entries/schemaField.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';

/** Keys that change the set point within a day. */
const HOURLY_KEYS = ['start', 'end', 'raise', 'rate'];

/**
 * Says of a set-back within the day, written for degree hours, why it is refused there, in place of 'unknown key'.
 *
 * Reference: MODEL section 4: without mass it would overstate the electricity saved more than twofold.
 */
export function explainSetBack(yaml: YamlFile, problems: readonly Problem[]): Problem[] {
  const need = entryOf(entryOf(yaml.raw, 'house'), 'need');
  if (entryOf(need, 'model') !== 'degreeHours') return [...problems];
  const refused: EntryPath[] = [['house', 'need', 'schedule']];
  const days = entryOf(need, 'days');
  if (Array.isArray(days)) {
    days.forEach((_, i) => {
      refused.push(...HOURLY_KEYS.map((key) => ['house', 'need', 'days', i, key]));
    });
  }
  const paths = new Set(refused.map(pathText));
  return problems.map((problem) => {
    if (problem.code !== 'entry.unknown-key' || problem.path === undefined || !paths.has(problem.path)) return problem;
    const { hint: _, allowed: __, ...rest } = problem;
    return { ...rest, code: 'scenario.set-back-needs-mass' };
  });
}
