import { mean, sampleSkewness, standardDeviation } from 'simple-statistics';
import { describe, expect, it } from 'vitest';
import { hashOfText, seededDraws } from '../../../scripts/demo/seededDraws.ts';

describe('seeded draws', () => {
  it('hash a text as FNV-1a does', () => {
    // Test values of the 32-bit FNV-1a hash published by its authors (Fowler, Noll, Vo), from memory.
    expect(hashOfText('')).toBe(0x811c9dc5);
    expect(hashOfText('a')).toBe(0xe40c292c);
    expect(hashOfText('foobar')).toBe(0xbf9cf968);
  });

  it('are the same for the same seed and unlike for seeds that differ by a letter', () => {
    const [one, again, other] = [seededDraws('town 1'), seededDraws('town 1'), seededDraws('town 2')];
    const first = Array.from({ length: 5 }, one.uniform);
    expect(Array.from({ length: 5 }, again.uniform)).toEqual(first);
    expect(Array.from({ length: 5 }, other.uniform)).not.toEqual(first);
  });

  it('begin evenly spread over the seeds, which the bare generator does not for small seeds', () => {
    const firsts = Array.from({ length: 400 }, (_, i) => seededDraws(String(i)).uniform());
    // Mean of 400 even draws: 0.5 with a standard error of 0.289/20 = 0.0144; four of them are allowed.
    expect(Math.abs(mean(firsts) - 0.5)).toBeLessThan(0.058);
    expect(firsts.filter((draw) => draw < 0.25).length).toBeGreaterThan(65); // 100 expected, standard deviation 8.7
  });

  it('give normal draws of mean 0 and standard deviation 1, as often left as right', () => {
    const draws = seededDraws('normal');
    const normal = Array.from({ length: 40_000 }, draws.normal);
    // Standard errors 0.005, 0.0035 and 0.012; four of each are allowed.
    expect(Math.abs(mean(normal))).toBeLessThan(0.02);
    expect(Math.abs(standardDeviation(normal) - 1)).toBeLessThan(0.014);
    expect(Math.abs(sampleSkewness(normal))).toBeLessThan(0.05);
  });
});
