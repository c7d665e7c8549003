const words: readonly (readonly [RegExp, string])[] = [
  [/^per /, 'je '],
  [/\/year$/, '/Jahr'],
  [/\/day$/, '/Tag'],
  [/^years$/, 'Jahre'],
  [/^lines$/, 'Zeilen'],
  [/^money$/, 'Geld'],
  [/^year$/, 'Jahr'],
  [/^je year$/, 'je Jahr'],
];

/**
 * A unit as fields and messages show it, in German.
 *
 * @example germanUnit('kWh/day') // 'kWh/Tag'
 */
export function germanUnit(unit: string): string {
  return words.reduce((text, [english, german]) => text.replace(english, german), unit);
}

/**
 * A usual range of an entry, in German.
 *
 * @example germanRange('0.1–2.8') // '0,1–2,8'
 */
export function germanRange(usual: string): string {
  return usual
    .replace(/(\d)\.(?=\d)/g, '$1,')
    .replace(/\], \[/g, ']; [')
    .replace(/(\d), (?=\d+,)/g, '$1; ')
    .replace(' electric', ' elektrisch')
    .replace(' a m² of floor', ' je m² Wohnfläche')
    .replace(' a person', ' je Person')
    .replace(' a m³ of natural gas', ' je m³ Erdgas')
    .replace(' a litre of heating oil', ' je Liter Heizöl')
    .replace(' on gross', ' auf den Brennwert bezogen')
    .replace(' to ', ' bis ');
}
