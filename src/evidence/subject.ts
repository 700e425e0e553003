import type { RealLadder } from '../network/real-arm.ts';
import { prepareReal, type PreparedReal } from '../network/real-sweep.ts';
import type { Ends } from '../network/sweep.ts';
import type { Aim } from '../network/termination.ts';
import type { Distribution } from './distribution.ts';
import type { EndSpread, VariedPart } from './spread.ts';

/** One network of real parts, what it works into, and what varies when it is built many times. */
export interface ToleranceSubject {
  readonly ladder: RealLadder;
  /** Frequencies over which the return loss counts, and the ends at them, of every load state; one at least. */
  readonly states: readonly { readonly name: string; readonly ends: Ends }[];
  /** Design frequency, Hz. */
  readonly f0: number;
  readonly aim: Aim;
  readonly parts: readonly VariedPart[];
  readonly spread: EndSpread;
  readonly distribution: Distribution;
}

/** The same, with what depends on frequency alone worked out: once, however many networks are drawn. */
export interface PreparedSubject extends ToleranceSubject {
  /** One a state. */
  readonly prepared: readonly PreparedReal[];
}

export const prepareSubject = (subject: ToleranceSubject): PreparedSubject => ({
  ...subject,
  prepared: subject.states.map(({ ends }) => prepareReal(subject.ladder, ends, subject.f0, subject.aim)),
});

/** The same networks drawn, but with one part's tolerance another: its deviations shrink or grow in proportion. */
export const withTolerance = (subject: PreparedSubject, part: number, tolerance: number): PreparedSubject => ({
  ...subject,
  parts: subject.parts.map((given, k) => (k === part ? { ...given, tolerance } : given)),
});
