import { Complex } from 'complex.js';
import { interpolate, intervalOf, slopesOf } from '../measured/shape-preserving.ts';
import type { Span } from '../quantity/span.ts';
import { partsOf } from './circuit-model.ts';
import { isMeasured, isModel, type MeasuredTermination, type OneImpedance, type Termination } from './termination.ts';

/**
 * Impedances of a termination over frequency, written into typed arrays for the sweep.
 *
 * @param f0     frequency at which one impedance holds, Hz
 * @param r, x   filled, Ω; as long as `frequencyHz`
 * @throws RangeError beyond measured data: callers keep within `rangeOf`
 */
export function fillTermination(
  termination: Termination,
  f0: number,
  frequencyHz: Float64Array,
  r: Float64Array,
  x: Float64Array,
): void {
  if (isMeasured(termination)) fillMeasured(termination, frequencyHz, r, x);
  else if (isModel(termination)) {
    const { arrangement, r: ohm, l, c, c0 } = partsOf(termination);
    for (let k = 0; k < frequencyHz.length; k += 1) {
      const omega = 2 * Math.PI * frequencyHz[k]!;
      const xl = l === null ? 0 : omega * l;
      const bc = c === null ? 0 : omega * c;
      if (arrangement === 'parallel') {
        setInverse(r, x, k, 1 / ohm, bc - (l === null ? 0 : 1 / xl));
        continue;
      }
      r[k] = ohm;
      x[k] = xl - (c === null ? 0 : 1 / bc);
      if (c0 !== null) {
        const d = ohm * ohm + x[k]! * x[k]!;
        setInverse(r, x, k, ohm / d, omega * c0 - x[k]! / d);
      }
    }
  } else fillOne(termination, f0, frequencyHz, r, x);
}

/** r + jx of element k := 1/(g + jb) */
function setInverse(r: Float64Array, x: Float64Array, k: number, g: number, b: number): void {
  const d = g * g + b * b;
  r[k] = g / d;
  x[k] = -b / d;
}

function fillOne(
  { r: r0, x: x0, behaviour }: OneImpedance,
  f0: number,
  frequencyHz: Float64Array,
  r: Float64Array,
  x: Float64Array,
): void {
  if (behaviour === 'constant' || x0 === 0) {
    r.fill(r0);
    x.fill(x0);
    return;
  }
  const n = frequencyHz.length;
  if (behaviour === 'series') {
    r.fill(r0);
    for (let k = 0; k < n; k += 1) {
      const u = frequencyHz[k]! / f0;
      x[k] = x0 > 0 ? x0 * u : x0 / u;
    }
    return;
  }
  const size = r0 * r0 + x0 * x0;
  const b0 = -x0 / size;
  for (let k = 0; k < n; k += 1) {
    const u = frequencyHz[k]! / f0;
    setInverse(r, x, k, r0 / size, b0 > 0 ? b0 * u : b0 / u);
  }
}

/** Largest |Γ| of an interpolated sample: beyond it rounding of the cubic would make a passive load active. */
const mostReflection = 1 - 1e-9;

interface Prepared {
  readonly f: Float64Array;
  readonly re: Float64Array;
  readonly im: Float64Array;
  readonly slopesRe: Float64Array;
  readonly slopesIm: Float64Array;
}

/** Slopes belong to the data as long as they live. */
const prepared = new WeakMap<MeasuredTermination['measured'], Prepared>();

function prepare(measured: MeasuredTermination['measured']): Prepared {
  const known = prepared.get(measured);
  if (known !== undefined) return known;
  const f = Float64Array.from(measured.frequencyHz);
  const re = Float64Array.from(measured.re);
  const im = Float64Array.from(measured.im);
  const made = { f, re, im, slopesRe: slopesOf(f, re), slopesIm: slopesOf(f, im) };
  prepared.set(measured, made);
  return made;
}

function fillMeasured(
  { measured }: MeasuredTermination,
  frequencyHz: Float64Array,
  r: Float64Array,
  x: Float64Array,
): void {
  const { f, re, im, slopesRe, slopesIm } = prepare(measured);
  for (let k = 0; k < frequencyHz.length; k += 1) {
    const hz = frequencyHz[k]!;
    // A part in 1e12 is the rounding of a grid's own edge.
    if (hz < f[0]! * (1 - 1e-12) || hz > f[f.length - 1]! * (1 + 1e-12)) {
      throw new RangeError(`termination: ${String(hz)} Hz is outside its data; keep the sweep within them`);
    }
    const interval = intervalOf(f, hz);
    let gammaRe = interpolate(f, re, slopesRe, interval, hz);
    let gammaIm = interpolate(f, im, slopesIm, interval, hz);
    const size = Math.hypot(gammaRe, gammaIm);
    if (size > mostReflection) {
      gammaRe *= mostReflection / size;
      gammaIm *= mostReflection / size;
    }
    const d = (1 - gammaRe) ** 2 + gammaIm ** 2;
    r[k] = (measured.referenceOhm * (1 - gammaRe * gammaRe - gammaIm * gammaIm)) / d;
    x[k] = (measured.referenceOhm * 2 * gammaIm) / d;
  }
}

/** Impedance of a termination at one frequency, Ω. */
export function terminationAt(termination: Termination, f0: number, frequencyHz: number): Complex {
  const r = new Float64Array(1);
  const x = new Float64Array(1);
  fillTermination(termination, f0, Float64Array.of(frequencyHz), r, x);
  return new Complex(r[0]!, x[0]!);
}

/** Frequencies for which a termination says anything, Hz; null: all. */
export function rangeOf(termination: Termination): Span | null {
  if (!isMeasured(termination)) return null;
  const { frequencyHz } = termination.measured;
  return { low: frequencyHz[0]!, high: frequencyHz[frequencyHz.length - 1]! };
}

/** Whether an impedance is a resistance at every frequency. */
export const isResistive = (termination: Termination): boolean => 'behaviour' in termination && termination.x === 0;
