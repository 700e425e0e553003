/**
 * Conventions of this folder, stated once: time factor e^{jωt}; peak values; a ladder's arms run from the source to
 * the load; SI units (Hz, Ω, S, H, F, W, V, A); port 1 is the source side, port 2 the load side.
 */

/** One element of a ladder. `value` is in henry or farad, positive and finite. */
export interface Arm {
  readonly arm: 'series' | 'shunt';
  readonly part: 'inductor' | 'capacitor';
  readonly value: number;
}
