import { Complex } from 'complex.js';
import type { Arm } from '../network/arm.ts';
import { ladderInput } from '../network/ladder-input.ts';
import { prepareLadder } from '../network/ladder.ts';
import { endsOver, sweep } from '../network/sweep.ts';
import { terminationAt } from '../network/termination-at.ts';
import { isOneImpedance, type Termination } from '../network/termination.ts';
import { formatQuantity } from '../quantity/format.ts';
import { pairQ, resistivePair } from '../synthesis/resistive-pair.ts';
import { twoElement } from '../synthesis/two-element.ts';
import { branchesOf } from './branch.ts';
import { check, leastGain, relativeSpread, routeTolerance, type EvidenceCheck } from './evidence-check.ts';
import { fromScattering, ladderScattering } from './s-parameters.ts';
import { solveNodal, type NodalSolution } from './nodal.ts';

export type { EvidenceCheck } from './evidence-check.ts';

export interface Evidence {
  /** Frequencies at which every route was evaluated, Hz: design frequency first, then band edges. */
  readonly frequenciesHz: readonly number[];
  readonly routes: readonly Route[];
  readonly checks: readonly EvidenceCheck[];
  readonly pass: boolean;
}

/** One independent way to the same numbers, at the design frequency. */
export interface Route {
  readonly name: string;
  /** How it computes, in one sentence. */
  readonly how: string;
  readonly seen: { readonly r: number; readonly x: number } | null;
  readonly transducerGain: number | null;
}

/** Largest relative difference between the element values of two methods that passes. */
const valueTolerance = 1e-12;

interface Figures {
  readonly seen: Complex;
  readonly gain: number;
}

/** One network between a source and one load state. */
export interface Subject {
  readonly arms: readonly Arm[];
  readonly source: Termination;
  readonly load: Termination;
  readonly f0: number;
}

const routes = [
  {
    name: 'Sweep',
    how: 'Voltage and current carried from the load back to the source, as in the response; GT = 4·RS·RL/|V + I·ZS|².',
    at: ({ arms, source, load, f0 }: Subject, hz: number): Figures => {
      const ends = endsOver(source, load, f0, Float64Array.of(hz));
      const { gain, gammaRe, gammaIm } = sweep(prepareLadder(arms), ends, 'reflectionless');
      const gamma = new Complex(gammaRe[0]!, gammaIm[0]!);
      const one = new Complex(1, 0);
      return {
        gain: gain[0]!,
        seen: one
          .add(gamma)
          .div(one.sub(gamma))
          .mul(terminationAt(source, f0, hz)),
      };
    },
  },
  {
    name: 'Step by step',
    how: 'Impedances combined in series and parallel from the load; GT = 4·RS·Rin/|ZS + Zin|² for lossless arms.',
    at: ({ arms, source, load, f0 }: Subject, hz: number): Figures => {
      const zs = terminationAt(source, f0, hz);
      const seen = ladderInput(arms, terminationAt(load, f0, hz), hz);
      return { seen, gain: (4 * zs.re * seen.re) / seen.add(zs).abs() ** 2 };
    },
  },
  {
    name: 'S-parameters',
    how: 'Scattering matrices of the arms cascaded in a common reference resistance; GT from the S-parameter formula.',
    at: ({ arms, source, load, f0 }: Subject, hz: number): Figures => {
      const zs = terminationAt(source, f0, hz);
      const zl = terminationAt(load, f0, hz);
      const z0 = Math.sqrt(zs.abs() * zl.abs());
      return fromScattering(ladderScattering(arms, hz, z0), zs, zl, z0);
    },
  },
  {
    name: 'Nodal equations',
    how: 'All node voltages solved at once; load power over available power, impedance from input voltage and current.',
    at: (subject: Subject, hz: number): Figures => nodalAt(subject, hz),
  },
] as const;

const nodalAt = ({ arms, source, load, f0 }: Subject, hz: number): NodalSolution =>
  solveNodal(branchesOf(arms, hz), terminationAt(source, f0, hz), terminationAt(load, f0, hz), 1);

