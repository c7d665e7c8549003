import { clamp, lineAt, type PlainCase } from './plainCase.ts';

export interface PlainLoad {
  readonly need: number;
  readonly waitingBefore: number;
  /** τ. */
  readonly share: number;
}

/** MODEL section 5: the relative load x of hour i. */
export function relativeLoad(plain: PlainCase, i: number, { need, waitingBefore, share }: PlainLoad): number {
  const design = plain.house.designLoad;
  const plainLoad = need / design;
  if (plain.flow.kind === 'line' || share === 1) return plainLoad;
  const quietLimit = plain.unit.quietShare !== null && plain.unit.quietShare[i] < 1;
  const catchesUp = share > 0 || (waitingBefore > 0 && !quietLimit);
  if (!catchesUp) return plainLoad;
  return Math.min(Math.max(1, plainLoad), (need + waitingBefore) / ((1 - share) * design));
}

/** MODEL section 5: flow temperature of hour i, °C. */
export function flowAt({ flow, weather }: PlainCase, i: number, x: number): number {
  if (flow.kind === 'line') return lineAt(flow.line, weather.temperature[i]);
  const spread = flow.flow - flow.return;
  const over = (flow.flow + flow.return) / 2 - flow.room;
  return clamp(flow.room + over * x ** (1 / flow.exponent) + (x * spread) / 2, flow.lowest, flow.highest);
}

/** MODEL section 5: return temperature that belongs to a flow temperature, °C. */
export function returnAt({ flow }: PlainCase, flowTemperature: number, x: number): number {
  const spread = flow.kind === 'emitters' ? flow.flow - flow.return : 5;
  return flowTemperature - clamp(x, 0.2, 1) * spread;
}
