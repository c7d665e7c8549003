/**
 * Hours that hand heat to the next, or share it between heat pump and backup, worked by hand from MODEL on the map of
 * round figures of the worked hours (−10 °C: 6 kW at COP 2.8 and 35 °C, 5 kW at COP 2.0 and 55 °C). The calculator's
 * twelve digits make 1e-9 of a figure the tolerance everywhere.
 */
import { expect, test } from 'vitest';
import type { YearColumns } from '../../src/sim/columns.ts';
import { MARK } from '../../src/sim/columns.ts';
import { simulateYear } from '../../src/sim/year.ts';
import { column, HOURS, expectNear as holdNear, type PlanParts, planOf } from '../unit/sim/planBuilder.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Hours that hand heat to the next');
const figures = accuracy.comparison({
  what: 'hot water beside rooms, quiet hours, waiting heat, hybrids',
  source: 'worked by hand from the model, twelve digits',
  unit: '%',
  allowed: 1e-7,
  why: 'figures of eleven digits or more',
});

/** Holds a figure to a worked one, and records how far off it is. */
function expectNear(actual: number | undefined, worked: number): void {
  holdNear(actual, worked);
  figures.add((100 * ((actual ?? Number.NaN) - worked)) / Math.max(Math.abs(worked), 1e-3));
}

/** −10 °C, 35 °C flow, Q = 0.15·30 = 4.5 kW, Q_d = 4.8 kW. */
const cold: PlanParts = { temperature: -10, house: { heatLoss: 0.15, designLoad: 4.8 } };

/*
 * 200 L, V·c = 0.2326 kWh/K, from 50 °C: 3 kWh drawn and 0.002·35 = 0.07 kWh lost in hour 0: T' = 50 − 3.07/0.2326 =
 * 36.8013757524 °C, below 45: reheat to 50 °C (= 55 − 5), E = 3.07 kWh.
 * Flow (36.8013757524 + 50)/2 + 5 = 48.4006878762 °C, v = 0.67003439381; C = 6 − v = 5.32996560619 kW;
 * τ = 3.07/5.32996560619 = 0.575988707401; η = 0.494938132733 − v·0.041971199319 = 0.46681598564;
 * κ = 324.5506878762/68.4006878762 = 4.74484538026; COP = 2.2149696729; E_w = 1.38602349168 kWh.
 */
const drawing: NonNullable<PlanParts['hotWater']> = {
  lossCoefficient: 0.002,
  draw: column(0, { 0: 3 }),
};

/*
 * Hour 0: given = 6·(1 − τ) = 2.5440677556 kWh at full load, COP 2.8: 0.908595626999 kWh of electricity;
 *   D = min(4.5 − 2.5440677556 = 1.9559322444, 9.6, 6 − 2.5440677556) = 1.9559322444; nothing is asked of the backup.
 * Hour 1: T' = 50 − 0.07/0.2326 = 49.6990541702 °C, no reheat; a = 6.4559322444, given 6, E = 6/2.8 = 2.14285714286;
 *   D = min(0.4559322444, 9.6, 1.9559322444 + 0).
 * Hour 2: a = 4.9559322444 is given; C_min = 1.8 kW at the same COP: E = 4.9559322444/2.8 = 1.76997580157; D = 0.
 */
test('hot water takes its share of the hour first; what it displaced waits and is worked off in the next hours', () => {
  const c = simulateYear(planOf({ ...cold, hotWater: drawing }));
  expectNear(c.hotWaterServed[0], 3);
  expectNear(c.cylinderLoss[0], 0.07);
  expectNear(c.hotWaterShare[0], 0.575988707401);
  expectNear(c.heatPumpWaterHeat[0], 3.07);
  expectNear(c.heatPumpWaterElectricity[0], 1.38602349168);
  expectNear(c.cylinderTemperature[0], 50);
  expectNear(c.cylinderTemperature[1], 49.6990541702);
  expectHours(c.heatPumpSpaceHeat, [2.5440677556, 6, 4.9559322444, 4.5]);
  expectHours(c.heatPumpSpaceElectricity, [0.908595626999, 2.14285714286, 1.76997580157, 4.5 / 2.8]);
  expectHours(c.waitingHeat, [1.9559322444, 0.4559322444, 0, 0]);
  expectHours(c.backupSpaceHeat, [0, 0, 0, 0]);
});

/*
 * The same hot water beside emitters 55/47 (n = 1.3, ΔT_m 31 K, s 8 K), Q = 4 kW, Q_d = 7.5 kW.
 * Hour 0: x = min(max(1, 0.533), 4/(0.424011292599·7.5) = 1.25782813487) = 1: T_f = 55 °C, C = 5 kW, COP 2;
 *   given 5·0.424011292599 = 2.120056463, E = 1.0600282315; D = min(1.879943537, 15, 2.879943537).
 * Hour 1: x = min(1, 5.879943537/7.5) = 0.7839924716; x^(1/1.3) = 0.829280504378; T_f = 48.8436655221 °C,
 *   v = 0.692183276105, C = 5.30781672389 kW, all of it given; η = 0.465886370486, κ = 4.72074900512,
 *   COP 2.19933261997; E = 2.41337607404; D = 0.572126813109.
 * Hour 2: x = 4.572126813109/7.5 = 0.609616908415; x^(1/1.3) = 0.683375231403; T_f = 43.6230998072 °C;
 *   η = 0.476842040695, κ = 5.02605344248, COP 2.39663358016 at every rate; E = 1.90772876211; D = 0.
 */
