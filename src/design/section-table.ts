import type { Complex } from 'complex.js';
import type { SectionRow, SectionTable } from '../dossier.ts';
import { returnLossDb } from '../network/figures-of-merit.ts';
import { formOf } from '../network/form.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { cascade } from '../synthesis/cascade.ts';
import type { bandSweeper } from './band-figures.ts';
import { allSections } from './method.ts';
import { decibelPair } from './words.ts';

/** One to six sections, in every form that exists, against the return loss to hold. */
export function sectionTable(
  record: DesignRecord,
  target: Complex,
  load: Complex,
  figuresOf: ReturnType<typeof bandSweeper>,
): SectionTable {
  const { frequencyHz, returnLossDb: asked } = record.requirement;
  const rows = cascade(target, load, frequencyHz, allSections).candidates.map((candidate): SectionRow => {
    const { worst, halfPower } = figuresOf(candidate.arms, formOf(candidate.arms));
    const worstDb = worst === null ? null : returnLossDb(worst.gammaSquared);
    return {
      id: candidate.id,
      sections: candidate.sections,
      form: candidate.pass,
      shuntAt: candidate.shuntAt,
      parts: candidate.arms.length,
      sectionQ: candidate.sectionQ,
      worstReturnLossDb: worstDb,
      halfPower,
      holds: worstDb === null || asked === null ? null : worstDb >= asked - 1e-9,
    };
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
  return `${String(smallest)} section${smallest === 1 ? ' is' : 's are'} the smallest number that holds ${required} over the band.`;
}
