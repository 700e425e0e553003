import type { Arm } from './arm.ts';

/** What direct current meets in a ladder. */
export interface DcPath {
  /** A series capacitor stands between source and load. */
  readonly blocked: boolean;
  /** A shunt inductor shorts that end to ground, with no series capacitor between. */
  readonly sourceShorted: boolean;
  readonly loadShorted: boolean;
}

/** @param arms source side first */
export function dcPath(arms: readonly Omit<Arm, 'value'>[]): DcPath {
  return {
    blocked: arms.some(isBlock),
    sourceShorted: shortedFrom(arms),
    loadShorted: shortedFrom(arms.toReversed()),
  };
}

const isBlock = ({ arm, part }: Omit<Arm, 'value'>): boolean => arm === 'series' && part === 'capacitor';

function shortedFrom(arms: readonly Omit<Arm, 'value'>[]): boolean {
  const block = arms.findIndex(isBlock);
  const reached = block < 0 ? arms : arms.slice(0, block);
  return reached.some(({ arm, part }) => arm === 'shunt' && part === 'inductor');
}
