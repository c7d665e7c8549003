import type { Problem } from '../../core/problem.ts';
import { massParameters } from '../../sim/lumpedHouse.ts';
import { heatLossOf } from '../prepare/prepareHouse.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { notBelow } from './contradictions.ts';

type House = Scenario['house'];

/** Shares of the heat loss may miss a sum of one by so much, for rounding in writing. */
const SHARE_TOLERANCE = 0.001;

/** What does not go together in the design conditions. */
export function checkDesign(yaml: YamlFile, design: House['design']): Problem[] {
  const room = { name: 'the design room temperature', value: design.roomTemperature };
  return notBelow(yaml, ['house', 'design', 'outdoorTemperature'], design.outdoorTemperature, room);
}

/** What does not go together in a heat loss that is given by a load. */
export function checkLoad(yaml: YamlFile, heatLoss: House['heatLoss']): Problem[] {
  if (heatLoss.given !== 'load') return [];
  const room = { name: 'the room temperature of that load', value: heatLoss.roomTemperature };
  return notBelow(yaml, ['house', 'heatLoss', 'outdoorTemperature'], heatLoss.outdoorTemperature, room);
}

/** Whether the house loses heat, and its mass takes it up; not asked where one of its parts contradicts itself. */
export function checkLoss(yaml: YamlFile, house: House): Problem[] {
  const { design, heatLoss, need, floorArea } = house;
  const parts = [checkDesign(yaml, design), checkLoad(yaml, heatLoss), checkNeed(yaml, need, floorArea)];
  if (parts.some((problems) => problems.length > 0)) return [];
  const { total } = heatLossOf(house);
  if (total <= 0) {
    const found = `${total.toFixed(1)} W/K`;
    return [yaml.keyProblem(['house', 'heatLoss'], { code: 'scenario.no-heat-loss', found })];
  }
  return checkMass(yaml, house);
}

/** What does not go together in the need of the house. */
export function checkNeed(yaml: YamlFile, need: House['need'], floorArea: House['floorArea']): Problem[] {
  const path = ['house', 'need'];
  if (need.model === 'lumped') {
    const problems: Problem[] = [];
    if (floorArea === undefined) {
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
