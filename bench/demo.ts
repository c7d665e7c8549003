import { DiskSource } from '../cli/diskSource.ts';
import { hasErrors } from '../src/core/problem.ts';
import { problemText } from '../src/core/problemText.ts';
import { type LoadedScenario, loadScenario } from '../src/scenario/loadScenario.ts';
import { prepareHouse } from '../src/scenario/prepare/prepareHouse.ts';
import { prepareParts, preparePlan } from '../src/scenario/prepare/preparePlan.ts';
import type { YearPlan } from '../src/sim/yearPlan.ts';

/** The demo house, loaded; throws with the problems where it cannot be. */
export function loadDemo(name = 'data/demo/house.yaml'): LoadedScenario {
  const { loaded, problems } = loadScenario(name, new DiskSource());
  if (loaded === undefined || hasErrors(problems)) throw new Error(problems.map(problemText).join('\n'));
  return loaded;
}

/** The plan of a loaded scenario, ready to run. */
export function planOf(loaded: LoadedScenario): YearPlan {
  const { scenario, clock } = loaded;
  const present = loaded.tariffs[0]?.prepared;
  const prepared = prepareHouse(scenario.house, clock, present);
  if ('opaqueLoss' in prepared) throw new Error('the house has no lumped model');
  return preparePlan(scenario, { ...prepareParts(loaded), clock, house: prepared.house, present });
}
