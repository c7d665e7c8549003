import { describe, expect, test } from 'vitest';
import { newColumns, type YearColumns } from '../../../src/sim/columns.ts';
import { massParameters } from '../../../src/sim/lumpedHouse.ts';
import { simulateYear } from '../../../src/sim/year.ts';
import { column, expectNear, type PlanParts, planOf } from './planBuilder.ts';

const HOURS = 480;
const temperature = Float64Array.from({ length: HOURS }, (_, i) => 4 - 12 * Math.cos(i / 40) - 5 * Math.cos(i / 3.82));
const result = massParameters(120, 'light', 220, { windows: 0.3, opaque: 0.5, ventilation: 0.2 });
if (!('mass' in result)) throw new Error(result.reason);

const plant: PlanParts = {
  hours: HOURS,
  temperature,
  house: { heatLoss: 0.22, designLoad: 7 },
  flow: { flow: 55, return: 47, roomTemperature: 20, exponent: 1.3, lowestFlow: 25, highestFlow: 55 },
  unit: { standbyPower: 0.01, lowestOutdoorTemperature: -14 },
  backup: { power: 1.5 },
  run: { circulationPower: 0.05, quietShare: column(1, { 30: 0.4, 31: 0.4, 400: 0 }, HOURS) },
};
const plans: Record<string, PlanParts> = {
  'degree hours': plant,
  'degree hours with hot water': { ...plant, hotWater: { draw: 0.25, lossCoefficient: 0.002, setPoint: 52 } },
  'lumped house': { ...plant, house: { ...plant.house, mass: result.mass } },
  'lumped house with hot water': {
    ...plant,
    house: { ...plant.house, mass: result.mass },
    hotWater: { draw: 0.25, lossCoefficient: 0.002 },
  },
  'no heat at all': { ...plant, house: { setPoint: -50 } },
};

/** Columns that a run of something else has left: no entry is zero. */
function usedColumns(): YearColumns {
  const c = newColumns(HOURS);
  for (const values of Object.values(c)) if (typeof values !== 'number') values.fill(7);
  return c;
}

describe('a simulated year', () => {
  test.each(Object.entries(plans))('does not show which run used its columns before: %s', (_, parts) => {
    const plan = planOf(parts);
    expect(simulateYear(plan, usedColumns())).toEqual(simulateYear(plan));
  });

  test.each(Object.entries(plans))('is returned in the columns handed in: %s', (_, parts) => {
    const c = newColumns(HOURS);
    expect(simulateYear(planOf(parts), c)).toBe(c);
  });

  test('without a need takes standby alone', () => {
    const c = simulateYear(planOf(plans['no heat at all']));
    expect(new Set(c.electricity)).toEqual(new Set([0.01]));
    expect(new Set(c.flowTemperature)).toEqual(new Set([0]));
    expect(new Set(c.marks)).toEqual(new Set([0]));
  });

  test('of a lumped house delivers after the start-up of the whole plant, not of an unlimited one', () => {
    const parts = plans['lumped house'];
    const weak = simulateYear(planOf({ ...parts, backup: { power: 0 } }));
    const strong = simulateYear(planOf({ ...parts, backup: { power: 50 } }));
    // the last fourteen days, which the year begins after, leave the weakly heated mass colder
    expect(weak.unmetHeat.subarray(HOURS - 336).some((kWh) => kWh > 0)).toBe(true);
    expect(weak.spaceHeatNeed[0]).toBeGreaterThan(strong.spaceHeatNeed[0]!);
    // but for the quiet hours of the start-up, which a strong plant has long made good
    expectNear(strong.spaceHeatNeed[0], strong.unlimitedNeed[0]!);
  });

  test('of a lumped house asks the backup for what exceeds full capacity only; the room waits for the rest', () => {
    const c = simulateYear(planOf({ ...plans['lumped house with hot water'], backup: { power: 50 } }));
    let shortened = 0;
    for (let i = 0; i < HOURS; i++) {
      if (c.capacity[i] === 0 || c.hotWaterShare[i] === 0) continue;
      expectNear(c.backupSpaceHeat[i], Math.max(0, c.spaceHeatNeed[i]! - c.capacity[i]!));
      shortened++;
    }
    expect(shortened).toBeGreaterThan(20);
  });

  test('works off the heat that waits in an hour without a need of its own', () => {
    const c = simulateYear(
      planOf({
        hours: 24,
        temperature: column(30, { 0: -10 }, 24),
        run: { quietShare: column(1, { 0: 0 }, 24) },
      }),
    );
    expectNear(c.waitingHeat[0], 6);
    expect(c.spaceHeatNeed[1]).toBe(0);
    expectNear(c.heatPumpSpaceHeat[1], 6);
    expect(c.waitingHeat[1]).toBe(0);
  });
});
