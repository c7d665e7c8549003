import { expect, test } from 'vitest';
import { polylineAt } from '../../../src/core/polyline.ts';

const line = { at: [-10, 0, 20], value: [55, 45, 25] };

test('a polyline has its values at its points', () => {
  expect(line.at.map((x) => polylineAt(line, x))).toEqual([55, 45, 25]);
});

test('between two points it is straight', () => {
  expect(polylineAt(line, -5)).toBe(50);
  expect(polylineAt(line, 5)).toBe(40);
  expect(polylineAt(line, 19)).toBe(26);
});

test('its ends are held', () => {
  expect(polylineAt(line, -40)).toBe(55);
  expect(polylineAt(line, 1e9)).toBe(25);
});

test('of one point it is that value everywhere', () => {
  expect([-1, 0, 1].map((x) => polylineAt({ at: [0], value: [7] }, x))).toEqual([7, 7, 7]);
});

test('with many pieces it takes the piece that holds the place', () => {
  const at = Array.from({ length: 30 }, (_, i) => i);
  // squares: the chord from i to i + 1 lies a quarter above the square in its middle
  const squares = { at, value: at.map((x) => x * x) };
  for (let i = 0; i < 29; i++) expect(polylineAt(squares, i + 0.5)).toBe((i + 0.5) ** 2 + 0.25);
});
