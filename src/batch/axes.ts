import type { Problem } from '../core/problem.ts';
import type { Plan } from '../scenario/planSchema.ts';
import type { Fault, YamlFile } from '../scenario/yaml/yamlFile.ts';
import type { Change } from './changes.ts';
import { notSingle, quoted, type ScenarioPlace, scenarioPlace } from './scenarioPlaces.ts';

/** One value of an axis: how results name it, and what it changes in the scenario. */
export interface AxisValue {
  readonly label: string | number | boolean;
  readonly changes: readonly Change[];
}

/** Something that is varied. */
export interface Axis {
  readonly name: string;
  readonly values: readonly AxisValue[];
}

/** Values of a range at most. */
const MOST_RANGE_VALUES = 10_000;
/** A range reaches its end where the steps miss it by no more than this share of a step. */
const RANGE_TOLERANCE = 1e-6;

type AxisEntry = Plan['axes'][number];

/**
 * The axes of a plan, every place in them looked up in the scenario.
 *
 * @param yaml the plan's file, for the places of problems
 * @param entries as the plan writes them
 * @param reserved names that the results use themselves
 */
export function axesOf(
  yaml: YamlFile,
  entries: readonly AxisEntry[],
  reserved: ReadonlySet<string>,
): { axes: Axis[]; problems: Problem[] } {
  const problems: Problem[] = [];
  const names = new Set<string>();
  const axes = entries.map((entry, i): Axis => {
    const at = ['axes', i];
    const name = { path: [...at, 'name'], found: quoted(entry.name) };
    if (names.has(entry.name))
      problems.push(yaml.problem(name.path, { code: 'batch.repeated-name', found: name.found }));
    if (reserved.has(entry.name))
      problems.push(yaml.problem(name.path, { code: 'batch.reserved-name', found: name.found }));
    names.add(entry.name);
    const fault = (path: (string | number)[], what: Fault) => problems.push(yaml.problem([...at, ...path], what));
    return { name: entry.name, values: valuesOf(yaml, at, entry, fault) };
  });
  return { axes, problems };
}

type Report = (path: (string | number)[], fault: Fault) => void;

function valuesOf(yaml: YamlFile, at: (string | number)[], entry: AxisEntry, report: Report): AxisValue[] {
  if (entry.given === 'options') return optionValues(yaml, at, entry.options, report);
  const place = placeOf(['path'], entry.path, report);
  if (place === undefined) return [];
  const single = notSingle(place);
  if (single !== undefined) {
    report(['path'], { code: 'batch.not-a-single-value', found: quoted(entry.path), allowed: single });
    return [];
  }
  const valueAt = (label: AxisValue['label'], path: (string | number)[]): AxisValue => {
    const origin = { file: yaml.file, ...yaml.place([...at, ...path]) };
    return { label, changes: [{ path: place.path, value: label, origin }] };
  };
  if (entry.given === 'values') return entry.values.map((value, k) => valueAt(value, ['values', k]));
  return rangeValues(entry, report).map((value) => valueAt(value, ['from']));
}

function placeOf(path: (string | number)[], text: string, report: Report): ScenarioPlace | undefined {
  const place = scenarioPlace(text);
  if ('path' in place) return place;
  const hint = place.near === undefined ? {} : { hint: `perhaps ${place.near} is meant` };
  report(path, { code: 'batch.unknown-place', found: quoted(text), allowed: place.known, ...hint });
  return undefined;
}

type Options = Extract<AxisEntry, { given: 'options' }>['options'];

function optionValues(yaml: YamlFile, at: (string | number)[], options: Options, report: Report): AxisValue[] {
  const names = new Set<string>();
  return options.map(({ name, set }, k) => {
    if (names.has(name)) report(['options', k, 'name'], { code: 'batch.repeated-name', found: quoted(name) });
    names.add(name);
    const changes = Object.entries(set).flatMap(([text, value]) => {
      const path = ['options', k, 'set', text];
      const place = placeOf(path, text, report);
      const origin = { file: yaml.file, ...yaml.place([...at, ...path]) };
      return place === undefined ? [] : [{ path: place.path, value, origin }];
    });
    return { label: name, changes };
  });
}

/** Values of a range, free of the digits that binary fractions add. */
function rangeValues(entry: { from: number; to: number; step: number }, report: Report): number[] {
  const { from, to, step } = entry;
  const steps = (to - from) / step;
  if (step === 0 || !(steps >= 0)) {
    report(['step'], { code: 'batch.bad-range', found: `from ${from} to ${to} in steps of ${step} there is no way` });
    return [];
  }
  const count = Math.floor(steps + RANGE_TOLERANCE) + 1;
  if (count > MOST_RANGE_VALUES) {
    report(['step'], {
      code: 'batch.bad-range',
      found: `${count} values are more than the ${MOST_RANGE_VALUES} of an axis`,
      hint: 'take a larger step, or a shorter range',
    });
    return [];
  }
  return Array.from({ length: count }, (_, k) => Number((from + k * step).toPrecision(12)));
}

/** How many options the axes come to: each value of one with each value of the others. */
export function optionCount(axes: readonly Axis[]): number {
  return axes.reduce((product, { values }) => product * values.length, 1);
}

/**
 * Which value of each axis an option takes; the last axis changes first.
 *
 * @param option counted from 0
 */
export function valueIndices(axes: readonly Axis[], option: number): number[] {
  const indices: number[] = [];
  let rest = option;
  for (const { values } of axes.toReversed()) {
    indices.unshift(rest % values.length);
    rest = Math.floor(rest / values.length);
  }
  return indices;
}

/** The values that an option takes, one of each axis. */
export function valuesOfOption(axes: readonly Axis[], option: number): AxisValue[] {
  return valueIndices(axes, option).map((index, a) => axes[a].values[index]);
}
