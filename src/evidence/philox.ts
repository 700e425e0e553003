/** Upper 32 bits of a 64-bit product of two unsigned 32-bit numbers; no sum in it exceeds 32 bits. */
function high(a: number, b: number): number {
  const [al, ah, bl, bh] = [a & 0xffff, a >>> 16, b & 0xffff, b >>> 16];
  const cross = Math.imul(ah, bl) >>> 0;
  const middle = (Math.imul(al, bh) + (cross & 0xffff) + (Math.imul(al, bl) >>> 16)) >>> 0;
  return Math.imul(ah, bh) + (cross >>> 16) + (middle >>> 16);
}

/**
 * Philox4x32-10: four random 32-bit words that follow from a counter and a key alone, so that any draw can be had
 * without those before it, by whoever asks.
 *
 * J. K. Salmon, M. A. Moraes, R. O. Dror, D. E. Shaw, "Parallel random numbers: as easy as 1, 2, 3", SC 2011.
 *
 * @param counter four 32-bit words
 * @param key     two 32-bit words
 * @param out     takes four words
 */
export function philox(
  counter: readonly [number, number, number, number],
  key: readonly [number, number],
  out: Uint32Array,
): void {
  let [c0, c1, c2, c3] = counter;
  let [k0, k1] = key;
  for (let round = 0; round < 10; round += 1) {
    const high0 = high(0xd2511f53, c0);
    const high1 = high(0xcd9e8d57, c2);
    const low0 = Math.imul(0xd2511f53, c0);
    const low1 = Math.imul(0xcd9e8d57, c2);
    c0 = high1 ^ c1 ^ k0;
    c1 = low1;
    c2 = high0 ^ c3 ^ k1;
    c3 = low0;
    k0 = (k0 + 0x9e3779b9) | 0;
    k1 = (k1 + 0xbb67ae85) | 0;
  }
  out[0] = c0;
  out[1] = c1;
  out[2] = c2;
  out[3] = c3;
}
