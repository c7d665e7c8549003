import { execSync } from 'node:child_process';
import { cpus } from 'node:os';
import { newColumns } from '../src/sim/columns.ts';
import { totalsOf } from '../src/sim/totals.ts';
import { simulateByStages, simulateYear } from '../src/sim/year.ts';
import { bill } from '../src/tariffs/bill.ts';
import { benchBatch } from './batch.ts';
import { benchColdStart } from './coldStart.ts';
import { loadDemo, planOf } from './demo.ts';
import { type Candidate, measure } from './measure.ts';
import { keepPage } from './page.ts';
import { plainC } from './plainC.ts';
import { everythingOn } from './plans.ts';
import { benchReading } from './reading.ts';
import { benchSheet } from './sheet.ts';
import { benchSheetOpening } from './sheetOpening.ts';

/** Everything that was printed, for the page. */
const said: string[] = [];
function say(line: string): void {
  console.log(line);
  said.push(line);
}

const SAMPLES = 31;
const YEARS_OF_C = 20;

const loaded = loadDemo();
const demo = planOf(loaded);
const everything = planOf(everythingOn(loaded, 'degreeHours'));
const lumped = planOf(everythingOn(loaded, 'lumped'));
const { hours } = demo.weather;
const columns = newColumns(hours);
simulateYear(demo, columns);
const ofDemo = simulateYear(demo);
const [tariff] = loaded.tariffs;
const year = (name: string, run: () => void): Candidate => ({
  name,
  repeat: YEARS_OF_C,
  run: () => {
    run();
    return columns.electricity[0];
  },
});

const inC = plainC(everything);
const candidates: Candidate[] = [
  year('a prepared year of the demo', () => simulateYear(demo, columns)),
  year('… with everything on', () => simulateYear(everything, columns)),
  year('… and a house with mass', () => simulateYear(lumped, columns)),
  year('… everything, stage by stage', () => simulateByStages(everything, columns)),
  { name: 'months and totals', repeat: YEARS_OF_C, run: () => totalsOf(demo, ofDemo).annual.electricity },
  { name: 'one more tariff on it', repeat: 50, run: () => bill(tariff.prepared, ofDemo.electricity).total },
];
const inCNs: number[] = [];
const measured = measure(
  inC === undefined
    ? candidates
    : [...candidates, { name: 'plain C loop, everything on', repeat: 1, run: () => timeOfC(inC.time(YEARS_OF_C)) }],
  SAMPLES,
).filter(({ name }) => !name.startsWith('plain C'));

/** The C program times itself: starting it does not count. */
function timeOfC(ns: number): number {
  inCNs.push(ns);
  return ns;
}

say(`${new Date().toISOString().slice(0, 10)}  ${cpus()[0].model.trim()}  Node ${process.version}  ${commit()}`);
say(`medians of ${SAMPLES} interleaved samples\n`);
const perHour = (name: string) => {
  const found = measured.find((each) => each.name === name);
  return found === undefined ? 0 : (found.median * 1e6) / hours;
};
for (const { name, least, median, most } of measured) {
  const figures = `${median.toFixed(3).padStart(8)} ms ${((median * 1e6) / hours).toFixed(1).padStart(7)} ns an hour`;
  say(`${name.padEnd(32)} ${figures}   (${least.toFixed(3)} to ${most.toFixed(3)})`);
}
if (inC === undefined) {
  say('no C compiler here: nothing to hold the year against');
} else {
  const ns = inCNs.toSorted((a, b) => a - b)[inCNs.length >> 1];
  say(`${'plain C loop, everything on'.padEnd(32)} ${''.padStart(11)} ${ns.toFixed(1).padStart(7)} ns an hour`);
  say(`\neverything on takes ${(perHour('… with everything on') / ns).toFixed(2)} × the plain C loop`);
  say(`a house with mass takes ${(perHour('… and a house with mass') / ns).toFixed(2)} × the same loop`);
  inC.close();
}
const year1 = perHour('a prepared year of the demo');
say(`hot water and mass take ${(perHour('… and a house with mass') / year1).toFixed(2)} × the year without them`);
say(`one more tariff costs ${((100 * perHour('one more tariff on it')) / year1).toFixed(1)} % of a simulated year`);

benchReading(say);
benchSheet(say);
await benchSheetOpening(say);
benchColdStart(say);
await benchBatch(say);
if (process.argv.includes('--keep')) keepPage(said);

function commit(): string {
  try {
    return `commit ${execSync('git rev-parse --short HEAD', { encoding: 'utf8' }).trim()}`;
  } catch {
    return 'no commit';
  }
}
