/**
 * Global radiation on level ground under a cloudless sky, W/m².
 *
 * @param sunHeightSine sine of the sun's height, −1…1
 * @returns 0 where the sun is down
 * @example clearSkyRadiation(1) // 1037
 *
 * Reference: B. Haurwitz, J. Meteorology 2 (1945) 154–166; constants 1098 W/m² and 0.057 from memory.
 */
export function clearSkyRadiation(sunHeightSine: number): number {
  return sunHeightSine <= 0 ? 0 : 1098 * sunHeightSine * Math.exp(-0.057 / sunHeightSine);
}

/**
 * Share of the cloudless sky's radiation that clouds let through.
 *
 * @param cloudCover covered share of the sky, 0…1
 * @example cloudFactor(1) // 0.25
 *
 * Reference: F. Kasten, G. Czeplak, Solar Energy 24 (1980) 177–189: 1 − 0.75·N^3.4.
 */
export function cloudFactor(cloudCover: number): number {
  return 1 - 0.75 * cloudCover ** 3.4;
}
