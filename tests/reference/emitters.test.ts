import { expect, test } from 'vitest';
import { emitterFlow, emitterSetting } from '../../src/sim/flowTemperature.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Emitters');
const overTemperatures = accuracy.comparison({
  what: 'over-temperature of a radiator for a share of its output, n = 1.3',
  source: 'characteristic equation of EN 442-2, recomputed',
  unit: 'K',
  allowed: 0.0026,
  why: 'half a unit of the fourth decimal of the output, by the slope of the curve',
});
const ratedFlow = accuracy.comparison({
  what: 'flow at the rated output',
  source: 'EN 442 rating 75/65/20 °C',
  unit: 'K',
  allowed: 1e-12,
  why: 'the point itself',
});

/**
 * Output of a radiator at a mean over-temperature ΔT beside that at 50 K, (ΔT/50)^n with n = 1.3, printed with four
 * decimals. Source: characteristic equation of EN 442-2, recomputed from the formula.
 */
const outputs = [
  { overTemperature: 30, output: 0.5148 },
  { overTemperature: 35, output: 0.629 },
  { overTemperature: 20, output: 0.3039 },
];

/** Radiators of 75/65 °C in a room of 20 °C: 50 K of mean over-temperature, as EN 442 rates them. */
const rated = emitterSetting({
  flow: 75,
  return: 65,
  roomTemperature: 20,
  exponent: 1.3,
  lowestFlow: 20,
  highestFlow: 75,
});

test.each(outputs)(
  'for $output of its output a radiator of 50 K runs at $overTemperature K',
  ({ overTemperature, output }) => {
    // the flow lies half the spread above the mean, and the spread shrinks with the output
    const mean = emitterFlow(rated, output) - (output * 10) / 2 - 20;
    // the last printed decimal is good to half a unit, and ΔT follows with the power 1/1.3
    const tolerance = (overTemperature * 0.00005) / output / 1.3;
    expect(Math.abs(mean - overTemperature)).toBeLessThanOrEqual(tolerance);
    overTemperatures.add(mean - overTemperature);
  },
);

test('at its rated output the radiator runs at its rated flow', () => {
  expect(Math.abs(emitterFlow(rated, 1) - 75)).toBeLessThanOrEqual(1e-12);
  ratedFlow.add(emitterFlow(rated, 1) - 75);
});
