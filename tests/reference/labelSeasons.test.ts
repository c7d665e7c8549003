import { describe, expect, test } from 'vitest';
import type { SeasonEntry } from '../../src/report/seasonSchema.ts';
import { checkedLabel, labelFile, type WrittenLabel, type WrittenSeason } from '../unit/scenario/season/labelFiles.ts';
import { accuracySection } from './accuracyRecord.ts';

const accuracy = accuracySection(import.meta.url, 'Seasons of the energy label');
const scops = accuracy.comparison({
  what: 'SCOP of certified units from their declared points',
  source: 'Heat Pump KEYMARK certificate records, a public certification database, as copied records',
  unit: '%',
  allowed: 0.2,
  why: 'published SCOP and COPs are printed to 0.01',
});
const electricities = accuracy.comparison({
  what: 'annual electricity of the same',
  source: 'Heat Pump KEYMARK certificate records, a public certification database, as copied records',
  unit: '%',
  allowed: 0.3,
  why: 'the design load is printed to 0.01 kW as well',
});
const efficiencies = accuracy.comparison({
  what: 'seasonal efficiency η_s of the same',
  source: 'Heat Pump KEYMARK certificate records, a public certification database, as copied records',
  unit: 'points',
  allowed: 1,
  why: 'printed whole',
});
const withoutRule = accuracy.comparison({
  what: 'SCOP of one of them without the ±10 % rule',
  source: 'computed apart from this project',
  unit: '',
  allowed: 0.00005,
  why: 'half of the last digit',
});
const twoWays = accuracy.comparison({
  what: 'SCOP from a map beside that from the points it was built of',
  source: 'the two ways of this program',
  unit: '%',
  allowed: 1e-7,
  why: 'two computations of the same sum',
});

// Four results of certified reversible air-to-water units, average climate. Source: Heat Pump KEYMARK certificate records, a
// public certification database, as copied records; the figures of a season are capacity kW / COP as printed, T_biv and the
// design temperature among them.
const idleOfA = { off: 16, thermostatOff: 16, standby: 16, crankcase: 0 };
const idleOfB = { off: 12, thermostatOff: 41, standby: 12, crankcase: 30 };
const certified: readonly Certified[] = [
  {
    name: 'A, 35 °C',
    idlePowers: idleOfA,
    season: {
      ...{ climate: 'average', application: 35, designLoad: 5.29, bivalentTemperature: -10, operatingLimit: -22 },
      points: [
        ...points({ '-7': [4.68, 2.98], '2': [2.88, 4.18], '7': [1.83, 5.11], '-10': [5.29, 2.21] }),
        { outdoor: 12, capacity: 1.81, cop: 5.18, degradation: 0.954 },
        { outdoor: -10, capacity: 5.29, cop: 2.21 },
      ],
    },
    published: { scop: 4.18, electricity: 2615, efficiency: 164 },
  },
  {
    name: 'A, 55 °C',
    idlePowers: idleOfA,
    season: {
      ...{ climate: 'average', application: 55, designLoad: 5.14, bivalentTemperature: -10, operatingLimit: -22 },
      points: [
        ...points({ '-7': [4.54, 2.2], '2': [2.77, 3.42], '7': [1.86, 4.46], '-10': [5.14, 1.88] }),
        { outdoor: 12, capacity: 1.76, cop: 4.86, degradation: 0.959 },
        { outdoor: -10, capacity: 5.14, cop: 1.88 },
      ],
    },
    published: { scop: 3.45, electricity: 3078, efficiency: 135 },
  },
  {
    name: 'B, 35 °C',
    idlePowers: idleOfB,
    season: {
      ...{ climate: 'average', application: 35, designLoad: 6.76, bivalentTemperature: -7, operatingLimit: -10 },
      points: [
        ...points({ '-7': [5.98, 3.13], '2': [3.81, 4.64], '7': [3.13, 6.3], '12': [3.82, 8.48], '-10': [5.32, 2.87] }),
        { outdoor: -7, capacity: 5.98, cop: 3.13 },
      ],
    },
    published: { scop: 4.71, electricity: 2970, efficiency: 185 },
  },
  {
    name: 'B, 55 °C',
    idlePowers: idleOfB,
    season: {
      ...{ climate: 'average', application: 55, designLoad: 6.7, bivalentTemperature: -7, operatingLimit: -10 },
      points: [
        ...points({ '-7': [5.92, 2.5], '2': [3.79, 3.69], '7': [2.82, 4.52], '12': [3.66, 6.4], '-10': [5.35, 2.24] }),
        { outdoor: -7, capacity: 5.92, cop: 2.5 },
      ],
    },
    published: { scop: 3.66, electricity: 3774, efficiency: 144 },
  },
];

