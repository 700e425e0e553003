import type { Dossier } from '../../dossier.ts';
import { plain, type Block, type Row } from '../page/block.ts';
import { changeWords } from './contents.ts';
import { parts } from './parts.ts';
import { notStated, orNotStated, sentence } from './words.ts';

/** Every revision with what it changed, the oldest first and this one last. */
export function history({ record, digest }: Dossier): readonly Block[] {
  const { identity } = record;
  return [
    { kind: 'heading', number: parts.history, text: 'Revision history' },
    {
      kind: 'table',
      columns: [
        { title: 'Revision', share: 16 },
        { title: 'Date', share: 14 },
        { title: 'What it changed, and why', share: 70 },
      ],
      rows: [
        ...record.history.map((earlier, k) =>
          row(orNotStated(earlier.revision), earlier.date, earlierChange(earlier.change, k), earlier.digest),
        ),
        row(`${orNotStated(identity.revision)}, this one`, identity.date, changeWords(record), digest),
      ],
      // A sheet with nothing but signatures on it could be put under any other report.
      together: true,
    },
  ];
}

const earlierChange = (change: string, index: number): string =>
  change.trim() !== '' ? sentence(change.trim()) : index === 0 ? 'The first of this document.' : sentence(notStated);

const row = (revision: string, date: string, change: string, digest: string): Row => ({
  cells: [[{ spans: [{ text: revision, bold: true }] }], [plain(orNotStated(date))], [plain(change)]],
  below: { from: 1, paragraphs: [plain(`SHA-256 of its record ${digest}`, 'small')] },
});
