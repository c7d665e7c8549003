import type { BoilerFuel } from '../../compare/fuel.ts';
import type { DefaultUsed } from '../entries/defaultsUsed.ts';

/** What the result rests on beside its defaults, by kind: figures alone, each in the unit that stands beside it. */
export interface AssumptionValues {
  /** Relative humidity, %. */
  'weather.no-humidity': { readonly humidity: number };
  /** Height above sea level, m. */
  'weather.no-pressure': { readonly altitude: number };
  'house.base-from-gains': NoValues;
  /** Highest flow of the map, °C. */
  'limits.flow-of-map': { readonly flow: number };
  'limits.no-lowest-outdoor': NoValues;
  /** Water that a short run works on, L. */
  'circulation.water-by-rule': { readonly water: number };
  'hot-water.profile-of-day': NoValues;
  'backup.none': NoValues;
  'backup.first-tariff-drives': NoValues;
  'household.none': NoValues;
  'household.even': NoValues;
  'boiler.cylinder-loss': NoValues;
  'boiler.hot-water-efficiency': NoValues;
  /** Carbon of a kWh of fuel, kg. */
  'fuel.published-factor': { readonly factor: number; readonly calorificValue: BoilerFuel['calorificValue'] };
}

type NoValues = Readonly<Record<never, never>>;

/** A default that was used. */
export interface DefaultAssumption {
  readonly path: string;
  readonly code: 'default';
  readonly used: DefaultUsed;
}

/** A rule of the model that filled a gap. */
export type RuleAssumption<K extends keyof AssumptionValues = keyof AssumptionValues> = {
  [C in K]: { readonly path: string; readonly code: C; readonly values: AssumptionValues[C] };
}[K];

/** Something the result rests on: its place in the scenario or unit file, its kind and its figures; a language makes a sentence of it. */
export type Assumption = DefaultAssumption | RuleAssumption;
