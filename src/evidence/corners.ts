import { holds, returnLossDb } from '../network/figures-of-merit.ts';
import { reflectionAt, type Draws } from '../network/real-sweep.ts';
import { formatFixed } from '../quantity/format.ts';
import { drawsWith, type VariedPart } from './spread.ts';
import type { PreparedSubject } from './subject.ts';
import type { Corners } from './tolerance-figures.ts';
import { worstReturnLosses } from './yield.ts';

/** Parts up to which every combination is tried. */
const mostParts = 12;

/**
 * The worst network that has every part at an end of its tolerance: of all combinations, or of more than twelve parts
 * the one in which each stands at the end that is worse for it alone. The ends are as stated.
 *
 * @param requiredDb least return loss, dB; null: none
 */
export function cornersOf(subject: PreparedSubject, requiredDb: number | null): Corners {
  const varied = subject.parts.filter(({ tolerance }) => tolerance > 0);
  const all = varied.length <= mostParts;
  const corners = all ? everyCorner(varied.length) : [worseEnds(subject, varied)];
  const draws = drawsAt(subject, varied, corners);
  const found = worstReturnLosses(subject, draws);
  const worst = found.indexOf(Math.min(...found));
  const corner = corners[worst]!;
  const { state, hz, db } = whereWorst(subject, drawsAt(subject, varied, [corner]));
  const words = varied.map(({ designator, tolerance }, k) => `${designator} ${signed(corner[k]! * tolerance)}`);
  const said = words.length === 0 ? 'no part varies' : words.join(', ');
  return {
    worstReturnLossDb: db,
    worstAtHz: hz,
    worstState: state,
    words: all ? said : `${said} (each at the end that is worse for it alone; not every combination was tried)`,
    meets: requiredDb === null ? null : holds(db, requiredDb),
  };
}

const signed = (fraction: number): string =>
  `${fraction > 0 ? '+' : ''}${formatFixed(fraction * 100, 2).replace(/\.?0+$/u, '')} %`;

/** Rows of +1 and −1; a single empty one of no parts. */
const everyCorner = (parts: number): number[][] =>
  Array.from({ length: 2 ** parts }, (_, corner) =>
    Array.from({ length: parts }, (_, k) => (((corner >> k) & 1) === 0 ? 1 : -1)),
  );

/** For each part the end of its tolerance at which, all others nominal, the worst return loss is the lower. */
function worseEnds(subject: PreparedSubject, varied: readonly VariedPart[]): number[] {
  return varied.map((_, k) => {
    const alone = [1, -1].map((end) => varied.map((_, other) => (other === k ? end : 0)));
    const [above, below] = worstReturnLosses(subject, drawsAt(subject, varied, alone));
    return above! < below! ? 1 : -1;
  });
}

const drawsAt = (
  subject: PreparedSubject,
  varied: readonly VariedPart[],
  rows: readonly (readonly number[])[],
): Draws =>
  drawsWith(
    varied,
    subject.ladder.arms.length,
    varied.map((_, k) => Float64Array.from(rows, (row) => row[k]!)),
    rows.length,
  );

/** Where a single network has its least return loss. */
function whereWorst({ states, prepared }: PreparedSubject, draws: Draws): { state: string; hz: number; db: number } {
  let worst = { state: states[0]!.name, hz: prepared[0]!.frequencyHz[0]!, reflection: -1 };
  const out = new Float64Array(1);
  prepared.forEach((state, which) => {
    state.frequencyHz.forEach((hz, k) => {
      reflectionAt(state, k, draws, out);
      if (out[0]! > worst.reflection) worst = { state: states[which]!.name, hz, reflection: out[0]! };
    });
  });
  return { state: worst.state, hz: worst.hz, db: returnLossDb(worst.reflection) };
}
