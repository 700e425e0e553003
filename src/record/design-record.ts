import type { Distribution } from '../evidence/distribution.ts';
import type { MeasuredData } from '../measured/measured.ts';
import type { Aim, Termination } from '../network/termination.ts';
import type { Origin } from '../parts/origin.ts';
import type { StockList } from '../parts/stock.ts';
import type { Tolerance } from '../parts/tolerance.ts';
import type { Span } from '../quantity/span.ts';

export const methods = [
  'two-element',
  'resistive-pair',
  'pi',
  'tee',
  'cascade',
  'equal-ripple',
  'fitted',
  'all',
] as const;
/** How networks are found; `all`: every method, of every size. */
export type Method = (typeof methods)[number];

/** One state of the load: "free space", "in hand". */
export interface LoadState {
  /** '' where there is only one. */
  readonly name: string;
  readonly termination: Termination;
}

export interface Signature {
  readonly name: string;
  readonly role: string;
  /** ISO 8601 calendar date, or '' while unsigned. */
  readonly date: string;
  readonly remark: string;
}

/** Of one kind of part, where its stock line says nothing else. */
export interface PartPolicy {
  readonly origin: Origin;
  readonly tolerance: Tolerance;
  /** Q(f) = Q0·(f/f0)^slope. */
  readonly qSlope: number;
}

/** What real parts are taken from, and what is asked of the network built of them. */
export interface Build {
  readonly inductor: PartPolicy;
  readonly capacitor: PartPolicy;
  readonly stock: StockList | null;
  /** Two parts in series or in parallel may stand for one. */
  readonly pairs: boolean;
  /** Self-resonance of inductors, Hz; null: above all frequencies of interest. */
  readonly selfResonanceHz: number | null;
  /** Equivalent series inductance of capacitors, H. */
  readonly eslH: number;
  /** Stray capacitance of every node to ground, F. */
  readonly strayF: number;
  /** Inductance of the leads of every shunt arm, H. */
  readonly leadH: number;
  readonly distribution: Distribution;
  /** How far R may be from its value, as a fraction of it, and X, as a fraction of |Z|; the same over frequency. */
  readonly sourceSpread: number;
  readonly loadSpread: number;
  /** Networks drawn for the yield. */
  readonly samples: number;
  readonly seed: number;
  /** Least yield, 0 to 1; null: not required. */
  readonly leastYield: number | null;
  /** Load mismatch up to which stress is assessed; null: the load states alone. */
  readonly vswr: number | null;
  /** Part of a rating that may be used, 0 to 1. */
  readonly derating: number;
  /** Ratings of parts whose stock line gives none; null: not known. V (peak), A (RMS), W. */
  readonly ratedVolts: number | null;
  readonly ratedAmps: number | null;
  readonly ratedWatts: number | null;
  /** A single-layer air coil: wire diameter, diameter of the form, gap between turns, m. */
  readonly winding: { readonly wireM: number; readonly formM: number; readonly gapM: number };
}

/** What a network is held to: the subjects of its checks, and of what is said where one falls short. */
export const requirements = [
  'return loss',
  'yield',
  'stress',
  'DC block',
  'DC at the source',
  'DC at the load',
  'part values',
] as const;
export type Required = (typeof requirements)[number];

/** A requirement that isn't met, accepted in writing. */
export interface Deviation {
  readonly subject: Required;
  readonly reason: string;
}

/** One line of the revision history. */
export interface EarlierRevision {
  readonly revision: string;
  /** ISO 8601 calendar date. */
  readonly date: string;
  /** What it changed, and why. */
  readonly change: string;
  /** Digest of that revision's record. */
  readonly digest: string;
}

/** What the analyser measured on the finished board, looking in from the source side with the load attached. */
export interface AsBuilt {
  readonly measured: MeasuredData;
  /** Load state that was attached, by its name; null: not said. */
  readonly state: string | null;
  readonly note: string;
}

/**
 * The design record: inputs and decisions, never results. Published as JSON Schema in public/schema/.
 * SI units throughout.
 */
export interface DesignRecord {
  readonly schema: 'ferrule-record/2';
  readonly identity: {
    readonly title: string;
    readonly number: string;
    readonly revision: string;
    /** ISO 8601 calendar date. */
    readonly date: string;
    /** Change ticket; '' when none. */
    readonly ticket: string;
    /** Legal owner of the document (ISO 7200); '' when none. */
    readonly owner: string;
    /** What this revision changes, and why; '' for the first. */
    readonly change: string;
  };
  readonly requirement: {
    readonly frequencyHz: number;
    /** Band to hold; null: the design frequency alone. Always holds `frequencyHz`. */
    readonly bandHz: Span | null;
    /** Least return loss over the band, dB; null: not required. */
    readonly returnLossDb: number | null;
    /** DC must be blocked between source and load. */
    readonly blockDc: boolean;
    /** Ends that carry DC, which the network must not short to ground. */
    readonly keepDc: 'none' | 'source' | 'load' | 'both';
    /** Practicable range of inductance, H. */
    readonly inductorH: Span;
    /** Practicable range of capacitance, F. */
    readonly capacitorF: Span;
    /** Available power of the source, W; null: not stated. */
    readonly powerW: number | null;
  };
  readonly source: Termination;
  /** Load states, one at least; the closed forms are matched to the first, every figure is the worst of all. */
  readonly loads: readonly LoadState[];
  readonly aim: Aim;
  readonly method: Method;
  /** Cascade and equal ripple: number of sections (1 to 6), or every number. */
  readonly sections: 'auto' | 1 | 2 | 3 | 4 | 5 | 6;
  /** Pi and T: Q at the steeper end; null: chosen from the least that exists. */
  readonly q: number | null;
  readonly fit: {
    /** Number of elements (2 to 8), or every number. */
    readonly elements: 'auto' | 2 | 3 | 4 | 5 | 6 | 7 | 8;
    readonly form: 'any' | 'low-pass' | 'high-pass';
    readonly shuntInductor: boolean;
    readonly seed: number;
    /** Pieces of work after which the engineer stopped it; null: all. */
    readonly steps: number | null;
  };
  /** Quality factors at the design frequency: of real parts, and for the loss stated of exact ones. */
  readonly partQ: { readonly inductor: number; readonly capacitor: number };
  /** null: exact, ideal parts alone. */
  readonly build: Build | null;
  /** Sweep shown, Hz; null: chosen from the band. */
  readonly sweepHz: Span | null;
  readonly selection: {
    /** Id of the network chosen by the engineer; null: the proposed one. */
    readonly option: string | null;
    /** Why, in the engineer's words. */
    readonly reason: string;
    /** Which of the best sets of values, 1 to 3. */
    readonly set: 1 | 2 | 3;
  };
  readonly deviations: readonly Deviation[];
  /** Earlier revisions, the oldest first. */
  readonly history: readonly EarlierRevision[];
  /** The revision before this one, itself without one before; null: none. */
  readonly previous: DesignRecord | null;
  readonly asBuilt: AsBuilt | null;
  /** Not part of the digest. */
  readonly signOff: {
    readonly state: 'draft' | 'for review' | 'issued';
    readonly prepared: Signature;
    readonly checked: Signature;
    readonly approved: Signature;
  };
}
