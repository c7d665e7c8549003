import { expect, test } from 'vitest';
import { MARK } from '../../../src/sim/columns.ts';
import { prepareMap } from '../../../src/sim/heatPumpMap.ts';
import { marksOfPoint } from '../../../src/sim/mapMarks.ts';
import { roundTable } from './planBuilder.ts';

/** Rows from −10 to 10 °C, columns from 35 to 55 °C. */
const map = prepareMap(roundTable, 'carnotShare');

test.each([
  ['inside', 0, 45, 0],
  ['on its corners', -10, 35, 0],
  ['on the other corner', 10, 55, 0],
  ['on the edge but for rounding', -10 - 1e-12, 55 + 1e-12, 0],
  ['colder', -10.1, 45, MARK.outsideMap],
  ['warmer', 10.1, 45, MARK.outsideMap],
  ['hotter', 0, 55.1, MARK.outsideMap],
  ['below the lowest flow', 0, 34.9, MARK.belowLowestFlow],
  ['colder and below the lowest flow', -11, 34, MARK.outsideMap | MARK.belowLowestFlow],
])('%s: the point %d/%d is marked so', (_, outdoor, flow, marks) => {
  expect(marksOfPoint(map, outdoor, flow)).toBe(marks);
});
