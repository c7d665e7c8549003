import type { AnnualCost } from '../../compare/annualCost.ts';
import {
  type BreakEvenFactor,
  type BreakEvenPrice,
  breakEvenFactor,
  breakEvenPrice,
  heatOverElectricity,
  meanElectricityPrice,
} from '../../compare/breakEven.ts';
import { type SensitivityRow, sensitivity } from '../../compare/sensitivity.ts';
import { type WholeLife, type WholeLifeTerms, wholeLife } from '../../compare/wholeLife.ts';
import type { YearTotals } from '../../sim/totals.ts';
import type { Scenario } from '../scenarioSchema.ts';

/** Heat pump against boiler on the first tariff, beyond the cost of a year. */
export interface Comparison {
  readonly breakEven: {
    readonly price: BreakEvenPrice;
    /** Present mean price of the heat pump's kWh, which the price compares with. */
    readonly meanPrice: number | 'no electricity';
    readonly factor: BreakEvenFactor;
    /** Present heat over electricity, which the factor compares with. */
    readonly heatOverElectricity: number | 'no electricity' | 'no heat';
  };
  readonly sensitivity: readonly SensitivityRow[];
  /** Only where a whole life is entered. */
  readonly wholeLife?: WholeLife & { readonly terms: WholeLifeTerms };
}

/** What a year costs of the heating and of the boiler, where there is one. */
interface YearOfBoth {
  readonly heating: AnnualCost;
  readonly boiler?: AnnualCost;
}

/**
 * Break-even, other prices and whole life on one tariff.
 *
 * @param scenario for the terms of the whole life
 * @param totals of the run whose electricity is on that tariff
 * @param cost of the year on it
 * @returns nothing without a boiler
 *
 * Reference: MODEL section 12.
 */
export function comparisonOf(scenario: Scenario, totals: YearTotals, cost: YearOfBoth): Comparison | undefined {
  const { heating, boiler } = cost;
  if (boiler === undefined) return undefined;
  const { electricity, ...annual } = totals.annual;
  const heat = annual.heatPumpSpaceHeat + annual.heatPumpWaterHeat + annual.backupSpaceHeat + annual.backupWaterHeat;
  const heatPump = { cost: heating, electricity, heat };
  const terms = scenario.wholeLife && termsOf(scenario.wholeLife);
  return {
    breakEven: {
      price: breakEvenPrice(heatPump, boiler),
      meanPrice: meanElectricityPrice(heatPump),
      factor: breakEvenFactor(heatPump, boiler),
      heatOverElectricity: heatOverElectricity(heatPump),
    },
    sensitivity: sensitivity(heating, boiler, terms),
    ...(terms === undefined ? {} : { wholeLife: { ...wholeLife(heating, boiler, terms), terms } }),
  };
}

/** Rates from per cent to shares. */
function termsOf(entry: NonNullable<Scenario['wholeLife']>): WholeLifeTerms {
  const { capital, grant, replacedBoiler, years } = entry;
  return {
    ...{ capital, grant, replacedBoiler, years },
    discountRate: entry.discountRate / 100,
    electricityDrift: entry.electricityDrift / 100,
    fuelDrift: entry.fuelDrift / 100,
  };
}
