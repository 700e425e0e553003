import type { MeasuredData } from '../measured/measured.ts';
import type { RealArm, RealLadder } from '../network/real-arm.ts';
import { endsOver, type Ends } from '../network/sweep.ts';
import type { Aim, Termination } from '../network/termination.ts';
import { logGrid } from '../network/worst-in-band.ts';
import { relativeTolerance, type Tolerance } from '../parts/tolerance.ts';
import type { Span } from '../quantity/span.ts';
import type { AsBuiltFigures, Attached, Explanation } from './as-built-figures.ts';
import { boardSweep, rmsDistance } from './as-built/board-sweep.ts';
import { boardOf } from './as-built/board.ts';
import { explain, type Fitted } from './as-built/explain.ts';
import { faultWords } from './as-built/fault-words.ts';
import type { Scale } from './as-built/hypotheses.ts';
import { outsideBand } from './as-built/outside-band.ts';
import { measuredReflection, overlayOf, samplesWithin, withinReach } from './as-built/overlay.ts';
import { remedyOf } from './as-built/remedy.ts';
import { verdictOf } from './as-built/verdict.ts';
import type { Percentiles } from './tolerance-figures.ts';

/** Most samples by which causes are fitted: more of them tell nothing more, and take longer. */
const mostFitted = 201;
const bandPoints = 101;

/** A finished board and all that was said of it. SI units. */
export interface AsBuiltInput {
  /** Looking in from the source side, the load attached. */
  readonly measured: MeasuredData;
  readonly ladder: RealLadder;
  /** One for each arm, as the next two. */
  readonly designators: readonly string[];
  readonly tolerances: readonly Tolerance[];
  /** Parts on sale that may stand in for the arm, the nearest values below and above; empty: none. */
  readonly candidates: readonly (readonly RealArm[])[];
  readonly source: Termination;
  readonly loads: readonly { readonly name: string; readonly termination: Termination }[];
  /** Name of the load state that was attached; null: not said. */
  readonly attached: string | null;
  readonly aim: Aim;
  readonly f0: number;
  /** Sweep shown, over which measurement and prediction are compared. */
  readonly spanHz: Span;
  /** Band to hold; null: the design frequency alone. */
  readonly bandHz: Span | null;
  readonly returnLossDb: number | null;
  /** Of the real network's return loss by tolerance; null: not worked out. */
  readonly percentiles: Percentiles | null;
}

/**
 * Compares a measurement of the finished board with the prediction, and looks for the single cause that would best
 * explain how they differ.
 *
 * @throws RangeError when no load state has the name said to be attached
 */
export function asBuilt(input: AsBuiltInput): AsBuiltFigures {
  const { measured, ladder, designators, source, loads, aim, f0, returnLossDb: requiredDb } = input;
  const terminations = [source, ...loads.map(({ termination }) => termination)];
  const bandHz = input.bandHz ?? { low: f0, high: f0 };
  const board = boardOf(ladder);
  const frequencyHz = samplesWithin(measured, withinReach(input.spanHz, terminations));
  const predict = (state: string, at: Float64Array) => {
    const ends = endsOver(source, loads.find(({ name }) => name === state)!.termination, f0, at);
    return { ends, gamma: boardSweep(ends, f0, aim)(board) };
  };
  const attached = attachedTo(input, frequencyHz, (state) => {
    const { ends, gamma } = predict(state, frequencyHz);
    return rmsDistance(measuredReflection(measured, ends, aim), gamma);
  });
  const { state } = attached;
  const { ends, gamma: predicted } = predict(state, frequencyHz);
  const seen = measuredReflection(measured, ends, aim);
  const overlay = overlayOf(frequencyHz, seen, predicted);
  const reach = withinReach(bandHz, terminations);
  const verdict = verdictOf(measured, bandHz, requiredDb, reach, aim, (at) => predict(state, at));
  const known = {
    name: measured.name,
    sha256: measured.sha256,
    referenceOhm: measured.referenceOhm,
    samples: measured.samples,
    measuredHz: { low: measured.frequencyHz[0]!, high: measured.frequencyHz.at(-1)! },
    attached,
    overlay,
    verdict,
    outside: outsideBand(overlay, input.percentiles, state),
  };
  if (frequencyHz.length === 0) {
    return { ...known, distance: null, conclusion: 'not compared', explanations: [], alike: 0, remedy: null };
  }

  const fitted = thinned(frequencyHz);
  const fittedEnds = endsOver(source, loads.find(({ name }) => name === state)!.termination, f0, fitted);
  const sweep = boardSweep(fittedEnds, f0, aim);
  const fittedTo = measuredReflection(measured, fittedEnds, aim);
  const distance = rmsDistance(sweep(board), fittedTo);
  const { conclusion, fits, alike } = explain(board, fittedTo, sweep, scaleOf(fittedEnds), distance);
  const remedy =
    alike === 0 || verdict.verdict === 'meets' || reach === null
      ? null
      : remedyOf(
          board,
          designators,
          input.candidates,
          fits.slice(0, alike).map(({ fault }) => fault),
          loads.map(({ termination }) =>
            boardSweep(endsOver(source, termination, f0, logGrid(reach.low, reach.high, bandPoints)), f0, aim),
          ),
          requiredDb,
        );
  return { ...known, distance, conclusion, explanations: fits.map((fit) => inWords(fit, input)), alike, remedy };
}

/** The state named, or the one whose prediction is nearest to the measurement. */
function attachedTo(
  { loads, attached }: AsBuiltInput,
  frequencyHz: Float64Array,
  distanceOf: (state: string) => number,
): Attached {
  if (attached !== null && !loads.some(({ name }) => name === attached)) {
    throw new RangeError(`asBuilt: no load state is called "${attached}"; name one of the record's`);
  }
  const distances =
    frequencyHz.length === 0 ? [] : loads.map(({ name }) => ({ state: name, distance: distanceOf(name) }));
  if (loads.length === 1) return { state: loads[0]!.name, by: 'only one', distances };
  if (attached !== null) return { state: attached, by: 'engineer', distances };
  const nearest = distances.toSorted((a, b) => a.distance - b.distance)[0]?.state ?? loads[0]!.name;
  return { state: nearest, by: 'nearest', distances };
}

/** Evenly chosen, first and last among them. */
function thinned(frequencyHz: Float64Array): Float64Array {
  const n = frequencyHz.length;
  if (n <= mostFitted) return frequencyHz;
  return Float64Array.from(
    { length: mostFitted },
    (_, k) => frequencyHz[Math.round((k * (n - 1)) / (mostFitted - 1))]!,
  );
}

function scaleOf({ frequencyHz, rs, xs, rl, xl }: Ends): Scale {
  const k = frequencyHz.length >> 1;
  return {
    omega: 2 * Math.PI * frequencyHz[k]!,
    source: Math.hypot(rs[k]!, xs[k]!),
    load: Math.hypot(rl[k]!, xl[k]!),
  };
}

function inWords({ fault, residual }: Fitted, { ladder, designators, tolerances }: AsBuiltInput): Explanation {
  const ofPart = fault.kind === 'value' || fault.kind === 'quality' || fault.kind === 'lead';
  return {
    ...fault,
    designator: ofPart ? designators[fault.at]! : null,
    words: faultWords(fault, ladder, designators),
    residual,
    withinTolerance:
      fault.kind === 'value'
        ? Math.abs(fault.size - 1) <= relativeTolerance(tolerances[fault.at]!, ladder.arms[fault.at]!.value)
        : null,
  };
}
