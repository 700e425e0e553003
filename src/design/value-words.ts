import { formatRead } from '../quantity/format.ts';
import type { Candidate } from './candidates.ts';

/** As to be ordered: "82 nH", "8.2 pF + 1 pF in parallel". */
export const valueWords = ({ parts, pair }: Candidate): string => {
  const values = parts.map(({ arm }) => formatRead(arm.value, arm.part === 'inductor' ? 'H' : 'F')).join(' + ');
  return pair === null ? values : `${values} ${pair}`;
};
