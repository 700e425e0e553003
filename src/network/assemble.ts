/**
 * The few words of WebAssembly (W3C, WebAssembly Core Specification 2.0, chapter 5) that a numeric loop needs: two
 * doubles at a time, or four whole numbers, in one memory. Code is a list of bytes; what takes operands puts theirs first.
 */
export type Code = readonly number[];

const unsigned = (value: number): number[] => {
  const low = value & 0x7f;
  const rest = value >>> 7;
  return rest === 0 ? [low] : [low | 0x80, ...unsigned(rest)];
};

/** A constant from 0 to 2³¹ − 1; signed LEB128, which a set bit 6 in the last byte would make negative. */
const constant = (value: number): Code => {
  const low = value & 0x7f;
  const rest = value >>> 7;
  return rest === 0 && low < 0x40 ? [low] : [low | 0x80, ...constant(rest)];
};

const simd = (opcode: number): number[] => [0xfd, ...unsigned(opcode)];
/** Alignment 2³, offset in bytes. */
const at = (offset: number): number[] => [3, ...unsigned(offset)];

export const get = (local: number): Code => [0x20, ...unsigned(local)];
export const set = (local: number, value: Code): Code => [...value, 0x21, ...unsigned(local)];

export const add = (a: Code, b: Code): Code => [...a, ...b, ...simd(240)];
export const subtract = (a: Code, b: Code): Code => [...a, ...b, ...simd(241)];
export const multiply = (a: Code, b: Code): Code => [...a, ...b, ...simd(242)];
export const divide = (a: Code, b: Code): Code => [...a, ...b, ...simd(243)];
/** b where a < b, else a. */
export const larger = (a: Code, b: Code): Code => [...a, ...b, ...simd(247)];

/** Two doubles from a local's address plus an offset, bytes; the same double twice; and two doubles put there. */
export const load = (local: number, offset: number): Code => [...get(local), ...simd(0), ...at(offset)];
export const loadTwice = (local: number, offset: number): Code => [...get(local), ...simd(10), ...at(offset)];
export const store = (local: number, offset: number, value: Code): Code => [
  ...get(local),
  ...value,
  ...simd(11),
  ...at(offset),
];

/** Four whole numbers of 32 bits at a time: sum, exclusive or, and a constant. */
export const addWords = (a: Code, b: Code): Code => [...a, ...b, ...simd(174)];
export const exclusiveOr = (a: Code, b: Code): Code => [...a, ...b, ...simd(81)];
export const words = (word: number): Code => [...simd(12), ...[0, 1, 2, 3].flatMap(() => bytesOf(word))];
/** Products of 64 bits of the first two words, and of the last two. */
export const productsOfFirst = (a: Code, b: Code): Code => [...a, ...b, ...simd(222)];
export const productsOfLast = (a: Code, b: Code): Code => [...a, ...b, ...simd(223)];
/** Lower and upper words of four such products. */
export const lowerWords = (first: Code, last: Code): Code => shuffled(first, last, 0);
export const upperWords = (first: Code, last: Code): Code => shuffled(first, last, 4);

const shuffled = (a: Code, b: Code, from: number): Code => [
  ...a,
  ...b,
  ...simd(13),
  ...[0, 8, 16, 24].flatMap((product) => [0, 1, 2, 3].map((byte) => product + from + byte)),
];

const bytesOf = (word: number): number[] => [0, 8, 16, 24].map((shift) => (word >>> shift) & 0xff);

/** Adds a constant to an address. */
export const advance = (local: number, by: number): Code => set(local, [...get(local), 0x41, ...constant(by), 0x6a]);
/** Once at least, and again while one address is below another. */
export const loopWhileBelow = (body: Code, local: number, end: number): Code => [
  ...[0x03, 0x40, ...body],
  ...[...get(local), ...get(end), 0x49, 0x0d, 0, 0x0b],
];

const section = (id: number, content: Code): Code => [id, ...unsigned(content.length), ...content];
const name = (text: string): Code => [text.length, ...new TextEncoder().encode(text)];

/**
 * A module with one function, exported as `run`, on the memory it imports as `host.memory`.
 *
 * @param addresses number of its parameters, addresses in memory: locals from 0
 * @param pairs     number of its variables, two doubles each: the locals that follow
 */
export function moduleOf(addresses: number, pairs: number, body: Code): Uint8Array<ArrayBuffer> {
  const [i32, v128] = [0x7f, 0x7b];
  const code = [1, ...unsigned(pairs), v128, ...body, 0x0b];
  return Uint8Array.from([
    ...[0, 0x61, 0x73, 0x6d, 1, 0, 0, 0],
    ...section(1, [1, 0x60, addresses, ...new Array<number>(addresses).fill(i32), 0]),
    ...section(2, [1, ...name('host'), ...name('memory'), 2, 0, 1]),
    ...section(3, [1, 0]),
    ...section(7, [1, ...name('run'), 0, 0]),
    ...section(10, [1, ...unsigned(code.length), ...code]),
  ]);
}
