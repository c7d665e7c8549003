import type { ProblemKind } from '../../../core/problems/catalogue.ts';
import type { scenarioProblems } from '../../../core/problems/scenarioProblems.ts';

/** Problems of structured files, in German. */
export const problemsOfScenarios: Readonly<Record<keyof typeof scenarioProblems, ProblemKind>> = {
  'yaml.not-text': {
    says: 'dies ist keine Textdatei',
    cure: 'nennen Sie eine Textdatei; eine Tabellenkalkulation oder ein Dokument muss erst exportiert werden',
  },
  'yaml.syntax': {
    says: 'hier ist die Datei nicht zu verstehen: {found}',
    cure: 'sehen Sie sich diese Zeile und die darüber an',
  },
  'yaml.too-deep': {
    says: 'Abschnitte stecken ineinander, {found}',
    cure: 'schließen Sie die Klammern, oder rücken Sie weniger ein',
  },
  'yaml.tag': {
    says: '„{found}“ hat hier keine Bedeutung',
    cure: 'nehmen Sie es heraus, oder setzen Sie den Text in Anführungszeichen',
  },
  'yaml.alias': {
    says: '„{found}“ geht hier nicht: Ein Verweis folgt seinem Anker (&name), enthält sich nicht selbst, und es gibt nur wenige',
    cure: 'schreiben Sie die Werte aus',
  },
  'yaml.several-documents': {
    says: 'hier beginnt ein zweites Dokument; eine Datei enthält eines',
    cure: 'nehmen Sie die Zeile --- heraus, oder legen Sie den zweiten Teil in eine eigene Datei',
  },
  'yaml.no-keys': {
    says: 'die Datei enthält {found}; sie muss Schlüssel mit Werten enthalten',
    cure: 'beginnen Sie mit einer Zeile wie „name: Mein Haus“',
  },
  'yaml.key-not-a-word': {
    says: 'ein Schlüssel muss ein Wort sein',
    cure: 'schreiben Sie ein Wort, einen Doppelpunkt und ein Leerzeichen',
  },
  'yaml.repeated-key': { says: '{path} steht zweimal da; zuerst in {found}', cure: 'behalten Sie eines von beiden' },
  'entry.missing': { says: '{path} fehlt; {allowed}', cure: 'ergänzen Sie es' },
  'entry.empty': {
    says: '{path} hat keinen Wert; {allowed}',
    cure: 'schreiben Sie einen Wert, oder nehmen Sie die Zeile heraus',
  },
  'entry.unknown-key': { says: '{path} ist hier nicht bekannt', cure: 'bekannt sind hier: {allowed}' },
  'entry.wrong-kind': { says: '{path} ist {found}; {allowed}', cure: 'schreiben Sie es in dieser Form' },
  'entry.out-of-range': { says: '{path} ist {found}; {allowed}', cure: 'prüfen Sie den Wert und seine Einheit' },
  'entry.not-a-choice': { says: '{path} ist {found}; {allowed}', cure: 'schreiben Sie eines dieser Wörter' },
  'entry.wrong-form': { says: '{path} ist {found}; {allowed}', cure: 'schreiben Sie es in dieser Form' },
  'entry.wrong-length': {
    says: '{path} hat {found}; {allowed}',
    cure: 'ergänzen Sie, was fehlt, oder nehmen Sie heraus, was zu viel ist',
  },
  'scenario.hygiene-below-set-point': {
    says: '{path} ist {found}, der Sollwert ist {allowed}: Der wöchentliche Lauf geht bis zum Sollwert und nicht weiter',
    cure: 'tragen Sie die Temperatur ein, die der Hygienelauf erreicht, oder lassen Sie den Lauf weg',
  },
  'scenario.contradiction': { says: '{path} ist {found}; {allowed}', cure: 'berichtigen Sie eines von beiden' },
  'scenario.points-not-rising': {
    says: '{path} liegt bei {found}, nicht über dem Punkt davor bei {allowed}',
    cure: 'schreiben Sie die Punkte von der tiefsten zur höchsten Temperatur, jede Temperatur einmal',
  },
  'scenario.no-heat-loss': {
    says: '{path} ergibt {found}; ein Haus verliert Wärme',
    cure: 'prüfen Sie die Wärmebrücken unter null',
  },
  'scenario.needs-floor-area': {
    says: '{path} rechnet mit Speichermasse und braucht die Wohnfläche',
    cure: 'ergänzen Sie floorArea beim Haus; seine Masse wird danach gezählt',
  },
  'scenario.loss-shares': {
    says: '{path}: Fenster, Bauteile und Lüftung ergeben zusammen {found}, nicht 1',
    cure: 'schreiben Sie die Anteile so, dass ihre Summe 1 ist',
  },
  'scenario.base-and-gains': {
    says: '{path} ist {found}, aber es ist eine Heizgrenze (baseTemperature) eingetragen, die die Gewinne schon enthält',
    cure: 'nehmen Sie baseTemperature heraus, oder die Gewinne',
  },
  'scenario.set-back-needs-mass': {
    says: '{path} ändert die Raumtemperatur innerhalb eines Tages; Gradstunden kennen keine Speichermasse und würden die Stromersparnis mehr als doppelt so hoch ansetzen',
    cure: 'schreiben Sie dafür „model: lumped“, mit den Regeln unter schedule; Gradstunden nehmen ganze Tage, unter days',
  },
  'scenario.empty-window': {
    says: '{path} ist {found}, dasselbe wie sein Beginn',
    cure: 'lassen Sie für den ganzen Tag beide weg',
  },
  'scenario.half-a-period': {
    says: '{path} fehlt neben dem anderen Ende',
    cure: 'geben Sie beide Tage an, oder keinen',
  },
  'scenario.no-such-date': {
    says: '{path} ist {found}, ein Tag, den es nicht gibt',
    cure: 'berichtigen Sie das Datum',
  },
  'scenario.mixed-dates': {
    says: '{path} ist {found}, aber der Zeitraum beginnt am {allowed}',
    cure: 'schreiben Sie das Jahr in beide Tage, oder für jedes Jahr in keinen',
  },
  'scenario.ends-before': {
    says: '{path} ist {found}, vor dem Beginn am {allowed}',
    cure: 'tauschen Sie die beiden Tage, oder lassen Sie für einen Zeitraum über Neujahr die Jahre weg',
  },
  'scenario.other-year': {
    says: '{path} ist {found}, aber das Kalenderjahr ist {allowed}: Die Regel gilt nie',
    cure: 'lassen Sie das Jahr weg, oder schreiben Sie das des Kalenders',
  },
  'scenario.rule-set-point': {
    says: '{path} hat {found}; eine Regel hat eines von beiden',
    cure: 'geben Sie setPoint für eine Temperatur an, oder raise für einen Unterschied',
  },
  'scenario.rate-needs-tariff': {
    says: '{path} folgt der Preisstufe eines Tarifs, aber es ist kein Tarif genannt',
    cure: 'nennen Sie unter tariffs eine Tarifdatei; die erste zählt',
  },
  'scenario.no-such-rate': {
    says: '{path} ist {found}; der erste Tarif hat {allowed}',
    cure: 'schreiben Sie den Namen einer seiner Preisstufen',
  },
  'scenario.cheapest-needs-tariff': {
    says: '{path} vergleicht Strom mit Brennstoff, aber es ist kein Tarif genannt',
    cure: 'nennen Sie unter tariffs eine Tarifdatei; die erste zählt',
  },
  'scenario.cheapest-needs-price': {
    says: '{path} vergleicht Preise Stunde für Stunde, aber der Tarif {found} hat nur Mengenstufen',
    cure: 'stellen Sie einen Tarif mit Preisstufen oder einer Preisreihe voran',
  },
  'scenario.no-shares': {
    says: '{path} sind alle null',
    cure: 'schreiben Sie, was in jeder Stunde gezapft wird, oder lassen Sie die Anteile weg',
  },
  'scenario.weekend-alone': {
    says: '{path} steht ohne die Anteile der anderen Tage',
    cure: 'geben Sie auch shares an, im selben Maßstab',
  },
  'scenario.boiler-needs-tariff': {
    says: '{path} ist Strom ohne Preis, der über den Tarif des Haushalts läuft, aber es ist kein Tarif genannt',
    cure: 'nennen Sie unter tariffs eine Tarifdatei, oder geben Sie dem Strom einen eigenen Preis',
  },
  'scenario.cylinder-without-hot-water': {
    says: '{path} ist {found} kWh im Jahr, aber es ist kein Warmwasser eingetragen',
    cure: 'tragen Sie hotWater ein, damit beide Seiten es heizen, oder nehmen Sie den Verlust heraus',
  },
  'scenario.carbon-needs-tariff': {
    says: '{path} gehen nach den Preisstufen eines Tarifs, aber es ist kein Tarif genannt',
    cure: 'nennen Sie unter tariffs eine Tarifdatei; die erste zählt',
  },
  'scenario.carbon-no-such-rate': {
    says: '{path} ist {found}; der erste Tarif hat {allowed}',
    cure: 'schreiben Sie den Namen einer seiner Preisstufen',
  },
  'scenario.carbon-rate-twice': {
    says: '{path} ist {found}; diese Preisstufe hat schon einen Faktor',
    cure: 'behalten Sie einen Faktor je Preisstufe',
  },
  'scenario.carbon-rate-missing': {
    says: 'in {path} fehlt die Preisstufe {found} des ersten Tarifs',
    cure: 'geben Sie jeder Preisstufe des ersten Tarifs ihren Faktor',
  },
  'scenario.whole-life-needs-boiler': {
    says: '{path} vergleicht Wärmepumpe und Kessel über die Jahre, aber es ist kein Kessel eingetragen',
    cure: 'tragen Sie den Kessel ein, oder nehmen Sie den Abschnitt heraus',
  },
  'scenario.whole-life-needs-tariff': {
    says: '{path} braucht die Kosten eines Jahres, aber es ist kein Tarif genannt',
    cure: 'nennen Sie unter tariffs eine Tarifdatei; die erste zählt',
  },
  'scenario.taxes-differ': {
    says: 'die Preise dieses Tarifs {found}; die des ersten Tarifs {allowed}: Ihre Rechnungen sind nicht vergleichbar',
    cure: 'geben Sie alle Tarife auf eine Art an; verglichen werden nur gleich angegebene',
  },
  'scenario.taxes-mixed': {
    says: 'die Preise dieses Tarifs {found}: Seine Rechnung ist mit keiner vergleichbar',
    cure: 'geben Sie die Tarife aller Lieferanten auf eine Art an',
  },
  'scenario.frozen-water': {
    says: '{path} ist {found}, mehr als das Mittel des Kaltwassers: Es würde gefrieren',
    cure: 'schreiben Sie den halben Unterschied zwischen kältestem und wärmstem Wasser',
  },
  'scenario.sun-without-radiation': {
    says: '{path} ist {found} m², aber die Wetterdatei {allowed} enthält keine Strahlung',
    cure: 'nennen Sie eine Wetterdatei mit Globalstrahlung, oder setzen Sie die Sonnenfläche auf 0',
  },
  'scenario.currency': {
    says: '{path} ist {found}, aber das Szenario rechnet in {allowed}',
    cure: 'geben Sie alle Preise in einer Währung an',
  },
  'scenario.unknown-kind': {
    says: 'dies ist weder Szenario, Gerät, Tarif, Plan, Leseangabe noch eine Tabelle, die hier gelesen wird: {found}',
    cure: 'vergleichen Sie es mit den Beispielen in docs/formats.md',
  },
  'house.opaque-loss': {
    says: 'Wände, Dach und Boden verlieren {found} {unit}, mehr, als die Speichermasse dieses Rechenwegs weitergeben kann ({allowed} {unit})',
    cure: 'prüfen Sie Wärmeverlust und Wohnfläche, oder rechnen Sie mit Gradstunden (model: degreeHours)',
  },
};
