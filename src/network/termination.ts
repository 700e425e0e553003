import type { CircuitModel } from './circuit-model.ts';

/** Conjugate: looking into the network one sees ZS*. Reflectionless: one sees ZS. Both are the same for a real source. */
export type Aim = 'conjugate' | 'reflectionless';

/** What one impedance does away from the design frequency. */
export type Behaviour = 'constant' | 'series' | 'parallel';

/**
 * One impedance at the design frequency and how it varies. `constant`: R + jX everywhere. `series`: R with the
 * inductance or capacitance that X means in series. `parallel`: the equivalent parallel R with L or C.
 */
export interface OneImpedance {
  /** Ω, > 0 */
  readonly r: number;
  /** Ω */
  readonly x: number;
  readonly behaviour: Behaviour;
}

/** Samples of a reflection coefficient, from a file or a pasted table; interpolated between, never beyond. */
export interface MeasuredTermination {
  readonly measured: {
    /** File name, or "table". */
    readonly name: string;
    /** SHA-256 of the file's or table's text, 64 hex digits. */
    readonly sha256: string;
    /** Samples in the file; more than are here where it was thinned. */
    readonly samples: number;
    /** Largest distance between a sample left out and the curve through those kept; 0 where none was. */
    readonly thinningError: number;
    /** Ω */
    readonly referenceOhm: number;
    readonly frequencyHz: readonly number[];
    readonly re: readonly number[];
    readonly im: readonly number[];
  };
}

/** One end of the interface. */
export type Termination = OneImpedance | CircuitModel | MeasuredTermination;

export const isOneImpedance = (t: Termination): t is OneImpedance => 'behaviour' in t;
export const isModel = (t: Termination): t is CircuitModel => 'model' in t;
export const isMeasured = (t: Termination): t is MeasuredTermination => 'measured' in t;
