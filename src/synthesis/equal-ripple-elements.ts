import { Complex } from 'complex.js';
import {
  complexOver,
  complexTimes,
  over,
  times,
  toFixedPoint,
  toNumber,
  unity,
  type Fixed,
  type FixedComplex,
} from './fixed-point.ts';
import { acosh, asinh, cos, cosh, sin, sinh } from '../quantity/elementary.ts';

/** Worst in-band |Γ| of the equal-ripple ladder between two resistances, in closed form. */
export interface Ripple {
  readonly epsilon: number;
  /** ε/√(1 + ε²) */
  readonly reflection: number;
}

/**
 * Insertion loss 1 + ε²·T_n²(x), x = (2ω² − ωa² − ωb²)/(ωb² − ωa²), which at zero frequency must be the plain mismatch
 * (1 + r)²/(4r) (G. L. Matthaei, Proc. IEEE 52, 1964).
 *
 * @param r         Rhigh/Rlow, at least 1
 * @param low, high band edges, Hz
 * @param sections  n; the ladder has 2n elements
 */
export function ripple(r: number, low: number, high: number, sections: number): Ripple {
  const x0 = (low * low + high * high) / ((high - low) * (high + low));
  const epsilon = (r - 1) / (2 * Math.sqrt(r)) / cosh(sections * acosh(x0));
  return { epsilon, reflection: epsilon / Math.sqrt(1 + epsilon * epsilon) };
}

/**
 * Elements of the low-pass equal-ripple ladder from a resistance of 1 Ω up to r, for a band around 1 rad/s:
 * series L, shunt C, series L, ..., shunt C.
 *
 * The zeros of ρ are those of T_n; its poles are the left-half-plane roots of N(s)·N(−s) + K², started from their closed
 * form and refined; the elements come from the continued fraction of (1 + ρ)/(1 − ρ).
 *
 * @param low, high band edges over sqrt(low·high)
 * @returns 2n values, H and F, from the lower resistance; and the resistance that they end in, Ω
 */
export function equalRippleElements(
  r: number,
  low: number,
  high: number,
  sections: number,
): { readonly values: readonly number[]; readonly end: number } {
  const { epsilon } = ripple(r, low, high, sections);
  const width = high * high - low * low;
  const middle = high * high + low * low;
  const squares = Array.from({ length: sections }, (_, k) => {
    const x = cos(((2 * k + 1) * Math.PI) / (2 * sections));
    return toFixedPoint((x * width + middle) / 2);
  });
  const k = 1 / (epsilon * 2 ** (sections - 1) * (2 / width) ** sections);
  const zeros = squares.reduce<Fixed[]>((p, w2) => product(p, [w2, 0n, unity]), [unity]);
  // Poles come in conjugate pairs, each pair a real quadratic.
  const denominator = roughPoles(sections, epsilon, width, middle)
    .filter(({ im }) => im > 0)
    .map((pole) => refine(pole, squares, toFixedPoint(k)))
    .reduce<Fixed[]>((p, { re, im }) => product(p, [times(re, re) + times(im, im), -2n * re, unity]), [unity]);

  let top = denominator.map((c, i) => c + zeros[i]!);
  let bottom = denominator.map((c, i) => c - zeros[i]!).slice(0, -1);
  const values: number[] = [];
  while (values.length < 2 * sections) {
    const value = over(top[top.length - 1]!, bottom[bottom.length - 1]!);
    values.push(toNumber(value));
    if (bottom.length === 1) break;
    // Two degrees go at once: every transmission zero is at infinity.
    const rest = top.slice(0, -2).map((c, i) => c - (i === 0 ? 0n : times(value, bottom[i - 1]!)));
    [top, bottom] = [bottom, rest];
  }
  return { values, end: toNumber(over(bottom[0]!, top[0]!)) };
}

const product = (a: readonly Fixed[], b: readonly Fixed[]): Fixed[] => {
  const out = new Array<Fixed>(a.length + b.length - 1).fill(0n);
  a.forEach((x, i) => {
    b.forEach((y, k) => (out[i + k]! += times(x, y)));
  });
  return out;
};

/** Left-half-plane roots of 1 + ε²·T_n²(x(s)) in closed form, to double precision. */
function roughPoles(n: number, epsilon: number, width: number, middle: number): Complex[] {
  const eta = asinh(1 / epsilon) / n;
  return Array.from({ length: 2 * n }, (_, k) => {
    const theta = ((2 * k + 1) * Math.PI) / (2 * n);
    const x = new Complex(cos(theta) * cosh(eta), -sin(theta) * sinh(eta));
    const s = x.mul(width).add(middle).div(-2).sqrt();
    return s.re < 0 ? s : s.neg();
  });
}

/** Newton's method on Π(s² + ωk²)² + K² from a double-precision start: each step doubles the digits. */
function refine(start: Complex, squares: readonly Fixed[], k: Fixed): FixedComplex {
  let s: FixedComplex = { re: toFixedPoint(start.re), im: toFixedPoint(start.im) };
  const k2 = times(k, k);
  for (let step = 0; step < 3; step += 1) {
    const square = complexTimes(s, s);
    const factors = squares.map((w2) => ({ re: square.re + w2, im: square.im }));
    const p = factors.reduce(complexTimes);
    const p2 = complexTimes(p, p);
    // F = P² + K², F′ = 2·P·P′ = 4·s·P²·Σ 1/(s² + ωk²)
    const sum = factors
      .map((factor) => complexOver({ re: unity, im: 0n }, factor))
      .reduce((a, b) => ({ re: a.re + b.re, im: a.im + b.im }));
    const slope = complexTimes(complexTimes(s, p2), sum);
    const delta = complexOver({ re: p2.re + k2, im: p2.im }, { re: 4n * slope.re, im: 4n * slope.im });
    s = { re: s.re - delta.re, im: s.im - delta.im };
  }
  return s;
}
