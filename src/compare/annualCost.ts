import type { Bill } from '../tariffs/bill.ts';
import { taxedEnergy } from '../tariffs/taxedEnergy.ts';
import type { FuelCost } from './fuel.ts';

/** What a year of heating costs at today's prices, by how each part drifts; money, taxes in. */
export interface CostParts {
  /** Electricity, with what it adds to standing and demand charges. */
  readonly electricity: number;
  /** Fuel, with its standing charge. */
  readonly fuel: number;
  /** Service and chimney sweep. */
  readonly service: number;
}

/** The same, with what of it the kilowatt-hours themselves cost. */
export interface AnnualCost extends CostParts {
  /** Of `electricity`, the energy with the taxes on it. */
  readonly electricityEnergy: number;
  /** Of `fuel`, the energy with the taxes on it. */
  readonly fuelEnergy: number;
}

/**
 * All of a year's cost, money.
 *
 * @example annualTotal({ electricity: 900, fuel: 200, service: 150 }) // 1250
 */
export function annualTotal({ electricity, fuel, service }: CostParts): number {
  return electricity + fuel + service;
}

/**
 * What a system's electricity costs: the bill with it less the bill of the household alone, on the same tariff.
 *
 * @param all the bill of household and system
 * @param household the bill of the household alone
 * @returns the difference, and of it the energy with the taxes on it; money, may be negative
 * @example electricityCost(bill(laid, all), bill(laid, household)).electricity // 8760 kWh more at 0.30 and 20 % tax: 3153.6
 *
 * Reference: MODEL section 12.
 */
export function electricityCost(all: Bill, household: Bill): Pick<AnnualCost, 'electricity' | 'electricityEnergy'> {
  return {
    electricity: all.total - household.total,
    electricityEnergy: taxedEnergy(all) - taxedEnergy(household),
  };
}

/**
 * What a system's fuel costs, and of it the energy with the taxes on it; money.
 *
 * @param cost energy, standing charge and taxes of a year
 * @example fuelParts({ energy: 900, standing: 100, taxes: 200, total: 1200 }) // { fuel: 1200, fuelEnergy: 1080 }
 */
export function fuelParts({ energy, standing, taxes, total }: FuelCost): Pick<AnnualCost, 'fuel' | 'fuelEnergy'> {
  const charged = energy + standing;
  return { fuel: total, fuelEnergy: energy * (1 + (charged === 0 ? 0 : taxes / charged)) };
}
