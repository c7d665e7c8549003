import { describe, expect, test } from 'vitest';
import { MARK } from '../../../src/sim/columns.ts';
import { hourlyProfile } from '../../../src/sim/tappingProfiles.ts';
import { simulateYear } from '../../../src/sim/year.ts';
import { column, expectNear, type PlanParts, planOf } from './planBuilder.ts';

const HOURS = 48;
/** A cylinder of 200 L beside a house that needs nothing; V·c = 0.2326 kWh/K. */
const simulate = (hotWater: NonNullable<PlanParts['hotWater']>, parts: PlanParts = {}) =>
  simulateYear(planOf({ hours: HOURS, temperature: 10, house: { setPoint: -40 }, hotWater, ...parts }));

describe('the cylinder', () => {
  test('loses heat by its temperature at the hour’s beginning, before the draw', () => {
    const c = simulate({ lossCoefficient: 0.002, draw: column(0, { 0: 1 }, HOURS) });
    expectNear(c.cylinderLoss[0], 0.07);
    expectNear(c.cylinderTemperature[0], 50 - 1.07 / 0.2326);
  });

  test('is left alone down to its hysteresis, and reheated below it', () => {
    // exactly 5 K: 1.163 kWh leave 45 °C, which is not below
    expect(simulate({ draw: column(0, { 0: 1.16 }, HOURS) }).heatPumpWaterHeat[0]).toBe(0);
    expectNear(simulate({ draw: column(0, { 0: 1.17 }, HOURS) }).heatPumpWaterHeat[0], 1.17);
  });

  test('is not reheated in closed hours, however cold', () => {
    const c = simulate({ draw: column(0, { 0: 6 }, HOURS), allowed: new Uint8Array(HOURS).fill(1, 9) });
    expect([...c.heatPumpWaterHeat.subarray(0, 9)]).toEqual(new Array(9).fill(0));
    expectNear(c.cylinderTemperature[8], 50 - 6 / 0.2326);
    expectNear(c.heatPumpWaterHeat[9], 6);
  });

  test('counts an hour in which hot water runs short, and only that', () => {
    // 0.2326·40 = 9.304 kWh above the cold water
    const c = simulate({ draw: column(0, { 3: 9.304, 30: 9.5 }, HOURS) });
    expect(c.marks[3]! & MARK.hotWaterShort).toBe(0);
    expect(c.marks[30]! & MARK.hotWaterShort).toBe(MARK.hotWaterShort);
    expectNear(c.hotWaterShort[30], 0.196);
  });

  test('gives nothing to a draw when it is no warmer than the cold water', () => {
    const c = simulate({ setPoint: 30, coldWater: 35, hysteresis: 50, draw: column(0, { 0: 1 }, HOURS) });
    expect(c.hotWaterServed[0]).toBe(0);
    expect(c.hotWaterShort[0]).toBe(1);
  });
});

describe('reheating', () => {
  const draw = column(0, { 0: 3 }, HOURS);

  test('takes frost loss at full load into account', () => {
    const unit = {
      defrost: {
        method: 'table',
        capacity: { at: [0], value: [0.8] },
        cop: { at: [0], value: [0.5] },
      },
    } as const;
    const plain = simulate({ draw });
    const frosted = simulate({ draw }, { unit });
    expectNear(frosted.hotWaterShare[0], plain.hotWaterShare[0]! / 0.8);
    expectNear(frosted.heatPumpWaterElectricity[0], plain.heatPumpWaterElectricity[0]! * 2);
  });

  test('bears the in-use allowance', () => {
    const used = simulate({ draw }, { run: { inUseAllowance: 0.2 } });
    expectNear(used.heatPumpWaterElectricity[0], simulate({ draw }).heatPumpWaterElectricity[0]! / 0.8);
  });

  test('is not limited by quiet hours', () => {
    const quiet = simulate({ draw }, { run: { quietShare: column(0, {}, HOURS) } });
    expect(quiet.heatPumpWaterHeat).toEqual(simulate({ draw }).heatPumpWaterHeat);
  });

  test('marks a point outside the map, and heat of the heater', () => {
    // flow (37.1 + 50)/2 + 5 = 48.6 °C lies inside; 20 °C outdoors is warmer than the warmest row
    const c = simulate({ draw, hygieneAsked: new Uint8Array(HOURS).fill(1, 0, 1) }, { temperature: 20 });
    expect(c.marks[0]).toBe(MARK.outsideMap | MARK.backupForWater);
    // the heater of 3 kW has 2.326 kWh to give, more than what the heat pump leaves of the hour; then all is done
    expect([c.marks[1], c.marks[2]]).toEqual([MARK.backupForWater, 0]);
  });

  test('in a hybrid is the boiler’s above the heat pump’s reach, within what the heat pump leaves of the hour', () => {
    const c = simulate(
      { draw, hygieneAsked: new Uint8Array(HOURS).fill(1, 0, 1), immersionPower: 99 },
      { backup: { isBoiler: true, power: 2, efficiency: 0.9, hotWaterEfficiency: 0.5 } },
    );
    expectNear(c.backupWaterHeat[0], 2 * (1 - c.hotWaterShare[0]!));
    expectNear(c.fuel[0], c.backupWaterHeat[0]! / 0.5);
    expectNear(c.electricity[0], c.heatPumpWaterElectricity[0]!);
  });

  test('has no reheat to carry over from the year’s end: the cylinder begins at its set point', () => {
    const c = simulate({ draw: column(0, { [HOURS - 1]: 9 }, HOURS), allowed: new Uint8Array(HOURS).fill(1, 1) });
    expectNear(c.cylinderTemperature[0], 50);
  });
});

test('profile M draws 1.61 kWh between seven and eight', () => {
  // 0.105 + 1.4 + 0.105
  expectNear(hourlyProfile('M')[7], 1.61);
});
