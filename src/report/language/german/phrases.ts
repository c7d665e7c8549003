import { type Phrase, writtenPhrases } from './writtenPhrases.ts';

/** What numbers are called in messages. */
const nouns: readonly Phrase[] = [
  [/^(?:it|they)$/, 'es'],
  [/^a temperature$/, 'eine Temperatur'],
  [/^an outdoor temperature$/, 'eine Außentemperatur'],
  [/^a flow temperature$/, 'eine Vorlauftemperatur'],
  [/^a temperature difference$/, 'ein Temperaturunterschied'],
  [/^a power$/, 'eine Leistung'],
  [/^a capacity$/, 'eine Heizleistung'],
  [/^an input power$/, 'eine elektrische Aufnahme'],
  [/^a COP$/, 'ein COP'],
  [/^a heat loss$/, 'ein Wärmeverlust'],
  [/^an area$/, 'eine Fläche'],
  [/^a volume$/, 'ein Volumen'],
  [/^a percentage$/, 'ein Prozentsatz'],
  [/^a U-value$/, 'ein U-Wert'],
  [/^a carbon factor$/, 'ein CO₂-Faktor'],
  [/^a price$/, 'ein Preis'],
];

/** Temperatures by which another one is bound, in the dative. */
const bounds: readonly Phrase[] = [
  [/^the room temperature$/, 'der Raumtemperatur'],
  [/^the design room temperature$/, 'der Raumtemperatur der Auslegung'],
  [/^the room temperature of that load$/, 'der Raumtemperatur dieser Heizlast'],
  [/^the return temperature$/, 'der Rücklauftemperatur'],
  [
    /^the design flow, which is the highest where none is given$/,
    'dem Vorlauf der Auslegung, ohne Angabe dem höchsten',
  ],
  [/^the highest flow$/, 'dem höchsten Vorlauf'],
  [/^the lowest flow$/, 'dem niedrigsten Vorlauf'],
  [/^the warmest cold water$/, 'dem wärmsten Kaltwasser'],
  [/^the set point$/, 'der Solltemperatur'],
];

/** Names of columns, quantities and values. */
const names: readonly Phrase[] = [
  [/^temperature$/, 'Temperatur'],
  [/^relative humidity$/, 'relative Feuchte'],
  [/^dew point$/, 'Taupunkt'],
  [/^wet bulb$/, 'Feuchtkugeltemperatur'],
  [/^global radiation$/, 'Globalstrahlung'],
  [/^pressure$/, 'Luftdruck'],
  [/^(temperature|relative humidity|dew point|wet bulb|global radiation|pressure) in (column .+)$/s, '%1 in %2'],
  [/^(?:the )?stamp$/, 'Zeitstempel'],
  [/^(?:the )?hour of the year$/, 'Stunde des Jahres'],
  [/^hours of the year$/, 'Stunden des Jahres'],
  [/^hours of the year, counted from ([01])$/, 'Stunden des Jahres, gezählt ab $1'],
  [/^date$/, 'Datum'],
  [/^time$/, 'Uhrzeit'],
  [/^year$/, 'Jahr'],
  [/^month$/, 'Monat'],
  [/^day$/, 'Tag'],
  [/^hour$/, 'Stunde'],
  [/^minute$/, 'Minute'],
  [/^reading$/, 'Zählerstand'],
  [/^readings$/, 'Zählerstände'],
  [/^use$/, 'Verbrauch'],
  [/^fill$/, 'Füllung'],
  [/^use or the fill$/, 'Verbrauch oder Füllung'],
  [/^reading, the use or the fill$/, 'Zählerstand, Verbrauch oder Füllung'],
  [/^(?:meter )?exchange$/, 'Zählerwechsel'],
  [/^estimated$/, 'geschätzt'],
  [/^prices?$/, 'Preise'],
  [/^factors?$/, 'Faktoren'],
  [/^year, month, day(, time of day)?$/, 'Jahr, Monat, Tag%1'],
  [/^day, month(, time of day)?$/, 'Tag, Monat%1'],
  [/^month, day(, time of day)?$/, 'Monat, Tag%1'],
  [/^, time of day$/, ', Uhrzeit'],
  [/^separate columns for (.+)$/, 'eigene Spalten für %1'],
  [/^the capacity$/, 'die Leistung'],
  [/^the COP$/, 'der COP'],
  [/^outdoor$/, 'Außentemperaturen'],
  [/^flow$/, 'Vorlauftemperaturen'],
  [/^the outdoor temperature (\S+ °C)$/, 'die Außentemperatur #1'],
  [/^the flow temperature (\S+ °C)$/, 'die Vorlauftemperatur #1'],
  [/^the column of (\S+ °C)$/, 'die Spalte von #1'],
  [/^the row of (\S+ °C)$/, 'die Zeile von #1'],
];

