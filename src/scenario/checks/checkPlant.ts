import type { Problem } from '../../core/problem.ts';
import type { EntryPath } from '../entries/pathText.ts';
import type { Scenario } from '../scenarioSchema.ts';
import type { YamlFile } from '../yaml/yamlFile.ts';
import { below, notAbove, pointsOutOfOrder } from './contradictions.ts';

type FlowTemperature = Scenario['flowTemperature'];

/** A choice by price needs a price. */
export function checkBackup(yaml: YamlFile, { backup, tariffs }: Pick<Scenario, 'backup' | 'tariffs'>): Problem[] {
  if (backup?.mode.kind !== 'cheapest' || tariffs.length > 0) return [];
  return [yaml.problem(['backup', 'mode'], { code: 'scenario.cheapest-needs-tariff' })];
}

/** What does not go together in the efficiency of a boiler that follows its return temperature. */
export function checkBoilerFlow(yaml: YamlFile, boiler: Scenario['boiler'], designRoom: number): Problem[] {
  if (typeof boiler?.efficiency !== 'object') return [];
  const { byReturnTemperature, flowTemperature } = boiler.efficiency;
  const path = ['boiler', 'efficiency'];
  return [
    ...pointsOutOfOrder(yaml, [...path, 'byReturnTemperature'], byReturnTemperature),
    ...checkFlow(yaml, [...path, 'flowTemperature'], flowTemperature, designRoom),
  ];
}

/** What does not go together in a flow setting; the emitters' own room is the design room where none is given. */
export function checkFlow(yaml: YamlFile, path: EntryPath, setting: FlowTemperature, designRoom: number): Problem[] {
  if (setting.method === 'curve') return pointsOutOfOrder(yaml, [...path, 'points'], setting.points);
  if (setting.method === 'fixed') return [];
  const { flow } = setting;
  const room = { name: 'the room temperature', value: setting.roomTemperature ?? designRoom };
  const highest =
    setting.highestFlow === undefined
      ? { name: 'the design flow, which is the highest where none is given', value: flow }
      : { name: 'the highest flow', value: setting.highestFlow };
  const problems = [
    ...notAbove(yaml, [...path, 'flow'], flow, room),
    ...notAbove(yaml, [...path, 'flow'], flow, { name: 'the return temperature', value: setting.return }),
  ];
  if (problems.length === 0 && (flow + setting.return) / 2 <= room.value) {
    problems.push(...notAbove(yaml, [...path, 'return'], (flow + setting.return) / 2, room));
  }
  if (setting.lowestFlow > highest.value) {
    problems.push(
      ...below(yaml, [...path, setting.highestFlow === undefined ? 'flow' : 'highestFlow'], highest.value, {
        name: 'the lowest flow',
        value: setting.lowestFlow,
      }),
    );
  }
  return problems;
}

/** What does not go together in the hot water. */
export function checkHotWater(yaml: YamlFile, hotWater: Scenario['hotWater']): Problem[] {
  if (hotWater === undefined) return [];
  const path = ['hotWater'];
  const { coldWater, draw, setPoint, hygiene } = hotWater;
  const warmest = { name: 'the warmest cold water', value: coldWater.mean + coldWater.amplitude };
  const problems = notAbove(yaml, [...path, 'setPoint'], setPoint, warmest);
  if (draw.given === 'litres') {
    problems.push(...notAbove(yaml, [...path, 'draw', 'useTemperature'], draw.useTemperature, warmest));
    if (draw.shares?.every((share) => share === 0)) {
      problems.push(yaml.problem([...path, 'draw', 'shares'], { code: 'scenario.no-shares' }));
    }
  }
  if (coldWater.amplitude > coldWater.mean) {
    const found = `${coldWater.amplitude} K`;
    problems.push(yaml.problem([...path, 'coldWater', 'amplitude'], { code: 'scenario.frozen-water', found }));
  }
  if (hygiene !== undefined && hygiene.temperature < setPoint) {
    const fault = { found: `${hygiene.temperature} °C`, allowed: `${setPoint} °C` };
    const mild = { code: 'scenario.hygiene-below-set-point', severity: 'warning', ...fault } as const;
    problems.push(yaml.problem([...path, 'hygiene', 'temperature'], mild));
  }
  return problems;
}
