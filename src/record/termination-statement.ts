import { isMeasured, isModel, type OneImpedance, type Termination } from '../network/termination.ts';
import type { MeasuredData } from '../measured/measured.ts';
import { sha256Of } from './canonical.ts';
import { terminationWords } from './read-termination.ts';
import { minus, type Statement } from './statement.ts';

const behaviours = {
  constant: 'the same at every frequency',
  series: 'varying as R and X in series',
  parallel: 'varying as R and X in parallel',
} as const;

/** One end of the interface, for comparing. */
export function terminationStatement(what: string, termination: Termination): Statement {
  if (isMeasured(termination)) return measuredStatement(what, termination.measured);
  const words = terminationWords(termination);
  if (isModel(termination)) {
    const { model, values } = termination;
    return { what, value: termination, words, exact: () => `${model}: ${values.map(String).join(', ')}` };
  }
  const { r, x, behaviour } = termination;
  return {
    what,
    value: termination,
    words: `${words}, ${away(termination)}`,
    exact: () => `R ${String(r)} Ω, X ${minus(String(x))} Ω, ${behaviours[behaviour]}`,
  };
}

const away = ({ x, behaviour }: OneImpedance): string => (x === 0 ? behaviours.constant : behaviours[behaviour]);

/** Data by name, samples and digest; their numbers are told apart by a digest too. */
export function measuredStatement(what: string, measured: MeasuredData): Statement {
  const { name, sha256, samples, thinningError, referenceOhm, frequencyHz, re, im } = measured;
  const words = `${terminationWords({ measured })}, SHA-256 ${sha256.slice(0, 16)}…`;
  return {
    what,
    value: measured,
    words,
    exact: () =>
      [
        JSON.stringify(name),
        `SHA-256 ${sha256}`,
        `${String(samples)} samples, of which ${String(frequencyHz.length)} are used`,
        `thinned within ${String(thinningError)}`,
        `reference ${String(referenceOhm)} Ω`,
        `SHA-256 of the numbers used ${sha256Of({ frequencyHz, re, im }).slice(0, 16)}…`,
      ].join('; '),
  };
}
