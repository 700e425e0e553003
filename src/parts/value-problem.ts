import type { RealArm } from '../network/real-arm.ts';
import type { Ends } from '../network/sweep.ts';
import type { Aim } from '../network/termination.ts';

/** What a search for values chooses from, and what for. */
export interface ValueProblem {
  /** For each arm, source side first, the real parts that it could be, ascending by value; one or more. */
  readonly candidates: readonly (readonly RealArm[])[];
  /** From every node to ground, F; 0: none. */
  readonly strayF: number;
  /** The same source over the same frequencies into each load state; one frequency where there is no band. */
  readonly states: readonly Ends[];
  /** Design frequency, Hz. */
  readonly f0: number;
  readonly aim: Aim;
}

/** One part for every arm. */
export interface PickedSet {
  /** Which of its arm's candidates each part is, source side first. */
  readonly picks: readonly number[];
  /** Largest |Γ|² over the frequencies and states given. */
  readonly gammaSquared: number;
}
