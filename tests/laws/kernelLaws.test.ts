/** The loops that run a year fast are held against the stages that are there to be read. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { simulateByStages, simulateYear } from '../../src/sim/year.ts';
import type { YearPlan } from '../../src/sim/yearPlan.ts';
import { caseForms, inventCase } from '../oracle/inventedCase.ts';
import { productPlan } from '../oracle/productPlan.ts';
import { anyPlan } from '../unit/sim/anyPlan.ts';

const RUNS = { seed: 20_261_201, numRuns: 200 };

function expectSameColumns(plan: YearPlan): void {
  const fast = simulateYear(plan);
  const plain = simulateByStages(plan);
  for (const [name, column] of Object.entries(plain)) {
    if (typeof column === 'number') continue;
    const same = Buffer.compare(Buffer.from(column.buffer), Buffer.from(fast[name as 'marks'].buffer)) === 0;
    expect(same, name).toBe(true);
  }
}

test('on random plans every column of the loops has the bytes of the stages', () => {
  let compared = 0;
  fc.assert(
    fc.property(anyPlan, (plan) => {
      if (plan.sourcePrices === null) compared++;
      expectSameColumns(plan);
    }),
    RUNS,
  );
  // `cheapest` is run by the stages both times, which compares nothing
  expect(compared).toBeGreaterThan(RUNS.numRuns / 2);
});

test('the same on the cases of the second implementation, which reach every branch', () => {
  const law = fc.property(caseForms, (forms) => expectSameColumns(productPlan(inventCase(forms))));
  fc.assert(law, RUNS);
});
