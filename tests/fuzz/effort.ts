import type fc from 'fast-check';

/** Properties that share the time; a rough number is enough. */
const PROPERTIES = 15;
const SEED = 20_250_301;

/** Ten minutes when it is asked for by `npm run fuzz`, none in the ordinary run. */
const usual = process.env.MODE === 'fuzz' ? 600 : 0;

const seconds = Number(process.env.WINTERLEDGER_FUZZ_SECONDS ?? usual);

/** Whether a time was set, so that new cases are tried and counted. */
export const isLong = seconds > 0;

/** Time that a property may take in the runner, ms. */
export const LONGEST = Math.max(120_000, 4 * seconds * 1000);

/**
 * How often a property is tried: always the same cases; or, with WINTERLEDGER_FUZZ_SECONDS, as many new ones as fit into
 * its share of that time. A failure is reported with the seed that brings it again as WINTERLEDGER_FUZZ_SEED.
 *
 * @param runs cases of the ordinary run
 */
export function effort(runs: number): fc.Parameters<unknown> {
  if (!isLong) return { seed: SEED, numRuns: runs };
  const seed = Number(process.env.WINTERLEDGER_FUZZ_SEED ?? Date.now() % 2 ** 31);
  return {
    seed,
    numRuns: 1_000_000_000,
    interruptAfterTimeLimit: (seconds * 1000) / PROPERTIES,
    markInterruptAsFailure: false,
  };
}
