import type { ValueSet } from '../dossier.ts';
import { formatFixed } from '../quantity/format.ts';
import type { Candidate } from './candidates.ts';
import { returnLossWords } from './words.ts';

/** How values were chosen, and whether another of the best sets has the better yield. */
export function searchWords(sets: readonly ValueSet[], taken: number, chosen: readonly Candidate[]): string {
  if (chosen.length === 0) return 'No part is needed.';
  if (chosen.every(({ parts }) => parts.every(({ from }) => from === 'exact'))) return 'Values are exact.';
  const set = sets[taken - 1]!;
  const pairs = chosen.filter(({ pair }) => pair !== null).length;
  const first = `Values were searched together among parts on sale, with loss and strays in: set ${String(taken)} of ${String(sets.length)} holds ${returnLossWords(set.worstReturnLossDb)} at worst.`;
  const joined = pairs === 0 ? '' : ` ${String(pairs)} of its arms ${pairs === 1 ? 'is' : 'are'} two parts.`;
  const mine = set.yield;
  const other = sets.findIndex(({ yield: found }) => mine !== null && found !== null && found.low > mine.high);
  if (other < 0 || mine === null) return first + joined;
  const percent = (value: number): string => formatFixed(value * 100, 1);
  return `${first}${joined} Set ${String(other + 1)} has the better yield, ${percent(sets[other]!.yield!.value)} % against ${percent(mine.value)} %.`;
}
