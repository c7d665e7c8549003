import type { ProblemKind } from '../../../core/problems/catalogue.ts';
import type { readingProblems } from '../../../core/problems/readingProblems.ts';

/** Problems of meter readings, in German. */
export const problemsOfReadings: Readonly<Record<keyof typeof readingProblems, ProblemKind>> = {
  'readings.no-rows': {
    says: 'es wurden keine Zählerstände gefunden',
    cure: 'schreiben Sie eine Zeile mit Namen, etwa „Datum;Zählerstand kWh“, und darunter je Ablesung eine Zeile',
  },
  'readings.long-line': {
    says: 'diese Zeile hat {found} Zeichen; höchstens {allowed} werden gelesen',
    cure: 'dies ist keine Tabelle mit einer Ablesung je Zeile: Exportieren Sie die Daten noch einmal als CSV-Text',
  },
  'readings.too-many-lines': {
    says: 'die Datei hat {found} Zeilen; höchstens {allowed} werden gelesen',
    cure: 'eine Ablesung am Tag genügt; kürzen Sie die Datei auf die letzten Jahre',
  },
  'readings.no-names': {
    says: 'in der ersten Zeile steht {found}, wo die Namen der Spalten stehen sollten',
    cure: 'schreiben Sie darüber eine Zeile mit Namen, etwa „Datum;Zählerstand kWh“',
  },
  'readings.no-column': {
    says: 'keine Spalte für {path} erkannt; in der ersten Zeile steht {found}',
    cure: 'nennen Sie sie in der ersten Zeile: „Datum“, und „Zählerstand“, „Verbrauch“ (seit dem Datum davor) oder „Füllung“ (eines Tanks)',
  },
  'readings.two-columns': {
    says: 'mehr als eine Spalte könnte {path} sein: {found}',
    cure: 'behalten Sie eine davon, oder geben Sie den anderen einen anderen Namen',
  },
  'readings.no-unit': {
    says: '{path} nennt keine Einheit, und das Szenario gibt keine Energie je Einheit an',
    cure: 'schreiben Sie die Einheit in den Namen der Spalte, etwa „Zählerstand kWh“ oder „Zählerstand m³“, oder geben Sie readings.kWhPerUnit im Szenario an',
  },
  'readings.needs-factor': {
    says: '{path} ist in {found}, aber die Energie von einem {found} ist nicht bekannt',
    cure: 'geben Sie readings.kWhPerUnit im Szenario an: bei Gas den Brennwert der Abrechnung (mit Zustandszahl), bei Heizöl etwa 10 kWh je Liter',
  },
  'readings.two-units': {
    says: '{path} ist in {found}, aber readings.kWhPerUnit ist {allowed}',
    cure: 'nehmen Sie readings.kWhPerUnit aus dem Szenario, oder berichtigen Sie die Einheit im Namen der Spalte',
  },
  'readings.no-efficiency': {
    says: 'der Nutzungsgrad, mit dem die gezählte Energie zu Wärme wurde, ist nicht bekannt',
    cure: 'geben Sie readings.efficiency im Szenario an, etwa 0.85 für einen alten Brennwertkessel auf den Brennwert bezogen, oder beschreiben Sie dessen Kessel',
  },
  'readings.date': {
    says: 'das Datum ist {found}; ein Datum schreibt man {allowed}',
    cure: 'berichtigen Sie das Datum',
  },
  'readings.day-month-order': {
    says: 'die Daten, etwa {found}, können Tag/Monat oder Monat/Tag sein, und nichts in der Datei entscheidet es',
    cure: 'schreiben Sie sie als Jahr-Monat-Tag, etwa 2024-03-31, oder als Tag.Monat.Jahr, etwa 31.3.2024',
  },
  'readings.disorder': {
    says: 'das Datum {found} kommt nach {allowed}, das in der Zeile davor steht',
    cure: 'ordnen Sie die Ablesungen nach ihrem Datum',
  },
  'readings.same-day': {
    says: '{found} steht hier ein zweites Mal; zuerst in Zeile {allowed}',
    cure: 'behalten Sie eines von beiden, oder zählen Sie Füllungen eines Tages zusammen; einen neuen Zähler bezeichnet eine Spalte „Wechsel“',
  },
  'readings.value': {
    says: '{path} ist {found}; {allowed}',
    cure: 'berichtigen Sie die Zelle; wo nicht abgelesen wurde, nehmen Sie die Zeile heraus',
  },
  'readings.decimal': {
    says: 'die Werte, etwa {found}, können Tausender sein oder drei Nachkommastellen haben, und nichts in der Datei entscheidet es',
    cure: 'schreiben Sie sie ohne Tausenderzeichen, oder geben Sie readings.decimal im Szenario an',
  },
  'readings.mark': {
    says: '{path} ist {found}; {allowed}',
    cure: 'schreiben Sie x, wo es zutrifft, und nichts, wo nicht',
  },
  'readings.falls': {
    says: 'der Zählerstand fällt auf {found}, von {allowed}',
    cure: 'berichtigen Sie den Schreibfehler; bei einem Zählerwechsel schreiben Sie den letzten Stand des alten und den ersten des neuen in zwei Zeilen, und kennzeichnen Sie die zweite in einer Spalte „Wechsel“',
  },
  'readings.more': {
    says: '{found} weitere Fehler sind nicht aufgeführt',
    cure: 'berichtigen Sie erst die aufgeführten',
  },

  'readings.weather-undated': {
    says: 'die Zeitstempel haben kein Jahr, also ist nicht bekannt, von wann dieses Wetter ist',
    cure: 'nennen Sie unter readings.weather im Szenario das Wetter, das gemessen wurde, während der Zähler lief; ein typisches Jahr taugt dafür nicht',
  },
  'readings.weather-typical': {
    says: 'die Datei setzt Monate aus {found} verschiedenen Jahren zusammen: ein typisches Jahr, nicht das Wetter der Ablesungen',
    cure: 'nennen Sie unter readings.weather im Szenario das Wetter, das gemessen wurde, während der Zähler lief',
  },
  'readings.weather-twice': {
    says: '{found} steht hier mit einem anderen Wert als in Zeile {allowed}',
    cure: 'nehmen Sie eine der beiden Zeilen heraus',
  },
  'readings.weather-missing': {
    says: 'das Wetter enthält {found} nicht; es enthält {allowed}',
    cure: 'nennen Sie unter readings.weather im Szenario das Wetter, das gemessen wurde, während der Zähler lief; mehrere Dateien und Teile von Jahren sind erlaubt, ein typisches Jahr taugt nicht',
  },

  'readings.too-few-periods': {
    says: '{found} zwischen Ablesungen; unter {allowed} lässt sich nichts sagen',
    cure: 'lesen Sie ein Jahr lang ab, einmal im Monat',
  },
  'readings.no-cold-days': {
    says: 'kein Zeitraum hat einen Tag unter {allowed}: Es gab keine Heizung, die zu messen wäre',
    cure: 'ergänzen Sie Ablesungen eines Winters',
  },
  'readings.alike': {
    says: 'die Zeiträume gleichen sich zu sehr: Wärmeverlust und Heizgrenze lassen sich nicht trennen',
    cure: 'ergänzen Sie Ablesungen anderer Jahreszeiten: tiefer Winter, Frühling und Sommer',
  },
  'readings.no-slope': {
    says: 'der Verbrauch steigt nicht, wenn es kälter wird: {found} {unit} je Gradtag',
    cure: 'prüfen Sie, ob dieser Zähler die Heizung zählt, die Daten, und ob das Wetter das von Ort und Zeit ist',
  },

  'readings.few-periods': {
    says: '{found} zwischen Ablesungen sind wenig; ein Jahr mit monatlichen Ablesungen ergibt {allowed}',
    cure: 'nehmen Sie die Spanne ernst, und lesen Sie den Zähler weiter ab',
  },
  'readings.few-heated': {
    says: 'nur {found} mit Heizung; erst drei oder mehr zeigen die Steigung',
    cure: 'ergänzen Sie Ablesungen der Heizzeit',
  },
  'readings.no-summer': {
    says: 'kein Zeitraum liegt außerhalb der Heizzeit: Warmwasser und Heizgrenze ruhen allein auf der Linie',
    cure: 'ergänzen Sie Ablesungen eines Sommers',
  },
  'readings.poor-line': {
    says: 'R² ist {found}; verlangt ist mindestens {allowed}: Der Verbrauch folgt der Außentemperatur nicht',
    cure: 'suchen Sie eine andere Wärmequelle (Ofen, Strom), Abwesenheit, zeitweise beheizte Räume, Arbeiten an Haus oder Kessel, falsche Daten oder Wetter eines anderen Ortes',
  },
  'readings.scatter': {
    says: 'CV(RMSE) ist {found}; verlangt ist höchstens {allowed}: Die Zeiträume streuen weit um die Linie',
    cure: 'sehen Sie sich die Zeiträume mit der größten Abweichung an: geschätzte Stände, Abwesenheit, eine andere Wärmequelle, Arbeiten an Haus oder Kessel',
  },
  'readings.base-at-end': {
    says: 'die Heizgrenze ist {found}, ein Ende des Bereichs, in dem gesucht wird ({allowed})',
    cure: 'die Linie hat keinen Knick, wo ein Haus einen hat: Suchen Sie geschätzte Stände, Sommerverbrauch, der kein Warmwasser ist, oder einen Zähler, der auch anderes zählt',
  },
  'readings.implausible-loss': {
    says: 'der Wärmeverlust ergibt {found} {unit}; Häuser liegen in {allowed}',
    cure: 'prüfen Sie Einheit und Energie der Ablesungen und die Wohnfläche',
  },
};
