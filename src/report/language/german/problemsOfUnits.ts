import type { ProblemKind } from '../../../core/problems/catalogue.ts';
import type { labelProblems } from '../../../core/problems/labelProblems.ts';
import type { mapProblems } from '../../../core/problems/mapProblems.ts';

/** Problems of the tables of a heat-pump unit, in German. */
export const problemsOfMaps: Readonly<Record<keyof typeof mapProblems, ProblemKind>> = {
  'map.no-table': {
    says: '{path} enthält keine Tabelle',
    cure: 'erste Zeile: Vorlauftemperaturen; darunter je Außentemperatur eine Zeile, die Werte dahinter',
  },
  'map.not-a-block': {
    says: '{path} steht in einer Zeile; nur hinter „|“ behält eine Tabelle ihre Zeilen',
    cure: 'schreiben Sie „|“ hinter den Schlüssel und die Tabelle eingerückt darunter',
  },
  'map.axis': {
    says: '{path} hat {found} auf einer Achse; {allowed}',
    cure: 'die erste Zeile enthält Vorlauftemperaturen, die erste Spalte Außentemperaturen; drehen Sie die Tabelle, wenn sie auf der Seite liegt',
  },
  'map.repeated': { says: '{path} hat {found} zweimal; zuerst in {allowed}', cure: 'behalten Sie eines von beiden' },
  'map.unsorted': {
    says: 'in {path} stehen die {found} hier nicht der Reihe nach; sie wurden sortiert',
    cure: 'prüfen Sie, ob diese Temperatur vertippt ist',
  },
  'map.ragged': {
    says: 'in {path} hat diese Zeile {found} Werte bei {allowed} Vorlauftemperaturen',
    cure: 'schreiben Sie einen Strich, wo kein Wert ist',
  },
  'map.not-a-number': {
    says: '{path} ist {found}; {allowed}',
    cure: 'schreiben Sie eine Zahl, oder einen Strich, wo kein Wert ist',
  },
  'map.out-of-range': { says: '{path} ist {found}; {allowed}', cure: 'prüfen Sie den Wert' },
  'map.more': {
    says: '{found} weitere solche Fehler in {path}',
    cure: 'berichtigen Sie erst die darüber; oft haben sie eine Ursache',
  },
  'map.which-second': {
    says: '{path} hat {found}; neben der Leistung braucht es entweder cop oder inputPower',
    cure: 'geben Sie eine der beiden Tabellen an',
  },
  'map.axes-differ': {
    says: '{path} {found}, anders als {allowed}',
    cure: 'geben Sie beiden Tabellen dieselben Temperaturen, mit einem Strich, wo kein Wert ist',
  },
  'map.sparse-column': {
    says: 'in {path} hat {found} weniger als zwei Punkte',
    cure: 'ergänzen Sie einen Punkt, oder nehmen Sie die Spalte heraus',
  },
  'map.input-above-capacity': {
    says: '{path} ist {found} kW, nicht weniger als die Leistung von {allowed} kW',
    cure: 'sind die beiden Tabellen vertauscht, oder ist die Aufnahme in W?',
  },
  'map.above-carnot': {
    says: '{path}: Ein COP von {found} ist mehr, als die Physik an diesem Punkt erlaubt ({allowed})',
    cure: 'suchen Sie einen Schreibfehler, und prüfen Sie Zeile und Spalte',
  },
  'map.lowest-above-carnot': {
    says: '{path}: {found} ist mehr, als die Physik dort erlaubt ({allowed})',
    cure: 'senken Sie das Vielfache, oder geben Sie die kleinste Stufe als Tabelle an',
  },
  'map.lowest-above-full': {
    says: '{path} ist {found} kW, mehr als die Volllast von {allowed} kW',
    cure: 'prüfen Sie, ob die beiden Stufen vertauscht sind',
  },
  'map.looks-mistyped': {
    says: '{found} bei {path} liegt weit neben der Linie der Nachbarn, während die anderen passen',
    cure: 'vergleichen Sie mit dem Datenblatt',
  },
  'map.rising-cop': {
    says: '{path}: Der COP steigt mit heißerem Vorlauf von {allowed} auf {found}',
    cure: 'vergleichen Sie beide mit dem Datenblatt; ein heißerer Vorlauf kostet COP',
  },
  'map.looks-integrated': {
    says: '{found} bei {path} liegt {allowed} unter der Linie zwischen den Nachbarn, wie integrierte Werte es tun: Der Verlust durch Abtauen würde doppelt zählen',
    cure: 'setzen Sie defrost auf method: included, oder tragen Sie frostfreie Werte ein',
  },
};

