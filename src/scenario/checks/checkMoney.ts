import { nearestName } from '../../core/nearest.ts';
import { type Problem, shown } from '../../core/problem.ts';
import type { PreparedTariff } from '../../tariffs/preparedTariff.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';

/** What does not go together in the profile of a household. */
export function checkHousehold(yaml: YamlFile, household: Scenario['household']): Problem[] {
  if (household?.given !== 'profile') return [];
  const { shares, weekendShares } = household;
  const lists = { shares, weekendShares };
  if (shares === undefined) {
    return weekendShares === undefined
      ? []
      : [yaml.keyProblem(['household', 'weekendShares'], { code: 'scenario.weekend-alone' })];
  }
  const empty = [shares, weekendShares ?? shares].every((list) => list.every((share) => share === 0));
  if (!empty) return [];
  return Object.entries(lists)
    .filter(([, list]) => list !== undefined)
    .map(([key]) => yaml.problem(['household', key], { code: 'scenario.no-shares' }));
}

/** What a boiler needs beside itself. */
export function checkBoiler(
  yaml: YamlFile,
  { boiler, hotWater, tariffs }: Pick<Scenario, 'boiler' | 'hotWater' | 'tariffs'>,
): Problem[] {
  if (boiler === undefined) return [];
  const problems: Problem[] = [];
  if (boiler.fuel.price === undefined && tariffs.length === 0) {
    problems.push(yaml.problem(['boiler', 'fuel'], { code: 'scenario.boiler-needs-tariff' }));
  }
  if (boiler.cylinderLoss !== undefined && boiler.cylinderLoss > 0 && hotWater === undefined) {
    const fault = { code: 'scenario.cylinder-without-hot-water', found: String(boiler.cylinderLoss) } as const;
    problems.push(yaml.problem(['boiler', 'cylinderLoss'], fault));
  }
  return problems;
}

/**
 * Whether carbon factors by rate fit the rates of the first tariff.
 *
 * @param present that tariff laid on the year, where it could be
 */
export function checkCarbon(
  yaml: YamlFile,
  { carbon, tariffs }: Pick<Scenario, 'carbon' | 'tariffs'>,
  present: PreparedTariff | undefined,
): Problem[] {
  if (carbon === undefined || typeof carbon.electricity === 'number') return [];
  if (carbon.electricity.given !== 'byRate') return [];
  const { factors } = carbon.electricity;
  const path = ['carbon', 'electricity', 'factors'];
  const names = factors.map(({ rate }) => rate);
  const problems = names.flatMap((name, i) =>
    names.indexOf(name) === i
      ? []
      : [yaml.problem([...path, i, 'rate'], { code: 'scenario.carbon-rate-twice', found: quoted(name) })],
  );
  if (tariffs.length === 0) return [...problems, yaml.problem(path, { code: 'scenario.carbon-needs-tariff' })];
  if (present === undefined) return problems;
  const known = present.rateNames.filter((_, i) => present.hoursOfRate[i] > 0);
  const allowed = known.map(quoted).join(', ');
  names.forEach((name, i) => {
    if (present.rateNames.includes(name)) return;
    const near = nearestName(name, known);
    const hint = near === undefined ? {} : { hint: `perhaps ${shown(near, 30)} is meant` };
    const fault = { code: 'scenario.carbon-no-such-rate', found: quoted(name), allowed, ...hint } as const;
    problems.push(yaml.problem([...path, i, 'rate'], fault));
  });
  const missing = known.filter((name) => !names.includes(name));
  if (missing.length > 0) {
    const found = missing.map(quoted).join(', ');
    problems.push(yaml.keyProblem(path, { code: 'scenario.carbon-rate-missing', found }));
  }
  return problems;
}

function quoted(name: string): string {
  return `'${shown(name, 30)}'`;
}

/** What a comparison over whole lives needs beside itself. */
export function checkWholeLife(
  yaml: YamlFile,
  { wholeLife, boiler, tariffs }: Pick<Scenario, 'wholeLife' | 'boiler' | 'tariffs'>,
): Problem[] {
  if (wholeLife === undefined) return [];
  const problems: Problem[] = [];
  if (boiler === undefined) {
    problems.push(yaml.keyProblem(['wholeLife'], { code: 'scenario.whole-life-needs-boiler' }));
  }
  if (tariffs.length === 0) {
    problems.push(yaml.keyProblem(['wholeLife'], { code: 'scenario.whole-life-needs-tariff' }));
  }
  return problems;
}
