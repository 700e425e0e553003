import { partOf, type Arm } from '../network/arm.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { Candidate, Synthesis } from './candidate.ts';
import { titleOf } from './title.ts';

/** Q = sqrt(Rhigh/Rlow − 1) of a resistive pair. Ω. */
export function pairQ(sourceOhm: number, loadOhm: number): number {
  const high = Math.max(sourceOhm, loadOhm);
  const low = Math.min(sourceOhm, loadOhm);
  // The difference of two close resistances is exact; their quotient isn't.
  return Math.sqrt((high - low) / low);
}

/**
 * Two-element networks between two resistances by the single-parameter Q method: Xseries = ±Q·Rlow at the lower end,
 * Xshunt = ∓Rhigh/Q across the higher one (common practice; e.g. C. Bowick, RF Circuit Design, ch. 4).
 */
export function resistivePair(sourceOhm: number, loadOhm: number, frequencyHz: number): Synthesis {
  const q = pairQ(sourceOhm, loadOhm);
  if (q === 0) {
    return { candidates: [{ id: 'direct', title: titleOf([]), arms: [], sections: 0, sectionQ: 0 }], absent: [] };
  }
  const shuntAt = loadOhm > sourceOhm ? 'load' : 'source';
  const low = Math.min(sourceOhm, loadOhm);
  const high = Math.max(sourceOhm, loadOhm);
  const candidates = ([1, -1] as const).map((sign): Candidate => {
    const series = partOf('series', sign * q * low, frequencyHz);
    const shunt = partOf('shunt', (sign * q) / high, frequencyHz);
    const rising = [series, shunt].filter((arm): arm is Arm => arm !== null);
    const arms = shuntAt === 'load' ? rising : rising.reverse();
    const id = `shunt-${shuntAt}-${sign > 0 ? 'plus' : 'minus'}`;
    return { id, title: titleOf(arms), arms, sections: 1, sectionQ: q };
  });
  const other = shuntAt === 'load' ? 'source' : 'load';
  return {
    candidates,
    absent: [
      {
        form: `shunt arm at the ${other}`,
        why: `needs the ${other} to be the higher resistance; here ${formatQuantity(low, 'Ω')} < ${formatQuantity(high, 'Ω')}`,
      },
    ],
  };
}
