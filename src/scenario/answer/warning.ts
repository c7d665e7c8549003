import type { Problem } from '../../core/problem.ts';

/** What was seen, by the kind of warning: figures alone, each in the unit that stands beside it. */
export interface WarningValues {
  /** H4, and between which factors homes have shown it. */
  'result.seasonal-factor': { readonly factor: number; readonly least: number; readonly most: number };
  /** Share of the heat, 0 … 1, and hours. */
  'result.much-backup': { readonly share: number; readonly hours: number };
  /** kWh of space heat, and hours. */
  'result.unmet-heat': { readonly heat: number; readonly hours: number };
  'result.many-starts': { readonly starts: number };
  'map.outside': { readonly hours: number };
  'map.flow-above-limit': { readonly hours: number };
  'map.too-cold': { readonly hours: number };
  /** Mean of the coldest day and design temperature, °C. */
  'weather.milder-than-design': { readonly coldest: number; readonly design: number };
  'weather.colder-than-design': { readonly coldest: number; readonly design: number };
  /** Design temperature and the unit's lowest outdoor temperature, °C; design load, kW. */
  'size.cannot-run': { readonly outdoor: number; readonly lowest: number; readonly designLoad: number };
  'size.far-under': SizeValues;
  'size.far-over': SizeValues;
  /** Set point, and the temperature of a usual hygiene run, °C. */
  'hot-water.legionella': { readonly setPoint: number; readonly usual: number };
  'hot-water.hygiene-run-cool': { readonly reached: number; readonly usual: number };
  /** °C */
  'hot-water.scalding': { readonly hottest: number };
  /** Set point, and the temperature of use, °C. */
  'hot-water.colder-than-use': { readonly setPoint: number; readonly use: number };
  /** Hours, kWh a year, and the coolest the cylinder gets, °C. */
  'hot-water.short': { readonly hours: number; readonly heat: number; readonly coolest: number };
}

/** Full capacity at design conditions beside the design load. */
export interface SizeValues {
  /** kW */
  readonly capacity: number;
  /** °C */
  readonly outdoor: number;
  /** °C */
  readonly flow: number;
  /** Whether that is the highest flow the unit gives there, lower than what is asked for. */
  readonly limited: boolean;
  /** kW */
  readonly designLoad: number;
}

/** Something seen in entries and result. */
export type SeenWarning<K extends keyof WarningValues = keyof WarningValues> = {
  [C in K]: { readonly code: C; readonly values: WarningValues[C] };
}[K];

/** A problem of loading that does not stop the work. */
export interface LoadingWarning {
  readonly code: Problem['code'];
  readonly problem: Problem;
}

/** Something that an assessor should look at before signing: its kind and its figures; a language makes sentences of it. */
export type Warning = SeenWarning | LoadingWarning;
