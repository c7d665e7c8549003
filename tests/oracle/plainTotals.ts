import type { PlainCase } from './plainCase.ts';
import type { PlainHour, PlainYear } from './plainYear.ts';

/** Sums over some hours of a run; kWh. */
export interface PlainTotals {
  readonly need: number;
  readonly heatPumpForRooms: number;
  readonly heatPumpForWater: number;
  readonly backupForRooms: number;
  readonly backupForWater: number;
  readonly unmet: number;
  readonly waterAsked: number;
  readonly waterShort: number;
  readonly cylinderLoss: number;
  readonly compressorForRooms: number;
  readonly compressorForWater: number;
  readonly heaters: number;
  readonly pump: number;
  readonly standby: number;
  readonly crankcase: number;
  readonly electricity: number;
  readonly fuel: number;
  /** MODEL section 11; null where no heat is given or nothing taken. */
  readonly h2: number | null;
  readonly h3: number | null;
  readonly h4: number | null;
}

/** MODEL sections 10 and 11: sums over hours from (included) to (excluded). */
export function plainTotals(plain: PlainCase, year: PlainYear, from: number, to: number): PlainTotals {
  const sum = (value: (hour: PlainHour, i: number) => number) => {
    let total = 0;
    for (let i = from; i < to; i++) total += value(year.hours[i], i);
    return total;
  };
  const lumped = plain.house.mass !== null;
  const need = sum((hour, i) => (lumped ? year.unlimitedNeed[i] : hour.need));
  const heatPumpForRooms = sum((hour) => hour.heat?.heatPump ?? 0);
  const heatPumpForWater = sum((hour) => hour.water?.heatPumpHeat ?? 0);
  const backupForRooms = sum((hour) => hour.heat?.backup ?? 0);
  const backupForWater = sum((hour) => hour.water?.backupHeat ?? 0);
  const heaters = plain.backup.boiler === null ? backupForRooms + backupForWater : 0;
  const compressorForRooms = sum((hour) => hour.heat?.run.electricity ?? 0);
  const compressorForWater = sum((hour) => hour.water?.electricity ?? 0);
  const pump = sum((hour) => hour.pump);
  const standby = sum((hour) => hour.standby);
  const crankcase = sum((hour) => hour.crankcase);
  const fuel = sum((hour) => hour.fuel);

  const heatOfUnit = heatPumpForRooms + heatPumpForWater;
  const heatOfAll = heatOfUnit + backupForRooms + backupForWater;
  const inputOfUnit = compressorForRooms + compressorForWater + standby + crankcase;
  const inputOfAll = inputOfUnit + heaters + fuel;
  const factor = (heat: number, input: number) => (heat > 0 && input > 0 ? heat / input : null);
  return {
    need,
    heatPumpForRooms,
    heatPumpForWater,
    backupForRooms,
    backupForWater,
    unmet: lumped ? need - heatPumpForRooms - backupForRooms : sum((hour) => hour.heat?.unmet ?? 0),
    waterAsked: sum((hour) => (hour.water === null ? 0 : hour.water.served + hour.water.short)),
    waterShort: sum((hour) => hour.water?.short ?? 0),
    cylinderLoss: sum((hour) => hour.water?.loss ?? 0),
    compressorForRooms,
    compressorForWater,
    heaters,
    pump,
    standby,
    crankcase,
    electricity: sum((hour) => hour.electricity),
    fuel,
    h2: factor(heatOfUnit, inputOfUnit),
    h3: factor(heatOfAll, inputOfAll),
    h4: factor(heatOfAll, inputOfAll + pump),
  };
}
