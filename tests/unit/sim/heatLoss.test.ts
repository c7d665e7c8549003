import { describe, expect, test } from 'vitest';
import { type BuildingElement, heatLossOfElements, heatLossOfLoad } from '../../../src/sim/heatLoss.ts';
import { expectNear } from './planBuilder.ts';

const wall: BuildingElement = { name: 'wall', kind: 'opaque', area: 100, uValue: 0.5, factor: 1 };

describe('heat loss from elements', () => {
  test('areas times U-values, and 0.33 Wh/(m³·K) of the air', () => {
    const parts = heatLossOfElements([wall], [], { volume: 300, airChanges: 0.5 });
    expectNear(parts.opaque, 50);
    expect(parts.windows).toBe(0);
    expectNear(parts.ventilation, 49.5);
  });

  test('windows stand apart, a factor lowers what an element sees, and bridges count with the opaque elements', () => {
    const elements: BuildingElement[] = [
      wall,
      { name: 'floor', kind: 'opaque', area: 80, uValue: 0.25, factor: 0.6 },
      { name: 'windows', kind: 'window', area: 20, uValue: 1.3, factor: 1 },
    ];
    const bridges = [
      { name: 'balcony', length: 6, psi: 0.5 },
      { name: 'corner', length: 10, psi: -0.1 },
    ];
    const parts = heatLossOfElements(elements, bridges, { volume: 200, airChanges: 0 });
    // 50 + 80·0.25·0.6 + 3 − 1
    expectNear(parts.opaque, 64);
    expectNear(parts.windows, 26);
    expect(parts.ventilation).toBe(0);
  });
});

test('a load at two temperatures is a heat loss', () => {
  expectNear(heatLossOfLoad(6.4, 20, -12), 200);
});