/** What was found, or may stand there. */
const findings: readonly Phrase[] = [
  [/^a list of (\d+)$/, 'eine Liste mit $1 Einträgen'],
  [/^a list$/, 'eine Liste'],
  [/^a section$/, 'ein Abschnitt'],
  [/^a folder$/, 'ein Ordner'],
  [/^not a finite number$/, 'keine endliche Zahl'],
  [/^nothing but comments$/, 'nur Kommentare'],
  [/^only '(.*)'$/s, 'nur „$1“'],
  [/^an empty cell$/, 'eine leere Zelle'],
  [/^left out$/, 'weggelassen'],
  [/^none$/, 'keine'],
  [/^one$/, 'einen Punkt'],
  [/^no point$/, 'keinen Punkt'],
  [/^no whole day$/, 'keinen ganzen Tag'],
  [/^the rest$/, 'der Rest'],
  [/^the references \(\*\)$/, 'die Verweise (*)'],
  [/^more than (\d+) references$/, 'mehr als $1 Verweise'],
  [/^more than (\d+) levels$/, 'mehr als $1 Ebenen'],
  [/^its keys are (.+)$/s, 'ihre Schlüssel sind &1'],
  [/^neither (\S+) nor (\S+)$/, 'weder $1 noch $2'],
  [/^both (\S+) and (\S+)$/, 'sowohl $1 als auch $2'],
  [/^lacks (.+)$/, 'hat nicht: %1'],
  [/^has (.+) more$/, 'hat außerdem: %1'],
  [/^hold the taxes$/, 'enthalten die Steuern'],
  [/^have the taxes added on the bill$/, 'erhalten die Steuern erst auf der Rechnung'],
  [/^are stated without tax, and none is listed$/, 'stehen ohne Steuer da, und keine ist genannt'],
  [/^state the taxes in more than one way$/, 'geben die Steuern auf mehr als eine Art an'],
  [/^no rates at all$/, 'gar keine Preisstufen'],
  [/^over (\d\S*)$/, 'über #1'],
  [/^(\d+) bytes$/, '$1 Bytes'],
  [/^from (\S+) to (\S+) in steps of (\S+) there is no way$/, 'von #1 bis #2 führt in Schritten von #3 kein Weg'],
  [/^(\d+) values are more than the (\d+) of an axis$/, '$1 Werte sind mehr als die $2 einer Achse'],
  [/^one line of (.+)$/, 'eine Zeile: %1'],
  [/^no line of (.+)$/, 'keine Zeile: %1'],
  [/^none; the rows are taken as they stand, .+$/, 'keine; die Zeilen gelten der Reihe nach, ab 1. Januar 00:00'],
  [/^two lines$/, 'zwei Zeilen'],
  [/^of stamps$/, 'der Zeitstempel'],
  [/^of prices$/, 'mit Preisen'],
  [/^of factors$/, 'mit Faktoren'],
  [/^of readings$/, 'mit Zählerständen'],
  [/^(.+); in all (\d+) minutes of the year have no price$/s, '$1; insgesamt haben $2 Minuten des Jahres keinen Preis'],
  [/^nothing in the last block$/, 'keine Angabe in der letzten Stufe'],
  [/^more than (\S+) kWh$/, 'mehr als #1 kWh'],
  [/^nothing for the first supplier$/, 'keine Angabe beim ersten Lieferanten'],
  [/^a date after that of the supplier before$/, 'ein Tag nach dem des Lieferanten davor'],
  [/^a date of the calendar year (\d+)$/, 'ein Tag des Kalenderjahrs $1'],
  [/^(\d+) suppliers$/, '$1 Lieferanten'],
  [/^at most (\d+) a year$/, 'höchstens $1 im Jahr'],
  [/^a year from (\d+) to (\d+)$/, 'ein Jahr von $1 bis $2'],
  [/^8760, or 8784 with 29 February$/, '8760, mit 29. Februar 8784'],
  [/^8760 or 8784$/, '8760 oder 8784'],
  [/^YYYY-MM-DDTHH:MM with Z or an offset such as \+01:00$/, 'YYYY-MM-DDTHH:MM mit Z oder einem Abstand wie +01:00'],
  [/^as (2024-\S+) or (\S+), from (\d+) to (\d+)$/, 'wie $1 oder $2, von $3 bis $4'],
  [/^(\S+) in line (\d+)$/, '#1 in Zeile $2'],
  [/^line (\d+)$/, 'Zeile $1'],
  [/^column (\d+) of that line$/, 'Spalte $1 derselben Zeile'],
  [/^the period (\S+) to (\S+)$/, 'den Zeitraum $1 bis $2'],
  [/^(\d+) periods, the first (\S+) to (\S+)$/, '$1 Zeiträume, der erste $2 bis $3'],
  [/^the (\S+) climate with (\d+) °C$/, 'das Klima $1 mit $2 °C'],
  [/^at (\S+ °C)$/, 'bei #1'],
  [/^(\S+ × \S+) at (\S+)$/, '#1 bei $2'],
  [/^no header, and (\d+) columns$/, 'keine Kopfzeile, und $1 Spalten'],
  [/^columns ([\d, ]+)$/, 'Spalten $1'],
  [/^(\d+) of the (\d+) hours$/, '$1 der $2 Stunden'],
  [/^(\d+) of (\d+) minutes$/, '$1 zu je $2 Minuten'],
  [/^at most (\d+) minutes$/, 'höchstens $1 Minuten'],
  [/^(.+) apart(, (\d+) min past the step)?$/, '%1 auseinander'],
  [/^not read$|^not decided$/, 'nicht erkannt'],
];

