/** A line through points [x, y], x rising; beyond its ends the end's value holds. */
export type PlainLine = readonly (readonly [number, number])[];

/** Hours of weather, one entry an hour; the series is taken as periodic. */
export interface PlainWeather {
  /** °C. */
  readonly temperature: readonly number[];
  /** W/m². */
  readonly irradiance: readonly number[];
  /** kg water per kg dry air. */
  readonly humidityRatio: readonly number[];
  /** Pa. */
  readonly pressure: readonly number[];
  /** First hour of each of twelve months and the number of hours: 13 entries. */
  readonly monthStart: readonly number[];
}

/** Areas and coefficients of the lumped house before scaling. */
export interface PlainMass {
  readonly massClass: 'veryLight' | 'light' | 'medium' | 'heavy' | 'veryHeavy';
  /** m². */
  readonly floorArea: number;
  /** Heat loss of windows, opaque parts and ventilation, in any one unit: only their ratio counts. */
  readonly windows: number;
  readonly opaque: number;
  readonly ventilation: number;
}

export interface PlainHouse {
  /** H, W/K. */
  readonly heatLoss: number;
  /** Q_d, kW. */
  readonly designLoad: number;
  /** °C by hour. */
  readonly setPoint: readonly number[];
  /** Entered base temperature and the set point it belongs to, °C; null: the base follows from the gains. */
  readonly enteredBase: { readonly base: number; readonly atSetPoint: number } | null;
  /** Φ_int, W. */
  readonly internalGains: number;
  /** A_sol, m². */
  readonly solarAperture: number;
  /** °C; null: no limit. */
  readonly heatingLimit: number | null;
  /** null: degree hours. */
  readonly mass: PlainMass | null;
}

export type PlainFlow =
  | { readonly kind: 'line'; readonly line: PlainLine }
  | {
      readonly kind: 'emitters';
      readonly flow: number;
      readonly return: number;
      readonly room: number;
      readonly exponent: number;
      readonly lowest: number;
      readonly highest: number;
    };

/** A printed table, [outdoor row][flow column]; null is a gap. */
export interface PlainTable {
  readonly outdoor: readonly number[];
  readonly flow: readonly number[];
  /** kW. */
  readonly capacity: readonly (readonly (number | null)[])[];
  readonly cop: readonly (readonly (number | null)[])[];
}

export interface PlainUnit {
  readonly full: PlainTable;
  readonly lowest:
    | { readonly kind: 'table'; readonly table: PlainTable }
    | { readonly kind: 'share'; readonly capacity: number; readonly cop: number };
  /** COP itself bilinear instead of η. */
  readonly linear: boolean;
  readonly defrost:
    | { readonly kind: 'included' }
    | { readonly kind: 'humidity'; readonly capacityLoss: number; readonly copLoss: number }
    | { readonly kind: 'table'; readonly capacity: PlainLine; readonly cop: PlainLine };
  readonly cycling:
    | { readonly kind: 'degradation'; readonly coefficient: number }
    /** W. */
    | { readonly kind: 'offPower'; readonly power: number };
  /** °C; null: no limit. */
  readonly lowestOutdoor: number | null;
  /** °C over outdoor °C; null: the highest flow of the map. */
  readonly highestFlow: PlainLine | null;
  /** Share of full capacity that is left by hour, 1 where nothing limits. */
  readonly quietShare: readonly number[] | null;
  readonly allowance: number;
  /** L; null: as MODEL section 9 estimates it. */
  readonly cycleWater: number | null;
  /** W. */
  readonly standby: number;
  /** W. */
  readonly crankcase: number;
  /** °C; null: always. */
  readonly crankcaseBelow: number | null;
}

export interface PlainHotWater {
  /** L. */
  readonly volume: number;
  readonly setPoint: number;
  readonly hysteresis: number;
  /** UA, W/K. */
  readonly lossCoefficient: number;
  readonly surroundings: number;
  /** kWh by hour. */
  readonly draw: readonly number[];
  /** °C by hour. */
  readonly coldWater: readonly number[];
  readonly allowed: readonly boolean[];
  /** The weekly hour of the hygiene run, by hour. */
  readonly hygieneAsked: readonly boolean[];
  readonly hygieneTemperature: number;
  /** kW. */
  readonly immersion: number;
}

export interface PlainBackup {
  /** P_b, kW. */
  readonly power: number;
  /** null: electric. */
  readonly boiler: { readonly efficiency: number; readonly hotWaterEfficiency: number } | null;
  readonly mode:
    | { readonly kind: 'parallel' }
    | { readonly kind: 'alternative'; readonly switchTemperature: number }
    /** Prices per kWh with taxes; electricity by hour. */
    | { readonly kind: 'cheapest'; readonly electricity: readonly number[]; readonly fuel: number };
}

/** Everything that one run needs, in plain numbers. */
export interface PlainCase {
  readonly weather: PlainWeather;
  readonly house: PlainHouse;
  readonly flow: PlainFlow;
  readonly unit: PlainUnit;
  readonly hotWater: PlainHotWater | null;
  readonly backup: PlainBackup;
  /** P_pump, W. */
  readonly pump: number;
}

/** Value of a line at x, the ends held. */
export function lineAt(line: PlainLine, x: number): number {
  if (x <= line[0][0]) return line[0][1];
  for (let k = 1; k < line.length; k++) {
    const [x0, y0] = line[k - 1];
    const [x1, y1] = line[k];
    if (x <= x1) return y0 + ((y1 - y0) * (x - x0)) / (x1 - x0);
  }
  return line[line.length - 1][1];
}

export function clamp(x: number, low: number, high: number): number {
  return Math.min(Math.max(x, low), high);
}

/** Mean of hours i−23 … i, the series periodic. */
export function meanOfLastDay(values: readonly number[], i: number): number {
  let sum = 0;
  for (let back = 0; back < 24; back++) sum += values[(i - back + values.length) % values.length];
  return sum / 24;
}
