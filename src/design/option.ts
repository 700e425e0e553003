import type { Complex } from 'complex.js';
import type { Ceiling, Harmonic, Option, StateFigures } from '../dossier.ts';
import { dcPath } from '../network/dc-path.ts';
import { attenuationDb, highestDb, returnLossDb } from '../network/figures-of-merit.ts';
import { formOf } from '../network/form.ts';
import { ladderInput } from '../network/ladder-input.ts';
import { prepareLadder } from '../network/ladder.ts';
import { endsOver, sweep } from '../network/sweep.ts';
import { isResistive, terminationAt } from '../network/termination-at.ts';
import type { Termination } from '../network/termination.ts';
import { designatorsOf } from '../parts/designators.ts';
import { rulesOfThumb } from '../parts/rules-of-thumb.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { bandSweeper, type BandFigures, type BandSweeper } from './band-figures.ts';
import { bandwidthNote } from './bandwidth-note.ts';
import { checksOf, verdictOf } from './checks.ts';
import type { FoundCandidate } from './method.ts';
import { dcWords } from './words.ts';

/** All that assessing a network needs of the record, worked out once. */
export interface Assessor {
  readonly record: DesignRecord;
  readonly reach: Span | null;
  readonly ceiling: Ceiling | null;
  readonly states: readonly {
    readonly name: string;
    readonly termination: Termination;
    readonly load: Complex;
    readonly figuresOf: BandSweeper;
  }[];
}

export function assessor(record: DesignRecord, reach: Span | null, ceiling: Ceiling | null): Assessor {
  const f0 = record.requirement.frequencyHz;
  return {
    record,
    reach,
    ceiling,
    states: record.loads.map(({ name, termination }) => ({
      name,
      termination,
      load: terminationAt(termination, f0, f0),
      figuresOf: bandSweeper(record, termination, reach),
    })),
  };
}

/** Everything that the options list says of one network: the figures of its worst state, and of each. */
export function assess({ record, reach, ceiling, states }: Assessor, candidate: FoundCandidate): Option {
  const { id, title, arms, sections, sectionQ, method } = candidate;
  const f0 = record.requirement.frequencyHz;
  const designators = designatorsOf(arms);
  const form = formOf(arms);
  const assessed = states.map(({ name, load, figuresOf }) => {
    const figures = figuresOf(arms, form);
    const seen = ladderInput(arms, load, f0);
    return { figures, state: stateFigures(name, { r: seen.re, x: seen.im }, figures, f0, reach) };
  });
  const governing = assessed.reduce((a, b) => (rank(b.state) < rank(a.state) ? b : a));
  const { state, figures } = governing;
  const dc = dcPath(arms);
  const loadedQ = sectionQ === 0 ? null : sectionQ / 2;
  const bandwidthFromQHz = loadedQ === null ? null : f0 / loadedQ;
  const worst = figures.worst ?? { gammaSquared: state.reflection ** 2, atHz: f0 };
  const checks = checksOf(record, arms, designators, worst, state.name, dc);
  const { name, ...figuresOfWorst } = state;
  const ceilingDb = ceiling === null ? null : returnLossDb(ceiling.bestReflection ** 2);
  return {
    id,
    title,
    method,
    arms,
    designators,
    sections,
    form,
    states: assessed.map((each) => each.state),
    worstState: name,
    ...figuresOfWorst,
    lossDb: lossDb(record, states[assessed.indexOf(governing)]!.termination, arms),
    ceilingGapDb: ceilingDb === null || state.worstReturnLossDb === null ? null : ceilingDb - state.worstReturnLossDb,
    loadedQ,
    bandwidthFromQHz,
    bandwidthNote: bandwidthNote(
      bandwidthFromQHz,
      state.halfPower,
      sections,
      !record.loads.every(({ termination }) => isResistive(termination)) || !isResistive(record.source),
    ),
    dc: { ...dc, words: dcWords(dc) },
    built: null,
    checks,
    ...verdictOf(checks),
    cautions: rulesOfThumb(arms, designators, dc, sectionQ),
  };
}

/** The lower, the worse: by the band where there is one, at the design frequency otherwise. */
const rank = ({ worstReturnLossDb, reflection }: StateFigures): number =>
  worstReturnLossDb ?? returnLossDb(reflection ** 2);

function stateFigures(
  name: string,
  seen: { readonly r: number; readonly x: number },
  figures: BandFigures,
  f0: number,
  reach: Span | null,
): StateFigures {
  const gain = figures.gainAt(f0);
  return {
    name,
    seen,
    transducerGain: Math.min(1, gain),
    reflection: Math.sqrt(figures.gammaSquaredAt(f0)),
    worstReturnLossDb: figures.worst === null ? null : returnLossDb(figures.worst.gammaSquared),
    worstAtHz: figures.worst?.atHz ?? null,
    halfPower: figures.halfPower,
    harmonicDb: ([2, 3] as const).map((order): Harmonic => {
      const hz = order * f0;
      if (reach !== null && hz > reach.high) return { order, attenuationDb: null };
      const db = attenuationDb(figures.gainAt(hz)) - attenuationDb(gain);
      return { order, attenuationDb: Math.max(-highestDb, db) };
    }),
  };
}

/** What the stated Q of the parts costs at the design frequency, dB. */
function lossDb(
  { source, aim, partQ, requirement }: DesignRecord,
  load: Termination,
  arms: FoundCandidate['arms'],
): number {
  const f0 = requirement.frequencyHz;
  const ends = endsOver(source, load, f0, Float64Array.of(f0));
  const gain = (ladder: FoundCandidate['arms']): number => sweep(prepareLadder(ladder), ends, aim).gain[0]!;
  return attenuationDb(gain(arms.map((arm) => ({ ...arm, q: partQ[arm.part] })))) - attenuationDb(gain(arms));
}
