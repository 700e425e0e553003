import type { Dossier, Option } from '../../dossier.ts';
import { plain, text, type Block } from '../page/block.ts';
import { methodAsked, methodNames } from './methods.ts';
import { compactRow, optionColumns, optionRow } from './option-row.ts';
import { parts } from './parts.ts';
import { sectionsTable } from './sections.ts';

/** More options than these would bury the one that matters if each were drawn. */
const drawnAtMost = 12;

/** Every network that exists with its verdict, and every form that has none with the inequality that fails. */
export function options(dossier: Dossier): readonly Block[] {
  const { options: list, absent, sections, record, minimum } = dossier;
  const method: Block = text(`Method: ${methodAsked(record)}.`);
  return [
    { kind: 'heading', number: parts.options, text: 'Options considered' },
    { ...method, keep: true },
    { ...text(list.length === 0 ? countWords(dossier) : `${countWords(dossier)} ${minimum}`), keep: list.length > 0 },
    ...(sections === null ? [] : sectionsTable(sections)),
    ...(sections === null || list.length === 0 ? [] : [{ kind: 'heading', text: 'Networks' } as const]),
    ...(list.length === 0 ? [] : list.length <= drawnAtMost ? [table(list, dossier, optionRow)] : longList(dossier)),
    ...(absent.length === 0 ? [] : absentForms(absent)),
  ];
}

function countWords({ options: list, record }: Dossier): string {
  const all = list.length;
  const meeting = list.filter(({ meets }) => meets).length;
  const searched = record.method === 'fitted' || record.method === 'all';
  if (all === 0) return searched ? 'No network was found.' : 'No network exists.';
  if (all === 1) {
    return `One network ${searched ? 'was found' : 'exists'}; it ${meeting === 1 ? 'meets' : 'does not meet'} everything required.`;
  }
  const count = `${String(all)} networks ${searched ? 'were found' : 'exist'}`;
  if (meeting === 0) return `${count}; none meets everything required.`;
  if (meeting === all) return `${count}; ${all === 2 ? 'both' : 'all'} meet everything required.`;
  return `${count}; ${String(meeting)} ${meeting === 1 ? 'meets' : 'meet'} everything required.`;
}

const table = (list: readonly Option[], dossier: Dossier, row: typeof optionRow): Block => ({
  kind: 'table',
  columns: optionColumns(dossier.record),
  rows: list.map((option) => row(option, dossier)),
});

/** First what was chosen and what is proposed, drawn; then all by method, or by number of sections, in short. */
function longList(dossier: Dossier): readonly Block[] {
  const { options: list, chosen, proposed, record } = dossier;
  const first = list.filter(({ id }) => id === chosen || id === proposed);
  const title = (option: Option): string => (record.method === 'all' ? methodNames[option.method] : 'All networks');
  const groups = new Map<string, Option[]>();
  for (const option of list) {
    const group = groups.get(title(option));
    if (group === undefined) groups.set(title(option), [option]);
    else group.push(option);
  }
  return [
    ...(first.length === 0 ? [] : [table(first, dossier, optionRow)]),
    {
      ...text(
        'All networks follow in short, numbered in the order considered; the DC path and the cautions are told of those above alone.',
      ),
      keep: true,
    },
    ...[...groups].flatMap(([name, group]): readonly Block[] => [
      { kind: 'heading', text: name },
      table(group, dossier, compactRow),
    ]),
  ];
}

function absentForms(absent: Dossier['absent']): readonly Block[] {
  const reasons = [...new Set(absent.map(({ why }) => why))];
  return [
    { kind: 'heading', text: 'Forms without a network' },
    {
      kind: 'table',
      columns: [
        { title: 'Form', share: 40 },
        { title: 'What fails', share: 60 },
      ],
      // Forms that fail for one reason stand together.
      rows: reasons.map((reason) => ({
        cells: [
          absent.filter(({ why }) => why === reason).map(({ form }) => plain(form, 'small')),
          [plain(reason, 'small')],
        ],
      })),
    },
  ];
}
