import { describe, expect, it } from 'vitest';
import type { ReadSettings } from '../../../../src/weather/readSettings.ts';
import { type Hour, iso, pad, parts, read, syntheticYear } from './syntheticYear.ts';

// Layouts in which public offices and data services hand out hourly weather, filled with the invented year.
const year = syntheticYear();
const same = (found: Float64Array | undefined, wanted: (h: Hour) => number) =>
  found === undefined ? 'no column' : year.findIndex((h, i) => !(Math.abs(found[i]! - wanted(h)) <= 1e-9));

function readAll(text: string, settings: ReadSettings = {}) {
  const reading = read(text, settings);
  expect(reading.problems).toEqual([]);
  expect(same(reading.series?.temperature, (h) => h.temperature)).toBe(-1);
  return reading;
}

describe('layouts in use', () => {
  it('a typical year of satellite data: coordinates, a table of months, stamps in UTC past the hour, remarks at the end', () => {
    const months = Array.from({ length: 12 }, (_, m) => `${m + 1},${2005 + ((m * 5) % 11)}`);
    const text = [
      'Latitude (decimal degrees): 47.100',
      'Elevation (m): 400',
      'month,year',
      ...months,
      'time(UTC),T2m,RH,G(h),Gb(n),Gd(h),IR(h),WS10m,WD10m,SP',
      ...year.map((h) => {
        const p = parts(h.minute);
        const stamp = `${2005 + (((p.m - 1) * 5) % 11)}${pad(p.m)}${pad(p.d)}:${pad(p.h)}10`;
        return [stamp, h.temperature, h.humidity, h.radiation, 0, 0, 300, 2, 180, h.pressure * 100].join(',');
      }),
      'T2m: 2-m air temperature (degree Celsius)',
      'G(h): Global irradiance on the horizontal plane (W/m2)',
      '',
      'Some owner, 2001-2023',
    ].join('\n');
    const { series, recognised } = readAll(text);
    expect(series?.offsetMinutes).toBe(0);
    expect(same(series?.humidity?.values, (h) => h.humidity)).toBe(-1);
    expect(same(series?.globalRadiation, (h) => h.radiation)).toBe(-1);
    expect(same(series?.pressure, (h) => h.pressure * 100)).toBe(-1);
    expect(recognised).toMatchObject({ footerRows: 3, linesSkipped: 15 });
  });

  it('a station file of a weather office: semicolons, padded cells, compact stamps, marks of missing values', () => {
    const text = [
      'STATIONS_ID;MESS_DATUM;QN_9;TT_TU;RF_TU;eor',
      ...year.map((h, i) => {
        const stamp = iso(h.minute).replace(/[-T:]/g, '').slice(0, 10);
        return `       4411;${stamp};    3; ${i === 77 ? '-999' : h.temperature};  ${pad(h.humidity, 5)};eor`;
      }),
    ].join('\r\n');
    const { series, problems, recognised } = read(text);
    expect(problems).toEqual([]);
    expect(recognised.filled[0]).toMatchObject({ quantity: 'temperature', hours: 1 });
    expect(same(series?.humidity?.values, (h) => h.humidity)).toBe(-1);
    expect(series?.temperature[76]).toBe(year[76]!.temperature);
    expect(recognised.station).toBe('4411');
  });

  it('a typical year with a line of the station above, dates and times apart, hours to 24', () => {
    const text = [
      '700000,"SOME AIRPORT",XX,1.0,52.000,9.000,12',
      'Date (MM/DD/YYYY),Time (HH:MM),ETR (W/m^2),ETRN (W/m^2),GHI (W/m^2),GHI source,DNI (W/m^2),DHI (W/m^2),Dry-bulb (C),Dry-bulb source,Dew-point (C),RHum (%),RHum source,Pressure (mbar),Pressure source,Wspd (m/s)',
      ...year.map((h) => {
        const p = parts(h.minute + 60, true);
        const values = [0, 0, h.radiation, 1, 0, 0, h.temperature, 'A', 1, h.humidity, 'A', h.pressure, 'A', 3];
        return [`${pad(p.m)}/${pad(p.d)}/${1990 + p.m}`, `${pad(p.h)}:00`, ...values].join(',');
      }),
    ].join('\n');
    const { series, recognised } = readAll(text);
    expect(recognised.stamps).toBe('end');
    expect(series?.humidity?.kind).toBe('relative');
    expect(same(series?.globalRadiation, (h) => h.radiation)).toBe(-1);
    expect(same(series?.pressure, (h) => h.pressure * 100)).toBeLessThan(0);
  });

  it('a typical year without names: year, month, day, hour and minute first, after lines of another form', () => {
    const text = [
      'PLACE,Nowhere,-,none,Source,700000,52.0,9.0,1.0,12.0',
      'SIZING,0',
      'COMMENTS,none',
      'SPAN,1,1,Data,Sunday, 1/ 1,12/31',
      ...year.map((h) => {
        const p = parts(h.minute + 60, true);
        return [1999 + p.m, p.m, p.d, p.h, 60, '?9?9E0', h.temperature, 1, h.humidity, h.pressure * 100].join(',');
      }),
    ].join('\n');
    const settings = { columns: { temperature: 7, relativeHumidity: 9, pressure: 10 } };
    expect(read(text).problems.map((p) => p.code)).toEqual(['weather.no-names']);
    const { recognised } = readAll(text, settings);
    expect(recognised).toMatchObject({ header: false, stamps: 'end', stepMinutes: 60 });
  });

  it('a forecast service: two lines of the place, a blank line, units in the names', () => {
    const text = [
      'latitude,longitude,elevation,utc_offset_seconds,timezone,timezone_abbreviation',
      '52.5,13.4,38.0,3600,Europe/Berlin,CET',
      '',
      'time,temperature_2m (°C),relative_humidity_2m (%),dew_point_2m (°C),apparent_temperature (°C),surface_pressure (hPa),pressure_msl (hPa),shortwave_radiation (W/m²),direct_radiation (W/m²),soil_temperature_0_to_7cm (°C)',
      ...year.map((h) =>
        [iso(h.minute), h.temperature, h.humidity, 1, 2, h.pressure, 1013, h.radiation, 4, 5].join(','),
      ),
    ].join('\n');
    const { series } = readAll(text);
    expect(same(series?.globalRadiation, (h) => h.radiation)).toBe(-1);
    expect(series?.pressure?.[9]).toBeCloseTo(year[9]!.pressure * 100, 9);
  });

  it('normals in °F without a unit, with slashes, and without the hour at the spring change of the clock', () => {
    const spring = Date.UTC(2019, 2, 10, 2) / 60_000;
    const text = [
      'date,temp',
      ...year
        .filter((h) => h.minute !== spring)
        .map((h) => `${iso(h.minute).replaceAll('-', '/').replace('T', ' ')},${(h.temperature * 1.8 + 32).toFixed(1)}`),
    ].join('\n');
    const { series, problems, recognised } = read(text, { absentHours: 'fill' }, { zone: 'America/New_York' });
    expect(problems.map((p) => p.code)).toEqual(['weather.unit-guessed']);
    expect(recognised).toMatchObject({ clock: 'standard' });
    // Printed with one decimal of °F: half of 0.1 °F is 0.028 K.
    expect(Math.abs(series!.temperature[4000]! - year[4000]!.temperature)).toBeLessThan(0.029);
  });
});
