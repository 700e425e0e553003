import { isOneImpedance } from '../network/termination.ts';
import { formatFixed, formatRead } from '../quantity/format.ts';
import type { DesignRecord } from '../record/design-record.ts';
import { buildAssumptions } from './build-assumptions.ts';
import { openQ } from './method.ts';
import { behaviourWords } from './words.ts';

/**
 * What the figures rest on, in the order in which a reviewer would question it.
 *
 * @param least the least Q for which a Pi or T exists, of the kinds that are asked for
 */
export function assumptionsOf(
  record: DesignRecord,
  least: readonly { readonly kind: 'Pi' | 'T'; readonly q: number }[],
): string[] {
  const { source, loads, aim, requirement, partQ, fit, method } = record;
  const { inductorH, capacitorF, frequencyHz } = requirement;
  const sameAim = isOneImpedance(source) && source.x === 0 ? ' With a real source both aims are the same.' : '';
  const several = loads.length > 1;
  return [
    behaviourWords('source', source, frequencyHz),
    ...loads.map(({ name, termination }) =>
      behaviourWords(name === '' ? 'load' : `load "${name}"`, termination, frequencyHz),
    ),
    ...(several
      ? ['Closed forms are matched to the first load state; every figure is that of the state in which it is worst.']
      : []),
    aim === 'conjugate'
      ? `Aim: conjugate. At the design frequency the source is to see ZS*, and all available power is delivered.${sameAim}`
      : `Aim: reflectionless. At the design frequency the source is to see ZS, so that no wave returns.${sameAim}`,
    ...(record.build === null
      ? [
          'Parts are ideal: lossless, of exact value, without strays. Tolerance, stress and heat are not assessed here.',
          `The loss figure alone takes inductors with Q ${String(partQ.inductor)} and capacitors with Q ${String(partQ.capacitor)} at the design frequency.`,
        ]
      : buildAssumptions(record, record.build)),
    ...least.map(
      ({ kind, q }) =>
        `${kind} networks exist for every Q of ${formatFixed(q, 3)} or more at the steeper end; ${
          record.q === null
            ? `Q ${formatFixed(openQ(q), 3)} is taken: 1.5 times the least, and at least 2`
            : `Q ${String(record.q)} is asked for`
        }.`,
    ),
    ...(method === 'fitted' || method === 'all'
      ? [
          `Fitted networks are the best of a seeded search (seed ${String(fit.seed)}${fit.steps === null ? '' : `, stopped after ${String(fit.steps)} steps`}) over band and states, inside the practicable ranges; a better one may exist.`,
        ]
      : []),
    'Terminations and parts are linear and do not change with power, temperature or time.',
    `Return loss, VSWR and mismatch loss are those at the source's terminals, for the aim above.`,
    `Transducer gain is load power over the source's available power. Harmonic figures take the terminations to behave at the harmonics as stated above.`,
    `Practicable parts: inductors ${formatRead(inductorH.low, 'H')} to ${formatRead(inductorH.high, 'H')}, capacitors ${formatRead(capacitorF.low, 'F')} to ${formatRead(capacitorF.high, 'F')}.`,
  ];
}
