import type { Dossier, Option, SectionTable } from '../../dossier.ts';
import { returnLossWords } from '../../design/words.ts';
import { schematicThumbnail } from '../../figures/schematic-thumbnail.ts';
import { formatFixed } from '../../quantity/format.ts';
import { plain, text, type Block, type Paragraph, type Row } from '../page/block.ts';
import { attenuation, partsOf, reasonsOf, sentence } from './words.ts';

/** Every network that exists with its verdict, and every form that has none with the inequality that fails. */
export function options(dossier: Dossier): readonly Block[] {
  const { options: list, absent, sections } = dossier;
  const meeting = list.filter(({ meets }) => meets).length;
  return [
    { kind: 'heading', number: 4, text: 'Options considered' },
    ...(sections === null ? [] : sectionsTable(sections)),
    ...(sections === null ? [] : [{ kind: 'heading', text: 'Networks' } as const]),
    { ...text(countWords(list.length, meeting)), keep: list.length > 0 || absent.length > 0 },
    ...(list.length === 0 ? [] : [optionTable(dossier)]),
    ...(absent.length === 0 ? [] : absentForms(absent)),
  ];
}

function countWords(all: number, meeting: number): string {
  if (all === 0) return 'No network exists.';
  if (all === 1) return `One network exists; it ${meeting === 1 ? 'meets' : 'does not meet'} everything required.`;
  const count = `${String(all)} networks exist`;
  if (meeting === 0) return `${count}; none meets everything required.`;
  if (meeting === all) return `${count}; ${all === 2 ? 'both' : 'all'} meet everything required.`;
  return `${count}; ${String(meeting)} ${meeting === 1 ? 'meets' : 'meet'} everything required.`;
}

function optionTable({ options: list, chosen, proposed }: Dossier): Block {
  return {
    kind: 'table',
    columns: [
      { title: 'No.', share: 14 },
      { title: 'Network, source on the left', share: 172 },
      { title: 'Half-power band', share: 100 },
      { title: 'Worst return\u00a0loss', share: 50, align: 'end' },
      { title: 'Attenuation at\u00a02f₀', share: 50, align: 'end' },
      { title: 'Attenuation at\u00a03f₀', share: 50, align: 'end' },
    ],
    rows: list.map((option, k) => row(option, k + 1, option.id === chosen, option.id === proposed)),
  };
}

function row(option: Option, number: number, chosen: boolean, proposed: boolean): Row {
  const { title, arms, harmonicDb, worstReturnLossDb, halfPower, dc, meets, cautions } = option;
  const harmonic = (order: 2 | 3): string => {
    const found = harmonicDb.find((entry) => entry.order === order);
    return found === undefined ? '–' : attenuation(found.attenuationDb);
  };
  const standing = [chosen ? 'chosen' : '', proposed && !chosen ? 'proposed' : ''].filter((word) => word !== '');
  const below: Paragraph[] = [
    {
      spans: [
        {
          text: `${meets ? 'Meets' : 'Falls short'}${standing.length === 0 ? '' : ` (${standing.join(', ')})`}: `,
          bold: true,
        },
        { text: reasonsOf(option) },
      ],
      style: 'small',
    },
    plain(`DC: ${sentence(dc.words).replace(/^./u, (letter) => letter.toLowerCase())}`, 'small'),
    ...(cautions.length === 0
      ? []
      : [
          {
            spans: [{ text: `Cautions: ${cautions.map(sentence).join(' ')}`, tone: 'muted' }],
            style: 'small',
          } as const,
        ]),
  ];
  return {
    cells: [
      [plain(String(number), 'small')],
      [
        { spans: [{ text: title, bold: true }], style: 'small' },
        { kind: 'picture', figure: schematicThumbnail(arms), scale: 0.9 },
        plain(partsOf(option), 'small'),
      ],
      [plain(halfPower.words, 'small')],
      [plain(worstReturnLossDb === null ? 'no band' : returnLossWords(worstReturnLossDb), 'small')],
      [plain(harmonic(2), 'small')],
      [plain(harmonic(3), 'small')],
    ],
    below: { from: 2, paragraphs: below },
    marked: chosen,
  };
}

function absentForms(absent: Dossier['absent']): readonly Block[] {
  return [
    { kind: 'heading', text: 'Forms without a network' },
    {
      kind: 'table',
      columns: [
        { title: 'Form', share: 30 },
        { title: 'What fails', share: 70 },
      ],
      rows: absent.map(({ form, why }) => ({ cells: [[plain(form, 'small')], [plain(why, 'small')]] })),
    },
  ];
}

function sectionsTable({ rows, words }: SectionTable): readonly Block[] {
  return [
    { kind: 'heading', text: 'Number of sections' },
    { ...text(words), keep: true },
    {
      kind: 'table',
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
    },
  ];
}
