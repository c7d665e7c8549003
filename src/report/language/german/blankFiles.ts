import type { BlankWords } from '../english/blankFiles.ts';

/** What stands in the files of a blank start, in German. */
export const germanBlank: BlankWords = {
  house: 'Neues Haus',
  houseSays: 'Ein Haus, im Blatt eingetragen. Kommentare dürfen überall stehen; sie bleiben.',
  weatherSays: 'Stündliches Wetter eines Jahres.',
  tariffsSay: 'Stromtarife zum Vergleich; der erste ist der heutige.',
  unit: 'Neues Gerät',
  unitSays: 'Eine Wärmepumpe, wie ihr Datenblatt sie druckt.',
  capacitySays: 'Wärme, kW',
  copSays: 'Wärme je aufgenommenem Strom',
  tariff: (number) => `Tarif ${number}`,
  ratesSay:
    'Die erste Preisstufe, die auf eine Minute passt, bestimmt ihren Preis; eine ohne Zeiten nimmt, was übrig ist.',
  allHours: 'alle Stunden',
};
