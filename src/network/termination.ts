/** Conjugate: looking into the network one sees ZS*. Reflectionless: one sees ZS. Both are the same for a real source. */
export type Aim = 'conjugate' | 'reflectionless';

/** What a termination does away from the design frequency. */
export type Behaviour = 'constant' | 'series' | 'parallel';

/**
 * One end of the interface: its impedance at the design frequency and how that varies.
 * `constant`: R + jX everywhere. `series`: R with the inductance or capacitance that X means in series.
 * `parallel`: the equivalent parallel R with L or C.
 */
export interface Termination {
  /** Ω, > 0 */
  readonly r: number;
  /** Ω */
  readonly x: number;
  readonly behaviour: Behaviour;
}
