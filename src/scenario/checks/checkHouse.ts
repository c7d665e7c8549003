import type { Problem } from '../../core/problem.ts';
import { massParameters } from '../../sim/lumpedHouse.ts';
import { heatLossOf } from '../prepare/prepareHouse.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { notBelow } from './contradictions.ts';

type House = Scenario['house'];

/** Shares of the heat loss may miss a sum of one by so much, for rounding in writing. */
const SHARE_TOLERANCE = 0.001;

/** What does not go together in the house: its heat loss, its design conditions, its need. */
export function checkHouse(yaml: YamlFile, house: House): Problem[] {
  const { design, heatLoss } = house;
  const problems = notBelow(yaml, ['house', 'design', 'outdoorTemperature'], design.outdoorTemperature, {
    name: 'the design room temperature',
    value: design.roomTemperature,
  });
  if (heatLoss.given === 'load') {
    const room = { name: 'the room temperature of that load', value: heatLoss.roomTemperature };
    problems.push(...notBelow(yaml, ['house', 'heatLoss', 'outdoorTemperature'], heatLoss.outdoorTemperature, room));
  }
  problems.push(...checkNeed(yaml, house));
  if (problems.length > 0) return problems;
  const { total } = heatLossOf(house);
  if (total <= 0) {
    const found = `${total.toFixed(1)} W/K`;
    return [yaml.keyProblem(['house', 'heatLoss'], { code: 'scenario.no-heat-loss', found })];
  }
  return checkMass(yaml, house);
}

function checkNeed(yaml: YamlFile, house: House): Problem[] {
  const { need } = house;
  const path = ['house', 'need'];
  if (need.model === 'lumped') {
    const problems: Problem[] = [];
    if (house.floorArea === undefined) {
      problems.push(yaml.problem([...path, 'model'], { code: 'scenario.needs-floor-area' }));
    }
    const shares = need.lossShares;
    const sum = shares === undefined ? 1 : shares.windows + shares.opaque + shares.ventilation;
    if (Math.abs(sum - 1) > SHARE_TOLERANCE) {
      const found = String(Number(sum.toFixed(4)));
      problems.push(yaml.problem([...path, 'lossShares'], { code: 'scenario.loss-shares', found }));
    }
    return problems;
  }
  if (need.baseTemperature === undefined) return [];
  return (['internalGains', 'solarAperture'] as const)
    .filter((gain) => need[gain] > 0)
    .map((gain) => yaml.problem([...path, gain], { code: 'scenario.base-and-gains', found: String(need[gain]) }));
}

/** The lumped house needs its mass to take up more than its opaque elements pass on (MODEL section 4). */
function checkMass(yaml: YamlFile, house: House): Problem[] {
  const { need, floorArea } = house;
  if (need.model !== 'lumped' || floorArea === undefined) return [];
  const { total, parts } = heatLossOf(house);
  const result = massParameters(floorArea, need.massClass, total, parts);
  if ('mass' in result) return [];
  const most = result.most.toFixed(0);
  // beyond what the surfaces pass on at all, no finite loss of the opaque elements would reach the heat loss
  const found = Number.isFinite(result.opaque) ? result.opaque.toFixed(0) : `over ${most}`;
  return [yaml.keyProblem(['house', 'heatLoss'], { code: 'house.opaque-loss', found, allowed: most, unit: 'W/K' })];
}
