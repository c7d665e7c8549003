import type { Language } from '../../src/report/language/languages.ts';
import { germanKeys } from './germanKeys.ts';

/** Keys and words of choices whose English is not just the key taken apart. */
const ENGLISH: Readonly<Record<string, string>> = {
  uValue: 'U-value',
  psi: 'ψ',
  kWhPerYear: 'kWh a year',
  perKW: 'Per kW',
  design: 'Design conditions',
  need: 'Heat need',
  given: 'Entered as',
  model: 'Model',
  coefficient: 'W/K, or a coefficient',
  load: 'kW at two temperatures',
  emitters: 'Radiators or floor, by their design',
  curve: 'Heating curve',
  fixed: 'The same at all times',
  lumped: 'House with mass',
  flow: 'Flow temperature',
  return: 'Return temperature',
  naturalGas: 'Natural gas',
  lpg: 'LPG',
  read: 'How to read it',
  unit: 'File of the unit',
  file: 'File',
  zone: 'Time zone',
  from: 'From (HH:MM)',
  to: 'To (HH:MM)',
  upTo: 'Up to',
  included: 'Held in the table (EN 14511)',
  degradation: 'Loss coefficient',
  offPower: 'Power in the pauses',
  wholeLife: 'Over the years',
  litres: 'Litres a day',
};

/**
 * Keys of the files, and the words that choices are made of, as people say them.
 *
 * @example keyNames('en')('heatLoss') // 'Heat loss'
 */
export function keyNames(language: Language): (word: string) => string {
  const known = language === 'de' ? germanKeys : ENGLISH;
  return (word) => (Object.hasOwn(known, word) ? known[word] : apart(word));
}

/** The parts of a key as words; what has a sign or stroke in it stands as it is. */
function apart(word: string): string {
  if (!/^[a-z][A-Za-z0-9]*$/.test(word)) return word;
  const words = word.replace(
    /([a-z0-9])([A-Z])/g,
    (_, before: string, after: string) => `${before} ${after.toLowerCase()}`,
  );
  return words.charAt(0).toUpperCase() + words.slice(1);
}
