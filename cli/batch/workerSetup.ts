import type { WeatherResult } from '../../src/scenario/loadWeather.ts';
import type { WeatherSeries } from '../../src/weather/series.ts';
import type { HeaderRow } from './homesFile.ts';

/** What a worker is given when it starts. */
export interface WorkerSetup {
  readonly planFile: string;
  /** Folder of the results, where the worker keeps what it has finished. */
  readonly results: string;
  readonly homes?: HeaderRow;
  /** Most tariffs of any job. */
  readonly tariffs: number;
  /** Weather that was read already, its columns in memory that all workers share. */
  readonly weather: readonly (readonly [string, WeatherResult])[];
}

/** The same weather with its columns in shared memory. */
export function sharedWeather(result: WeatherResult): WeatherResult {
  if (result.read === undefined) return result;
  return { ...result, read: { ...result.read, series: sharedSeries(result.read.series) } };
}

function sharedSeries(series: WeatherSeries): WeatherSeries {
  const { humidity, globalRadiation, pressure } = series;
  return {
    ...series,
    temperature: shared(series.temperature),
    ...(humidity === undefined ? {} : { humidity: { ...humidity, values: shared(humidity.values) } }),
    ...(globalRadiation === undefined ? {} : { globalRadiation: shared(globalRadiation) }),
    ...(pressure === undefined ? {} : { pressure: shared(pressure) }),
  };
}

function shared(column: Float64Array): Float64Array {
  const copy = new Float64Array(new SharedArrayBuffer(column.byteLength));
  copy.set(column);
  return copy;
}
