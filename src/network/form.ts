import type { Arm } from './arm.ts';

export type Form = 'low-pass' | 'high-pass' | 'band-pass' | 'all-pass';

/** What a ladder passes between resistances, from its parts' limits at zero and at infinite frequency. */
export function formOf(arms: readonly Arm[]): Form {
  const stopsZero = arms.some(({ arm, part }) => (arm === 'series') === (part === 'capacitor'));
  const stopsInfinity = arms.some(({ arm, part }) => (arm === 'series') === (part === 'inductor'));
  if (stopsZero) return stopsInfinity ? 'band-pass' : 'high-pass';
  return stopsInfinity ? 'low-pass' : 'all-pass';
}
