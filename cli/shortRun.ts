import { setFlagsFromString } from 'node:v8';

/**
 * Bytes of code that a function runs through before it is compiled for speed. A year is read, simulated and printed before
 * such a compilation pays: with what V8 takes by itself a single year costs half as much again of the processor.
 */
const BUDGET = 2_000_000;

/** Has the machine compile for speed only what runs much longer than a single year. */
export function expectShortRun(): void {
  setFlagsFromString(`--interrupt-budget=${BUDGET}`);
}
