import type { Arm } from '../network/arm.ts';

/** A network that a method found, before it is judged. */
export interface Candidate {
  /** Stable for given terminations. */
  readonly id: string;
  readonly title: string;
  readonly arms: readonly Arm[];
  /** Sections in cascade; 0 when no part is needed. */
  readonly sections: number;
  /** Q of every section, between its own two resistances. */
  readonly sectionQ: number;
}

/** A form that has no network for these terminations. */
export interface Absence {
  readonly form: string;
  /** The inequality that fails, with its numbers. */
  readonly why: string;
}

export interface Synthesis {
  readonly candidates: readonly Candidate[];
  readonly absent: readonly Absence[];
}
