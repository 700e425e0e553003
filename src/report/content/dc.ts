import type { Dossier } from '../../dossier.ts';
import { text, type Block } from '../page/block.ts';
import { parts } from './parts.ts';
import { chosenOption, sentence } from './words.ts';

/** What DC meets at each end, what is required of it, and which parts may serve a bias feed or a block. */
export function dc({ options, chosen }: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.dc, text: 'DC' };
  const option = chosenOption(options, chosen);
  if (option === undefined) return [heading, text('Without a network there is no DC path.')];
  const required = option.checks.filter(({ subject }) => subject.startsWith('DC'));
  const { bias } = option.built ?? { bias: [] };
  return [
    heading,
    ...(bias.length === 0 ? [text(sentence(option.dc.words))] : []),
    ...required.map(({ verdict, reason }): Block => ({
      kind: 'text',
      paragraph: {
        spans: [{ text: verdict === 'meets' ? 'Meets: ' : 'Falls short: ', bold: true }, { text: sentence(reason) }],
      },
    })),
    ...bias.map((words) => text(sentence(words))),
  ];
}
