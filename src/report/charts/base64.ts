const DIGITS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';

/**
 * Bytes as text of 64 signs.
 *
 * @example base64(Uint8Array.of(77, 97)) // 'TWE='
 *
 * Reference: RFC 4648, section 4.
 */
export function base64(bytes: Uint8Array): string {
  let text = '';
  for (let i = 0; i < bytes.length; i += 3) {
    const word = (bytes[i] << 16) | ((bytes[i + 1] ?? 0) << 8) | (bytes[i + 2] ?? 0);
    text += DIGITS[word >> 18] + DIGITS[(word >> 12) & 63];
    text += i + 1 < bytes.length ? DIGITS[(word >> 6) & 63] : '=';
    text += i + 2 < bytes.length ? DIGITS[word & 63] : '=';
  }
  return text;
}
