import * as z from 'zod';
import { nearestName } from '../../core/nearest.ts';
import { type Problem, shown } from '../../core/problem.ts';
import type { Fault, YamlFile } from '../yaml/yamlFile.ts';
import { allowedText, listed, shownUnit } from './allowedText.ts';
import { choiceCure, formatCure, kindCure, rangeCure } from './entryCures.ts';
import { pathText } from './pathText.ts';
import { choicesOf, chooseForm, entryOf, type Field, fieldAt, kindOf, kindOfValue } from './schemaField.ts';

/** Faults listed of one file; behind so many there is one cause, and the first ones show it. */
const MOST_PROBLEMS = 100;

type Issue = z.core.$ZodIssue;

/**
 * Faults that a schema finds in a file, as problems with line and column.
 *
 * @param yaml the file
 * @param schema the schema it was held against
 * @param issues what the schema reports
 * @returns at most 100 problems, in the order of the file's lines
 */
export function entryProblems(yaml: YamlFile, schema: z.core.$ZodType, issues: readonly Issue[]): Problem[] {
  const single = issues.flatMap((issue) => flattened(issue, yaml.raw, schema)).slice(0, MOST_PROBLEMS);
  const problems: Problem[] = [];
  const meant = new Set<string>();
  for (const issue of single) {
    if (issue.code !== 'unrecognized_keys') continue;
    for (const key of issue.keys.slice(0, MOST_PROBLEMS))
      problems.push(unknownKey(yaml, schema, { issue, key, meant }));
  }
  for (const issue of single) {
    if (issue.code === 'unrecognized_keys') continue;
    const problem = entryProblem(yaml, schema, issue);
    const mistyped = problem.code === 'entry.missing' && problem.path !== undefined && meant.has(problem.path);
    if (!mistyped && !problems.some((p) => p.path === problem.path)) problems.push(problem);
  }
  return problems
    .sort((a, b) => (a.line ?? 0) - (b.line ?? 0) || (a.column ?? 0) - (b.column ?? 0))
    .slice(0, MOST_PROBLEMS);
}

/** Of an either-or without keys to tell the forms apart: the faults of that form whose kind fits what is written. */
function flattened(issue: Issue, raw: unknown, schema: z.core.$ZodType): Issue[] {
  if (issue.code !== 'invalid_union' || issue.errors.length === 0) return [issue];
  const path = issue.path.map(step);
  const field = fieldAt(schema, path, raw);
  const kind = kindOfValue(valueAt(raw, path));
  if (field === undefined || !(field.schema instanceof z.ZodUnion)) return [issue];
  const form = field.schema.options.findIndex((option) => kindOf(option) === kind);
  const inner = issue.errors[form];
  if (inner === undefined) return [issue];
  return inner.flatMap((within) => flattened({ ...within, path: [...issue.path, ...within.path] }, raw, schema));
}

function unknownKey(
  yaml: YamlFile,
  schema: z.core.$ZodType,
  unknown: { issue: Issue; key: string; meant: Set<string> },
): Problem {
  const path = unknown.issue.path.map(step);
  const { key } = unknown;
  const section = fieldAt(schema, path, yaml.raw);
  const form = section && chooseForm(section, valueAt(yaml.raw, path)).schema;
  const known = form instanceof z.ZodObject ? Object.keys(form.shape) : [];
  const near = nearestName(key, known);
  const owner = near === undefined || !known.includes(key) ? otherForm(section, key) : undefined;
  if (near !== undefined && owner === undefined) unknown.meant.add(pathText([...path, near]));
  const hint = owner ?? (near === undefined ? undefined : `perhaps ${near} is meant`);
  return yaml.keyProblem([...path, key], { code: 'entry.unknown-key', allowed: listed(known), ...given({ hint }) });
}

