import type { Option } from '../dossier.ts';
import type { DesignRecord, LoadState } from '../record/design-record.ts';

/** Load states, the one that governs first. */
export const statesOf = ({ loads }: DesignRecord, { worstState, built }: Option): readonly LoadState[] =>
  loads.toSorted(
    (a, b) =>
      Number(b.name === (built?.worstState ?? worstState)) - Number(a.name === (built?.worstState ?? worstState)),
  );