interface Certified {
  readonly name: string;
  readonly idlePowers: NonNullable<WrittenLabel['idlePowers']>;
  readonly season: WrittenSeason;
  readonly published: { readonly scop: number; readonly electricity: number; readonly efficiency: number };
}

function points(list: Record<string, [number, number]>) {
  return Object.entries(list).map(([outdoor, [capacity, cop]]) => ({ outdoor: Number(outdoor), capacity, cop }));
}

/** From the text of a unit file to the document: loader, checks, preparation, season. */
function ratedFromPoints({ idlePowers, season }: Pick<Certified, 'idlePowers' | 'season'>) {
  const label: WrittenLabel = { reversible: true, idlePowers, seasons: [season] };
  const rating = checkedLabel(labelFile(label)).seasons[0]?.points;
  if (rating === undefined || typeof rating === 'string') throw new Error('no points were rated');
  return rating;
}

describe('certified units, from their declared points', () => {
  test.each(certified)('$name meets its published SCOP, annual electricity and η_s', (unit) => {
    const { scop, electricity, efficiency } = ratedFromPoints(unit);
    const { published } = unit;
    // SCOP is printed to 0.01 and its COPs to 0.01: 0.2 % covers that rounding and sees each rule of the standard; Q_HE
    // follows from a design load rounded to 0.01 kW as well; η_s is printed whole.
    expect(Math.abs(scop / published.scop - 1)).toBeLessThan(0.002);
    expect(Math.abs(electricity / published.electricity - 1)).toBeLessThan(0.003);
    expect(Math.abs(efficiency - published.efficiency)).toBeLessThan(1);
    scops.add(100 * (scop / published.scop - 1));
    electricities.add(100 * (electricity / published.electricity - 1));
    efficiencies.add(efficiency - published.efficiency);
  });

  test('all four published results were compared, each with the six points as printed', () => {
    expect(certified).toHaveLength(4);
    for (const { season } of certified) expect(season.points).toHaveLength(6);
  });

  test('the tolerance sees the ±10 % rule: without it B at 35 °C comes out at 4.6955 and misses', () => {
    // Of B only the 2 °C point lies between its part load and 1.10 times that. Its COP with the loss by cycling worked in by
    // hand, CR/(0.9·CR + 0.1), is what the season would use without the rule; entered so, the rule leaves it as it is.
    const b = certified[2]!;
    const load = (6.76 * (16 - 2)) / (16 + 10);
    const ratio = load / 3.81;
    expect(ratio).toBeGreaterThan(1 / 1.1);
    expect(ratio).toBeLessThan(1);
    const worked = (4.64 * ratio) / (0.9 * ratio + 0.1);
    const changed = b.season.points!.map((point) => (point.outdoor === 2 ? { ...point, cop: worked } : point));
    const { scop } = ratedFromPoints({ ...b, season: { ...b.season, points: changed } });
    // 4.6955 was computed apart from this project; half of its last digit.
    expect(Math.abs(scop - 4.6955)).toBeLessThanOrEqual(0.00005);
    withoutRule.add(scop - 4.6955);
    expect(Math.abs(scop / b.published.scop - 1)).toBeGreaterThan(0.002);
  });

  test('the rule ends at 1.10 times the part load: a capacity just above it cycles, just below it does not', () => {
    const b = certified[2]!;
    const limit = (1.1 * 6.76 * (16 - 2)) / (16 + 10);
    const scopWith = (capacity: number) => {
      const changed = b.season.points!.map((point) => (point.outdoor === 2 ? { ...point, capacity } : point));
      return ratedFromPoints({ ...b, season: { ...b.season, points: changed } }).scop;
    };
    // above 2 °C capacities count by the rule alone, so below the limit nothing changes
    expect(scopWith(limit - 0.001)).toBe(scopWith(3.81));
    expect(scopWith(limit + 0.001)).toBeLessThan(0.997 * scopWith(3.81));
  });
});

