/** What can be bought as fuel. */
export type FuelKind = 'naturalGas' | 'heatingOil' | 'lpg' | 'pellets' | 'electricity' | 'districtHeat' | 'other';

/** A fuel with its price; money before taxes. */
export interface Fuel {
  readonly kind: FuelKind;
  /** Money per kWh on the calorific value below. */
  readonly price: number;
  /** Calorific value on which price and efficiency stand. */
  readonly calorificValue: 'gross' | 'net';
  readonly standingPerYear: number;
  readonly taxes: readonly { readonly name: string; readonly percent: number }[];
  /** kg per kWh on that calorific value; the published one where left out. */
  readonly carbonFactor?: number | undefined;
}

/** Electricity that is bought as the household's is: on its tariff, not at a price of its own. */
export interface TariffElectricity extends Omit<Fuel, 'kind' | 'price'> {
  readonly kind: 'electricity';
  /** Left out; a standing charge of its own and the taxes on it count all the same. */
  readonly price?: number | undefined;
}

/** What a boiler burns or draws; electricity without a price is on the household's tariff. */
export type BoilerFuel = Fuel | TariffElectricity;

/**
 * A fuel as something that is bought at a price.
 *
 * @returns nothing where it is electricity on the household's tariff
 * @example pricedFuel({ kind: 'electricity', calorificValue: 'gross', standingPerYear: 0, taxes: [] }) // undefined
 */
export function pricedFuel(fuel: BoilerFuel): Fuel | undefined {
  return fuel.price === undefined ? undefined : { ...fuel, price: fuel.price };
}

/**
 * Carbon dioxide of burning one kWh of net calorific value, kg.
 *
 * Reference: Commission Implementing Regulation (EU) 2018/2066, annex VI, table 1: natural gas 56.1, gas/diesel oil 74.1,
 * liquefied petroleum gases 63.1 t/TJ; 1 kWh = 3.6 MJ.
 */
const carbonPerNetKwh: Partial<Record<FuelKind, number>> = {
  naturalGas: 56.1 * 3.6e-3,
  heatingOil: 74.1 * 3.6e-3,
  lpg: 63.1 * 3.6e-3,
};

/**
 * Net calorific value as a share of the gross one.
 *
 * Reference: IPCC Guidelines 2006, volume 2, section 1.4.1.2: about 5 % less for oil, 10 % for natural and manufactured
 * gas (from memory); liquefied petroleum gas 8 % (from memory).
 */
const netPerGross: Partial<Record<FuelKind, number>> = { naturalGas: 0.9, heatingOil: 0.95, lpg: 0.92 };

/**
 * Carbon factor of a fuel on the calorific value that its price stands on.
 *
 * @returns kg per kWh; nothing where none is entered and none is published here
 * @example carbonFactorOf({ kind: 'naturalGas', calorificValue: 'net', price: 0.1, standingPerYear: 0, taxes: [] }) // 0.20196
 */
export function carbonFactorOf(fuel: Pick<Fuel, 'kind' | 'calorificValue' | 'carbonFactor'>): number | undefined {
  if (fuel.carbonFactor !== undefined) return fuel.carbonFactor;
  const perNet = carbonPerNetKwh[fuel.kind];
  const net = netPerGross[fuel.kind];
  if (perNet === undefined || net === undefined) return undefined;
  return fuel.calorificValue === 'net' ? perNet : perNet * net;
}

/** Taxes of a fuel, added up, as a share. */
export function fuelTaxShare(fuel: Fuel): number {
  return fuel.taxes.reduce((sum, tax) => sum + tax.percent, 0) / 100;
}

/** What a year of fuel costs. */
export interface FuelCost {
  readonly energy: number;
  readonly standing: number;
  readonly taxes: number;
  readonly total: number;
}

/**
 * Cost of a year of fuel: energy, standing charge, and the taxes on both.
 *
 * @param fuel its prices
 * @param kWh on the fuel's calorific value, 0 or above
 * @example fuelCost({ kind: 'naturalGas', price: 0.1, standingPerYear: 100, taxes: [{ name: 'VAT', percent: 20 }], calorificValue: 'gross' }, 10000).total // 1320
 *
 * Reference: MODEL section 12.
 */
export function fuelCost(fuel: Fuel, kWh: number): FuelCost {
  const energy = kWh * fuel.price;
  const standing = fuel.standingPerYear;
  const taxes = (energy + standing) * fuelTaxShare(fuel);
  return { energy, standing, taxes, total: energy + standing + taxes };
}