/** Problems of what an energy label declares, in German. */
export const problemsOfLabels: Readonly<Record<keyof typeof labelProblems, ProblemKind>> = {
  'label.needs-idle-powers': {
    says: '{path} gibt eine Heizperiode an, aber die Leistungsaufnahmen im Ruhen fehlen',
    cure: 'ergänzen Sie idlePowers im Label: off, thermostatOff, standby und crankcase, in W, wie das Datenblatt sie angibt',
  },
  'label.repeated-season': {
    says: '{path} ist noch einmal {found}; zuerst in {allowed}',
    cure: 'behalten Sie eines von beiden',
  },
  'label.few-points': {
    says: '{path} hat {found}; eine Heizperiode braucht zwei verschiedene Außentemperaturen',
    cure: 'ergänzen Sie Punkte des Datenblatts, oder nehmen Sie die Liste heraus',
  },
  'label.repeated-point': {
    says: '{path} ist noch einmal {found}, mit anderen Werten als {allowed}',
    cure: 'vergleichen Sie beide mit dem Datenblatt, und behalten Sie den richtigen',
  },
  'label.bivalent-below-limit': {
    says: '{path} ist {found}, unter der Betriebsgrenze von {allowed}: Wo das Gerät nicht läuft, kann es die Last nicht tragen',
    cure: 'vergleichen Sie T_biv und TOL mit dem Datenblatt; vielleicht sind sie vertauscht',
  },
  'label.bivalent-too-warm': {
    says: '{path} ist {found}; in diesem Klima erlaubt die Verordnung (EU) 813/2013 höchstens {allowed}',
    cure: 'vergleichen Sie T_biv und das Klima mit dem Datenblatt',
  },
  'label.limit-too-warm': {
    says: '{path} ist {found}; in diesem Klima erlaubt die Verordnung (EU) 813/2013 höchstens {allowed}',
    cure: 'vergleichen Sie TOL und das Klima mit dem Datenblatt',
  },
  'label.above-carnot': {
    says: '{path}: Ein COP von {found} ist mehr, als die Physik an diesem Punkt erlaubt ({allowed})',
    cure: 'suchen Sie einen Schreibfehler, und prüfen Sie die Außentemperatur',
  },
  'label.capacity-below-load': {
    says: '{path} ist {found} kW, mehr als 10 % unter der Teillast von {allowed} kW, obwohl es nicht kälter als T_biv ist',
    cure: 'vergleichen Sie Leistung, designLoad und bivalentTemperature mit dem Datenblatt',
  },
  'label.cop-falls-off': {
    says: '{path}: Über die zwei wärmsten Punkte hinaus verlängert, fällt der COP bei mildem Wetter auf nichts',
    cure: 'vergleichen Sie COP und Leistung der zwei wärmsten Punkte mit dem Datenblatt',
  },
  'label.unknown-outlets': {
    says: 'die Austrittstemperaturen für {found} sind nicht bekannt, darum lässt sich die Leistungstabelle dafür nicht bewerten; bekannt sind {allowed}',
    cure: 'tragen Sie sie im Abschnitt label ein, etwa „outlets: [{ climate: warmer, application: 45, points: [[7, 38], [12, 30]] }]“ mit den Werten der EN 14825',
  },
  'label.outlet-at-design': {
    says: '{path} liegt bei {found}; bei der Auslegungstemperatur von {allowed} gilt die Austrittstemperatur der Anwendung selbst, und kälter wird es nicht',
    cure: 'schreiben Sie Punkte über der Auslegungstemperatur, etwa −7, 2, 7 und 12 °C',
  },
  'label.no-outlet-points': {
    says: '{path} hat keinen Punkt über der Auslegungstemperatur von {allowed}',
    cure: 'schreiben Sie die Punkte der EN 14825 darüber, etwa −7, 2, 7 und 12 °C',
  },
};
