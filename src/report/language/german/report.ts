import type { ReportWords } from '../english/report.ts';
import { germanAuditor } from './auditor.ts';
import { germanBatch } from './batch.ts';
import { germanFormulas } from './formulas.ts';
import { germanProfessional } from './professional.ts';

/** Every word of the report, in German. */
export const german: ReportWords = {
  language: 'de',
  title: 'Was eine Wärmepumpe in diesem Haus leisten würde',
  skip: 'Zur Antwort',
  contents: 'Teile dieses Berichts',
  footer: (version) => `Erstellt mit Winterledger ${version}. Eine Schätzung, keine Zusage.`,
  months: ['Januar', 'Februar', 'März', 'April', 'Mai', 'Juni', 'Juli', 'August', 'September'].concat([
    'Oktober',
    'November',
    'Dezember',
  ]),
  monthsShort: ['Jan', 'Feb', 'Mär', 'Apr', 'Mai', 'Jun', 'Jul', 'Aug', 'Sep', 'Okt', 'Nov', 'Dez'],
  monthLetters: ['J', 'F', 'M', 'A', 'M', 'J', 'J', 'A', 'S', 'O', 'N', 'D'],
  month: 'Monat',
  year: 'Jahr',
  figures: 'Zahlen',

  client: {
    title: 'Die Antwort',
    use: ({ electricity, heat, factor }) =>
      `In einem Jahr mit diesem Wetter würde die Wärmepumpe ${electricity} Strom brauchen, um ${heat} Wärme zu geben: ${factor} kWh Wärme je gekaufter kWh.`,
    useWithFuel: ({ electricity, fuel, heat, factor }) =>
      `In einem Jahr mit diesem Wetter würden Wärmepumpe und Kessel ${electricity} Strom und ${fuel} Brennstoff brauchen, um ${heat} Wärme zu geben: ${factor} kWh Wärme je gekaufter kWh.`,
    noHeat: (electricity) =>
      `In einem Jahr mit diesem Wetter wird keine Wärme verlangt; die Anlage würde in Bereitschaft ${electricity} Strom brauchen.`,
    cost: ({ cost, tariff }) => `Die Heizung würde ${cost} im Jahr kosten (${tariff})`,
    cheapest: ({ cost, tariff }) => `, am günstigsten hier ${cost} (${tariff})`,
    cheaper: ({ boiler, saving }) =>
      `; der Kessel würde ${boiler} kosten, die Wärmepumpe spart also ${saving} im Jahr.`,
    dearer: ({ boiler, saving }) =>
      `; der Kessel würde ${boiler} kosten, die Wärmepumpe ist also ${saving} im Jahr teurer.`,
    noTariff: 'Was sie kostet, steht hier nicht, denn es ist kein Stromtarif eingetragen.',
    boilerAlone: (cost) =>
      `Der Kessel für dasselbe Haus würde ${cost} im Jahr kosten; zum Vergleich fehlt ein Stromtarif.`,
    backup: ({ hours, share }) => `Die Zusatzheizung würde in ${hours} Stunden helfen und ${share} der Wärme geben`,
    noBackup: 'Die Zusatzheizung würde nie laufen',
    cold: ({ hours, heat }) => `, doch in ${hours} Stunden würde den Räumen Wärme fehlen, zusammen ${heat}.`,
    warm: ', und den Räumen würde keine Wärme fehlen.',
    tiles: {
      electricity: 'Strom im Jahr',
      factor: 'Wärme je gekaufter kWh',
      cost: 'Heizung im Jahr',
      saved: 'Ersparnis zum Kessel',
      dearer: 'Teurer als der Kessel',
      carbon: 'Kohlendioxid im Jahr',
      backupHours: 'Stunden mit Zusatzheizung',
    },
    costTitle: 'Was ein Jahr Heizen kostet',
    costNote:
      'Laufende Kosten mit Steuern, Brennstoff und Wartung wie eingetragen; der Kessel mit seiner Pumpe im ersten Tarif.',
    boiler: 'Stattdessen der Kessel',
    changesTitle: 'Was am meisten daran ändern könnte',
    changesCaption: (currency) => `Mehr oder weniger im Jahr, ${currency}`,
    changesCaptionEnergy: 'Mehr Strom im Jahr',
    change: 'Wenn …',
    heatingCost: 'Heizung',
    saving: 'Ersparnis',
    nothingChanges: 'Es wird keine Wärme verlangt, also ist nichts zu ändern.',
    changes: {
      electricity: (share) => `Strom ${share} teurer wäre`,
      fuel: (share) => `Brennstoff ${share} teurer wäre`,
      flow: (kelvin) => `das Heizwasser ${kelvin} K heißer wäre`,
      rooms: (kelvin) => `die Räume ${kelvin} K wärmer wären`,
    },
    warningsTitle: 'Vor der Unterschrift ansehen',
    noWarnings: 'An Eingaben und Ergebnis fiel nichts Ungewöhnliches auf.',
    moreWarnings: (count) => `Und ${count} weitere im Teil für die Prüfung.`,
    notTitle: 'Was dies nicht ist',
    not: [
      'Es ist eine Schätzung und keine Zusage: Wetter, Preise, Einstellungen und Gewohnheiten ändern sie.',
      'Auslegung, Elektroanschluss und Arbeiten am Kältekreis sind Sache zugelassener Fachleute; örtliche Vorschriften entscheiden.',
      'Warmwasser: In lauwarmem Wasser wachsen Legionellen, und Wasser über etwa 60 °C verbrüht. Über Temperaturen, Aufheizen und Mischer entscheiden örtliche Vorschriften.',
    ],
    date: 'Ort und Datum',
    assessor: 'Energieberatung',
    client: 'Auftraggeber',
    rests: 'Stunde für Stunde über ein Jahr gerechnet mit der Wärmepumpe',
  },

  ...germanProfessional,
  ...germanAuditor,
  ...germanBatch,
  formulas: germanFormulas,
};