test('emitters run hotter in an hour that hot water shortens, and while heat waits', () => {
  const c = simulateYear(
    planOf({
      temperature: -10,
      house: { heatLoss: 0.2, designLoad: 7.5, baseTemperature: 10 },
      flow: { flow: 55, return: 47, roomTemperature: 20, exponent: 1.3, lowestFlow: 25, highestFlow: 55 },
      hotWater: drawing,
    }),
  );
  expectHours(c.flowTemperature, [55, 48.8436655221, 43.6230998072]);
  expectHours(c.heatPumpSpaceHeat, [2.120056463, 5.30781672389, 4.57212681311]);
  expectHours(c.heatPumpSpaceElectricity, [1.0600282315, 2.41337607404, 1.90772876211]);
  expectHours(c.waitingHeat, [1.879943537, 0.572126813109, 0]);
});

/*
 * Hour 0 may use half of C = 6 kW. Lowest level 1.8 kW at COP 1.2·2.8 = 3.36. Given 3 kWh at r = 3 kW: COP = 3.36 −
 * 0.56·(3 − 1.8)/(6 − 1.8) = 3.2, the line of the whole capacity; E = 0.9375 kWh. D = min(1.5, 9.6, 6 − 3) = 1.5.
 * Hour 1: a = 6 kWh = C at COP 2.8, E = 2.14285714286. Hour 2: 4.5 kW: COP = 3.36 − 0.56·2.7/4.2 = 3, E = 1.5.
 */
test('a quiet hour caps the rate, keeps the COP line, and leaves heat waiting', () => {
  const c = simulateYear(
    planOf({
      ...cold,
      unit: { lowest: { given: 'share', capacity: 0.3, cop: 1.2 } },
      run: { quietShare: column(1, { 0: 0.5 }) },
    }),
  );
  expectHours(c.heatPumpSpaceHeat, [3, 6, 4.5]);
  expectHours(c.heatPumpSpaceElectricity, [0.9375, 2.14285714286, 1.5]);
  expectHours(c.waitingHeat, [1.5, 0, 0]);
  expectHours(c.backupSpaceHeat, [0, 0, 0]);
});

/*
 * Silent hours 0 and 1: D_0 = min(4.5, 2·4 = 8, 0 + 6) = 4.5; D_1 = min(9, 8, 4.5 + 6) = 8 and 1 kWh is the backup's.
 * Hour 2: a = 12.5, given 6; D_2 = min(6.5, 8, 8 + 0) = 6.5. In hour 3 the unit is too cold to run (−30 °C): D_3 = 0,
 * and the backup carries Q = 0.15·50 = 7.5 and the 6.5 that waited: 14 kWh.
 */
test('no more than two hours of design load wait, and none where the heat pump is off', () => {
  const c = simulateYear(
    planOf({
      temperature: column(-10, { 3: -30 }),
      house: { heatLoss: 0.15, designLoad: 4 },
      unit: { lowestOutdoorTemperature: -20 },
      run: { quietShare: column(1, { 0: 0, 1: 0 }) },
    }),
  );
  expectHours(c.waitingHeat, [4.5, 8, 6.5, 0]);
  expectHours(c.heatPumpSpaceHeat, [0, 0, 6, 0]);
  expectHours(c.backupSpaceHeat, [0, 1, 0, 14]);
});

/*
 * The last hour of the year is quiet: 3 kWh are given, and the 1.5 kWh that would wait are asked of the backup.
 */
test('what waits at the end of the year is asked of the backup in the last hour', () => {
  const c = simulateYear(planOf({ ...cold, run: { quietShare: column(1, { [HOURS - 1]: 0.5 }) } }));
  expectNear(c.heatPumpSpaceHeat[HOURS - 1], 3);
  expectNear(c.backupSpaceHeat[HOURS - 1], 1.5);
  expect(c.waitingHeat[HOURS - 1]).toBe(0);
  expect(c.waitingHeat[0]).toBe(0);
});