/**
 * Independent routes to the impedance seen and the transducer gain of one network, with the spread between them.
 *
 * @param subjects      the network into each load state; the figures reported are those of the first
 * @param frequenciesHz where they are compared; the first is the design frequency
 * @param twoElement    the network is one of at most two elements, so that the Q method applies to a resistive pair
 */
export function evidence(
  subjects: readonly Subject[],
  frequenciesHz: readonly number[],
  twoElement: boolean,
): Evidence {
  const figures = subjects.flatMap((subject) =>
    frequenciesHz.map((hz) => routes.map((route) => route.at(subject, hz))),
  );
  const reported = routes.map(({ name, how }, k): Route => {
    const { seen, gain } = figures[0]![k]!;
    return { name, how, seen: { r: seen.re, x: seen.im }, transducerGain: gain };
  });
  const spreadOf = (pick: (row: readonly Figures[]) => number): number => Math.max(...figures.map(pick));
  const checks: EvidenceCheck[] = [
    check(
      'impedance seen',
      spreadOf((row) => relativeSpread(row.map(({ seen }) => seen))),
      routeTolerance,
      'largest difference between any two routes, relative to |Zin|',
    ),
    check(
      'transducer gain',
      spreadOf((row) =>
        relativeSpread(
          row.map(({ gain }) => new Complex(gain, 0)),
          leastGain,
        ),
      ),
      routeTolerance,
      'largest difference between any two routes, relative to the gain or, of a smaller one, to a millionth',
    ),
    check(
      'power balance',
      Math.max(...subjects.flatMap((subject) => frequenciesHz.map((hz) => imbalance(nodalAt(subject, hz))))),
      routeTolerance,
      'available power against load + losses + reflected, from the nodal solution',
    ),
  ];
  const pair = twoElement ? qMethod(subjects[0]!) : null;
  if (pair !== null) {
    reported.push(pair.route);
    checks.push(pair.check);
  }
  return { frequenciesHz, routes: reported, checks, pass: checks.every(({ pass }) => pass) };
}

const imbalance = ({ availableW, loadW, lostW, reflectedW }: NodalSolution): number =>
  Math.abs(availableW - loadW - lostW - reflectedW) / availableW;

/** The single-parameter Q method beside the general equations; null when the pair isn't resistive. */
function qMethod({ arms, source, load, f0 }: Subject): { route: Route; check: EvidenceCheck } | null {
  if (!isOneImpedance(source) || !isOneImpedance(load) || source.x !== 0 || load.x !== 0) return null;
  const alike = (candidate: { readonly arms: readonly Arm[] }): boolean =>
    candidate.arms.length === arms.length &&
    candidate.arms.every((arm, k) => arm.arm === arms[k]!.arm && arm.part === arms[k]!.part);
  const byQ = resistivePair(source.r, load.r, f0).candidates.find(alike);
  const general = twoElement(new Complex(source.r, 0), new Complex(load.r, 0), f0).candidates.find(alike);
  if (byQ === undefined || general === undefined) return null;
  const spread = Math.max(
    0,
    ...arms.flatMap(({ value }, k) => [byQ, general].map((found) => Math.abs(found.arms[k]!.value / value - 1))),
  );
  const values = (found: readonly Arm[]): string =>
    found.length === 0
      ? 'no part'
      : found.map(({ part, value }) => formatQuantity(value, part === 'inductor' ? 'H' : 'F', 9)).join(', ');
  const q = formatQuantity(pairQ(source.r, load.r), '', 6);
  return {
    route: {
      name: 'Q method',
      how: `Q = √(Rhigh/Rlow − 1) = ${q}; Xseries = ±Q·Rlow, Xshunt = ∓Rhigh/Q: ${values(byQ.arms)}. General equations: ${values(general.arms)}.`,
      seen: null,
      transducerGain: null,
    },
    check: check(
      'element values by the Q method',
      spread,
      valueTolerance,
      'largest relative difference of the network from the Q method and from the general equations',
    ),
  };
}
