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

/** Networks worked on together: what is theirs stays in the processor's nearest cache over all frequencies. Even. */
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
// Its variables: voltage, current, an immittance, and what is needed in between.
const [vr, vi, jr, ji, p, q, a, b, c] = [4, 5, 6, 7, 8, 9, 10, 11, 12] as const;

const number = (at: number): Code => loadTwice(numbers, at * bytes);
const column = (slot: number): Code => load(columns, slot * block * bytes);
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
  const body = [
    ...set(vr, varied.load ? add(number(0), multiply(number(0), column(ends))) : number(0)),
    ...set(vi, varied.load ? add(number(1), multiply(number(2), column(ends + 1))) : number(1)),
    ...set(jr, number(4)),
    ...set(ji, number(5)),
    ...steps.flatMap((step, k) => stepCode(step, endsSize + k * stepSize)),
    ...sourceCode(varied.source, ends + 2, aim === 'conjugate', reactiveSource),
    // |V − w|²/|V + w|²
    ...set(p, subtract(get(vr), get(a))),
    ...set(q, subtract(get(vi), get(b))),
    ...set(vr, add(get(vr), get(a))),
    ...set(vi, add(get(vi), get(b))),
    ...store(worst, 0, larger(load(worst, 0), divide(squared(p, q), squared(vr, vi)))),
    ...advance(columns, 2 * bytes),
    ...advance(worst, 2 * bytes),
  ];
  return moduleOf(4, 9, loopWhileBelow(body, worst, end));
}

/** w = I·RS, or I·ZS, into a and b; I·jXS onto the voltage where that isn't in w. `at`: the column of R's deviations. */
function sourceCode(varied: boolean, at: number, conjugate: boolean, reactive: boolean): Code {
  const current: Pair = [get(jr), get(ji)];
  const deviating = (stated: Code, times: Code, deviation: number): Code =>
    varied ? add(stated, multiply(times, column(deviation))) : stated;
  const w = [
    ...set(p, deviating(number(6), number(6), at)),
    ...set(q, deviating(number(7), number(7), at)),
    ...set2(a, b, times([get(p), get(q)], current)),
  ];
  if (!varied && !reactive) return w;
  return [
    ...w,
    ...set(p, deviating(number(8), number(10), at + 1)),
    ...set(q, deviating(number(9), number(11), at + 1)),
    ...(conjugate ? accumulate(vr, vi, current) : accumulate(a, b, current)),
  ];
}

/** One step; its numbers begin at `at`. */
function stepCode({ arm, form, slot, bare, real }: Step, at: number): Code {
  const [re, im, otherRe, otherIm] = arm === 'series' ? ([vr, vi, jr, ji] as const) : ([jr, ji, vr, vi] as const);
  const other: Pair = [get(otherRe), get(otherIm)];
  const linear = (zeroth: number, first: number, withoutZeroth = false): Code => {
    if (slot === null) return number(zeroth);
    const term = multiply(column(slot), number(first));
    return withoutZeroth ? term : add(number(zeroth), term);
  };
  if (form === 'linear') {
    const realPart = set(p, linear(at, at + 2, bare));
    if (!real) return [...realPart, ...set(q, linear(at + 1, at + 3, bare)), ...accumulate(re, im, other)];
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
      ...accumulate(re, im, other),
    ];
  }
  return [
    ...denominator,
    ...set(c, linear(at, at + 2, bare)),
    ...set(q, linear(at + 1, at + 3, bare)),
    ...set(p, add(multiply(get(c), get(a)), multiply(get(q), get(b)))),
    ...set(q, subtract(multiply(get(q), get(a)), multiply(get(c), get(b)))),
    ...accumulate(re, im, other),
  ];
}

const set2 = (re: number, im: number, value: Pair): Code => [...set(re, value[0]), ...set(im, value[1])];

/** Adds (p + jq)·other to a voltage or a current. */
function accumulate(re: number, im: number, other: Pair): Code {
  const product = times([get(p), get(q)], other);
  return set2(re, im, [add(get(re), product[0]), add(get(im), product[1])]);
}
