import { zlibSync } from 'fflate';

/** Red, green, blue, each 0 … 255. */
export type Colour = readonly [number, number, number];

const SIGNATURE = Uint8Array.of(0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a);
const EIGHT_BITS = 8;
const INDEXED = 3;

/** A picture whose points are numbers of a palette. */
export interface IndexedPicture {
  readonly width: number;
  readonly height: number;
  /** Row by row from the top left, each a number of the palette. */
  readonly points: Uint8Array;
  /** At most 256 colours. */
  readonly palette: readonly Colour[];
}

/**
 * A picture as the bytes of a PNG file.
 *
 * @param picture of at least one point
 * @returns the same bytes for the same picture
 *
 * Reference: ISO/IEC 15948 (PNG), colour type 3, filter 0, one IDAT chunk.
 */
export function indexedPng({ width, height, points, palette }: IndexedPicture): Uint8Array {
  const header = new Uint8Array(13);
  const view = new DataView(header.buffer);
  view.setUint32(0, width);
  view.setUint32(4, height);
  header[8] = EIGHT_BITS;
  header[9] = INDEXED;
  const rows = new Uint8Array((width + 1) * height);
  for (let row = 0; row < height; row++) {
    rows.set(points.subarray(row * width, (row + 1) * width), row * (width + 1) + 1);
  }
  return joined([
    SIGNATURE,
    chunk('IHDR', header),
    chunk('PLTE', Uint8Array.from(palette.flat())),
    chunk('IDAT', zlibSync(rows, { level: 9 })),
    chunk('IEND', new Uint8Array(0)),
  ]);
}

/** Length, name, content, and the check sum of name and content. */
function chunk(name: string, content: Uint8Array): Uint8Array {
  const bytes = new Uint8Array(content.length + 12);
  const view = new DataView(bytes.buffer);
  view.setUint32(0, content.length);
  for (let i = 0; i < 4; i++) bytes[4 + i] = name.charCodeAt(i);
  bytes.set(content, 8);
  view.setUint32(content.length + 8, checkSum(bytes.subarray(4, content.length + 8)));
  return bytes;
}

/**
 * Cyclic redundancy check of 32 bits.
 *
 * @example checkSum(new TextEncoder().encode('123456789')) // 0xcbf43926
 *
 * Reference: ISO 3309; ISO/IEC 15948 annex D.
 */
export function checkSum(bytes: Uint8Array): number {
  let sum = 0xffffffff;
  for (const byte of bytes) {
    sum ^= byte;
    for (let bit = 0; bit < 8; bit++) sum = (sum & 1) === 1 ? (sum >>> 1) ^ 0xedb88320 : sum >>> 1;
  }
  return (sum ^ 0xffffffff) >>> 0;
}

function joined(parts: readonly Uint8Array[]): Uint8Array {
  const all = new Uint8Array(parts.reduce((length, part) => length + part.length, 0));
  let from = 0;
  for (const part of parts) {
    all.set(part, from);
    from += part.length;
  }
  return all;
}