/*
 * Electricity 0.30, boiler heat 0.09/0.9 = 0.10 a kWh; 55 °C flow.
 * Hour 0, −10 °C: Q = 6 kWh; the heat pump could give 5 at COP 2: 0.15 a kWh, dearer. The boiler carries its 4 kWh,
 *   the heat pump the 2 left (r = 2 kW ≥ C_min = 1.5, COP 2): E = 1 kWh; fuel 4/0.9 = 4.44444444444 kWh.
 * Hour 1, 10 °C: Q = 2 kWh, C_min = 2.7: CR = 0.740740740741, COP = 3.2·(1 − 0.25·0.259259259259) = 2.99259259259:
 *   0.10025 a kWh, dearer: the boiler gives 2 kWh, fuel 2.22222222222 kWh, the heat pump nothing.
 * Hour 2, 10 °C, electricity 0.29: 0.0969 a kWh, cheaper: E = 2/2.99259259259 = 0.668316831683 kWh.
 */
test('the cheaper source carries the hour, a boiler as far as its power goes', () => {
  const c = simulateYear(
    planOf({
      temperature: column(10, { 0: -10 }),
      flow: 55,
      backup: { power: 4, isBoiler: true, efficiency: 0.9, hotWaterEfficiency: 0.8 },
      run: { sourcePrices: { electricity: column(0.3, { 2: 0.29 }), fuel: 0.09 } },
    }),
  );
  expectHours(c.backupSpaceHeat, [4, 2, 0]);
  expectHours(c.heatPumpSpaceHeat, [2, 0, 2]);
  expectHours(c.electricity, [1, 0, 0.668316831683]);
  expectHours(c.fuel, [4.44444444444, 2.22222222222, 0]);
  expect([0, 1, 2].map((i) => (c.marks[i]! & MARK.cycling) > 0)).toEqual([false, false, true]);
});

/*
 * A hybrid with the cylinder at 58 °C and the unit limited to 55 °C flow: T_h = 50 °C. 4 kWh drawn: T' = 40.8030954428;
 * E = 0.2326·9.1969045572 = 2.1392 kWh at flow 50.4015477214 °C: C = 5.22992261393 kW, τ = 0.409030908852;
 * η = 0.462617061271, κ = 4.63841432881, COP 2.14580960575, E_w = 0.996919761318 kWh.
 * The boiler lifts 50 to 58 °C: min(0.2326·8 = 1.8608, 4·(1 − τ) = 2.36387636459) = 1.8608 kWh.
 * Rooms, Q = 9 kW: given 6·(1 − τ) = 3.54581454689; D = min(5.45418545311, 19.2, 2.45418545311) = 2.45418545311; asked
 * of the boiler 3 kWh, of which its other 4 − 1.8608 = 2.1392 kWh are left; unmet 0.8608 kWh.
 * Fuel 2.1392/0.9 + 1.8608/0.8 = 4.70288888889 kWh.
 */
test('above what the unit reaches the boiler of a hybrid heats the cylinder, and the rooms do not get that heat', () => {
  const c = simulateYear(
    planOf({
      temperature: -10,
      house: { heatLoss: 0.3, designLoad: 9.6 },
      backup: { power: 4, isBoiler: true, efficiency: 0.9, hotWaterEfficiency: 0.8 },
      hotWater: { setPoint: 58, draw: column(0, { 0: 4 }) },
    }),
  );
  expectNear(c.heatPumpWaterHeat[0], 2.1392);
  expectNear(c.heatPumpWaterElectricity[0], 0.996919761318);
  expectNear(c.backupWaterHeat[0], 1.8608);
  expectNear(c.cylinderTemperature[0], 58);
  expectNear(c.heatPumpSpaceHeat[0], 3.54581454689);
  expectNear(c.waitingHeat[0], 2.45418545311);
  expectNear(c.backupSpaceHeat[0], 2.1392);
  expectNear(c.unmetHeat[0], 0.8608);
  expectNear(c.fuel[0], 4.70288888889);
});

/*
 * Pump 50 W, standby 15 W, crankcase heater 40 W below 10 °C; base 4 °C, COP 2.8 of the map's −10/35 in hour 3.
 * Hour 0, 25 °C: standby. Hour 1, 5 °C: no need, standby and crankcase heater. Hour 3, −10 °C: Q = 0.2·14 = 2.8 kWh,
 * E = 1 kWh and the pump. In hour 2, at 10 °C exactly, the crankcase heater is off.
 */
test('pump, standby and crankcase heater draw in their hours', () => {
  const c = simulateYear(
    planOf({
      temperature: column(25, { 1: 5, 2: 10, 3: -10 }),
      house: { baseTemperature: 4 },
      unit: { standbyPower: 0.015, crankcasePower: 0.04, crankcaseBelow: 10 },
      run: { circulationPower: 0.05 },
    }),
  );
  expectHours(c.standbyElectricity, [0.015, 0.015, 0.015, 0]);
  expectHours(c.crankcaseElectricity, [0, 0.04, 0, 0]);
  expectHours(c.circulationElectricity, [0, 0, 0, 0.05]);
  expectHours(c.electricity, [0.015, 0.055, 0.015, 1.05]);
});

/** The first hours of a column beside worked figures. */
function expectHours(values: YearColumns['electricity'], worked: readonly number[]): void {
  worked.forEach((value, hour) => {
    expectNear(values[hour], value);
  });
}
