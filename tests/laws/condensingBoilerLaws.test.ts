import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { spaceHeatInput } from '../../src/compare/spaceHeatInput.ts';
import { emitterSetting } from '../../src/sim/flowTemperature.ts';

const RUNS = { seed: 20_250_104, numRuns: 200 };
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('a condensing boiler', () => {
  const need = fc.array(between(0, 12), { minLength: 1, maxLength: 50 }).map((hours) => Float64Array.from(hours));
  const boilerAt = (flow: number) => ({
    overReturn: { at: [25, 45, 60], value: [0.98, 0.93, 0.87] },
    flow: emitterSetting({
      flow,
      return: flow - 10,
      roomTemperature: 20,
      exponent: 1.3,
      lowestFlow: 25,
      highestFlow: flow,
    }),
    designLoad: 8,
  });

  test('takes between what its best and its worst efficiency would take, in every hour', () => {
    const law = fc.property(need, between(35, 80), (hours, flow) => {
      spaceHeatInput(boilerAt(flow), hours).forEach((input, i) => {
        const heat = hours[i] as number;
        expect(input).toBeGreaterThanOrEqual((heat / 0.98) * (1 - 1e-15));
        expect(input).toBeLessThanOrEqual((heat / 0.87) * (1 + 1e-15));
      });
    });
    fc.assert(law, RUNS);
  });

  test('never takes less at a hotter flow', () => {
    const law = fc.property(need, between(35, 80), between(0, 10), (hours, flow, more) => {
      const cooler = spaceHeatInput(boilerAt(flow), hours);
      spaceHeatInput(boilerAt(flow + more), hours).forEach((input, i) => {
        expect(input).toBeGreaterThanOrEqual((cooler[i] as number) * (1 - 1e-12));
      });
    });
    fc.assert(law, RUNS);
  });
});
