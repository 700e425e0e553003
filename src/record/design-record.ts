import type { Aim, Termination } from '../network/termination.ts';
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
}

/**
 * The design record: inputs and decisions, never results. Published as JSON Schema in public/schema/.
 * SI units throughout.
 */
export interface DesignRecord {
  readonly schema: 'ferrule-record/1';
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
  /** Quality factors for which a loss is stated; every other figure takes parts as lossless. */
  readonly partQ: { readonly inductor: number; readonly capacitor: number };
  /** Sweep shown, Hz; null: chosen from the band. */
  readonly sweepHz: Span | null;
  readonly selection: {
    /** Id of the network chosen by the engineer; null: the proposed one. */
    readonly option: string | null;
    /** Why, in the engineer's words. */
    readonly reason: string;
  };
  readonly signOff: {
    readonly prepared: Signature;
    readonly checked: Signature;
    readonly approved: Signature;
  };
}
