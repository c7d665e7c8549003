import { inflateSync } from 'node:zlib';
import { scaleLinear } from 'd3-scale';
import { describe, expect, it } from 'vitest';
import { leftRoom, ticksOf } from '../../../../src/report/charts/axes.ts';
import { barStrip } from '../../../../src/report/charts/barStrip.ts';
import { carpet } from '../../../../src/report/charts/carpet.ts';
import { colourRamp, RAMP_STEPS } from '../../../../src/report/charts/colourRamp.ts';
import { densityField } from '../../../../src/report/charts/densityField.ts';
import { heatMap, isDark, mostColumns } from '../../../../src/report/charts/heatMap.ts';
import { lineChart } from '../../../../src/report/charts/lineChart.ts';
import { quantileBoxes } from '../../../../src/report/charts/quantileBoxes.ts';
import { stackedBars } from '../../../../src/report/charts/stackedBars.ts';
import { strokesOf } from '../../../../src/report/charts/texture.ts';

const written = (value: number, decimals: number) => value.toFixed(decimals);
const text = { id: 'x', title: 'A title', description: 'What is seen' };

/** Rectangles of the fills of a tone: `M x y h width v height h −width z`. */
function rectanglesOf(svg: string, tone: number): { x: number; y: number; width: number; height: number }[] {
  const path = new RegExp(`<path d="([^"]*)" class="fill t${tone}"`).exec(svg)?.[1] ?? '';
  return [...path.matchAll(/M([-\d.]+) ([-\d.]+)h([-\d.]+)v([-\d.]+)/g)].map(([, ...numbers]) => {
    const [x, y, width, height] = numbers.map(Number);
    return { x: x!, y: y!, width: width!, height: height! };
  });
}

describe('ticks', () => {
  it('have as many decimals as their step asks for', () => {
    const labels = (to: number, count: number) =>
      ticksOf(scaleLinear([0, to], [0, 100]), count, written).map(({ label }) => label);
    expect(labels(10, 5)).toEqual(['0', '2', '4', '6', '8', '10']);
    expect(labels(1, 5)).toEqual(['0.0', '0.2', '0.4', '0.6', '0.8', '1.0']);
    expect(labels(0.3, 3)).toEqual(['0.0', '0.1', '0.2', '0.3']);
    expect(labels(0.1, 2)).toEqual(['0.00', '0.05', '0.10']);
  });

  it('ask for more room the longer their labels are', () => {
    const room = (label: string) => leftRoom([{ place: 0, label }]);
    expect(room('−100 000')).toBeGreaterThan(room('100'));
  });
});

describe('stacked bars', () => {
  const svg = stackedBars({
    ...text,
    labels: ['a', 'b'],
    series: [
      { look: { tone: 1, texture: 'plain' }, values: [30, 10] },
      { look: { tone: 3, texture: 'falling' }, values: [10, 30] },
    ],
    quantity: 'kWh',
    categories: '',
    written,
  }).text;

  it('stand on each other, as high as their values', () => {
    const [below, above] = [rectanglesOf(svg, 1), rectanglesOf(svg, 3)];
    expect(below.length).toBe(2);
    // Coordinates are tenths, so heights are right to a tenth.
    expect(below[0]!.height / below[1]!.height).toBeCloseTo(3, 1);
    for (const bar of [0, 1]) {
      expect(above[bar]!.y + above[bar]!.height).toBeCloseTo(below[bar]!.y, 0);
      expect(above[bar]!.x).toBe(below[bar]!.x);
    }
    expect(below[0]!.height + above[0]!.height).toBeCloseTo(below[1]!.height + above[1]!.height, 0);
  });

  it('are named for those who do not see them', () => {
    expect(svg).toContain('role="img" aria-labelledby="x-title x-says"');
    expect(svg).toContain('<title id="x-title">A title</title><desc id="x-says">What is seen</desc>');
  });

  it('draw values below zero below the line, and nothing for zeros', () => {
    const series = [{ look: { tone: 1, texture: 'plain' } as const, values: [5, -5, 0] }];
    const below = stackedBars({ ...text, labels: ['a', 'b', 'c'], series, quantity: '', categories: '', written }).text;
    const [up, down, ...others] = rectanglesOf(below, 1);
    expect(down!.y).toBeCloseTo(up!.y + up!.height, 0);
    expect(others).toEqual([]);
  });

  it('stack what is below zero downwards from the line, apart from what is above', () => {
    const series = [
      { look: { tone: 1, texture: 'plain' } as const, values: [10] },
      { look: { tone: 3, texture: 'plain' } as const, values: [-4] },
    ];
    const mixed = stackedBars({ ...text, labels: ['a'], series, quantity: '', categories: '', written }).text;
    const [[up], [down]] = [rectanglesOf(mixed, 1), rectanglesOf(mixed, 3)];
    expect(down!.y).toBeCloseTo(up!.y + up!.height, 0);
    expect(up!.height / down!.height).toBeCloseTo(2.5, 1);
  });

  it('can be made of nothing but zeros', () => {
    const series = [{ look: { tone: 1, texture: 'plain' } as const, values: [0, 0] }];
    const svg = stackedBars({ ...text, labels: ['a', 'b'], series, quantity: '', categories: '', written }).text;
    expect(svg).not.toContain('NaN');
  });
});

