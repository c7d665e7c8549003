import { loadPlan } from '../../../src/batch/batchPlan.ts';
import type { Home } from '../../../src/batch/homesTable.ts';
import { JobRunner } from '../../../src/batch/runJob.ts';
import { InputFiles } from '../../../src/scenario/inputFiles.ts';
import { Kept } from '../../../src/scenario/kept.ts';
import { memoryFiles } from '../scenario/memoryFiles.ts';
import { sampleFiles } from '../scenario/sampleFiles.ts';

/** The base scenario as the one home of a plan. */
export const baseHome: Home = { name: 'base', changes: [], problems: [] };

/** Files of a plan over the sample scenario. */
export function planFiles(plan: string, changes: Record<string, string> = {}) {
  return memoryFiles(sampleFiles({ 'plan.yaml': plan, ...changes }));
}

/** A plan loaded, with what its jobs share. */
export function loadedPlan(plan: string, changes: Record<string, string> = {}) {
  const kept = new Kept();
  const files = new InputFiles(planFiles(plan, changes), kept);
  return { ...loadPlan('plan.yaml', files), files, kept };
}

/** A runner of the jobs of a plan without faults. */
export function runnerOf(plan: string, changes: Record<string, string> = {}) {
  const { plan: loaded, problems, files, kept } = loadedPlan(plan, changes);
  if (loaded === undefined) throw new Error(JSON.stringify(problems));
  return { runner: new JobRunner(loaded, files, kept), plan: loaded };
}
