/**
 * ISO 13790:2008 annex C in closed form. The constants of the standard are from memory; the steady state and the decay are
 * recomputed from its formulas: floor 100 m², class medium, H_op = 100, H_w = 50, H_ve = 60 W/K.
 */
import { describe, expect, test } from 'vitest';
import { type MassParameters, massParameters } from '../../src/sim/lumpedHouse.ts';
import { simulateYear } from '../../src/sim/year.ts';
import { column, HOURS, expectNear as holdNear, planOf } from '../unit/sim/planBuilder.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'House with mass');
const figures = accuracy.comparison({
  what: 'steady need, decay of the air, gains, jump of the set point',
  source: 'worked by hand from the model, twelve digits',
  unit: '%',
  allowed: 1e-7,
  why: 'figures of eleven digits or more',
});

/** Holds a figure to a worked one, and records how far off it is. */
function expectNear(actual: number | undefined, worked: number): void {
  holdNear(actual, worked);
  figures.add((100 * ((actual ?? Number.NaN) - worked)) / Math.max(Math.abs(worked), 1e-3));
}

/** H_ve + 1/(1/H_is + 1/(H_w + H_op)), H_is = 3.45·4.5·100 = 1552.5 W/K: 60 + 1552.5·150/1702.5. */
const STEADY_LOSS = 60 + (1552.5 * 150) / 1702.5;

function mass(): MassParameters {
  const result = massParameters(100, 'medium', STEADY_LOSS, { windows: 50, opaque: 100, ventilation: 60 });
  if (!('mass' in result)) throw new Error(result.reason);
  return result.mass;
}

describe('steady state', () => {
  test('the three ways give 196.784 W/K from air to outdoors', () => {
    // published with three decimals
    expect(Math.abs(STEADY_LOSS - 196.784)).toBeLessThanOrEqual(0.0005);
  });

  test('at 30 K the house needs 5903.5 W once its mass is warm', () => {
    const c = simulateYear(planOf({ temperature: -10, house: { heatLoss: STEADY_LOSS / 1000, mass: mass() } }));
    // published with one decimal; the start-up has long died away, so that the formula itself is met to rounding
    expect(Math.abs(c.spaceHeatNeed[HOURS - 1]! * 1000 - 5903.5)).toBeLessThanOrEqual(0.05);
    expectNear(c.spaceHeatNeed[HOURS - 1], (STEADY_LOSS * 30) / 1000);
    expectNear(c.indoorTemperature[HOURS - 1], 20);
  });
});

/*
 * Crank–Nicolson: C·(θ' − θ) = −h·(θ' + θ)/2 for one hour, so θ'/θ = (C − h/2)/(C + h/2), all temperatures against a
 * constant outdoor temperature. H_1 = 1/(1/60 + 1/1552.5) = 57.7674418605; H_2 = 107.7674418605; H_ms = 9.1·2.5·100 = 2275;
 * H_3 = 1/(1/107.7674418605 + 1/2275) = 102.8933525; H_em = 1/(1/100 − 1/2275) = 104.5977011; h = 207.4910536 W/K;
 * C = 165·100/3.6 = 4583.333333 Wh/K; ratio (4583.333333 − 103.7455268)/(4583.333333 + 103.7455268) = 0.9557313.
 * Time constant −1/ln 0.9557313 = 22.086 h; the exact one is C/h = 22.089 h.
 */
test('without heat and gains the air falls by the Crank–Nicolson factor every hour', () => {
  const h1 = 1 / (1 / 60 + 1 / 1552.5);
  const h3 = 1 / (1 / (h1 + 50) + 1 / 2275);
  const hEm = 1 / (1 / 100 - 1 / 2275);
  const capacity = (165 * 100) / 3.6;
  const half = (h3 + hEm) / 2;
  const keep = (capacity - half) / (capacity + half);
  expect(Math.abs(keep - 0.9557313)).toBeLessThanOrEqual(1e-7);

  const c = simulateYear(planOf({ temperature: 0, house: { heatLoss: 0.2, mass: mass(), heatingLimit: -50 } }));
  let compared = 0;
  for (let hour = 1; hour < 48; hour++) {
    // the year begins after 336 hours of the same decay from 20 °C, far above rounding
    expectNear(c.indoorTemperature[hour]! / c.indoorTemperature[hour - 1]!, keep);
    compared++;
  }
  expect(compared).toBe(47);
  // −1/ln(keep) is the time constant; the step makes it shorter than C/h by (h/C)²/12 of it, 0.02 %
  const timeConstant = -1 / Math.log(c.indoorTemperature[1]! / c.indoorTemperature[0]!);
  expect(Math.abs(timeConstant / (capacity / (2 * half)) - 1)).toBeLessThanOrEqual(0.0002);
});