describe('a map that is built from the declared points', () => {
  // Invented: COPs of a unit whose capacity is the part load at every point, so that it never cycles there; 35 °C outlet at
  // all temperatures, as a rating with a fixed outlet has it.
  const designLoad = 13;
  const cops: [number, number][] = [
    [-10, 2.4],
    [-7, 2.7],
    [2, 3.7],
    [7, 4.6],
    [12, 5.4],
  ];
  const loadAt = (outdoor: number) => (designLoad * (16 - outdoor)) / 26;
  const declared = cops.map(([outdoor, cop]) => ({ outdoor, capacity: loadAt(outdoor), cop }));
  const label: WrittenLabel = {
    reversible: true,
    idlePowers: { off: 10, thermostatOff: 20, standby: 10, crankcase: 5 },
    seasons: [
      {
        ...{ climate: 'average', application: 35, designLoad, bivalentTemperature: -10, operatingLimit: -10 },
        points: declared,
      },
    ],
    outlets: [
      {
        climate: 'average',
        application: 35,
        points: [
          [-7, 35],
          [12, 35],
        ],
      },
    ],
  };

  /** Both ways of rating, the map given by rows of outdoor temperature and COP and single-speed at the part load. */
  function bothWays(interpolation: 'linear' | 'carnotShare', rows: [number, number][]): SeasonEntry {
    const tableOf = (value: (row: [number, number]) => number) =>
      ['out W35', ...rows.map((row) => `${row[0]} ${value(row)}`)].join('\n');
    const map = {
      fullLoad: { capacity: tableOf(([outdoor]) => loadAt(outdoor)), cop: tableOf(([, cop]) => cop) },
      lowestLevel: { given: 'share', capacity: 1 },
      interpolation,
    };
    return checkedLabel(labelFile(label, { map })).seasons[0]!;
  }

  const scopsOf = ({ map, points: fromPoints }: SeasonEntry): [number, number] => {
    if (typeof map === 'string' || typeof fromPoints === 'string') throw new Error('not rated both ways');
    return [map.scop, fromPoints.scop];
  };

  test('gives the same SCOP both ways where the map is as linear as the label and reaches its warmest bin', () => {
    // the extension of the label along 7–12 °C, written out as a row of the map at 15 °C
    const warmest: [number, number] = [15, 5.4 + ((5.4 - 4.6) * 3) / 5];
    const [fromMap, fromPoints] = scopsOf(bothWays('linear', [...cops, warmest]));
    // Two computations of the same sum: rounding alone parts them.
    expect(Math.abs(fromMap / fromPoints - 1)).toBeLessThan(1e-9);
    twoWays.add(100 * (fromMap / fromPoints - 1));
  });

  test('with the usual map the two ways part by what lies between and beyond the points', () => {
    const [fromMap, fromPoints] = scopsOf(bothWays('carnotShare', cops));
    // Between points the map reads the share of the Carnot COP, the label the COP; above 12 °C the map's capacity is held
    // and the unit cycles, the label extends its line, though only 1.4 % of the heat is needed there. Less than 1.5 %.
    expect(Math.abs(fromMap / fromPoints - 1)).toBeLessThan(0.015);
    expect(fromMap).not.toBeCloseTo(fromPoints, 6);
  });
});
