import { Complex } from 'complex.js';
import { realImpedance, type RealArm, type RealLadder } from '../network/real-arm.ts';
import type { Ends } from '../network/sweep.ts';
import { realBranches } from './branch.ts';
import { carry } from './carry.ts';
import { largestOnDisc } from './largest-on-disc.ts';
import { shares, type Pair, type Share } from './pair-share.ts';
import type { PartStress, Stress, StressFigures } from './stress-figures.ts';
import { limitOf, stressWords, type Ratings } from './stress-limit.ts';

/** One part to order. */
export interface StressPart {
  readonly designator: string;
  /** Index of its arm in the ladder. */
  readonly armIndex: number;
  readonly pair: Pair;
  /** The part by itself: of a pair, one of the two. */
  readonly alone: RealArm;
  /** As its stock line says; null: it says nothing. V (peak), A (RMS). */
  readonly ratedVolts: number | null;
  readonly ratedAmps: number | null;
}

export interface StressSubject {
  readonly ladder: RealLadder;
  /** Hz */
  readonly f0: number;
  /** Those of one arm follow each other. */
  readonly parts: readonly StressPart[];
  /** Source and load over the band, one for each load state. */
  readonly states: readonly Ends[];
}

/**
 * What each part bears for the available power: the most of each figure over the frequencies and the load states.
 *
 * A mismatched load is one that reflects up to (s − 1)/(s + 1) against its nominal impedance, at any angle:
 * Γ = (Z − ZL)/(Z + ZL*), so Z = (ZL + Γ·ZL*)/(1 − Γ). Voltage and current at the load are then ZL + Γ·ZL* and 1 − Γ,
 * and what that carries back is linear in Γ: every voltage and current of a part, for a source of given open-circuit
 * voltage, is (a + bΓ)/(c + dΓ). A pole would be a load of positive resistance into which the source's loop, V + I·ZS,
 * is zero: the passive network would show −ZS, which has negative resistance. So there is none for |Γ| < 1, the most
 * occurs on the rim (maximum modulus), and it has a closed form. Heat is |I|² times a resistance: the same load is worst.
 *
 * @param powerW   available from the source, > 0, W
 * @param vswr     1 or more; null: the loads as they are
 * @param derating part of a rating that may be used, 0 to 1
 */
export function stressOf(
  { ladder, f0, parts, states }: StressSubject,
  powerW: number,
  vswr: number | null,
  ratings: Ratings,
  derating: number,
): Stress {
  const rho = vswr === null ? 0 : (vswr - 1) / (vswr + 1);
  const nominal = parts.map(() => new Most());
  const mismatched = parts.map(() => new Most());
  for (const { frequencyHz, rs, xs, rl, xl } of states) {
    frequencyHz.forEach((hz, k) => {
      const branches = realBranches(ladder, f0, hz);
      const source = new Complex(rs[k]!, xs[k]!);
      const load = new Complex(rl[k]!, xl[k]!);
      const emf = Math.sqrt(8 * source.re * powerW);
      const matched = carry(branches, load, new Complex(1, 0));
      const reflecting = carry(branches, load.conjugate(), new Complex(-1, 0));
      const c = matched.volts.add(matched.amps.mul(source));
      const d = reflecting.volts.add(reflecting.amps.mul(source));
      const share = sharesAt(parts, f0, hz);
      parts.forEach(({ armIndex }, n) => {
        const { arm, z } = branches.arms[armIndex]!;
        // One of the two rules the other by the arm's impedance: that which the ladder gives without a division.
        const what = arm === 'series' ? 'amps' : 'volts';
        const a = matched.arms[armIndex]![what];
        const b = reflecting.arms[armIndex]![what];
        const toAmps = arm === 'series' ? 1 : 1 / z.abs();
        nominal[n]!.consider(((emf * a.abs()) / c.abs()) * toAmps, z, share[n]!);
        if (vswr !== null) mismatched[n]!.consider(emf * largestOnDisc(a, b, c, d, rho) * toAmps, z, share[n]!);
      });
    });
  }
  const stressed = parts.map((part, n): PartStress => {
    const figures = nominal[n]!.figures();
    const worst = vswr === null ? null : mismatched[n]!.figures();
    const rated = {
      ratedVolts: part.ratedVolts ?? ratings.ratedVolts,
      ratedAmps: part.ratedAmps ?? ratings.ratedAmps,
      ratedWatts: ratings.ratedWatts,
    };
    const limit = limitOf(worst ?? figures, rated, derating, powerW);
    return {
      designator: part.designator,
      ...figures,
      mismatched: worst,
      limitW: limit?.powerW ?? null,
      limitBy: limit?.by ?? null,
    };
  });
  return { powerW, vswr, parts: stressed, ...stressWords(stressed, powerW, vswr, derating) };
}

/** The most of each figure met so far. */
class Most {
  private volts = 0;
  private amps = 0;
  private watts = 0;

  /** @param amps through the arm, peak; of which the part bears a share */
  consider(amps: number, z: Complex, share: Share): void {
    this.volts = Math.max(this.volts, amps * z.abs() * share.volts);
    this.amps = Math.max(this.amps, (amps / Math.SQRT2) * share.amps);
    this.watts = Math.max(this.watts, ((amps * amps * z.re) / 2) * share.watts);
  }

  figures(): StressFigures {
    return { voltsPeak: this.volts, ampsRms: this.amps, watts: this.watts };
  }
}

/** One for each part, at a frequency. */
const sharesAt = (parts: readonly StressPart[], f0: number, hz: number): Share[] =>
  parts.flatMap(({ armIndex, pair }, n) => {
    if (parts[n - 1]?.armIndex === armIndex) return [];
    const together = pair === null ? [parts[n]!] : parts.filter((part) => part.armIndex === armIndex);
    return shares(
      together.map(({ alone }) => realImpedance(alone, f0, hz)),
      pair,
    );
  });
