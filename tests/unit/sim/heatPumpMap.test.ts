import { describe, expect, test } from 'vitest';
import { type MapInterpolation, prepareMap, readMap } from '../../../src/sim/heatPumpMap.ts';
import type { PerformanceTable } from '../../../src/sim/performanceTable.ts';
import { expectNear, roundTable } from './planBuilder.ts';

/** κ(T, F) written out, so that the tests do not lean on the product's own. */
const kappa = (outdoor: number, flow: number) => (flow + 276.15) / Math.max(flow - outdoor + 10, 15);

function read(outdoor: number, flow: number, table = roundTable, interpolation: MapInterpolation = 'carnotShare') {
  const out = new Float64Array(2);
  readMap(prepareMap(table, interpolation), outdoor, flow, out, 0);
  return { kW: out[0]!, cop: out[1]! };
}

describe('inside the map', () => {
  test.each([
    [-10, 35, 6, 2.8],
    [-10, 55, 5, 2.0],
    [10, 35, 10, 5.0],
    [10, 55, 9, 3.2],
  ])('the point %d/%d is met exactly', (outdoor, flow, kW, cop) => {
    expectNear(read(outdoor, flow).kW, kW, 1e-14);
    expectNear(read(outdoor, flow).cop, cop, 1e-14);
  });

  test('capacity and the share of κ are bilinear', () => {
    // u = 0.25, v = 0.75: shares of the four points 0.1875, 0.5625, 0.0625, 0.1875
    const weights = [0.1875, 0.5625, 0.0625, 0.1875];
    const eta = [2.8 / kappa(-10, 35), 2.0 / kappa(-10, 55), 5.0 / kappa(10, 35), 3.2 / kappa(10, 55)];
    const { kW, cop } = read(-5, 50);
    expectNear(kW, 6 * 0.1875 + 5 * 0.5625 + 10 * 0.0625 + 9 * 0.1875);
    expectNear(cop, weights.reduce((sum, weight, i) => sum + weight * eta[i]!, 0) * kappa(-5, 50));
  });

  test('with linear interpolation the COP itself is bilinear', () => {
    const { cop } = read(-5, 50, roundTable, 'linear');
    expectNear(cop, 2.8 * 0.1875 + 2.0 * 0.5625 + 5.0 * 0.0625 + 3.2 * 0.1875);
  });

  test('of several rows and columns the cell around the point is taken', () => {
    const table: PerformanceTable = {
      outdoor: [-10, 0, 5, 20],
      flow: [30, 40, 60],
      capacity: [1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12],
      cop: [2, 2, 2, 2, 2, 2, 2, 2, 2, 2, 2, 2],
    };
    // between rows 0 and 5 (u = 0.4) and columns 40 and 60 (v = 0.5): 5.5 and 8.5
    expectNear(read(2, 50, table).kW, 0.6 * 5.5 + 0.4 * 8.5);
    // on the last row and column
    expectNear(read(20, 60, table).kW, 12);
    expectNear(read(0, 30, table).kW, 4);
  });

  test('one flow column serves every flow, its η held', () => {
    const single: PerformanceTable = { outdoor: [-10, 10], flow: [45], capacity: [5, 9], cop: [2.4, 4] };
    const { kW, cop } = read(-10, 55, single);
    expectNear(kW, 5);
    expectNear(cop, (2.4 / kappa(-10, 45)) * kappa(-10, 55));
  });
});

describe('outside the map', () => {
  test('below the coldest row the capacity falls by the slope there, or by a hundredth a kelvin', () => {
    // 35 °C: slope (10 − 6)/20 = 0.2 kW/K; 5 K below
    expectNear(read(-15, 35).kW, 6 - 5 * 0.2);
    const flat: PerformanceTable = { ...roundTable, capacity: [6, 5, 6, 5] };
    expectNear(read(-15, 35, flat).kW, 6 - 5 * 0.06);
    const rising: PerformanceTable = { ...roundTable, capacity: [6, 5, 5, 4] };
    expectNear(read(-15, 55, rising).kW, 5 - 5 * 0.05);
  });

  test('the capacity never falls below three tenths of that at the coldest row', () => {
    expectNear(read(-45, 35).kW, 0.3 * 6);
  });

  test('colder and hotter, η is held and κ taken at the true point', () => {
    const held = read(-10, 40).cop / kappa(-10, 40);
    expectNear(read(-22, 40).cop, held * kappa(-22, 40));
    expectNear(read(10, 62).cop, (3.2 / kappa(10, 55)) * kappa(10, 62));
    expectNear(read(10, 62).kW, 9);
  });

  test('warmer than the warmest row κ sees 5 K more at most, and the capacity is held', () => {
    const eta = 5 / kappa(10, 35);
    expectNear(read(13, 35).cop, eta * kappa(13, 35));
    expectNear(read(15, 35).cop, eta * kappa(15, 35));
    expectNear(read(24, 35).cop, eta * kappa(15, 35));
    expectNear(read(24, 35).kW, 10);
  });

  test('below the lowest flow column the COP gains 2 % a kelvin over 10 K', () => {
    expectNear(read(-10, 34).cop, 2.8 * 1.02);
    expectNear(read(-10, 25).cop, 2.8 * 1.2);
    expectNear(read(-10, 20).cop, 2.8 * 1.2);
    expectNear(read(-10, 20).kW, 6);
  });

  test('with linear interpolation the share of κ at the edge is held all the same', () => {
    const held = read(-10, 45, roundTable, 'linear').cop;
    expectNear(held, 2.4);
    expectNear(read(-20, 45, roundTable, 'linear').cop, (2.4 / kappa(-10, 45)) * kappa(-20, 45));
    expectNear(read(22, 30, roundTable, 'linear').cop, (5 / kappa(10, 35)) * kappa(15, 35) * 1.1);
  });
});

describe('gaps of the table', () => {
  const gapped = (interpolation: MapInterpolation) =>
    prepareMap(
      {
        outdoor: [-10, 0, 10, 20],
        flow: [35, 55],
        capacity: [null, 5, 7, 6, null, 9, 13, null],
        cop: [null, 2.0, 4, 2.5, null, 3.2, 6, null],
      },
      interpolation,
    );

  test('are filled along the outdoor axis, capacity linear and its ends held', () => {
    // column 35: –, 7, –, 13 → 7, 7, 10, 13; column 55: 5, 6, 9, – → 9
    const { capacity } = gapped('carnotShare');
    expect([...capacity]).toEqual([7, 5, 7, 6, 10, 9, 13, 9]);
  });

  test('take η, not the COP, from their neighbours', () => {
    const { quality } = gapped('carnotShare');
    const first = 4 / kappa(0, 35);
    expectNear(quality[0], first);
    expectNear(quality[4], (first + 6 / kappa(20, 35)) / 2);
    expectNear(quality[7], 3.2 / kappa(10, 55));
  });

  test('are filled by η with linear interpolation too, and the COP follows at the point', () => {
    const { quality } = gapped('linear');
    expectNear(quality[2], 4);
    expectNear(quality[0], (4 / kappa(0, 35)) * kappa(-10, 35));
    expectNear(quality[7], (3.2 / kappa(10, 55)) * kappa(20, 55));
  });
});
