import { describe, expect, it } from 'vitest';
import { decodeText } from '../../../src/core/decodeText.ts';

const utf16 = (text: string, littleEndian: boolean) => {
  const bytes = new Uint8Array(2 * text.length);
  const view = new DataView(bytes.buffer);
  for (let i = 0; i < text.length; i++) view.setUint16(2 * i, text.charCodeAt(i), littleEndian);
  return bytes;
};

describe('the encoding of a text file', () => {
  const text = 'Außentemperatur °C −5,0 € 東';

  it('is UTF-8 where the bytes are valid UTF-8', () => {
    expect(decodeText(new TextEncoder().encode(text))).toEqual({ text, encoding: 'UTF-8' });
  });

  it('is told by a byte-order mark, which is taken off', () => {
    expect(decodeText(new TextEncoder().encode(`\ufeff${text}`))).toEqual({
      text,
      encoding: 'UTF-8 with byte-order mark',
    });
    expect(decodeText(utf16(`\ufeff${text}`, true))).toEqual({ text, encoding: 'UTF-16 (little-endian)' });
    expect(decodeText(utf16(`\ufeff${text}`, false))).toEqual({ text, encoding: 'UTF-16 (big-endian)' });
  });

  it('is Latin-1 where the bytes are no UTF-8, with the signs that Windows adds', () => {
    expect(decodeText(Uint8Array.of(0xb0, 0x43))).toEqual({ text: '°C', encoding: 'Latin-1 (Windows-1252)' });
    // 0x80 is the euro sign in windows-1252 (WHATWG Encoding Standard, index windows-1252).
    expect(decodeText(Uint8Array.of(0x80, 0x20, 0xdf)).text).toBe('€ ß');
  });

  it('never fails: broken bytes behind a mark become replacement characters', () => {
    expect(decodeText(Uint8Array.of(0xef, 0xbb, 0xbf, 0xff, 0x41)).text).toBe('\ufffdA');
    expect(decodeText(Uint8Array.of(0xff, 0xfe, 0x41)).text).toBe('\ufffd');
    expect(decodeText(new Uint8Array(0))).toEqual({ text: '', encoding: 'UTF-8' });
  });
});
