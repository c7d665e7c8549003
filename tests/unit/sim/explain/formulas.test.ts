import { describe, expect, test } from 'vitest';
import type { FigureName } from '../../../../src/sim/explain/figures.ts';
import type { ExplainedStage, FormulaName } from '../../../../src/sim/explain/stage.ts';
import { type ExplainedCase, explainedCases } from './explainedYears.ts';
import { type Shown, worked } from './workedFormulas.ts';

/** What counts only where the stage itself shows it. */
const OWN_ONLY = new Set<FigureName>(['lowFlowGain', 'coldSlope', 'flowAbove']);

/** Figures of a stage, else those that an earlier stage of the hour has shown. */
function shownIn(stage: ExplainedStage, before: ReadonlyMap<FigureName, number>): Shown {
  const own = new Map(stage.figures.map(({ name, value }) => [name, value]));
  return (name, otherwise) => {
    const value = own.get(name) ?? (OWN_ONLY.has(name) ? undefined : before.get(name)) ?? otherwise;
    if (value === undefined) throw new Error(`${stage.stage} shows no ${name}`);
    return value;
  };
}

/** Formulas of the hour that were worked, and what differs from what is shown. */
function workHour({ stages }: ExplainedCase): { readonly formulas: FormulaName[]; readonly differences: string[] } {
  const before = new Map<FigureName, number>();
  const formulas: FormulaName[] = [];
  const differences: string[] = [];
  for (const stage of stages) {
    // behind the backup only what the heat pump gives in the end counts
    if (stage.stage === 'rateLeft')
      for (const name of ['offeredHeat', 'offeredElectricity'] as const) before.delete(name);
    const f = shownIn(stage, before);
    for (const [formula, work] of Object.entries(worked)) {
      if (!stage.formulas.includes(formula as FormulaName)) continue;
      formulas.push(formula as FormulaName);
      for (const [shown, reckoned] of work(f, stage.findings)) {
        // rounding of a handful of operations
        const isSame = Math.abs(shown - reckoned) <= 1e-9 * Math.max(1, Math.abs(reckoned));
        if (!isSame) differences.push(`${stage.stage}, ${formula}: ${shown} shown, ${reckoned} reckoned`);
      }
    }
    for (const { name, value } of stage.figures) before.set(name, value);
  }
  return { formulas, differences };
}

describe('the figures of an explained hour', () => {
  const counts = new Map<FormulaName, number>();

  test('follow from one another as the words of the formulas say', () => {
    for (const one of explainedCases(1)) {
      const { formulas, differences } = workHour(one);
      expect(differences, `${one.name}, hour ${one.i}`).toEqual([]);
      for (const formula of formulas) counts.set(formula, (counts.get(formula) ?? 0) + 1);
    }
  });

  test('were worked for every formula, many times', () => {
    for (const formula of Object.keys(worked)) {
      expect(counts.get(formula as FormulaName) ?? 0, formula).toBeGreaterThan(5);
    }
  });
});
