/** Text and the encoding in which it was written, in words. */
export interface DecodedText {
  readonly text: string;
  readonly encoding: string;
}

const marks = [
  { bytes: [0xef, 0xbb, 0xbf], label: 'utf-8', encoding: 'UTF-8 with byte-order mark' },
  { bytes: [0xff, 0xfe], label: 'utf-16le', encoding: 'UTF-16 (little-endian)' },
  { bytes: [0xfe, 0xff], label: 'utf-16be', encoding: 'UTF-16 (big-endian)' },
] as const;

/** What windows-1252 puts in place of the control characters 0x80 … 0x9f; five of them stay what they are. */
const WINDOWS_SIGNS = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';

/**
 * Bytes of a text file as text: by its byte-order mark, else as UTF-8 where that is valid, else as Latin-1.
 *
 * @param bytes the whole file; anything at all. Where a mark promises an encoding that the bytes break, the broken
 *   places come out as U+FFFD.
 * @returns the text without its mark, and the encoding in words
 * @example decodeText(Uint8Array.of(0xb0, 0x43)) // { text: '°C', encoding: 'Latin-1 (Windows-1252)' }
 *
 * Reference: WHATWG Encoding Standard, which reads Latin-1 as windows-1252.
 */
export function decodeText(bytes: Uint8Array): DecodedText {
  for (const { bytes: mark, label, encoding } of marks) {
    if (mark.every((byte, i) => bytes[i] === byte)) {
      return { text: new TextDecoder(label).decode(bytes), encoding };
    }
  }
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), encoding: 'UTF-8' };
  } catch {
    return { text: decodeLatin1(bytes), encoding: 'Latin-1 (Windows-1252)' };
  }
}

/** Some releases of Node leave the control characters where windows-1252 has signs; browsers do not. */
function decodeLatin1(bytes: Uint8Array): string {
  const text = new TextDecoder('windows-1252').decode(bytes);
  return text.replace(/[\u0080-\u009f]/g, (control) => WINDOWS_SIGNS.charAt(control.charCodeAt(0) - 0x80));
}
