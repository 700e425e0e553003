import type { Arm } from '../network/arm.ts';

/** Reference designators in the order of the arms: L and C numbered apart, from the source (common practice). */
export function designatorsOf(arms: readonly Arm[]): string[] {
  const count = { inductor: 0, capacitor: 0 };
  return arms.map(({ part }) => {
    count[part] += 1;
    return `${part === 'inductor' ? 'L' : 'C'}${String(count[part])}`;
  });
}
