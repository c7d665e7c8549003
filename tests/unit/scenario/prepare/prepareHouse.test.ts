import { describe, expect, test } from 'vitest';
import { designLoadOf, heatLossOf, prepareHouse } from '../../../../src/scenario/prepare/prepareHouse.ts';
import type { House } from '../../../../src/sim/house.ts';
import { prepareTariff } from '../../../../src/tariffs/prepareTariff.ts';
import { clockOf, scenarioOf, stepAt } from './preparedSample.ts';

const clock = clockOf();
const near = (actual: number | undefined, expected: number) =>
  expect(Math.abs((actual ?? Number.NaN) - expected)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(expected)));

const entryOf = (parts: Record<string, unknown>) =>
  scenarioOf({
    house: {
      heatLoss: { given: 'coefficient', value: 200 },
      design: { outdoorTemperature: -12 },
      need: { model: 'degreeHours' },
      ...parts,
    },
  }).house;

function houseOf(parts: Record<string, unknown>, tariff?: Parameters<typeof prepareHouse>[2]): House {
  const prepared = prepareHouse(entryOf(parts), clock, tariff);
  if (!('house' in prepared)) throw new Error('no house');
  return prepared.house;
}

const elements = {
  given: 'elements',
  elements: [
    { name: 'walls', area: 120, uValue: 0.4 },
    { name: 'floor', area: 80, uValue: 0.5, factor: 0.5 },
    { name: 'windows', kind: 'window', area: 20, uValue: 1.5 },
  ],
  thermalBridges: [{ name: 'sills', length: 20, psi: 0.1 }],
  ventilation: { volume: 300, airChanges: 0.4 },
};

describe('the heat loss of a house', () => {
  test('is its coefficient', () => {
    expect(heatLossOf(entryOf({}))).toEqual({
      total: 200,
      parts: { windows: 0.25, opaque: 0.5, ventilation: 0.25 },
    });
  });

  test('follows from a load at two temperatures', () => {
    // 8 kW over 20 − (−14) = 34 K
    const heatLoss = { given: 'load', value: 8, outdoorTemperature: -14 };
    near(heatLossOf(entryOf({ heatLoss })).total, 8000 / 34);
  });

  test('adds up from its elements', () => {
    // opaque 48 + 20 + 2 = 70, windows 30, air 0.33·0.4·300 = 39.6
    const { total, parts } = heatLossOf(entryOf({ heatLoss: elements }));
    near(total, 139.6);
    near(parts.opaque, 70);
    near(parts.windows, 30);
    near(parts.ventilation, 39.6);
  });

  test('is parted as entered where shares are given', () => {
    const lossShares = { windows: 0.2, opaque: 0.5, ventilation: 0.3 };
    const need = { model: 'lumped', lossShares };
    expect(heatLossOf(entryOf({ need })).parts).toEqual(lossShares);
    expect(heatLossOf(entryOf({ need, heatLoss: elements })).parts).toEqual(lossShares);
  });

  test('gives the design load at the design conditions', () => {
    near(designLoadOf(entryOf({})), 6.4);
    near(designLoadOf(entryOf({ design: { outdoorTemperature: -10, roomTemperature: 22 } })), 6.4);
  });
});

