import type { batchProblems } from '../../../core/problems/batchProblems.ts';
import type { ProblemKind } from '../../../core/problems/catalogue.ts';

/** Problems of batches, in German. */
export const problemsOfBatch: Readonly<Record<keyof typeof batchProblems, ProblemKind>> = {
  'batch.nothing-varies': {
    says: 'der Plan hat weder axes noch homes, also ist nur ein Jahr zu rechnen',
    cure: 'ergänzen Sie axes oder homes, oder nehmen Sie „winterledger simulate“ für ein einzelnes Haus',
  },
  'batch.unknown-place': {
    says: '{path}: {found} ist keine Stelle eines Szenarios',
    cure: 'schreiben Sie die Schlüssel aus docs/formats.md mit Punkten dazwischen; bekannt sind hier: {allowed}',
  },
  'batch.not-a-single-value': {
    says: '{path}: {found} enthält {allowed}, keinen einzelnen Wert',
    cure: 'nennen Sie eine der Angaben darin, oder nehmen Sie eine Achse mit options',
  },
  'batch.repeated-name': {
    says: '{path} ist {found}; so heißt schon etwas davor',
    cure: 'geben Sie jedem einen eigenen Namen',
  },
  'batch.reserved-name': {
    says: '{path} ist {found}; so heißt eine Spalte jedes Ergebnisses',
    cure: 'geben Sie der Achse einen anderen Namen',
  },
  'batch.bad-range': {
    says: '{path}: {found}',
    cure: 'lassen Sie step vom ersten Wert zum letzten führen',
  },
  'batch.too-many-years': {
    says: 'der Plan ergibt {found} Jahre; ohne weitere Erlaubnis werden höchstens {allowed} gerechnet',
    cure: 'verändern Sie weniger, oder erlauben Sie mehr mit --limit {found}',
  },
  'batch.no-name-column': {
    says: 'die Tabelle der Häuser hat keine Spalte {found}; ihre Spalten sind {allowed}',
    cure: 'nennen Sie die Spalte mit den Namen der Häuser so, oder nennen Sie sie im Plan als nameColumn',
  },
  'batch.unknown-column': {
    says: 'die Spalte {found} ist keine Stelle eines Szenarios',
    cure: 'nennen Sie sie wie in docs/formats.md, etwa house.heatLoss.value, oder nehmen Sie sie heraus; bekannt sind hier: {allowed}',
  },
  'batch.column-not-single': {
    says: 'die Spalte {found} enthält {allowed}, keinen einzelnen Wert',
    cure: 'nennen Sie eine der Angaben darin, jede in einer eigenen Spalte',
  },
  'batch.repeated-column': { says: 'die Spalte {found} steht zweimal da', cure: 'behalten Sie eine von beiden' },
  'batch.no-homes': {
    says: 'die Tabelle enthält keine Häuser',
    cure: 'schreiben Sie unter die Namen der Spalten eine Zeile je Haus',
  },
  'batch.row-length': {
    says: 'Zellen in dieser Zeile: {found}; Namen von Spalten: {allowed}',
    cure: 'suchen Sie ein überzähliges Trennzeichen, oder setzen Sie einen Text, der eines enthält, in Anführungszeichen',
  },
  'batch.open-quote': {
    says: 'in dieser Zeile beginnt ein Text in Anführungszeichen und endet nicht innerhalb von {allowed}',
    cure: 'schließen Sie die Anführungszeichen, oder verdoppeln Sie das Zeichen, wo es zum Text gehört',
  },
  'batch.worker-failed': {
    says: 'dieses Jahr ließ sich nicht rechnen: {found}',
    cure: 'rechnen Sie sein Szenario allein mit „winterledger simulate“; bei wenig Speicher nehmen Sie weniger --workers',
  },
  'batch.folder-busy': {
    says: 'ein anderer Lauf ({found}) schreibt in diesen Ordner',
    cure: 'warten Sie auf ihn, oder nennen Sie einen anderen Ordner; gibt es keinen solchen Lauf mehr, löschen Sie {path}',
  },
  'batch.other-run': {
    says: 'in diesem Ordner liegen {allowed} eines anderen Laufs: {found}',
    cure: 'nennen Sie mit --out einen anderen Ordner, oder leeren Sie diesen',
  },
  'batch.foreign-file': {
    says: 'im Ordner liegt eine Datei {found}, die kein Stapel geschrieben hat',
    cure: 'nennen Sie mit --out einen anderen Ordner',
  },
  'batch.homes-changed': {
    says: 'die Tabelle der Häuser wurde geändert, während gerechnet wurde',
    cure: 'leeren Sie den Ordner der Ergebnisse, und beginnen Sie neu',
  },
  'batch.no-results': {
    says: 'im Ordner liegen keine fertigen Ergebnisse eines Stapels',
    cure: 'nennen Sie den Ordner, den „winterledger batch --out“ oder „winterledger gather --out“ fertiggestellt hat',
  },
  'batch.results-differ': {
    says: 'diese Ergebnisse sind nicht das, was ihr Verzeichnis (manifest.json) sagt: {found}',
    cure: 'den Ordner nehmen, wie er geschrieben wurde, oder die Reihe noch einmal in einen leeren rechnen',
  },
  'batch.parts-differ': {
    says: 'dieser Teil gehört nicht zum ersten: {found}',
    cure: 'fügen Sie Teile eines Plans zusammen, gerechnet mit denselben Dateien und derselben Version',
  },
  'batch.part-twice': { says: 'Teil {found} ist schon da', cure: 'nennen Sie jeden Teil einmal' },
  'batch.not-a-part': {
    says: 'diese Ergebnisse sind schon vollständig, kein Teil eines Stapels',
    cure: 'fügen Sie Ordner zusammen, die mit --shard entstanden sind',
  },
  'batch.part-missing': {
    says: 'Teil {found} fehlt: die Jahre {allowed}',
    cure: 'rechnen Sie ihn mit --shard {found}, und fügen Sie noch einmal zusammen',
  },
};
