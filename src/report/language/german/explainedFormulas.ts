import type { FormulaName } from '../../../sim/explain/stage.ts';
import type { ExplainWords } from '../../explainWords.ts';

const ISO = 'ISO 13790:2008 Anhang C';
const ASHRAE = 'ASHRAE Handbook Fundamentals Kap. 1';

/** The formulas of an explained hour, in German. */
export const explainedFormulas: Readonly<Record<FormulaName, ExplainWords['formulas'][FormulaName]>> = {
  humidityFromRelative: {
    section: '3',
    says: 'Dampf = relative Feuchte/100 × Sättigungsdruck; Wassergehalt = 0,621945 × Dampf / (Luftdruck − Dampf)',
    source: `${ASHRAE} Gl. 6, 20, 22`,
  },
  humidityFromDewPoint: {
    section: '3',
    says: 'Dampf = Sättigungsdruck am Taupunkt; Wassergehalt = 0,621945 × Dampf / (Luftdruck − Dampf)',
    source: `${ASHRAE} Gl. 6, 20`,
  },
  humidityFromWetBulb: {
    section: '3',
    says: 'Wassergehalt aus Feuchtkugel- und Außentemperatur nach den Gleichungen des Psychrometers',
    source: `${ASHRAE} Gl. 33, 35`,
  },
  trailingMeans: { section: '4', says: 'Mittel dieser Stunde und der 23 davor' },
  frostIndex: {
    section: '7',
    says: 'Verdampfer = Außentemperatur − 8; Δw = Wassergehalt − dem über Eis, nicht unter 0; φ = Anteil, der als Reif bleibt, × Δw / Δw_ref, höchstens 1,5',
  },
  baseFromGains: {
    section: '4',
    says: 'Gewinne = innere Gewinne + Sonnenfläche/1000 × mittlere Strahlung der letzten 24 Stunden; Heizgrenze = Solltemperatur − Gewinne / (Wärmeverlust/1000)',
  },
  baseEntered: {
    section: '4',
    says: 'Heizgrenze = Heizgrenze wie eingetragen + Solltemperatur − Solltemperatur zur eingetragenen Heizgrenze',
  },
  degreeHours: {
    section: '4',
    says: 'Wärmebedarf = Wärmeverlust/1000 × (Heizgrenze − Außentemperatur), nicht unter 0',
  },
  heatingLimit: {
    section: '4',
    says: 'kein Bedarf, solange die Mitteltemperatur der letzten 24 Stunden die Heizgrenztemperatur erreicht',
  },
  fiveResistances: {
    section: '4',
    says: 'die halben inneren Gewinne gehen in die Luft, der Rest und die Sonne an Oberflächen und Masse; die Leitwerte und die Außentemperatur machen daraus die Teile durch Wetter und Gewinne',
    source: `${ISO}, Gl. C.1 bis C.11`,
  },
  airAtRest: {
    section: '4',
    says: 'ruhende Luft = Anteil der Masse × Temperatur der Masse + Teil durch Wetter und Gewinne',
    source: ISO,
  },
  needWithMass: {
    section: '4',
    says: 'Wärmebedarf = (Solltemperatur − ruhende Luft) / Kelvin der Luft je kW, nicht unter 0',
    source: `${ISO}.4`,
  },
  draw: {
    section: '8',
    says: 'gespeichert = Wärme eines Kelvins × (Speichertemperatur − Kaltwasser); geliefert = das Kleinere von verlangt und gespeichert; der Rest wird nicht geliefert',
  },
  cylinderLoss: {
    section: '8',
    says: 'Verlust = Verlustbeiwert × (Speichertemperatur − Temperatur darum); nach Entnahme und Verlust = Temperatur − (geliefert + Verlust) / Wärme eines Kelvins',
  },
  reheatPoint: {
    section: '8',
    says: 'T_h = das Kleinere von gewünschter Temperatur und höchstem Vorlauf des Geräts − 5; Vorlauf = (Temperatur nach Entnahme und Verlust + T_h)/2 + 5',
  },
  reheatByHeatPump: {
    section: '8',
    says: 'Leistung = die der Tabelle × (1 − Abtauverlust), COP ebenso × (1 − Abschlag für den Betrieb); τ = Wärme eines Kelvins × (T_h − Temperatur nach Entnahme und Verlust) / Leistung, höchstens 1; Wärme = τ × Leistung; Strom = Wärme / COP',
  },
  reheatByHeater: {
    section: '8',
    says: 'Heizstab oder Kessel = was zur gewünschten Temperatur fehlt, höchstens Leistung × (1 − τ), sobald die Wärmepumpe fertig ist; Temperatur am Ende = nach Entnahme und Verlust + alle Wärme / Wärme eines Kelvins',
  },
  load: { section: '5', says: 'x = Wärmebedarf / Heizlast' },
  harderLoad: {
    section: '5',
    says: 'x = (Wärmebedarf + wartende Wärme) / ((1 − τ) × Heizlast), höchstens das Größere von 1 und Wärmebedarf / Heizlast',
  },
  emitterFlow: {
    section: '5',
    says: 'Vorlauf = Raumtemperatur + Übertemperatur × x^(1/n) + x × Spreizung / 2, zwischen niedrigstem und höchstem Vorlauf der Heizflächen gehalten',
    source: 'EN 442-2, Kennlinie',
  },
  flowSet: { section: '5', says: 'der Vorlauf folgt allein aus der Außentemperatur, wie eingetragen' },
  returnTemperature: { section: '5', says: 'Rücklauf = Vorlauf − x × Spreizung, x zwischen 0,2 und 1 gehalten' },
  mapInside: {
    section: '6',
    says: 'η und Leistung = (1 − v) × [(1 − u) × kälter + u × wärmer] in der niedrigeren Spalte + v × dasselbe in der höheren; COP = η × κ',
  },
  mapLinear: {
    section: '6',
    says: 'COP und Leistung = (1 − v) × [(1 − u) × kälter + u × wärmer] in der niedrigeren Spalte + v × dasselbe in der höheren; COP × κ / κ am nächsten Punkt der Tabelle',
  },
  kappa: {
    section: '6',
    says: 'κ = (Vorlauf + 3 + 273,15) / (Vorlauf − Außentemperatur + 10), der Teiler mindestens 15; η = COP/κ an jedem Punkt der Tabelle',
    source: 'Satz von Carnot mit Temperaturabständen',
  },
  coldCapacity: {
    section: '6',
    says: 'Leistung = die der kältesten Zeile − Leistungsverlust je Kelvin × Kelvin darunter, mindestens 0,3 davon; je Kelvin mindestens 0,01 davon',
  },
  lowFlow: {
    section: '6',
    says: 'COP × (1 + 0,02 × Kelvin unter der niedrigsten Spalte, höchstens 10)',
    source: 'übliche Praxis, ohne Quelle',
  },
  frostByHumidity: {
    section: '7',
    says: 'Leistungsverlust = d_q × φ, COP-Verlust = d_c × φ, jeder höchstens 0,5; bei kleinster Stufe der Teil kleinste zu voller Leistung, beide vor Abtauverlust',
  },
  frostByTable: {
    section: '7',
    says: 'Verlust = 1 − Faktor der Tabelle des Geräts bei der Außentemperatur, gleich für beide Stufen',
  },
  afterFrost: {
    section: '7',
    says: 'Leistung und COP einer Stufe = die davor × (1 − ihr Anteil, den das Abtauen kostet)',
  },
  lowestByShare: {
    section: '9',
    says: 'kleinste Stufe vor Abtauverlust: m × Leistung nach der Tabelle, g × COP nach der Tabelle',
  },
  shareThroughLimit: {
    section: '9',
    says: 'Anteil = (höchster Vorlauf − Rücklauf) / (Vorlauf − Rücklauf), zwischen 0 und 1; Rest = Bedarf × (1 − Anteil)',
  },
  givenByHeatPump: {
    section: '9',
    says: 'verlangt = Teil der Wärmepumpe + wartende Wärme; könnte geben = Leistung × Anteil leiser Stunden × (1 − τ); gegeben = das Kleinere von beiden',
  },
  waiting: {
    section: '9',
    says: 'verdrängt = vorher wartend + Leistung − könnte geben; wartet = das Kleinste von verlangt − gegeben, zwei Stunden der Heizlast und verdrängt; 0, wo das Gerät ruht, und in der letzten Stunde des Jahres',
  },
  waitingInRoom: {
    section: '9',
    says: 'der Raum wartet auf das Kleinere von verlangt − gegeben und Leistung − könnte geben; die Masse merkt es sich',
  },
  copBetween: {
    section: '9',
    says: 'r = Wärme / (1 − τ); COP linear in r zwischen kleinster Stufe und voller Leistung',
  },
  copSingleSpeed: { section: '9', says: 'r = Wärme / (1 − τ); der COP bei voller Leistung' },
  copCycling: {
    section: '9',
    says: 'r = Wärme / (1 − τ); CR = r / kleinste Leistung; COP = der der kleinsten Stufe × (1 − C_d × (1 − CR))',
    source: 'Minderung wie in EN 14825 und AHRI 210/240',
  },
  copOffPower: { section: '9', says: 'r = Wärme / (1 − τ); CR = r / kleinste Leistung; COP der kleinsten Stufe' },
  electricityOfRate: { section: '9', says: 'Strom = Wärme / (COP × (1 − Abschlag für den Betrieb))' },
  electricityWithOffPower: {
    section: '9',
    says: 'Strom = Wärme / (COP × (1 − Abschlag für den Betrieb)) + Aufnahme in den Pausen × (1 − CR) × (1 − τ)',
  },
  starts: {
    section: '9',
    says: 'Starts = kleinste Leistung × CR × (1 − CR) × (1 − τ) / (Wasser × 0,001163 × 5), höchstens 6',
    source: 'Wasser eines Laufs: übliche Praxis, ohne Quelle',
  },
  backupParallel: {
    section: '10',
    says: 'verlangt = Rest + von der Wärmepumpe verlangt − gegeben − wartet; Zusatzheizung = das Kleinere von verlangt und übriger Leistung; was bleibt, fehlt',
  },
  cheapest: {
    section: '10',
    says: 'Kosten mit der Wärmepumpe = ihr Strom × Preis; mit dem Kessel = dieselbe Wärme / Nutzungsgrad × Brennstoffpreis; das Billigere trägt, bei Gleichstand die Wärmepumpe',
  },
  boilerCarries: {
    section: '10',
    says: 'Zusatzheizung = das Kleinere von Rest + von der Wärmepumpe verlangt und übriger Leistung; die Wärmepumpe gibt, was von ihrem Teil bleibt; nichts wartet',
  },
  roomAfter: {
    section: '4',
    says: 'Luft = ruhende Luft + Kelvin der Luft je kW × gegebene Wärme; Masse = behaltener Anteil × Temperatur der Masse + Teil durch Wetter und Gewinne + Kelvin der Masse je kW × gegebene Wärme',
    source: ISO,
  },
  auxiliaries: {
    section: '11',
    says: 'die Pumpe läuft die ganze Stunde, wenn die Räume Wärme brauchen, sonst für τ; Bereitschaft und Ölsumpfheizung zählen, wenn der Verdichter nichts tut',
  },
  electricity: {
    section: '11',
    says: 'aller Strom = die Summe der Verwendungen; eine elektrische Zusatzheizung gibt eine kWh für eine kWh',
  },
  fuel: {
    section: '11',
    says: 'Brennstoff = Wärme an die Räume / Nutzungsgrad + Wärme in den Speicher / dessen Nutzungsgrad',
  },
  cost: {
    section: '12',
    says: 'Kosten = Strom × Preis; Mengenstufen, Grundpreis und Leistungspreis gehören zu keiner einzelnen Stunde',
  },
  carbon: { section: '12', says: 'Kohlendioxid = Strom × sein Faktor + Brennstoff × sein Faktor' },
};
