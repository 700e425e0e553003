/** Upper 32 bits of a 64-bit product of two unsigned 32-bit numbers; no sum in it exceeds 32 bits. */
function high(a: number, b: number): number {
  const al = a & 0xffff;
  const ah = a >>> 16;
  const bl = b & 0xffff;
  const bh = b >>> 16;
  const cross = Math.imul(ah, bl);
  const middle = (Math.imul(al, bh) + (cross & 0xffff) + (Math.imul(al, bl) >>> 16)) | 0;
  return (Math.imul(ah, bh) + (cross >>> 16) + (middle >>> 16)) | 0;
}

/**
 * Philox4x32-10: four random 32-bit words that follow from a counter and a key alone, so that any draw can be had
 * without those before it, by whoever asks.
 *
 * J. K. Salmon, M. A. Moraes, R. O. Dror, D. E. Shaw, "Parallel random numbers: as easy as 1, 2, 3", SC 2011.
 *
 * @param c0  counter, four 32-bit words
 * @param k0  key, two 32-bit words
 * @param out takes four words from `at` on
 */
export function philox(
  c0: number,
  c1: number,
  c2: number,
  c3: number,
  k0: number,
  k1: number,
  out: Uint32Array,
  at: number,
): void {
  let w0 = c0 | 0;
  let w1 = c1 | 0;
  let w2 = c2 | 0;
  let w3 = c3 | 0;
  let key0 = k0 | 0;
  let key1 = k1 | 0;
  for (let round = 0; round < 10; round += 1) {
    const high0 = high(0xd2511f53, w0);
    const high1 = high(0xcd9e8d57, w2);
    const low0 = Math.imul(0xd2511f53, w0);
    const low1 = Math.imul(0xcd9e8d57, w2);
    w0 = high1 ^ w1 ^ key0;
    w1 = low1;
    w2 = high0 ^ w3 ^ key1;
    w3 = low0;
    key0 = (key0 + 0x9e3779b9) | 0;
    key1 = (key1 + 0xbb67ae85) | 0;
  }
  out[at] = w0;
  out[at + 1] = w1;
  out[at + 2] = w2;
  out[at + 3] = w3;
}
