import type { Span } from '../quantity/span.ts';

/** What the finished board was measured to do, against what was predicted of it. SI units; no NaN, no Infinity. */
export interface AsBuiltFigures {
  /** File measured, its SHA-256, its reference resistance (Ω), its samples and the frequencies that they span, Hz. */
  readonly name: string;
  readonly sha256: string;
  readonly referenceOhm: number;
  readonly samples: number;
  readonly measuredHz: Span;
  readonly attached: Attached;
  /** The samples within the sweep, for the aim in force; empty where the two don't meet. */
  readonly overlay: Overlay;
  readonly verdict: AsBuiltVerdict;
  /** Where the return loss lies outside the tolerance band, by frequency; null: no band is worked out. */
  readonly outside: readonly OutsideSpan[] | null;
  /** Root mean square of |Γ measured − Γ predicted| over the samples compared; null: there are none. */
  readonly distance: number | null;
  readonly conclusion: Conclusion;
  /** Single causes, each fitted alone, the one that leaves least first; those that take nothing away are left out. */
  readonly explanations: readonly Explanation[];
  /** How many of them, from the first, can't be told apart; 0 where none is needed or none explains it. */
  readonly alike: number;
  /** null: not looked for, or no single part on sale brings the network closer. */
  readonly remedy: Remedy | null;
}

/** Which load state the board was measured with. */
export interface Attached {
  /** '' where there is only one without a name. */
  readonly state: string;
  /** The engineer named it, it is the one nearest to the measurement, or there is only one. */
  readonly by: 'engineer' | 'nearest' | 'only one';
  /** RMS distance of the prediction with each state; empty where nothing can be compared. */
  readonly distances: readonly { readonly state: string; readonly distance: number }[];
}

/** Equal lengths; ascending frequency. Reflections for the aim in force; return loss 0 to 200 dB. */
export interface Overlay {
  readonly frequencyHz: readonly number[];
  readonly measuredRe: readonly number[];
  readonly measuredIm: readonly number[];
  readonly measuredDb: readonly number[];
  readonly predictedRe: readonly number[];
  readonly predictedIm: readonly number[];
  readonly predictedDb: readonly number[];
}

/** Of the required band, or the design frequency alone, within the data. */
export interface AsBuiltVerdict {
  readonly verdict: 'meets' | 'falls short' | 'not assessed';
  /** What was required, dB; null: nothing. */
  readonly requiredDb: number | null;
  readonly bandHz: Span;
  /** Part of the band that was measured; null: nothing of it. */
  readonly coveredHz: Span | null;
  /** Least return loss measured there, dB, and where; null: nothing was. */
  readonly worstReturnLossDb: number | null;
  readonly worstAtHz: number | null;
  /** The same of the prediction, over the same samples. */
  readonly predictedDb: number | null;
}

/** A run of samples outside the tolerance band. */
export interface OutsideSpan extends Span {
  readonly side: 'below' | 'above';
  /** Farthest from the band, dB, and where, Hz. */
  readonly byDb: number;
  readonly atHz: number;
}

/**
 * `as predicted`: nothing that a measurement could tell from it. `explained`: one cause stands out. `alike`: several
 * fit as well. `unexplained`: no single cause takes away half of the distance.
 */
export type Conclusion = 'not compared' | 'as predicted' | 'explained' | 'alike' | 'unexplained';

/**
 * A single cause. `size`: of `value`, `load resistance` a factor; of `quality` the Q itself; of all others what is added
 * to the prediction, in F (`stray`, `load capacitance`), H (`lead`, `load inductance`) or Ω (`load reactance`).
 */
export interface Fault {
  readonly kind: FaultKind;
  /** Index of the arm (`value`, `quality`, `lead`) or of the node (`stray`), from the source; 0 for the load. */
  readonly at: number;
  readonly size: number;
}

export type FaultKind =
  | 'value'
  | 'quality'
  | 'stray'
  | 'lead'
  | 'load resistance'
  | 'load reactance'
  | 'load inductance'
  | 'load capacitance';

export interface Explanation extends Fault {
  /** Part that it is about; null: a node or the load. */
  readonly designator: string | null;
  /** "L1 is 12 % high (91.8 nH instead of 82 nH)" */
  readonly words: string;
  /** RMS distance that is left with it in force. */
  readonly residual: number;
  /** Whether the part's tolerance allows it; null: it isn't about a part's value. */
  readonly withinTolerance: boolean | null;
}

/** The one part to be replaced. Return losses are the least over band and load states, the explanation in force, dB. */
export interface Remedy {
  readonly designator: string;
  /** H or F */
  readonly from: number;
  readonly to: number;
  readonly words: string;
  readonly beforeDb: number;
  readonly afterDb: number;
  /** null: no return loss is required. */
  readonly meets: boolean | null;
}
