import { execSync } from 'node:child_process';
import { cpus } from 'node:os';
import { newColumns } from '../src/sim/columns.ts';
import { totalsOf } from '../src/sim/totals.ts';
import { simulateYear } from '../src/sim/year.ts';
import { bill } from '../src/tariffs/bill.ts';
import { loadDemo, planOf } from './demo.ts';
import { measure } from './measure.ts';

const SAMPLES = 41;

const loaded = loadDemo();
const plan = planOf(loaded);
const { hours } = plan.weather;
const columns = simulateYear(plan, newColumns(hours));
const tariff = loaded.tariffs[0].prepared;

const measured = measure(
  [
    { name: 'a prepared year of the demo', repeat: 20, run: () => simulateYear(plan, columns).electricity[0] },
    { name: 'its months and totals', repeat: 20, run: () => totalsOf(plan, columns).annual.electricity },
    { name: 'one more tariff on it', repeat: 50, run: () => bill(tariff, columns.electricity).total },
  ],
  SAMPLES,
);

console.log(
  `${new Date().toISOString().slice(0, 10)}  ${cpus()[0].model.trim()}  Node ${process.version}  ${commit()}`,
);
console.log(`medians of ${SAMPLES} interleaved samples\n`);
for (const { name, least, median, most } of measured) {
  const perHour = ((median * 1e6) / hours).toFixed(1);
  console.log(
    `${name.padEnd(32)} ${median.toFixed(3).padStart(8)} ms  ${perHour.padStart(7)} ns an hour   (${least.toFixed(3)} to ${most.toFixed(3)})`,
  );
}
console.log(
  `\none more tariff costs ${((100 * measured[2].median) / measured[0].median).toFixed(1)} % of a simulated year`,
);

function commit(): string {
  try {
    return `commit ${execSync('git rev-parse --short HEAD', { encoding: 'utf8' }).trim()}`;
  } catch {
    return 'no commit';
  }
}
