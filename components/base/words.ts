import type { Built, BuiltPart, Option } from '../../src/dossier.ts';
import type { Arm } from '../../src/network/arm.ts';
import { formatFixed, formatQuantity, formatRead } from '../../src/quantity/format.ts';

/** "17.2 dB"; figures stop at 200 dB, and say so. */
export const decibels = (value: number, decimals = 1): string =>
  value >= 200 ? '200 dB or more' : `${formatFixed(value, decimals)} dB`;

/** "140.2 nH" */
export const partValue = ({ part, value }: Arm): string => formatQuantity(value, part === 'inductor' ? 'H' : 'F');

/** "L1 140.2 nH", one for every part, source side first. */
export const partWords = ({ arms, designators }: Option): readonly string[] =>
  arms.map((arm, index) => `${designators[index] ?? ''} ${partValue(arm)}`);

/** A value as it is to be ordered: "82 nH"; one that isn't of a series or a list, with as many digits as a drawing needs. */
export const orderedValue = ({ part, value, from }: BuiltPart): string => {
  const unit = part === 'inductor' ? 'H' : 'F';
  return from === 'exact' || from === 'wound' ? formatQuantity(value, unit) : formatRead(value, unit);
};

/** "L1 82 nH", one for every part to order, source side first. */
export const builtPartWords = ({ parts }: Built): readonly string[] =>
  parts.map((part) => `${part.designator} ${orderedValue(part)}`);

/** "12.3 dB, 21.0 dB": attenuation at the harmonics, where the data reach so far. */
export function harmonics({ harmonicDb }: Option): string {
  const words = harmonicDb.map(({ attenuationDb }) => (attenuationDb === null ? null : decibels(attenuationDb)));
  return words.every((each) => each === null)
    ? 'outside the data'
    : words.map((each) => each ?? 'outside the data').join(', ');
}

/** Why a network has no loaded Q. */
export const withoutLoadedQ = ({ arms }: Option): string =>
  arms.length === 0 ? 'none: no part is needed' : 'not defined for this network';

/** A number stays with its unit at the end of a line. */
export const unbroken = (text: string): string =>
  text.replace(/(\d) (?=(?:[GMkmµnp]?(?:Hz|Ω|H|F|W|V)|dB|%)(?![\p{L}\p{N}]))/gu, '$1\u00a0');

/** "2 parts" */
export const count = (number: number, noun: string): string => `${String(number)} ${noun}${number === 1 ? '' : 's'}`;

/** Largest voltage of a network's parts, and whether anything is over its rating; null: no power is stated. */
export function stressWords({ stress }: Built): string | null {
  if (stress === null || stress.parts.length === 0) return null;
  const volts = Math.max(...stress.parts.map(({ voltsPeak, mismatched }) => mismatched?.voltsPeak ?? voltsPeak));
  return `${formatQuantity(volts, 'V', 3)} peak${stress.within === false ? ', over a rating' : ''}`;
}