/** Joins and numbers that stand in longer texts of their own. */
const within: readonly Phrase[] = [
  [/“([^”“]*)”/g, '„$1“'],
  [/^((?:[\w.[\]]+, )*[\w.[\]]+) and ([\w.[\]]+)$/g, '$1 und $2'],
  [/\bcolumn (\d+)/g, 'Spalte $1'],
  [/\((\d+) rows\)/g, '($1 Zeilen)'],
  [/\(1 row\)/g, '(1 Zeile)'],
  [/\b(\d+) hours\b/g, '$1 Stunden'],
  [/\b1 hour\b/g, '1 Stunde'],
  [/\b(\d+) days\b/g, '$1 Tage'],
  [/\b1 day\b/g, '1 Tag'],
  [/\b(\d+) minutes\b/g, '$1 Minuten'],
  [/\b1 minute\b/g, '1 Minute'],
  [/\b(\d+) periods\b/g, '$1 Zeiträume'],
  [/\b1 period\b/g, '1 Zeitraum'],
  [/\b(\d+) entries\b/g, '$1 Einträge'],
  [/\b1 entry\b/g, '1 Eintrag'],
  [/\b(\d+) letters\b/g, '$1 Zeichen'],
  [/ and (\d+) more (?:spans|stretches)$/g, ' und $1 weitere Spannen'],
  [/ and (\d+) more$/g, ' und $1 weitere'],
  [/([\dZ:]) to (?=[−-]?\d)/g, '$1 bis '],
  [/^from (?=[−-]?\d)/g, 'von '],
  [/^lacks /g, 'hat nicht '],
  [/ and (the (?:row|column) of )/g, ', $1'],
  [/the row of /g, 'die Zeile von '],
  [/the column of /g, 'die Spalte von '],
];

const whole: readonly Phrase[] = [...writtenPhrases, ...nouns, ...bounds, ...names, ...findings];

const NUMBER = /^[+−-]?\d+\.\d+(?: \S+)?$/;

/**
 * A phrase that stands in a problem, in German; what is no phrase of the program, such as a text of a file, stays.
 *
 * @param text English, as a problem holds it
 * @param field the German of a field’s sentence, which a cure may hold
 * @example germanPhrase('it is one of a, b and c', (says) => says) // 'es ist eines von a, b und c'
 */
export function germanPhrase(text: string, field: (says: string) => string): string {
  if (NUMBER.test(text)) return text.replace('.', ',');
  for (const [english, german] of whole) {
    const match = english.exec(text);
    if (match !== null) return filled(german, match, field);
  }
  return within.reduce((all, [english, german]) => all.replace(english, german), text);
}

function filled(german: string, match: RegExpExecArray, field: (says: string) => string): string {
  return german.replace(/([$#%&@])(\d)/g, (_, how: string, place: string) => {
    const part = match[Number(place)] ?? '';
    if (how === '#') return part.replace(/(\d)\.(?=\d)/g, '$1,');
    if (how === '&') return part.replace(/ and (?=[^,]*$)/, ' und ').replaceAll(' or ', ' oder ');
    if (how === '@') return field(part);
    return how === '%' ? germanPhrase(part, field) : part;
  });
}
