import type { MeasuredData } from '../measured/measured.ts';
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
  readonly measured: MeasuredData;
}

/** One end of the interface. */
export type Termination = OneImpedance | CircuitModel | MeasuredTermination;

export const isOneImpedance = (t: Termination): t is OneImpedance => 'behaviour' in t;
export const isModel = (t: Termination): t is CircuitModel => 'model' in t;
export const isMeasured = (t: Termination): t is MeasuredTermination => 'measured' in t;