/** Where a key belongs to another form of the section: the choice that would allow it. */
function otherForm(section: Field | undefined, key: string): string | undefined {
  if (!(section?.schema instanceof z.ZodDiscriminatedUnion)) return undefined;
  const by = section.schema.def.discriminator;
  const form = section.schema.options.find(
    (option) => option instanceof z.ZodObject && Object.hasOwn(option.shape, key),
  );
  return form === undefined ? undefined : `${shown(key)} goes with ${by}: ${choicesOf(form, by).join(' or ')}`;
}

function entryProblem(yaml: YamlFile, schema: z.core.$ZodType, issue: Issue): Problem {
  const path = issue.path.map(step);
  const found = valueAt(yaml.raw, path);
  const known = fieldAt(schema, path, yaml.raw) ?? fieldAt(schema, path.slice(0, -1), yaml.raw);
  const field = known && chooseForm(known, found);
  if (field === undefined) return yaml.problem(path, { code: 'entry.wrong-kind', found: foundText(found) });
  const allowed = issueChoices(issue) ?? allowedText(field);
  const unit = shownUnit(field.unit);
  const base = { allowed, ...given({ unit }) };
  if (found === undefined) {
    return yaml.problem(path, {
      ...base,
      code: 'entry.missing',
      hint: `add it: ${field.says ?? ''}`.trim().replace(/:$/, ''),
    });
  }
  if (found === null || found === '') return yaml.problem(path, { ...base, code: 'entry.empty' });
  return yaml.problem(path, { ...base, found: foundText(found), ...faultOf(issue, field, found) });
}

function faultOf(issue: Issue, field: Field, found: unknown): Fault {
  if (issue.code === 'invalid_union' && issue.errors.length === 0) {
    return { code: 'entry.not-a-choice', ...given({ hint: choiceCure(found, issueOptions(issue)) }) };
  }
  if (issue.code === 'invalid_value') {
    return { code: 'entry.not-a-choice', ...given({ hint: choiceCure(found, issue.values.map(String)) }) };
  }
  if (issue.code === 'invalid_format' && typeof found === 'string') {
    return { code: 'entry.wrong-form', ...given({ hint: formatCure(field.format, found) }) };
  }
  if (typeof found === 'number' && kindOf(field.schema) === 'number') {
    return { code: 'entry.out-of-range', ...given({ hint: rangeCure(field, found) }) };
  }
  if ((issue.code === 'too_big' || issue.code === 'too_small') && (Array.isArray(found) || typeof found === 'string')) {
    const count = Array.isArray(found)
      ? `${found.length} ${found.length === 1 ? 'entry' : 'entries'}`
      : `${found.length} letters`;
    return { code: 'entry.wrong-length', found: count };
  }
  return { code: 'entry.wrong-kind', ...given({ hint: kindCure(field, found) }) };
}

function issueOptions(issue: Issue): string[] {
  if (issue.code !== 'invalid_union' || !('options' in issue) || !Array.isArray(issue.options)) return [];
  return issue.options.map(String);
}

function issueChoices(issue: Issue): string | undefined {
  const options = issueOptions(issue);
  return options.length > 0 ? `it is one of ${listed(options)}` : undefined;
}

function valueAt(raw: unknown, path: readonly (string | number)[]): unknown {
  return path.reduce<unknown>((value, key) => entryOf(value, key), raw);
}

function step(key: PropertyKey): string | number {
  return typeof key === 'number' ? key : String(key);
}

/** What stands at an entry, for a message. */
function foundText(value: unknown): string {
  if (typeof value === 'string') return `'${shown(value)}'`;
  if (Array.isArray(value)) return `a list of ${value.length}`;
  if (typeof value === 'number' && !Number.isFinite(value)) return 'not a finite number';
  return typeof value === 'object' && value !== null ? 'a section' : shown(value);
}

function given<T extends object>(texts: T): { [K in keyof T]?: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(texts).filter(([, text]) => text !== undefined)) as {
    [K in keyof T]?: Exclude<T[K], undefined>;
  };
}
