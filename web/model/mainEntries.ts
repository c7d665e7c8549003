import type { EntryPath } from '../../src/scenario/entries/pathText.ts';

/** Entries that may be left out and are asked for at every visit all the same; the others stand behind a fold. */
const MAIN = new Set([
  'currency',
  'house.floorArea',
  'house.need.setPoint',
  'house.need.internalGains',
  'house.need.solarAperture',
  'house.heatLoss.thermalBridges',
  'site.altitude',
  'weather.read',
  'weather.read.decimal',
  'weather.read.stamps',
  'weather.read.offset',
  'weather.read.clock',
  'flowTemperature.exponent',
  'circulation.pumpPower',
  'hotWater',
  'hotWater.setPoint',
  'backup',
  'household',
  'boiler',
  'boiler.servicePerYear',
  'boiler.fuel.calorificValue',
  'boiler.fuel.standingPerYear',
  'boiler.fuel.taxes',
  'wholeLife',
  'carbon',
  'limits.lowestOutdoorTemperature',
  'limits.highestFlow',
  'defrost',
  'rates',
  'standing',
  'standing.perMonth',
  'standing.perYear',
  'taxes',
  'circulation',
  'limits',
  'pricesStated',
]);

/** Keys whose lists and rules are main wherever they stand: the times of a rate. */
const MAIN_KEYS = new Set(['from', 'to', 'price']);

/** Whether an entry that may be left out stands before the fold; positions in lists do not count. */
export function isMainEntry(path: EntryPath): boolean {
  const keys = path.filter((step) => typeof step === 'string');
  return MAIN.has(keys.join('.')) || (keys[0] === 'rates' && MAIN_KEYS.has(keys.at(-1) ?? ''));
}
