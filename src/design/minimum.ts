import type { Option } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { decibelPair } from './words.ts';

/** The least network that meets everything, or by how much the best return loss falls short, in a sentence. */
export function minimumWords({ requirement }: DesignRecord, options: readonly Option[]): string {
  const meeting = options.filter(({ meets }) => meets);
  if (meeting.length > 0) {
    const least = meeting.reduce((a, b) => (b.arms.length < a.arms.length ? b : a));
    const parts = least.arms.length;
    if (parts === 0) return 'No part is needed.';
    return `The smallest network that meets everything has ${String(parts)} part${parts === 1 ? '' : 's'}: ${least.title}.`;
  }
  if (options.length === 0) return 'No network was found.';
  const asked = requirement.returnLossDb;
  const found = options
    .map(({ built, worstReturnLossDb }) => built?.worstReturnLossDb ?? worstReturnLossDb)
    .filter((db) => db !== null);
  if (asked === null || found.length === 0) return 'No network meets everything.';
  const best = Math.max(...found);
  const [bestWords, askedWords] = decibelPair(best, asked);
  return best >= asked
    ? `No network meets everything, though the best holds ${bestWords} over the band.`
    : `No network holds ${askedWords} over the band: the best reaches ${bestWords}, ${decibelPair(asked - best, 0)[0]} short.`;
}
