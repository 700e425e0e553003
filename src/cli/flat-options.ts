import type { Dossier, Option } from '../dossier.ts';

/** A dossier for standard output: where real parts are worked out, their figures stand at the head of each option. */
export const flatOptions = (dossier: Dossier): object => ({ ...dossier, options: dossier.options.map(flat) });

function flat(option: Option): object {
  const { built, worstReturnLossDb, worstAtHz, worstState, lossDb } = option;
  if (built === null) return option;
  return {
    ...option,
    exact: { worstReturnLossDb, worstAtHz, worstState, lossDb },
    worstReturnLossDb: built.worstReturnLossDb,
    worstAtHz: built.worstAtHz,
    worstState: built.worstState,
    lossDb: built.lossDb,
    parts: built.parts,
    yield: built.yield,
    stress: built.stress?.parts ?? null,
    sensitivity: built.sensitivity,
  };
}
