import type { Yield } from '../evidence/tolerance-figures.ts';
import type { DcPath } from '../network/dc-path.ts';
import { modelWords } from '../network/read-model.ts';
import { isMeasured, isModel, type MeasuredTermination, type Termination } from '../network/termination.ts';
import { formatFixed, formatImpedanceRead, formatQuantity } from '../quantity/format.ts';
import { frequencySpan } from '../quantity/figures-in-words.ts';

export { decibelPair, frequencySpan, returnLossWords } from '../quantity/figures-in-words.ts';

export function dcWords({ blocked, sourceShorted, loadShorted }: DcPath): string {
  const ends = [sourceShorted ? 'source' : '', loadShorted ? 'load' : ''].filter((end) => end !== '');
  return [
    blocked ? 'series path blocked' : 'series path open to DC',
    ends.length === 0 ? 'no short to ground' : `shorted to ground at the ${ends.join(' and the ')}`,
  ].join('; ');
}

/** What a termination is taken to be away from the design frequency. */
export function behaviourWords(end: string, termination: Termination, f0: number): string {
  if (isMeasured(termination)) return measuredWords(end, termination);
  if (isModel(termination)) return `The ${end} is the circuit model ${modelWords(termination)}.`;
  const { r, x, behaviour } = termination;
  const z = formatImpedanceRead(r, x);
  if (x === 0) return `The ${end} is ${z} at every frequency.`;
  if (behaviour === 'constant') return `The ${end} is ${z} at every frequency swept (held constant).`;
  const omega = 2 * Math.PI * f0;
  if (behaviour === 'series') {
    const part = x > 0 ? formatQuantity(x / omega, 'H') : formatQuantity(-1 / (omega * x), 'F');
    return `The ${end} is ${z} at the design frequency and varies as ${formatQuantity(r, 'Ω')} in series with ${part}.`;
  }
  const size = r * r + x * x;
  const b = -x / size;
  const part = b > 0 ? formatQuantity(b / omega, 'F') : formatQuantity(-1 / (omega * b), 'H');
  return `The ${end} is ${z} at the design frequency and varies as ${formatQuantity(size / r, 'Ω')} in parallel with ${part}.`;
}

function measuredWords(end: string, { measured }: MeasuredTermination): string {
  const { name, sha256, samples, frequencyHz, thinningError } = measured;
  const span = frequencySpan({ low: frequencyHz[0]!, high: frequencyHz[frequencyHz.length - 1]! });
  const thinned =
    thinningError === 0 && samples === frequencyHz.length
      ? ''
      : ` ${String(frequencyHz.length)} samples of them are used; the curve through these passes every other within ${thinningError < 1e-4 ? '0.0001' : formatFixed(thinningError, 4)} in Γ.`;
  return `The ${end} is measured: ${name}, SHA-256 ${sha256.slice(0, 16)}…, ${String(samples)} samples, ${span}; Γ is interpolated between samples and never extrapolated.${thinned}`;
}

/** "93.2 % (91.4 to 94.7 %, 95 % confidence, 1000 networks, seed 1)". */
export function yieldWords({ value, low, high, confidence, samples, seed }: Yield): string {
  const percent = (fraction: number): string => formatFixed(fraction * 100, 1);
  return `${percent(value)} % (${percent(low)} to ${percent(high)} %, ${String(confidence * 100)} % confidence, ${String(samples)} networks, seed ${String(seed)})`;
}
