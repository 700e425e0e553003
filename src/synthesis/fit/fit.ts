import type { Arm } from '../../network/arm.ts';
import { ladderInput } from '../../network/ladder-input.ts';
import { endsOver, type Ends } from '../../network/sweep.ts';
import type { Aim, Termination } from '../../network/termination.ts';
import { terminationAt } from '../../network/termination-at.ts';
import type { Span } from '../../quantity/span.ts';
import { targetOf } from '../target.ts';
import { twoElement } from '../two-element.ts';
import { minimise } from './minimise.ts';
import { seeded } from './random.ts';
import { shapesOf, type Shape, type ShapeRule } from './shape.ts';
import { WorstMismatch } from './worst-mismatch.ts';

export interface FitProblem {
  readonly source: Termination;
  /** Load states, all to be held at once. */
  readonly loads: readonly Termination[];
  readonly f0: number;
  readonly bandHz: Span;
  readonly aim: Aim;
  readonly elements: number;
  readonly rule: ShapeRule;
  readonly inductorH: Span;
  readonly capacitorF: Span;
  readonly seed: number;
  /** Networks to start from beside the random ones: closed forms, or what a smaller ladder found. */
  readonly starts: readonly (readonly Arm[])[];
}

export interface Fitted {
  readonly arms: readonly Arm[];
  /** Worst ln|Γ|² over the samples, all states. */
  readonly level: number;
}

export interface FitProgress {
  /** 0 to 1, of the work of this fit. */
  readonly done: number;
  /** Best so far; null before the first. */
  readonly best: Fitted | null;
}

/**
 * Random starts of every shape, and starts that two elements at the source match at the band's centre (a narrow band is
 * rarely found from elsewhere); how many of all go on to each later stage; distinct networks that are returned.
 */
const randomStarts = 8;
const matchedStarts = 4;
const kept = { second: 96, third: 20 };
const returned = 3;
/** Sharpness of the smooth maximum, stage by stage: the last is within 0.005 dB of the true one. */
const coarse = 3;
const middle = [8, 30];
const fine = [100, 400, 1600, 6400];

interface Trial {
  readonly shape: Shape;
  readonly x: Float64Array;
  level: number;
}

/**
 * Fits ladders to band and load states: lowers the worst |Γ| over every shape that the rule allows, from seeded random
 * starts and from those given, inside the element limits. Yields after each short piece of work, so that a caller can
 * show progress and stop; what it yields last holds the best so far.
 */
export function* fit(problem: FitProblem): Generator<FitProgress, readonly Fitted[]> {
  const rough = samples(problem, 17);
  const dense = samples(problem, 49);
  const limits = limitsOf(problem);
  const random = seeded(problem.seed);
  const scale = reactanceScale(dense);
  // Coupled resonances of a narrow band have reactances further apart.
  const spread = 2.5 + Math.max(0, Math.log(0.1 / Math.log(problem.bandHz.high / problem.bandHz.low)) / 2);
  const omega = 2 * Math.PI * Math.sqrt(problem.bandHz.low * problem.bandHz.high);
  let best: Fitted | null = null;
  let trials: Trial[] = [];

  const improve = (trial: Trial, states: readonly Ends[], betas: readonly number[], steps: number): void => {
    const mismatch = new WorstMismatch(trial.shape, states, problem.aim);
    for (const beta of betas) trial.level = minimiseInside(mismatch, trial, beta, steps, limits);
  };
  const sharp = fine[fine.length - 1]!;
  const unused = new Float64Array(problem.elements);
  const note = (trial: Trial): void => {
    const logs = Float64Array.from(trial.x, (t, k) => fromInside(t, limits[trial.shape[k]!.part]));
    const level = new WorstMismatch(trial.shape, dense, problem.aim).at(logs, sharp, unused);
    if (best === null || level < best.level) best = { ...fitted(trial, limits), level };
  };

  const shapes = shapesOf(problem.elements, problem.rule);
  for (const [k, shape] of shapes.entries()) {
    const starts = problem.starts.filter((arms) => fits(arms, shape)).map((arms) => inside(arms, limits));
    for (let start = 0; start < randomStarts; start += 1) {
      starts.push(
        Float64Array.from(shape, ({ part }) => {
          const x = scale * Math.exp((2 * random() - 1) * spread);
          return toInside(Math.log(part === 'inductor' ? x / omega : 1 / (omega * x)), limits[part]);
        }),
      );
    }
    for (const x of starts) {
      const trial = { shape, x, level: 0 };
      improve(trial, rough, [coarse], 30);
      note(trial);
      trials.push(trial);
    }
    if (k % 8 === 7) yield { done: (0.3 * (k + 1)) / shapes.length, best };
  }
  const wanted = shapes.length * matchedStarts;
  for (let k = 0; k < wanted && problem.elements >= 3; k += 1) {
    const shape = shapes[k % shapes.length]!;
    const inner = shape.slice(2).map((arm): Arm => {
      const x = scale * Math.exp((2 * random() - 1) * spread);
      return { ...arm, value: arm.part === 'inductor' ? x / omega : 1 / (omega * x) };
    });
    for (const arms of matchedAtCentre(problem, inner)) {
      const found = shapes.find((other) => fits(arms, other));
      if (found === undefined) continue;
      const trial = { shape: found, x: inside(arms, limits), level: 0 };
      improve(trial, rough, [coarse], 30);
      note(trial);
      trials.push(trial);
    }
    if (k % 16 === 15) yield { done: 0.3 + (0.2 * (k + 1)) / wanted, best };
  }

  trials = leading(trials, kept.second);
  for (const [k, trial] of trials.entries()) {
    improve(trial, rough, middle, 60);
    note(trial);
    if (k % 8 === 7) yield { done: 0.5 + (0.25 * (k + 1)) / trials.length, best };
  }
  trials = leading(trials, kept.third);
  for (const [k, trial] of trials.entries()) {
    improve(trial, dense, fine, 80);
    note(trial);
    yield { done: 0.75 + (0.25 * (k + 1)) / trials.length, best };
  }
  const distinct: Trial[] = [];
  for (const trial of leading(trials, trials.length)) {
    if (!distinct.some(({ shape }) => shape === trial.shape)) distinct.push(trial);
  }
  return distinct.slice(0, returned).map((trial) => fitted(trial, limits));
}

