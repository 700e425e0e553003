import type { Arm } from '../../network/arm.ts';
import type { Aim, Termination } from '../../network/termination.ts';
import type { Span } from '../../quantity/span.ts';
import type { ShapeRule } from './shape.ts';

export interface FitProblem {
  readonly source: Termination;
  /** Load states, all to be held at once. */
  readonly loads: readonly Termination[];
  readonly f0: number;
  readonly bandHz: Span;
  readonly aim: Aim;
  readonly elements: number;
  readonly rule: ShapeRule;
  readonly inductorH: Span;
  readonly capacitorF: Span;
  readonly seed: number;
  /** Networks to start from beside the random ones: closed forms, or what a smaller ladder found. */
  readonly starts: readonly (readonly Arm[])[];
}

export interface Fitted {
  readonly arms: readonly Arm[];
  /** Worst ln|Γ|² over the samples, all states. */
  readonly level: number;
}

export interface FitProgress {
  /** 0 to 1, of the work of this fit. */
  readonly done: number;
  /** Best so far; null before the first. */
  readonly best: Fitted | null;
}
