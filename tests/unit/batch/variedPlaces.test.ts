import { describe, expect, it } from 'vitest';
import { mostTariffs, variedPlaces } from '../../../src/batch/varied.ts';
import { loadedPlan } from './batchFiles.ts';

const planOf = (axes: string) => loadedPlan(`name: T\nscenario: house.yaml\naxes:\n${axes}\n`).plan!;

describe('the places that a plan varies', () => {
  it('are those of all its axes, each once', () => {
    const plan = planOf(
      [
        '  - { given: range, name: a, path: house.need.setPoint, from: 18, to: 22, step: 1 }',
        '  - { given: options, name: o, options: [{ name: x, set: { backup: null, tariffs: [] } }] }',
      ].join('\n'),
    );
    expect(variedPlaces(plan, undefined)).toEqual([['house', 'need', 'setPoint'], ['backup'], ['tariffs']]);
  });
});

describe('the most tariffs of any job', () => {
  it('are those of the base scenario, of a longer list, or of a position behind it', () => {
    expect(
      mostTariffs(planOf('  - { given: values, name: a, path: house.need.setPoint, values: [18] }'), undefined),
    ).toBe(1);
    expect(mostTariffs(planOf('  - { given: values, name: a, path: "tariffs[2]", values: [x] }'), undefined)).toBe(3);
    const lists =
      '  - { given: options, name: o, options: [{ name: x, set: { tariffs: [a, b] } }, { name: y, set: {} }] }';
    expect(mostTariffs(planOf(lists), undefined)).toBe(2);
  });
});
