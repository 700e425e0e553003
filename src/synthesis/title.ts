import type { Arm } from '../network/arm.ts';

const symbol = { inductor: 'L', capacitor: 'C' } as const;

/** Arms in words, source side first: "Series L, shunt C". */
export function titleOf(arms: readonly Arm[]): string {
  if (arms.length === 0) return 'No network needed';
  const words = arms.map(({ arm, part }) => `${arm} ${symbol[part]}`).join(', ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** Same arms with values within a part in 1e9: one network, found twice. */
export function sameArms(a: readonly Arm[], b: readonly Arm[]): boolean {
  return (
    a.length === b.length &&
    a.every((arm, k) => {
      const other = b[k]!;
      return (
        arm.arm === other.arm &&
        arm.part === other.part &&
        Math.abs(arm.value - other.value) <= 1e-9 * Math.max(arm.value, other.value)
      );
    })
  );
}
