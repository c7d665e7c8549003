/** Values at the crossings of two axes, both rising, each of at least two entries. */
export interface Field {
  readonly x: ArrayLike<number>;
  readonly y: ArrayLike<number>;
  /** Row-major, y × x. */
  readonly values: ArrayLike<number>;
}

/** A piece of a line of one value: from x, y to x, y. */
export type Segment = readonly [number, number, number, number];

/**
 * Lines along which a field has one value, taken as linear along the edges of its cells.
 *
 * @param field finite values
 * @param level the value
 * @returns pieces, one or two a cell, in the order of the cells; in a saddle the mean of the corners decides
 * @example contourLines({ x: [0, 1], y: [0, 1], values: [0, 1, 0, 1] }, 0.25) // [[0.25, 0, 0.25, 1]]
 *
 * Reference: Lorensen and Cline, Computer Graphics 21 (1987) 163–169, in the plane (marching squares).
 */
export function contourLines(field: Field, level: number): Segment[] {
  const segments: Segment[] = [];
  const columns = field.x.length;
  for (let row = 0; row + 1 < field.y.length; row++) {
    for (let column = 0; column + 1 < columns; column++) segments.push(...segmentsOfCell(field, row, column, level));
  }
  return segments;
}

type Point = readonly [number, number];

/** Corners of a cell around it: south-west, south-east, north-east, north-west. */
function segmentsOfCell({ x, y, values }: Field, row: number, column: number, level: number): Segment[] {
  const columns = x.length;
  const places: Point[] = [
    [x[column], y[row]],
    [x[column + 1], y[row]],
    [x[column + 1], y[row + 1]],
    [x[column], y[row + 1]],
  ];
  const corner = row * columns + column;
  const heights = [values[corner], values[corner + 1], values[corner + columns + 1], values[corner + columns]];
  const crossings = heights.flatMap((from, edge): Point[] => {
    const next = (edge + 1) % 4;
    const to = heights[next];
    return from < level === to < level ? [] : [between(places[edge], places[next], (level - from) / (to - from))];
  });
  if (crossings.length < 2) return [];
  if (crossings.length === 2) return [[...crossings[0], ...crossings[1]]];
  // With four crossings the line goes around the corners that lie on the other side than the middle.
  const middleAbove = heights.reduce((sum, height) => sum + height, 0) / 4 >= level;
  const aroundFirst = heights[0] >= level !== middleAbove;
  const [a, b, c, d] = crossings;
  return aroundFirst
    ? [
        [...d, ...a],
        [...b, ...c],
      ]
    : [
        [...a, ...b],
        [...c, ...d],
      ];
}

function between([x0, y0]: Point, [x1, y1]: Point, share: number): Point {
  return [x0 + share * (x1 - x0), y0 + share * (y1 - y0)];
}
