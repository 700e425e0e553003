import { fitOneResonance, type OneResonance } from '../../network/one-resonance.ts';
import { terminationAt } from '../../network/termination-at.ts';
import type { Limits } from './limits.ts';
import type { FitProblem, FitProgress } from './problem.ts';
import { kept, leading, middle, samplePoints, Search, type Trial } from './search.ts';
import { exp, log } from '../../quantity/elementary.ts';

/** Narrower than this (ln of the edges' ratio), coupled resonances are rarely found from random starts. */
const narrowest = 0.06;
const widerBand = 0.12;
/** Factor of the width from one step of the tracking to the next. */
const narrowing = 0.7;

/**
 * One resonance that stands for the first load, for a narrow band into a reactive load. Null where the band isn't narrow
 * or the load has no reactance to speak of.
 */
export function resonanceOf({ loads, f0, bandHz }: FitProblem): OneResonance | null {
  const width = log(bandHz.high / bandHz.low);
  if (width >= narrowest || width === 0) return null;
  const hz = [...samplePoints(bandHz, 17)];
  const centre = Math.sqrt(bandHz.low * bandHz.high);
  const model = fitOneResonance(
    hz,
    hz.map((f) => terminationAt(loads[0]!, f0, f)),
    centre,
  );
  return Math.max(model.growingQ, model.fallingQ) < 1 ? null : model;
}

/** The problem of a load of the same Q times width over a band of another width about the same centre. */
function ofWidth(problem: FitProblem, model: OneResonance, width: number): FitProblem {
  const { bandHz } = problem;
  const centre = Math.sqrt(bandHz.low * bandHz.high);
  const ratio = log(bandHz.high / bandHz.low) / width;
  const q = (model.growingQ >= model.fallingQ ? 1 : -1) * Math.max(model.growingQ, model.fallingQ) * ratio;
  // In parallel, the reactance of R/(1 + jQ) has the other sign and is smaller.
  const z =
    model.arrangement === 'series'
      ? { r: model.r, x: model.r * q }
      : { r: model.r / (1 + q * q), x: (-model.r * q) / (1 + q * q) };
  return {
    ...problem,
    loads: [{ ...z, behaviour: model.arrangement }],
    f0: centre,
    bandHz: { low: centre * exp(-width / 2), high: centre * exp(width / 2) },
    starts: [],
  };
}

/**
 * Networks for a narrow band, by way of a wider one with the load's Q lowered as much: found there from random starts,
 * followed step by step to the true width and taken over to the true load.
 */
export function* tracked(
  problem: FitProblem,
  model: OneResonance,
  search: Search,
): Generator<FitProgress, readonly Trial[]> {
  const exploring = new Search(ofWidth(problem, model, widerBand)).explore(0.4, 0.6);
  let found: readonly Trial[] = [];
  for (;;) {
    const step = exploring.next();
    if (step.done === true) {
      found = leading(step.value, kept.third);
      break;
    }
    // The best of the wider problem is none of the true one.
    yield { done: step.value.done, best: search.best };
  }
  const width = log(problem.bandHz.high / problem.bandHz.low);
  const stages = stepsTo(width).map((w) => ({ width: w, search: new Search(ofWidth(problem, model, w)) }));
  const trials: Trial[] = [];
  for (const [k, { shape, x }] of found.entries()) {
    const trial = { shape, x: x.slice(), level: 0 };
    let before = { width: widerBand, x };
    let last = before;
    for (const stage of stages) {
      predict(trial, before, last, stage.width, search.limits);
      stage.search.improve(trial, stage.search.dense, [middle[1]], 40);
      [before, last] = [last, { width: stage.width, x: trial.x.slice() }];
    }
    predict(trial, before, last, width, search.limits);
    search.improve(trial, search.dense, middle, 60);
    search.note(trial);
    trials.push(trial);
    yield { done: 0.6 + (0.15 * (k + 1)) / found.length, best: search.best };
  }
  return trials;
}

/** Widths on the way from the wider band to above the true one; the first step is short, so that the second has a lead. */
function stepsTo(width: number): readonly number[] {
  const widths: number[] = [];
  for (let w = widerBand * 0.95; w > width; w *= narrowing) widths.push(w);
  return widths;
}

interface Step {
  readonly width: number;
  readonly x: Float64Array;
}

/** Values of coupled resonators are nearly powers of the width: a step starts from where the two before it lead. */
function predict(trial: Trial, before: Step, last: Step, width: number, limits: Limits): void {
  if (before.width === last.width) return;
  const along = log(width / last.width) / log(last.width / before.width);
  const shift = last.x.map((value, k) => along * (value - before.x[k]!));
  // A natural logarithm or more is a jump, and leads nowhere.
  if (shift.some((by, k) => Math.abs(by) * limits[trial.shape[k]!.part].half > 1)) return;
  shift.forEach((by, k) => (trial.x[k] = last.x[k]! + by));
}
