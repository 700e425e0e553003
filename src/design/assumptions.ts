import type { DesignRecord } from '../record/design-record.ts';
import { behaviourWords } from './words.ts';
import { formatQuantity } from '../quantity/format.ts';

/** What the figures rest on, in the order in which a reviewer would question it. */
export function assumptionsOf(record: DesignRecord): string[] {
  const { source, load, aim, requirement } = record;
  const { inductorH, capacitorF, frequencyHz } = requirement;
  const sameAim = source.x === 0 ? ' With a real source both aims are the same.' : '';
  return [
    behaviourWords('source', source, frequencyHz),
    behaviourWords('load', load, frequencyHz),
    aim === 'conjugate'
      ? `Aim: conjugate. At the design frequency the source sees ZS*, and all available power is delivered.${sameAim}`
      : `Aim: reflectionless. At the design frequency the source sees ZS, so that no wave returns.${sameAim}`,
    'Parts are ideal: lossless, of exact value, without strays. Loss, tolerance, stress and heat are not assessed here.',
    'Terminations and parts are linear and do not change with power, temperature or time.',
    `Return loss, VSWR and mismatch loss are those at the source's terminals, for the aim above.`,
    `Transducer gain is load power over the source's available power. Harmonic figures take the terminations to behave at the harmonics as stated above.`,
    `Practicable parts: inductors ${formatQuantity(inductorH.low, 'H', 3)} to ${formatQuantity(inductorH.high, 'H', 3)}, capacitors ${formatQuantity(capacitorF.low, 'F', 3)} to ${formatQuantity(capacitorF.high, 'F', 3)}.`,
  ];
}
