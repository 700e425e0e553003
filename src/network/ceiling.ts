import { zeroBetween } from './search.ts';
import { cosh, exp, sin, sinh, tanh } from '../quantity/elementary.ts';

/**
 * What no lossless network can beat: the best |Γ| over a band into a load with one reactance, resonated at the band's
 * centre. H. W. Bode, Network Analysis and Feedback Amplifier Design, 1945; R. M. Fano, J. Franklin Institute 249, 1950.
 */

/**
 * Best |Γ| with any number of sections: exp(−π/(Q·w)).
 *
 * @param g Q·w: load Q times fractional bandwidth; 0 for a load without reactance
 */
export const bestReflection = (g: number): number => (g === 0 ? 0 : exp(-Math.PI / g));

/**
 * Best |Γ| with n resonators, the load's own counted: cosh(nb)/cosh(na), where tanh(na)/cosh(a) = tanh(nb)/cosh(b) and
 * sinh a − sinh b = 2·sin(π/2n)/(Q·w).
 *
 * @param g Q·w
 * @param n 1 or more
 */
export function bestReflectionOf(g: number, n: number): number {
  if (g === 0) return 0;
  // One resonator: sinh a = 1/sinh b, and the equations have a closed form.
  if (n === 1) return g / (1 + Math.sqrt(1 + g * g));
  const wanted = (2 * sin(Math.PI / (2 * n))) / g;
  const side = (t: number): number => tanh(n * t) / cosh(t);
  // `side` rises to its one peak and falls: b stands before it, a beyond it at the same height. At the peak
  // n/(sinh(nt)·cosh(nt)) = tanh t.
  const peak = zeroBetween((t) => n / (sinh(n * t) * cosh(n * t)) - tanh(t), 1e-9, 3);
  const beyond = (b: number): number => {
    const height = side(b);
    let far = peak + 1;
    while (side(far) > height) far += 1;
    return zeroBetween((t) => side(t) - height, peak, far);
  };
  const excess = (b: number): number => sinh(beyond(b)) - sinh(b) - wanted;
  let low = peak / 2;
  while (excess(low) < 0 && low > 1e-300) low /= 2;
  const b = zeroBetween(excess, low, peak);
  const a = beyond(b);
  // cosh(nb)/cosh(na) without overflow.
  return exp(n * (b - a)) * ((1 + exp(-2 * n * b)) / (1 + exp(-2 * n * a)));
}