/** Inner arms completed at the source by every two-element network that matches the first load at the band's centre. */
function matchedAtCentre({ source, loads, f0, bandHz, aim }: FitProblem, inner: readonly Arm[]): readonly Arm[][] {
  const centre = Math.sqrt(bandHz.low * bandHz.high);
  const seen = ladderInput(inner, terminationAt(loads[0]!, f0, centre), centre);
  if (!(seen.re > 0)) return [];
  const target = targetOf(terminationAt(source, f0, centre), aim);
  return twoElement(target, seen, centre).candidates.map(({ arms }) => [...arms, ...inner]);
}

const leading = (trials: readonly Trial[], most: number): Trial[] =>
  trials.toSorted((a, b) => a.level - b.level).slice(0, most);

/** Terminations at points crowded towards the band's edges, where the worst mismatch usually is. */
function samples({ source, loads, f0, bandHz }: FitProblem, points: number): Ends[] {
  const middle = Math.sqrt(bandHz.low * bandHz.high);
  const half = Math.log(bandHz.high / bandHz.low) / 2;
  const count = half === 0 ? 1 : points;
  const frequencyHz = Float64Array.from({ length: count }, (_, k) =>
    count === 1 ? middle : middle * Math.exp(-half * Math.cos((Math.PI * k) / (count - 1))),
  );
  frequencyHz[0] = bandHz.low;
  frequencyHz[count - 1] = bandHz.high;
  return loads.map((load) => endsOver(source, load, f0, frequencyHz));
}

/** Geometric middle of the impedances that meet, Ω: reactances are looked for around it. */
function reactanceScale(states: readonly Ends[]): number {
  let sum = 0;
  let count = 0;
  for (const { rs, xs, rl, xl } of states) {
    for (let k = 0; k < rs.length; k += 1) {
      sum += Math.log(Math.hypot(rs[k]!, xs[k]!)) + Math.log(Math.hypot(rl[k]!, xl[k]!));
      count += 2;
    }
  }
  return Math.exp(sum / count);
}

type Limits = Record<Arm['part'], { readonly middle: number; readonly half: number }>;

/** Limits as logarithms. */
function limitsOf({ inductorH, capacitorF }: FitProblem): Limits {
  const of = ({ low, high }: Span) => ({
    middle: Math.log(low * high) / 2,
    half: Math.max(Math.log(high / low) / 2, 1e-12),
  });
  return { inductor: of(inductorH), capacitor: of(capacitorF) };
}

/** Logarithm of a value from its unbounded variable: middle + half·sin t stays within the limits. */
const fromInside = (t: number, { middle, half }: Limits[Arm['part']]): number => middle + half * Math.sin(t);

function toInside(log: number, { middle, half }: Limits[Arm['part']]): number {
  return Math.asin(Math.max(-0.999, Math.min(0.999, (log - middle) / half)));
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
      for (let k = 0; k < n; k += 1) slope[k]! *= Math.cos(y[k]! / bounds[k]!.half);
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
  Float64Array.from(arms, ({ part, value }) => toInside(Math.log(value), limits[part]));

const fitted = ({ shape, x, level }: Trial, limits: Limits): Fitted => ({
  arms: shape.map((arm, k) => ({ ...arm, value: Math.exp(fromInside(x[k]!, limits[arm.part])) })),
  level,
});
