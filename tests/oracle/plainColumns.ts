import type { MARK, YearColumns } from '../../src/sim/columns.ts';
import type { EnergyTotals } from '../../src/sim/totals.ts';
import type { PlainCase } from './plainCase.ts';
import type { PlainTotals } from './plainTotals.ts';
import type { PlainHour } from './plainYear.ts';

/** kWh: what is short by less is short by rounding. MODEL is silent; common practice, no source. */
const ROUNDING = 1e-10;

/** The columns of numbers, without the marks. */
export type NumberColumn = Exclude<keyof YearColumns, 'hours' | 'marks' | 'unlimitedNeed'>;

/** Each of the product's columns as this model has it. */
export const plainColumn: Record<NumberColumn, (hour: PlainHour) => number> = {
  spaceHeatNeed: (hour) => hour.need,
  flowTemperature: (hour) => hour.offer?.flow ?? 0,
  capacity: (hour) => hour.offer?.C ?? 0,
  heatPumpSpaceHeat: (hour) => hour.heat?.heatPump ?? 0,
  heatPumpSpaceElectricity: (hour) => hour.heat?.run.electricity ?? 0,
  backupSpaceHeat: (hour) => hour.heat?.backup ?? 0,
  unmetHeat: (hour) => hour.heat?.unmet ?? 0,
  waitingHeat: (hour) => hour.heat?.waiting ?? 0,
  starts: (hour) => hour.heat?.run.starts ?? 0,
  hotWaterShare: (hour) => hour.water?.share ?? 0,
  heatPumpWaterHeat: (hour) => hour.water?.heatPumpHeat ?? 0,
  heatPumpWaterElectricity: (hour) => hour.water?.electricity ?? 0,
  backupWaterHeat: (hour) => hour.water?.backupHeat ?? 0,
  hotWaterServed: (hour) => hour.water?.served ?? 0,
  hotWaterShort: (hour) => hour.water?.short ?? 0,
  cylinderLoss: (hour) => hour.water?.loss ?? 0,
  cylinderTemperature: (hour) => hour.water?.after.temperature ?? 0,
  circulationElectricity: (hour) => hour.pump,
  standbyElectricity: (hour) => hour.standby,
  crankcaseElectricity: (hour) => hour.crankcase,
  electricity: (hour) => hour.electricity,
  fuel: (hour) => hour.fuel,
  indoorTemperature: (hour) => hour.air ?? 0,
  massTemperature: (hour) => hour.massBefore ?? 0,
};

/** Each of the product's totals as this model has it. */
export const plainTotal: Record<keyof EnergyTotals, keyof PlainTotals> = {
  spaceHeatNeed: 'need',
  heatPumpSpaceHeat: 'heatPumpForRooms',
  heatPumpWaterHeat: 'heatPumpForWater',
  backupSpaceHeat: 'backupForRooms',
  backupWaterHeat: 'backupForWater',
  unmetHeat: 'unmet',
  hotWaterAsked: 'waterAsked',
  hotWaterShort: 'waterShort',
  cylinderLoss: 'cylinderLoss',
  heatPumpSpaceElectricity: 'compressorForRooms',
  heatPumpWaterElectricity: 'compressorForWater',
  backupElectricity: 'heaters',
  circulationElectricity: 'pump',
  standbyElectricity: 'standby',
  crankcaseElectricity: 'crankcase',
  electricity: 'electricity',
  fuel: 'fuel',
};

/** Where the unit gives heat in an hour: outdoor and flow, °C; for space, for water, or both (MODEL section 6). */
function pointsOf(plain: PlainCase, hour: PlainHour, i: number) {
  const outdoor = plain.weather.temperature[i] as number;
  const flows = [];
  if (hour.offer !== null && (hour.heat?.heatPump ?? 0) > 0) flows.push(hour.offer.unitFlow);
  if (hour.water !== null && hour.water.flow !== null) flows.push(hour.water.flow);
  return flows.map((flow) => ({ outdoor, flow }));
}

/** What is noted of an hour beside its energy (MODEL sections 6, 8, 9 and 10). */
export interface PlainMarks {
  readonly colder: boolean;
  readonly warmer: boolean;
  readonly hotter: boolean;
  readonly belowLowestFlow: boolean;
}

export function plainMarks(plain: PlainCase, hour: PlainHour, i: number): PlainMarks {
  const { outdoor, flow } = plain.unit.full;
  const points = pointsOf(plain, hour, i);
  const last = (axis: readonly number[]) => axis[axis.length - 1] as number;
  return {
    colder: points.some((point) => point.outdoor < (outdoor[0] as number)),
    warmer: points.some((point) => point.outdoor > last(outdoor)),
    hotter: points.some((point) => point.flow > last(flow)),
    belowLowestFlow: points.some((point) => point.flow < (flow[0] as number)),
  };
}

/** The product's marks of an hour as this model has them. */
export function productMarks(plain: PlainCase, hour: PlainHour, i: number): Record<keyof typeof MARK, boolean> {
  const { colder, warmer, hotter, belowLowestFlow } = plainMarks(plain, hour, i);
  return {
    outsideMap: colder || warmer || hotter,
    belowLowestFlow,
    // MODEL does not define this count: hours in which a part of the need is left to the top-up.
    flowAboveLimit: hour.need > 0 && (hour.offer?.aboveLimit ?? false),
    cycling: hour.heat?.run.cycles ?? false,
    backupForSpace: (hour.heat?.backup ?? 0) > 0,
    backupForWater: (hour.water?.backupHeat ?? 0) > 0,
    hotWaterShort: (hour.water?.short ?? 0) > ROUNDING,
    unmet: (hour.heat?.unmet ?? 0) > ROUNDING,
    heating: hour.need > 0,
  };
}
