import type { RealArm } from '../network/real-arm.ts';

/** A part that shorts, or that a lossless resonance opens, stays a number: squares of Ω below this are taken as this. */
const least = 1e-24;

/**
 * Impedance of a real series arm (Ω) or admittance of a real shunt arm (S) over frequency: what `realImpedance` says,
 * in a loop that allocates nothing.
 *
 * @param into real and imaginary part at each frequency in turn, 2n numbers
 */
export function fillImmittance(arm: RealArm, f0: number, frequencyHz: Float64Array, into: Float64Array): void {
  const { part, value, q, qSlope, parallelF, seriesH } = arm;
  const series = arm.arm === 'series';
  for (let f = 0; f < frequencyHz.length; f += 1) {
    const hz = frequencyHz[f]!;
    const omega = 2 * Math.PI * hz;
    let x = part === 'inductor' ? omega * value : -1 / (omega * value);
    let r = q === null ? 0 : Math.abs(x) / (qSlope === 0 ? q : q * (hz / f0) ** qSlope);
    if (parallelF !== 0) {
      // z/(1 + jbz)
      const b = omega * parallelF;
      const re = 1 - b * x;
      const im = b * r;
      const scale = 1 / Math.max(re * re + im * im, least);
      const own = r;
      r = (own * re + x * im) * scale;
      x = (x * re - own * im) * scale;
    }
    x += omega * seriesH;
    if (series) {
      into[2 * f] = r;
      into[2 * f + 1] = x;
    } else {
      const scale = 1 / Math.max(r * r + x * x, least);
      into[2 * f] = r * scale;
      into[2 * f + 1] = -x * scale;
    }
  }
}
