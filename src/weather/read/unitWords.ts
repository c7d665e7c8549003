import type { UnitSettings } from '../readSettings.ts';
import type { Quantity, QuantityUnit } from './quantities.ts';

type Words = readonly (readonly [QuantityUnit, RegExp])[];

/** A single letter that stands alone, with brackets, blanks or underscores around it. */
function letter(name: string): string {
  return `(?:^|[\\s_([{,;/])${name}(?:[\\s)\\]},;_]|$)`;
}

const TEMPERATURE: Words = [
  ['0.1C', /0[.,]1\s*(?:°|deg|grad|c\b|k\b)|1\/10\s*(?:°|deg|grad|c\b)|zehntel|tenths?/],
  ['F', new RegExp(`°\\s*f|deg[a-z]*[ _.]?f(?:[^a-z]|$)|fahrenheit|${letter('f')}`)],
  ['K', new RegExp(`kelvin|${letter('k')}`)],
  ['C', new RegExp(`°\\s*c|deg[a-z]*[ _.]?c(?:[^a-z]|$)|celsius|${letter('c')}`)],
];

const WORDS: Record<Quantity, Words> = {
  temperature: TEMPERATURE,
  dewPoint: TEMPERATURE,
  wetBulb: TEMPERATURE,
  relativeHumidity: [
    ['percent', /%|percent|prozent|pour ?cent|\bpct\b/],
    ['fraction', /0\s*[-–…]\s*1(?:\D|$)|fraction|anteil|[([{]\s*[-1]\s*[)\]}]/],
  ],
  globalRadiation: [
    ['kWh/m2', /kwh/],
    ['Wh/m2', /wh/],
    ['MJ/m2', /mj/],
    ['J/cm2', /j\s*[/*.]?\s*cm/],
    ['kJ/m2', /kj/],
    ['W/m2', /w\s*[/*.]?\s*m|watt/],
  ],
  pressure: [
    ['hPa', /hpa|mbar|millibar|(?:^|[^a-z])mb(?:[^a-z]|$)/],
    ['kPa', /kpa/],
    ['mmHg', /mm\s*hg|torr/],
    ['inHg', /in\w*\s*hg/],
    ['Pa', /(?:^|[^a-z])pa(?:[^a-z]|$)|pascal/],
  ],
};

/**
 * The unit that a header names, in brackets, after a blank or in a line of its own.
 *
 * @param quantity what the column holds
 * @param header all header cells of the column
 * @returns nothing where no unit is recognised
 * @example unitOfHeader('pressure', 'Luftdruck [hPa]') // 'hPa'
 */
export function unitOfHeader(quantity: Quantity, header: string): QuantityUnit | undefined {
  const text = header
    .slice(0, 300)
    .replace(/([a-z])([CFK])(?=[\s_)\]]|$)/g, '$1 $2')
    .toLowerCase()
    .replace(/²/g, '2')
    .replace(/[\^·_]/g, ' ')
    .replace(/º|˚/g, '°')
    .replace(/℃/g, '°c')
    .replace(/℉/g, '°f');
  return WORDS[quantity].find(([, words]) => words.test(text))?.[0];
}

/** The unit that the settings name for a quantity. */
export function unitOfSettings(quantity: Quantity, units: UnitSettings): QuantityUnit | undefined {
  if (quantity === 'dewPoint' || quantity === 'wetBulb') return units.temperature;
  return units[quantity];
}