describe('a prepared house', () => {
  test('of degree hours has its numbers in kW and no mass', () => {
    const need = { model: 'degreeHours', setPoint: 21, internalGains: 400, solarAperture: 3 };
    const house = houseOf({ need });
    near(house.heatLoss, 0.2);
    near(house.internalGains, 0.4);
    expect(house.solarAperture).toBe(3);
    expect(house.nominalSetPoint).toBe(21);
    expect(new Set(house.setPoint)).toEqual(new Set([21]));
    expect([house.baseTemperature, house.mass]).toEqual([null, null]);
    expect(house.heatingLimit).toBe(Number.POSITIVE_INFINITY);
  });

  test('keeps an entered base and a heating limit', () => {
    const house = houseOf({ need: { model: 'degreeHours', baseTemperature: 16, heatingLimit: 14 } });
    expect([house.baseTemperature, house.heatingLimit]).toEqual([16, 14]);
  });

  test('of the lumped model is scaled to its heat loss', () => {
    const { mass } = houseOf({ floorArea: 100, need: { model: 'lumped', massClass: 'heavy' } });
    if (mass === null) throw new Error('no mass');
    const opaque = 1 / (1 / mass.hMassOutdoor + 1 / mass.hSurfaceMass);
    near(mass.hVentilation + 1 / (1 / mass.hAirSurface + 1 / (mass.hWindows + opaque)), 0.2);
    near(mass.capacity, (260 * 100) / 3600);
    // usual shares 0.25, 0.50, 0.25
    near(opaque / mass.hWindows, 2);
  });

  test('says how much its opaque elements lose where its mass cannot take that up', () => {
    const prepared = prepareHouse(
      entryOf({
        floorArea: 10,
        heatLoss: { given: 'coefficient', value: 400 },
        need: { model: 'lumped', lossShares: { windows: 0, opaque: 0.7, ventilation: 0.3 } },
      }),
      clock,
      undefined,
    );
    if (!('opaqueLoss' in prepared)) throw new Error('not refused');
    // H_ms = 9.1·2.5·10
    near(prepared.opaqueLoss.most, 227.5);
    expect(prepared.opaqueLoss.found).toBeGreaterThan(227.5);
  });
});

describe('the set point', () => {
  test('of degree hours differs by whole civil days, the first rule that fits winning', () => {
    const days = [
      { name: 'holiday', setPoint: 14, from: '02-10', to: '02-16' },
      { name: 'weekend', setPoint: 18, weekdays: ['sat', 'sun'] },
    ];
    const { setPoint } = houseOf({ need: { model: 'degreeHours', days } });
    // Saturday 15 February lies in the holiday, Saturday 22 February does not
    expect(setPoint[stepAt(clock, '2025-02-15T12:00')]).toBe(14);
    expect(setPoint[stepAt(clock, '2025-02-22T12:00')]).toBe(18);
    expect(setPoint[stepAt(clock, '2025-02-21T22:00')]).toBe(20);
    expect(setPoint[stepAt(clock, '2025-02-21T23:00')]).toBe(18);
  });

  test('of the lumped model may change by the hour, or be raised', () => {
    const schedule = [
      { name: 'night', setPoint: 17, start: '22:00', end: '06:00' },
      { name: 'bath', raise: 2, start: '06:00', end: '07:00' },
      { name: 'noon', raise: -1, start: '12:00', end: '13:00' },
    ];
    const { setPoint } = houseOf({ floorArea: 100, need: { model: 'lumped', setPoint: 20.5, schedule } });
    expect([...setPoint.subarray(4, 8)]).toEqual([17, 17, 22.5, 20.5]);
    expect(setPoint[12]).toBe(19.5);
    expect(setPoint[22]).toBe(17);
  });

  test('may follow a rate of the first tariff', () => {
    const tariff = {
      name: 'two rates',
      taxes: [],
      credits: [],
      holidays: [],
      pricesStated: 'withTax' as const,
      rates: [
        { name: 'cheap', price: 0.1, from: '13:00', to: '15:00' },
        { name: 'dear', price: 0.3 },
      ],
    };
    const { prepared } = prepareTariff({ tariff, file: 'tariff.yaml', series: undefined }, clock);
    const schedule = [{ name: 'store', raise: 1.5, rate: 'cheap' }];
    const need = { model: 'lumped', schedule };
    const { setPoint } = houseOf({ floorArea: 100, need }, prepared);
    expect([...setPoint.subarray(12, 16)]).toEqual([20, 21.5, 21.5, 20]);
    // no tariff, or no such rate: the rule never holds
    expect(new Set(houseOf({ floorArea: 100, need }).setPoint)).toEqual(new Set([20]));
  });
});
