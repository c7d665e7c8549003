import type { PlainCase, PlainHotWater } from './plainCase.ts';
import { highestFlowAt, isResting, levelsAt, type PlainMaps } from './plainUnit.ts';

/** kWh/(L·K). */
export const WATER = 1.163e-3;

export interface PlainCylinder {
  /** °C. */
  readonly temperature: number;
  readonly reheating: boolean;
  readonly hygienePending: boolean;
}

/** What hot water did in one hour; kWh. */
export interface PlainWaterHour {
  readonly after: PlainCylinder;
  readonly served: number;
  readonly short: number;
  readonly loss: number;
  /** τ. */
  readonly share: number;
  readonly heatPumpHeat: number;
  readonly electricity: number;
  /** By the immersion heater, or by the boiler of a hybrid. */
  readonly backupHeat: number;
  /** Flow of the heat pump, °C; null where it does not heat water. */
  readonly flow: number | null;
}

/** MODEL section 8: the cylinder at the first step. */
export function fullCylinder(water: PlainHotWater): PlainCylinder {
  return { temperature: water.setPoint, reheating: false, hygienePending: false };
}

/** MODEL section 8: hour i of the cylinder. */
export function waterHour(plain: PlainCase, maps: PlainMaps, i: number, before: PlainCylinder): PlainWaterHour {
  const water = plain.hotWater;
  if (water === null) throw new Error('no hot water in this case');
  const perKelvin = water.volume * WATER;
  const stored = Math.max(0, (before.temperature - water.coldWater[i]) * perKelvin);
  const served = Math.min(water.draw[i], stored);
  const loss = (water.lossCoefficient / 1000) * (before.temperature - water.surroundings);
  const drawn = before.temperature - (served + loss) / perKelvin;

  const hygiene = before.hygienePending || water.hygieneAsked[i];
  const target = hygiene ? water.hygieneTemperature : water.setPoint;
  const asked = hygiene || before.reheating || drawn < water.setPoint - water.hysteresis;
  const heats = asked && water.allowed[i];

  const none = { share: 0, heatPumpHeat: 0, electricity: 0, backupHeat: 0, flow: null, reached: false, end: drawn };
  const heating = heats ? reheat(plain, maps, i, drawn, target) : none;
  return {
    after: {
      temperature: heating.end,
      reheating: (before.reheating || heats) && !heating.reached,
      hygienePending: hygiene && !heating.reached,
    },
    served,
    short: water.draw[i] - served,
    loss,
    share: heating.share,
    heatPumpHeat: heating.heatPumpHeat,
    electricity: heating.electricity,
    backupHeat: heating.backupHeat,
    flow: heating.flow,
  };
}

/**
 * MODEL section 8: reheating from `drawn` towards `target`, °C, in hour i: the heat pump up to T_h, then in the rest of the
 * hour the immersion heater, or in a hybrid the boiler. `reached` says whether the target was reached.
 */
function reheat(plain: PlainCase, maps: PlainMaps, i: number, drawn: number, target: number) {
  const water = plain.hotWater;
  if (water === null) throw new Error('no hot water in this case');
  const perKelvin = water.volume * WATER;
  const reach = Math.min(target, highestFlowAt(plain, i) - 5); // T_h
  const heatPumpRuns = !isResting(plain, i) && reach > drawn;
  const flow = heatPumpRuns ? (drawn + reach) / 2 + 5 : null;
  const { C, cop } = flow === null ? { C: 1, cop: 1 } : levelsAt(plain, maps, i, flow);
  const E = heatPumpRuns ? (reach - drawn) * perKelvin : 0;
  const share = Math.min(1, E / C);
  const heatPumpHeat = Math.min(E, C);

  const above = Math.max(0, target - (heatPumpRuns ? reach : drawn)) * perKelvin;
  const power = plain.backup.boiler === null ? water.immersion : plain.backup.power;
  const backupHeat = E > C ? 0 : Math.min(above, power * (1 - share));

  const reached = E <= C && backupHeat === above;
  const end = reached ? Math.max(target, drawn) : drawn + (heatPumpHeat + backupHeat) / perKelvin;
  return { share, heatPumpHeat, electricity: heatPumpHeat / cop, backupHeat, flow, reached, end };
}
