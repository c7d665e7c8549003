import { annualTotal, type CostParts } from './annualCost.ts';

/** Less electricity than this in a year is none, kWh: a mean price of it would mean nothing. */
const LEAST_ELECTRICITY = 0.001;

/** A year with the heat pump, as break-even looks at it. */
export interface HeatPumpYear {
  readonly cost: CostParts;
  /** All electricity of the heating system, kWh. */
  readonly electricity: number;
  /** Heat for rooms and cylinder that the seasonal factor counts, kWh. */
  readonly heat: number;
}

/**
 * Mean price of the heat pump's kWh at which both cost the same in a year, money/kWh; `not even free` where the boiler costs
 * less than the heat pump's fuel and service alone.
 */
export type BreakEvenPrice = number | 'no electricity' | 'not even free';

/**
 * Heat over electricity at which both cost the same in a year; `no price` where the present mean price of the heat pump's
 * kWh is not above zero, `at no factor` where the boiler costs no more than the heat pump's fuel and service alone.
 */
export type BreakEvenFactor = number | 'no electricity' | 'no heat' | 'no price' | 'at no factor';

/**
 * Present mean price of the heat pump's kWh, with taxes and what it adds to standing and demand charges.
 *
 * @returns money/kWh
 * @example meanElectricityPrice({ cost: { electricity: 900, fuel: 0, service: 100 }, electricity: 3000, heat: 9000 }) // 0.3
 */
export function meanElectricityPrice({ cost, electricity }: HeatPumpYear): number | 'no electricity' {
  return electricity < LEAST_ELECTRICITY ? 'no electricity' : cost.electricity / electricity;
}

/**
 * Present heat over electricity, with which the break-even factor compares: H4 where no fuel is burnt beside.
 *
 * @example heatOverElectricity({ cost: { electricity: 900, fuel: 0, service: 100 }, electricity: 3000, heat: 9000 }) // 3
 */
export function heatOverElectricity({ electricity, heat }: HeatPumpYear): number | 'no electricity' | 'no heat' {
  if (heat <= 0) return 'no heat';
  return electricity < LEAST_ELECTRICITY ? 'no electricity' : heat / electricity;
}

/**
 * Mean price of the heat pump's kWh at which the annual costs are equal; the boiler's cost, that of its pump included, and
 * the heat pump's fuel and service stay as they are.
 *
 * @param heatPump the year with the heat pump at today's prices
 * @param boiler annual cost of the boiler
 * @returns (boiler − fuel − service of the heat pump)/electricity, money/kWh with taxes; or why there is none
 * @example breakEvenPrice({ cost: { electricity: 900, fuel: 0, service: 100 }, electricity: 3000, heat: 9000 }, { electricity: 0, fuel: 1300, service: 0 }) // 0.4
 *
 * Reference: MODEL section 12.
 */
export function breakEvenPrice(heatPump: HeatPumpYear, boiler: CostParts): BreakEvenPrice {
  if (heatPump.electricity < LEAST_ELECTRICITY) return 'no electricity';
  const left = leftForElectricity(heatPump.cost, boiler);
  return left < 0 ? 'not even free' : left / heatPump.electricity;
}

/**
 * Seasonal factor at which the annual costs are equal at the present mean price of the heat pump's kWh. It compares with
 * heat over electricity, which is H4 where no fuel is burnt beside.
 *
 * @param heatPump the year with the heat pump at today's prices
 * @param boiler annual cost of the boiler
 * @returns heat over the electricity that the boiler's cost, less the heat pump's fuel and service, would buy; or why there
 *   is none
 * @example breakEvenFactor({ cost: { electricity: 900, fuel: 0, service: 100 }, electricity: 3000, heat: 9000 }, { electricity: 0, fuel: 1300, service: 0 }) // 2.25
 *
 * Reference: MODEL section 12.
 */
export function breakEvenFactor(heatPump: HeatPumpYear, boiler: CostParts): BreakEvenFactor {
  const { heat } = heatPump;
  if (heat <= 0) return 'no heat';
  const meanPrice = meanElectricityPrice(heatPump);
  if (meanPrice === 'no electricity' || meanPrice <= 0) return meanPrice === 'no electricity' ? meanPrice : 'no price';
  const left = leftForElectricity(heatPump.cost, boiler);
  const factor = (heat * meanPrice) / left;
  return left > 0 && Number.isFinite(factor) ? factor : 'at no factor';
}

/** What the boiler's cost leaves for electricity after the heat pump's fuel and service. */
function leftForElectricity({ fuel, service }: CostParts, boiler: CostParts): number {
  return annualTotal(boiler) - fuel - service;
}
