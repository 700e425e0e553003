import type { Option, Response } from '../../dossier.ts';
import { formatFixed, formatQuantity, formatRead } from '../../quantity/format.ts';
import type { Span } from '../../quantity/span.ts';
import type { DesignRecord } from '../../record/design-record.ts';
import { log10 } from '../../quantity/elementary.ts';

/** What stands where nothing was given: an empty cell would look like a slip. */
export const notStated = 'not stated';

export const orNotStated = (text: string): string => (text.trim() === '' ? notStated : text);

/** Title of the document; a record may come without one. */
export const titleOf = ({ identity }: DesignRecord): string =>
  identity.title.trim() === '' ? 'Untitled matching network' : identity.title;

/** A span as it was asked for, no digit lost: "150.5 MHz to 152 MHz". */
export const spanRead = ({ low, high }: Span, unit: 'Hz' | 'H' | 'F'): string =>
  `${formatRead(low, unit)} to ${formatRead(high, unit)}`;

/** Attenuation at a harmonic in dB, with its sign. */
export const attenuation = (value: number | null): string =>
  value === null
    ? 'outside the data'
    : Math.abs(value) > 100
      ? `${value < 0 ? '< −' : '> '}100 dB`
      : `${formatFixed(value, 1)} dB`;

/** A number without a unit, to four digits: "0.03974", "6.501". */
export function ratio(value: number): string {
  const decimals = value >= 1e-4 && value < 1e6 ? Math.max(0, 3 - Math.floor(log10(value))) : null;
  return decimals === null ? powerOfTen(value) : formatFixed(value, decimals);
}

/** A small number in powers of ten: "3.1 × 10⁻¹⁵". */
export function powerOfTen(value: number): string {
  if (value === 0) return '0';
  const [mantissa = '0', exponent = '0'] = value.toExponential(1).split('e');
  const raised = String(Number(exponent)).replace(/./gu, (sign) => '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(sign)] ?? '⁻');
  return `${formatFixed(Number(mantissa), 1)} × 10${raised}`;
}

export const valueOf = ({ part, value }: Option['arms'][number]): string =>
  formatQuantity(value, part === 'inductor' ? 'H' : 'F');

/** "L1 140.2 nH, C1 22.60 pF"; words when there is no part. */
export const partsOf = ({ arms, designators }: Option): string =>
  arms.length === 0 ? 'no part' : arms.map((arm, k) => `${designators[k] ?? ''}\u00a0${valueOf(arm)}`).join(', ');

export const chosenOption = <O extends { readonly id: string }>(
  options: readonly O[],
  id: string | null,
): O | undefined => options.find((option) => option.id === id);

/** The frequencies that a requirement names, Hz, each with what it is. */
export const namedFrequencies = ({
  frequencyHz,
  bandHz,
}: Pick<DesignRecord['requirement'], 'frequencyHz' | 'bandHz'>): readonly (readonly [string, number])[] => [
  ...(bandHz === null ? [] : ([['Lower band edge', bandHz.low]] as const)),
  ['Design frequency', frequencyHz],
  ...(bandHz === null ? [] : ([['Upper band edge', bandHz.high]] as const)),
];

/** Index of a frequency among a response's samples; -1 when the sweep doesn't hold it. */
export const sampleAt = ({ frequencyHz }: Pick<Response, 'frequencyHz'>, hertz: number): number =>
  frequencyHz.findIndex((sample) => Math.abs(sample - hertz) <= 1e-9 * hertz);

export const sentence = (words: string): string => {
  const opened = words.charAt(0).toUpperCase() + words.slice(1);
  return /[.!?]$/u.test(opened) ? opened : `${opened}.`;
};

/** Reasons as one sentence, in the order in which they were assessed. */
export const reasonsOf = ({ reasons }: Option): string => sentence(reasons.join('; '));
