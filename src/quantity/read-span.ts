import { normalise, readQuantity } from './read-quantity.ts';
import { read, refuse, type Reading } from './reading.ts';
import type { Span } from './span.ts';
import { prefixes, type Unit } from './unit.ts';

const separators = /\s*(?:\.{2,3}|…|\bto\b)\s*|\s+-\s+|(?<=[\d.a-zA-ZΩ])(?<!\d[eE])-(?=[\d.])/u;

/**
 * Reads `150.5M..152M`, `150.5 to 152 MHz` or `150.5-152 MHz`. A prefix and unit given only at the upper end hold for
 * both.
 *
 * @returns the ends as written: which is the lower is for the caller to judge
 */
export function readSpan(text: string, unit: Unit, example: string): Reading<Span> {
  const would = `write it as ${example}`;
  const given = normalise(text);
  if (given === '') return refuse('nothing is given', would);
  const parts = given.split(separators);
  const [lowText, highText] = parts;
  if (parts.length !== 2 || lowText === undefined || highText === undefined) {
    return refuse('not a lower and an upper end', would);
  }
  const suffix = /[\d.,]\s*([a-zA-ZΩ]+)$/u.exec(highText)?.[1] ?? '';
  const carried = /^[+-]?[\d.,]+$/u.test(lowText) && suffix !== '' && (suffix.length > 1 || suffix in prefixes);
  const low = readQuantity(carried ? lowText + suffix : lowText, unit);
  if (!low.ok) return refuse(`the lower end: ${low.why}`, would);
  const high = readQuantity(highText, unit);
  if (!high.ok) return refuse(`the upper end: ${high.why}`, would);
  return read({ low: low.value, high: high.value });
}
