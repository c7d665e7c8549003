import { describe, expect, test } from 'vitest';
import { prepareHotWater } from '../../../../src/scenario/prepare/prepareHotWater.ts';
import { hourlyProfile } from '../../../../src/sim/tappingProfiles.ts';
import type { CivilClock } from '../../../../src/tariffs/civilClock.ts';
import { clockOf, instantsOf, scenarioOf, stepAt } from './preparedSample.ts';

const berlin = clockOf();

function prepare(parts: Record<string, unknown>, clock: CivilClock = berlin) {
  const { hotWater } = scenarioOf({
    hotWater: {
      volume: 200,
      loss: { given: 'coefficient', value: 1.8 },
      draw: { given: 'litres', litresPerDay: 100, useTemperature: 40 },
      ...parts,
    },
  });
  if (hotWater === undefined) throw new Error('no hot water');
  return prepareHotWater(hotWater, clock);
}

const near = (actual: number | undefined, expected: number) =>
  expect(Math.abs((actual ?? Number.NaN) - expected)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(expected)));
const dayOf = (column: Float64Array, from = 0) =>
  column.subarray(from, from + 24).reduce((sum, value) => sum + value, 0);

describe('the draw of a day', () => {
  test('of litres is their heat above the cold water', () => {
    // 100 L · 1.163e-3 · 30 K = 3.489 kWh
    near(dayOf(prepare({}).draw), 3.489);
  });

  test('is parted by its shares, which need not sum to one', () => {
    const shares = new Array(24).fill(0).with(7, 3).with(19, 1);
    const { draw } = prepare({ draw: { given: 'litres', litresPerDay: 100, useTemperature: 40, shares } });
    near(draw[7], 3.489 * 0.75);
    near(draw[19], 3.489 * 0.25);
    expect(draw[8]).toBe(0);
  });

  test('follows tapping profile M where no shares are given', () => {
    // profile M: 1.61 of 5.845 kWh between seven and eight
    near(prepare({}).draw[7], (3.489 * 1.61) / 5.845);
  });

  test('of a profile is its kWh as printed, in the civil hour', () => {
    const { draw } = prepare({ draw: { given: 'profile', profile: 'L' } });
    const printed = hourlyProfile('L');
    expect([...draw.subarray(0, 24)]).toEqual([...printed]);
    // 06:00 UTC in July is eight o'clock
    near(draw[stepAt(berlin, '2025-07-03T06:00')], printed[8]!);
  });

  test('goes by the civil hour also in a zone of half hours', () => {
    const kolkata = clockOf('Asia/Kolkata', 300);
    const { draw } = prepare({ draw: { given: 'profile', profile: 'S' } }, kolkata);
    // steps begin at half past: the step of 07:30 stands for hour 7
    near(draw[stepAt(kolkata, '2025-01-10T02:00')], hourlyProfile('S')[7]!);
  });

  test('loses an hour’s draw in spring, and has one twice in autumn', () => {
    const shares = new Array(24).fill(1);
    const { draw } = prepare({ draw: { given: 'litres', litresPerDay: 240, useTemperature: 40, shares } });
    const total = draw.reduce((sum, kWh) => sum + kWh, 0);
    near(total, 8760 * 10 * 1.163e-3 * 30);
  });
});

