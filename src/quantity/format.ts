import type { Unit } from './unit.ts';

const steps = [
  [12, 'T'],
  [9, 'G'],
  [6, 'M'],
  [3, 'k'],
  [0, ''],
  [-3, 'm'],
  [-6, 'µ'],
  [-9, 'n'],
  [-12, 'p'],
  [-15, 'f'],
  [-18, 'a'],
] as const;

/** Hyphen-minus to the true minus sign; every formatted number goes through here. */
const sign = (text: string): string => text.replace('-', '−');

/** Mantissa and prefix of a finite value in engineering notation, rounded to `digits` significant digits. */
function engineering(value: number, digits: number): { readonly mantissa: string; readonly prefix: string } {
  if (!Number.isFinite(value)) throw new RangeError(`formatQuantity: ${String(value)} has no digits to write`);
  if (value === 0) return { mantissa: '0', prefix: '' };
  const exponent = Number(value.toExponential(digits - 1).split('e')[1]);
  const step = steps.find(([power]) => exponent >= power) ?? steps[steps.length - 1]!;
  const decimals = Math.max(0, digits - 1 - (exponent - step[0]));
  // A power of ten is applied through the literal, so that 4.7e-9 is written from its own digits.
  const [digitsText = '0', exponentText = '0'] = value.toExponential(Math.min(100, digits - 1)).split('e');
  const mantissa = Number(`${digitsText}e${String(Number(exponentText) - step[0])}`).toFixed(Math.min(decimals, 100));
  return { mantissa, prefix: step[1] };
}

/** Engineering notation with `digits` significant digits: `formatQuantity(1.5125e8, 'Hz')` is "151.3 MHz". */
export function formatQuantity(value: number, unit: string, digits = 4): string {
  const { mantissa, prefix } = engineering(value, digits);
  return `${sign(mantissa)} ${prefix}${unit}`.trimEnd();
}

/** What was read, with no digit lost to rounding (to 12) and no trailing zeros: "151.25 MHz". */
export function formatRead(value: number, unit: Unit): string {
  if (unit === 'dB') return `${sign(String(value))} dB`;
  const { mantissa, prefix } = engineering(value, 12);
  return `${sign(trim(mantissa))} ${prefix}${unit}`;
}

/** Fixed decimals with a true minus sign; −0 is written 0. */
export function formatFixed(value: number, decimals: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`formatFixed: ${String(value)} has no digits to write`);
  const text = value.toFixed(decimals);
  return sign(Number(text) === 0 ? text.replace('-', '') : text);
}

/** One part of an impedance: plain digits from 1 mΩ to 1 MΩ, a prefix beyond. */
function ohms(value: number, digits: number): string {
  const size = Math.abs(value);
  if (size !== 0 && (size < 1e-3 || size >= 1e6)) {
    const { mantissa, prefix } = engineering(value, digits);
    return mantissa + prefix;
  }
  const exponent = Number(value.toExponential(digits - 1).split('e')[1]);
  return Number(value.toPrecision(digits)).toFixed(Math.max(0, digits - 1 - exponent));
}

/** "9.400 − j61.00 Ω"; a part below 1e-9 of the other is rounding and is written 0. */
export function formatImpedance(r: number, x: number, digits = 4): string {
  const floor = 1e-9 * Math.max(Math.abs(r), Math.abs(x));
  const re = Math.abs(r) < floor ? '0' : ohms(r, digits);
  const im = Math.abs(x) < floor ? '0' : ohms(Math.abs(x), digits);
  return `${sign(re)} ${x < 0 && im !== '0' ? '−' : '+'} j${im} Ω`;
}

/** Impedance as read, no trailing zeros: "9.4 − j61 Ω", "1.5 kΩ". */
export function formatImpedanceRead(r: number, x: number): string {
  if (x === 0) return formatRead(r, 'Ω');
  return `${sign(trim(ohms(r, 7)))} ${x < 0 ? '−' : '+'} j${trim(ohms(Math.abs(x), 7))} Ω`;
}

/** Drops trailing zeros of a decimal fraction, before a prefix too. */
const trim = (text: string): string => text.replace(/(\.\d*?)0+(?=\D*$)/u, '$1').replace(/\.(?=\D*$)/u, '');
