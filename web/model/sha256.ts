/** First 32 bits of the fractional parts of the cube roots of the first 64 primes (FIPS 180-4, 4.2.2), found by whole numbers. */
const ROUNDS = constants(3, 64);
/** The same of the square roots of the first eight (FIPS 180-4, 5.3.3). */
const START = constants(2, 8);

/**
 * SHA-256 of some bytes: the page may be opened from a place where the browser's own is not to be had.
 *
 * @param bytes at most 2^29 of them
 * @returns hexadecimal, 64 letters
 * @example sha256(new TextEncoder().encode('abc')).slice(0, 8) // 'ba7816bf'
 *
 * Reference: FIPS 180-4 (2015), sections 5.1.1 and 6.2.
 */
export function sha256(bytes: Uint8Array): string {
  const blocks = Math.ceil((bytes.length + 9) / 64);
  const padded = new Uint8Array(64 * blocks);
  padded.set(bytes);
  padded[bytes.length] = 0x80;
  const view = new DataView(padded.buffer);
  view.setUint32(padded.length - 8, Math.floor(bytes.length / 2 ** 29));
  view.setUint32(padded.length - 4, (bytes.length << 3) >>> 0);
  const state = Int32Array.from(START);
  const words = new Int32Array(64);
  for (let block = 0; block < padded.length; block += 64) digest(state, words, view, block);
  return Array.from(state, (word) => (word >>> 0).toString(16).padStart(8, '0')).join('');
}

function digest(state: Int32Array, w: Int32Array, view: DataView, block: number): void {
  for (let t = 0; t < 16; t++) w[t] = view.getInt32(block + 4 * t);
  for (let t = 16; t < 64; t++) {
    const small0 = turned(w[t - 15], 7) ^ turned(w[t - 15], 18) ^ (w[t - 15] >>> 3);
    const small1 = turned(w[t - 2], 17) ^ turned(w[t - 2], 19) ^ (w[t - 2] >>> 10);
    w[t] = (w[t - 16] + small0 + w[t - 7] + small1) | 0;
  }
  let [a, b, c, d, e, f, g, h] = state;
  for (let t = 0; t < 64; t++) {
    const big1 = turned(e, 6) ^ turned(e, 11) ^ turned(e, 25);
    const one = (h + big1 + ((e & f) ^ (~e & g)) + ROUNDS[t] + w[t]) | 0;
    const big0 = turned(a, 2) ^ turned(a, 13) ^ turned(a, 22);
    const two = (big0 + ((a & b) ^ (a & c) ^ (b & c))) | 0;
    [h, g, f, e, d, c, b, a] = [g, f, e, (d + one) | 0, c, b, a, (one + two) | 0];
  }
  [a, b, c, d, e, f, g, h].forEach((word, i) => {
    state[i] = (state[i] + word) | 0;
  });
}

function turned(word: number, by: number): number {
  return (word >>> by) | (word << (32 - by));
}

function constants(root: 2 | 3, count: number): Int32Array {
  const primes: number[] = [];
  for (let n = 2; primes.length < count; n++) if (primes.every((prime) => n % prime !== 0)) primes.push(n);
  return Int32Array.from(primes, (prime) =>
    Number(BigInt.asIntN(32, wholeRoot(BigInt(prime) << BigInt(32 * root), root))),
  );
}

/** The greatest whole number whose power is at most `value`. */
function wholeRoot(value: bigint, root: 2 | 3): bigint {
  let low = 0n;
  let high = 1n << 40n;
  while (high - low > 1n) {
    const middle = (low + high) / 2n;
    if (middle ** BigInt(root) <= value) low = middle;
    else high = middle;
  }
  return low;
}
