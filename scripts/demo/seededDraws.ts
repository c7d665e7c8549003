import { uniformFloat64 } from 'pure-rand/distribution/uniformFloat64';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';

/** Random draws that are the same for the same seed on every machine. */
export interface Draws {
  /** The next draw of the even distribution over 0 (included) to 1 (excluded). */
  readonly uniform: () => number;
  /** The next draw of the normal distribution of mean 0 and standard deviation 1. */
  readonly normal: () => number;
}

/** The generator's first draws follow small seeds in step; after so many they no longer do. */
const WARM_UP_DRAWS = 20;

/**
 * Random draws from a seed written in words.
 *
 * @param seed any text; a single changed letter gives unlike draws
 * @returns draws, each call moving on by one (a normal draw uses two even ones)
 *
 * Reference: G. E. P. Box, M. E. Muller, Ann. Math. Stat. 29 (1958) 610–611, for the normal draw.
 */
export function seededDraws(seed: string): Draws {
  const generator = xoroshiro128plus(hashOfText(seed));
  for (let i = 0; i < WARM_UP_DRAWS; i++) uniformFloat64(generator);
  const uniform = () => uniformFloat64(generator);
  const normal = () => {
    const radius = Math.sqrt(-2 * Math.log(1 - uniform()));
    return radius * Math.cos(2 * Math.PI * uniform());
  };
  return { uniform, normal };
}

/**
 * FNV-1a hash of a text's UTF-16 units, 32 bit, as a whole number from 0.
 *
 * @param text any text; '' gives the offset basis
 * @example hashOfText('a') // 0xe40c292c
 *
 * Reference: G. Fowler, L. C. Noll, K.-P. Vo, FNV-1a with 32 bit; constants from memory, held to published hashes by the test.
 */
export function hashOfText(text: string): number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < text.length; i++) hash = Math.imul(hash ^ text.charCodeAt(i), 0x01000193);
  return hash >>> 0;
}
