import type { Colour } from './indexedPng.ts';

/** Colours of a ramp; enough that no step is seen, few enough that the picture stays small. */
export const RAMP_STEPS = 64;

/**
 * Ramps that grow darker from end to end, so that they are read without colour and by the colour-blind. `warmth` runs from
 * cold and dark to warm and light.
 */
const STOPS: Readonly<Record<RampName, readonly Colour[]>> = {
  energy: [
    [246, 243, 235],
    [244, 198, 120],
    [205, 104, 62],
    [122, 34, 58],
    [42, 12, 40],
  ],
  warmth: [
    [20, 24, 66],
    [38, 82, 130],
    [78, 142, 148],
    [164, 193, 142],
    [247, 234, 176],
  ],
  price: [
    [240, 244, 238],
    [168, 206, 178],
    [82, 148, 136],
    [26, 88, 98],
    [8, 34, 52],
  ],
};

export type RampName = 'energy' | 'warmth' | 'price';

/**
 * The colours of a ramp.
 *
 * @returns `RAMP_STEPS` colours, the least value first
 */
export function colourRamp(name: RampName): Colour[] {
  const stops = STOPS[name];
  return Array.from({ length: RAMP_STEPS }, (_, step) => {
    const along = (step / (RAMP_STEPS - 1)) * (stops.length - 1);
    const from = Math.min(Math.floor(along), stops.length - 2);
    const mix = (channel: 0 | 1 | 2) =>
      Math.round(stops[from][channel] + (along - from) * (stops[from + 1][channel] - stops[from][channel]));
    return [mix(0), mix(1), mix(2)];
  });
}
