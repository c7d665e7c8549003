import { WEEKDAY_NAMES } from '../../core/civilDate.ts';
import { WATER_HEAT_CAPACITY } from '../../core/constants.ts';
import { cosineOfTurns } from '../../core/turn.ts';
import type { HotWaterPlan } from '../../sim/hotWaterPlan.ts';
import { hourlyProfile } from '../../sim/tappingProfiles.ts';
import type { CivilClock } from '../../tariffs/civilClock.ts';
import { type Kept, KeptKind } from '../kept.ts';
import type { Scenario } from '../scenarioSchema.ts';
import { stepsOfRule } from './schedules.ts';

type HotWaterEntry = NonNullable<Scenario['hotWater']>;

/** Temperature difference for which a standing loss in kWh a day is stated, K. */
const STANDING_LOSS_DIFFERENCE = 45;
const DAYS_OF_THE_WAVE = 365;

/** Columns of the hot water that the scenarios of a batch have in common; the cylinder itself is a few numbers. */
const columns = new KeptKind<Float64Array>(64);
const marks = new KeptKind<Uint8Array>(64);

/**
 * The cylinder, its draws and its windows, by hour; draws and windows at the civil time of each step's beginning.
 *
 * @param kept where the scenarios of a batch keep the columns
 */
export function prepareHotWater(entry: HotWaterEntry, clock: CivilClock, kept?: Kept): HotWaterPlan {
  const keyOf = (part: string, value: unknown) => kept?.key([clock], part, value) ?? '';
  const coldKey = keyOf('coldWater', entry.coldWater);
  const coldWater = columns.of(kept, coldKey, () => coldWaterOf(entry, clock));
  const draw = columns.of(kept, keyOf(coldKey, entry.draw), () => drawOf(entry, clock, coldWater));
  const allowed = marks.of(kept, keyOf('windows', entry.reheatWindows), () => allowedSteps(entry, clock));
  const hygieneAsked = marks.of(kept, keyOf('hygiene', entry.hygiene), () => hygieneSteps(entry, clock));
  return {
    volume: entry.volume,
    setPoint: entry.setPoint,
    hysteresis: entry.hysteresis,
    lossCoefficient:
      entry.loss.given === 'coefficient' ? entry.loss.value / 1000 : entry.loss.value / 24 / STANDING_LOSS_DIFFERENCE,
    surroundingTemperature: entry.surroundingTemperature,
    draw,
    coldWater,
    allowed,
    hygieneAsked,
    hygieneTemperature: Math.max(entry.setPoint, entry.hygiene?.temperature ?? entry.setPoint),
    immersionPower: entry.immersionPower,
  };
}

/** T_mean + A·cos(2π(day − day_max)/365), the day counted from 1 (MODEL section 8). */
function coldWaterOf({ coldWater }: HotWaterEntry, clock: CivilClock): Float64Array {
  const { mean, amplitude, warmestDay } = coldWater;
  return Float64Array.from(clock.civilDay, (day) => {
    return mean + amplitude * cosineOfTurns((day + 1 - warmestDay) / DAYS_OF_THE_WAVE);
  });
}

function drawOf({ draw }: HotWaterEntry, clock: CivilClock, coldWater: Float64Array): Float64Array {
  const hourOf = (i: number) => Math.floor(clock.minuteOfDay[i] / 60);
  const column = new Float64Array(clock.hours);
  if (draw.given === 'profile') {
    const kWh = hourlyProfile(draw.profile);
    return column.map((_, i) => kWh[hourOf(i)]);
  }
  const shares = draw.shares ?? USUAL_SHARES;
  const sum = shares.reduce((total, share) => total + share, 0);
  return column.map((_, i) => {
    const litres = (draw.litresPerDay * shares[hourOf(i)]) / sum;
    return Math.max(0, litres * WATER_HEAT_CAPACITY * (draw.useTemperature - coldWater[i]));
  });
}

/** Shares of the day where none are given: those of tapping profile M. */
const USUAL_SHARES = Array.from(hourlyProfile('M'));

function allowedSteps({ reheatWindows }: HotWaterEntry, clock: CivilClock): Uint8Array {
  if (reheatWindows.length === 0) return new Uint8Array(clock.hours).fill(1);
  const windows = reheatWindows.map((window) => stepsOfRule(window, clock));
  return new Uint8Array(clock.hours).map((_, i) => (windows.some((steps) => steps[i] === 1) ? 1 : 0));
}

function hygieneSteps({ hygiene }: HotWaterEntry, clock: CivilClock): Uint8Array {
  const steps = new Uint8Array(clock.hours);
  if (hygiene === undefined) return steps;
  const weekday = WEEKDAY_NAMES.indexOf(hygiene.weekday) + 1;
  return steps.map((_, i) =>
    clock.weekday[i] === weekday && Math.floor(clock.minuteOfDay[i] / 60) === hygiene.hour ? 1 : 0,
  );
}
