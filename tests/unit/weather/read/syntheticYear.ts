import { type ReadContext, readWeather } from '../../../../src/weather/read/readWeather.ts';
import type { ReadSettings } from '../../../../src/weather/readSettings.ts';

/** One row of an invented year: values with as many decimals as a file prints. */
export interface Hour {
  /** Minutes since 1970-01-01 00:00 of standard time, at the beginning of the step. */
  readonly minute: number;
  readonly temperature: number;
  readonly humidity: number;
  readonly radiation: number;
  /** hPa */
  readonly pressure: number;
}

/** An invented year, the same at every call: smooth, with a remainder that makes every hour its own. */
export function syntheticYear(year = 2019, step = 60, days = isLeap(year) ? 366 : 365): Hour[] {
  const start = Date.UTC(year, 0, 1) / 60_000;
  return Array.from({ length: (days * 1440) / step }, (_, i) => {
    const hour = (i * step) / 60;
    const season = Math.cos((2 * Math.PI * hour) / 8760);
    const day = Math.cos((2 * Math.PI * (hour - 14)) / 24);
    return {
      minute: start + i * step,
      // Zero, not the negative zero that rounding may leave: a print does not tell them apart.
      temperature: Math.round((9 - 11 * season + 4 * day + ((i * 7) % 13) / 10) * 10) / 10 + 0,
      humidity: 55 + ((i * 11) % 40),
      radiation: Math.max(0, Math.round(500 * day - 100 * season)) + ((i * 3) % 7),
      pressure: 1000 + ((i * 17) % 250) / 10,
    };
  });
}

function isLeap(year: number): boolean {
  return new Date(Date.UTC(year, 1, 29)).getUTCDate() === 29;
}

export function pad(value: number, digits = 2): string {
  return String(value).padStart(digits, '0');
}

/** Calendar parts of a minute; `to24` writes midnight as 24:00 of the day before. */
export function parts(minute: number, to24 = false) {
  const date = new Date((to24 && minute % 1440 === 0 ? minute - 1 : minute) * 60_000);
  const end = to24 && minute % 1440 === 0;
  return {
    y: date.getUTCFullYear(),
    m: date.getUTCMonth() + 1,
    d: date.getUTCDate(),
    h: end ? 24 : date.getUTCHours(),
    min: end ? 0 : date.getUTCMinutes(),
  };
}

export function iso(minute: number): string {
  return new Date(minute * 60_000).toISOString().slice(0, 16);
}

export const header = 'time,temperature,relative humidity,global radiation,pressure';

/** The plainest file of a year: ISO stamps, commas, °C, %, W/m², hPa. */
export function plainFile(year: readonly Hour[], stamp: (minute: number) => string = iso): string {
  return `${[header, ...plainRows(year, stamp)].join('\n')}\n`;
}

export function plainRows(year: readonly Hour[], stamp: (minute: number) => string = iso): string[] {
  return year.map((h) => [stamp(h.minute), h.temperature, h.humidity, h.radiation, h.pressure].join(','));
}

export function read(text: string, settings: ReadSettings = {}, context: Partial<ReadContext> = {}) {
  return readWeather(text, {
    file: 'w.csv',
    settings,
    zone: 'Europe/Berlin',
    defaultOffsetMinutes: 60,
    altitude: 0,
    ...context,
  });
}
