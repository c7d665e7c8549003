import { hasErrors, type Problem } from '../core/problem.ts';
import { readEntries } from '../scenario/entries/readEntries.ts';
import { entryOf } from '../scenario/entries/schemaField.ts';
import type { InputFiles } from '../scenario/inputFiles.ts';
import { planSchema } from '../scenario/planSchema.ts';
import { parseYaml } from '../scenario/yaml/parseYaml.ts';
import type { YamlFile } from '../scenario/yaml/yamlFile.ts';
import { type Axis, axesOf } from './axes.ts';
import { RESERVED_NAMES } from './rowColumns.ts';

/** A plan read: the base scenario as written, what is varied, and where the homes stand. */
export interface BatchPlan {
  readonly name: string;
  readonly file: string;
  /** The base scenario as written; it need not be complete, where axes or homes complete it. */
  readonly base: YamlFile;
  readonly axes: readonly Axis[];
  /** The table of homes as the plan names it; absent where the base scenario is the one home. */
  readonly homes?: { readonly file: string; readonly nameColumn: string };
}

/**
 * Reads a plan and its base scenario. Never throws; all problems come at once.
 *
 * @param name of the plan, as the user gives it
 * @param files reads and keeps the record
 */
export function loadPlan(name: string, files: InputFiles): { plan?: BatchPlan; problems: Problem[] } {
  const read = files.read(name, 'plan');
  if (read.input === undefined) return { problems: read.problems };
  const { yaml, entries, problems } = readEntries(read.input, planSchema);
  if (yaml === undefined || entries === undefined) return { problems };
  const { scenario, axes: axisEntries, homes } = entries.value;
  const base = files.readNamed(scenario, 'scenario', { yaml, path: ['scenario'] });
  const parsed = base.input === undefined ? { problems: base.problems } : parseYaml(base.input);
  const { axes, problems: axisProblems } = axesOf(yaml, axisEntries, RESERVED_NAMES);
  const found = [...parsed.problems, ...axisProblems];
  if (axes.length === 0 && homes === undefined) found.push(yaml.problem(['axes'], { code: 'batch.nothing-varies' }));
  if (hasErrors(found) || !('yaml' in parsed)) return { problems: found };
  const plan = { name: entries.value.name, file: yaml.file, base: parsed.yaml, axes };
  return { plan: homes === undefined ? plan : { ...plan, homes }, problems: found };
}

/** Name of the base scenario, for the one home of a plan without a table of homes. */
export function baseName({ base }: BatchPlan): string {
  const name = entryOf(base.raw, 'name');
  return typeof name === 'string' ? name : base.file;
}
