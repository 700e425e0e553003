import type { Built } from '../dossier.ts';
import { cornersOf } from '../evidence/corners.ts';
import { percentilesOf } from '../evidence/percentiles.ts';
import { sensitivityOf } from '../evidence/sensitivity.ts';
import type { VariedPart } from '../evidence/spread.ts';
import { prepareSubject, withTolerance, type PreparedSubject } from '../evidence/subject.ts';
import { tighten } from '../evidence/tighten.ts';
import type { Percentiles, Yield } from '../evidence/tolerance-figures.ts';
import { passedOf, yieldFrom } from '../evidence/yield.ts';
import type { RealLadder } from '../network/real-arm.ts';
import { endsOver } from '../network/sweep.ts';
import { relativeTolerance } from '../parts/tolerance.ts';
import type { Build, DesignRecord, LoadState } from '../record/design-record.ts';
import type { Candidate } from './candidates.ts';
import type { RealStates } from './real-worst.ts';

/** Networks counted between two looks for a stop. */
const slice = 5000;

/** What varies when a network of these parts is built many times. */
export function subjectOf(
  record: DesignRecord,
  build: Build,
  { ends }: RealStates,
  ladder: RealLadder,
  parts: readonly VariedPart[],
): PreparedSubject {
  return prepareSubject({
    ladder,
    states: record.loads.map(({ name }, k) => ({ name, ends: ends[k]! })),
    f0: record.requirement.frequencyHz,
    aim: record.aim,
    parts,
    spread: { source: build.sourceSpread, load: build.loadSpread },
    distribution: build.distribution,
  });
}

/** The parts of the arms chosen, each with its tolerance and its share in the arm. */
export const variedParts = (chosen: readonly Candidate[], designators: readonly string[]): readonly VariedPart[] =>
  chosen
    .flatMap(({ arm, parts, pair }, armIndex) =>
      parts.map((part): Omit<VariedPart, 'designator'> => {
        const adds = pair === null || (pair === 'in series') === (arm.part === 'inductor');
        return {
          armIndex,
          tolerance: relativeTolerance(part.tolerance, part.arm.value),
          weight: adds ? part.arm.value / arm.value : arm.value / part.arm.value,
          adds,
        };
      }),
    )
    .map((part, k) => ({ designator: designators[k]!, ...part }));

/** null where no return loss is required. */
export function* yieldSteps(
  { requirement }: DesignRecord,
  { samples, seed }: Build,
  subject: PreparedSubject,
): Generator<void, Yield | null> {
  const { returnLossDb } = requirement;
  if (returnLossDb === null) return null;
  let passed = 0;
  for (let from = 0; from < samples; from += slice) {
    passed += passedOf(subject, returnLossDb, seed, from, Math.min(slice, samples - from));
    yield;
  }
  return yieldFrom(passed, samples, seed);
}

/** Corners, sensitivity of each part, and which tolerance to tighten. */
export function* toleranceSteps(
  record: DesignRecord,
  build: Build,
  subject: PreparedSubject,
  found: Yield | null,
): Generator<void, Pick<Built, 'corners' | 'sensitivity' | 'tighten'>> {
  const { returnLossDb } = record.requirement;
  const halved: number[] = [];
  if (found !== null) {
    for (const [k, { tolerance }] of subject.parts.entries()) {
      const with1 = yield* yieldSteps(record, build, withTolerance(subject, k, tolerance / 2));
      halved.push(with1!.value);
    }
  }
  const sensitivity = sensitivityOf(subject, found === null ? null : halved);
  yield;
  return {
    corners: subject.parts.length === 0 ? null : cornersOf(subject, returnLossDb),
    sensitivity,
    tighten: tighten(subject.parts, sensitivity, found?.value ?? null),
  };
}

/** Return loss that fractions of the networks have, over the frequencies shown and into each state. */
export function percentilesOver(
  record: DesignRecord,
  build: Build,
  { parts, ladder, spread, distribution, aim, f0 }: PreparedSubject,
  states: readonly LoadState[],
  frequencyHz: Float64Array,
): Percentiles {
  return percentilesOf(
    prepareSubject({
      ladder,
      states: states.map(({ name, termination }) => ({
        name,
        ends: endsOver(record.source, termination, f0, frequencyHz),
      })),
      f0,
      aim,
      parts,
      spread,
      distribution,
    }),
    build.seed,
    build.samples,
  );
}
