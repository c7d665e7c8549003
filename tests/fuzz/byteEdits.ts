import fc from 'fast-check';
import { place } from './textEdits.ts';

/** A change of bytes, whatever they mean. */
export type ByteEdit = Readonly<{ at: number; byte: number; length: number; how: ByteHow }>;

type ByteHow = (typeof byteHows)[number];

const byteHows = ['set', 'set', 'insert', 'cut', 'copy', 'fill'] as const;

export const byteEdit: fc.Arbitrary<ByteEdit> = fc.record({
  at: place,
  byte: fc.oneof(fc.nat(255), fc.constantFrom(0, 9, 10, 13, 0x22, 0x2c, 0x2d, 0x80, 0xc3, 0xed, 0xff)),
  length: fc.integer({ min: 1, max: 40 }),
  how: fc.constantFrom(...byteHows),
});

/** Makes some changes to bytes, one after the other. */
export function editedBytes(bytes: Uint8Array, edits: readonly ByteEdit[]): Uint8Array {
  return edits.reduce((changed, edit) => editedOnce(changed, edit), bytes);
}

function editedOnce(bytes: Uint8Array, { at, byte, length, how }: ByteEdit): Uint8Array {
  const i = Math.floor(at * bytes.length);
  const [before, piece, after] = [bytes.subarray(0, i), bytes.subarray(i, i + length), bytes.subarray(i + length)];
  if (how === 'cut') return joined(before, after);
  if (how === 'copy') return joined(before, piece, piece, after);
  if (how === 'insert') return joined(before, Uint8Array.of(byte), bytes.subarray(i));
  return joined(
    before,
    piece.slice(how === 'set' ? 1 : piece.length),
    new Uint8Array(how === 'set' ? 1 : length).fill(byte),
    after,
  );
}

function joined(...parts: readonly Uint8Array[]): Uint8Array {
  return new Uint8Array(Buffer.concat(parts));
}

/** Ways in which a program may have written the same text. */
export const encodings = [
  'utf8',
  'utf8bom',
  'utf16le',
  'utf16lebom',
  'utf16be',
  'latin1',
  'crlf',
  'cr',
  'noEnd',
] as const;

export type Encoding = (typeof encodings)[number];

/** The bytes of a text in one of these ways. */
export function encoded(text: string, encoding: Encoding): Uint8Array {
  switch (encoding) {
    case 'utf8bom':
      return bytesOf(`\ufeff${text}`);
    case 'utf16le':
      return new Uint8Array(Buffer.from(text, 'utf16le'));
    case 'utf16lebom':
      return new Uint8Array(Buffer.from(`\ufeff${text}`, 'utf16le'));
    case 'utf16be':
      return new Uint8Array(Buffer.from(`\ufeff${text}`, 'utf16le').swap16());
    case 'latin1':
      return new Uint8Array(Buffer.from(text, 'latin1'));
    case 'crlf':
      return bytesOf(text.replaceAll('\n', '\r\n'));
    case 'cr':
      return bytesOf(text.replaceAll('\n', '\r'));
    case 'noEnd':
      return bytesOf(text.trimEnd());
    case 'utf8':
      return bytesOf(text);
  }
}

function bytesOf(text: string): Uint8Array {
  return new TextEncoder().encode(text);
}
