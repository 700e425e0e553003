import {
  add,
  advance,
  divide,
  get,
  larger,
  load,
  loadTwice,
  loopWhileBelow,
  moduleOf,
  multiply,
  set,
  store,
  subtract,
  type Code,
} from './assemble.ts';
import { endsSize, stepSize, type PreparedReal, type Step } from './real-steps.ts';

/** Networks worked on together: what is theirs stays in the processor's nearest cache over all frequencies. */
export const block = 256;

/** Which ends vary from network to network. */
export interface VariedEnds {
  readonly load: boolean;
  readonly source: boolean;
}

/** A complex number of two networks: real and imaginary. */
type Pair = readonly [re: Code, im: Code];

const bytes = 8;
// Parameters of the function: addresses of one frequency's numbers, of the networks' columns, of their worst so far, and
// where the worst ends.
const [numbers, columns, worst, end] = [0, 1, 2, 3] as const;

/** Pairs that go hand in hand: while one waits for its last step, the processor works on the other. */
const pairs = 2;
/** Networks of one round; `block` is a multiple. */
export const together = 2 * pairs;
/** Variables of each pair. */
const perPair = 9;

/** Variables of one pair: voltage, current, an immittance, and what is needed in between; and where it stands, bytes. */
interface Variables extends Record<'vr' | 'vi' | 'jr' | 'ji' | 'p' | 'q' | 'a' | 'b' | 'c', number> {
  readonly offset: number;
}

function variablesOf(pair: number): Variables {
  const first = end + 1 + pair * perPair;
  const [vr, vi, jr, ji, p, q, a, b, c] = Array.from({ length: perPair }, (_, k) => first + k) as VariableNumbers;
  return { vr, vi, jr, ji, p, q, a, b, c, offset: pair * 2 * bytes };
}
type VariableNumbers = [number, number, number, number, number, number, number, number, number];

const number = (at: number): Code => loadTwice(numbers, at * bytes);
const column = (slot: number, { offset }: Variables): Code => load(columns, slot * block * bytes + offset);
const times = (x: Pair, y: Pair): Pair => [
  subtract(multiply(x[0], y[0]), multiply(x[1], y[1])),
  add(multiply(x[0], y[1]), multiply(x[1], y[0])),
];
const squared = (x: number, y: number): Code => add(multiply(get(x), get(x)), multiply(get(y), get(y)));

/**
 * The loop over networks at one frequency, written out for one ladder: no step has to be told from another while it
 * runs, and two networks go hand in hand in every instruction. As in the sweep, voltage and current are carried from a
 * load current of 1 A back to the source. Γ = (V − I·ZS*)/(V + I·ZS) is (V' − I·RS)/(V' + I·RS) with V' = V + I·jXS;
 * for the reflectionless aim it is (V − I·ZS)/(V + I·ZS).
 *
 * Columns: u of each arm, source side first; then deviations of load R and X, source R and X; `block` numbers each.
 */
export function kernelOf(
  { steps, inverse, aim, reactiveSource }: PreparedReal,
  varied: VariedEnds,
): Uint8Array<ArrayBuffer> {
  const ends = inverse.length;
  const all = Array.from({ length: pairs }, (_, pair) => variablesOf(pair));
  const body = [
    ...all.flatMap((variables) => loadCode(varied.load, ends, variables)),
    ...steps.flatMap((step, k) => all.flatMap((variables) => stepCode(step, endsSize + k * stepSize, variables))),
    ...all.flatMap((variables) => sourceCode(varied.source, ends + 2, aim === 'conjugate', reactiveSource, variables)),
    ...all.flatMap(worstCode),
    ...advance(columns, together * bytes),
    ...advance(worst, together * bytes),
  ];
  return moduleOf(end + 1, pairs * perPair, loopWhileBelow(body, worst, end));
}

/** Voltage and current of 1 A in the load. `at`: the column of R's deviations. */
function loadCode(varied: boolean, at: number, variables: Variables): Code {
  const { vr, vi, jr, ji } = variables;
  const deviating = (stated: number, times: number, deviation: number): Code =>
    varied ? add(number(stated), multiply(number(times), column(deviation, variables))) : number(stated);
  return [
    ...set(vr, deviating(0, 0, at)),
    ...set(vi, deviating(1, 2, at + 1)),
    ...set(jr, number(4)),
    ...set(ji, number(5)),
  ];
}

