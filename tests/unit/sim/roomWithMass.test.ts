import { describe, expect, test } from 'vitest';
import { newColumns } from '../../../src/sim/columns.ts';
import { massParameters } from '../../../src/sim/lumpedHouse.ts';
import { layMassOnWeather } from '../../../src/sim/massOnWeather.ts';
import { advanceRoom, needOfRoom, needWithUnlimitedHeat, START_UP_HOURS } from '../../../src/sim/roomWithMass.ts';
import { simulateYear } from '../../../src/sim/year.ts';
import { column, expectNear, houseOf, type PlanParts, planOf, weatherOf } from './planBuilder.ts';

const result = massParameters(120, 'medium', 180, { windows: 0.25, opaque: 0.5, ventilation: 0.25 });
if (!('mass' in result)) throw new Error(result.reason);
const { mass } = result;

const HOURS = 480;
const lumped = (parts: PlanParts = {}) => planOf({ hours: HOURS, ...parts, house: { mass, ...parts.house } });

describe('the hours of a lumped house', () => {
  test('without heat and gains a house as warm as outdoors stays so', () => {
    const { airAtRest, massAtRest } = layMassOnWeather(mass, houseOf({}, 24), weatherOf({ hours: 24, temperature: 7 }));
    expectNear(mass.airFromMass * 7 + airAtRest[0]!, 7);
    expectNear(mass.keep * 7 + massAtRest[0]!, 7);
  });

  test('the sun of the hour itself counts, not of the day', () => {
    const radiation = column(0, { 5: 600 }, 24);
    const { massAtRest } = layMassOnWeather(
      mass,
      houseOf({ solarAperture: 4 }, 24),
      weatherOf({ hours: 24, radiation }),
    );
    expect(massAtRest[5]).toBeGreaterThan(0);
    expect([massAtRest[4], massAtRest[6]]).toEqual([0, 0]);
  });
});

describe('the need of a room', () => {
  test('brings the air to the set point at once', () => {
    const plan = lumped({ temperature: -5 });
    const c = newColumns(HOURS);
    const onWeather = layMassOnWeather(mass, plan.house, plan.weather);
    const need = needOfRoom(plan, mass, onWeather, 3, 17);
    c.heatPumpSpaceHeat[3] = need * 0.75;
    c.backupSpaceHeat[3] = need * 0.25;
    advanceRoom(mass, onWeather, c, 3, 17);
    expectNear(c.indoorTemperature[3], 20);
  });

  test('half the need leaves the air below it', () => {
    const plan = lumped({ temperature: -5 });
    const c = newColumns(HOURS);
    const onWeather = layMassOnWeather(mass, plan.house, plan.weather);
    c.heatPumpSpaceHeat[3] = needOfRoom(plan, mass, onWeather, 3, 17) / 2;
    const warmer = advanceRoom(mass, onWeather, c, 3, 17);
    expect(c.indoorTemperature[3]).toBeLessThan(19);
    c.heatPumpSpaceHeat[3] = 0;
    expect(advanceRoom(mass, onWeather, c, 3, 17)).toBeLessThan(warmer);
  });

  test('is never negative, and nothing where the heating limit holds', () => {
    const warm = lumped({ temperature: 25 });
    expect(needOfRoom(warm, mass, layMassOnWeather(mass, warm.house, warm.weather), 3, 25)).toBe(0);
    const limited = lumped({ temperature: 12, house: { mass, heatingLimit: 12 } });
    expect(needOfRoom(limited, mass, layMassOnWeather(mass, limited.house, limited.weather), 3, 5)).toBe(0);
  });
});

describe('the year of a lumped house', () => {
  test('begins with the mass left by the last fourteen days, which began at the set point', () => {
    // a start-up that reached further back would see −30 °C
    expect(START_UP_HOURS).toBe(336);
    const temperature = column(10, {}, HOURS).fill(-30, 0, HOURS - START_UP_HOURS);
    // never heated: free decay from 20 °C towards 10 °C
    const plan = lumped({ temperature, house: { mass, heatingLimit: -60 } });
    const c = simulateYear(plan);
    const massAtStart = 10 + 10 * mass.keep ** START_UP_HOURS;
    const onWeather = layMassOnWeather(mass, plan.house, plan.weather);
    expectNear(c.indoorTemperature[0], mass.airFromMass * massAtStart + onWeather.airAtRest[0]!);
  });

  test('the pass with unlimited heat knows nothing of the plant', () => {
    const weak = lumped({ temperature: -10, table: { outdoor: [-10, 10], flow: [35], capacity: [1, 1], cop: [3, 4] } });
    const strong = lumped({ temperature: -10 });
    const c = simulateYear({ ...weak, backup: { ...weak.backup, power: 0 } });
    const ample = simulateYear(strong);
    expect(c.unlimitedNeed).toEqual(ample.unlimitedNeed);
    expect(ample.unlimitedNeed).toEqual(ample.spaceHeatNeed);
    // a cold house asks for more than a warm one
    expect(c.spaceHeatNeed[HOURS - 1]).toBeGreaterThan(c.unlimitedNeed[HOURS - 1]!);
  });

  test('the second pass has a start-up of its own', () => {
    const plan = lumped({ temperature: -10 });
    const c = newColumns(HOURS);
    const onWeather = layMassOnWeather(mass, plan.house, plan.weather);
    needWithUnlimitedHeat(plan, mass, onWeather, c);
    // fourteen days at a constant −10 °C: the steady state is reached to the mass's forgetting, keep^336 of 30 K
    expectNear(c.unlimitedNeed[0], 0.18 * 30, 1e-4);
  });
});
