import { type PlainShare, shareHeat } from './plainBackup.ts';
import type { PlainCase } from './plainCase.ts';
import { degreeHourNeed, heatingStopped } from './plainNeed.ts';
import { type PlainRoom, roomAfter, roomNeed, roomOf } from './plainRoom.ts';
import { offerAt, type PlainOffer } from './plainRunning.ts';
import { cycleWaterOf, isResting, mapsOf, type PlainMaps } from './plainUnit.ts';
import { fullCylinder, type PlainCylinder, type PlainWaterHour, waterHour } from './plainWater.ts';

const START_UP_HOURS = 14 * 24;

/** One hour of a run; kWh, °C, and what happened in it. */
export interface PlainHour {
  readonly need: number;
  readonly waitingBefore: number;
  readonly resting: boolean;
  /** null in hours in which no heat is asked for the rooms. */
  readonly offer: PlainOffer | null;
  readonly heat: PlainShare | null;
  readonly water: PlainWaterHour | null;
  /** Air of the lumped house. */
  readonly air: number | null;
  /** Its mass at the hour's beginning. */
  readonly massBefore: number | null;
  readonly pump: number;
  readonly standby: number;
  readonly crankcase: number;
  readonly electricity: number;
  readonly fuel: number;
}

export interface PlainYear {
  readonly hours: readonly PlainHour[];
  /** Need of the lumped house with unlimited heat, kWh by hour. */
  readonly unlimitedNeed: readonly number[];
}

/** What one hour hands to the next. */
interface State {
  readonly waiting: number;
  readonly cylinder: PlainCylinder | null;
  /** θ_m, °C. */
  readonly mass: number;
}

/** What a run looks up but does not change. */
interface Prepared {
  readonly plain: PlainCase;
  readonly maps: PlainMaps;
  readonly cycleWater: number;
  readonly room: PlainRoom | null;
}

/** The whole model for one case: start-up, the year, and with a lumped house the second pass. */
export function plainYear(plain: PlainCase): PlainYear {
  const { house, weather, hotWater, unit } = plain;
  const maps = mapsOf(unit);
  const room = house.mass === null ? null : roomOf(house.mass, house.heatLoss);
  const prepared: Prepared = { plain, maps, cycleWater: cycleWaterOf(unit, maps), room };
  const N = weather.temperature.length;
  const first = N - START_UP_HOURS;
  const fresh = { waiting: 0, cylinder: hotWater === null ? null : fullCylinder(hotWater) };

  let mass = house.setPoint[first];
  if (room !== null) {
    let state: State = { ...fresh, mass };
    for (let i = first; i < N; i++) state = hourOf(prepared, i, state).after;
    mass = state.mass;
  }

  const hours: PlainHour[] = [];
  let state: State = { ...fresh, mass };
  for (let i = 0; i < N; i++) {
    const { hour, after } = hourOf(prepared, i, state);
    hours.push(hour);
    state = after;
  }
  return { hours, unlimitedNeed: room === null ? [] : needWithUnlimitedHeat(plain, room) };
}

/** MODEL section 10, the second pass: the lumped house with every need met, with its own start-up. */
function needWithUnlimitedHeat(plain: PlainCase, room: PlainRoom): number[] {
  const N = plain.weather.temperature.length;
  let mass = plain.house.setPoint[N - START_UP_HOURS];
  const step = (i: number) => {
    const need = heatingStopped(plain, i) ? 0 : roomNeed(plain, room, i, mass);
    mass = roomAfter(plain, room, i, mass, need).mass;
    return need / 1000;
  };
  for (let i = N - START_UP_HOURS; i < N; i++) step(i);
  return plain.weather.temperature.map((_, i) => step(i));
}

/** Hour i in the order of MODEL: need, hot water, flow, map, running, backup, auxiliaries. */
function hourOf({ plain, maps, cycleWater, room }: Prepared, i: number, before: State) {
  const need = needOf(plain, room, i, before.mass);
  const water = before.cylinder === null ? null : waterHour(plain, maps, i, before.cylinder);
  const load = { need, waitingBefore: before.waiting, share: water?.share ?? 0 };

  const isAsked = need + before.waiting > 0;
  const offer = isAsked ? offerAt(plain, maps, i, load) : null;
  const boilerForWater = plain.backup.boiler === null ? 0 : (water?.backupHeat ?? 0);
  const isLast = i === plain.weather.temperature.length - 1;
  const heat = offer === null ? null : shareHeat(plain, { i, load, offer, isLast, boilerForWater, cycleWater });

  const delivered = (heat?.heatPump ?? 0) + (heat?.backup ?? 0);
  const after = room === null ? null : roomAfter(plain, room, i, before.mass, delivered * 1000);
  const hour: PlainHour = {
    need,
    waitingBefore: before.waiting,
    resting: isResting(plain, i),
    offer,
    heat,
    water,
    air: after === null ? null : after.air,
    massBefore: after === null ? null : before.mass,
    ...inputOf(plain, i, need, heat, water),
  };
  const next: State = {
    waiting: room === null ? (heat?.waiting ?? 0) : 0,
    cylinder: water === null ? null : water.after,
    mass: after === null ? before.mass : after.mass,
  };
  return { hour, after: next };
}

/** MODEL section 4: the need of hour i by either method, kWh. */
function needOf(plain: PlainCase, room: PlainRoom | null, i: number, mass: number): number {
  if (room === null) return degreeHourNeed(plain, i);
  return heatingStopped(plain, i) ? 0 : roomNeed(plain, room, i, mass) / 1000;
}

/** MODEL section 11 and section 10 (fuel): auxiliaries, all electricity and the boiler's fuel of hour i, kWh. */
function inputOf(plain: PlainCase, i: number, need: number, heat: PlainShare | null, water: PlainWaterHour | null) {
  const { unit, backup, weather } = plain;
  const compressorIsOff = (heat?.heatPump ?? 0) === 0 && (water?.heatPumpHeat ?? 0) === 0;
  const isCold = unit.crankcaseBelow === null || weather.temperature[i] < unit.crankcaseBelow;
  const pump = (plain.pump / 1000) * (need > 0 ? 1 : (water?.share ?? 0));
  const standby = compressorIsOff ? unit.standby / 1000 : 0;
  const crankcase = compressorIsOff && isCold ? unit.crankcase / 1000 : 0;
  const backupForRooms = heat?.backup ?? 0;
  const backupForWater = water?.backupHeat ?? 0;
  const { boiler } = backup;
  const compressor = (heat?.run.electricity ?? 0) + (water?.electricity ?? 0);
  const heaters = boiler === null ? backupForRooms + backupForWater : 0;
  const fuel = boiler === null ? 0 : backupForRooms / boiler.efficiency + backupForWater / boiler.hotWaterEfficiency;
  return { pump, standby, crankcase, electricity: compressor + heaters + pump + standby + crankcase, fuel };
}
