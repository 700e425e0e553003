import type { Dossier } from '../../dossier.ts';
import type { Signature } from '../../record/design-record.ts';
import { plain, text, type Block, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { orNotStated, sentence } from './words.ts';

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
      // A sheet with nothing but signatures on it could be put under any other report.
      together: true,
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

/** Name, role, date and room for a hand-written signature. */
export function signOff({ record }: Dossier): readonly Block[] {
  const row = (duty: string, { name, role, date }: Signature): Row => ({
    cells: [
      [{ spans: [{ text: duty, bold: true }] }],
      [plain(name.trim())],
      [plain(role.trim())],
      [plain(date.trim())],
      [],
    ],
  });
  const { prepared, checked, approved } = record.signOff;
  return [
    { kind: 'heading', number: parts.signOff, text: 'Sign-off' },
    {
      ...text(
        `Revision ${orNotStated(record.identity.revision)}. The digest at the foot of every page is the SHA-256 (FIPS 180-4) of this design’s record in RFC 8785 form, its sign-off left out: the same inputs and decisions give the same digest.`,
      ),
      keep: true,
    },
    {
      kind: 'table',
      columns: [
        { title: 'Duty', share: 14 },
        { title: 'Name', share: 24 },
        { title: 'Role', share: 20 },
        { title: 'Date', share: 14 },
        { title: 'Signature', share: 28 },
      ],
      rows: [row('Prepared', prepared), row('Checked', checked), row('Approved', approved)],
      rowHeight: 34,
    },
  ];
}
