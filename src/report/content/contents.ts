import type { Dossier } from '../../dossier.ts';
import type { Block, Heading } from '../page/block.ts';
import { parts as numbers } from './parts.ts';
import { sentence } from './words.ts';

/** What this revision changes, and where its parts are. */
export function contents({ record }: Dossier, parts: readonly Block[]): readonly Block[] {
  const entries = parts
    .filter((block): block is Heading & { readonly number: number } => block.kind === 'heading' && 'number' in block)
    .map(({ number, text }) => ({ number, text }));
  return [
    {
      kind: 'text',
      paragraph: {
        spans: [{ text: 'Contents of this revision. ', bold: true }, { text: changeWords(record) + whereTold(record) }],
      },
      opens: true,
      keep: true,
    },
    { kind: 'contents', columns: 3, entries },
  ];
}

const whereTold = ({ previous }: Dossier['record']): string =>
  previous === null ? '' : ` Part ${String(numbers.changes)} tells each change.`;

/** What a revision changes, in the engineer's words; what stands for them where there are none. */
export function changeWords({ identity, history }: Dossier['record']): string {
  if (identity.change.trim() !== '') return sentence(identity.change.trim());
  return history.length === 0 ? 'The first of this document.' : 'What it changes is not stated.';
}
