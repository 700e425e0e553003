import type { Built, BuiltPart, Centring, Option, Stress, ValueSet } from '../dossier.ts';
import { biasWords } from '../evidence/bias.ts';
import { realBranches } from '../evidence/branch.ts';
import { realPoint } from '../evidence/real-point.ts';
import { stressOf } from '../evidence/stress.ts';
import { returnLossDb } from '../network/figures-of-merit.ts';
import type { RealArm, RealLadder } from '../network/real-arm.ts';
import { terminationAt } from '../network/termination-at.ts';
import { centreValues, worstOf } from '../parts/centre-values.ts';
import { chooseValues } from '../parts/choose-values.ts';
import { chooseWithPairs } from '../parts/choose-with-pairs.ts';
import { coil } from '../parts/coil.ts';
import type { Span } from '../quantity/span.ts';
import type { Build, DesignRecord, LoadState } from '../record/design-record.ts';
import { candidatesFor, pairReach, partOf, type Candidate } from './candidates.ts';
import { realWorst, type RealStates } from './real-worst.ts';
import { searchWords } from './search-words.ts';
import { percentilesOver, subjectOf, toleranceSteps, variedParts, yieldSteps } from './tolerance-steps.ts';
import { valueWords } from './value-words.ts';
import { log10, power } from '../quantity/elementary.ts';

/** How far from its exact value one that is centred anew may lie, as a ratio. */
const widest = 4;
const kept = 3;
/** Arms up to which values are centred from two starts. */
const mostCentredTwice = 6;

/** Where the spread over frequency is shown too. */
export interface Shown {
  readonly states: readonly LoadState[];
  readonly frequencyHz: Float64Array;
}

/** One option of real parts: values chosen, then what is to be expected of as many as are drawn. */
export function* builtSteps(
  record: DesignRecord,
  build: Build,
  option: Option,
  states: RealStates,
  shown: Shown | null,
): Generator<void, Built> {
  const { requirement, aim, selection } = record;
  const f0 = requirement.frequencyHz;
  const { arms } = option;
  const armFor = (arm: number, value: number): RealArm =>
    partOf(record, build, arms[arm]!, value, build[arms[arm]!.part].origin).arm;
  const exact = arms.map(({ value }) => value);
  const problem = { armFor, strayF: build.strayF, states: states.ends, f0, aim };
  const real = arms.map((_, k) => armFor(k, exact[k]!));
  const limits = arms.map((arm) => limitsOf(record, build, arm));
  const centred = centreValues(problem, exact, limits);
  yield;
  const { lists, sets } = yield* search(record, build, option, states, centred.values);
  const best = sets[0]!.map((pick, k) => lists[k]![pick]!.arm.value);
  // From the best set on sale too, where that doesn't take long or is better: what can be made is no worse than that.
  const wanted = arms.length <= mostCentredTwice || worstOf(problem, best) < centred.gammaSquared;
  const again = wanted ? centreValues(problem, best, limits) : centred;
  const centre = again.gammaSquared < centred.gammaSquared ? again : centred;
  yield;
  const taken = selection.option === option.id ? Math.min(selection.set, sets.length) : 1;
  const ladders = sets.map((picks) =>
    ladderOf(
      build,
      picks.map((pick, k) => lists[k]![pick]!),
    ),
  );
  const figures: ValueSet[] = [];
  const networks = sets.map((picks, k) => {
    const chosen = picks.map((pick, arm) => lists[arm]![pick]!);
    const parts = partsOf(chosen, option.designators);
    const varied = variedParts(
      chosen,
      parts.map(({ designator }) => designator),
    );
    return { chosen, parts, ladder: ladders[k]!, subject: subjectOf(record, build, states, ladders[k]!, varied) };
  });
  for (const { chosen, ladder, subject } of networks) {
    figures.push({
      values: chosen.map(({ arm }) => arm.value),
      words: chosen.map(valueWords),
      worstReturnLossDb: realWorst(states, ladder).returnLossDb,
      yield: yield* yieldSteps(record, build, subject),
    });
  }
  const { chosen, parts, ladder, subject } = networks[taken - 1]!;
  const worst = realWorst(states, ladder);
  const found = figures[taken - 1]!.yield;
  const spread = yield* toleranceSteps(record, build, subject, found);
  const centring: Centring = {
    idealDb: option.worstReturnLossDb ?? returnLossDb(option.reflection ** 2),
    realDb: realWorst(states, { arms: real, strayF: build.strayF }).returnLossDb,
    values: centre.values,
    centredDb: realWorst(states, { arms: arms.map((_, k) => armFor(k, centre.values[k]!)), strayF: build.strayF })
      .returnLossDb,
    roundingDb: 0,
  };
  const governing = record.loads.find(({ name }) => name === worst.state)!;
  const { efficiency } = realPoint(
    realBranches(ladder, f0, f0),
    terminationAt(record.source, f0, f0),
    terminationAt(governing.termination, f0, f0),
    requirement.powerW ?? 1,
  );
  return {
    parts,
    ladder,
    sets: figures,
    set: taken,
    searchWords: searchWords(figures, taken, chosen),
    worstReturnLossDb: worst.returnLossDb,
    worstAtHz: worst.atHz,
    worstState: worst.state,
    centring: { ...centring, roundingDb: centring.centredDb - worst.returnLossDb },
    lossDb: Math.max(0, -10 * log10(efficiency)),
    efficiency: Math.min(1, efficiency),
    yield: found,
    percentiles: shown === null ? null : percentilesOver(record, build, subject, shown.states, shown.frequencyHz),
    ...spread,
    stress: stressFor(record, build, states, ladder, chosen, parts),
    bias: biasWords(arms, option.designators, { keepDc: requirement.keepDc, blockDc: requirement.blockDc }),
    coils: arms.flatMap((arm, k) =>
      arm.part === 'inductor' ? [coil(option.designators[k]!, chosen[k]!.arm.value, build.winding)] : [],
    ),
  };
}

