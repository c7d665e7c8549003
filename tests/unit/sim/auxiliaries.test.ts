import { expect, test } from 'vitest';
import { countAuxiliaries } from '../../../src/sim/auxiliaries.ts';
import { newColumns } from '../../../src/sim/columns.ts';
import { column, expectNear, type PlanParts, planOf } from './planBuilder.ts';

const HOURS = 24;
const parts: PlanParts = {
  hours: HOURS,
  temperature: column(5, { 3: 20 }, HOURS),
  unit: { standbyPower: 0.01, crankcasePower: 0.03, crankcaseBelow: 15 },
  run: { circulationPower: 0.06 },
};

/** Hour 0: space heat; 1: hot water alone; 2: need that the backup meets; 3, 4: nothing at 20 and 5 °C. */
function columnsOf(plan: PlanParts) {
  const c = newColumns(HOURS);
  c.spaceHeatNeed.set([3, 0, 2]);
  c.heatPumpSpaceHeat.set([3, 0, 0]);
  c.heatPumpSpaceElectricity.set([1, 0, 0]);
  c.hotWaterShare.set([0.2, 0.25, 0]);
  c.heatPumpWaterHeat.set([1, 1, 0]);
  c.heatPumpWaterElectricity.set([0.4, 0.5, 0]);
  c.backupSpaceHeat.set([0, 0, 1.8]);
  c.backupWaterHeat.set([0, 0.8, 0]);
  countAuxiliaries(planOf(plan), c);
  return c;
}

test('the pump runs with a need, else for the share of hot water', () => {
  expect([...columnsOf(parts).circulationElectricity.subarray(0, 5)]).toEqual([0.06, 0.015, 0.06, 0, 0]);
});

test('standby and crankcase heater draw while the compressor does nothing, the latter below its temperature', () => {
  const c = columnsOf(parts);
  expect([...c.standbyElectricity.subarray(0, 5)]).toEqual([0, 0, 0.01, 0.01, 0.01]);
  expect([...c.crankcaseElectricity.subarray(0, 5)]).toEqual([0, 0, 0.03, 0, 0.03]);
  const always = columnsOf({ ...parts, unit: { crankcasePower: 0.03 } });
  expect([...always.crankcaseElectricity.subarray(2, 5)]).toEqual([0.03, 0.03, 0.03]);
});

test('an electric backup is on the electricity of the hour', () => {
  const c = columnsOf(parts);
  [1.46, 0.5 + 0.015 + 0.8, 1.8 + 0.06 + 0.04, 0.01, 0.04].forEach((kWh, hour) => {
    expectNear(c.electricity[hour], kWh);
  });
  expect(c.fuel).toEqual(new Float64Array(HOURS));
});

test('a boiler’s heat is fuel by its two efficiencies', () => {
  const c = columnsOf({ ...parts, backup: { isBoiler: true, efficiency: 0.9, hotWaterEfficiency: 0.8 } });
  [1.46, 0.515, 0.1, 0.01, 0.04].forEach((kWh, hour) => {
    expectNear(c.electricity[hour], kWh);
  });
  expectNear(c.fuel[1], 1);
  expectNear(c.fuel[2], 2);
});
