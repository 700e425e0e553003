import type { RealLadder } from '../../network/real-arm.ts';
import { formatFixed, formatQuantity } from '../../quantity/format.ts';
import type { Fault } from '../as-built-figures.ts';
import { mostQ } from './hypotheses.ts';

/** A cause in words: "L1 is 12 % high (91.8 nH instead of 82 nH)", "1.30 pF to ground at the node between L1 and L2". */
export function faultWords(
  { kind, at, size }: Fault,
  { arms, strayF }: RealLadder,
  designators: readonly string[],
): string {
  const more = (unit: string): string => `${formatQuantity(Math.abs(size), unit, 3)} ${size < 0 ? 'less' : 'more'}`;
  switch (kind) {
    case 'value': {
      const { part, value } = arms[at]!;
      const unit = part === 'inductor' ? 'H' : 'F';
      const [is, was] = [formatQuantity(value * size, unit, 3), formatQuantity(value, unit, 3)];
      return `${designators[at]!} is ${percent(size)} (${is} instead of ${was})`;
    }
    case 'quality': {
      const { q } = arms[at]!;
      const is = `${quality(size)}${size > 0.99 * mostQ ? ' or more' : ''}`;
      return `the Q of ${designators[at]!} is ${is}${q === null ? '' : ` instead of ${quality(q)}`}`;
    }
    case 'lead': {
      const { seriesH } = arms[at]!;
      return seriesH === 0
        ? `${formatQuantity(size, 'H', 3)} in the leads of ${designators[at]!}`
        : `${more('H')} in series with ${designators[at]!} than the ${formatQuantity(seriesH, 'H', 3)} assumed`;
    }
    case 'stray': {
      const node = nodeWords(at, arms, designators);
      return strayF === 0
        ? `${formatQuantity(size, 'F', 3)} to ground ${node}`
        : `${more('F')} to ground ${node} than the ${formatQuantity(strayF, 'F', 3)} assumed`;
    }
    case 'load resistance':
      return `the load's resistance is ${percent(size)}`;
    case 'load reactance':
      return `the load's reactance is ${formatQuantity(Math.abs(size), 'Ω', 3)} ${size < 0 ? 'lower' : 'higher'}`;
    case 'load inductance':
      return `${more('H')} in series with the load`;
    case 'load capacitance':
      return `${more('F')} across the load`;
  }
}

/** Nodes stand between series arms; the first is the source's. */
function nodeWords(node: number, arms: RealLadder['arms'], designators: readonly string[]): string {
  const series = designators.filter((_, k) => arms[k]!.arm === 'series');
  return node === 0 ? "at the source's node" : `at the node between ${series[node - 1]!} and ${series[node]!}`;
}

/** "12 % high", "3.4 % low". */
function percent(factor: number): string {
  const size = Math.abs(factor - 1) * 100;
  return `${formatFixed(size, size >= 9.95 ? 0 : size >= 0.995 ? 1 : 2)} % ${factor < 1 ? 'low' : 'high'}`;
}

const quality = (q: number): string => formatFixed(q, q >= 9.95 ? 0 : 1);
