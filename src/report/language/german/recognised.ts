import type { Quantity } from '../../../weather/read/quantities.ts';
import type { RecognisedWords } from '../../../weather/read/recognisedWords.ts';
import { germanPhrase } from './phrases.ts';

const delimiters: Readonly<Record<string, string>> = {
  comma: 'ein Komma',
  semicolon: 'einen Strichpunkt',
  tab: 'einen Tabulator',
  blanks: 'Leerzeichen',
};

const quantities: Readonly<Record<Quantity, string>> = {
  temperature: 'Temperatur',
  relativeHumidity: 'relative Feuchte',
  dewPoint: 'Taupunkt',
  wetBulb: 'Feuchtkugeltemperatur',
  globalRadiation: 'Globalstrahlung',
  pressure: 'Luftdruck',
};

const phrase = (text: string) => germanPhrase(text, (says) => says);

/** How the reading of a weather file is told in German. */
export const germanRecognised: RecognisedWords = {
  cells: (delimiter, decimal) =>
    `Zellen sind durch ${delimiters[delimiter] ?? delimiter} getrennt, das Dezimalzeichen ist ${decimal === 'comma' ? 'das Komma' : 'der Punkt'}`,
  header: (line) => `die Kopfzeile ist Zeile ${line}`,
  noHeader: 'es gibt keine Kopfzeile',
  skipped: (lines) => `; ${counted(lines, 'Zeile', 'Zeilen')} davor übersprungen`,
  station: (name) => `Station ${name}`,
  rows: (count) => `${counted(count, 'Zeile', 'Zeilen')} gelesen`,
  footer: (lines) => `; ${counted(lines, 'Zeile', 'Zeilen')} mit Bemerkungen danach weggelassen`,
  column: ({ use, number, name, unit, how }) =>
    `${use}: Spalte ${number}${name === '' ? '' : ` „${name}“`}${unit === '' ? '' : `, ${unit}`} (${how})`,
  use: phrase,
  units: {
    C: '°C',
    F: '°F',
    K: 'K',
    '0.1C': 'Zehntel °C',
    percent: '%',
    fraction: '0 bis 1',
    'W/m2': 'W/m²',
    'Wh/m2': 'Wh/m²',
    'kWh/m2': 'kWh/m²',
    'kJ/m2': 'kJ/m²',
    'MJ/m2': 'MJ/m²',
    'J/cm2': 'J/cm²',
  },
  decided: {
    settings: 'nach den Leseangaben',
    name: 'nach ihrem Namen',
    content: 'nach ihrem Inhalt',
    position: 'die einzige Spalte mit Zahlen',
  },
  unitDecided: {
    settings: 'Einheit nach den Leseangaben',
    header: 'Einheit aus der Kopfzeile',
    values: 'Einheit an den Werten erkannt',
    assumed: 'Einheit angenommen',
  },
  form: (form) => `Zeitstempel: ${phrase(form)}`,
  marks: (end, how) =>
    `jeder Zeitstempel bezeichnet ${end === 'end' ? 'das Ende' : 'den Anfang'} seines Zeitschritts (${how})`,
  how: { settings: 'nach den Leseangaben', recognised: 'erkannt', assumed: 'angenommen' },
  step: (minutes) => (minutes === 60 ? 'stündlich eine Zeile' : `alle ${minutes} Minuten eine Zeile`),
  localClock: (how) => `die Uhr wurde im Sommer umgestellt; in Normalzeit umgerechnet (${how})`,
  offset: (offset, from) => `Normalzeit ${offset} (${from})`,
  offsetFrom: {
    settings: 'aus den Leseangaben',
    stamps: 'aus den Zeitstempeln',
    header: 'aus der Kopfzeile',
    zone: 'Normalzeit der Zeitzone des Ortes',
    site: 'Normalzeit der Zeitzone des Ortes, angenommen',
  },
  year: (year) => `das Jahr ${year}`,
  sorted: 'die Zeilen wurden nach der Zeit sortiert',
  quantity: (quantity) => quantities[quantity],
  interpolated: (name, hours, longest) =>
    `${name}: ${counted(hours, 'Stunde', 'Stunden')} interpoliert, die längste Lücke ${counted(longest, 'Stunde', 'Stunden')}`,
  held: (name, values, at) => `${name}: ${counted(values, 'Wert', 'Werte')} bei ${at} gehalten`,
  empty: (name) => `${name}: Die Spalte ist leer und wurde weggelassen`,
};

function counted(count: number, one: string, many: string): string {
  return `${count} ${count === 1 ? one : many}`;
}
