import type { SectionTable } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { formatFixed } from '../../quantity/format.ts';
import { plain, text, type Block } from '../page/block.ts';

/** Every number of sections in every form against the return loss to hold. */
export function sectionsTable({ rows, words }: SectionTable): readonly Block[] {
  return [
    { kind: 'heading', text: 'Number of sections' },
    { ...text(words), keep: rows.length > 0 },
    ...(rows.length === 0
      ? []
      : [
          {
            kind: 'table' as const,
            columns: [
              { title: 'Sections', share: 34, align: 'end' },
              { title: 'Parts', share: 22, align: 'end' },
              { title: 'Form', share: 38 },
              { title: 'Shunt arm\u00a0at', share: 38 },
              { title: 'Q of a\u00a0section', share: 34, align: 'end' },
              { title: 'Worst return\u00a0loss', share: 46, align: 'end' },
              { title: 'Holds', share: 24 },
              { title: 'Half-power band', share: 166 },
            ],
            rows: rows.map(({ sections, parts, form, shuntAt, sectionQ, worstReturnLossDb, holds, halfPower }) => ({
              cells: [
                [plain(String(sections), 'small')],
                [plain(String(parts), 'small')],
                [plain(form, 'small')],
                [plain(shuntAt, 'small')],
                [plain(formatFixed(sectionQ, 3), 'small')],
                [plain(worstReturnLossDb === null ? 'no band' : returnLossWords(worstReturnLossDb), 'small')],
                [plain(holds === null ? '–' : holds ? 'yes' : 'no', 'small')],
                [plain(halfPower.words, 'small')],
              ],
            })),
          } satisfies Block,
        ]),
  ];
}
