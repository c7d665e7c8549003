import type { SeenYear } from './answer.ts';
import type { SeenWarning } from './warning.ts';

/** Stored water at or above this is the usual guard against legionella, °C (common practice; local codes decide). */
const HYGIENE_STORE = 60;
/** Below this a cylinder without a weekly run is worth a word, °C (common practice; local codes decide). */
const COOL_STORE = 55;
/** Water above this at a tap scalds within seconds, °C (common practice, no source). */
const SCALDING = 60;

/** Cautions of hygiene and scalding, and a cylinder colder than the draw needs. */
export function hotWaterCautions({ loaded, totals, columns }: SeenYear): SeenWarning[] {
  const { hotWater } = loaded.scenario;
  if (hotWater === undefined) return [];
  const list: SeenWarning[] = [];
  const hottest = Math.max(hotWater.setPoint, hotWater.hygiene?.temperature ?? 0);
  const { setPoint, hygiene, draw } = hotWater;
  if (setPoint < COOL_STORE && hygiene === undefined) {
    list.push({ code: 'hot-water.legionella', values: { setPoint, usual: HYGIENE_STORE } });
  }
  if (hygiene !== undefined && hottest < HYGIENE_STORE) {
    list.push({ code: 'hot-water.hygiene-run-cool', values: { reached: hottest, usual: HYGIENE_STORE } });
  }
  if (hottest > SCALDING) list.push({ code: 'hot-water.scalding', values: { hottest } });
  if (draw.given === 'litres' && setPoint < draw.useTemperature) {
    list.push({ code: 'hot-water.colder-than-use', values: { setPoint, use: draw.useTemperature } });
  }
  const hours = totals.hours.hotWaterShort;
  if (hours > 0) {
    const coolest = columns.cylinderTemperature.reduce((least, value) => Math.min(least, value));
    list.push({ code: 'hot-water.short', values: { hours, heat: totals.annual.hotWaterShort, coolest } });
  }
  return list;
}
