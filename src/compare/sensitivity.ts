import { type AnnualCost, annualTotal } from './annualCost.ts';
import { type WholeLifeTerms, wholeLife } from './wholeLife.ts';

/** Changes of a price that the table goes through, shares of today's. */
export const PRICE_CHANGES = [-0.2, 0, 0.2] as const;

/** The result at other energy prices. */
export interface SensitivityRow {
  /** Change of the electricity price and of the fuel price, shares of today's. */
  readonly electricityChange: number;
  readonly fuelChange: number;
  /** Boiler less heat pump in the first year, money. */
  readonly annualSaving: number;
  /** Only where the terms of a whole life are given, money. */
  readonly netPresentValue?: number;
}

/**
 * Annual saving and net present value at electricity and fuel prices of −20, 0 and +20 %.
 *
 * Scaled is what the kilowatt-hours cost, with the taxes on them, of both systems alike; standing and demand charges,
 * service and capital stay. The year is not run again: a hybrid that chooses the cheaper source is taken as it ran at
 * today's prices.
 *
 * @param heatPump annual cost at today's prices
 * @param boiler annual cost at today's prices
 * @param terms of the whole life, where they are given
 * @returns nine rows, electricity −20 % first, and within it fuel −20 % first
 * @example sensitivity(heatPump, boiler, undefined)[4]?.annualSaving // the saving at today's prices
 *
 * Reference: MODEL section 12 for what is varied; the steps are common practice, no source.
 */
export function sensitivity(
  heatPump: AnnualCost,
  boiler: AnnualCost,
  terms: WholeLifeTerms | undefined,
): SensitivityRow[] {
  return PRICE_CHANGES.flatMap((electricityChange) =>
    PRICE_CHANGES.map((fuelChange) => {
      const changed = (cost: AnnualCost) => atPrices(cost, electricityChange, fuelChange);
      const one = changed(heatPump);
      const other = changed(boiler);
      const row = { electricityChange, fuelChange, annualSaving: annualTotal(other) - annualTotal(one) };
      return terms === undefined ? row : { ...row, netPresentValue: wholeLife(one, other, terms).netPresentValue };
    }),
  );
}

function atPrices(cost: AnnualCost, electricityChange: number, fuelChange: number): AnnualCost {
  const electricity = cost.electricityEnergy * electricityChange;
  const fuel = cost.fuelEnergy * fuelChange;
  return {
    electricity: cost.electricity + electricity,
    electricityEnergy: cost.electricityEnergy + electricity,
    fuel: cost.fuel + fuel,
    fuelEnergy: cost.fuelEnergy + fuel,
    service: cost.service,
  };
}