/*
 * Gains in a steady state, 0 °C outdoors and 20 °C indoors: half of Φ_int goes to the air, the rest and the sun to surfaces
 * and mass; what enters there warms the air less. θ_s is the surface, the mass is in equilibrium:
 *   surface: H_is·(20 − θ_s) + φ_st = H_w·θ_s + H_ms·(θ_s − θ_m);  mass: H_ms·(θ_s − θ_m) + φ_m = H_em·θ_m.
 *   A_t = 450, A_m = 250 m². Φ_int = 600 W, sun 2 m²·100 W/m² = 200 W: 0.5Φ_int + Φ_sol = 500 W.
 *   φ_m = 250/450·500 = 277.777777778; φ_st = (1 − 250/450 − 50/(9.1·450))·500 = 216.117216117 W.
 *   mass: θ_m = (2275·θ_s + 277.777777778)/2379.59770115 = 0.956043956044·θ_s + 0.116733083766
 *   surface: 1552.5·20 + 216.117216117 + 2275·θ_m = (1552.5 + 50 + 2275)·θ_s.
 * The two are solved below; need = H_ve·20 + H_is·(20 − θ_s) − 300 W.
 */
test('gains of house and sun lower the steady need by what the network lets through', () => {
  const perSurface = 2275 / (2275 + 104.59770114942529);
  const fromMass = 277.77777777777777 / (2275 + 104.59770114942529);
  const surface = (1552.5 * 20 + 216.11721611721612 + 2275 * fromMass) / (3877.5 - 2275 * perSurface);
  const need = 60 * 20 + 1552.5 * (20 - surface) - 300;
  const c = simulateYear(
    planOf({
      temperature: 0,
      radiation: 100,
      house: { heatLoss: STEADY_LOSS / 1000, mass: mass(), internalGains: 0.6, solarAperture: 2 },
    }),
  );
  expectNear(c.spaceHeatNeed[HOURS - 1], need / 1000);
});

/*
 * The heat that brings the air to the set point at once, in the first heated hour after a cold one: a jump of the set
 * point by 1 K needs 1/(air per heat). Network seen from the air for one hour: with everything at 0 °C and a mean mass of
 * half its new value, need P gives θ_s·(H_ms + H_w + H_1) = H_ms·θ_m'/2 + P·H_1/H_ve, θ_m' = (H_3/H_2)·(H_1/H_ve)·P/(C + h/2),
 * θ_air = (H_is·θ_s + P)/(H_is + H_ve). With P = 1 W: H_1/H_ve = 0.962790697674; H_3/H_2 = 0.954772153;
 *   θ_m' = 0.962790697674·0.954772153/4687.07886 = 1.961234e-4 K; the rest is computed below.
 */
test('a set point 1 K higher for one hour needs what the network asks for', () => {
  const h1 = 1 / (1 / 60 + 1 / 1552.5);
  const h2 = h1 + 50;
  const h3 = 1 / (1 / h2 + 1 / 2275);
  const half = (h3 + 1 / (1 / 100 - 1 / 2275)) / 2;
  const massRise = ((h1 / 60) * (h3 / h2)) / ((165 * 100) / 3.6 + half);
  const surface = (2275 * (massRise / 2) + h1 / 60) / (2275 + 50 + h1);
  const airPerWatt = (1552.5 * surface + 1) / (1552.5 + 60);
  const c = simulateYear(
    planOf({
      temperature: 0,
      house: { heatLoss: STEADY_LOSS / 1000, mass: mass(), setPoint: column(20, { 5000: 21 }) },
    }),
  );
  expectNear(c.spaceHeatNeed[5000]! - c.spaceHeatNeed[4999]!, 1 / airPerWatt / 1000);
});
