import { spawnSync } from 'node:child_process';
import { measure } from './measure.ts';

const SAMPLES = 15;

/** Times whole processes from start to end, held against a Node that does nothing. Prints what it finds. */
export function benchColdStart(say: (line: string) => void): void {
  const main = 'dist/main.js';
  const starts = {
    'node -e 0': ['-e', '0'],
    '--help alone': [main, '--help'],
    'the demo simulated': [main, 'simulate', 'data/demo/house.yaml'],
  };
  const [nothing, ...ours] = measure(
    Object.entries(starts).map(([name, args]) => ({ name, repeat: 1, run: () => exitCodeOf(args) })),
    SAMPLES,
  );
  say(`\nwhole processes, medians of ${SAMPLES} interleaved starts`);
  say(`${nothing.name.padEnd(42)} ${nothing.median.toFixed(0).padStart(6)} ms`);
  for (const { name, median } of ours) {
    const times = (median / nothing.median).toFixed(1);
    say(`${name.padEnd(42)} ${median.toFixed(0).padStart(6)} ms   ${times} × ${nothing.name}`);
  }
}

function exitCodeOf(args: readonly string[]): number {
  const { status } = spawnSync(process.execPath, [...args], { stdio: 'ignore' });
  return status === 0 ? 0 : Number.NaN;
}
