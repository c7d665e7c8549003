import type { ProblemKind } from '../../../core/problems/catalogue.ts';
import type { fileProblems } from '../../../core/problems/fileProblems.ts';
import type { hourProblems } from '../../../core/problems/hourProblems.ts';
import type { reportProblems } from '../../../core/problems/reportProblems.ts';

type Codes = keyof typeof fileProblems | keyof typeof hourProblems | keyof typeof reportProblems;

/** Problems of files as such, of an hour that is asked for, and of reports, in German. */
export const problemsOfFiles: Readonly<Record<Codes, ProblemKind>> = {
  'file.missing': {
    says: 'diese Datei gibt es nicht',
    cure: 'prüfen Sie den Namen; Namen in einem Szenario zählen von seinem Ordner aus',
  },
  'file.unreadable': {
    says: 'die Datei lässt sich nicht lesen: {found}',
    cure: 'prüfen Sie die Zugriffsrechte, oder nennen Sie eine andere Datei',
  },
  'file.not-a-file': { says: 'dies ist {found}, keine Datei', cure: 'nennen Sie eine gewöhnliche Datei' },
  'file.too-large': {
    says: 'die Datei hat {found}; höchstens {allowed} werden gelesen',
    cure: 'kürzen Sie sie auf das gewünschte Jahr',
  },
  'file.empty': { says: 'die Datei ist leer', cure: 'nennen Sie die Datei, in der die Daten stehen' },
  'file.unwritable': {
    says: 'die Datei lässt sich nicht schreiben: {found}',
    cure: 'wählen Sie einen Ordner, den es gibt und in den geschrieben werden darf',
  },
  'file.output-is-folder': {
    says: 'hierhin lässt sich kein Ergebnis schreiben: Dies ist ein Ordner',
    cure: 'nennen Sie eine Datei darin, etwa {path}',
  },
  'file.output-is-input': {
    says: 'das Ergebnis würde diese Datei überschreiben, die als Eingabe gelesen wird',
    cure: 'wählen Sie einen anderen Namen für das Ergebnis',
  },
  'file.output-twice': {
    says: 'zwei Ergebnisse würden in dieselbe Datei geschrieben',
    cure: 'geben Sie jedem Ergebnis einen eigenen Namen',
  },

  'hour.unreadable': {
    says: '„{found}“ ist kein Datum mit einer Uhrzeit, die es gibt',
    cure: 'schreiben Sie es wie 2025-01-14T06:00, mit einem Abstand zu UTC wie +01:00 dahinter, wo es nicht Ortszeit ist',
  },
  'hour.twice': {
    says: '{found} gibt es an diesem Tag zweimal, weil die Uhr zurückgestellt wird',
    cure: 'schreiben Sie {allowed}',
  },
  'hour.skipped': {
    says: '{found} gibt es nicht: Die Uhr wird darüber hinweg vorgestellt',
    cure: 'die Stunde danach ist {allowed}',
  },
  'hour.other-year': {
    says: '{found} liegt nicht im Kalenderjahr des Szenarios, {allowed}',
    cure: 'schreiben Sie eine Zeit dieses Jahres, oder ein anderes site.calendarYear ins Szenario',
  },
  'hour.not-simulated': {
    says: '{found} gehört nicht zu den gerechneten Stunden, {allowed}',
    cure: 'wählen Sie eine von diesen',
  },

  'report.no-data': {
    says: 'dies ist kein Bericht über ein Haus von Winterledger: Er enthält dessen Daten nicht',
    cure: 'nennen Sie den Bericht eines Szenarios, so wie „winterledger report“ ihn geschrieben hat; der Bericht eines Stapels entsteht neu aus seinem Ordner',
  },
  'report.broken-data': {
    says: 'die Daten in diesem Bericht sind nicht die eines Berichts',
    cure: 'nehmen Sie die Datei, wie sie geschrieben wurde; von Hand oder von einer anderen Version geändert, lässt sie sich nicht prüfen',
  },
  'report.no-browser': {
    says: 'es wurde kein Chromium gefunden, das den Bericht als PDF drucken könnte',
    cure: 'installieren Sie Chromium oder Chrome, oder nennen Sie sein Programm in der Variablen CHROMIUM; den HTML-Bericht druckt jeder Browser',
  },
  'report.browser-failed': {
    says: 'der Browser {path} hat den Bericht nicht gedruckt: {found}',
    cure: 'nennen Sie in der Variablen CHROMIUM ein anderes Chromium, oder drucken Sie den HTML-Bericht aus irgendeinem Browser',
  },
};
