import { formatFixed, formatQuantity } from '../quantity/format.ts';
import { readQuantity } from '../quantity/read-quantity.ts';
import { read, refuse, type Reading } from '../quantity/reading.ts';

/** How far a part may be from its value, either way: a fraction of it (0.05), or henry or farad. */
export interface Tolerance {
  readonly kind: 'relative' | 'absolute';
  readonly value: number;
}

/** Tolerance letters of IEC 60062:2016 in per cent, and those in picofarad for capacitors below 10 pF. */
const percentLetters: Readonly<Record<string, number>> = { F: 1, G: 2, J: 5, K: 10, M: 20 };
const picofaradLetters: Readonly<Record<string, number>> = { B: 0.1, C: 0.25, D: 0.5 };

/**
 * Reads `5%`, `±0.25 pF`, `0.1nH` or a letter of IEC 60062: `J`, and for capacitors `C`.
 *
 * @returns a fraction below 1, or an amount in the part's own unit; 0 or more
 */
export function readTolerance(text: string, part: 'inductor' | 'capacitor'): Reading<Tolerance> {
  const would = part === 'capacitor' ? 'write it as 5%, 0.25 pF or a letter such as J' : 'write it as 5%, 0.2 nH or J';
  const given = text.trim().replace(/^(?:±|\+\/-)\s*/u, '');
  if (given === '') return refuse('nothing is given', would);
  const percent = percentLetters[given];
  if (percent !== undefined) return read({ kind: 'relative', value: percent / 100 });
  const picofarad = picofaradLetters[given];
  if (picofarad !== undefined) {
    return part === 'capacitor'
      ? read({ kind: 'absolute', value: picofarad / 1e12 })
      : refuse(`${given} means ±${String(picofarad)} pF, which is for capacitors`, would);
  }
  if (given.endsWith('%')) {
    const value = Number(given.slice(0, -1).trim().replace(',', '.'));
    if (given === '%' || !Number.isFinite(value)) return refuse('not a number of per cent', would);
    if (value < 0) return refuse('a tolerance is not negative', would);
    if (value >= 100) return refuse('at 100 % or more a part could be nothing at all', would);
    return read({ kind: 'relative', value: value / 100 });
  }
  if (/^[\d.,]+$/u.test(given)) return refuse('per cent or a unit is missing', would);
  const amount = readQuantity(given, part === 'capacitor' ? 'F' : 'H');
  if (!amount.ok) return refuse('not a tolerance', would);
  return amount.value < 0
    ? refuse('a tolerance is not negative', would)
    : read({ kind: 'absolute', value: amount.value });
}

/** "±5 %" or "±0.25 pF". */
export function formatTolerance({ kind, value }: Tolerance, part: 'inductor' | 'capacitor'): string {
  if (kind === 'absolute') return `±${formatQuantity(value, part === 'capacitor' ? 'F' : 'H', 3)}`;
  const percent = value * 100;
  return `±${formatFixed(percent, Math.abs(percent - Math.round(percent)) < 1e-9 ? 0 : 2)} %`;
}

/** As a fraction of a value, H or F; below 1, because no part is less than nothing. */
export const relativeTolerance = ({ kind, value }: Tolerance, of: number): number =>
  kind === 'relative' ? value : Math.min(value / of, 0.999);
