import { describe, expect, test } from 'vitest';
import { editDistance, nearestName } from '../../../src/core/nearest.ts';

describe('the nearest known name', () => {
  test.each([
    ['heatLos', ['heatLoss', 'house'], 'heatLoss'],
    ['HEATLOSS', ['heatLoss', 'house'], 'heatLoss'],
    ['monday', ['mon', 'tue', 'wed'], 'mon'],
    ['degree', ['lumped', 'degreeHours'], 'degreeHours'],
    ['folw', ['flow', 'return'], 'flow'],
  ])('to %s among %j is %s', (word, known, near) => {
    expect(nearestName(word, known)).toBe(near);
  });

  test('is none where every name is further than a third of the letters', () => {
    expect(nearestName('window', ['flow', 'return'])).toBeUndefined();
    expect(nearestName('x', [])).toBeUndefined();
  });

  test('is none for a text too long to be a slip of the pen', () => {
    expect(nearestName('a'.repeat(61), ['a'.repeat(61)])).toBeUndefined();
    expect(nearestName('a'.repeat(60), ['a'.repeat(59)])).toBe('a'.repeat(59));
  });
});

describe('the edit distance', () => {
  // kitten/sitting is 3 in Wagner and Fischer's textbook example (from memory); the rest is counted by hand.
  test.each([
    ['kitten', 'sitting', 3],
    ['flow', 'folw', 1],
    ['', 'abc', 3],
    ['abc', '', 3],
    ['same', 'same', 0],
  ])('from %j to %j is %d', (a, b, steps) => {
    expect(editDistance(a, b)).toBe(steps);
    expect(editDistance(b, a)).toBe(steps);
  });
});
