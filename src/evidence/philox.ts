import {
  addWords,
  advance,
  exclusiveOr,
  get,
  load,
  loopWhileBelow,
  lowerWords,
  moduleOf,
  productsOfFirst,
  productsOfLast,
  set,
  store,
  upperWords,
  words,
} from '../network/assemble.ts';

/** Counters worked on together; a multiple of four. */
const block = 1024;
const bytes = 4;
/** In memory: c2, c3 and the key, four times each; then blocks of c0, c1 and the four results. */
const countersAt = 64;
const stride = block * bytes;

// Parameters of the function: where the constants stand, where the counters do and end. Its variables: the four words, the
// key, and the products of a round.
const [constants, here, end] = [0, 1, 2] as const;
const [w0, w1, w2, w3, k0, k1, a, b, c, d] = [3, 4, 5, 6, 7, 8, 9, 10, 11, 12] as const;

const round = [
  ...set(a, productsOfFirst(get(w0), words(0xd2511f53))),
  ...set(b, productsOfLast(get(w0), words(0xd2511f53))),
  ...set(c, productsOfFirst(get(w2), words(0xcd9e8d57))),
  ...set(d, productsOfLast(get(w2), words(0xcd9e8d57))),
  ...set(w0, exclusiveOr(exclusiveOr(upperWords(get(c), get(d)), get(w1)), get(k0))),
  ...set(w1, lowerWords(get(c), get(d))),
  ...set(w2, exclusiveOr(exclusiveOr(upperWords(get(a), get(b)), get(w3)), get(k1))),
  ...set(w3, lowerWords(get(a), get(b))),
  ...set(k0, addWords(get(k0), words(0x9e3779b9))),
  ...set(k1, addWords(get(k1), words(0xbb67ae85))),
];

const body = loopWhileBelow(
  [
    ...set(w0, load(here, 0)),
    ...set(w1, load(here, stride)),
    ...[w2, w3, k0, k1].flatMap((local, k) => set(local, load(constants, 16 * k))),
    ...Array.from({ length: 10 }, () => round).flat(),
    ...[w0, w1, w2, w3].flatMap((local, k) => store(here, (2 + k) * stride, get(local))),
    ...advance(here, 16),
  ],
  here,
  end,
);

interface Machine {
  readonly memory: Uint32Array;
  readonly run: (constants: number, here: number, end: number) => void;
}

let machine: Machine | null = null;

function started(): Machine {
  const memory = new WebAssembly.Memory({ initial: 1 });
  const instance = new WebAssembly.Instance(new WebAssembly.Module(moduleOf(3, 10, body)), { host: { memory } });
  return { memory: new Uint32Array(memory.buffer), run: instance.exports['run'] as Machine['run'] };
}

/**
 * Philox4x32-10: four random 32-bit words that follow from a counter and a key alone, so that any draw can be had without
 * those before it, by whoever asks. Four counters at a time.
 *
 * J. K. Salmon, M. A. Moraes, R. O. Dror, D. E. Shaw, "Parallel random numbers: as easy as 1, 2, 3", SC 2011.
 *
 * @param c0, c1 the counters' first two words, arrays of equal length
 * @param rest    their other two words, the same for all
 * @param key     two 32-bit words
 * @param out     four arrays as long as the counters
 */
export function philox(
  c0: Uint32Array,
  c1: Uint32Array,
  rest: readonly [number, number],
  key: readonly [number, number],
  out: readonly [Uint32Array, Uint32Array, Uint32Array, Uint32Array],
): void {
  machine ??= started();
  const { memory, run } = machine;
  [...rest, ...key].forEach((word, k) => memory.fill(word, 4 * k, 4 * k + 4));
  const first = countersAt / bytes;
  for (let from = 0; from < c0.length; from += block) {
    const length = Math.min(block, c0.length - from);
    memory.set(c0.subarray(from, from + length), first);
    memory.set(c1.subarray(from, from + length), first + block);
    run(0, countersAt, countersAt + Math.ceil(length / 4) * 4 * bytes);
    out.forEach((column, k) => {
      const at = first + (2 + k) * block;
      column.set(memory.subarray(at, at + length), from);
    });
  }
}
