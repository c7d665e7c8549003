import type { ProblemKind } from '../../../core/problems/catalogue.ts';
import type { tariffProblems } from '../../../core/problems/tariffProblems.ts';

/** Problems of tariff files, series of values over time and civil time, in German. */
export const problemsOfTariffs: Readonly<Record<keyof typeof tariffProblems, ProblemKind>> = {
  'clock.unknown-zone': {
    says: '{path} ist {found}; das ist keine Zeitzone der IANA-Liste',
    cure: 'schreiben Sie sie als Gebiet und Stadt, etwa Europe/Berlin oder America/New_York',
  },
  'clock.calendar-year': {
    says: '{path} ist {found}; erlaubt ist {allowed}',
    cure: 'schreiben Sie das Jahr, dessen Wochentage und Zeitumstellung gelten sollen',
  },
  'clock.common-year': {
    says: 'das Wetter hat {found} Stunden, aber {path} ist ein Jahr ohne 29. Februar',
    cure: 'wählen Sie ein Schaltjahr für den Kalender, oder eine Wetterdatei mit 8760 Stunden',
  },
  'clock.hours': {
    says: 'das Wetter hat {found} Stunden; ein Jahr hat {allowed}',
    cure: 'nennen Sie eine Wetterdatei, die ein ganzes Jahr enthält',
  },
  'tariff.none': {
    says: 'es ist kein Tarif genannt, weder im Szenario noch daneben',
    cure: 'nennen Sie Tarifdateien hinter dem Szenario, oder darin unter tariffs',
  },
  'tariff.no-price': {
    says: 'dieser Tarif hat keinen Preis für Strom',
    cure: 'geben Sie Preisstufen, eine Preisreihe oder Mengenstufen an',
  },
  'tariff.time-of-day': {
    says: '{path} ist {found}; das ist keine Uhrzeit',
    cure: 'schreiben Sie Stunden und Minuten in Anführungszeichen, von 00:00 bis 23:59; ein Ende darf 24:00 sein',
  },
  'tariff.no-such-date': {
    says: '{path} ist {found}, ein Datum, das es nicht gibt',
    cure: 'schreiben Sie YYYY-MM-DD, oder MM-DD für jedes Jahr',
  },
  'tariff.rate-without-time': {
    says: '{path} ist {found}, dasselbe wie der Beginn',
    cure: 'lassen Sie für den ganzen Tag beide Zeiten weg',
  },
  'tariff.unpriced': {
    says: 'keine Preisstufe gilt für {found}',
    cure: 'setzen Sie an das Ende der Liste eine Preisstufe ohne Zeiten und Tage: Sie nimmt alles, was übrig ist',
  },
  'tariff.rate-never-used': {
    says: '{path} ({found}) gilt das ganze Jahr nie: Andere Preisstufen kommen zuerst, oder ihre Tage gibt es nicht',
    cure: 'setzen Sie sie weiter nach oben, ändern Sie ihre Zeiten oder Tage, oder nehmen Sie sie heraus',
  },
  'tariff.no-holidays': {
    says: '{path} ist {found}, aber es ist kein Feiertag aufgeführt',
    cure: 'führen Sie die Tage unter „holidays“ auf',
  },
  'tariff.holidays-of-other-years': {
    says: 'keiner der Feiertage mit Jahr liegt im Kalenderjahr {allowed}; der erste ist {found}',
    cure: 'führen Sie die Tage dieses Jahres auf, oder schreiben Sie MM-DD für Tage, die jedes Jahr wiederkehren',
  },
  'tariff.block-order': {
    says: '{path} ist {found}; erlaubt ist {allowed}',
    cure: 'lassen Sie „upTo“ von Stufe zu Stufe steigen, und lassen Sie es nur bei der letzten weg',
  },
  'tariff.series-unread': {
    says: 'die Preisreihe {found} ließ sich nicht verwenden, also hat dieser Tarif keine Preise',
    cure: 'berichtigen Sie erst die Fehler der Reihe',
  },
  'series.long-line': {
    says: 'diese Zeile hat {found} Zeichen; höchstens {allowed} werden gelesen',
    cure: 'dies ist keine Tabelle mit einem Wert je Zeile: Exportieren Sie die Daten noch einmal als CSV-Text',
  },
  'series.too-many-lines': {
    says: 'die Datei hat {found} Zeilen; höchstens {allowed} werden gelesen',
    cure: 'kürzen Sie die Datei auf das Kalenderjahr des Szenarios',
  },
  'series.quotes': {
    says: 'ein Anführungszeichen ist nicht geschlossen oder steht an der falschen Stelle',
    cure: 'setzen Sie Anführungszeichen an beide Enden einer Zelle, oder an keines',
  },
  'series.column': {
    says: 'die Spalte {found} aus {path} ist nicht da; die Datei hat {allowed}',
    cure: 'nennen Sie die Spalten: timeColumn und {unit}',
  },
  'series.empty': {
    says: 'die Datei hat {found}; nötig sind mindestens {allowed}',
    cure: 'jede Zeile enthält einen Zeitstempel und einen Wert',
  },
  'series.stamp': {
    says: '{found} ist kein Zeitstempel; erlaubt ist {allowed}',
    cure: 'geben Sie jedem Zeitstempel seinen Abstand zu UTC, oder sagen Sie mit „stamps“, dass sie „utc“ oder „local“ sind',
  },
  'series.no-such-time': {
    says: '{found} gibt es in {allowed} nicht: Die Uhr wurde darüber hinweg vorgestellt',
    cure: 'nehmen Sie die Zeile heraus, oder schreiben Sie die Zeitstempel mit ihrem Abstand zu UTC',
  },
  'series.value': {
    says: '{found} ist kein Wert ({unit}); erlaubt ist {allowed}',
    cure: 'schreiben Sie eine einfache Zahl, etwa 0.2415; jeder Zeitstempel braucht eine',
  },
  'series.decimal': {
    says: 'das Komma in {found} kann Dezimalen oder Tausender trennen',
    cure: 'sagen Sie mit „decimal“, dass es „comma“ oder „point“ ist, und schreiben Sie keine Tausenderzeichen',
  },
  'series.step': {
    says: '{unit} liegen {found} auseinander; erlaubt ist {allowed}',
    cure: 'nehmen Sie {unit} je Stunde oder feiner, in Zeitschritten von ganzen Minuten',
  },
  'series.gap': {
    says: 'vor {found} fehlen {unit}: {allowed}',
    cure: 'vervollständigen Sie die Datei; bei Ortszeit auch die Stunde, die es im Herbst zweimal gibt',
  },
  'series.repeat': {
    says: '{found} kommt ein zweites Mal vor',
    cure: 'lassen Sie je Zeitstempel nur eine Angabe ({unit}) stehen',
  },
  'series.disorder': {
    says: '{found} steht nach einem späteren Zeitstempel',
    cure: 'sortieren Sie die Zeilen nach der Zeit',
  },
  'series.irregular': {
    says: '{found} ist aus dem Takt; {unit} liegen {allowed} auseinander',
    cure: 'behalten Sie in der ganzen Datei einen Zeitschritt bei',
  },
  'series.more': {
    says: 'in dieser Datei sind {found} weitere Fehler',
    cure: 'berichtigen Sie erst die darüber; oft haben sie eine Ursache',
  },
  'series.short': {
    says: 'die Reihe ({unit}) reicht nicht bis {found}',
    cure: 'nehmen Sie eine Reihe, die das ganze Kalenderjahr des Szenarios enthält',
  },
  'series.of-other-year': {
    says: 'für {found} Stunden wurde die Angabe ({unit}) eines Jahres davor oder danach genommen; die Reihe enthält {allowed}',
    cure: 'nehmen Sie eine Reihe des Kalenderjahrs des Szenarios, oder stellen Sie das Kalenderjahr auf das der Reihe',
  },
  'tariff.supplier-order': {
    says: '{path} ist {found}; erlaubt ist {allowed}',
    cure: 'führen Sie die Lieferanten in der Reihenfolge des Jahres auf, den ersten ohne Datum',
  },
  'tariff.supplier-currency': {
    says: 'die Währung ist {found}, die des Lieferanten davor {allowed}',
    cure: 'geben Sie beide Tarife in einer Währung an',
  },
};
