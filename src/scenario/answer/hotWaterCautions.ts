import type { BareAnswer, Warning } from './answer.ts';

/** Stored water at or above this is the usual guard against legionella, °C (common practice; local codes decide). */
const HYGIENE_STORE = 60;
/** Below this a cylinder without a weekly run is worth a word, °C (common practice; local codes decide). */
const COOL_STORE = 55;
/** Water above this at a tap scalds within seconds, °C (common practice, no source). */
const SCALDING = 60;
const DEFER = 'Local codes and licensed practice decide.';

/** Cautions of hygiene and scalding, and a cylinder colder than the draw needs. */
export function hotWaterCautions({ loaded, totals, columns }: BareAnswer): Warning[] {
  const { hotWater } = loaded.scenario;
  if (hotWater === undefined) return [];
  const list: Warning[] = [];
  const hottest = Math.max(hotWater.setPoint, hotWater.hygiene?.temperature ?? 0);
  if (hotWater.setPoint < COOL_STORE && hotWater.hygiene === undefined) {
    list.push({
      code: 'hot-water.legionella',
      text: `The cylinder is kept at ${hotWater.setPoint} °C and no weekly hygiene run is entered.`,
      remedy: `Legionella can grow in warm water: enter a hygiene run to ${HYGIENE_STORE} °C or show another measure. ${DEFER}`,
    });
  }
  if (hotWater.hygiene !== undefined && hotWater.hygiene.temperature < HYGIENE_STORE) {
    list.push({
      code: 'hot-water.hygiene-run-cool',
      text: `The hygiene run reaches ${hotWater.hygiene.temperature} °C only.`,
      remedy: `Usual is ${HYGIENE_STORE} °C. ${DEFER}`,
    });
  }
  if (hottest > SCALDING) {
    list.push({
      code: 'hot-water.scalding',
      text: `The cylinder reaches ${hottest} °C: water that hot scalds at the tap.`,
      remedy: `A thermostatic mixing valve is usual. ${DEFER}`,
    });
  }
  if (hotWater.draw.given === 'litres' && hotWater.setPoint < hotWater.draw.useTemperature) {
    list.push({
      code: 'hot-water.colder-than-use',
      text: `The cylinder is kept at ${hotWater.setPoint} °C, colder than the ${hotWater.draw.useTemperature} °C of use.`,
      remedy: 'Raise the set point, or enter the litres at the temperature at which they are drawn.',
    });
  }
  if (totals.hours.hotWaterShort > 0) {
    const coolest = columns.cylinderTemperature.reduce((least, value) => Math.min(least, value));
    list.push({
      code: 'hot-water.short',
      text: `In ${totals.hours.hotWaterShort} hours hot water ran short (${totals.annual.hotWaterShort.toFixed(0)} kWh a year; coolest ${coolest.toFixed(0)} °C).`,
      remedy: 'A larger cylinder, a higher set point, or longer reheat windows.',
    });
  }
  return list;
}
