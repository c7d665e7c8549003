import { columnSum } from '../core/columnSum.ts';
import { type BoilerFuel, type FuelCost, fuelCost, pricedFuel } from './fuel.ts';
import { type SpaceHeatEfficiency, spaceHeatInput } from './spaceHeatInput.ts';

/** A boiler that would meet the same need; also pellets, district heat or direct electric heating. */
export interface Boiler {
  /** For space heat, on the fuel's calorific value. */
  readonly efficiency: SpaceHeatEfficiency;
  /** For hot water, constant, above 0. */
  readonly hotWaterEfficiency: number;
  readonly fuel: BoilerFuel;
  /** Electricity of pump and fan while it heats the rooms, kW. */
  readonly pumpPower: number;
  /** Money a year. */
  readonly servicePerYear: number;
}

/** Need that a boiler meets whole: also what the heat pump could not give. */
export interface BoilerNeed {
  /** Space-heat need by hour, kWh. */
  readonly spaceHeat: Float64Array;
  /** Hot water asked, also where it was not served, kWh. */
  readonly hotWater: number;
  /** The same by hour; looked at only where the boiler is on the household's tariff. */
  readonly hotWaterByHour: Float64Array;
  /** Standing loss of the cylinder, kWh a year. */
  readonly cylinderLoss: number;
  /** The same by hour; looked at as the hot water by hour is, and even over the hours where it is absent. */
  readonly cylinderLossByHour?: Float64Array | undefined;
}

/** A year with the boiler. */
export interface BoilerYear {
  /** Fuel at its own price, kWh on its calorific value; 0 where the boiler is on the household's tariff. */
  readonly fuel: number;
  readonly cost: FuelCost;
  readonly service: number;
  /** Electricity on the household's bill by hour, kWh: the pump, and the heat where it is made on that tariff. */
  readonly electricity: Float64Array;
  /** The pump's part of it by hour, kWh. */
  readonly pump: Float64Array;
  /** The same in the year, kWh. */
  readonly pumpElectricity: number;
  /** The heat's part of it, kWh a year; 0 where the boiler has a fuel of its own price. */
  readonly heatElectricity: number;
  /** Space heat over what was taken for it. */
  readonly meanSpaceHeatEfficiency: number | 'no heat';
}

/**
 * A year in which a boiler meets the whole need.
 *
 * On the household's tariff, hot water is taken as heated when it is drawn, and the loss of the cylinder when it is lost.
 *
 * @param boiler efficiencies and fuel
 * @param need what it has to give
 * @returns fuel = Σ space need/η + (hot water + cylinder loss)/η_w, its cost, and the electricity on the household's bill
 * @example boilerYear(boiler, need).fuel // 10,000 kWh of space heat at an efficiency of 0.8: 12,500
 *
 * Reference: MODEL section 12.
 */
export function boilerYear(boiler: Boiler, need: BoilerNeed): BoilerYear {
  const { efficiency, hotWaterEfficiency, pumpPower } = boiler;
  const spaceHeat = sumOf(need.spaceHeat);
  const roomInput =
    typeof efficiency === 'number' ? spaceHeat / efficiency : sumOf(spaceHeatInput(efficiency, need.spaceHeat));
  const pump = new Float64Array(need.spaceHeat.length);
  for (let i = 0; i < pump.length; i++) if (need.spaceHeat[i] > 0) pump[i] = pumpPower;
  const input = roomInput + (need.hotWater + need.cylinderLoss) / hotWaterEfficiency;
  const fuel = pricedFuel(boiler.fuel);
  const common = {
    service: boiler.servicePerYear,
    pump,
    pumpElectricity: sumOf(pump),
    meanSpaceHeatEfficiency: roomInput > 0 ? spaceHeat / roomInput : ('no heat' as const),
  };
  if (fuel !== undefined) {
    return { ...common, fuel: input, cost: fuelCost(fuel, input), electricity: pump, heatElectricity: 0 };
  }
  const forRooms = spaceHeatInput(efficiency, need.spaceHeat);
  const evenLoss = need.cylinderLoss / pump.length;
  const lossOfHour = (i: number) => need.cylinderLossByHour?.[i] ?? evenLoss;
  const electricity = pump.map(
    (kWh, i) => kWh + forRooms[i] + (need.hotWaterByHour[i] + lossOfHour(i)) / hotWaterEfficiency,
  );
  const standing = fuelCost({ ...boiler.fuel, price: 0 }, 0);
  return { ...common, fuel: 0, cost: standing, electricity, heatElectricity: input };
}

function sumOf(column: Float64Array): number {
  return columnSum(column, 0, column.length);
}
