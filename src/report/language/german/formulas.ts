import type { FormulaSource } from '../languages.ts';

/** What is computed by section of the model, and its source. */
export const germanFormulas: readonly FormulaSource[] = [
  {
    section: '1 Zeit',
    what: '8760 oder 8784 Stunden Normalzeit mit festem Abstand zur Weltzeit, auf ein Kalenderjahr gelegt; Ortszeit nach der IANA-Zone; Preise sind Mittel über die Minuten der Stunde',
    source: '–',
  },
  {
    section: '2 Gradtage',
    what: '`hours` Σ max(0, b − T)/24; `mean`, `minmax`, `fourcase`, `threshold`',
    source: 'ISO 15927-6; Verfahren der USA; des Vereinigten Königreichs; der europäischen Statistik',
  },
  {
    section: '3 Feuchte Luft',
    what: 'Sättigungsdruck, Wassergehalt, Normatmosphäre',
    source: 'Hyland–Wexler, ASHRAE Fundamentals Kap. 1 Gl. 5 und 6; ISO 2533',
  },
  {
    section: '4 Bedarf',
    what: 'Gradstunden mit Gewinnen und der Sonne eines Tages; oder fünf Widerstände und eine Kapazität',
    source: 'ISO 13790:2008 Anhang C',
  },
  {
    section: '5 Vorlauftemperatur',
    what: 'fest, Kurve, oder Heizflächen T_f = Raum + ΔT_m·x^(1/n) + x·s/2',
    source: 'EN 442',
  },
  {
    section: '6 Leistungstabelle',
    what: 'Leistung und η = COP/κ bilinear, κ = (F + 276,15)/max(F − T + 10, 15); Regeln außerhalb der Tabelle',
    source: 'Carnot; Prüfpunkte der EN 14511',
  },
  {
    section: '7 Abtauen',
    what: 'Werte mit Abtauen, oder Verlust nach Feuchte, oder eine Tabelle',
    source: 'EN 14511; feuchte Luft nach ASHRAE',
  },
  {
    section: '8 Warmwasser',
    what: 'eine Speichertemperatur, Entnahmen, Bereitschaftsverlust, Nachladen, wöchentliches Aufheizen',
    source: 'Zapfprofile der Verordnung (EU) 814/2013',
  },
  {
    section: '9 Betrieb',
    what: 'COP linear zwischen kleinster Stufe und Volllast; Takten COP_min·(1 − C_d·(1 − CR)); Wärme, die wartet',
    source: 'EN 14825, AHRI 210/240 (C_d 0,25)',
  },
  { section: '10 Zusatzheizung', what: 'parallel, alternativ, günstigste Quelle der Stunde', source: '–' },
  { section: '11 Bilanzgrenzen', what: 'H2, H3, H4', source: 'SEPEMO-Build, Beschluss 2013/114/EU' },
  {
    section: '12 Geld',
    what: 'Preisstufen in Ortszeit, Preisreihen, Mengenstufen, Grund- und Leistungspreis, Steuern, Gutschriften; Haushalt; Kessel; Kohlendioxid; über die Jahre, gleiche Kosten, andere Preise',
    source: 'Verordnung (EU) 2018/2066 Anhang VI; EN 15459-1',
  },
];
