import { describe, expect, test } from 'vitest';
import { MARK, newColumns } from '../../../src/sim/columns.ts';
import { AT } from '../../../src/sim/hourScratch.ts';
import { findCapacity, giveSpaceHeat, markSpaceHeat, runAt, setFlow } from '../../../src/sim/spaceHeat.ts';
import { column, expectNear, type PlanParts, planOf } from './planBuilder.ts';

const HOURS = 24;
const emitters = { flow: 55, return: 47, roomTemperature: 20, exponent: 1.3, lowestFlow: 25, highestFlow: 55 };

/** One hour of a plan up to the heat that the heat pump gives. */
function hourOf(parts: PlanParts, state: { need?: number; waiting?: number; share?: number; hour?: number } = {}) {
  const { need = 3, waiting = 0, share = 0, hour: i = 5 } = state;
  const plan = planOf({ hours: HOURS, temperature: -10, ...parts });
  const c = newColumns(HOURS);
  const hour = new Float64Array(AT.size);
  c.spaceHeatNeed[i] = need;
  c.hotWaterShare[i] = share;
  setFlow(plan, c, i, waiting, hour);
  findCapacity(plan, c, i, hour);
  giveSpaceHeat(plan, c, i, waiting, hour);
  return { flow: c.flowTemperature[i], given: c.heatPumpSpaceHeat[i], waits: c.waitingHeat[i], c, hour, plan };
}

describe('the flow of an hour', () => {
  test('of a curve does not change with what is asked', () => {
    expect(hourOf({ flow: 42 }, { waiting: 5, share: 0.4 }).flow).toBe(42);
  });

  test('of emitters rises with waiting heat, unless a quiet hour keeps it from being worked off', () => {
    const plain = hourOf({ flow: emitters }).flow!;
    expect(hourOf({ flow: emitters }, { waiting: 1 }).flow).toBeGreaterThan(plain);
    const quiet = { quietShare: column(0.6, {}, HOURS) };
    expect(hourOf({ flow: emitters, run: quiet }, { waiting: 1 }).flow).toBe(plain);
    // hot water in the quiet hour spreads all that is asked over what is left of it
    expect(hourOf({ flow: emitters, run: quiet }, { waiting: 1, share: 0.2 }).flow).toBeGreaterThan(plain);
    const unlimited = { quietShare: column(1, {}, HOURS) };
    expect(hourOf({ flow: emitters, run: unlimited }, { waiting: 1 }).flow).toBeGreaterThan(plain);
  });
});

describe('the heat of an hour', () => {
  test('is what is asked, within what hot water and quiet hours leave of the capacity', () => {
    expect(hourOf({}, { need: 5 }).given).toBe(5);
    expectNear(hourOf({}, { need: 8 }).given, 6);
    expectNear(hourOf({}, { need: 8, share: 0.25 }).given, 4.5);
    const quiet = { run: { quietShare: column(0.5, {}, HOURS) } };
    expectNear(hourOf(quiet, { need: 8, share: 0.25 }).given, 2.25);
  });

  test('waits only as far as it was displaced, not where the unit is too small', () => {
    expect(hourOf({}, { need: 8 }).waits).toBe(0);
    // asked 8, given 4.5: of the 3.5 lacking 6 − 4.5 were displaced
    expectNear(hourOf({}, { need: 8, share: 0.25 }).waits, 1.5);
    // what waited already may go on waiting
    expectNear(hourOf({}, { need: 8, waiting: 1 }).waits, 1);
  });

  test('of a resting unit is none, and nothing waits', () => {
    const rests = { run: { resting: new Uint8Array(HOURS).fill(1) } };
    const found = hourOf(rests, { need: 4, waiting: 2 });
    expect([found.given, found.waits, found.c.capacity[5]]).toEqual([0, 0, 0]);
    expectNear(found.hour[AT.asked], 6);
  });

  test('waits no longer in the last hour of the year', () => {
    expect(hourOf({}, { need: 4, share: 0.5, hour: HOURS - 1 }).waits).toBe(0);
  });

  test('at a flow above the limit is the part that lies below it', () => {
    // 58 °C, return 55 °C at x = 3/6.4·5 = 2.34375 K below the flow: 55.65625 °C, hotter than 55
    expect(hourOf({ flow: 58 }).given).toBe(0);
    // 56 °C: return 53.65625; (55 − 53.65625)/2.34375 = 0.573333333333
    const found = hourOf({ flow: 56 });
    expectNear(found.given, 3 * 0.5733333333333333);
    expectNear(found.hour[AT.topUp], 3 * (1 - 0.5733333333333333));
    expect(found.c.marks[5]! & MARK.flowAboveLimit).toBe(MARK.flowAboveLimit);
  });

  test('is read from the map at the limit where the flow asked is above it', () => {
    expectNear(hourOf({ flow: 56 }).c.capacity[5], 5);
  });
});

describe('the marks of an hour', () => {
  const marksAfter = (given: number, parts: PlanParts = {}) => {
    const { plan, c, hour } = hourOf(parts);
    runAt(plan, c, 5, given, hour);
    markSpaceHeat(plan, c, 5, hour);
    return c.marks[5]! & ~MARK.heating;
  };

  test('say that the compressor cycled below its lowest level, not at it', () => {
    // 0.3·6 = 1.8 kW
    expect(marksAfter(1.79)).toBe(MARK.cycling);
    expect(marksAfter(1.8 - 1e-12)).toBe(0);
    expect(marksAfter(1.81)).toBe(0);
  });

  test('say nothing where the heat pump gives nothing in the end', () => {
    expect(marksAfter(0, { temperature: -15, flow: 30 })).toBe(0);
    expect(marksAfter(3, { temperature: -15, flow: 30 })).toBe(MARK.outsideMap | MARK.belowLowestFlow);
  });
});
