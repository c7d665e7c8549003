import type { ProblemKind } from '../../../core/problems/catalogue.ts';
import type { weatherProblems } from '../../../core/problems/weatherProblems.ts';

/** Problems of weather files, in German. */
export const problemsOfWeather: Readonly<Record<keyof typeof weatherProblems, ProblemKind>> = {
  'weather.long-line': {
    says: 'diese Zeile hat {found} Zeichen; höchstens {allowed} werden gelesen',
    cure: 'dies ist keine Tabelle mit einer Stunde je Zeile: Exportieren Sie die Daten noch einmal als CSV-Text',
  },
  'weather.too-many-lines': {
    says: 'die Datei hat {found} Zeilen; höchstens {allowed} werden gelesen',
    cure: 'kürzen Sie die Datei auf die gewünschte Station und das gewünschte Jahr',
  },
  'weather.too-many-columns': {
    says: 'diese Zeile hat {found} Zellen; höchstens {allowed} werden gelesen',
    cure: 'prüfen Sie das Trennzeichen (geben Sie „delimiter“ an), oder exportieren Sie weniger Spalten',
  },
  'weather.no-rows': {
    says: 'es wurden keine Zeilen mit Zahlen gefunden',
    cure: 'prüfen Sie die Datei; geben Sie „delimiter“, „decimal“ oder „skipLines“ an, wo sie ungewöhnlich ist',
  },
  'weather.no-such-column': {
    says: '{path} ist {found}; das hat die Datei nicht, sie hat {allowed}',
    cure: 'schreiben Sie den Namen, wie er in der Kopfzeile steht, oder die Nummer der Spalte, gezählt ab 1',
  },
  'weather.repeated-name': {
    says: '{path} ist {found}, ein Name, den die Kopfzeile mehr als einmal enthält ({allowed})',
    cure: 'schreiben Sie stattdessen die Nummer der Spalte',
  },
  'weather.no-temperature': {
    says: 'keine Spalte für die Außentemperatur erkannt; die Datei hat {found}',
    cure: 'nennen Sie sie mit „columns: {temperature: …}“, mit ihrem Namen oder ihrer Nummer',
  },
  'weather.two-columns': {
    says: 'mehr als eine Spalte könnte {path} sein: {found}',
    cure: 'wählen Sie eine mit „columns: {{path}: …}“',
  },
  'weather.no-names': {
    says: 'die Datei hat keine Kopfzeile und mehrere Spalten mit Zahlen: {found}',
    cure: 'sagen Sie mit Nummern, welche welche ist, etwa „columns: {temperature: 2, relativeHumidity: 3}“',
  },
  'weather.column-holds-stamps': {
    says: 'hier sollte {path} stehen, aber die Spalte enthält Datum oder Uhrzeit wie {found}',
    cure: 'die Namen in der Kopfzeile scheinen vertauscht: Sagen Sie unter „columns“ mit Nummern, welche Spalte welche ist',
  },
  'weather.column-not-numbers': {
    says: 'hier sollte {path} stehen, aber die Spalte enthält Text wie {found}',
    cure: 'nennen Sie unter „columns“ eine andere Spalte, oder geben Sie „decimal“ an, wenn das Dezimalzeichen falsch erkannt wurde',
  },
  'weather.column-implausible': {
    says: 'die meisten Werte ({path}) sind unmöglich, etwa {found}; möglich ist {allowed}',
    cure: 'nennen Sie unter „columns“ eine andere Spalte, oder unter „units“ die Einheit',
  },
  'weather.unit-guessed': {
    says: '{path} wird als {unit} genommen: Die Kopfzeile nennt keine Einheit, und die Werte gehen {found}',
    cure: 'geben Sie sie unter „units“ an, um sicher zu sein',
  },
  'weather.wide-row': {
    says: 'diese Zeile hat {found} Zellen, die Kopfzeile oder die anderen Zeilen haben {allowed}',
    cure: 'ist das Komma hier ein Dezimalzeichen? Geben Sie „delimiter“ und „decimal“ an, oder setzen Sie solche Zellen in Anführungszeichen',
  },
  'weather.short-row': {
    says: 'diese Zeile hat {found} Zellen; die benutzten Spalten brauchen {allowed}',
    cure: 'vervollständigen Sie die Zeile, oder nehmen Sie sie heraus',
  },
  'weather.text-cell': {
    says: '{path} ist {found}; nötig ist eine Zahl',
    cure: 'berichtigen Sie die Zelle; bezeichnet dies einen fehlenden Wert, führen Sie es unter „missing“ auf',
  },
  'weather.impossible-value': {
    says: '{path} ist {found} {unit}; möglich ist {allowed}',
    cure: 'berichtigen Sie die Zelle; bezeichnet dies einen fehlenden Wert, führen Sie es unter „missing“ auf; oder prüfen Sie die Einheit',
  },
  'weather.stamp': {
    says: '{path} ist {found}; das ist kein Zeitstempel der Form {allowed}',
    cure: 'berichtigen Sie den Zeitstempel, oder geben Sie die Form aller Zeitstempel mit „stampFormat“ an',
  },
  'weather.day-month-order': {
    says: 'die Daten, etwa {found}, können Tag/Monat oder Monat/Tag sein, und nichts in der Datei entscheidet es',
    cure: 'geben Sie es mit „stampFormat“ an, etwa „dd/MM/yyyy HH:mm“ oder „MM/dd/yyyy HH:mm“',
  },
  'weather.stamp-format': {
    says: '{path} ist {found}; kein Zeitstempel der Datei hat diese Form, der erste ist {allowed}',
    cure: 'nehmen Sie Zeichen von luxon: yyyy Jahr, MM Monat, dd Tag, HH Stunde, mm Minute, ZZ Abstand zu UTC; Text in einfachen Anführungszeichen',
  },
  'weather.loose-format': {
    says: '{path} ist {found}: Es enthält zweimal einen Teil veränderlicher Länge, oder mehr als acht davon',
    cure: 'schreiben Sie zweistellige Teile als MM, dd, HH, mm und ss, und was immer dort steht, in einfachen Anführungszeichen',
  },
  'weather.unread-stamps': {
    says: '{path} scheint die Zeitstempel zu enthalten, aber {found} hat keine Form, die erkannt wird',
    cure: 'geben Sie die Form mit „stampFormat“ an, etwa „dd-MMM-yyyy HH:mm“',
  },
  'weather.some-offsets': {
    says: 'manche Zeitstempel haben einen Abstand zu UTC, andere wie {found} nicht',
    cure: 'schreiben Sie alle Zeitstempel mit ihrem Abstand, oder alle ohne',
  },
  'weather.row-count': {
    says: 'die Datei hat keine Zeitstempel und {found} Zeilen; ohne Zeitstempel ist ein ganzes Jahr von {allowed} Zeilen nötig',
    cure: 'nehmen Sie ein vollständiges Jahr, oder eine Datei mit Zeitstempeln; hat sie welche, nennen Sie deren Spalte unter „columns“',
  },
  'weather.several-stations': {
    says: 'die Datei enthält mehrere Stationen: {found}',
    cure: 'wählen Sie eine mit „station: {column: {path}, value: …}“',
  },
  'weather.no-such-station': {
    says: 'die Station {found} ist nicht in der Datei; sie hat {allowed}',
    cure: 'schreiben Sie unter „station“ den Wert, wie er in der Datei steht',
  },
  'weather.several-years': {
    says: 'die Datei enthält mehrere Jahre: {found}',
    cure: 'wählen Sie eines mit „year: …“',
  },
  'weather.no-such-year': {
    says: 'das Jahr {found} ist nicht in der Datei; sie hat {allowed}',
    cure: 'wählen Sie eines davon mit „year“',
  },
  'weather.coarse-step': {
    says: 'die Zeilen liegen {found} auseinander; nötig sind stündliche oder feinere Daten',
    cure: 'besorgen Sie stündliche Daten: Aus gröberen Mitteln lässt sich eine Wärmepumpe nicht beurteilen',
  },
  'weather.odd-step': {
    says: 'die Zeilen liegen {found} auseinander; das teilt die Stunde nicht in gleiche Teile',
    cure: 'nehmen Sie Daten in Schritten von 60, 30, 20, 15, 12, 10, 6, 5, 4, 3, 2 oder 1 Minuten',
  },
  'weather.off-step': {
    says: 'der Zeitstempel {found} ist aus dem Takt der anderen; sie liegen {allowed}',
    cure: 'berichtigen Sie den Zeitstempel',
  },
  'weather.clock-needs-zone': {
    says: 'die Zeitstempel zeigen Ortszeit, aber die Zeitzone des Ortes ist nicht bekannt',
    cure: 'geben Sie dem Ort seine Zeitzone („zone“), etwa Europe/Berlin',
  },
  'weather.unknown-zone': {
    says: '{found} ist keine Zeitzone der IANA-Liste',
    cure: 'schreiben Sie sie als Gebiet und Stadt, etwa Europe/Berlin oder America/New_York',
  },
  'weather.clock-needs-year': {
    says: 'die Zeitstempel zeigen Ortszeit, haben aber kein Jahr, an dem sich die Zeitumstellung ablesen ließe',
    cure: 'nehmen Sie „clock: standard“, wenn sie Normalzeit zeigen, oder eine Datei, deren Zeitstempel Jahre haben',
  },
  'weather.no-such-clock-time': {
    says: '{found} gibt es in {allowed} nicht: Die Uhr wird darüber hinweg vorgestellt',
    cure: 'berichtigen Sie den Zeitstempel; zeigt die Datei das ganze Jahr Normalzeit, geben Sie „clock: standard“ an',
  },
  'weather.duplicate': {
    says: '{found} steht hier mit anderen Werten als in Zeile {allowed}',
    cure: 'nehmen Sie eine der beiden Zeilen heraus',
  },
  'weather.repeated-row': {
    says: '{found} steht hier ein zweites Mal, mit denselben Werten wie in Zeile {allowed}; eine von beiden wird benutzt',
    cure: 'nehmen Sie eine der beiden Zeilen heraus',
  },
  'weather.disorder': {
    says: 'die Zeilen stehen nicht in der Reihenfolge der Zeit; die erste ist {found}; sie wurden sortiert',
    cure: 'prüfen Sie, ob die Zeitstempel stimmen',
  },
  'weather.absent-hours': {
    says: 'in der Datei fehlt {found}',
    cure: 'vervollständigen Sie die Datei, oder geben Sie „absentHours: fill“ an, um bis zu 6 Stunden am Stück zu interpolieren',
  },
  'weather.part-year': {
    says: 'die Datei enthält {found} eines Jahres; es fehlen: {allowed}',
    cure: 'nötig ist ein ganzes Jahr: Besorgen Sie den fehlenden Teil',
  },
  'weather.long-gap': {
    says: '{path} hat nach dieser Zeile keinen Wert für {found}; höchstens {allowed} am Stück werden interpoliert',
    cure: 'ergänzen Sie die Spalte von einer Nachbarstation, oder lassen Sie sie weg, wenn sie nicht gebraucht wird',
  },
  'weather.spike': {
    says: '{path} ist in dieser Stunde {found} {unit}, {allowed} weit weg von der Stunde davor und der danach',
    cure: 'prüfen Sie den Wert; er wurde benutzt, wie er ist',
  },
  'weather.looks-end-stamped': {
    says: 'die Zeitstempel gehen von {found}, als bezeichne jeder das Ende seines Zeitschritts; sie wurden als Anfang genommen',
    cure: 'entscheiden Sie es mit „stamps: end“ oder „stamps: begin“',
  },
  'weather.more': {
    says: '{found} weitere ({path}) sind nicht aufgeführt',
    cure: 'berichtigen Sie erst die aufgeführten; oft haben sie eine Ursache',
  },
};
