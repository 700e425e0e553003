import { normalise } from './read-quantity.ts';
import { read, refuse, type Reading } from './reading.ts';

/**
 * Reads `5%` as a fraction; what range it may have is the caller's to say. A bare number could be a fraction or per cent,
 * and is refused.
 */
export function readPercent(text: string): Reading<number> {
  const match = /^([+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+))(?:e([+-]?\d+))?\s*(%)?$/iu.exec(normalise(text));
  if (match === null) return refuse('not a percentage', 'write it as 5%');
  if (match[3] === undefined) return refuse('the per cent is missing', `write ${normalise(text)}% if that is meant`);
  const [, digits = '', exponent = '0'] = match;
  // The exponent takes the per cent, so that nothing is rounded twice.
  const value = Number(`${digits.replace(',', '.')}e${String(Number(exponent) - 2)}`);
  return Number.isFinite(value) ? read(value) : refuse('beyond the range of numbers', 'write it as 5%');
}

/** A percentage that reads back as the same fraction: 0.05 as `5%`. */
export function writePercent(fraction: number): string {
  const [digits = '', exponent] = String(fraction).split('e');
  if (exponent !== undefined) return `${digits}e${String(Number(exponent) + 2)}%`;
  const [whole = '', decimals = ''] = digits.split('.');
  const moved = `${whole}${decimals.padEnd(2, '0').slice(0, 2)}.${decimals.slice(2)}`;
  return `${moved.replace(/^(-?)0+(?=\d)/u, '$1').replace(/\.$/u, '')}%`;
}
