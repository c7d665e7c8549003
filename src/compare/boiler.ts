import { type Fuel, type FuelCost, fuelCost } from './fuel.ts';

/** A boiler that would meet the same need. */
export interface Boiler {
  /** Seasonal efficiencies on the fuel's calorific value, above 0. */
  readonly efficiency: number;
  readonly hotWaterEfficiency: number;
  readonly fuel: Fuel;
  /** Electricity of pump and fan while it heats the rooms, kW. */
  readonly pumpPower: number;
  /** Money a year. */
  readonly servicePerYear: number;
}

/** Need that a boiler meets whole: also what the heat pump could not give. */
export interface BoilerNeed {
  /** Space-heat need by hour, kWh. */
  readonly spaceHeat: Float64Array;
  /** Their sum. */
  readonly spaceHeatTotal: number;
  /** Hot water asked, also where it was not served, kWh. */
  readonly hotWater: number;
  /** Standing loss of the cylinder, kWh. */
  readonly cylinderLoss: number;
}

/** A year with the boiler. */
export interface BoilerYear {
  /** Fuel, kWh on its calorific value. */
  readonly fuel: number;
  readonly cost: FuelCost;
  readonly service: number;
  /** Electricity of its pump by hour, kWh; it is on the household's bill. */
  readonly pump: Float64Array;
  readonly pumpElectricity: number;
}

/**
 * A year in which a boiler meets the whole need.
 *
 * @param boiler efficiencies and fuel
 * @param need what it has to give
 * @returns fuel = space need/η + (hot water + cylinder loss)/η_w, its cost, and the electricity of the pump
 * @example boilerYear(boiler, need).fuel // 10,000 kWh of space heat at an efficiency of 0.8: 12,500
 *
 * Reference: MODEL section 12.
 */
export function boilerYear(boiler: Boiler, need: BoilerNeed): BoilerYear {
  const fuel =
    need.spaceHeatTotal / boiler.efficiency + (need.hotWater + need.cylinderLoss) / boiler.hotWaterEfficiency;
  const pump = new Float64Array(need.spaceHeat.length);
  let pumpHours = 0;
  for (let i = 0; i < pump.length; i++) {
    if (need.spaceHeat[i] <= 0) continue;
    pump[i] = boiler.pumpPower;
    pumpHours++;
  }
  return {
    fuel,
    cost: fuelCost(boiler.fuel, fuel),
    service: boiler.servicePerYear,
    pump,
    pumpElectricity: pumpHours * boiler.pumpPower,
  };
}
