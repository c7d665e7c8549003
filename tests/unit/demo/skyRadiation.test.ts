import { describe, expect, it } from 'vitest';
import { clearSkyRadiation, cloudFactor } from '../../../scripts/demo/skyRadiation.ts';

describe('radiation of the demo', () => {
  it('is nothing while the sun is down', () => {
    expect(clearSkyRadiation(0)).toBe(0);
    expect(clearSkyRadiation(-0.5)).toBe(0);
  });

  it('comes to 1037 W/m² under a clear sky with the sun overhead', () => {
    // Haurwitz 1945: 1098·e^(−0.057).
    expect(clearSkyRadiation(1)).toBeCloseTo(1037.2, 1);
  });

  it('falls to a quarter under a covered sky and is whole under a clear one', () => {
    // Kasten and Czeplak 1980: 1 − 0.75·N^3.4.
    expect(cloudFactor(0)).toBe(1);
    expect(cloudFactor(1)).toBe(0.25);
    expect(cloudFactor(0.5)).toBeCloseTo(1 - 0.75 * 0.0947, 4);
  });
});