describe('the cold water', () => {
  test('is constant where it has no amplitude', () => {
    expect(new Set(prepare({ coldWater: { mean: 11 } }).coldWater)).toEqual(new Set([11]));
  });

  test('is warmest on its day, counted from 1 on 1 January, and coldest half a year away', () => {
    const { coldWater, draw } = prepare({ coldWater: { mean: 10, amplitude: 4, warmestDay: 230 } });
    // day 230 is 18 August
    near(coldWater[stepAt(berlin, '2025-08-18T10:00')], 14);
    near(coldWater[stepAt(berlin, '2025-08-19T10:00')], 10 + 4 * Math.cos((2 * Math.PI) / 365));
    near(coldWater[stepAt(berlin, '2025-01-01T10:00')], 10 + 4 * Math.cos((2 * Math.PI * 229) / 365));
    // it changes at civil midnight
    near(coldWater[stepAt(berlin, '2025-08-17T22:00')], 14);
    expect(coldWater[stepAt(berlin, '2025-08-17T21:00')]).toBeLessThan(14);
    // litres drawn at 40 °C take less heat from warmer water: 26 K instead of 30
    near(dayOf(draw, stepAt(berlin, '2025-08-17T22:00')), (3.489 * 26) / 30);
  });

  test('has 1 March for its day 60 with 8760 hours, on a leap year too, and for its day 61 with 8784', () => {
    const coldWater = { mean: 10, amplitude: 4 };
    for (const { hours, day } of [
      { hours: 8760, day: 60 },
      { hours: 8784, day: 61 },
    ]) {
      const clock = clockOf('Europe/Berlin', 60, 2024, hours);
      const column = prepare({ coldWater: { ...coldWater, warmestDay: day } }, clock).coldWater;
      near(column[stepAt(clock, '2024-03-01T10:00')], 14);
    }
  });

  test('warmer than the use takes nothing', () => {
    const { draw } = prepare({
      draw: { given: 'litres', litresPerDay: 100, useTemperature: 30 },
      coldWater: { mean: 30, amplitude: 5 },
    });
    expect(draw.every((kWh) => kWh >= 0)).toBe(true);
    expect(draw.some((kWh) => kWh === 0)).toBe(true);
  });
});

describe('the cylinder', () => {
  test('loses by its coefficient, or by the kWh of a day at 45 K', () => {
    near(prepare({}).lossCoefficient, 0.0018);
    // 1.5 kWh in 24 h at 45 K
    near(prepare({ loss: { given: 'standingLoss', value: 1.5 } }).lossCoefficient, 1.5 / (24 * 45));
  });

  test('may always be reheated where no windows are given', () => {
    expect(prepare({}).allowed.every((allowed) => allowed === 1)).toBe(true);
  });

  test('may be reheated in any of its windows', () => {
    const reheatWindows = [
      { start: '02:00', end: '04:00' },
      { start: '13:00', end: '15:00', weekdays: ['wed'] },
    ];
    // 1 January 2025 is a Wednesday
    const { allowed } = prepare({ reheatWindows });
    expect(allowed.subarray(0, 24).join('')).toBe('001100000000011000000000');
    expect(allowed.subarray(24, 48).join('')).toBe('001100000000000000000000');
  });

  test('keeps the other entries', () => {
    const plan = prepare({ setPoint: 52, hysteresis: 4, surroundingTemperature: 12, immersionPower: 2 });
    expect(plan).toMatchObject({
      volume: 200,
      setPoint: 52,
      hysteresis: 4,
      surroundingTemperature: 12,
      immersionPower: 2,
    });
  });
});

describe('the weekly hygiene run', () => {
  test('is asked for in its civil hour, once a week', () => {
    const { hygieneAsked, hygieneTemperature } = prepare({ hygiene: { weekday: 'mon', hour: 13, temperature: 62 } });
    const asked = instantsOf(berlin, hygieneAsked);
    expect(hygieneTemperature).toBe(62);
    expect(asked).toHaveLength(52);
    expect(asked[0]).toBe('2025-01-06T12:00');
    expect(asked).toContain('2025-07-07T11:00');
  });

  test('is left out in the week whose hour the clocks skip, and asked twice where it occurs twice', () => {
    const { hygieneAsked } = prepare({ hygiene: { weekday: 'sun', hour: 2, temperature: 60 } });
    const asked = instantsOf(berlin, hygieneAsked);
    // Central European Time in 2025: 2:00 is skipped on 30 March and occurs at 0:00 and 1:00 UTC on 26 October.
    expect(asked.filter((instant) => instant > '2025-03-23' && instant < '2025-04-07')).toEqual([
      '2025-03-23T01:00',
      '2025-04-06T00:00',
    ]);
    expect(asked.filter((instant) => instant.startsWith('2025-10-26'))).toEqual([
      '2025-10-26T00:00',
      '2025-10-26T01:00',
    ]);
  });

  test('is never asked for where none is entered', () => {
    expect(
      prepare({ setPoint: 65, hygiene: { weekday: 'mon', hour: 13, temperature: 60 } }).hygieneTemperature,
      'a run does not cool what stands warmer',
    ).toBe(65);
    expect(prepare({}).hygieneAsked.every((asked) => asked === 0)).toBe(true);
  });
});
