/** What the entries of a scenario mean that describe heating, hot water, boiler and the years, by their places. */
export const fieldsOfPlant: Readonly<Record<string, string>> = {
  flowTemperature: 'Wie die Vorlauftemperatur einer Stunde bestimmt wird.',
  'flowTemperature.emitters.flow': 'Vorlauftemperatur bei voller Heizlast.',
  'flowTemperature.emitters.return': 'Rücklauftemperatur bei voller Heizlast.',
  'flowTemperature.emitters.roomTemperature':
    'Raumtemperatur der Heizflächen; fehlt sie, die Raumtemperatur der Auslegung.',
  'flowTemperature.emitters.exponent': 'Exponent der Heizflächen: 1,3 Heizkörper, 1,1 Fußbodenheizung (EN 442).',
  'flowTemperature.emitters.lowestFlow': 'Niedrigste Vorlauftemperatur.',
  'flowTemperature.emitters.highestFlow': 'Höchste Vorlauftemperatur; fehlt sie, die der Auslegung.',
  'flowTemperature.curve.points': 'Vorlauftemperatur über der Außentemperatur; jenseits der Enden bleibt sie gleich.',
  'flowTemperature.fixed.flow': 'Vorlauftemperatur in jeder Stunde.',
  circulation: 'Der Heizkreis.',
  'circulation.pumpPower': 'Elektrische Leistung der Heizkreispumpe.',
  'circulation.waterContent':
    'Wasser, an dem ein kurzer Lauf des Verdichters arbeitet; fehlt es, 20 L je kW der kleinsten Stufe, mindestens 100 L.',
  heatPump: 'Die Wärmepumpe, und wie sie laufen darf.',
  'heatPump.unit': 'Datei der Wärmepumpe.',
  'heatPump.inUseAllowance':
    'Anteil, um den jeder COP gesenkt wird für das, was ein Haus einem Gerät antut: Einstellungen, Abgleich, Fühler.',
  'heatPump.quietHours': 'Stunden mit begrenzter Leistung für Raumwärme; die erste Regel, die passt, gilt.',
  'heatPump.quietHours.weekdays': 'Wochentage der Stunden selbst, auch nach Mitternacht; fehlen sie, alle.',
  'heatPump.quietHours.capacity': 'Anteil der vollen Leistung, der genutzt werden darf; die Linie des COP bleibt.',
  backup: 'Was hilft, wenn die Wärmepumpe das Haus nicht tragen kann: ein Heizstab oder ein Kessel (Hybrid).',
  'backup.electric.power': 'Wärme, die die Zusatzheizung geben kann.',
  'backup.electric.mode': 'Wann die Zusatzheizung läuft.',
  'backup.electric.mode.alternative.switchTemperature':
    'Unter dieser Außentemperatur ruht die Wärmepumpe, und die Zusatzheizung trägt alles.',
  'backup.boiler.efficiency':
    'Nutzungsgrad für Raumwärme, bezogen auf den beim Brennstoff genannten Heizwert oder Brennwert.',
  'backup.boiler.hotWaterEfficiency': 'Nutzungsgrad für Warmwasser; fehlt er, der für Raumwärme.',
  'backup.boiler.fuel.kind': 'Was gekauft wird; davon hängt der angenommene CO₂-Faktor ab.',
  'backup.boiler.fuel.price': 'Arbeitspreis einer kWh Brennstoff, vor den Steuern darunter.',
  'backup.boiler.fuel.calorificValue':
    'Ob sich Preis und Nutzungsgrad auf Heizwert oder Brennwert beziehen; beide müssen sich auf dasselbe beziehen. Bei Strom und Fernwärme gibt es keinen Unterschied.',
  'backup.boiler.fuel.standingPerYear': 'Grundpreis des Brennstoffs, vor Steuern.',
  'backup.boiler.fuel.taxes': 'Steuern in Prozent; sie addieren sich, auf Arbeitspreis und Grundpreis.',
  'backup.boiler.fuel.taxes.name': 'Name der Steuer.',
  'backup.boiler.fuel.taxes.percent': 'Ihr Satz.',
  'backup.boiler.fuel.carbonFactor':
    'Kohlendioxid einer kWh Brennstoff, ebenso bezogen; fehlt er bei Gas, Öl und Flüssiggas, nach der Verordnung (EU) 2018/2066.',
  'backup.boiler.mode': 'Wann der Kessel läuft; „das Billigere“ vergleicht beide Quellen jede Stunde im ersten Tarif.',

  hotWater: 'Warmwasser von demselben Gerät.',
  'hotWater.volume': 'Wasser im Warmwasserspeicher.',
  'hotWater.setPoint': 'Temperatur, auf die der Warmwasserspeicher geladen wird.',
  'hotWater.hysteresis': 'So weit unter der Solltemperatur beginnt das Nachladen.',
  'hotWater.loss': 'Was der Warmwasserspeicher verliert.',
  'hotWater.loss.coefficient.value': 'Wärmeverlust UA des Warmwasserspeichers.',
  'hotWater.loss.standingLoss.value': 'Wärme, die an einem Tag bei 45 K über der Umgebung verloren geht.',
  'hotWater.surroundingTemperature': 'Temperatur um den Warmwasserspeicher.',
  'hotWater.draw': 'Gezapftes Warmwasser.',
  'hotWater.draw.litres.litresPerDay': 'An einem Tag gezapftes Wasser bei der Nutztemperatur.',
  'hotWater.draw.litres.useTemperature': 'Temperatur dieser Liter an der Zapfstelle.',
  'hotWater.draw.litres.shares':
    'Anteile des Tages in den 24 Stunden der Ortszeit; sie werden auf die Summe eins gebracht.',
  'hotWater.draw.profile.profile': 'Zapfprofil der Verordnung (EU) 814/2013, seine kWh wie gedruckt.',
  'hotWater.coldWater': 'Kaltwasser.',
  'hotWater.coldWater.mean': 'Mittlere Temperatur des Kaltwassers.',
  'hotWater.coldWater.amplitude': 'Halber Ausschlag über das Jahr.',
  'hotWater.coldWater.warmestDay': 'Tag des Jahres, an dem es am wärmsten ist.',
  'hotWater.reheatWindows': 'Wann der Warmwasserspeicher nachgeladen werden darf; ohne Angabe immer.',
  'hotWater.hygiene': 'Wöchentliches Aufheizen gegen Legionellen; ob es genügt, sagen die örtlichen Vorschriften.',
  'hotWater.hygiene.weekday': 'Tag des wöchentlichen Aufheizens.',
  'hotWater.hygiene.hour': 'Stunde der Ortszeit, in der es verlangt wird.',
  'hotWater.hygiene.temperature': 'Temperatur, die einmal erreicht wird.',
  'hotWater.immersionPower': 'Heizstab im Warmwasserspeicher; bei einem Hybrid tritt der Kessel an seine Stelle.',

  household:
    'Strom des Haushalts ohne die Heizung: Er steht auf derselben Rechnung und zählt zu Mengenstufen und Spitzen.',
  'household.profile.kWhPerYear':
    'Strom des Haushalts im Jahr, ohne die Heizung; das Profil wird genau darauf gebracht.',
  'household.profile.shares':
    'Anteile der 24 Stunden eines Tages in Ortszeit; ihre Summe muss nicht eins sein. Fehlen sie, gleichmäßig über die Stunden.',
  'household.profile.weekendShares':
    'Dasselbe für Samstag und Sonntag, im Maßstab der anderen Anteile: Eine größere Summe ist ein Wochenende mit mehr Verbrauch. Fehlen sie, wie an den anderen Tagen.',
  'household.meter.file':
    'CSV-Datei mit einer Spalte der Zeitstempel, die den Anfang eines Zeitschritts bezeichnen, und einer der Energie je Schritt von höchstens einer Stunde.',
  'household.meter.unit': 'Einheit der Energien.',
  'household.meter.stamps': 'Was ein Zeitstempel ohne Abstand zu UTC bedeutet: einen Fehler, UTC oder Ortszeit.',
  'household.meter.timeColumn': 'Name der Spalte der Zeitstempel; unnötig bei einer Datei mit zwei Spalten.',
  'household.meter.energyColumn': 'Name der Spalte der Energien; unnötig bei einer Datei mit zwei Spalten.',
  'household.meter.decimal': 'Dezimalzeichen der Energien; fehlt es, zeigt es die Datei.',
  tariffs:
    'Stromtarife zum Vergleich, jeder der Name einer Datei oder ein Wechsel des Lieferanten; der erste ist der heutige.',
  'tariffs.0': 'Eine Tarifdatei.',
  'tariffs.1': 'Ein Jahr mit Wechsel des Lieferanten: mehrere Tarifdateien nacheinander.',
  'tariffs.1.name': 'Wie Ergebnisse das Jahr nennen; fehlt der Name, die Namen der Tarife nacheinander.',
  'tariffs.1.supplies': 'Die Tarife des Jahres der Reihe nach, jeder von seinem Datum bis zu dem des nächsten.',
  'tariffs.1.supplies.from':
    'Tag, an dem dieser Tarif beginnt, im Kalenderjahr oder in jedem Jahr; der erste hat keinen.',

  boiler: 'Der Kessel, der stattdessen bliebe oder gekauft würde.',
  'boiler.efficiency':
    'Nutzungsgrad für Raumwärme: ein Wert, oder nach der Rücklauftemperatur bei einem Brennwertkessel.',
  'boiler.efficiency.0':
    'Jahresnutzungsgrad für Raumwärme, bezogen auf den beim Brennstoff genannten Heizwert oder Brennwert.',
  'boiler.efficiency.1.byReturnTemperature':
    'Nutzungsgrad für Raumwärme über der Rücklauftemperatur, bezogen auf den beim Brennstoff genannten Heizwert oder Brennwert; jenseits der Enden bleibt er gleich.',
  'boiler.efficiency.1.byReturnTemperature.0': 'Rücklauftemperatur.',
  'boiler.efficiency.1.byReturnTemperature.1': 'Nutzungsgrad dort.',
  'boiler.efficiency.1.flowTemperature':
    'Wie die Vorlauftemperatur des Kessels bestimmt wird; sie muss nicht die der Wärmepumpe sein und wird nicht von ihr genommen.',
  'boiler.hotWaterEfficiency':
    'Nutzungsgrad für Warmwasser; fehlt er, der für Raumwärme, bei Angabe nach Rücklauftemperatur der beim heißesten Rücklauf.',
  'boiler.fuel': 'Was gekauft wird, und zu welchem Preis; Strom ohne Preis läuft über den Tarif des Haushalts.',
  'boiler.fuel.electricity.price':
    'Arbeitspreis einer kWh in einem eigenen Vertrag, vor den Steuern darunter; fehlt er, läuft der Strom Stunde für Stunde über den Tarif des Haushalts.',
  'boiler.cylinderLoss':
    'Bereitschaftsverlust des Warmwasserspeichers, den der Kessel heizen würde; fehlt er, der aus der Rechnung der Wärmepumpe.',
  'boiler.pumpPower': 'Elektrische Leistung von Pumpe und Gebläse, während er heizt.',
  'boiler.servicePerYear': 'Wartung und Schornsteinfeger.',
  carbon: 'CO₂-Faktoren; ohne diesen Abschnitt wird kein Kohlendioxid gerechnet.',
  'carbon.electricity':
    'Kohlendioxid einer kWh Strom: ein Faktor, einer je Preisstufe des ersten Tarifs oder eine Reihe.',
  'carbon.electricity.0': 'Kohlendioxid einer kWh Strom.',
  'carbon.electricity.1.byRate.factors': 'Ein Faktor für jede Preisstufe des ersten Tarifs.',
  'carbon.electricity.1.byRate.factors.rate': 'Name einer Preisstufe des ersten Tarifs.',
  'carbon.electricity.1.byRate.factors.factor': 'Kohlendioxid einer kWh, solange die Preisstufe gilt.',
  'carbon.electricity.1.series.file':
    'CSV-Datei mit einer Spalte der Zeitstempel und einer der Faktoren, in einem Zeitschritt von höchstens einer Stunde.',
  'carbon.electricity.1.series.unit': 'Einheit der Faktoren.',
  'carbon.electricity.1.series.factorColumn': 'Name der Spalte der Faktoren; unnötig bei einer Datei mit zwei Spalten.',
  'carbon.electricity.1.series.decimal': 'Dezimalzeichen der Faktoren; fehlt es, zeigt es die Datei.',
  wholeLife: 'Kapital und Bedingungen eines Vergleichs über die Jahre; ohne diesen Abschnitt gibt es keinen.',
  'wholeLife.capital': 'Was die Wärmepumpe eingebaut kostet, mit allem, was dazugehört, vor der Förderung.',
  'wholeLife.grant': 'Förderung dafür.',
  'wholeLife.replacedBoiler':
    'Was jetzt ein neuer Kessel kosten würde, der nicht gekauft werden muss; 0, wenn der alte bleiben könnte.',
  'wholeLife.years': 'Betrachtete Jahre.',
  'wholeLife.discountRate': 'Realer Zinssatz: was Geld über der Inflation bringt oder kostet.',
  'wholeLife.electricityDrift': 'Wie viel teurer Strom jedes Jahr über der Inflation wird, mit seinem Grundpreis.',
  'wholeLife.fuelDrift': 'Wie viel teurer Brennstoff jedes Jahr über der Inflation wird, mit seinem Grundpreis.',
  'wholeLife.servicePerYear': 'Wartung der Wärmepumpe; sie bleibt, wie sie ist.',
};
