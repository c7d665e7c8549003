import { readFileSync } from 'node:fs';
import Papa from 'papaparse';

/** Rows of a CSV file of the package vega-datasets 3.2.1 (BSD-3-Clause; the data are by NOAA, U.S. Government). */
function rowsOf(name: string): Record<string, string>[] {
  const text = readFileSync(new URL(`../../node_modules/vega-datasets/data/${name}`, import.meta.url), 'utf8');
  return Papa.parse<Record<string, string>>(text, { header: true, skipEmptyLines: true }).data;
}

/**
 * Hourly temperature normals 1981–2010 of Seattle-Tacoma, °C, 8760 hours of local standard time. The file lacks its first
 * hour, which takes the value of the second. Averaged over thirty years, this is no real year: cool summer days are gone.
 */
export function seattleHourlyNormals(): Float64Array {
  const rows = rowsOf('seattle-weather-hourly-normals.csv');
  if (rows.length !== 8759 || rows[0]?.date !== '2010-01-01T01:00:00') throw new Error('the file has changed');
  const readings = rows.map((row) => Number(row.temperature));
  return Float64Array.from([readings[0] as number, ...readings]);
}

/** Daily extremes of one calendar year, °C (NOAA GHCN daily, 2012–2015), of a file with or without a column of places. */
export function dailyExtremesOf(file: string, year: number, place?: string): { highest: number[]; lowest: number[] } {
  const rows = rowsOf(file).filter(
    (row) => row.date?.startsWith(`${year}-`) && (place === undefined || row.location === place),
  );
  return { highest: rows.map((row) => Number(row.temp_max)), lowest: rows.map((row) => Number(row.temp_min)) };
}
