import type { Dossier, Option } from '../../dossier.ts';
import { schematic } from '../../figures/schematic.ts';
import { formatImpedance, formatQuantity } from '../../quantity/format.ts';
import { loadLabel, terminationLabel } from '../../record/read-termination.ts';
import { drawnArms } from '../../design/drawn-arms.ts';
import { plain, text, type Block } from '../page/block.ts';
import { order } from './order.ts';
import { parts } from './parts.ts';
import { whyNotBuilt } from './real-words.ts';
import { chosenOption, sentence, valueOf } from './words.ts';

/** The chosen network: who chose it and why, its schematic, and the parts to order. */
export function network(dossier: Dossier): readonly Block[] {
  const option = chosenOption(dossier.options, dossier.chosen);
  const heading: Block = { kind: 'heading', number: parts.network, text: 'Chosen network' };
  if (option === undefined) return [heading, text('There is no network to choose.')];
  const { source, loads, requirement, build } = dossier.record;
  const { built } = option;
  const ordered = built !== null && built.parts.length > 0;
  const f0 = formatQuantity(requirement.frequencyHz, 'Hz', 5);
  return [
    heading,
    { kind: 'text', paragraph: { spans: [{ text: sentence(option.title), bold: true }] }, keep: true },
    { ...text(why(dossier)), keep: true },
    {
      kind: 'picture',
      figure: schematic(drawnArms(option), option.designators, terminationLabel(source), loadLabel(loads)),
      caption: `Figure 1. Chosen network${ordered ? ', values as ordered; with exact values,' : ';'} at ${f0} the source sees ${formatImpedance(option.seen.r, option.seen.x)}${loads.length > 1 ? ` with the load ${option.worstState}, the state that governs${ordered ? ' them' : ''}` : ''}.`,
      scale: 1,
    },
    ...(built === null || build === null ? exactParts(dossier, option) : order(dossier, option, built, build)),
  ];
}

function exactParts(dossier: Dossier, option: Option): readonly Block[] {
  return [
    { kind: 'heading', text: 'Parts' },
    ...(option.arms.length === 0
      ? [text('None: the terminations are connected directly.')]
      : [{ ...text(`Exact values: ${whyNotBuilt(dossier)}.`), keep: true }, partsList(option)]),
  ];
}

function why({ chosenBy, record, options }: Dossier): string {
  if (chosenBy === 'proposal') {
    return `Proposed: the first of ${String(options.length)} in the order considered that meets everything required.${note(record.selection.reason)}`;
  }
  if (chosenBy === 'nearest') {
    return `No option meets everything required; this one comes nearest. Part ${String(parts.deviations)} tells what it misses.${note(record.selection.reason)}`;
  }
  const by = record.signOff.prepared.name.trim();
  const who = by === '' ? 'Chosen by the engineer' : `Chosen by the engineer (prepared by ${by})`;
  const reason = record.selection.reason.trim();
  return `${who}. ${reason === '' ? 'No reason was written down.' : `Reason given: “${reason}”`}`;
}

const note = (reason: string): string => (reason.trim() === '' ? '' : ` Note by the engineer: “${reason.trim()}”`);

function partsList({ arms, designators }: Option): Block {
  return {
    kind: 'table',
    columns: [
      { title: 'Designator', share: 20 },
      { title: 'Kind', share: 24 },
      { title: 'Arm, from the source', share: 32 },
      { title: 'Value', share: 24, align: 'end' },
    ],
    rows: arms.map((arm, k) => ({
      cells: [
        [{ spans: [{ text: designators[k] ?? '', bold: true }] }],
        [plain(arm.part)],
        [plain(`${String(k + 1)}, ${arm.arm}`)],
        [plain(valueOf(arm))],
      ],
    })),
  };
}
