import { normalise, readQuantity } from './read-quantity.ts';
import { read, refuse, type Reading } from './reading.ts';
import { cos, sin } from './elementary.ts';

export interface Rectangular {
  /** Ω */
  readonly r: number;
  /** Ω */
  readonly x: number;
}

const would = 'write it as 50, 9.4-j61 or 50∠-30°';

/**
 * Reads an impedance in Ω: `50`, `9.4-j61`, `9.4 - 61j`, `1k5 + j200`, `50∠-30°`, `50<-30` (degrees unless `rad` is
 * said), or a pair of columns, `9.4 -61`.
 */
export function readImpedance(text: string): Reading<Rectangular> {
  const given = normalise(text);
  if (given === '') return refuse('nothing is given', would);
  if (/[∠<]/u.test(given)) return readPolar(given);
  const pair = /^(\S+)\s+([+-]?[\d.]\S*)$/u.exec(given);
  if (pair !== null && !/[ij]/iu.test(given.replace(/ohms?/giu, '')) && !isGrouped(given)) {
    const [, first = '', second = ''] = pair;
    return combine(first, second);
  }
  return readTerms(given);
}

/** "1 500" is one number in groups of three, not a resistance of 1 and a reactance of 500. */
function isGrouped(text: string): boolean {
  return /^[+-]?\d{1,3}( \d{3})+([.,]\d+)?$/u.test(text);
}

function readPolar(given: string): Reading<Rectangular> {
  const match =
    /^([^∠<]+)[∠<]\s*([+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)(?:e[+-]?\d+)?)\s*(°|deg|rad)?\s*(?:Ω|ohms?)?$/iu.exec(given);
  if (match === null) return refuse('not a magnitude and an angle', would);
  const [, size = '', angleText = '', angleUnit = '°'] = match;
  const magnitude = readQuantity(size, 'Ω');
  if (!magnitude.ok) return magnitude;
  if (magnitude.value < 0) return refuse('a magnitude is not negative', would);
  const angle = Number(angleText.replace(',', '.')) * (angleUnit.toLowerCase() === 'rad' ? 1 : Math.PI / 180);
  if (!Number.isFinite(angle)) return refuse('the angle is beyond the range of numbers', would);
  return read({ r: magnitude.value * cos(angle), x: magnitude.value * sin(angle) });
}

function readTerms(given: string): Reading<Rectangular> {
  const bare = given
    .replace(/^\((.*)\)$/u, '$1')
    .replace(/(?:Ω|ohms?)/giu, '')
    .replace(/\s*([+-])\s*/gu, '$1')
    .trim();
  const terms = bare.split(/(?<!\d[eE])(?=[+-])/u).filter((term) => term !== '');
  let real: string | undefined;
  let imaginary: string | undefined;
  for (const term of terms) {
    const unsigned = term.replace(/^[+-]/u, '').trim();
    const sign = term.startsWith('-') ? '-' : '';
    const leading = /^[ij]\s*\*?\s*(.*)$/iu.exec(unsigned);
    const trailing = /^(.*?)\s*\*?\s*[ij]$/iu.exec(unsigned);
    const size = leading?.[1] ?? trailing?.[1];
    if (size !== undefined) {
      if (imaginary !== undefined) return refuse('two imaginary parts', would);
      imaginary = sign + (size === '' ? '1' : size);
    } else {
      if (real !== undefined) return refuse('two real parts and no j', would);
      real = sign + unsigned;
    }
  }
  return combine(real ?? '0', imaginary ?? '0');
}

function combine(real: string, imaginary: string): Reading<Rectangular> {
  const r = readQuantity(real, 'Ω');
  if (!r.ok) return refuse(r.why === 'not a quantity' ? 'not an impedance' : r.why, would);
  const x = readQuantity(imaginary, 'Ω');
  if (!x.ok) return refuse(x.why === 'not a quantity' ? 'not an impedance' : x.why, would);
  return read({ r: r.value, x: x.value });
}
