import type { Dossier } from '../../dossier.ts';
import { plain, text, type Block } from '../page/block.ts';
import { parts } from './parts.ts';
import { sentence } from './words.ts';

/** Safety before practice. */
export function cautions({ cautions: list }: Dossier): readonly Block[] {
  const heading: Block = { kind: 'heading', number: parts.cautions, text: 'Cautions' };
  if (list.length === 0) return [heading, text('None beyond the usual care with radio-frequency power.')];
  const ordered = [...list.filter(({ kind }) => kind === 'safety'), ...list.filter(({ kind }) => kind === 'practice')];
  return [
    heading,
    {
      kind: 'list',
      entries: ordered.map(({ kind, text: words }, k) => ({
        mark: `${String(parts.cautions)}.${String(k + 1)}`,
        paragraph:
          kind === 'safety'
            ? { spans: [{ text: 'Safety. ', bold: true }, { text: sentence(words) }] }
            : { spans: [{ text: sentence(words) }] },
      })),
    },
  ];
}

export function references({ references: list }: Dossier): readonly Block[] {
  return [
    { kind: 'heading', number: parts.references, text: 'Standards and literature applied' },
    {
      kind: 'table',
      columns: [
        { title: 'Reference', share: 58 },
        { title: 'Applied for', share: 42 },
      ],
      rows: merged(list).map(({ title, appliedFor }) => ({ cells: [[plain(title)], [plain(appliedFor)]] })),
    },
  ];
}

/** One row a title: what it was applied for more than once stands in one place. */
function merged(list: Dossier['references']): Dossier['references'] {
  const titles = [...new Set(list.map(({ title }) => title))];
  return titles.map((title) => ({
    title,
    appliedFor: list
      .filter((reference) => reference.title === title)
      .map(({ appliedFor }) => appliedFor)
      .join('; '),
  }));
}
