/** A column of numbers that grows; it takes eight bytes a value, and at most twice that. */
export class GrowingColumn {
  #values = new Float64Array(1024);
  #length = 0;

  add(value: number): void {
    if (this.#length === this.#values.length) {
      const longer = new Float64Array(2 * this.#length);
      longer.set(this.#values);
      this.#values = longer;
    }
    this.#values[this.#length] = value;
    this.#length++;
  }

  /** The values so far. */
  get values(): Float64Array {
    return this.#values.subarray(0, this.#length);
  }
}
