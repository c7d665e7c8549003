import { median } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { homeMedians, medianMap } from '../../../../../src/report/html/batch/medianMap.ts';
import { batchReportOf } from './batchReports.ts';

const axes = [
  { name: 'unit', values: ['a', 'b', 'c'] },
  { name: 'flow', values: [35, 55] },
  { name: 'price', values: [0.2, 0.3, 0.4, 0.5] },
];
// A figure in which nothing is alike and no order is kept.
const mixed = (home: number, labels: readonly unknown[], job: number) => ({
  cost: 100 + ((job * 7919 + home * 31 + String(labels[0]).charCodeAt(0) * 17) % 997),
});

describe('the map of medians', () => {
  it('has in each cell the median over the homes and all other axes', () => {
    const input = batchReportOf({ homes: 7, axes, year: mixed, chosen: ['unit', 'flow'] });
    const map = medianMap(input, 8);
    if (typeof map === 'string') throw new Error(map);
    const years = Array.from({ length: 7 * 24 }, (_, i) => {
      // 3 units × 2 temperatures × 4 prices in each home, the price changing first.
      const labels = [axes[0]!.values[Math.floor((i % 24) / 8)]!, axes[1]!.values[Math.floor((i % 8) / 4)]!];
      return { labels, cost: mixed(Math.floor(i / 24), labels, i + 1).cost };
    });
    const cell = (unit: string, flow: number) =>
      years.filter(({ labels }) => labels[0] === unit && labels[1] === flow).map(({ cost }) => cost);
    const expected = ['a', 'b', 'c'].flatMap((unit) => [35, 55].map((flow) => median(cell(unit, flow))));
    expect(map.medians).toEqual(expected);
    expect(map.medians.length).toBe(6);
    expect([map.down.axis, map.across.axis]).toEqual(['unit', 'flow']);
  });

  it('takes the two axes with most values where none are named', () => {
    const map = medianMap(batchReportOf({ axes, year: mixed }), 8);
    expect(map).toMatchObject({ down: { axis: 'price' }, across: { axis: 'unit' } });
  });

  it('takes the named axes, the first of them down', () => {
    const map = medianMap(batchReportOf({ axes, year: mixed, chosen: ['flow', 'price'] }), 8);
    expect(map).toMatchObject({ down: { axis: 'flow' }, across: { axis: 'price' } });
  });

  it('puts neighbouring values together where there are more than fit', () => {
    const long = [
      { name: 'loss', values: Array.from({ length: 50 }, (_, i) => 100 + i) },
      { name: 'price', values: [1, 2, 3, 4, 5] },
    ];
    const input = batchReportOf({
      axes: long,
      year: (_, [loss, price]) => ({ cost: Number(loss) + 1000 * Number(price) }),
    });
    const map = medianMap(input, 3);
    if (typeof map === 'string') throw new Error(map);
    // 50 values in at most 24 groups are threes; 5 in at most 3 are pairs.
    expect(map.down.names).toHaveLength(17);
    expect(map.down.names.slice(-2)).toEqual(['145 … 147', '148 … 149']);
    expect(map.across.names).toEqual(['1 … 2', '3 … 4', '5']);
    // losses 100, 101, 102 with prices 1 and 2: 1100, 1101, 1102, 2100, 2101, 2102
    expect(map.medians[0]).toBe(1601);
  });

  it('sets homes in groups beside the only axis, the least median first', () => {
    const input = batchReportOf({
      homes: 10,
      axes: [{ name: 'unit', values: ['a', 'b'] }],
      // Home 9 is the cheapest, home 0 the dearest.
      year: (home, [unit]) => ({ cost: 100 * (10 - home) + (unit === 'b' ? 10 : 0) }),
    });
    const map = medianMap(input, 8);
    if (typeof map === 'string') throw new Error(map);
    expect(map.across).toEqual({ axis: undefined, names: ['1/5', '2/5', '3/5', '4/5', '5/5'], size: 1 });
    expect(map.medians).toEqual([150, 350, 550, 750, 950, 160, 360, 560, 760, 960]);
  });

  it('leaves a cell empty where no year has the figure', () => {
    const input = batchReportOf({
      axes: axes.slice(0, 2),
      year: (_, [unit, flow]) => (unit === 'b' && flow === 55 ? { fails: true } : { cost: 5 }),
    });
    expect(medianMap(input, 8)).toMatchObject({ medians: [5, 5, 5, undefined, 5, 5] });
  });

  it('says why there is none', () => {
    expect(medianMap(batchReportOf({ homes: 3, year: mixed }), 8)).toBe('noAxis');
    expect(medianMap(batchReportOf({ axes: axes.slice(0, 1), year: mixed }), 8)).toBe('oneAxis');
  });
});

describe('the median of a home', () => {
  it('is taken over its options, those that failed left out', () => {
    const input = batchReportOf({
      homes: 3,
      axes: [{ name: 'unit', values: ['a', 'b', 'c'] }],
      year: (home, [unit]) =>
        home === 2 || (home === 1 && unit === 'c') ? { fails: true } : { cost: home * 10 + (unit === 'a' ? 1 : 4) },
    });
    expect([...homeMedians(input).medians]).toEqual([4, 12.5, Number.NaN]);
  });
});
