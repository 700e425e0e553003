import type { Arm } from '../../network/arm.ts';
import { ladderInput } from '../../network/ladder-input.ts';
import { endsOver, type Ends } from '../../network/sweep.ts';
import { terminationAt } from '../../network/termination-at.ts';
import type { Span } from '../../quantity/span.ts';
import { targetOf } from '../target.ts';
import { twoElement } from '../two-element.ts';
import { fromInside, limitsOf, toInside, type Limits } from './limits.ts';
import { minimise } from './minimise.ts';
import type { Fitted, FitProblem, FitProgress } from './problem.ts';
import { seeded } from './random.ts';
import { shapesOf, type Shape } from './shape.ts';
import { WorstMismatch } from './worst-mismatch.ts';
import { cos, exp, log } from '../../quantity/elementary.ts';

/**
 * Random starts of every shape, and starts that two elements at the source match at the band's centre (a narrow band is
 * rarely found from elsewhere); how many of all go on to each later stage.
 */
const randomStarts = 8;
const matchedStarts = 4;
export const kept = { second: 96, third: 20 };
/** Sharpness of the smooth maximum, stage by stage: the last is within 0.005 dB of the true one. */
const coarse = 3;
export const middle = [8, 30] as const;
export const fine = [100, 400, 1600, 6400] as const;

/** A shape with its variables, and the smooth level that they reached. */
export interface Trial {
  readonly shape: Shape;
  readonly x: Float64Array;
  level: number;
}

/** One problem's samples, limits and best network so far. */
export class Search {
  readonly limits: Limits;
  readonly dense: readonly Ends[];
  /** Between samples of the others a ladder of eight elements rises by some hundredths of a decibel. */
  readonly finest: readonly Ends[];
  readonly #rough: readonly Ends[];
  readonly #problem: FitProblem;
  best: Fitted | null = null;

  constructor(problem: FitProblem) {
    this.#problem = problem;
    this.limits = limitsOf(problem);
    this.#rough = samples(problem, 17);
    this.dense = samples(problem, 49);
    this.finest = samples(problem, 145);
  }

