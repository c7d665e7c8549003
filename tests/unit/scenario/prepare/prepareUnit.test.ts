import { describe, expect, test } from 'vitest';
import { loadUnit } from '../../../../src/scenario/loadUnit.ts';
import { polylineOf, prepareUnit } from '../../../../src/scenario/prepare/prepareUnit.ts';
import type { HeatPumpUnit } from '../../../../src/sim/unit.ts';
import { memoryFiles } from '../memoryFiles.ts';

const full = `  fullLoad:
    capacity: |
      outdoor, 35, 55
      -10, 6, 5
       10, 10, 9
    cop: |
      outdoor, 35, 55
      -10, 2.8, 2.0
       10, 5.0, 3.2
`;

function unitOf(rest = '', map = ''): HeatPumpUnit {
  const { loaded, problems } = loadUnit(
    'unit.yaml',
    memoryFiles({ 'unit.yaml': `name: u\nmap:\n${full}${map}${rest}` }),
  );
  if (loaded === undefined) throw new Error(problems.map((problem) => problem.code).join(' '));
  return prepareUnit(loaded);
}

describe('a unit as its file gives it', () => {
  test('with nothing but its map takes the defaults', () => {
    const unit = unitOf();
    expect(unit.lowest).toEqual({ given: 'share', capacity: 0.3, cop: 1 });
    expect(unit.defrost).toEqual({ method: 'included' });
    expect(unit.cycling).toEqual({ method: 'degradation', coefficient: 0.25 });
    expect(unit.lowestOutdoorTemperature).toBe(Number.NEGATIVE_INFINITY);
    expect(unit.highestFlow).toEqual({ at: [0], value: [55] });
    expect([unit.standbyPower, unit.crankcasePower]).toEqual([0, 0]);
    expect(unit.crankcaseBelow).toBe(Number.POSITIVE_INFINITY);
    expect([...unit.full.capacity]).toEqual([6, 5, 10, 9]);
  });

  test('has its powers in kW', () => {
    const unit = unitOf(`standbyPower: 12
crankcase: { power: 40, belowTemperature: 8 }
cycling: { method: offPower, power: 25 }
`);
    expect([unit.standbyPower, unit.crankcasePower, unit.crankcaseBelow]).toEqual([0.012, 0.04, 8]);
    expect(unit.cycling).toEqual({ method: 'offPower', power: 0.025 });
  });

  test('has its limits, the highest flow one number or a line', () => {
    expect(unitOf('limits: { lowestOutdoorTemperature: -18, highestFlow: 60 }\n')).toMatchObject({
      lowestOutdoorTemperature: -18,
      highestFlow: { at: [0], value: [60] },
    });
    expect(unitOf('limits: { highestFlow: [[-20, 45], [-5, 60]] }\n').highestFlow).toEqual({
      at: [-20, -5],
      value: [45, 60],
    });
  });

  test('has its lowest level from a table of its own', () => {
    const { lowest } = unitOf(
      '',
      `  lowestLevel:
    given: table
    capacity: |
      outdoor, 35
      -10, 2
       10, 3
    cop: |
      outdoor, 35
      -10, 3.0
       10, 5.5
`,
    );
    if (lowest.given !== 'table') throw new Error('no table');
    expect([...lowest.map.capacity]).toEqual([2, 3]);
  });

  test('has frost by table as two lines', () => {
    const { defrost } = unitOf('defrost: { method: table, capacity: [[0, 0.9], [6, 1]], cop: [[2, 0.85]] }\n');
    expect(defrost).toEqual({
      method: 'table',
      capacity: { at: [0, 6], value: [0.9, 1] },
      cop: { at: [2], value: [0.85] },
    });
    expect(unitOf('defrost: { method: humidity }\n').defrost).toEqual({
      method: 'humidity',
      capacityLoss: 0.1,
      copLoss: 0.12,
    });
  });

  test('reads COP linearly where its file says so', () => {
    expect(unitOf('', '  interpolation: linear\n').full.linear).toBe(true);
    expect([...unitOf('', '  interpolation: linear\n').full.quality]).toEqual([2.8, 2, 5, 3.2]);
  });
});

test('pairs become a polyline', () => {
  expect(
    polylineOf([
      [1, 10],
      [2, 20],
    ]),
  ).toEqual({ at: [1, 2], value: [10, 20] });
});
