import { describe, expect, it } from 'vitest';
import { optionCount, valueIndices, valuesOfOption } from '../../../src/batch/axes.ts';
import { problemText } from '../../../src/core/problemText.ts';
import { loadedPlan } from './batchFiles.ts';

const head = 'name: Test\nscenario: house.yaml\naxes:\n';
const axesOf = (axes: string) => loadedPlan(`${head}${axes}`);
const textsOf = (axes: string) => axesOf(axes).problems.map(problemText);

describe('the axes of a plan', () => {
  it('combine every value of one with every value of the others, the last changing first', () => {
    const { plan, problems } = axesOf(
      [
        '  - { given: values, name: unit, path: heatPump.unit, values: [a.yaml, b.yaml] }',
        '  - { given: range, name: set point, path: house.need.setPoint, from: 19, to: 21, step: 1 }',
      ].join('\n'),
    );
    expect(problems).toEqual([]);
    const { axes } = plan!;
    expect(optionCount(axes)).toBe(6);
    const labels = Array.from({ length: 6 }, (_, k) => valuesOfOption(axes, k).map(({ label }) => label));
    expect(labels).toEqual(['a.yaml', 'b.yaml'].flatMap((unit) => [19, 20, 21].map((set) => [unit, set])));
    expect(valueIndices(axes, 5)).toEqual([1, 2]);
  });

  it('count a range without the digits that binary fractions add', () => {
    const { plan } = axesOf(
      '  - { given: range, name: a, path: heatPump.inUseAllowance, from: 0, to: 0.3, step: 0.1 }',
    );
    expect(plan?.axes[0]?.values.map(({ label }) => label)).toEqual([0, 0.1, 0.2, 0.3]);
  });

  it('may fall, and end before a value that the steps miss', () => {
    const { plan } = axesOf('  - { given: range, name: a, path: house.need.setPoint, from: 21, to: 18.6, step: -1 }');
    expect(plan?.axes[0]?.values.map(({ label }) => label)).toEqual([21, 20, 19]);
  });

  it('know the place of each value in the plan', () => {
    const { plan } = axesOf('  - { given: values, name: unit, path: heatPump.unit, values: [a.yaml, b.yaml] }');
    expect(plan?.axes[0]?.values[1]?.changes[0]?.origin).toEqual({ file: 'plan.yaml', line: 4, column: 72 });
  });

  it('with options change several entries at once', () => {
    const { plan } = axesOf(
      '  - { given: options, name: o, options: [{ name: none, set: {} }, { name: both, set: { backup: null, house.need.setPoint: 21 } }] }',
    );
    expect(plan?.axes[0]?.values.map(({ label, changes }) => [label, changes.map(({ value }) => value)])).toEqual([
      ['none', []],
      ['both', [null, 21]],
    ]);
  });
});

describe('what is wrong with the axes of a plan', () => {
  it('is told with its place and what would be right, all at once', () => {
    const texts = textsOf(
      [
        '  - { given: values, name: a, path: house.heatLos.value, values: [1] }',
        '  - { given: values, name: a, path: house, values: [1] }',
        '  - { given: values, name: electricity, path: name, values: [x] }',
        '  - { given: options, name: o, options: [{ name: x, set: { nowhere: 1 } }, { name: x, set: {} }] }',
      ].join('\n'),
    );
    expect(texts).toEqual([
      "plan.yaml:4:37  axes[0].path: 'house.heatLos.value' is no place in a scenario\n    → perhaps house.heatLoss is meant",
      "plan.yaml:5:28  axes[1].name is 'a', which an earlier one is called already\n    → give each a name of its own",
      "plan.yaml:5:37  axes[1].path: 'house' holds a section, not a single value\n    → name one of the entries in it, or use an axis with options",
      "plan.yaml:6:28  axes[2].name is 'electricity', which is a column of every result\n    → give the axis another name",
      expect.stringMatching(/^plan.yaml:7:69 {2}axes\[3\]\.options\[0\]\.set\.nowhere: 'nowhere' is no place/),
      expect.stringMatching(/^plan.yaml:7:84 {2}axes\[3\]\.options\[1\]\.name is 'x', which an earlier one/),
    ]);
  });

  it('is told of a range that leads nowhere or too far', () => {
    const range = (text: string) => textsOf(`  - { given: range, name: a, path: house.need.setPoint, ${text} }`)[0];
    expect(range('from: 19, to: 21, step: -1')).toMatch(
      /axes\[0\]\.step: from 19 to 21 in steps of -1 there is no way/,
    );
    expect(range('from: 19, to: 21, step: 0')).toMatch(/there is no way\n {4}→ let step lead/);
    expect(range('from: 0, to: 20, step: 0.001')).toMatch(
      /20001 values are more than the 10000 of an axis\n {4}→ take a larger step/,
    );
  });

  it('is told of a plan in which nothing varies', () => {
    expect(loadedPlan('name: Test\nscenario: house.yaml\n').problems.map(problemText)).toEqual([
      expect.stringMatching(
        /^plan.yaml:1:1 {2}the plan has neither axes nor homes, so there is one year to simulate\n/,
      ),
    ]);
  });

  it('is told of a base scenario that is missing or cannot be understood', () => {
    expect(loadedPlan('name: T\nscenario: none.yaml\nhomes: { file: h.csv }\n').problems.map(problemText)).toEqual([
      expect.stringMatching(/^none.yaml:2:11 {2}there is no such file\n {4}→ named in plan.yaml under scenario/),
    ]);
    const broken = loadedPlan('name: T\nscenario: b.yaml\nhomes: { file: h.csv }\n', { 'b.yaml': 'a: [' });
    expect(broken.problems[0]?.file).toBe('b.yaml');
  });
});
