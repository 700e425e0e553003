import { formatQuantity } from '../quantity/format.ts';
import { readQuantity } from '../quantity/read-quantity.ts';
import { read, refuse, type Reading } from '../quantity/reading.ts';

/** How far a part may be from its value, either way: a fraction of it (0.05), or henry or farad. */
export interface Tolerance {
  readonly kind: 'relative' | 'absolute';
  readonly value: number;
}

/** Tolerance letters of IEC 60062:2016 in per cent, and those in picofarad for capacitors below 10 pF. */
const percentLetters: ReadonlyMap<string, number> = new Map(Object.entries({ F: 1, G: 2, J: 5, K: 10, M: 20 }));
const picofaradLetters: ReadonlyMap<string, number> = new Map(Object.entries({ B: 0.1, C: 0.25, D: 0.5 }));

/** IEC 60062 counts in picofarad below this, F. */
const picofaradBelow = 10e-12;

/**
 * Reads `5%`, `±0.25 pF`, `0.1nH` or a letter of IEC 60062: `J`, and for capacitors `C`.
 *
 * @param of the part's value, H or F, where it is known: what doesn't fit it is refused
 * @returns  a fraction below 1, or an amount in the part's own unit; 0 or more
 */
export function readTolerance(
  text: string,
  part: 'inductor' | 'capacitor',
  of: number | null = null,
): Reading<Tolerance> {
  const would = part === 'capacitor' ? 'write it as 5%, 0.25 pF or a letter such as J' : 'write it as 5%, 0.2 nH or J';
  const given = text.trim().replace(/^(?:±|\+\/-)\s*/u, '');
  if (part === 'capacitor' && of !== null) {
    const two = twoMeanings(given, of);
    if (two !== null) return two;
  }
  if (given === '') return refuse('nothing is given', would);
  const percent = percentLetters.get(given);
  if (percent !== undefined) return read({ kind: 'relative', value: percent / 100 });
  const picofarad = picofaradLetters.get(given);
  if (picofarad !== undefined) {
    return part === 'capacitor'
      ? read({ kind: 'absolute', value: picofarad / 1e12 })
      : refuse(`${given} means ±${String(picofarad)} pF, which is for capacitors`, would);
  }
  if (given.endsWith('%')) {
    const digits = given.slice(0, -1).trim();
    if (!/^[+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)$/u.test(digits)) return refuse('not a number of per cent', would);
    const value = Number(`${digits.replace(',', '.')}e-2`);
    if (value < 0) return refuse('a tolerance is not negative', would);
    if (value >= 1) return refuse('at 100 % or more a part could be nothing at all', would);
    return read({ kind: 'relative', value });
  }
  if (/^[\d.,]+$/u.test(given)) return refuse('per cent or a unit is missing', would);
  const amount = readQuantity(given, part === 'capacitor' ? 'F' : 'H');
  if (!amount.ok) return refuse('not a tolerance', would);
  if (amount.value < 0) return refuse('a tolerance is not negative', would);
  if (of !== null && amount.value >= of)
    return refuse('with as much as its value a part could be nothing at all', would);
  return read({ kind: 'absolute', value: amount.value });
}

/** A letter that the standard counts otherwise at this value than makers' lists often do; null: it is none. */
function twoMeanings(letter: string, of: number): Reading<never> | null {
  const small = of < picofaradBelow;
  const table = small ? percentLetters : picofaradLetters;
  const size = table.get(letter);
  if (size === undefined || 'JKM'.includes(letter)) return null;
  const range = small ? 'below 10 pF' : 'from 10 pF up';
  return refuse(`${letter} can mean per cent or pF ${range}`, `write ${String(size)}% or ${String(size)} pF`);
}

/** "±5 %", "±0.25 pF" or "±0.2 nH". */
export function formatTolerance({ kind, value }: Tolerance, part: 'inductor' | 'capacitor'): string {
  if (kind === 'relative') return `±${decimal(value * 100)} %`;
  const [scale, prefix, unit] = part === 'capacitor' ? ([1e12, 'p', 'F'] as const) : ([1e9, 'n', 'H'] as const);
  const scaled = value * scale;
  if (scaled < 1e-3 || scaled >= 1e3) return `±${formatQuantity(value, unit, 3)}`;
  return `±${decimal(scaled)} ${prefix}${unit}`;
}

/** At most four decimals, none that is zero at the end. */
const decimal = (value: number): string => String(Number(value.toFixed(4)));

/** As a fraction of a value, H or F; below 1, because no part is less than nothing. */
export const relativeTolerance = ({ kind, value }: Tolerance, of: number): number =>
  kind === 'relative' ? value : Math.min(value / of, 0.999);
