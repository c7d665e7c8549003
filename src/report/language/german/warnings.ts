import type { SizeValues } from '../../../scenario/answer/warning.ts';
import { localFigures } from '../localFigures.ts';
import type { WarningWords } from '../warningWords.ts';

const DEFER = 'Örtliche Vorschriften und zugelassene Fachbetriebe entscheiden.';

const { number, percent, kWh } = localFigures(',');

/** A figure that a file holds, with all its decimals. */
const written = (value: number) => String(value).replace('.', ',').replace('-', '−');

/** What warnings say, in German. */
export const germanWarnings: WarningWords = {
  'result.seasonal-factor': ({ factor, least, most }) => ({
    text: `Die Jahresarbeitszahl H4 von ${number(factor, 2)} liegt außerhalb von ${written(least)}–${written(most)}, was Häuser gezeigt haben.`,
    remedy: 'Suchen Sie bei Vorlauftemperaturen, COP-Tabelle und Pumpenleistung einen Schreibfehler.',
  }),
  'result.much-backup': ({ share, hours }) => ({
    text: `Die Zusatzheizung gibt ${percent(share)} der Wärme, in ${number(hours, 0)} Stunden.`,
    remedy:
      'Ein größeres Gerät, größere Heizflächen für einen niedrigeren Vorlauf oder weniger Wärmeverlust; prüfen Sie die Umschalttemperatur.',
  }),
  'result.unmet-heat': ({ heat, hours }) => ({
    text: `${kWh(heat)} Raumwärme fehlen (${number(hours, 0)} Stunden): Räume würden kalt.`,
    remedy:
      'Mehr Zusatzheizung, ein größeres Gerät oder weniger Wärmeverlust. Unterschreiben Sie keine Größe, die das Haus kalt lässt.',
  }),
  'result.many-starts': ({ starts }) => ({
    text: `Etwa ${number(Math.round(starts / 100) * 100, 0)} Verdichterstarts im Jahr (eine Schätzung).`,
    remedy: 'Ein Gerät mit kleinerer kleinster Stufe, oder mehr Wasser im Kreis, etwa ein Pufferspeicher.',
  }),
  'map.outside': ({ hours }) => ({
    text: `In ${number(hours, 0)} Stunden lief das Gerät kälter, wärmer oder heißer, als seine Leistungstabelle reicht.`,
    remedy:
      'Fragen Sie den Hersteller nach den fehlenden Zeilen oder Spalten; die Werte dort sind nach Regeln verlängert.',
  }),
  'map.flow-above-limit': ({ hours }) => ({
    text: `In ${number(hours, 0)} Stunden verlangen die Räume einen höheren Vorlauf, als das Gerät geben kann.`,
    remedy: 'Größere Heizflächen oder eine niedrigere Heizkurve; die Zusatzheizung hebt den Rest.',
  }),
  'map.too-cold': ({ hours }) => ({
    text: `In ${number(hours, 0)} Stunden ist es kälter als die tiefste Außentemperatur des Geräts: Es steht still.`,
    remedy: 'Stellen Sie sicher, dass die Zusatzheizung das Haus in diesen Stunden allein trägt.',
  }),
  'weather.milder-than-design': (values) => ({
    text: `${coldestDay(values)}: Das Jahr ist milder als die Auslegung.`,
    remedy: 'Gut für die Energie, nicht für die Größe: Schließen Sie daraus nicht, dass ein kleineres Gerät genügt.',
  }),
  'weather.colder-than-design': (values) => ({
    text: `${coldestDay(values)}: Das Jahr ist kälter als die Auslegung.`,
    remedy: 'Prüfen Sie den Ort der Wetterdatei und die Normaußentemperatur.',
  }),
  'size.cannot-run': ({ outdoor, lowest, designLoad }) => ({
    text: `Das Gerät kann bei der Normaußentemperatur nicht laufen: ${written(outdoor)} °C sind kälter als seine tiefste Außentemperatur, ${written(lowest)} °C.`,
    remedy: `Dann muss die Zusatzheizung die ganze Heizlast von ${number(designLoad, 1)} kW tragen; sonst nehmen Sie ein Gerät, das bei solcher Kälte läuft.`,
  }),
  'size.far-under': (values) => ({
    text: `Das Gerät ist viel kleiner, als das Haus es braucht: ${sizes(values)}.`,
    remedy:
      'Nehmen Sie die nächste Größe, oder stellen Sie sicher, dass Leistung und Kosten der Zusatzheizung gewollt sind.',
  }),
  'size.far-over': (values) => ({
    text: `Das Gerät ist viel größer, als das Haus es braucht: ${sizes(values)}.`,
    remedy: 'Ein kleineres Gerät startet und stoppt seltener und kostet weniger.',
  }),
  'hot-water.legionella': ({ setPoint, usual }) => ({
    text: `Der Warmwasserspeicher wird auf ${written(setPoint)} °C gehalten, und es ist kein wöchentliches Aufheizen eingetragen.`,
    remedy: `In warmem Wasser können Legionellen wachsen: Tragen Sie ein Aufheizen auf ${usual} °C ein, oder weisen Sie eine andere Maßnahme nach. ${DEFER}`,
  }),
  'hot-water.hygiene-run-cool': ({ reached, usual }) => ({
    text: `Das wöchentliche Aufheizen erreicht nur ${written(reached)} °C.`,
    remedy: `Üblich sind ${usual} °C. ${DEFER}`,
  }),
  'hot-water.scalding': ({ hottest }) => ({
    text: `Der Warmwasserspeicher erreicht ${written(hottest)} °C: So heißes Wasser verbrüht an der Zapfstelle.`,
    remedy: `Üblich ist ein thermostatischer Mischer. ${DEFER}`,
  }),
  'hot-water.colder-than-use': ({ setPoint, use }) => ({
    text: `Der Warmwasserspeicher wird auf ${written(setPoint)} °C gehalten, kälter als die Nutztemperatur von ${written(use)} °C.`,
    remedy:
      'Heben Sie die Solltemperatur an, oder geben Sie die Liter bei der Temperatur an, mit der sie gezapft werden.',
  }),
  'hot-water.short': ({ hours, heat, coolest }) => ({
    text: `In ${number(hours, 0)} Stunden reichte das Warmwasser nicht (${kWh(heat)} im Jahr; am kühlsten ${number(coolest, 0)} °C).`,
    remedy: 'Ein größerer Warmwasserspeicher, eine höhere Solltemperatur oder längere Ladezeiten.',
  }),
};

function coldestDay({ coldest, design }: { readonly coldest: number; readonly design: number }): string {
  return `Der kälteste Tag des Wetters hat ${number(coldest, 1)} °C, die Normaußentemperatur ist ${written(design)} °C`;
}

function sizes({ capacity, outdoor, flow, limited, designLoad }: SizeValues): string {
  const highest = limited ? ', dem höchsten, den es dort gibt' : '';
  return `${number(capacity, 1)} kW bei ${written(outdoor)} °C außen und ${written(Number(flow.toFixed(1)))} °C Vorlauf${highest}; die Heizlast ist ${number(designLoad, 1)} kW`;
}
