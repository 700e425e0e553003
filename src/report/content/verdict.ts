import type { Dossier, Option } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { returnLossDb } from '../../network/figures-of-merit.ts';
import { formatFixed, formatImpedance, formatQuantity } from '../../quantity/format.ts';
import { plain, type Block } from '../page/block.ts';
import { allAccepted } from './deviations.ts';
import { boardBrief } from './finished-board.ts';
import { parts } from './parts.ts';
import { orderWords, percent, returnLossName, stressBrief, yieldBrief } from './real-words.ts';
import { chosenOption, partsOf, reasonsOf } from './words.ts';

/** The answer first: whether the chosen network meets what was asked, why, and its leading figures. */
export function verdict(dossier: Dossier): readonly Block[] {
  const option = chosenOption(dossier.options, dossier.chosen);
  if (option === undefined) {
    return bar('No network', [
      `No network of the kind asked for matches these terminations; the reasons follow in part ${String(parts.options)}.`,
    ]);
  }
  const proof =
    dossier.evidence?.pass === false
      ? [`Verification fails: see part ${String(parts.verification)} before using any figure.`]
      : [];
  const words = option.meets ? [reasonsOf(option)] : [reasonsOf(option), shortfall(dossier)];
  return [
    ...bar(option.meets ? 'Meets the requirement' : 'Falls short of the requirement', [
      `${option.title}: ${option.built === null ? partsOf(option) : orderWords(option.built)}.`,
      ...words,
      ...proof,
      ...[boardBrief(dossier)].filter((brief) => brief !== ''),
    ]),
    { kind: 'facts', columns: 4, entries: [...realFigures(dossier, option), ...figures(dossier, option)] },
  ];
}

function shortfall(dossier: Dossier): string {
  const { proposed, options, ceiling } = dossier;
  const other = chosenOption(options, proposed);
  const instead = other === undefined ? 'No option meets everything.' : `${other.title} would meet everything.`;
  const limit = ceiling?.verdict === 'out of reach' ? ` ${ceiling.words}` : '';
  const accepted = allAccepted(dossier)
    ? `Accepted in writing: see part ${String(parts.deviations)}.`
    : 'Issuing this document needs a written deviation.';
  return `${instead}${limit} ${accepted}`;
}

function bar(headline: string, words: readonly string[]): readonly Block[] {
  return [
    {
      kind: 'text',
      paragraph: { spans: [{ text: headline, bold: true }], style: 'lead' },
      bar: true,
      opens: true,
      keep: true,
    },
    ...words.map((text): Block => ({ kind: 'text', paragraph: plain(text), bar: true, keep: true })),
  ];
}

type Entry = { readonly name: string; readonly value: string };

/** What decides, first; the figures of exact values follow. */
function realFigures({ record }: Dossier, { built }: Option): readonly Entry[] {
  if (built === null) return [];
  const into = record.loads.length > 1 ? `, ${built.worstState}` : '';
  return [
    { name: `${returnLossName(record)}, real parts${into}`, value: returnLossWords(built.worstReturnLossDb) },
    { name: 'Yield (95 % interval)', value: yieldBrief(built) },
    { name: 'Loss, real parts', value: `${formatFixed(built.lossDb, 2)} dB, efficiency ${percent(built.efficiency)}` },
    { name: 'Stress', value: stressBrief(built) },
  ];
}

function figures({ record }: Dossier, option: Option): readonly Entry[] {
  const worst = option.worstReturnLossDb;
  const into = option.states.length > 1 ? `, ${option.worstState}` : '';
  const exact = record.build === null ? '' : ', exact values';
  const f0 = record.build === null ? formatQuantity(record.requirement.frequencyHz, 'Hz', 5) : 'f₀';
  return [
    {
      name:
        worst === null
          ? `Return loss at ${f0}${exact}${into}`
          : `Worst return loss${exact === '' ? ' in the band' : exact}${into}`,
      value: worst === null ? atDesignFrequency(option) : returnLossWords(worst),
    },
    { name: `Impedance seen at ${f0}${exact}${into}`, value: formatImpedance(option.seen.r, option.seen.x) },
    { name: `Transducer gain at ${f0}${exact}${into}`, value: formatFixed(option.transducerGain, 6) },
    { name: `Half-power band${exact}${into}`, value: option.halfPower.words },
  ];
}

const atDesignFrequency = ({ reflection }: Option): string => returnLossWords(returnLossDb(reflection ** 2));
