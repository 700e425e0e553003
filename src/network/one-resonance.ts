import type { Complex } from 'complex.js';

/**
 * The one-resonance model nearest to an impedance over a band: a resistance with an inductance and a capacitance, in
 * series or in parallel, either of which may be absent.
 */
export interface OneResonance {
  readonly arrangement: 'series' | 'parallel';
  /** Ω */
  readonly r: number;
  /** Reactance (series) or susceptance (parallel) over resistance or conductance, at the band's centre: of the part that
   * grows with frequency and of the one that falls. 0 or more. */
  readonly growingQ: number;
  readonly fallingQ: number;
  /** Largest distance between the model's reflection coefficient and the data's, in a reference of |Z|. */
  readonly misfit: number;
}

/**
 * Least squares over samples of a band, of X = growing·u − falling/u (u: frequency over the centre) with R the mean, in
 * impedance and in admittance; the better of the two in reflection.
 *
 * @param impedances Ω, one a frequency
 */
export function fitOneResonance(
  frequencyHz: readonly number[],
  impedances: readonly Complex[],
  centreHz: number,
): OneResonance {
  const u = frequencyHz.map((hz) => hz / centreHz);
  const series = fitOne(u, impedances);
  const parallel = fitOne(
    u,
    impedances.map((z) => z.inverse()),
  );
  const asOne = (fit: Fit, arrangement: OneResonance['arrangement']): OneResonance => ({
    arrangement,
    r: arrangement === 'series' ? fit.real : 1 / fit.real,
    growingQ: fit.growing / fit.real,
    fallingQ: fit.falling / fit.real,
    misfit: misfit(u, impedances, fit, arrangement),
  });
  const [a, b] = [asOne(series, 'series'), asOne(parallel, 'parallel')];
  return a.misfit <= b.misfit ? a : b;
}

interface Fit {
  readonly real: number;
  readonly growing: number;
  readonly falling: number;
}

function fitOne(u: readonly number[], values: readonly Complex[]): Fit {
  const n = values.length;
  const real = values.reduce((sum, { re }) => sum + re, 0) / n;
  let [uu, vv, ux, vx] = [0, 0, 0, 0];
  values.forEach(({ im }, k) => {
    const x = u[k]!;
    uu += x * x;
    vv += 1 / (x * x);
    ux += x * im;
    vx += im / x;
  });
  // Normal equations of im = growing·u − falling/u; Σ u·(1/u) = n.
  const determinant = uu * vv - n * n;
  if (determinant > 1e-12 * uu * vv) {
    const growing = (ux * vv - vx * n) / determinant;
    const falling = (ux * n - vx * uu) / determinant;
    if (growing >= 0 && falling >= 0) return { real, growing, falling };
  }
  // A negative part isn't one: the better of each alone.
  const onlyGrowing = Math.max(0, ux / uu);
  const onlyFalling = Math.max(0, -vx / vv);
  const error = (growing: number, falling: number): number =>
    values.reduce((sum, { im }, k) => sum + (im - growing * u[k]! + falling / u[k]!) ** 2, 0);
  return error(onlyGrowing, 0) <= error(0, onlyFalling)
    ? { real, growing: onlyGrowing, falling: 0 }
    : { real, growing: 0, falling: onlyFalling };
}

function misfit(
  u: readonly number[],
  impedances: readonly Complex[],
  { real, growing, falling }: Fit,
  arrangement: OneResonance['arrangement'],
): number {
  return Math.max(
    ...impedances.map((z, k) => {
      const im = growing * u[k]! - falling / u[k]!;
      const reference = z.abs();
      const immittance = z.mul(0).add(real).add({ re: 0, im });
      const model = arrangement === 'series' ? immittance : immittance.inverse();
      const gamma = (value: Complex): Complex => value.sub(reference).div(value.add(reference));
      return gamma(model).sub(gamma(z)).abs();
    }),
  );
}
