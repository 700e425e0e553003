import type { Built, BuiltPart, Dossier, StressFigures } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { formatFixed, formatQuantity, formatRead } from '../../quantity/format.ts';
import type { DesignRecord } from '../../record/design-record.ts';
import { chosenOption } from './words.ts';

/** With real parts, of the network that the report is about; null where there is nothing of the kind. */
export const chosenBuilt = ({ options, chosen }: Dossier): Built | null => chosenOption(options, chosen)?.built ?? null;

/** Why the chosen network has no figures of real parts. */
export function whyNotBuilt({ record, chosen }: Dossier): string {
  if (chosen === null) return 'there is no network';
  return record.build === null ? 'real parts were not asked for' : 'real parts were not worked out';
}

/** A value as it is ordered: one on sale is written as its maker does. */
export const orderedValue = ({ part, value, from }: BuiltPart): string => {
  const unit = part === 'inductor' ? 'H' : 'F';
  return from === 'exact' || from === 'wound' ? formatQuantity(value, unit) : formatRead(value, unit);
};

/** "C1 8.2 pF, L1 47 nH" */
export const orderWords = ({ parts }: Built): string =>
  parts.length === 0 ? 'no part' : parts.map((part) => `${part.designator}\u00a0${orderedValue(part)}`).join(', ');

/** "93.2 %"; what isn't all or nothing is never written so. */
export function percent(fraction: number): string {
  const rounded = Math.round(fraction * 1000) / 10;
  const kept = fraction < 1 && rounded === 100 ? 99.9 : fraction > 0 && rounded === 0 ? 0.1 : rounded;
  return `${formatFixed(kept, 1)} %`;
}

/** "70.6 % (67.7 to 73.4 %)": what was found, and where it lies with the confidence stated. */
export function yieldBrief({ yield: found }: Built): string {
  if (found === null) return 'not assessed: no return loss required';
  return `${percent(found.value)} (${percent(found.low).replace(' %', '')} to ${percent(found.high)})`;
}

/** What the worst return loss is the worst of. */
export const returnLossName = ({ requirement }: DesignRecord): string =>
  requirement.bandHz === null ? 'Return loss at f₀' : 'Worst return\u00a0loss';

/** "18.26 dB at 152.00 MHz, in hand" */
export function worstWords(db: number, atHz: number, state: string): string {
  return `${returnLossWords(db)} at ${formatQuantity(atHz, 'Hz', 5)}${state === '' ? '' : `, ${state}`}`;
}

export const volts = (value: number): string => formatQuantity(value, 'V', 3);
export const amps = (value: number): string => formatQuantity(value, 'A', 3);
export const watts = (value: number): string => formatQuantity(value, 'W', 3);

/** The most of each figure and the part that has it, mismatched where that is assessed; null without a part or power. */
export function mostStressed({ stress }: Built): string | null {
  if (stress === null || stress.parts.length === 0) return null;
  const most = (figure: keyof StressFigures): { readonly designator: string; readonly value: number } =>
    stress.parts
      .map(({ designator, mismatched, ...nominal }) => ({ designator, value: (mismatched ?? nominal)[figure] }))
      .reduce((a, b) => (b.value > a.value ? b : a));
  const [v, a, w] = [most('voltsPeak'), most('ampsRms'), most('watts')];
  const load = stress.vswr === null ? '' : `, load up to VSWR ${String(stress.vswr)}`;
  return `${volts(v.value)} peak across ${v.designator}, ${amps(a.value)} RMS through ${a.designator}, ${watts(w.value)} of heat in ${w.designator}${load}`;
}

/** The stress in a few words, for whoever reads no further. */
export function stressBrief({ stress }: Built): string {
  if (stress === null) return 'not assessed: no power stated';
  if (stress.parts.length === 0) return 'none: no part';
  const { first, within } = stress;
  if (first === null) {
    const most = stress.parts
      .map(({ designator, voltsPeak, mismatched }) => ({ designator, peak: mismatched?.voltsPeak ?? voltsPeak }))
      .reduce((a, b) => (b.peak > a.peak ? b : a));
    return `${volts(most.peak)} peak across ${most.designator}; no rating known`;
  }
  return `${within === true ? 'within ratings' : 'over a rating'}: ${first.designator} fails first, at ${watts(first.powerW)}`;
}
