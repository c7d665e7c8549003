/**
 * The cylinder worked by hand from MODEL section 8, c = 1.163e-3 kWh/(L·K), with a calculator of twelve digits (tolerance
 * 1e-9), on the map of round figures of the worked hours. Houses without need: nothing but the cylinder takes electricity.
 */
import { describe, expect, test } from 'vitest';
import { simulateYear } from '../../src/sim/year.ts';
import { column, expectNear as holdNear, type PlanParts, planOf } from '../unit/sim/planBuilder.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Cylinder of hot water');
const figures = accuracy.comparison({
  what: 'temperatures, heat and electricity of a cylinder, hour by hour',
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

/** A house that needs no heat, with a cylinder. */
const simulate = (parts: PlanParts) => simulateYear(planOf({ house: { setPoint: -40 }, ...parts }));

const expectHours = (values: Float64Array, worked: readonly number[]) => {
  worked.forEach((value, hour) => {
    expectNear(values[hour], value);
  });
};

/*
 * 300 L at 60 °C, 1.5 kWh a day at 45 K: UA = 1.5/(24·45) = 1.38888888889e-3 kW/K, V·c = 0.3489 kWh/K, surroundings 15 °C.
 * First hour: loss 0.0625 kWh, T = 60 − 0.0625/0.3489 = 59.8208656. Each hour keeps 1 − UA/(V·c) = 0.996019235056 of the
 * 45 K: after 29 hours 15 + 45·0.996019235056^29 = 55.0845078072 °C, after 30 hours 54.9249408037 °C, below 60 − 5.
 */
test('a cylinder at rest loses its 1.5 kWh a day and is reheated in its thirtieth hour', () => {
  const c = simulate({
    temperature: 10,
    hotWater: { volume: 300, setPoint: 60, lossCoefficient: 1.5 / 24 / 45, immersionPower: 3 },
  });
  expectNear(c.cylinderLoss[0], 0.0625);
  expectNear(c.cylinderTemperature[0], 60 - 0.0625 / 0.3489);
  expectNear(c.cylinderTemperature[28], 55.0845078072);
  expect(c.backupWaterHeat.subarray(0, 29).every((heat) => heat === 0)).toBe(true);
  // the unit reaches 50 °C only, so the heater lifts 54.9249408037 to 60 °C: 0.3489·5.0750591963 = 1.7706881536
  expectNear(c.backupWaterHeat[29], 1.7706881536);
  expectNear(c.cylinderTemperature[29], 60);
});

/*
 * 100 L from 50 °C with cold water of 10 °C hold 0.1163·40 = 4.652 kWh. Of 6 kWh asked 1.348 are not delivered, and the
 * cylinder is left at 10 °C. Reheat to 50 °C at flow (10 + 50)/2 + 5 = 35 °C and 10 °C outdoors, a point of the map:
 * 10 kW, COP 5: τ = 0.4652, E = 0.9304 kWh.
 */
test('no more is served than the heat above the cold water, and the heat pump fills it up again', () => {
  const c = simulate({ temperature: 10, hotWater: { volume: 100, draw: column(0, { 0: 6 }) } });
  expectNear(c.hotWaterServed[0], 4.652);
  expectNear(c.hotWaterShort[0], 1.348);
  expectNear(c.hotWaterShare[0], 0.4652);
  expectNear(c.heatPumpWaterHeat[0], 4.652);
  expectNear(c.electricity[0], 0.9304);
  expectNear(c.cylinderTemperature[0], 50);
});

/*
 * 500 L at 58 °C, V·c = 0.5815 kWh/K, hysteresis 10 K, −10 °C, unit up to 55 °C flow, so T_h = 50 °C. 20 kWh drawn:
 * T' = 58 − 20/0.5815 = 23.6061908856 °C.
 * Hour 0: flow 41.8030954428, v = 0.340154772141, C = 5.65984522786 kW, E = 15.348 kWh: the whole hour, no heater;
 *   η = 0.480661428992, κ = 317.9530954428/61.8030954428 = 5.14461441073, COP 2.47281771428, 2.28882428138 kWh.
 * Hour 1: T' = 33.3393727048, flow 46.6696863524, C = 5.41651568238: the whole hour; COP 2.27794784346, 2.3778049607 kWh.
 * Hour 2: T' = 42.6541030271, flow 51.3270515135, C = 5.18364742432, E = 0.5815·7.3458969729 = 4.27163908976,
 *   τ = 0.82406050028; COP 2.11505219716, 2.01963766922 kWh. The heater has 0.17593949972 of the hour:
 *   3·0.17593949972 = 0.52781849916 kWh, T = 50 + 0.52781849916/0.5815 = 50.9076844354 °C.
 * Hour 3: closed; 50.9 °C is above 48 °C, but the reheat stays under way.
 * Hour 4: the heater gives 3 kWh, hour 5 the last 0.5815·8 − 0.52781849916 − 3 = 1.12418150084 kWh.
 */
test('a long reheat takes whole hours, then the heater its rest, and waits under way while the window is closed', () => {
  const c = simulate({
    temperature: -10,
    hotWater: {
      volume: 500,
      setPoint: 58,
      hysteresis: 10,
      draw: column(0, { 0: 20 }),
      allowed: new Uint8Array(8760).fill(1).fill(0, 3, 4),
    },
  });
  expectHours(c.heatPumpWaterHeat, [5.65984522786, 5.41651568238, 4.27163908976, 0, 0, 0, 0]);
  expectHours(c.heatPumpWaterElectricity, [2.28882428138, 2.3778049607, 2.01963766922, 0, 0, 0, 0]);
  expectHours(c.hotWaterShare, [1, 1, 0.82406050028, 0, 0, 0, 0]);
  expectHours(c.backupWaterHeat, [0, 0, 0.52781849916, 0, 3, 1.12418150084, 0]);
  expectHours(c.cylinderTemperature.subarray(2), [50.9076844354, 50.9076844354, 50.9076844354 + 3 / 0.5815, 58, 58]);
});

describe('the weekly hygiene run', () => {
  /*
   * 200 L at 50 °C, V·c = 0.2326: to 60 °C 2.326 kWh. The unit reaches 50 °C only, where the cylinder stands already: the
   * heater of 1 kW gives 1 + 1 + 0.326 kWh in hours 5 to 7 and is then done.
   */
  test('is asked for although the cylinder is warm, and pending until it is reached', () => {
    const c = simulate({
      temperature: 10,
      hotWater: { immersionPower: 1, hygieneAsked: new Uint8Array(8760).fill(1, 5, 6) },
    });
    expectHours(c.backupWaterHeat, [0, 0, 0, 0, 0, 1, 1, 0.326, 0, 0]);
    expectNear(c.cylinderTemperature[8760 - 1], 60);
  });

  test('waits for the next open window', () => {
    const c = simulate({
      temperature: 10,
      hotWater: {
        hygieneAsked: new Uint8Array(8760).fill(1, 5, 6),
        allowed: new Uint8Array(8760).fill(1).fill(0, 4, 9),
      },
    });
    expectHours(c.backupWaterHeat, [0, 0, 0, 0, 0, 0, 0, 0, 0, 2.326, 0]);
  });

  /*
   * A unit that reaches 70 °C flow lifts 50 to 60 °C itself: flow (50 + 60)/2 + 5 = 60 °C, beyond the hottest column at
   * 10 °C outdoors: η = 0.531481201872 of the last column, κ = 336.15/60 = 5.6025, COP = 2.97762343349; capacity 9 kW held.
   * E = 2.326/2.97762343349 = 0.781159892094 kWh.
   */
  test('is the heat pump’s where its flow reaches', () => {
    const c = simulate({
      temperature: 10,
      unit: { highestFlow: { at: [0], value: [70] } },
      hotWater: { hygieneAsked: new Uint8Array(8760).fill(1, 5, 6) },
    });
    expectNear(c.heatPumpWaterHeat[5], 2.326);
    expectNear(c.hotWaterShare[5], 2.326 / 9);
    expectNear(c.electricity[5], 0.781159892094);
    expect(c.backupWaterHeat[5]).toBe(0);
  });
});

/*
 * Too cold for the unit: the heater alone has the whole hour. 3.07 kWh are lacking at 200 L, 3 kW: 3 kWh, then 0.07 kWh.
 */
test('where the heat pump is off the heater does it all', () => {
  const c = simulate({
    temperature: -25,
    unit: { lowestOutdoorTemperature: -20 },
    hotWater: { draw: column(0, { 0: 3.07 }) },
  });
  expectHours(c.backupWaterHeat, [3, 0.07, 0]);
  expectHours(c.electricity, [3, 0.07, 0]);
  expectHours(c.hotWaterShare, [0, 0, 0]);
});
