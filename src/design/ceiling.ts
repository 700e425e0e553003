import { holds } from '../network/figures-of-merit.ts';
import type { Ceiling } from '../dossier.ts';
import { bestReflection, bestReflectionOf } from '../network/ceiling.ts';
import { partsOf } from '../network/circuit-model.ts';
import { fitOneResonance } from '../network/one-resonance.ts';
import { isResistive, terminationAt } from '../network/termination-at.ts';
import { isModel, isOneImpedance, type Termination } from '../network/termination.ts';
import { logGrid } from '../network/worst-in-band.ts';
import { formatFixed, formatQuantity } from '../quantity/format.ts';
import type { Span } from '../quantity/span.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { returnLossWords } from './words.ts';
import { log10 } from '../quantity/elementary.ts';

/** Resonators for which a ceiling is told. */
const mostResonators = 6;
const fitPoints = 41;

/** Q of an end at the band's centre, by which Bode and Fano bound what a network can do. */
interface EndQ {
  readonly q: number;
  readonly estimate: boolean;
  readonly basis: string;
}

/** The ceiling over the band, or why there is none. */
export function ceilingOf(record: DesignRecord): { readonly ceiling: Ceiling | null; readonly noCeiling: string } {
  const { source, loads, aim, requirement } = record;
  const { bandHz, frequencyHz: f0, returnLossDb } = requirement;
  const none = (noCeiling: string) => ({ ceiling: null, noCeiling });
  if (bandHz === null || bandHz.low === bandHz.high) return none('A ceiling belongs to a band; none is given.');
  if (aim === 'reflectionless' && !isResistive(source)) {
    return none('A reflectionless match to a complex source is no question of power, which is what a ceiling bounds.');
  }
  const centre = Math.sqrt(bandHz.low * bandHz.high);
  const w = (bandHz.high - bandHz.low) / centre;
  const ends = [
    ...loads.map(({ name, termination }) => ({ governs: 'load' as const, state: name, termination })),
    { governs: 'source' as const, state: '', termination: source },
  ]
    .filter(({ termination }) => !isResistive(termination))
    .map((end) => ({ ...end, ...endQ(end.termination, f0, bandHz, centre) }));
  if (ends.length === 0) return none('Between two resistances no ceiling exists: more sections always hold more.');
  const worst = ends.reduce((a, b) => (b.q > a.q ? b : a));
  const g = worst.q * w;
  const perResonators = Array.from({ length: mostResonators }, (_, k) => bestReflectionOf(g, k + 1));
  const best = bestReflection(g);
  const needs = returnLossDb === null ? null : leastResonators(perResonators, returnLossDb);
  return {
    ceiling: {
      bestReflection: best,
      perResonators,
      governs: worst.governs,
      state: worst.state,
      q: worst.q,
      fractionalWidth: w,
      estimate: worst.estimate,
      needs,
      ...verdict(best, perResonators, needs, returnLossDb, worst.estimate),
      basis: worst.basis,
    },
    noCeiling: '',
  };
}

const decibels = (reflection: number): number => (reflection < 1e-10 ? 200 : -20 * log10(reflection) + 0);

function leastResonators(perResonators: readonly number[], askedDb: number): number | null {
  const index = perResonators.findIndex((reflection) => holds(decibels(reflection), askedDb));
  return index < 0 ? null : index + 1;
}

function verdict(
  best: number,
  perResonators: readonly number[],
  needs: number | null,
  askedDb: number | null,
  estimate: boolean,
): Pick<Ceiling, 'verdict' | 'words'> {
  const figure = (reflection: number): string => {
    const words = returnLossWords(decibels(reflection));
    return estimate && !words.startsWith('over') ? `about ${words}` : words;
  };
  const top = figure(best);
  if (askedDb === null) {
    const words = top.startsWith('over')
      ? `The ceiling is ${top} over the band, more than any network that can be built.`
      : `No lossless network holds more than ${top} over the band.`;
    return { verdict: 'not assessed', words };
  }
  const asked = `${formatFixed(askedDb, 2)} dB`;
  if (!holds(decibels(best), askedDb)) {
    return {
      verdict: 'out of reach',
      words: `${asked} can't be met by any lossless network: the ceiling is ${top}, ${formatFixed(askedDb - decibels(best), 2)} dB less.`,
    };
  }
  if (needs === null) {
    return {
      verdict: 'within reach',
      words: `${asked} needs more than ${String(mostResonators)} resonators tuned to the band's centre (${figure(perResonators[mostResonators - 1]!)} with six); the ceiling is ${top}.`,
    };
  }
  const with_ = `${figure(perResonators[needs - 1]!)} with ${needs === 1 ? "the end's own alone" : String(needs)}`;
  if (needs === 1) {
    return {
      verdict: 'room to spare',
      words: `Room to spare: ${asked} needs one resonator (${with_}); the ceiling is ${top}.`,
    };
  }
  return {
    verdict: 'within reach',
    words: `${asked} needs at least ${String(needs)} resonators tuned to the band's centre (${with_}); the ceiling is ${top}.`,
  };
}

function endQ(termination: Termination, f0: number, band: Span, centre: number): EndQ {
  if (isOneImpedance(termination)) {
    const z = terminationAt(termination, f0, centre);
    const q = Math.abs(z.im) / z.re;
    const words = `Q = |X|/R = ${formatQuantity(q, '', 4)} at the band's centre, ${formatQuantity(centre, 'Hz')}`;
    return termination.behaviour === 'constant'
      ? { q, estimate: true, basis: `${words}; a reactance held constant stands for none that exists` }
      : { q, estimate: false, basis: words };
  }
  if (isModel(termination)) {
    const { arrangement, r, l, c, c0 } = partsOf(termination);
    if (c0 === null) {
      const omega = 2 * Math.PI * centre;
      const ratio = (x: number): number => (arrangement === 'series' ? x / r : r / x);
      // Each reactance bounds the integral of ln 1/|Γ| by itself; resonating the smaller makes up the rest.
      const q = Math.max(l === null ? 0 : ratio(omega * l), c === null ? 0 : ratio(1 / (omega * c)));
      return {
        q,
        estimate: false,
        basis: `Q = ${formatQuantity(q, '', 4)} of the larger reactance at the band's centre, ${formatQuantity(centre, 'Hz')}`,
      };
    }
  }
  const frequencies = [...logGrid(band.low, band.high, fitPoints)];
  const fit = fitOneResonance(
    frequencies,
    frequencies.map((hz) => terminationAt(termination, f0, hz)),
    centre,
  );
  const q = Math.max(fit.growingQ, fit.fallingQ);
  return {
    q,
    estimate: true,
    basis: `one-resonance model (${fit.arrangement} R ${formatQuantity(fit.r, 'Ω')}, Q ${formatQuantity(q, '', 3)} at ${formatQuantity(centre, 'Hz')}) fitted over the band, within ${formatFixed(Math.max(fit.misfit, 0.001), 3)} of Γ`,
  };
}
