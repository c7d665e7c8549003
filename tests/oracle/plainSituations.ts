import { clamp, meanOfLastDay, type PlainCase } from './plainCase.ts';
import { plainMarks } from './plainColumns.ts';
import { frostIndexOf } from './plainFrost.ts';
import { filled, mapAt } from './plainMap.ts';
import { baseTemperature, heatingStopped } from './plainNeed.ts';
import type { PlainHour, PlainYear } from './plainYear.ts';

/** An hour of a run with its surroundings. */
export interface Seen {
  readonly plain: PlainCase;
  readonly hour: PlainHour;
  readonly before: PlainHour | undefined;
  readonly i: number;
  readonly isLast: boolean;
  /** The heat pump gives heat to the rooms. */
  readonly gives: boolean;
  /** τ. */
  readonly share: number;
  readonly outdoor: number;
}

export function seenIn(plain: PlainCase, year: PlainYear, i: number): Seen {
  const hour = year.hours[i] as PlainHour;
  return {
    plain,
    hour,
    before: year.hours[i - 1],
    i,
    isLast: i === year.hours.length - 1,
    gives: (hour.heat?.heatPump ?? 0) > 0,
    share: hour.water?.share ?? 0,
    outdoor: plain.weather.temperature[i] as number,
  };
}

type Situations = Readonly<Record<string, (seen: Seen) => boolean>>;

const hasMass = ({ plain }: Seen) => plain.house.mass !== null;
const waits = ({ hour }: Seen) => hour.heat?.waiting ?? 0;
const unmet = ({ hour }: Seen) => hour.heat?.unmet ?? 0;
const quiet = ({ plain, i }: Seen) => plain.unit.quietShare?.[i] ?? 1;

const inNeed: Situations = {
  'the heating limit stops heating': (seen) =>
    !hasMass(seen) && heatingStopped(seen.plain, seen.i) && baseTemperature(seen.plain, seen.i) > seen.outdoor,
  'the heating limit stops heating in a house with mass': (seen) => hasMass(seen) && heatingStopped(seen.plain, seen.i),
  'just at the heating limit': ({ plain, i }) =>
    plain.house.heatingLimit !== null && meanOfLastDay(plain.weather.temperature, i) === plain.house.heatingLimit,
  'a house with mass that loses more than its surfaces pass on': ({ plain }) =>
    plain.house.mass !== null && plain.house.heatLoss > 3.45 * 4.5 * plain.house.mass.floorArea,
  'gains cover the losses': ({ plain, hour, i, outdoor }) =>
    plain.house.enteredBase === null &&
    hour.need === 0 &&
    outdoor < (plain.house.setPoint[i] as number) &&
    !heatingStopped(plain, i),
};

const inWaiting: Situations = {
  'hot water takes a part of the hour': ({ share, gives }) => share > 0 && share < 1 && gives,
  'hot water takes the whole hour': ({ share, hour }) => share === 1 && hour.need > 0,
  'hot water takes the whole hour while heat waits': ({ share, hour }) => share === 1 && hour.waitingBefore > 0,
  'heat waits two hours in a row': (seen) => seen.hour.waitingBefore > 0 && waits(seen) > 0,
  'heat waits up to two hours of design load': (seen) => waits(seen) === 2 * seen.plain.house.designLoad,
  'waiting heat is given with no need': ({ hour, gives }) => hour.waitingBefore > 0 && hour.need === 0 && gives,
  'waiting heat is left at the end of the year': ({ isLast, hour }) => isLast && hour.waitingBefore > 0,
  'waiting heat meets a resting heat pump': ({ hour }) => hour.waitingBefore > 0 && hour.resting,
  'the room with mass waits': (seen) => hasMass(seen) && waits(seen) > 0,
  'a quiet hour stops the heat pump': (seen) => quiet(seen) === 0 && seen.hour.need > 0 && !seen.hour.resting,
  'a quiet hour limits the heat pump': (seen) =>
    quiet(seen) > 0 && quiet(seen) < 1 && seen.gives && waits(seen) > (seen.hour.waitingBefore || 0),
};

const hasFrost = ({ plain, gives }: Seen) => gives && plain.unit.defrost.kind === 'humidity';
const frost = ({ plain, outdoor, i }: Seen) =>
  frostIndexOf(outdoor, plain.weather.humidityRatio[i] as number, plain.weather.pressure[i] as number);