interface Found {
  /** What could stand for each arm. */
  readonly lists: readonly (readonly Candidate[])[];
  /** The best sets, as places in the lists. */
  readonly sets: readonly (readonly number[])[];
}

/** Single parts; where those miss what is required and the engineer allows it, two in place of one too. */
function* search(
  record: DesignRecord,
  build: Build,
  { arms }: Option,
  { ends }: RealStates,
  centre: readonly number[],
): Generator<void, Found> {
  const { requirement, aim } = record;
  const singles = arms.map((arm, k) => candidatesFor(record, build, arm, centre[k]!));
  const choice = {
    candidates: singles.map((parts) => parts.map(({ arm }) => arm)),
    centre,
    strayF: build.strayF,
    states: ends,
    f0: requirement.frequencyHz,
    aim,
    keep: kept,
  };
  const alone = yield* chooseValues(choice);
  const required = power(10, -(requirement.returnLossDb ?? Infinity) / 10);
  const single: Found = {
    lists: singles.map((parts) => parts.map((part): Candidate => ({ arm: part.arm, parts: [part], pair: null }))),
    sets: alone.map(({ picks }) => picks),
  };
  if (!build.pairs || alone[0]!.gammaSquared <= required) return single;
  const mayPair = arms.map(({ part }) => build[part].origin !== 'exact' && build[part].origin !== 'wound');
  const wide = arms.map((arm, k) => candidatesFor(record, build, arm, centre[k]!, pairReach));
  const { candidates, sets } = yield* chooseWithPairs({
    ...choice,
    candidates: wide.map((parts) => parts.map(({ arm }) => arm)),
    mayPair,
    required,
  });
  if (sets.length === 0 || sets[0]!.gammaSquared >= alone[0]!.gammaSquared) return single;
  return {
    lists: candidates.map((list, k) =>
      list.map(({ arm, pair }, pick): Candidate => {
        if (pair !== null) return { arm, parts: pair.of.map((of) => wide[k]![of]!), pair: pair.join };
        // Singles keep their order among the pairs.
        const before = list.slice(0, pick).filter((other) => other.pair === null).length;
        return { arm, parts: [wide[k]![before]!], pair: null };
      }),
    ),
    sets: sets.map(({ picks }) => picks),
  };
}

/** Values between which an arm may be centred anew: its own where it is exact. */
function limitsOf({ requirement }: DesignRecord, build: Build, { part, value }: Option['arms'][number]): Span {
  if (build[part].origin === 'exact') return { low: value, high: value };
  const range = part === 'inductor' ? requirement.inductorH : requirement.capacitorF;
  const low = Math.max(range.low, value / widest);
  const high = Math.min(range.high, value * widest);
  return low < high ? { low, high } : { low: value / widest, high: value * widest };
}

const ladderOf = ({ strayF }: Build, chosen: readonly Candidate[]): RealLadder => ({
  arms: chosen.map(({ arm }) => arm),
  strayF,
});

/** Parts to order; the two of a pair are told apart by a letter. */
function partsOf(chosen: readonly Candidate[], designators: readonly string[]): readonly BuiltPart[] {
  return chosen.flatMap(({ parts, pair }, armIndex) =>
    parts.map(({ arm, from, tolerance, selfResonanceHz, ratedVolts, ratedAmps }, k): BuiltPart => {
      const letter = parts.length === 1 ? '' : (['a', 'b'][k] ?? '');
      return {
        designator: `${designators[armIndex]!}${letter}`,
        armIndex,
        arm: arm.arm,
        part: arm.part,
        value: arm.value,
        from,
        pair,
        tolerance,
        q: arm.q!,
        selfResonanceHz,
        ratedVolts,
        ratedAmps,
      };
    }),
  );
}

function stressFor(
  { requirement }: DesignRecord,
  build: Build,
  { ends }: RealStates,
  ladder: RealLadder,
  chosen: readonly Candidate[],
  parts: readonly BuiltPart[],
): Stress | null {
  if (requirement.powerW === null) return null;
  const alone = chosen.flatMap(({ parts: each }) => each.map(({ arm }) => arm));
  const { ratedVolts, ratedAmps, ratedWatts } = build;
  return stressOf(
    {
      ladder,
      f0: requirement.frequencyHz,
      states: ends,
      parts: parts.map(({ designator, armIndex, pair, ratedVolts: volts, ratedAmps: amps }, k) => ({
        designator,
        armIndex,
        pair,
        alone: alone[k]!,
        ratedVolts: volts,
        ratedAmps: amps,
      })),
    },
    requirement.powerW,
    build.vswr,
    { ratedVolts, ratedAmps, ratedWatts },
    build.derating,
  );
}
