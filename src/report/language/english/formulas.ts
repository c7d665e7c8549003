/** What is computed by section of the model, and its source; the table of docs/model.md. */
export const englishFormulas = [
  {
    section: '1 Time',
    what: '8760 or 8784 hours of standard time with a fixed offset, laid on a calendar year; civil time through the IANA zone; prices are means over the minutes of a step',
    source: '–',
  },
  {
    section: '2 Degree days',
    what: '`hours` Σ max(0, b − T)/24; `mean`, `minmax`, `fourcase`, `threshold`',
    source: 'ISO 15927-6; US convention; UK convention; European statistics',
  },
  {
    section: '3 Humid air',
    what: 'saturation pressure, humidity ratio, standard atmosphere',
    source: 'Hyland–Wexler, ASHRAE Fundamentals ch. 1 eq. 5 and 6; ISO 2533',
  },
  {
    section: '4 Need',
    what: 'degree hours with gains and a day’s sun; or five resistances and one capacity',
    source: 'ISO 13790:2008 annex C',
  },
  {
    section: '5 Flow temperature',
    what: 'fixed, curve, or emitters T_f = room + ΔT_m·x^(1/n) + x·s/2',
    source: 'EN 442',
  },
  {
    section: '6 Map',
    what: 'capacity and η = COP/κ bilinear, κ = (F + 276.15)/max(F − T + 10, 15); rules outside the grid',
    source: 'Carnot; EN 14511 rating points',
  },
  {
    section: '7 Defrost',
    what: 'values integrated, or loss by humidity, or a table',
    source: 'EN 14511; ASHRAE humid air',
  },
  {
    section: '8 Hot water',
    what: 'one cylinder temperature, draws, standing loss, reheat, weekly hygiene run',
    source: 'Regulation (EU) 814/2013 tapping profiles',
  },
  {
    section: '9 Running',
    what: 'linear COP between lowest level and full load; cycling COP_min·(1 − C_d·(1 − CR)); heat that waits',
    source: 'EN 14825, AHRI 210/240 (C_d 0.25)',
  },
  { section: '10 Backup', what: 'parallel, alternative, cheapest source of the hour', source: '–' },
  { section: '11 Boundaries', what: 'H2, H3, H4', source: 'SEPEMO-Build, Decision 2013/114/EU' },
  {
    section: '12 Money',
    what: 'rates in civil time, price series, blocks, standing and demand charges, taxes, credits; household; boiler; carbon; whole life, break-even, other prices',
    source: 'Regulation (EU) 2018/2066 annex VI; EN 15459-1',
  },
];
