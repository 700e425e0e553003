import { holds, returnLossDb } from '../network/figures-of-merit.ts';
import { worstInto, type Draws } from '../network/real-sweep.ts';
import { clopperPearson, usualConfidence } from './clopper-pearson.ts';
import { drawsOf } from './spread.ts';
import type { PreparedSubject } from './subject.ts';
import type { Yield } from './tolerance-figures.ts';

/** Networks drawn at a time: no more memory for a million of them than for these. */
const slice = 4096;

/** Least return loss of each network over all states and their frequencies, dB, 0 to 200. */
export function worstReturnLosses({ prepared }: PreparedSubject, draws: Draws): Float64Array {
  const worst = new Float64Array(draws.count);
  for (const state of prepared) worstInto(state, draws, worst);
  return worst.map(returnLossDb);
}

/**
 * How many of the networks `from` to `from + count` of a seed's list hold the return loss in every state. Of a list cut
 * into ranges the numbers add up, whoever counts which.
 *
 * @param requiredDb least return loss, dB
 */
export function passedOf(
  subject: PreparedSubject,
  requiredDb: number,
  seed: number,
  from: number,
  count: number,
): number {
  const { parts, ladder, spread, distribution } = subject;
  let passed = 0;
  for (let at = from; at < from + count; at += slice) {
    const length = Math.min(slice, from + count - at);
    const draws = drawsOf(parts, ladder.arms.length, spread, distribution, seed, at, length);
    for (const found of worstReturnLosses(subject, draws)) if (holds(found, requiredDb)) passed += 1;
  }
  return passed;
}

/** @param samples 1 or more */
export const yieldFrom = (passed: number, samples: number, seed: number): Yield => ({
  value: passed / samples,
  ...clopperPearson(passed, samples),
  confidence: usualConfidence,
  samples,
  passed,
  seed,
});

/** Fraction of the first `samples` networks of a seed's list that hold the return loss in every state. */
export const yieldOf = (subject: PreparedSubject, requiredDb: number, seed: number, samples: number): Yield =>
  yieldFrom(passedOf(subject, requiredDb, seed, 0, samples), samples, seed);
