/** A run of many scenarios, for which what they have in common is made once. */
export class Kept {
  readonly #numbers = new WeakMap<object, number>();
  #last = 0;

  /**
   * A text that is the same for the same parts: prepared things count by identity, everything else by its content.
   *
   * @param prepared things that were made once themselves
   * @param entries plain values, such as entries of a scenario
   */
  key(prepared: readonly object[], ...entries: readonly unknown[]): string {
    return `${prepared.map((thing) => this.#numberOf(thing)).join(' ')}|${JSON.stringify(entries)}`;
  }

  #numberOf(thing: object): number {
    const known = this.#numbers.get(thing);
    if (known !== undefined) return known;
    this.#last++;
    this.#numbers.set(thing, this.#last);
    return this.#last;
  }
}

/**
 * A kind of thing that is dear to make. Things of one run that have the same key are made once; the least recently asked
 * ones are let go when there are too many, so that memory does not grow with the number of scenarios.
 */
export class KeptKind<T> {
  readonly #most: number;
  readonly #runs = new WeakMap<Kept, Map<string, T>>();

  /** @param most things of the kind that are kept at once */
  constructor(most: number) {
    this.#most = most;
  }

  /**
   * The thing with this key, made where it is not there.
   *
   * @param kept the run; without one the thing is made each time
   * @param key all that the thing depends on
   * @param make makes it
   * @param lasts whether a thing just made may serve other scenarios too
   */
  of(kept: Kept | undefined, key: string, make: () => T, lasts: (made: T) => boolean = () => true): T {
    if (kept === undefined) return make();
    const things = this.#thingsOf(kept);
    const known = things.get(key);
    if (known !== undefined) {
      things.delete(key);
      things.set(key, known);
      return known;
    }
    const made = make();
    if (!lasts(made)) return made;
    const [oldest] = things.keys();
    if (things.size >= this.#most && oldest !== undefined) things.delete(oldest);
    things.set(key, made);
    return made;
  }

  /** All that a run keeps, by key, so that another thread can be given it. */
  entriesOf(kept: Kept): readonly (readonly [string, T])[] {
    return [...this.#thingsOf(kept)];
  }

  /** Has a run keep what was made elsewhere. */
  put(kept: Kept, entries: readonly (readonly [string, T])[]): void {
    const things = this.#thingsOf(kept);
    for (const [key, thing] of entries) things.set(key, thing);
  }

  #thingsOf(kept: Kept): Map<string, T> {
    const known = this.#runs.get(kept);
    if (known !== undefined) return known;
    const things = new Map<string, T>();
    this.#runs.set(kept, things);
    return things;
  }
}