const unitFlow = ({ hour }: Seen) => hour.offer?.unitFlow ?? 0;
const marks = ({ plain, hour, i }: Seen) => plainMarks(plain, hour, i);
const first = (axis: readonly number[]) => axis[0] as number;
const last = (axis: readonly number[]) => axis[axis.length - 1] as number;

/** MODEL section 6: capacity never below 0.3 of that at the coldest row. */
function isAtFloor({ plain, hour, outdoor }: Seen): boolean {
  const table = filled(plain.unit.full);
  const coldest = table.outdoor[0] as number;
  const flow = hour.offer?.unitFlow ?? 0;
  if (outdoor >= coldest) return false;
  return mapAt(table, outdoor, flow, false).capacity === 0.3 * mapAt(table, coldest, flow, false).capacity;
}

const onTheMap: Situations = {
  'colder than the coldest row': (seen) => seen.gives && marks(seen).colder,
  'so cold that capacity is held at its floor': (seen) => seen.gives && isAtFloor(seen),
  'warmer than the warmest row': (seen) => seen.gives && marks(seen).warmer,
  'more than 5 K warmer than the warmest row': (seen) =>
    seen.gives && seen.outdoor > last(seen.plain.unit.full.outdoor) + 5,
  'hotter than the hottest column': (seen) => seen.gives && marks(seen).hotter,
  'below the lowest flow': (seen) => seen.gives && marks(seen).belowLowestFlow,
  'more than 10 K below the lowest flow': (seen) =>
    seen.gives && unitFlow(seen) < first(seen.plain.unit.full.flow) - 10,
  'a table with one flow column': ({ plain, gives }) => gives && plain.unit.full.flow.length === 1,
  'a table with gaps': ({ plain, gives }) => gives && plain.unit.full.cop.flat().includes(null),
  'a lift below 15 K': (seen) => seen.gives && unitFlow(seen) - seen.outdoor + 10 < 15,
  'frost takes its usual share': (seen) => hasFrost(seen) && frost(seen) > 0 && frost(seen) < 1.5,
  'frost takes its highest share': (seen) => hasFrost(seen) && frost(seen) === 1.5,
  'frost takes half': (seen) => {
    const { defrost } = seen.plain.unit;
    return seen.gives && defrost.kind === 'humidity' && defrost.capacityLoss * frost(seen) > 0.5;
  },
};

const isSingle = ({ hour }: Seen) => hour.heat?.run.singleSpeed ?? false;
const cycles = ({ hour }: Seen) => hour.heat?.run.cycles ?? false;
const aboveLimit = ({ hour, gives }: Seen) => gives && hour.need > 0 && (hour.offer?.aboveLimit ?? false);
const carried = ({ hour }: Seen) => (hour.offer?.L ?? 0) / hour.need;

const inRunning: Situations = {
  'flow above the highest': (seen) => aboveLimit(seen) && clamp(carried(seen), 0.01, 0.99) === carried(seen),
  'even the return above the highest flow': (seen) => aboveLimit(seen) && carried(seen) === 0,
  'single speed below full load': (seen) => seen.gives && isSingle(seen) && cycles(seen),
  'a lowest level of its own table that is not below full load': (seen) =>
    seen.gives && isSingle(seen) && seen.plain.unit.lowest.kind === 'table',
  'between the levels': (seen) => seen.gives && !cycles(seen) && !isSingle(seen),
  'cycling with a coefficient': (seen) => cycles(seen) && seen.plain.unit.cycling.kind === 'degradation',
  'just not cold enough for the crankcase heater': ({ plain, outdoor }) => outdoor === plain.unit.crankcaseBelow,
  'cycling with off power': (seen) => cycles(seen) && seen.plain.unit.cycling.kind === 'offPower',
  'six starts an hour': ({ hour }) => hour.heat?.run.starts === 6,
  'just not too cold for the heat pump': ({ hour, plain, outdoor }) =>
    outdoor === plain.unit.lowestOutdoor && !hour.resting && hour.need > 0,
  'too cold for the heat pump': ({ hour, plain }) =>
    hour.resting && plain.backup.mode.kind !== 'alternative' && hour.need > 0,
};

