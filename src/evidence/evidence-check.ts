import type { Complex } from 'complex.js';

export interface EvidenceCheck {
  /** "impedance seen", "transducer gain", "power balance", "element values by the Q method" */
  readonly subject: string;
  /** Largest relative difference over routes and frequencies. */
  readonly spread: number;
  readonly tolerance: number;
  readonly pass: boolean;
  readonly note: string;
}

/** Largest relative difference between routes that passes. */
export const routeTolerance = 1e-9;
/** Of a gain below −60 dB the rounding of the available power is all that routes could differ by. */
export const leastGain = 1e-6;

export function check(subject: string, spread: number, tolerance: number, note: string): EvidenceCheck {
  return { subject, spread, tolerance, pass: spread <= tolerance, note };
}

/** @param floor size below which a difference is taken relative to this instead */
export function relativeSpread(values: readonly Complex[], floor = 0): number {
  const size = Math.max(floor, ...values.map((value) => value.abs()));
  if (size === 0) return 0;
  return Math.max(...values.flatMap((a) => values.map((b) => a.sub(b).abs()))) / size;
}
