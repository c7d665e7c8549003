import type { Io } from '../io.ts';

/** Milliseconds between two looks of the line. */
const PAUSE = 200;

/** A line on the terminal that says how far a batch is, and how long it will still take; nothing where there is no terminal. */
export class Progress {
  readonly #io: Io;
  readonly #total: number;
  readonly #start = Date.now();
  readonly #before: number;
  #done: number;
  #last = 0;
  #shown = false;

  /**
   * @param total years of the run
   * @param done of them finished by an earlier run
   */
  constructor(io: Io, total: number, done: number) {
    this.#io = io;
    this.#total = total;
    this.#before = done;
    this.#done = done;
  }

  async add(years: number): Promise<void> {
    this.#done += years;
    const now = Date.now();
    if (this.#io.terminal !== true || now - this.#last < PAUSE) return;
    this.#last = now;
    this.#shown = true;
    await this.#io.stderr.write(`\r\u001b[2K${this.#text(now)}`);
  }

  /** Takes the line away. */
  async end(): Promise<void> {
    if (this.#shown) await this.#io.stderr.write('\r\u001b[2K');
    this.#shown = false;
  }

  #text(now: number): string {
    const share = Math.floor((100 * this.#done) / this.#total);
    const rate = (this.#done - this.#before) / Math.max(1, now - this.#start);
    const left = rate > 0 ? `, ${durationText((this.#total - this.#done) / rate)} left` : '';
    return `${this.#done} of ${this.#total} years, ${share} %${left}`;
  }
}

/** A time in words: '3 min 20 s'. @param millis 0 or above */
export function durationText(millis: number): string {
  const seconds = Math.ceil(millis / 1000);
  if (seconds < 60) return `${seconds} s`;
  const minutes = Math.floor(seconds / 60);
  return minutes < 60 ? `${minutes} min ${seconds % 60} s` : `${Math.floor(minutes / 60)} h ${minutes % 60} min`;
}