const isAlternative = ({ plain }: Seen) => plain.backup.mode.kind === 'alternative';
const boilerForWater = ({ plain, hour }: Seen) => (plain.backup.boiler === null ? 0 : (hour.water?.backupHeat ?? 0));

const inBackup: Situations = {
  'alternative: the backup carries all': (seen) => isAlternative(seen) && seen.hour.resting && seen.hour.need > 0,
  'alternative: just at the switch temperature': ({ plain, outdoor }) =>
    plain.backup.mode.kind === 'alternative' && outdoor === plain.backup.mode.switchTemperature,
  'alternative: back to the heat pump': (seen) =>
    isAlternative(seen) && !seen.hour.resting && (seen.before?.resting ?? false) && seen.gives,
  'hot water leaves the rooms too little of the boiler': (seen) =>
    boilerForWater(seen) > 0 && unmet(seen) > 0 && (seen.hour.heat?.backup ?? 0) < seen.plain.backup.power,
  'the backup is too small': (seen) => unmet(seen) > 0,
};

const cheaper = ({ hour }: Seen) => hour.heat?.cheaper ?? null;
const boilerTakes = (seen: Seen) => cheaper(seen) === 'boiler';

const inCheapest: Situations = {
  'cheapest turns to the boiler': (seen) => boilerTakes(seen) && seen.before?.heat?.cheaper === 'heatPump',
  'cheapest turns to the heat pump': (seen) => cheaper(seen) === 'heatPump' && seen.before?.heat?.cheaper === 'boiler',
  'cheapest ties': (seen) => cheaper(seen) === 'tie' && seen.gives,
  'cheapest: the heat pump gives what the boiler cannot': (seen) =>
    boilerTakes(seen) && seen.gives && unmet(seen) === 0,
  'cheapest: both together are too small': (seen) => boilerTakes(seen) && seen.gives && unmet(seen) > 0,
  'cheapest: the boiler cannot carry the top-up': (seen) =>
    boilerTakes(seen) && (seen.hour.offer?.topUp ?? 0) > seen.plain.backup.power,
  'cheapest: the boiler takes over what waited': (seen) => boilerTakes(seen) && seen.hour.waitingBefore > 0,
  'cheapest: the boiler carries an hour with hot water': (seen) => boilerTakes(seen) && seen.share > 0,
  'cheapest: the boiler in a house with mass': (seen) => boilerTakes(seen) && hasMass(seen),
};

const waterByBackup = ({ hour }: Seen) => (hour.water?.backupHeat ?? 0) > 0;
const isClosed = ({ plain, i }: Seen) => plain.hotWater !== null && plain.hotWater.allowed[i] === false;
const stillPending = ({ hour, before }: Seen) =>
  (hour.water?.after.hygienePending ?? false) && (before?.water?.after.hygienePending ?? false);

const inWater: Situations = {
  'the heater in the cylinder ends what the heat pump began': (seen) =>
    waterByBackup(seen) && seen.share > 0 && seen.plain.backup.boiler === null,
  'the boiler ends what the heat pump began': (seen) => boilerForWater(seen) > 0 && seen.share > 0,
  'hot water while the heat pump rests': (seen) => waterByBackup(seen) && seen.hour.resting,
  'a reheat stays under way in a closed window': (seen) =>
    isClosed(seen) && (seen.hour.water?.after.reheating ?? false),
  'hygiene is pending in a closed window': (seen) => isClosed(seen) && stillPending(seen),
  'hygiene is pending while it is heated': (seen) => !isClosed(seen) && stillPending(seen),
  'hygiene is reached': ({ hour, before }) =>
    (before?.water?.after.hygienePending ?? false) && hour.water?.after.hygienePending === false,
  'hot water falls short': ({ hour }) => (hour.water?.short ?? 0) > 0,
  'the cylinder is warmed by its surroundings': ({ hour }) => (hour.water?.loss ?? 0) < 0,
};

/** What a set of runs must have met, so that a comparison cannot thin out unseen: true in an hour that is such. */
export const situations: Situations = {
  ...inNeed,
  ...inWaiting,
  ...onTheMap,
  ...inRunning,
  ...inBackup,
  ...inCheapest,
  ...inWater,
};
