import { read, refuse, type Reading } from './reading.ts';
import { prefixes, units, type Unit } from './unit.ts';

const plain = /^([+-]?)(\d+(?:[.,]\d*)?|[.,]\d+)(?:e([+-]?\d+))?\s*(.*)$/iu;
const lonelyM = /^[+-]?[\d.,]+(?:e[+-]?\d+)?\s*m\d*$/iu;
const letterForPoint = /^([+-]?)(\d*)([a-zA-Z])(\d+)\s*(.*)$/u;

/** Typographic variants that mean the same as the plain sign. */
export function normalise(text: string): string {
  return text
    .replace(/[\u2212\u2013\u2012\uFE63\uFF0D]/gu, '-')
    .replace(/[\u00B5\u03BC]/gu, 'u')
    .replace(/\u2126/gu, 'Ω')
    .replace(/[\u00A0\u2007\u2009\u202F]/gu, ' ')
    .trim();
}

/**
 * Reads one quantity as engineers write it: `151.25M`, `151.25 MHz`, `4n7` (IEC 60062 letter-for-point), `4,7 nH`,
 * `1.5e8`, `151 250 000`.
 *
 * @returns the value in the SI unit itself (Hz, Ω, H, F, W, V, A, m) or in dB; finite
 */
export function readQuantity(text: string, unit: Unit): Reading<number> {
  const would = `write it as ${units[unit].example}`;
  const given = normalise(text).replace(/(?<=^[+-]?\d{1,3}(?: \d{3})*) (?=\d{3}(?!\d))/gu, '');
  if (given === '') return refuse('nothing is given', would);

  if (unit === 'm' && lonelyM.test(given)) return refuse('the m can mean metre or milli', would);

  const letters = letterForPoint.exec(given);
  if (letters !== null) {
    const [, sign = '', whole = '', letter = '', fraction = '', rest = ''] = letters;
    const exponent = letter.toUpperCase() === 'R' && unit === 'Ω' ? 0 : prefixes[letter];
    if (exponent !== undefined && (rest === '' || isUnit(rest, unit))) {
      return finite(`${sign}${whole === '' ? '0' : whole}.${fraction}e${String(exponent)}`, unit, letter);
    }
  }

  const match = plain.exec(given);
  if (match === null) return refuse('not a quantity', would);
  const [, sign = '', digits = '', exponent = '0', suffix = ''] = match;
  if (suffix.startsWith(',') || suffix.startsWith('.')) return refuse('more than one point or comma', would);
  if (/^[1-9]\d{0,2},\d{3}$/u.test(digits)) {
    const [thousands = '', units3 = ''] = digits.split(',');
    return refuse(
      `the comma can mean ${thousands}.${units3} or ${thousands}${units3}`,
      `write ${thousands}.${units3} or ${thousands}${units3}`,
    );
  }
  const scale = readSuffix(suffix, unit);
  if (scale === null) return refuse(`"${suffix}" is not a prefix with ${unit}`, would);
  return finite(`${sign}${digits.replace(',', '.')}e${String(Number(exponent) + scale.exponent)}`, unit, scale.prefix);
}

function finite(literal: string, unit: Unit, prefix: string): Reading<number> {
  const value = Number(literal);
  if (!Number.isFinite(value)) return refuse('beyond the range of numbers', `write it as ${units[unit].example}`);
  if (unit === 'Hz' && 'afpnum'.includes(prefix) && prefix !== '') {
    return refuse(`"${prefix}" makes it less than a hertz`, 'write M for mega, k for kilo');
  }
  if (unit === 'A' && prefix === 'a') return refuse('"a" means atto', 'write A for ampere, m for milli');
  if (unit === 'm' && prefix !== '' && 'MGT'.includes(prefix)) {
    return refuse(`"${prefix}" makes it more than a kilometre`, `write it as ${units[unit].example}`);
  }
  if (unit === 'dB' && prefix !== '') return refuse('decibels take no prefix', 'write it as 14');
  return read(value);
}

function readSuffix(suffix: string, unit: Unit): { readonly exponent: number; readonly prefix: string } | null {
  if (suffix === '' || isUnit(suffix, unit)) return { exponent: 0, prefix: '' };
  const prefix = suffix.charAt(0);
  const rest = suffix.slice(1).trim();
  const exponent = prefixes[prefix];
  if (exponent === undefined || (rest !== '' && !isUnit(rest, unit, true))) return null;
  return { exponent, prefix };
}

/** Lower case is read after a prefix ("4.7 pf") and where it can't be one; a lone "f" could be femto. */
function isUnit(text: string, unit: Unit, afterPrefix = false): boolean {
  const lower = text.toLowerCase();
  if (!(units[unit].spellings as readonly string[]).includes(lower)) return false;
  return afterPrefix || lower.length > 1 || text === unit || !(lower in prefixes);
}
