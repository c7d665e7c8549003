import type { PlainLine, PlainTable, PlainUnit } from './plainCase.ts';
import type { Draws } from './plainDraws.ts';
import { kappa } from './plainMap.ts';

/** Which forms a case takes; the numbers are drawn. */
export interface UnitForms {
  readonly lowest: 'share' | 'singleSpeed' | 'table';
  readonly linear: boolean;
  readonly defrost: 'included' | 'humidity' | 'table';
  readonly cycling: 'degradation' | 'offPower';
  readonly quiet: 'none' | 'stop' | 'some';
}

/** An invented table of about `size` kW at 0 °C, with gaps but at least two points of each kind in every column. */
function inventTable(draws: Draws, size: number): PlainTable {
  const outdoor = draws.rising(draws.whole(2, 5), draws.between(-22, -5), 6);
  const flow = draws.rising(draws.whole(1, 4), draws.between(24, 36), 7);
  const grid = (value: (t: number, f: number) => number) =>
    outdoor.map((t) => flow.map((f): number | null => value(t, f)));
  // A unit that loses much at its coldest row comes to the floor of the extrapolation within a few kelvins.
  const atColdest = draws.chance(0.5) ? draws.between(0.35, 0.75) : 1;
  const ofRow = (t: number) => (t === outdoor[0] ? atColdest : 1);
  const capacity = grid(
    (t, f) => ofRow(t) * size * (1 + draws.between(0, 0.03) * t - 0.003 * (f - 35)) * draws.between(0.9, 1.1),
  );
  const cop = grid((t, f) => kappa(t, f) * draws.between(0.3, 0.55));
  for (const values of [capacity, cop]) {
    flow.forEach((_, column) => {
      const spared = draws.whole(0, outdoor.length - 1);
      outdoor.forEach((_, row) => {
        const isSpared = row === spared || row === (spared + 1) % outdoor.length;
        if (!isSpared && draws.chance(0.2)) (values[row] as (number | null)[])[column] = null;
      });
    });
  }
  return { outdoor, flow, capacity, cop };
}

function factorLine(draws: Draws): PlainLine {
  const worst = draws.between(0.75, 1);
  return [
    [-10, draws.between(0.9, 1)],
    [draws.between(-3, 3), worst],
    [7, 1],
  ];
}

function inventLowest(draws: Draws, form: UnitForms['lowest'], size: number): PlainUnit['lowest'] {
  if (form === 'table') return { kind: 'table', table: inventTable(draws, size * draws.between(0.2, 1)) };
  if (form === 'singleSpeed') return { kind: 'share', capacity: 1, cop: 1 };
  return { kind: 'share', capacity: draws.between(0.15, 0.8), cop: draws.between(0.8, 1.15) };
}

function inventDefrost(draws: Draws, form: UnitForms['defrost']): PlainUnit['defrost'] {
  if (form === 'included') return { kind: 'included' };
  if (form === 'table') return { kind: 'table', capacity: factorLine(draws), cop: factorLine(draws) };
  return { kind: 'humidity', capacityLoss: draws.between(0, 0.45), copLoss: draws.between(0, 0.45) };
}

function inventQuiet(draws: Draws, form: UnitForms['quiet'], hours: number): number[] | null {
  if (form === 'none') return null;
  const share = form === 'stop' ? 0 : draws.between(0.2, 0.95);
  const from = draws.whole(18, 23);
  const to = draws.whole(0, 7);
  return Array.from({ length: hours }, (_, i) => (i % 24 >= from || i % 24 < to ? share : 1));
}

/** A threshold of outdoor temperature, °C: of its own, or one that an hour meets exactly, to tell 'at' from 'below'. */
export function thresholdOf(draws: Draws, temperature: readonly number[], low: number, high: number): number {
  const met = temperature.filter((outdoor) => outdoor > low && outdoor < high);
  return met.length > 0 && draws.chance(0.5) ? draws.oneOf(met) : draws.between(low, high);
}

/** An invented unit for a house of `designLoad` kW. */
export function inventUnit(
  draws: Draws,
  forms: UnitForms,
  designLoad: number,
  temperature: readonly number[],
): PlainUnit {
  const size = designLoad * draws.between(0.3, 1.6);
  const limit = draws.between(38, 65);
  return {
    full: inventTable(draws, size),
    lowest: inventLowest(draws, forms.lowest, size),
    linear: forms.linear,
    defrost: inventDefrost(draws, forms.defrost),
    cycling:
      forms.cycling === 'offPower'
        ? { kind: 'offPower', power: draws.between(0, 60) }
        : { kind: 'degradation', coefficient: draws.between(0, 0.5) },
    lowestOutdoor: draws.chance(0.4) ? thresholdOf(draws, temperature, -15, 3) : null,
    highestFlow: draws.oneOf<PlainLine | null>([
      null,
      [[0, limit]],
      [
        [-15, limit - draws.between(2, 12)],
        [draws.between(-5, 5), limit],
      ],
    ]),
    quietShare: inventQuiet(draws, forms.quiet, temperature.length),
    allowance: draws.chance(0.5) ? draws.between(0, 0.15) : 0,
    cycleWater: draws.chance(0.5) ? draws.between(10, 200) : null,
    standby: draws.between(0, 30),
    crankcase: draws.between(0, 50),
    crankcaseBelow: draws.chance(0.6) ? thresholdOf(draws, temperature, -5, 15) : null,
  };
}