  improve(trial: Trial, states: readonly Ends[], betas: readonly number[], steps: number): void {
    const mismatch = new WorstMismatch(trial.shape, states, this.#problem.aim);
    for (const beta of betas) trial.level = minimiseInside(mismatch, trial, beta, steps, this.limits);
  }

  /** Keeps a trial that is the best so far by the sharp figure on dense samples. */
  note(trial: Trial): void {
    const logs = Float64Array.from(trial.x, (t, k) => fromInside(t, this.limits[trial.shape[k]!.part]));
    const unused = new Float64Array(logs.length);
    const level = new WorstMismatch(trial.shape, this.dense, this.#problem.aim).at(logs, fine[3], unused);
    if (this.best === null || level < this.best.level) this.best = { ...fitted(trial, this.limits), level };
  }

  /** Random, matched and given starts, improved and thinned to the few that are worth refining; progress from..to. */
  *explore(from: number, to: number): Generator<FitProgress, Trial[]> {
    const problem = this.#problem;
    const at = (part: number): FitProgress => ({ done: from + (to - from) * part, best: this.best });
    const shapes = shapesOf(problem.elements, problem.rule);
    const random = seeded(problem.seed);
    const scale = reactanceScale(this.dense);
    const omega = 2 * Math.PI * Math.sqrt(problem.bandHz.low * problem.bandHz.high);
    const value = ({ part }: Shape[number]): number => {
      const x = scale * exp((2 * random() - 1) * spread);
      return part === 'inductor' ? x / omega : 1 / (omega * x);
    };
    const trials: Trial[] = [];
    const start = (shape: Shape, x: Float64Array): void => {
      const trial = { shape, x, level: 0 };
      this.improve(trial, this.#rough, [coarse], 30);
      this.note(trial);
      trials.push(trial);
    };
    for (const [k, shape] of shapes.entries()) {
      for (const arms of problem.starts) if (fits(arms, shape)) start(shape, inside(arms, this.limits));
      for (let count = 0; count < randomStarts; count += 1) {
        start(
          shape,
          Float64Array.from(shape, (arm) => toInside(log(value(arm)), this.limits[arm.part])),
        );
      }
      for (let count = 0; count < matchedStarts && problem.elements >= 3; count += 1) {
        const inner = shape.slice(2).map((arm): Arm => ({ ...arm, value: value(arm) }));
        for (const arms of matchedAtCentre(problem, inner)) {
          const found = shapes.find((other) => fits(arms, other));
          if (found !== undefined) start(found, inside(arms, this.limits));
        }
      }
      if (k % 4 === 3) yield at((0.65 * (k + 1)) / shapes.length);
    }
    const better = leading(trials, kept.second);
    for (const [k, trial] of better.entries()) {
      this.improve(trial, this.#rough, middle, 60);
      this.note(trial);
      if (k % 8 === 7) yield at(0.65 + (0.35 * (k + 1)) / better.length);
    }
    return better;
  }
}

/** Inner arms completed at the source by every two-element network that matches the first load at the band's centre. */
function matchedAtCentre({ source, loads, f0, bandHz, aim }: FitProblem, inner: readonly Arm[]): readonly Arm[][] {
  const centre = Math.sqrt(bandHz.low * bandHz.high);
  const seen = ladderInput(inner, terminationAt(loads[0]!, f0, centre), centre);
  if (!(seen.re > 0)) return [];
  const target = targetOf(terminationAt(source, f0, centre), aim);
  return twoElement(target, seen, centre).candidates.map(({ arms }) => [...arms, ...inner]);
}

export const leading = (trials: readonly Trial[], most: number): Trial[] =>
  trials.toSorted((a, b) => a.level - b.level).slice(0, most);

/** Reactances are tried within this many natural logarithms of the impedances' own size. */
const spread = 2.5;

/** Terminations at points crowded towards the band's edges, where the worst mismatch usually is. */
function samples({ source, loads, f0, bandHz }: FitProblem, points: number): Ends[] {
  const frequencyHz = samplePoints(bandHz, points);
  return loads.map((load) => endsOver(source, load, f0, frequencyHz));
}

/** Frequencies crowded towards a band's edges; the centre alone where it has no width. Hz. */
export function samplePoints(bandHz: Span, points: number): Float64Array {
  const centre = Math.sqrt(bandHz.low * bandHz.high);
  const half = log(bandHz.high / bandHz.low) / 2;
  if (half === 0) return Float64Array.of(centre);
  const frequencyHz = Float64Array.from(
    { length: points },
    (_, k) => centre * exp(-half * cos((Math.PI * k) / (points - 1))),
  );
  frequencyHz[0] = bandHz.low;
  frequencyHz[points - 1] = bandHz.high;
  return frequencyHz;
}

/** Geometric middle of the impedances that meet, Ω: reactances are looked for around it. */
function reactanceScale(states: readonly Ends[]): number {
  let sum = 0;
  let count = 0;
  for (const { rs, xs, rl, xl } of states) {
    for (let k = 0; k < rs.length; k += 1) {
      sum += log(Math.hypot(rs[k]!, xs[k]!)) + log(Math.hypot(rl[k]!, xl[k]!));
      count += 2;
    }
  }
  return exp(sum / count);
}

function minimiseInside(
  mismatch: WorstMismatch,
  { shape, x }: Trial,
  beta: number,
  steps: number,
  limits: Limits,
): number {
  const n = shape.length;
  const logs = new Float64Array(n);
  const bounds = shape.map(({ part }) => limits[part]);
  // One unit of a variable is one natural logarithm of its value near the middle of its range.
  const scaled = x.map((t, k) => t * bounds[k]!.half);
  const value = minimise(
    (y, slope) => {
      for (let k = 0; k < n; k += 1) logs[k] = fromInside(y[k]! / bounds[k]!.half, bounds[k]!);
      const level = mismatch.at(logs, beta, slope);
      for (let k = 0; k < n; k += 1) slope[k]! *= cos(y[k]! / bounds[k]!.half);
      return level;
    },
    scaled,
    steps,
  );
  scaled.forEach((y, k) => (x[k] = y / bounds[k]!.half));
  return value;
}

const fits = (arms: readonly Arm[], shape: Shape): boolean =>
  arms.length === shape.length && arms.every(({ arm, part }, k) => arm === shape[k]!.arm && part === shape[k]!.part);

const inside = (arms: readonly Arm[], limits: Limits): Float64Array =>
  Float64Array.from(arms, ({ part, value }) => toInside(log(value), limits[part]));

export const fitted = ({ shape, x, level }: Trial, limits: Limits): Fitted => ({
  arms: shape.map((arm, k) => ({ ...arm, value: exp(fromInside(x[k]!, limits[arm.part])) })),
  level,
});
