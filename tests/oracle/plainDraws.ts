/** Repeatable numbers for invented cases. */
export interface Draws {
  /** Uniform in [low, high). */
  readonly between: (low: number, high: number) => number;
  /** A whole number from low to high, both included. */
  readonly whole: (low: number, high: number) => number;
  readonly chance: (share: number) => boolean;
  readonly oneOf: <T>(choices: readonly T[]) => T;
  /** `count` rising values from about `low`, at least `gap` apart. */
  readonly rising: (count: number, low: number, gap: number) => number[];
}

/** Numbers that follow from a seed alone: a 32-bit counter through a mixing function (common practice, no source). */
export function drawsFrom(seed: number): Draws {
  let counter = seed >>> 0;
  const next = () => {
    counter = (counter + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(counter ^ (counter >>> 15), counter | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const between = (low: number, high: number) => low + (high - low) * next();
  const whole = (low: number, high: number) => low + Math.floor((high - low + 1) * next());
  return {
    between,
    whole,
    chance: (share) => next() < share,
    oneOf: (choices) => choices[whole(0, choices.length - 1)] as (typeof choices)[number],
    rising: (count, low, gap) => {
      let value = low + between(0, gap);
      return Array.from({ length: count }, () => {
        const here = value;
        value += gap * between(1, 2);
        return here;
      });
    },
  };
}
