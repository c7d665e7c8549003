import { HOURS_PER_DAY } from '../../src/core/constants.ts';
import { monthStarts } from '../../src/weather/monthSteps.ts';
import { trailingDayMean } from '../../src/weather/trailingDayMean.ts';
import { seededDraws } from './seededDraws.ts';
import type { TownWeather } from './townWeather.ts';
import { STAMPED_YEAR } from './weatherCsv.ts';

/** The seed of the readings that are committed. */
export const METER_SEED = 'Nebelquellingen gas meter';

/** The invented house of `house.yaml` with its boiler, and the habits that nobody meters. */
const home = {
  /** kW/K */
  heatLoss: 0.195,
  setPoint: 20,
  /** kW */
  internalGains: 0.42,
  /** m² */
  solarAperture: 2.5,
  efficiency: 0.88,
  /** kWh of gas a day */
  hotWater: 9.5,
  /** Share by which windows, absences and visitors change a day's use. */
  unrest: 0.12,
  firstReading: 41_208,
};

/** Days of the month on which somebody went down to the cellar, January to December and once more. */
const READING_DAYS = [1, 2, 1, 3, 1, 1, 4, 1, 1, 2, 1, 1];
/** The reading of August was sent by the supplier. */
const ESTIMATED_MONTH = 7;
const ESTIMATE_ERROR = 35;

/**
 * The text of `data/demo/meter.csv`: a gas meter in kWh, read about once a month in the year whose stamps the demo's weather
 * carries; the last reading is that of 1 January after it.
 *
 * @param weather one common year
 * @param seed any text
 * @returns lines ended by a line feed, whole kWh
 */
export function meterCsv(weather: TownWeather, seed: string): string {
  const use = dailyUse(weather, seed);
  const starts = monthStarts(weather.temperature.length);
  const days = [...READING_DAYS.map((day, month) => starts[month] / HOURS_PER_DAY + day - 1), use.length];
  const lines = ['date,invented reading kWh,estimated'];
  for (const [month, day] of days.entries()) {
    const estimated = month === ESTIMATED_MONTH;
    const counted = use.subarray(0, day).reduce((sum, kWh) => sum + kWh, home.firstReading);
    const date = new Date(Date.UTC(STAMPED_YEAR, 0, 1 + day)).toISOString().slice(0, 10);
    lines.push(`${date},${Math.round(counted + (estimated ? ESTIMATE_ERROR : 0))},${estimated ? 'x' : ''}`);
  }
  return `${lines.join('\n')}\n`;
}

/** Gas of each day, kWh: degree hours with gains, hot water, and unrest from day to day. */
function dailyUse({ temperature, globalRadiation }: TownWeather, seed: string): Float64Array {
  const draws = seededDraws(seed);
  const sun = trailingDayMean(globalRadiation);
  const use = new Float64Array(temperature.length / HOURS_PER_DAY);
  temperature.forEach((outdoor, hour) => {
    const gains = home.internalGains + (home.solarAperture * sun[hour]) / 1000;
    const need = Math.max(0, home.heatLoss * (home.setPoint - outdoor) - gains);
    use[Math.floor(hour / HOURS_PER_DAY)] += need / home.efficiency;
  });
  return use.map((kWh) => (kWh + home.hotWater) * Math.max(0, 1 + home.unrest * draws.normal()));
}
