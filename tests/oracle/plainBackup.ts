import type { PlainCase } from './plainCase.ts';
import type { PlainLoad } from './plainFlow.ts';
import { type PlainOffer, type PlainRun, runAt } from './plainRunning.ts';

/** Who gave what to the rooms in one hour; kWh. */
export interface PlainShare {
  readonly heatPump: number;
  readonly run: PlainRun;
  readonly backup: number;
  readonly unmet: number;
  /** D_i, or with the lumped model what the room waits for. */
  readonly waiting: number;
  /** `cheapest`: what the hour's comparison said. */
  readonly cheaper: 'heatPump' | 'boiler' | 'tie' | null;
}

export interface PlainHourOfHeat {
  readonly i: number;
  readonly load: PlainLoad;
  readonly offer: PlainOffer;
  readonly isLast: boolean;
  /** Heat that a boiler gives to hot water in this hour, kWh. */
  readonly boilerForWater: number;
  readonly cycleWater: number;
}

/** MODEL sections 9 and 10: heat pump, waiting heat and backup in one hour. */
export function shareHeat(plain: PlainCase, hour: PlainHourOfHeat): PlainShare {
  const { load, offer, cycleWater } = hour;
  const run = (given: number) => runAt(plain, offer.levels, given, load.share, cycleWater);
  const power = Math.max(0, plain.backup.power - hour.boilerForWater);
  const a = offer.L + load.waitingBefore;
  const most = offer.limited * (1 - load.share);
  const given = Math.min(a, most);

  const cheaper = cheaperSource(plain, hour, given, run(given).electricity);
  if (cheaper === 'boiler') {
    const forRooms = Math.min(a, Math.max(0, power - offer.topUp));
    const heatPump = Math.min(a - forRooms, most);
    const backup = Math.min(offer.topUp, power) + forRooms;
    const unmet = offer.topUp - Math.min(offer.topUp, power) + (a - forRooms - heatPump);
    return { heatPump, run: run(heatPump), backup, unmet, waiting: 0, cheaper };
  }

  const asked = plain.house.mass === null ? askedWithWaiting(plain, hour, a, given) : askedOfRoom(offer, given);
  const backup = Math.min(power, asked.ofBackup);
  return {
    heatPump: given,
    run: run(given),
    backup,
    unmet: asked.ofBackup - backup,
    waiting: asked.waiting,
    cheaper,
  };
}

/** MODEL section 9, degree hours: D_i and what the backup is asked for; at the year's end D is asked of it too. */
function askedWithWaiting(plain: PlainCase, { load, offer, isLast }: PlainHourOfHeat, a: number, given: number) {
  const { C, limited } = offer;
  const twoHours = plain.house.designLoad * 2;
  const displaced = load.waitingBefore + C - limited * (1 - load.share);
  const D = C === 0 || isLast ? 0 : Math.min(a - given, twoHours, displaced);
  return { waiting: D, ofBackup: offer.topUp + (a - given - D) };
}

/** MODEL section 9, lumped: the room waits for what hot water and quiet hours took; the backup gives what C cannot. */
function askedOfRoom(offer: PlainOffer, given: number) {
  const beyond = Math.max(0, offer.L - offer.C);
  return { waiting: offer.L - given - beyond, ofBackup: offer.topUp + beyond };
}

/** MODEL section 10, `cheapest`: which source is cheaper for the heat that the heat pump could give. */
function cheaperSource(plain: PlainCase, { i, load }: PlainHourOfHeat, given: number, electricity: number) {
  const { mode, boiler } = plain.backup;
  if (mode.kind !== 'cheapest' || boiler === null || load.share === 1) return null;
  const byHeatPump = electricity * mode.electricity[i];
  const byBoiler = (given / boiler.efficiency) * mode.fuel;
  if (byHeatPump === byBoiler) return 'tie';
  return byHeatPump > byBoiler ? 'boiler' : 'heatPump';
}
