import type { InputRecord } from '../scenario/inputFiles.ts';
import type { DegreeDayKind, DegreeDayMethod, DegreeDays } from '../weather/degreeDays.ts';
import type { WeatherLines } from './weatherLines.ts';

/** Degree days of one weather file as plain data, as `--json` writes it. */
export interface DegreeDaysDocument {
  readonly version: string;
  readonly kind: DegreeDayKind;
  /** Base temperature, °C; `threshold` does not look at it. */
  readonly base: number;
  readonly method: DegreeDayMethod;
  readonly unit: 'K·d';
  readonly annual: number;
  /** Twelve months of standard time, January first. */
  readonly monthly: readonly number[];
  readonly weather: { readonly file: string } & WeatherLines;
  readonly inputs: readonly InputRecord[];
}

/** What was asked of a weather file, and what came out. */
export interface DegreeDaysResult {
  readonly version: string;
  readonly kind: DegreeDayKind;
  readonly base: number;
  readonly method: DegreeDayMethod;
  readonly degreeDays: DegreeDays;
  readonly weather: DegreeDaysDocument['weather'];
  readonly inputs: readonly InputRecord[];
}

/** Degree days as plain data, keys in a fixed order, full precision. */
export function degreeDaysDocument(result: DegreeDaysResult): DegreeDaysDocument {
  const { version, kind, base, method, degreeDays, weather, inputs } = result;
  const { annual, monthly } = degreeDays;
  return { version, kind, base, method, unit: 'K·d', annual, monthly, weather, inputs };
}
