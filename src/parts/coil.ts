import { formatQuantity } from '../quantity/format.ts';
import type { CoilWinding } from './coil-winding.ts';

export interface WindingForm {
  /** Diameter of the wire, m. */
  readonly wireM: number;
  /** Diameter of what it is wound on, m. */
  readonly formM: number;
  /** Between neighbouring turns, m; 0: close-wound. */
  readonly gapM: number;
}

const inchM = 0.0254;

/**
 * Self-capacitance of a single-layer coil with one end grounded, pF per centimetre of diameter, by length over diameter
 * (R. G. Medhurst, Wireless Engineer 24, 1947; quoted from memory).
 */
const medhurst = [
  [0.1, 0.96],
  [0.15, 0.79],
  [0.2, 0.7],
  [0.25, 0.64],
  [0.3, 0.6],
  [0.35, 0.57],
  [0.4, 0.54],
  [0.45, 0.52],
  [0.5, 0.5],
  [0.6, 0.48],
  [0.7, 0.47],
  [0.8, 0.46],
  [0.9, 0.46],
  [1, 0.46],
  [1.5, 0.47],
  [2, 0.5],
  [2.5, 0.56],
  [3, 0.61],
  [3.5, 0.67],
  [4, 0.72],
  [4.5, 0.77],
  [5, 0.81],
  [6, 0.92],
  [7, 1.01],
  [8, 1.12],
  [9, 1.22],
  [10, 1.32],
] as const;

/** More turns than anyone winds evenly by hand. */
const mostTurns = 100;

/**
 * A single-layer air coil of an inductance: L(µH) = r²N²/(9r + 10l), r and l in inches (H. A. Wheeler, Proc. IRE 16,
 * 1928), solved for N with a winding of length l = N·(wire + gap), and r to the middle of the wire.
 */
export function coil(designator: string, inductanceH: number, { wireM, formM, gapM }: WindingForm): CoilWinding {
  const diameterM = formM + wireM;
  const pitchM = wireM + gapM;
  const r = diameterM / 2 / inchM;
  const microhenry = inductanceH * 1e6;
  // r²N² − 10·L·pitch·N − 9·L·r = 0; the other root is negative.
  const half = (5 * microhenry * pitchM) / inchM;
  const turns = (half + Math.sqrt(half ** 2 + 9 * microhenry * r ** 3)) / r ** 2;
  const lengthM = turns * pitchM;
  const selfCapacitanceF = selfCapacitance(lengthM, diameterM);
  const selfResonanceHz =
    selfCapacitanceF === null ? null : 1 / (2 * Math.PI * Math.sqrt(inductanceH * selfCapacitanceF));
  return {
    designator,
    inductanceH,
    turns,
    diameterM,
    lengthM,
    wireLengthM: turns * Math.hypot(Math.PI * diameterM, pitchM),
    wireM,
    selfCapacitanceF,
    selfResonanceHz,
    caution: cautionOf(turns, lengthM, diameterM),
  };
}

/**
 * F, straight between the values of Medhurst's table.
 *
 * @returns null outside of it, length over diameter below 0.1 or above 10
 */
export function selfCapacitance(lengthM: number, diameterM: number): number | null {
  const ratio = lengthM / diameterM;
  const above = medhurst.findIndex(([at]) => at >= ratio);
  const upper = medhurst[above];
  if (upper === undefined) return null;
  const lower = medhurst[above - 1];
  if (lower === undefined) return ratio === upper[0] ? upper[1] * diameterM * 1e-10 : null;
  const share = (ratio - lower[0]) / (upper[0] - lower[0]);
  return (lower[1] + share * (upper[1] - lower[1])) * diameterM * 1e-10;
}

/** All that applies, in sentences. */
function cautionOf(turns: number, lengthM: number, diameterM: number): string {
  const cautions: string[] = [];
  const radiusM = diameterM / 2;
  if (turns < 1) cautions.push('Less than one turn: a loop or a straight wire, for which the formula is not made.');
  if (lengthM <= 0.8 * radiusM) {
    cautions.push(
      `The winding, ${formatQuantity(lengthM, 'm', 3)}, is not longer than 0.8 of its radius, ` +
        `${formatQuantity(radiusM, 'm', 3)}: the formula is off by more than 1 %.`,
    );
  }
  const ratio = lengthM / diameterM;
  if (ratio < medhurst[0][0] || ratio > medhurst.at(-1)![0]) {
    cautions.push(
      `Length over diameter, ${ratio.toPrecision(3)}, is outside 0.1 to 10: no figure for its self-capacitance and self-resonance.`,
    );
  }
  if (turns > mostTurns) cautions.push(`More than ${String(mostTurns)} turns: thinner wire or a larger form would do.`);
  return cautions.join(' ');
}
