import { describe, expect, test } from 'vitest';
import { heightStrip, lyingBar, rangeOf } from '../../../../src/report/terminal/blocks.ts';

describe('a bar of block letters', () => {
  test.each([
    [3, 4, 4, '███'],
    [4, 4, 4, '████'],
    [0, 4, 4, ''],
    [1, 16, 2, '▏'],
    [15, 16, 1, '█'],
  ])('of %d where %d is %d letters', (value, most, width, bar) => {
    expect(lyingBar(value, most, width)).toBe(bar);
  });

  test('shows a value far too small for an eighth as an eighth', () => {
    expect(lyingBar(0.001, 1000, 10)).toBe('▏');
  });
});

describe('a strip of heights', () => {
  test('stands lowest at the lowest of its range and highest at its highest', () => {
    expect(heightStrip([0, 1, 2], 1, { least: 0, most: 2 })).toBe('▁▅█');
    expect(heightStrip([1, 2], 2, rangeOf([1, 2]))).toBe('▁▁██');
  });

  test('of values all alike is level', () => {
    expect(heightStrip([5, 5, 5], 1, rangeOf([5, 5, 5]))).toBe('▁▁▁');
  });

  test('shares a scale with others', () => {
    expect(heightStrip([2, 2], 1, { least: 1, most: 3 })).toBe('▅▅');
  });
});
