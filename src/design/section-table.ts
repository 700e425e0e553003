import type { Option, SectionRow, SectionTable } from '../dossier.ts';
import type { DesignRecord } from '../record/design-record.ts';
import type { FoundCandidate } from './method.ts';
import { decibelPair } from './words.ts';

/**
 * One to six sections, in every form that exists, against the return loss to hold.
 *
 * @param candidates of every number of sections
 * @param options    the same networks, assessed, in the same order
 */
export function sectionTable(
  { requirement }: DesignRecord,
  candidates: readonly FoundCandidate[],
  options: readonly Option[],
): SectionTable {
  const asked = requirement.returnLossDb;
  const rows = candidates.flatMap((candidate, k): SectionRow[] => {
    const { pass, shuntAt, sectionQ } = candidate;
    if (pass === undefined || shuntAt === undefined) return [];
    const option = options[k]!;
    const returnLoss = option.checks.find(({ subject }) => subject === 'return loss');
    return [
      {
        id: option.id,
        sections: option.sections,
        form: pass,
        shuntAt,
        parts: option.arms.length,
        sectionQ,
        worstReturnLossDb: option.worstReturnLossDb,
        halfPower: option.halfPower,
        holds: option.worstReturnLossDb === null || returnLoss === undefined ? null : returnLoss.verdict === 'meets',
      },
    ];
  });
  const holding = rows.filter(({ holds }) => holds === true).map(({ sections }) => sections);
  const smallest = holding.length === 0 ? null : Math.min(...holding);
  const found = rows.map(({ worstReturnLossDb }) => worstReturnLossDb).filter((db) => db !== null);
  const best = found.length === 0 ? null : Math.max(...found);
  return { rows, smallest, bestReturnLossDb: best, words: words(smallest, best, asked) };
}

function words(smallest: number | null, best: number | null, asked: number | null): string {
  if (best === null) return 'No band is given, so no number of sections can be judged.';
  if (asked === null) return 'No return loss is required, so any number of sections will do.';
  const [found, required] = decibelPair(best, asked);
  if (smallest === null) {
    return `Six sections do not hold ${required} over the band: the best of all reaches ${found}, ${decibelPair(asked - best, 0)[0]} short.`;
  }
  if (smallest === 0) return `No part is needed: the terminations hold ${required} as they are.`;
  return smallest === 1
    ? `1 section holds ${required} over the band.`
    : `${String(smallest)} sections are the smallest number that holds ${required} over the band.`;
}
