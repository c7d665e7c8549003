import { describe, expect, test } from 'vitest';
import type { HeatLossParts } from '../../../src/sim/heatLoss.ts';
import { type MassClass, type MassParameters, massParameters } from '../../../src/sim/lumpedHouse.ts';
import { expectNear } from './planBuilder.ts';

function massOf(floor: number, massClass: MassClass, heatLoss: number, parts: HeatLossParts): MassParameters {
  const result = massParameters(floor, massClass, heatLoss, parts);
  if (!('mass' in result)) throw new Error(result.reason);
  return result.mass;
}

/** Steady loss of a network from air to outdoors, W/K. */
function steadyLoss({ hVentilation, hAirSurface, hWindows, hSurfaceMass, hMassOutdoor }: MassParameters): number {
  const opaque = hMassOutdoor === 0 ? 0 : 1 / (1 / hMassOutdoor + 1 / hSurfaceMass);
  return 1000 * (hVentilation + 1 / (1 / hAirSurface + 1 / (hWindows + opaque)));
}

const usual: HeatLossParts = { windows: 0.25, opaque: 0.5, ventilation: 0.25 };

describe('the lumped house', () => {
  // ISO 13790:2008 table 12, from memory: A_m in m² and C_m in kJ/K, both per m² of floor
  test.each([
    ['veryLight', 2.5, 80],
    ['light', 2.5, 110],
    ['medium', 2.5, 165],
    ['heavy', 3, 260],
    ['veryHeavy', 3.5, 370],
  ] as const)('%s stores heat behind its own area', (massClass, area, capacity) => {
    const mass = massOf(120, massClass, 180, usual);
    expectNear(mass.hSurfaceMass, (9.1 * area * 120) / 1000);
    expectNear(mass.capacity, (capacity * 120) / 3600);
    expectNear(mass.hAirSurface, (3.45 * 4.5 * 120) / 1000);
    expectNear(mass.gainsToMass, area / 4.5);
    expectNear(mass.gainsToSurface, 1 - area / 4.5 - (mass.hWindows * 1000) / (9.1 * 4.5 * 120));
  });

  test.each([
    ['usual shares', 180, usual],
    ['shares in W/K', 180, { windows: 45, opaque: 90, ventilation: 45 }],
    ['no ventilation', 180, { windows: 40, opaque: 60, ventilation: 0 }],
    ['no opaque elements', 180, { windows: 40, opaque: 0, ventilation: 30 }],
    ['air alone', 180, { windows: 0, opaque: 0, ventilation: 1 }],
    ['air alone, in W/K', 180, { windows: 0, opaque: 0, ventilation: 45 }],
    ['a great loss by air', 4000, { windows: 0.1, opaque: 0.1, ventilation: 0.8 }],
  ])('one factor scales all ways so that the steady loss is the one entered: %s', (_, heatLoss, parts) => {
    const mass = massOf(120, 'medium', heatLoss, parts);
    expectNear(steadyLoss(mass), heatLoss);
    expectNear(mass.hWindows * parts.ventilation, mass.hVentilation * parts.windows);
  });

  test('opaque elements that lose more than the mass takes up are refused with both figures', () => {
    // 120 m² medium: H_ms = 9.1·2.5·120 = 2730 W/K
    const result = massParameters(120, 'medium', 3200, { windows: 0, opaque: 0.9, ventilation: 0.1 });
    if ('mass' in result) throw new Error('not refused');
    expectNear(result.most, 2730);
    expect(result.opaque).toBeGreaterThan(2730);
  });

  test.each([
    ['windows', { windows: 1, opaque: 0, ventilation: 0 }],
    ['windows in W/K', { windows: 100, opaque: 0, ventilation: 0 }],
    ['walls', { windows: 0, opaque: 1, ventilation: 0 }],
  ])('a loss that the inner surfaces cannot pass on is refused, not computed: %s', (_, parts) => {
    // 5 m² of floor: H_is = 3.45·4.5·5 = 77.625 W/K, and no air to carry the rest
    const result = massParameters(5, 'medium', 100, parts);
    if ('mass' in result) throw new Error('not refused');
    expect(result.opaque).toBe(Number.POSITIVE_INFINITY);
    expectNear(result.most, 113.75);
    expectNear(steadyLoss(massOf(5, 'medium', 60, { windows: 1, opaque: 0, ventilation: 0 })), 60);
  });
});
