import type { AssumptionWords } from '../assumptionWords.ts';
import { localFigures } from '../localFigures.ts';
import { germanField } from './fields.ts';
import { germanKeys } from './keys.ts';
import { germanUnit } from './units.ts';

const { number } = localFigures(',');

/** What a result rests on, in German. */
export const germanAssumptions: AssumptionWords = {
  ofDefault: ({ value, unit, says }) =>
    `${written(value)}${unit === undefined ? '' : ` ${germanUnit(unit)}`}. ${germanField(says)}`.trimEnd(),
  rules: {
    'weather.no-humidity': ({ humidity }) => `Die Datei enthält keine Feuchte: ${written(humidity)} % in jeder Stunde.`,
    'weather.no-pressure': ({ altitude }) =>
      `Die Datei enthält keinen Luftdruck: die Normatmosphäre in ${written(altitude)} m Höhe.`,
    'house.base-from-gains': () =>
      'Die Heizgrenze folgt aus Solltemperatur, Gewinnen und Wärmeverlust; das Haus speichert die Sonne eines Tages.',
    'limits.flow-of-map': ({ flow }) => `${written(flow)} °C, der höchste Vorlauf der Leistungstabelle.`,
    'limits.no-lowest-outdoor': () => 'Nicht eingetragen: Das Gerät läuft, wie kalt es auch ist.',
    'circulation.water-by-rule': ({ water }) =>
      `${number(water, 0)} L, nach Faustregel (20 L je kW, mindestens 100 L; übliche Praxis, ohne Quelle). Nur die Schätzung der Starts hängt davon ab.`,
    'hot-water.profile-of-day': () => 'Über den Tag verteilt wie im Zapfprofil M.',
    'backup.none': () => 'Es gibt keine Zusatzheizung.',
    'backup.first-tariff-drives': () =>
      'Der erste Tarif steuert das Jahr; jeder weitere Tarif hat eine eigene Rechnung, nur für seine Kosten.',
    'household.none': () => 'Es ist kein Strom des Haushalts eingetragen: Die Rechnung ist die der Heizung allein.',
    'household.even': () => 'Gleichmäßig über die Stunden des Tages.',
    'boiler.cylinder-loss': () => 'Der aus der Rechnung der Wärmepumpe.',
    'boiler.hot-water-efficiency': () => 'Der für Raumwärme, bei einem Brennwertkessel der beim heißesten Rücklauf.',
    'fuel.published-factor': ({ factor, calorificValue }) =>
      `${number(factor, 3)} kg/kWh. Verordnung (EU) 2018/2066, auf den ${calorificValue === 'gross' ? 'Brennwert' : 'Heizwert'} bezogen.`,
  },
};

function written(value: string | number | boolean): string {
  if (typeof value === 'number') return String(value).replace('.', ',').replace('-', '−');
  if (typeof value === 'boolean') return value ? 'ja' : 'nein';
  return Object.hasOwn(germanKeys, value) ? germanKeys[value] : value;
}
