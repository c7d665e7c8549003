import { inflateSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { base64 } from '../../../../src/report/charts/base64.ts';
import { colourRamp, RAMP_STEPS } from '../../../../src/report/charts/colourRamp.ts';
import { checkSum, indexedPng } from '../../../../src/report/charts/indexedPng.ts';

/** Chunks of a PNG by name, read by the standard's layout: length, name, content, check sum. */
function chunksOf(png: Uint8Array): Map<string, Buffer> {
  const bytes = Buffer.from(png);
  expect([...bytes.subarray(0, 8)]).toEqual([137, 80, 78, 71, 13, 10, 26, 10]);
  const chunks = new Map<string, Buffer>();
  for (let at = 8; at < bytes.length; ) {
    const length = bytes.readUInt32BE(at);
    const named = bytes.subarray(at + 4, at + 8 + length);
    expect(bytes.readUInt32BE(at + 8 + length)).toBe(checkSum(named));
    chunks.set(named.toString('latin1', 0, 4), named.subarray(4));
    at += 12 + length;
  }
  return chunks;
}

describe('a picture as PNG', () => {
  const palette = [
    [255, 0, 0],
    [0, 255, 0],
    [1, 2, 3],
  ] as const;
  const png = indexedPng({ width: 3, height: 2, points: Uint8Array.of(0, 1, 2, 2, 1, 0), palette });

  it('has the chunks of an indexed picture with its size', () => {
    const chunks = chunksOf(png);
    expect([...chunks.keys()]).toEqual(['IHDR', 'PLTE', 'IDAT', 'IEND']);
    expect([...chunks.get('IHDR')!]).toEqual([0, 0, 0, 3, 0, 0, 0, 2, 8, 3, 0, 0, 0]);
    expect([...chunks.get('PLTE')!]).toEqual([255, 0, 0, 0, 255, 0, 1, 2, 3]);
  });

  it('gives its points back row by row, each row behind its filter byte', () => {
    expect([...inflateSync(chunksOf(png).get('IDAT')!)]).toEqual([0, 0, 1, 2, 0, 2, 1, 0]);
  });
});

describe('the check sum', () => {
  it('is that which the standards give for 123456789', () => {
    // Check value of CRC-32 (ISO 3309) over the nine digits, as in the catalogues of check sums: CBF43926.
    expect(checkSum(new TextEncoder().encode('123456789'))).toBe(0xcbf43926);
  });
});

describe('base64', () => {
  // Test vectors of RFC 4648, section 10.
  it.each([
    ['', ''],
    ['f', 'Zg=='],
    ['fo', 'Zm8='],
    ['foo', 'Zm9v'],
    ['foob', 'Zm9vYg=='],
    ['fooba', 'Zm9vYmE='],
    ['foobar', 'Zm9vYmFy'],
  ])('writes %j as %j', (text, expected) => {
    expect(base64(new TextEncoder().encode(text))).toBe(expected);
  });
});

describe('the colours of a ramp', () => {
  // Relative luminance with the weights of ITU-R BT.709, without gamma: enough to see a turn.
  const lightness = ([red, green, blue]: readonly number[]) => 0.2126 * red! + 0.7152 * green! + 0.0722 * blue!;

  it.each([
    ['energy', -1],
    ['price', -1],
    ['warmth', 1],
  ] as const)('of %s grow in one direction of lightness, so that they are read without colour', (name, direction) => {
    const ramp = colourRamp(name).map(lightness);
    expect(ramp.length).toBe(RAMP_STEPS);
    for (let i = 1; i < ramp.length; i++) expect(direction * (ramp[i]! - ramp[i - 1]!)).toBeGreaterThan(0);
    expect(Math.abs(ramp[0]! - ramp[RAMP_STEPS - 1]!)).toBeGreaterThan(150);
  });
});