describe('a lying bar', () => {
  const width = (value: number, range: [number, number]) =>
    rectanglesOf(barStrip(value, range, { tone: 1, texture: 'plain' }).text, 1)[0]?.width ?? 0;

  it('is as long as its value against the others', () => {
    expect(width(50, [0, 100]) / width(100, [0, 100])).toBeCloseTo(0.5, 2);
  });

  it('lies left of the line below zero, and is none at zero', () => {
    const svg = barStrip(-20, [-20, 80], { tone: 1, texture: 'plain' }).text;
    const [bar] = rectanglesOf(svg, 1);
    const line = Number(/<path d="M([\d.]+) 0V/.exec(svg)?.[1]);
    expect(bar!.x + bar!.width).toBeCloseTo(line, 0);
    expect(width(0, [0, 0])).toBe(0);
  });
});

describe('a carpet', () => {
  const values = new Float64Array(48);
  values[5] = 1; // day 0, hour 5
  values[47] = 0.5; // day 1, hour 23
  const svg = carpet({
    ...{ ...text, values, range: [0, 1], ramp: 'energy', quantity: 'kWh', written },
    months: [{ day: 0, label: 'J' }],
  }).text;

  it('has the hours from the bottom up and the days from left to right', () => {
    const png = Buffer.from(/base64,([^"]+)"/.exec(svg)![1]!, 'base64');
    const at = png.indexOf('IDAT') + 4;
    const rows = inflateSync(png.subarray(at, at + png.readUInt32BE(at - 8)));
    // Two days: a filter byte and two points a row; hour 23 is row 0, hour 5 is row 18.
    const point = (row: number, day: number) => rows[row * 3 + 1 + day];
    expect(rows.length).toBe(24 * 3);
    expect(point(18, 0)).toBe(RAMP_STEPS - 1);
    expect(point(0, 1)).toBe(Math.round((RAMP_STEPS - 1) / 2));
    expect(rows.reduce((sum, value) => sum + (value === 0 ? 0 : 1), 0)).toBe(2);
  });
});

describe('a chart of lines', () => {
  const chart = { ...text, steps: false, xRange: [0, 10] as const, xTitle: 'h', yTitle: 'kW', marks: [], written };
  const points = (svg: string) =>
    [.../<path d="M([^"]*)" class="line/.exec(svg)![1]!.matchAll(/([\d.]+),([\d.]+)/g)].map(([, x, y]) => [
      Number(x),
      Number(y),
    ]);

  it('draws a straight line straight, up for more', () => {
    const svg = lineChart({ ...chart, series: [{ kind: 1, x: [0, 5, 10], y: [0, 5, 10] }] }).text;
    const [first, middle, last] = points(svg);
    expect(middle![0]).toBeCloseTo((first![0]! + last![0]!) / 2, 0);
    expect(middle![1]).toBeCloseTo((first![1]! + last![1]!) / 2, 0);
    expect(last![1]).toBeLessThan(first![1]!);
  });

  it('writes the name of a mark as text', () => {
    const svg = lineChart({ ...chart, series: [], marks: [{ x: 2, label: '<48 h>' }] }).text;
    expect(svg).toContain('&lt;48 h&gt;');
    expect(svg).not.toContain('NaN');
  });
});

describe('a field', () => {
  it('is darkest where the most is, with a label on each line that is there', () => {
    const svg = densityField({
      ...text,
      cells: [
        { x: 0, y: 0, amount: 1 },
        { x: 2, y: 2, amount: 12 },
      ],
      ...{ cellWidth: 2, cellHeight: 2, levels: [0.5, 7], points: [[1, 1]], xTitle: 'T', yTitle: 'F', written },
      ...{ xRange: [0, 4], yRange: [0, 4], contours: { x: [0, 4], y: [0, 4], values: [0, 1, 0, 1] } },
    }).text;
    expect(svg).toMatch(/class="shade d1".*class="shade d6"/);
    expect(svg.match(/class="contour"/g)?.length).toBe(1);
    expect(svg).toContain('>0.5</text>');
  });
});

describe('strokes of a texture', () => {
  it.each(['rising', 'falling', 'level'] as const)('%s stay within their rectangle', (texture) => {
    const path = strokesOf({ x: 10, y: 20, width: 33, height: 17 }, texture);
    const lines = [...path.matchAll(/M([\d.]+) ([\d.]+)(?:h([\d.]+)|L([\d.]+) ([\d.]+))/g)];
    expect(lines.length).toBeGreaterThan(2);
    for (const [, x0, y0, across, x1, y1] of lines) {
      const xs = [Number(x0), across === undefined ? Number(x1) : Number(x0) + Number(across)];
      const ys = [Number(y0), y1 === undefined ? Number(y0) : Number(y1)];
      expect(Math.min(...xs)).toBeGreaterThanOrEqual(10);
      expect(Math.max(...xs)).toBeLessThanOrEqual(43);
      expect(Math.min(...ys)).toBeGreaterThanOrEqual(20);
      expect(Math.max(...ys)).toBeLessThanOrEqual(37);
    }
  });

  it('are none on a plain surface', () => {
    expect(strokesOf({ x: 0, y: 0, width: 10, height: 10 }, 'plain')).toBe('');
  });
});

describe('a chart of counts', () => {
  it('has no tick between whole numbers', () => {
    const ticksAt = (values: number[], whole: boolean) =>
      [
        ...stackedBars({
          ...{ ...text, quantity: 'Homes', categories: '', written, whole, labels: values.map(() => '') },
          series: [{ look: { tone: 1, texture: 'plain' }, values }],
        }).text.matchAll(/class="end">([^<]*)</g),
      ].map(([, label]) => Number(label));
    expect(ticksAt([1, 1], true)).toEqual([0, 1]);
    expect(ticksAt([3, 1], true)).toEqual([0, 1, 2, 3]);
    expect(ticksAt([400, 1], true)).toEqual([0, 100, 200, 300, 400]);
    expect(ticksAt([1, 1], false).some((value) => !Number.isInteger(value))).toBe(true);
  });
});

describe('a map of figures', () => {
  const map = (values: (number | undefined)[]) =>
    heatMap({
      ...{ ...text, rows: ['a', 'b'], columns: ['x', 'y'], rowTitle: 'r', columnTitle: 'c' },
      ...{ values, ramp: 'warmth', decimals: 1, written },
    }).text;

  it('has the colours of the ends of its ramp at the least and the greatest value', () => {
    const svg = map([1, 2, undefined, 3]);
    const colours = [...svg.matchAll(/fill="rgb\(([^)]*)\)"/g)].map(([, colour]) => colour);
    expect([colours[0], colours[2]]).toEqual(['20,24,66', '247,234,176']);
    expect([...svg.matchAll(/class="mid(?: on-\w+)?">([\d.–]+)</g)].map(([, value]) => value)).toEqual([
      '1.0',
      '2.0',
      '–',
      '3.0',
    ]);
  });

  it('writes in each cell so that the contrast is at least 4.5', () => {
    // WCAG 2.2, success criterion 1.4.3; luminance by its definition, each channel linear.
    const light = (channel: number) =>
      channel / 255 <= 0.04045 ? channel / 3294.6 : ((channel / 255 + 0.055) / 1.055) ** 2.4;
    const luminance = ([r, g, b]: readonly [number, number, number]) =>
      0.2126 * light(r) + 0.7152 * light(g) + 0.0722 * light(b);
    for (const ramp of ['energy', 'price', 'warmth'] as const) {
      for (const colour of colourRamp(ramp)) {
        const contrast = isDark(colour) ? 1.05 / (luminance(colour) + 0.05) : (luminance(colour) + 0.05) / 0.05;
        expect(contrast).toBeGreaterThanOrEqual(4.5);
      }
    }
  });

  it('takes values that are all the same', () => {
    expect(map([2, 2, 2, 2])).not.toMatch(/NaN|Infinity/);
  });

  it('has the more columns the shorter its figures are', () => {
    expect(mostColumns('9')).toBeGreaterThan(mostColumns('12 345'));
    expect(mostColumns('9'.repeat(500))).toBe(1);
  });
});

describe('spreads below one another', () => {
  const box = { name: 'a', q05: 10, q25: 20, median: 30, q75: 40, q95: 50 };
  const svg = quantileBoxes({
    ...text,
    boxes: [box, { ...box, name: 'b', median: 25 }],
    quantity: 'kWh',
    decimals: 0,
    written,
  }).text;

  it('have box and median at their places on the scale below', () => {
    const ticks = [...svg.matchAll(/<text x="([\d.]+)" y="[\d.]+" class="mid">(\d+)</g)].map(
      ([, x, label]) => [Number(x), Number(label)] as const,
    );
    expect(ticks.map(([, label]) => label)).toEqual([10, 20, 30, 40, 50]);
    const placeOf = (value: number) => ticks.find(([, label]) => label === value)![0];
    const [, from, to] = /<path d="M([\d.]+) [\d.]+H([\d.]+)v10H[\d.]+z" class="box"/.exec(svg)!;
    expect([Number(from), Number(to)]).toEqual([placeOf(20), placeOf(40)]);
    const medians = [...svg.matchAll(/<path d="M([\d.]+) [\d.]+v12" class="median"/g)].map(([, x]) => Number(x));
    expect(medians[0]).toBe(placeOf(30));
    // Half way between two ticks; a coordinate is rounded to tenths.
    expect(medians[1]).toBeCloseTo((placeOf(20) + placeOf(30)) / 2, 0);
  });

  it('take a spread without width', () => {
    const flat = { name: 'x', q05: 5, q25: 5, median: 5, q75: 5, q95: 5 };
    expect(quantileBoxes({ ...text, boxes: [flat], quantity: '', decimals: 0, written }).text).not.toMatch(
      /NaN|Infinity/,
    );
  });
});
