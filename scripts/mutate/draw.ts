import { uniformInt } from 'pure-rand/distribution/uniformInt';
import { xoroshiro128plus } from 'pure-rand/generator/xoroshiro128plus';
import type { Mutant } from './mutants.ts';

/**
 * Chooses mutants by a seed, at most one a line.
 *
 * @param mutants all of them, in a fixed order
 * @param count how many are wanted
 * @param seed any whole number
 */
export function drawMutants(mutants: readonly Mutant[], count: number, seed: number): Mutant[] {
  const random = xoroshiro128plus(seed);
  // the first numbers of a small seed are alike
  for (let i = 0; i < 20; i++) uniformInt(random, 0, 1);
  const open = [...mutants];
  const drawn = new Map<string, Mutant>();
  while (drawn.size < count && open.length > 0) {
    const [mutant] = open.splice(uniformInt(random, 0, open.length - 1), 1);
    if (mutant === undefined) break;
    const line = `${mutant.file}:${mutant.line}`;
    if (!drawn.has(line)) drawn.set(line, mutant);
  }
  return [...drawn.values()].sort((a, b) => (a.file === b.file ? a.line - b.line : a.file < b.file ? -1 : 1));
}
