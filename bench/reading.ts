import { readFileSync } from 'node:fs';
import Papa from 'papaparse';
import { DiskSource } from '../cli/diskSource.ts';
import { isProblem } from '../src/scenario/fileSource.ts';
import { InputFiles } from '../src/scenario/inputFiles.ts';
import { prepared, tariffOf } from '../src/scenario/loadTariff.ts';
import { prepareWeather } from '../src/weather/prepareWeather.ts';
import { readWeather } from '../src/weather/read/readWeather.ts';
import { loadDemo } from './demo.ts';
import { measure } from './measure.ts';

const SAMPLES = 41;
const WEATHER = 'data/demo/weather.csv';
const TARIFFS = ['three-band', 'half-hourly'];
const CSV_READER = 'papaparse alone on that text';
const READING = 'reading a year of weather';

/**
 * Times what comes before the hours: reading a year of weather, held against a CSV reader alone on the same text, and laying
 * weather and tariffs on the year. Prints what it finds.
 */
export function benchReading(say: (line: string) => void): void {
  const text = readFileSync(WEATHER, 'utf8');
  const { weather, clock, scenario } = loadDemo();
  const { zone, altitude } = scenario.site;
  const context = { file: WEATHER, settings: {}, zone, defaultOffsetMinutes: 60, altitude };
  const site = { altitude, defaultRelativeHumidity: scenario.weather.relativeHumidity };
  const measured = measure(
    [
      { name: CSV_READER, repeat: 2, run: () => Papa.parse(text).data.length },
      { name: READING, repeat: 2, run: () => readWeather(text, context).series?.hours ?? Number.NaN },
      { name: 'preparing it', repeat: 10, run: () => prepareWeather(weather.series, site).hours },
      ...TARIFFS.map((name) => {
        const read = readTariff(`data/demo/tariffs/${name}.yaml`, zone);
        const lay = () => prepared(read, clock).prepared?.price[0] ?? Number.NaN;
        return { name: `laying the tariff ${name} on the year`, repeat: 10, run: lay };
      }),
    ],
    SAMPLES,
  );
  say(`\nbefore the hours, medians of ${SAMPLES} interleaved samples`);
  for (const { name, median } of measured) say(`${name.padEnd(42)} ${median.toFixed(2).padStart(6)} ms`);
  const medianOf = (wanted: string) => measured.find(({ name }) => name === wanted)?.median ?? Number.NaN;
  say(`reading takes ${(medianOf(READING) / medianOf(CSV_READER)).toFixed(1)} × the CSV reader`);
}

function readTariff(name: string, zone: string) {
  const files = new InputFiles(new DiskSource());
  const input = new DiskSource().read(name);
  const { read } = isProblem(input) ? {} : tariffOf(input, zone, files);
  if (read === undefined) throw new Error(`the tariff ${name} cannot be read`);
  return read;
}
