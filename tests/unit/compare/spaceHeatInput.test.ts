import { describe, expect, test } from 'vitest';
import { spaceHeatInput, usualHotWaterEfficiency } from '../../../src/compare/spaceHeatInput.ts';
import { emitterSetting } from '../../../src/sim/flowTemperature.ts';

// Powers, lines and quotients round by some 1e-16 of values near ten.
const ROUNDING = 1e-12;

/** Emitters of exponent 1, so that the flow is 20 + 30x + 5x; return 10 K below at full load. */
const emitters = { flow: 55, return: 45, roomTemperature: 20, exponent: 1, lowestFlow: 25, highestFlow: 55 };
const flow = emitterSetting(emitters);
const condensing = { overReturn: { at: [30, 50], value: [0.97, 0.91] }, flow, designLoad: 8 };

describe('what a boiler takes for the rooms', () => {
  test('is the need over a constant efficiency', () => {
    expect([...spaceHeatInput(0.8, Float64Array.of(4, 0, 2))]).toEqual([5, 0, 2.5]);
  });

  // efficiency between 30 and 50 °C of return: 0.97 − 0.003 a kelvin
  test.each([
    // x = 0.5: flow 37.5, return 37.5 − 5
    ['half the design load', 4, 4 / (0.97 - 0.003 * 2.5)],
    // x = 1: flow 55, return 45
    ['the design load', 8, 8 / (0.97 - 0.003 * 15)],
    // x = 1.25: the flow is held at 55, the spread at 10
    ['more than the design load', 10, 10 / (0.97 - 0.003 * 15)],
    // x = 0.1: flow held at 25, return 25 − 0.2·10: beyond the list's cold end, which is held
    ['little', 0.8, 0.8 / 0.97],
  ])('follows the return of its own emitters at %s', (_, need, expected) => {
    const [input] = spaceHeatInput(condensing, Float64Array.of(need));
    expect(Math.abs((input as number) - expected)).toBeLessThanOrEqual(ROUNDING);
  });

  test('with radiators follows the characteristic of EN 442', () => {
    const radiators = emitterSetting({ ...emitters, exponent: 1.3 });
    // EN 442-2: over-temperature 30·0.5^(1/1.3) at half load, flow half of the halved spread above, return below it
    const back = 20 + 30 * 0.5 ** (1 / 1.3) - 2.5;
    const [input] = spaceHeatInput({ ...condensing, flow: radiators }, Float64Array.of(4));
    expect(Math.abs((input as number) - 4 / (0.97 - 0.003 * (back - 30)))).toBeLessThanOrEqual(ROUNDING);
  });

  test('with a heating curve returns 5 K below it at full load, and a fifth of that at least', () => {
    const curve = { ...flow, set: Float64Array.of(50, 50, 50), spread: 5 };
    const input = spaceHeatInput({ ...condensing, flow: curve }, Float64Array.of(8, 0, 0.8));
    // returns of 45 and 49 °C; nothing in the hour without need
    const expected = [8 / (0.97 - 0.003 * 15), 0, 0.8 / (0.97 - 0.003 * 19)];
    expected.forEach((kWh, i) => {
      expect(Math.abs((input[i] as number) - kWh)).toBeLessThanOrEqual(ROUNDING);
    });
  });

  test('is the same as with a constant efficiency where the list has one value', () => {
    const single = { ...condensing, overReturn: { at: [40], value: [0.8] } };
    expect([...spaceHeatInput(single, Float64Array.of(4, 0, 2))]).toEqual([5, 0, 2.5]);
  });
});

describe('the efficiency for hot water where none is entered', () => {
  test('is that for space heat', () => {
    expect(usualHotWaterEfficiency(0.9)).toBe(0.9);
  });

  test('is that of the hottest return of a condensing boiler', () => {
    expect(usualHotWaterEfficiency(condensing)).toBe(0.91);
  });
});
