import type { Complex } from 'complex.js';
import type { Arm } from '../network/arm.ts';
import type { Behaviour } from '../network/termination.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { Absence, Candidate } from './candidate.ts';
import { equalRippleElements, ripple } from './equal-ripple-elements.ts';
import { parallelResistance, susceptance, type ShuntAt } from './resistance-chain.ts';
import { log10, power } from '../quantity/elementary.ts';

/** One end as the method sees it: its impedance at f0 and how its reactance varies. */
export interface EqualRippleEnd {
  readonly z: Complex;
  readonly behaviour: Behaviour;
}

export interface EqualRippleCandidate extends Candidate {
  readonly pass: 'low-pass' | 'high-pass';
  readonly shuntAt: ShuntAt;
  /** Worst in-band return loss in closed form, dB. */
  readonly closedFormDb: number;
}

/** Beyond it the swept figure is rounding and can't bear out the closed form, dB. */
const mostDb = 150;

/**
 * Equal-ripple ladders between two resistances over a band, low-pass and high-pass form (ω → ωa·ωb/ω), 2n elements
 * (G. L. Matthaei, Proc. IEEE 52, 1964). Reactance at an end is absorbed where it is of the outer element's kind and no
 * larger than it.
 */
export function equalRipple(
  source: EqualRippleEnd,
  load: EqualRippleEnd,
  f0: number,
  bandHz: Span,
  sections: readonly number[],
): { readonly candidates: readonly EqualRippleCandidate[]; readonly absent: readonly Absence[] } {
  const candidates: EqualRippleCandidate[] = [];
  const absent: Absence[] = [];
  // The series element stands at the lower end, which counts by its series resistance; the other by its parallel one.
  const arrangements = (
    [
      [source, load, 'load'],
      [load, source, 'source'],
    ] as const
  )
    .map(([low, high, shuntAt]) => ({ low, high, shuntAt, r: parallelResistance(high.z) / low.z.re }))
    .filter(({ r }) => r > 1 + 1e-12);
  if (arrangements.length === 0) {
    absent.push({ form: 'equal ripple', why: 'needs two different resistances; here they are the same' });
  }
  if (bandHz.low === bandHz.high) {
    return {
      candidates,
      absent: [{ form: 'equal ripple', why: 'needs a band with a width; here both edges are the same' }],
    };
  }
  const centre = Math.sqrt(bandHz.low * bandHz.high);
  for (const { low, high, shuntAt, r } of arrangements) {
    // Both forms have the same elements; large numbers of sections take their time.
    const known = new Map<number, readonly number[]>();
    const elements = (n: number): readonly number[] => {
      const values = known.get(n) ?? equalRippleElements(r, bandHz.low / centre, bandHz.high / centre, n).values;
      known.set(n, values);
      return values;
    };
    for (const pass of ['low-pass', 'high-pass'] as const) {
      // One line tells why a form doesn't exist at all; numbers of sections that merely lack are told one by one.
      const refused: Absence[] = [];
      let exists = false;
      for (const n of sections) {
        const form = `equal ripple, ${String(n)} section${n === 1 ? '' : 's'}, ${pass}, shunt arm at the ${shuntAt}`;
        const closedFormDb = -20 * log10(ripple(r, bandHz.low, bandHz.high, n).reflection);
        if (closedFormDb > mostDb) {
          refused.push({
            form,
            why: `its closed form promises ${formatFixed(closedFormDb, 0)} dB, which double precision can't bear out; fewer sections hold more than can be built`,
          });
          continue;
        }
        const rising = arms(elements(n), low.z.re, centre, pass);
        const why = absorb(rising, low, high, f0);
        if (why !== null) {
          refused.push({ form, why });
          continue;
        }
        exists = true;
        candidates.push({
          id: `equal-ripple-${pass}-${String(n)}-shunt-${shuntAt}`,
          title: form.charAt(0).toUpperCase() + form.slice(1),
          arms: (shuntAt === 'load' ? rising : rising.toReversed()).filter(({ value }) => value > 0),
          sections: n,
          sectionQ: Math.sqrt(power(r, 1 / n) - 1),
          pass,
          shuntAt,
          closedFormDb,
        });
      }
      const [first] = refused;
      if (exists) absent.push(...refused);
      else if (first !== undefined) {
        absent.push({ form: `equal ripple, ${pass}, shunt arm at the ${shuntAt}`, why: first.why });
      }
    }
  }
  return { candidates: candidates.toSorted((a, b) => a.sections - b.sections), absent };
}

/** Normalised elements as parts, from the lower resistance to the higher. */
function arms(values: readonly number[], ohm: number, centreHz: number, pass: 'low-pass' | 'high-pass'): Arm[] {
  const omega = 2 * Math.PI * centreHz;
  return values.map((g, k) => {
    const arm = k % 2 === 0 ? 'series' : 'shunt';
    // Reactance (series) or resistance over susceptance (shunt) at the centre, the same in both forms.
    const x = arm === 'series' ? g * ohm : ohm / g;
    const inductive = (arm === 'series') === (pass === 'low-pass');
    return { arm, part: inductive ? 'inductor' : 'capacitor', value: inductive ? x / omega : 1 / (omega * x) };
  });
}

/**
 * Takes the ends' reactance out of the outer elements, in place.
 *
 * @returns why it can't be done; null when it is done
 */
function absorb(rising: Arm[], low: EqualRippleEnd, high: EqualRippleEnd, f0: number): string | null {
  const omega = 2 * Math.PI * f0;
  const first = rising[0]!;
  const last = rising[rising.length - 1]!;
  const x = low.z.im;
  if (x !== 0) {
    const own = { name: 'series reactance', kind: x > 0 ? 'inductor' : 'capacitor', size: Math.abs(x) } as const;
    if (low.behaviour !== 'series')
      return "needs the lower end's reactance to be one part in series; it is not taken as that";
    if (own.kind !== first.part) return `the lower end's reactance is of the other kind than the outer ${first.part}`;
    // A series capacitor left over of two in series is larger: 1/C = 1/C1 − 1/Cend.
    const value = own.kind === 'inductor' ? own.size / omega : 1 / (omega * own.size);
    const rest = own.kind === 'inductor' ? first.value - value : 1 / (1 / first.value - 1 / value);
    if (!(rest >= 0)) return tooSmall(first, value);
    rising[0] = { ...first, value: Number.isFinite(rest) ? rest : 0 };
  }
  const b = susceptance(high.z);
  if (high.z.im !== 0) {
    const kind = b > 0 ? 'capacitor' : 'inductor';
    if (high.behaviour !== 'parallel')
      return "needs the higher end's reactance to be one part in parallel; it is not taken as that";
    if (kind !== last.part) return `the higher end's reactance is of the other kind than the outer ${last.part}`;
    const value = kind === 'capacitor' ? b / omega : -1 / (omega * b);
    const rest = kind === 'capacitor' ? last.value - value : 1 / (1 / last.value - 1 / value);
    if (!(rest >= 0)) return tooSmall(last, value);
    rising[rising.length - 1] = { ...last, value: Number.isFinite(rest) ? rest : 0 };
  }
  return null;
}

function tooSmall({ part, value }: Arm, own: number): string {
  const unit = part === 'inductor' ? 'H' : 'F';
  return `the outer ${part} of ${formatQuantity(value, unit)} does not hold the end's own ${formatQuantity(own, unit)}`;
}
