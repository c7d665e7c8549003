import type { Answer } from '../scenario/answer/answer.ts';
import { MARK } from '../sim/columns.ts';

/** A column of figures of the hourly CSV. */
export interface HourColumn {
  /** Name as in the program and in docs/nomenclature.md. */
  readonly name: string;
  readonly unit: string;
  readonly values: ArrayLike<number>;
  /** Hours in which the cell stays blank: there the quantity has no meaning. */
  readonly blank?: (hour: number) => boolean;
}

/**
 * The columns of figures that a run has, in their order: weather, price, rooms, unit, backup, hot water, electricity,
 * marks.
 *
 * Columns of things that the scenario does not have (hot water, a house with mass, a fuel, radiation, tariffs) are left out.
 */
export function hourColumns(answer: Answer): HourColumn[] {
  return [
    ...weatherColumns(answer),
    ...priceColumns(answer),
    ...roomColumns(answer),
    ...unitColumns(answer),
    ...hotWaterColumns(answer),
    ...inputColumns(answer),
    ...markColumns(answer),
  ];
}

function weatherColumns({ plan: { weather } }: Answer): HourColumn[] {
  const temperature = { name: 'outdoorTemperature', unit: '°C', values: weather.temperature };
  if (!weather.hasRadiation) return [temperature];
  return [temperature, { name: 'globalRadiation', unit: 'W/m²', values: weather.globalRadiation }];
}

function priceColumns({ loaded }: Answer): HourColumn[] {
  const first = loaded.tariffs[0];
  if (first === undefined) return [];
  const currency = first.currency ?? loaded.scenario.currency;
  return [{ name: 'price', unit: `${currency}/kWh`, values: first.prepared.price }];
}

function roomColumns({ columns: c, plan }: Answer): HourColumn[] {
  const need = [
    { name: 'setPoint', unit: '°C', values: plan.house.setPoint },
    { name: 'spaceHeatNeed', unit: 'kWh', values: c.spaceHeatNeed },
  ];
  if (plan.house.mass === null) return need;
  return [
    ...need,
    { name: 'unlimitedNeed', unit: 'kWh', values: c.unlimitedNeed },
    { name: 'indoorTemperature', unit: '°C', values: c.indoorTemperature },
    { name: 'massTemperature', unit: '°C', values: c.massTemperature },
  ];
}

function unitColumns({ columns: c }: Answer): HourColumn[] {
  // In an hour that asks no heat of the rooms the simulation leaves both at zero.
  const blank = (hour: number) => c.flowTemperature[hour] === 0;
  return [
    { name: 'flowTemperature', unit: '°C', values: c.flowTemperature, blank },
    { name: 'capacity', unit: 'kW', values: c.capacity, blank },
    { name: 'heatPumpSpaceHeat', unit: 'kWh', values: c.heatPumpSpaceHeat },
    { name: 'backupSpaceHeat', unit: 'kWh', values: c.backupSpaceHeat },
    { name: 'unmetHeat', unit: 'kWh', values: c.unmetHeat },
    { name: 'waitingHeat', unit: 'kWh', values: c.waitingHeat },
    { name: 'starts', unit: '1', values: c.starts },
  ];
}

function hotWaterColumns({ columns: c, plan }: Answer): HourColumn[] {
  if (plan.hotWater === null) return [];
  return [
    { name: 'hotWaterShare', unit: '1', values: c.hotWaterShare },
    { name: 'heatPumpWaterHeat', unit: 'kWh', values: c.heatPumpWaterHeat },
    { name: 'backupWaterHeat', unit: 'kWh', values: c.backupWaterHeat },
    { name: 'hotWaterServed', unit: 'kWh', values: c.hotWaterServed },
    { name: 'hotWaterShort', unit: 'kWh', values: c.hotWaterShort },
    { name: 'cylinderLoss', unit: 'kWh', values: c.cylinderLoss },
    { name: 'cylinderTemperature', unit: '°C', values: c.cylinderTemperature },
  ];
}

function inputColumns({ columns: c, plan, loaded }: Answer): HourColumn[] {
  const household = { name: 'householdElectricity', unit: 'kWh', values: loaded.household };
  const water = { name: 'heatPumpWaterElectricity', unit: 'kWh', values: c.heatPumpWaterElectricity };
  return [
    { name: 'heatPumpSpaceElectricity', unit: 'kWh', values: c.heatPumpSpaceElectricity },
    ...(plan.hotWater === null ? [] : [water]),
    { name: 'circulationElectricity', unit: 'kWh', values: c.circulationElectricity },
    { name: 'standbyElectricity', unit: 'kWh', values: c.standbyElectricity },
    { name: 'crankcaseElectricity', unit: 'kWh', values: c.crankcaseElectricity },
    { name: 'electricity', unit: 'kWh', values: c.electricity },
    ...(loaded.scenario.household === undefined ? [] : [household]),
    ...(plan.backup.isBoiler ? [{ name: 'fuel', unit: 'kWh', values: c.fuel }] : []),
  ];
}

function markColumns({ columns: { marks } }: Answer): HourColumn[] {
  return (['outsideMap', 'belowLowestFlow', 'flowAboveLimit', 'cycling'] as const).map((name) => ({
    name,
    unit: '0 or 1',
    values: marks.map((bits) => ((bits & MARK[name]) === 0 ? 0 : 1)),
  }));
}
