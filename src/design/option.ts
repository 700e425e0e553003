import type { Complex } from 'complex.js';
import type { Option } from '../dossier.ts';
import { dcPath } from '../network/dc-path.ts';
import { attenuationDb, highestDb, returnLossDb } from '../network/figures-of-merit.ts';
import { formOf } from '../network/form.ts';
import { ladderInput } from '../network/ladder-input.ts';
import { designatorsOf } from '../parts/designators.ts';
import { rulesOfThumb } from '../parts/rules-of-thumb.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { DesignRecord } from '../record/design-record.ts';
import type { Candidate } from '../synthesis/candidate.ts';
import type { BandFigures, bandSweeper } from './band-figures.ts';
import { checksOf } from './checks.ts';
import { dcWords } from './words.ts';

/** Difference between the two half-power figures above which the estimate is said not to hold. */
const estimateWithin = 0.1;

/** Everything that the options list says of one network. */
export function assess(
  record: DesignRecord,
  load: Complex,
  candidate: Candidate,
  figuresOf: ReturnType<typeof bandSweeper>,
): Option {
  const { id, title, arms, sections, sectionQ } = candidate;
  const f0 = record.requirement.frequencyHz;
  const designators = designatorsOf(arms);
  const form = formOf(arms);
  const figures = figuresOf(arms, form);
  const seen = ladderInput(arms, load, f0);
  const gain = figures.gainAt(f0);
  const gammaSquared = figures.gammaSquaredAt(f0);
  const dc = dcPath(arms);
  const loadedQ = sectionQ === 0 ? null : sectionQ / 2;
  const bandwidthFromQHz = loadedQ === null ? null : f0 / loadedQ;
  const checks = checksOf(record, arms, designators, figures.worst ?? { gammaSquared, atHz: f0 }, dc);
  const short = checks.filter(({ verdict }) => verdict === 'falls short');
  return {
    id,
    title,
    arms,
    designators,
    sections,
    form,
    seen: { r: seen.re, x: seen.im },
    transducerGain: Math.min(1, gain),
    reflection: Math.sqrt(gammaSquared),
    worstReturnLossDb: figures.worst === null ? null : returnLossDb(figures.worst.gammaSquared),
    worstAtHz: figures.worst?.atHz ?? null,
    halfPower: figures.halfPower,
    loadedQ,
    bandwidthFromQHz,
    bandwidthNote: bandwidthNote(bandwidthFromQHz, figures, record, sections),
    harmonicDb: ([2, 3] as const).map((order) => ({
      order,
      attenuationDb: Math.max(-highestDb, attenuationDb(figures.gainAt(order * f0)) - attenuationDb(gain)),
    })),
    dc: { ...dc, words: dcWords(dc) },
    meets: short.length === 0,
    checks,
    reasons: (short.length === 0 ? checks : short).map(({ reason }) => reason),
    cautions: rulesOfThumb(arms, designators, dc, sectionQ),
  };
}

/** How f0/Q_L and the sweep compare and, where they differ, why. */
function bandwidthNote(
  fromQ: number | null,
  { halfPower }: BandFigures,
  { source, load }: DesignRecord,
  sections: number,
): string {
  if (fromQ === null) return 'No section has a Q: there is nothing to estimate from.';
  if (halfPower.bandwidthHz === null) {
    return 'The estimate assumes an edge on either side; the sweep finds none on one side, so the two do not compare.';
  }
  const difference = fromQ / halfPower.bandwidthHz - 1;
  if (Math.abs(difference) <= estimateWithin) {
    return `The estimate is within 10 % of the sweep (${percent(difference)}).`;
  }
  const reactive = source.x !== 0 || load.x !== 0;
  const causes = [
    sections > 1 ? `it takes one section alone, and ${String(sections)} sections shape the band together` : '',
    reactive ? "it leaves out the energy stored in the terminations' reactance" : '',
    sections === 1 && !reactive
      ? 'it assumes a resonance whose edges lie close to it on either side; this Q is low'
      : '',
  ].filter((cause) => cause !== '');
  return `The estimate does not hold (${percent(difference)} against the sweep): ${causes.join('; ')}.`;
}

const percent = (fraction: number): string =>
  Math.abs(fraction) < 10
    ? `${fraction > 0 ? '+' : ''}${formatFixed(100 * fraction, 0)} %`
    : `${formatQuantity(1 + fraction, '', 2)} times`;