/** |V − w|²/|V + w|², where it is more than the worst so far. */
function worstCode({ vr, vi, p, q, a, b, offset }: Variables): Code {
  return [
    ...set(p, subtract(get(vr), get(a))),
    ...set(q, subtract(get(vi), get(b))),
    ...set(vr, add(get(vr), get(a))),
    ...set(vi, add(get(vi), get(b))),
    ...store(worst, offset, larger(load(worst, offset), divide(squared(p, q), squared(vr, vi)))),
  ];
}

/** w = I·RS, or I·ZS, into a and b; I·jXS onto the voltage where that isn't in w. `at`: the column of R's deviations. */
function sourceCode(varied: boolean, at: number, conjugate: boolean, reactive: boolean, variables: Variables): Code {
  const { vr, vi, jr, ji, p, q, a, b } = variables;
  const current: Pair = [get(jr), get(ji)];
  const deviating = (stated: number, times: number, deviation: number): Code =>
    varied ? add(number(stated), multiply(number(times), column(deviation, variables))) : number(stated);
  const w = [
    ...set(p, deviating(6, 6, at)),
    ...set(q, deviating(7, 7, at)),
    ...set2(a, b, times([get(p), get(q)], current)),
  ];
  if (!varied && !reactive) return w;
  return [
    ...w,
    ...set(p, deviating(8, 10, at + 1)),
    ...set(q, deviating(9, 11, at + 1)),
    ...(conjugate ? accumulate(vr, vi, current, variables) : accumulate(a, b, current, variables)),
  ];
}

/** One step; its numbers begin at `at`. */
function stepCode({ arm, form, slot, bare, real }: Step, at: number, variables: Variables): Code {
  const { vr, vi, jr, ji, p, q, a, b, c } = variables;
  const [re, im, otherRe, otherIm] = arm === 'series' ? ([vr, vi, jr, ji] as const) : ([jr, ji, vr, vi] as const);
  const other: Pair = [get(otherRe), get(otherIm)];
  const linear = (zeroth: number, first: number, withoutZeroth = false): Code => {
    if (slot === null) return number(zeroth);
    const term = multiply(column(slot, variables), number(first));
    return withoutZeroth ? term : add(number(zeroth), term);
  };
  if (form === 'linear') {
    const realPart = set(p, linear(at, at + 2, bare));
    if (!real) return [...realPart, ...set(q, linear(at + 1, at + 3, bare)), ...accumulate(re, im, other, variables)];
    return [
      ...realPart,
      ...set(re, add(get(re), multiply(get(p), other[0]))),
      ...set(im, add(get(im), multiply(get(p), other[1]))),
    ];
  }
  // n/(a + jb) is n·(a − jb)·c with c = 1/(a² + b²).
  const denominator = [
    ...set(a, linear(at + 4, at + 6)),
    ...set(b, linear(at + 5, at + 7)),
    ...set(c, divide(number(3), squared(a, b))),
    ...set(a, multiply(get(a), get(c))),
    ...set(b, multiply(get(b), get(c))),
  ];
  if (form === 'reciprocal') {
    return [
      ...denominator,
      ...set(p, add(number(at), get(a))),
      ...set(q, subtract(number(at + 1), get(b))),
      ...accumulate(re, im, other, variables),
    ];
  }
  return [
    ...denominator,
    ...set(c, linear(at, at + 2, bare)),
    ...set(q, linear(at + 1, at + 3, bare)),
    ...set(p, add(multiply(get(c), get(a)), multiply(get(q), get(b)))),
    ...set(q, subtract(multiply(get(q), get(a)), multiply(get(c), get(b)))),
    ...accumulate(re, im, other, variables),
  ];
}

const set2 = (re: number, im: number, value: Pair): Code => [...set(re, value[0]), ...set(im, value[1])];

/** Adds (p + jq)·other to a voltage or a current. */
function accumulate(re: number, im: number, other: Pair, { p, q }: Variables): Code {
  const product = times([get(p), get(q)], other);
  return set2(re, im, [add(get(re), product[0]), add(get(im), product[1])]);
}
