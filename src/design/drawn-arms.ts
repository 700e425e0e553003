import type { Option } from '../dossier.ts';
import type { Arm } from '../network/arm.ts';

/** A drawing and a parts list that disagree would both be wrong: of real parts, the values are those to order. */
export const drawnArms = ({ arms, built }: Option): readonly Arm[] =>
  built === null ? arms : arms.map((arm, k) => ({ ...arm, value: built.ladder.arms[k]?.value ?? arm.value }));
