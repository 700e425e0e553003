import { Complex } from 'complex.js';
import { lineProblem } from './line-problem.ts';
import type { Header } from './touchstone-header.ts';
import { cos, sin } from '../quantity/elementary.ts';

/**
 * Reflection coefficient of one port, in its own reference, from one line of data; the other port closed with its
 * reference.
 *
 * @param values frequency, then pairs
 */
export function reflectionOf(
  values: Float64Array,
  header: Header,
  port: 1 | 2,
  line: number,
): { readonly re: number; readonly im: number } {
  const { options } = header;
  const pair = (k: number): Complex => complexOf(values[1 + 2 * k]!, values[2 + 2 * k]!, options.format);
  const gamma =
    options.parameter === 'S'
      ? pair(port === 1 ? 0 : header.matrix === 'full' ? 3 : 2)
      : reflectionInto(immittanceSeen(pair, header, port), header.references[port - 1]!, options.parameter);
  if (!Number.isFinite(gamma.re) || !Number.isFinite(gamma.im)) {
    throw lineProblem(line, 'these values have no reflection coefficient', 'check them');
  }
  return gamma;
}

/** Γ = (Z − R)/(Z + R) = (1 − Y·R)/(1 + Y·R) */
function reflectionInto(seen: Complex, r: number, parameter: 'Z' | 'Y'): Complex {
  return parameter === 'Z' ? seen.sub(r).div(seen.add(r)) : new Complex(1, 0).sub(seen.mul(r)).div(seen.mul(r).add(1));
}

/** Impedance or admittance of one port, the other closed with its reference; Ω or S. */
function immittanceSeen(pair: (k: number) => Complex, header: Header, port: 1 | 2): Complex {
  const { options, ports, references } = header;
  const own = immittances(pair, header);
  if (ports === 1) return own.p11;
  const near = port === 1 ? own.p11 : own.p22;
  const far = port === 1 ? own.p22 : own.p11;
  const other = references[2 - port]!;
  return near.sub(own.p12.mul(own.p21).div(far.add(options.parameter === 'Z' ? other : 1 / other)));
}

/** Matrix in Ω or S: version 1 writes it normalised to the reference. */
function immittances(
  pair: (k: number) => Complex,
  { version, ports, options, order, matrix }: Header,
): { p11: Complex; p12: Complex; p21: Complex; p22: Complex } {
  const scale = version === 2 ? 1 : options.parameter === 'Z' ? options.referenceOhm : 1 / options.referenceOhm;
  const at = (k: number): Complex => pair(k).mul(scale);
  if (ports === 1) return { p11: at(0), p12: at(0), p21: at(0), p22: at(0) };
  if (matrix !== 'full') return { p11: at(0), p12: at(1), p21: at(1), p22: at(2) };
  const [p12, p21] = order === '21_12' ? [at(2), at(1)] : [at(1), at(2)];
  return { p11: at(0), p12, p21, p22: at(3) };
}

function complexOf(a: number, b: number, format: 'MA' | 'DB' | 'RI'): Complex {
  if (format === 'RI') return new Complex(a, b);
  const size = format === 'MA' ? a : 10 ** (a / 20);
  const angle = (b * Math.PI) / 180;
  return new Complex(size * cos(angle), size * sin(angle));
}
