import type { Attachment } from '../attachments.ts';
import { plain, text, type Block } from '../page/block.ts';
import { parts } from './parts.ts';

/** The files that travel in the report. */
export const files = (attached: readonly Attachment[]): readonly Block[] => [
  { kind: 'heading', number: parts.files, text: 'Attached files' },
  {
    ...text('They are inside this PDF file. The record alone reproduces the design; the others spare the work.'),
    keep: true,
  },
  {
    kind: 'table',
    columns: [
      { title: 'File', share: 30 },
      { title: 'What it holds', share: 70 },
    ],
    rows: attached.map(({ name, description }) => ({ cells: [[plain(name)], [plain(description)]] })),
  },
];
