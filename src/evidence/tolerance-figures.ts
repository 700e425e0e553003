/** Fraction of networks that hold the return loss, with the exact (Clopper-Pearson) interval. */
export interface Yield {
  readonly value: number;
  readonly low: number;
  readonly high: number;
  /** Two-sided confidence of the interval, 0.95. */
  readonly confidence: number;
  readonly samples: number;
  readonly passed: number;
  readonly seed: number;
}

/** Of each load state, by its name, over the frequencies of the dossier's responses. dB, at most 200. */
export interface Percentiles {
  /** Fractions of networks: 0.05, 0.5, 0.95 */
  readonly fractions: readonly number[];
  readonly states: readonly {
    readonly state: string;
    readonly frequencyHz: readonly number[];
    /** Return loss of the nominal real network. */
    readonly nominalDb: readonly number[];
    /** One curve for each fraction: that many of the networks have a lower return loss. */
    readonly curvesDb: readonly (readonly number[])[];
  }[];
}

/** Every part at an end of its tolerance. */
export interface Corners {
  readonly worstReturnLossDb: number;
  readonly worstAtHz: number;
  readonly worstState: string;
  /** "L1 +5 %, C1 −5 %" */
  readonly words: string;
  readonly meets: boolean | null;
}

export interface PartSensitivity {
  readonly designator: string;
  /** Change of the worst return loss for +1 % of the part's value, dB. */
  readonly dbPerPercent: number;
  /** The same for −1 %. */
  readonly dbPerMinusPercent: number;
  /** Worst return loss with this part alone at the worse end of its tolerance, dB. */
  readonly atToleranceDb: number;
  /** Yield with this part's tolerance halved, the same networks drawn; null where no yield is assessed. */
  readonly yieldIfHalved: number | null;
}
