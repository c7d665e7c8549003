import { expect, test } from 'vitest';
import { explainHour } from '../../../../src/sim/explain/explainHour.ts';
import type { ExplainedStage } from '../../../../src/sim/explain/stage.ts';
import { simulateYear } from '../../../../src/sim/year.ts';
import { planOf } from '../planBuilder.ts';
import { figureOf } from './explainedYears.ts';

// A table of three rows and three columns, every value its own, so that no corner can be taken for another.
const table = {
  outdoor: [-7, 2, 7],
  flow: [35, 45, 55],
  capacity: [5.1, 5.2, 5.3, 6.1, 6.2, 6.3, 8.1, 8.2, 8.3],
  cop: [2.9, 2.4, 2.1, 3.6, 2.9, 2.4, 4.2, 3.3, 2.8],
};
const HOURS = 48;

/** The map of an hour in which the unit heats rooms at an outdoor and a flow temperature. */
function mapAt(outdoor: number, flow: number, of: typeof table = table): ExplainedStage {
  const plan = planOf({
    hours: HOURS,
    temperature: new Float64Array(HOURS).fill(outdoor),
    table: of,
    flow: { at: [0], value: [flow] },
    unit: { highestFlow: { at: [0], value: [70] } },
  });
  const air = { kind: 'relative', humidity: 80, humidityMeasured: true, pressureMeasured: true } as const;
  return explainHour(plan, simulateYear(plan), 30, air).find(({ stage }) => stage === 'map')!;
}

const hasFigure = (stage: ExplainedStage, name: string) => stage.figures.some((figure) => figure.name === name);

test.each([
  [-3, 40, [5.1, 5.2, 6.1, 6.2]],
  [-3, 50, [5.2, 5.3, 6.2, 6.3]],
  [4, 40, [6.1, 6.2, 8.1, 8.2]],
  [4, 50, [6.2, 6.3, 8.2, 8.3]],
])('at %d °C and %d °C flow the four corners around the point are shown', (outdoor, flow, corners) => {
  const stage = mapAt(outdoor, flow);
  const names = ['capacityColdLow', 'capacityColdHigh', 'capacityWarmLow', 'capacityWarmHigh'] as const;
  expect(names.map((name) => figureOf(stage, name))).toEqual(corners);
});

test.each([
  [-3, 35],
  [-3, 55],
  [-7, 45],
  [7, 45],
])('a point on the edge of the map is inside it: %d °C, %d °C flow', (outdoor, flow) => {
  expect(mapAt(outdoor, flow).findings).toEqual(['insideMap']);
});

test('the fall of capacity below the coldest row is shown below it, and nowhere else', () => {
  expect(hasFigure(mapAt(-9, 40), 'coldSlope')).toBe(true);
  for (const outdoor of [-7, -3, 4]) expect(hasFigure(mapAt(outdoor, 40), 'coldSlope')).toBe(false);
});

test('only a table of one flow column is said to be one', () => {
  const columns = (count: number) => ({
    ...table,
    flow: table.flow.slice(0, count),
    capacity: table.capacity.filter((_, i) => i % 3 < count),
    cop: table.cop.filter((_, i) => i % 3 < count),
  });
  for (const count of [1, 2, 3]) {
    expect(mapAt(2, 35, columns(count)).findings.includes('oneFlowColumn')).toBe(count === 1);
  }
});
