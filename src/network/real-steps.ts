import { Complex } from 'complex.js';
import { qAt, type RealArm, type RealLadder } from './real-arm.ts';
import type { Ends } from './sweep.ts';
import type { Aim } from './termination.ts';

/** Numbers of a step at one frequency: n0, n1, d0, d1, real and imaginary. */
export const stepSize = 8;
/** Numbers of the ends at one frequency: ZL; |ZL| and 1; κ, RS/κ, j·XS/κ, j·|ZS|/κ, real and imaginary. */
export const endsSize = 12;

/**
 * How a step carries voltage and current on. A series step's impedance adds voltage, a shunt step's admittance current:
 * n0 + u·n1 (`linear`), n0 + 1/(d0 + u·d1) (`reciprocal`) or (n0 + u·n1)/(d0 + u·d1) (`bilinear`).
 */
export interface Step {
  readonly arm: RealArm['arm'];
  readonly form: 'linear' | 'reciprocal' | 'bilinear';
  /** Arm, source side first, whose u the step takes; null: a stray alone, nothing but n0. */
  readonly slot: number | null;
  /** n0 is 0 at every frequency. */
  readonly bare: boolean;
  /** n0 and n1 are real at every frequency. */
  readonly real: boolean;
}

/**
 * A real ladder prepared for many networks at the same frequencies. Part values stand in it as u: a part's value over
 * the nominal one, or the inverse of that, whichever its immittance is linear in. What depends on frequency alone is
 * worked out here, once for all networks.
 *
 * The current is carried as J = κ·I, with a κ (Ω) at each frequency that makes the impedance of one series part real.
 * All parts like it, such as the inductors of one Q, then need half the multiplications.
 */
export interface PreparedReal {
  readonly frequencyHz: Float64Array;
  readonly aim: Aim;
  /** One an arm, source side first: u is the inverse of the value's scale. */
  readonly inverse: readonly boolean[];
  /** Load side first. */
  readonly steps: readonly Step[];
  /** The source has a reactance at some frequency. */
  readonly reactiveSource: boolean;
  /** Frequency by frequency: `endsSize` numbers of the ends, then `stepSize` of each step. */
  readonly numbers: Float64Array;
}

/** Parts and strays of a step. */
interface Piece extends Pick<Step, 'arm' | 'form' | 'slot'> {
  readonly part: RealArm | null;
  readonly inverse: boolean;
  /** Stray capacitance beside a shunt part, F. */
  readonly strayF: number;
}

/** Of a lossless part: so large that nothing shows it, and a resonance still divides by something. */
const losslessQ = 1e18;
/** Relative imaginary part that is rounding. */
const rounding = 1e-14;

/**
 * @param ends frequencies, and the terminations at them
 * @param f0   design frequency, to which each part's Q refers, Hz
 */
export function prepareReal(ladder: RealLadder, ends: Ends, f0: number, aim: Aim): PreparedReal {
  const { frequencyHz, rs, xs, rl, xl } = ends;
  const pieces = piecesOf(ladder);
  const reference = pieces.find(({ arm, part, form }) => arm === 'series' && form === 'linear' && part?.seriesH === 0);
  const bare = pieces.map(() => true);
  const real = pieces.map(() => true);
  const width = endsSize + pieces.length * stepSize;
  const numbers = new Float64Array(frequencyHz.length * width);
  frequencyHz.forEach((hz, k) => {
    const kappa = reference === undefined ? new Complex(0, 1) : own(reference.part!, f0, hz);
    const source = new Complex(rs[k]!, xs[k]!);
    const row = [
      new Complex(rl[k]!, xl[k]!),
      new Complex(Math.hypot(rl[k]!, xl[k]!), 1),
      kappa,
      new Complex(source.re, 0).div(kappa),
      new Complex(0, source.im).div(kappa),
      new Complex(0, source.abs()).div(kappa),
    ];
    pieces.forEach((piece, at) => {
      const [n0, n1, d0, d1] = numbersOf(piece, f0, hz, kappa);
      row.push(n0, n1, d0, d1);
      bare[at] &&= n0.re === 0 && n0.im === 0;
      real[at] &&= [n0, n1].every(({ re, im }) => Math.abs(im) <= rounding * Math.abs(re));
    });
    row.forEach(({ re, im }, at) => numbers.set([re, im], k * width + 2 * at));
  });
  return {
    frequencyHz,
    aim,
    inverse: ladder.arms.map((_, slot) => pieces.find((piece) => piece.slot === slot)!.inverse),
    steps: pieces.map(({ arm, form, slot }, at) => ({ arm, form, slot, bare: bare[at]!, real: real[at]! })),
    reactiveSource: xs.some((x) => x !== 0),
    numbers,
  };
}

/** Load side first; a node's stray goes with a shunt arm there, if there is one. */
function piecesOf({ arms, strayF }: RealLadder): Piece[] {
  const pieces: Piece[] = [];
  let stray = strayF;
  const strayAlone = (): void => {
    if (stray === 0) return;
    pieces.push({ arm: 'shunt', part: null, slot: null, form: 'linear', inverse: false, strayF: stray });
  };
  for (let slot = arms.length - 1; slot >= 0; slot -= 1) {
    const part = arms[slot]!;
    const inductor = part.part === 'inductor';
    if (part.arm === 'series') {
      strayAlone();
      stray = strayF;
      // Across a parallel capacitance admittances add; an inductor's is linear in the inverse of its value.
      const reciprocal = part.parallelF !== 0;
      const form = reciprocal ? 'reciprocal' : 'linear';
      pieces.push({ arm: 'series', part, slot, form, inverse: inductor === reciprocal, strayF: 0 });
    } else {
      const form = part.seriesH === 0 ? 'linear' : part.parallelF === 0 ? 'reciprocal' : 'bilinear';
      const inverse = inductor === (form !== 'reciprocal');
      pieces.push({ arm: 'shunt', part, slot, form, inverse, strayF: stray });
      stray = 0;
    }
  }
  strayAlone();
  return pieces;
}

/** n0, n1, d0, d1 of a step: of its impedance over κ, of its admittance times κ. */
function numbersOf(
  { arm, part, form, strayF }: Piece,
  f0: number,
  frequencyHz: number,
  kappa: Complex,
): readonly [Complex, Complex, Complex, Complex] {
  const zero = new Complex(0, 0);
  const reactance = (henry: number): Complex => new Complex(0, 2 * Math.PI * frequencyHz * henry);
  const stray = reactance(strayF).mul(kappa);
  if (part === null) return [stray, zero, zero, zero];
  const z = own(part, f0, frequencyHz).div(kappa);
  const y = z.inverse();
  const across = reactance(part.parallelF).mul(kappa);
  const lead = reactance(part.seriesH).div(kappa);
  if (arm === 'series') return form === 'linear' ? [lead, z, zero, zero] : [lead, zero, across, y];
  if (form === 'linear') return [stray.add(across), y, zero, zero];
  if (form === 'reciprocal') return [stray, zero, lead, z];
  const d0 = lead.mul(across).add(1);
  const d1 = lead.mul(y);
  return [across.add(stray.mul(d0)), y.add(stray.mul(d1)), d0, d1];
}

/** Impedance of L or C alone, with its loss, Ω. */
function own(part: RealArm, f0: number, frequencyHz: number): Complex {
  const omega = 2 * Math.PI * frequencyHz;
  const x = part.part === 'inductor' ? omega * part.value : -1 / (omega * part.value);
  return new Complex(Math.abs(x) / (qAt(part, f0, frequencyHz) ?? losslessQ), x);
}
