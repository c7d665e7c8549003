/** A thing to be timed: `run` returns a figure so that nothing is optimised away. */
export interface Candidate {
  readonly name: string;
  /** How often it is run for one sample. */
  readonly repeat: number;
  readonly run: () => number;
}

export interface Measured {
  readonly name: string;
  /** Milliseconds a run: least, median and most over the samples. */
  readonly least: number;
  readonly median: number;
  readonly most: number;
}

/**
 * Times candidates in turn, A B C A B C …, so that a change of the machine's speed meets all of them alike.
 *
 * @param candidates what is timed
 * @param samples counted rounds, after five that are not
 */
export function measure(candidates: readonly Candidate[], samples: number): Measured[] {
  const times = candidates.map(() => [] as number[]);
  let sink = 0;
  for (let round = -5; round < samples; round++) {
    candidates.forEach((candidate, at) => {
      const start = process.hrtime.bigint();
      for (let k = 0; k < candidate.repeat; k++) sink += candidate.run();
      const each = Number(process.hrtime.bigint() - start) / 1e6 / candidate.repeat;
      if (round >= 0) times[at].push(each);
    });
  }
  if (!Number.isFinite(sink)) throw new Error('a candidate returned no finite figure');
  return candidates.map(({ name }, at) => {
    const sorted = times[at].toSorted((a, b) => a - b);
    return { name, least: sorted[0], median: sorted[sorted.length >> 1], most: sorted[sorted.length - 1] };
  });
}
