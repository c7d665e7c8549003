import { describe, expect, test } from 'vitest';
import {
  curveSetting,
  emitterFlow,
  emitterLoad,
  emitterSetting,
  returnTemperature,
} from '../../../src/sim/flowTemperature.ts';
import { column, expectNear, weatherOf } from './planBuilder.ts';

const radiators = emitterSetting({
  flow: 55,
  return: 45,
  roomTemperature: 20,
  exponent: 1.3,
  lowestFlow: 25,
  highestFlow: 55,
});

describe('a curve', () => {
  test('gives the flow of each hour from its outdoor temperature, the ends held', () => {
    const weather = weatherOf({ hours: 24, temperature: column(0, { 1: -20, 2: 15, 3: 30 }, 24) });
    const { set } = curveSetting({ at: [-10, 10], value: [50, 30] }, weather);
    expect([...(set ?? [])].slice(0, 4)).toEqual([40, 50, 30, 30]);
  });

  test('has 5 K between flow and return', () => {
    const fixed = curveSetting({ at: [0], value: [40] }, weatherOf({ hours: 24 }));
    expect([...(fixed.set ?? [])]).toEqual(new Array(24).fill(40));
    expectNear(returnTemperature(fixed, 40, 0.6), 37);
  });
});

describe('emitters', () => {
  test('at their design load run at their design flow', () => {
    expectNear(emitterFlow(radiators, 1), 55, 1e-14);
  });

  test('at part load follow the power 1/n of the load and half the shrunk spread', () => {
    expectNear(emitterFlow(radiators, 0.5), 20 + 30 * 0.5 ** (1 / 1.3) + 2.5);
  });

  test('are held between their lowest and highest flow', () => {
    expect(emitterFlow(radiators, 0.01)).toBe(25);
    expect(emitterFlow(radiators, 0)).toBe(25);
    expect(emitterFlow(radiators, 1.4)).toBe(55);
    expectNear(emitterFlow({ ...radiators, highest: 80 }, 1.4), 20 + 30 * 1.4 ** (1 / 1.3) + 7);
  });

  test.each([
    [0.05, 2],
    [0.2, 2],
    [0.6, 6],
    [1, 10],
    [1.3, 10],
  ])('at %d of the load the return lies %d K below the flow', (load, below) => {
    expectNear(returnTemperature(radiators, 50, load), 50 - below);
  });
});

describe('the load that sets the flow of an hour of emitters', () => {
  test('spreads what is asked over what hot water leaves of the hour', () => {
    expectNear(emitterLoad(2, 0, 0.5, 8), 0.5);
    expectNear(emitterLoad(2, 1, 0.5, 8), 0.75);
    expectNear(emitterLoad(2, 1, 0, 8), 0.375);
  });

  test('goes up to the design load, or to the need where that is higher', () => {
    expect(emitterLoad(6, 4, 0.5, 8)).toBe(1);
    expectNear(emitterLoad(10, 4, 0.5, 8), 1.25);
  });

  test('is that of the need where hot water takes the whole hour', () => {
    expectNear(emitterLoad(2, 5, 1, 8), 0.25);
  });
});
