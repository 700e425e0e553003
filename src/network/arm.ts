/**
 * Conventions of this folder, stated once: time factor e^{jωt}; peak values; a ladder's arms run from the source to
 * the load; SI units (Hz, Ω, S, H, F, W, V, A); port 1 is the source side, port 2 the load side.
 */

/** One element of a ladder. `value` is in henry or farad, positive and finite. */
export interface Arm {
  readonly arm: 'series' | 'shunt';
  readonly part: 'inductor' | 'capacitor';
  readonly value: number;
  /** Quality factor, the same at every frequency, as a series resistance of reactance/Q; absent: lossless. */
  readonly q?: number;
}

/** Reactance in series (Ω) or susceptance across (S) at one frequency, as the part that has it; null when it is zero. */
export function partOf(arm: Arm['arm'], immittance: number, frequencyHz: number): Arm | null {
  if (immittance === 0) return null;
  const omega = 2 * Math.PI * frequencyHz;
  const size = Math.abs(immittance);
  const inductive = arm === 'series' ? immittance > 0 : immittance < 0;
  // ωL in series and ωC across grow with frequency; 1/(ωC) in series and 1/(ωL) across fall.
  const growing = immittance > 0;
  return { arm, part: inductive ? 'inductor' : 'capacitor', value: growing ? size / omega : 1 / (omega * size) };
}
