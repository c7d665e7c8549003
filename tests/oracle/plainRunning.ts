import { clamp, type PlainCase } from './plainCase.ts';
import { flowAt, type PlainLoad, relativeLoad, returnAt } from './plainFlow.ts';
import { highestFlowAt, isResting, levelsAt, type PlainLevels, type PlainMaps } from './plainUnit.ts';
import { WATER } from './plainWater.ts';

/** A rate of C'(1 − τ)/(1 − τ) is C' but for the last digit: without this a single speed at full load would count as cycling. */
const ROUNDING = 1e-12;

/** What is there for the rooms in one hour, before anything is given. */
export interface PlainOffer {
  /** T_f asked, °C. */
  readonly flow: number;
  /** Flow that the unit runs at, °C. */
  readonly unitFlow: number;
  readonly aboveLimit: boolean;
  /** The heat pump's part L of the need, and what the series top-up leaves to the backup, kWh. */
  readonly L: number;
  readonly topUp: number;
  readonly levels: PlainLevels;
  /** C and C', kW; 0 where the heat pump rests. */
  readonly C: number;
  readonly limited: number;
}

/** MODEL sections 5 and 9 up to `C'`: what the heat pump can do in hour i. */
export function offerAt(plain: PlainCase, maps: PlainMaps, i: number, load: PlainLoad): PlainOffer {
  const x = relativeLoad(plain, i, load);
  const flow = flowAt(plain, i, x);
  const back = returnAt(plain, flow, x);
  const limit = highestFlowAt(plain, i);
  const unitFlow = Math.min(flow, limit);
  const aboveLimit = flow > limit;
  const part = aboveLimit ? clamp((limit - back) / (flow - back), 0, 1) : 1;
  const levels = levelsAt(plain, maps, i, unitFlow);
  const C = isResting(plain, i) ? 0 : levels.C;
  const quiet = plain.unit.quietShare === null ? 1 : plain.unit.quietShare[i];
  return {
    flow,
    unitFlow,
    aboveLimit,
    L: load.need * part,
    topUp: load.need - load.need * part,
    levels,
    C,
    limited: C * quiet,
  };
}

/** How the heat pump gave its heat in one hour. */
export interface PlainRun {
  /** kWh. */
  readonly electricity: number;
  readonly cycles: boolean;
  readonly singleSpeed: boolean;
  readonly starts: number;
}

/** MODEL section 9: electricity and starts for `given` kWh in the share 1 − τ of an hour. */
export function runAt(
  plain: PlainCase,
  levels: PlainLevels,
  given: number,
  share: number,
  cycleWater: number,
): PlainRun {
  const { C, cop } = levels;
  const singleSpeed = levels.Cmin >= C;
  if (given === 0) return { electricity: 0, cycles: false, singleSpeed, starts: 0 };
  const Cmin = singleSpeed ? C : levels.Cmin;
  const copMin = singleSpeed ? cop : levels.copMin;
  const rate = given / (1 - share);
  if (rate >= Cmin * (1 - ROUNDING)) {
    const copAtRate = singleSpeed ? cop : copMin + ((cop - copMin) * (rate - Cmin)) / (C - Cmin);
    return { electricity: given / copAtRate, cycles: false, singleSpeed, starts: 0 };
  }
  const CR = rate / Cmin;
  const { cycling } = plain.unit;
  const electricity =
    cycling.kind === 'degradation'
      ? given / (copMin * (1 - cycling.coefficient * (1 - CR)))
      : given / copMin + (cycling.power / 1000) * (1 - CR) * (1 - share);
  const starts = Math.min(6, (Cmin * CR * (1 - CR) * (1 - share)) / (cycleWater * WATER * 5));
  return { electricity, cycles: true, singleSpeed, starts };
}
