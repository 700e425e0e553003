import type { Change, Dossier } from '../../dossier.ts';
import { changeGroups } from '../../record/change.ts';
import { plain, text, type Block, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { orNotStated, sentence } from './words.ts';

/** Longer names of a revision stand in the text, not in a heading. */
const longest = 12;

/** What this revision has otherwise than the one before it: in what was asked, in what came out, and in the verdicts. */
export function changes({ record, difference }: Dossier): readonly Block[] {
  const { previous, history } = record;
  if (previous === null) {
    const why =
      history.length === 0
        ? 'None: this is the first revision.'
        : 'Not told: the record of the revision before is not with this one.';
    return [heading('the revision before'), text(why)];
  }
  const { revision, date } = previous.identity;
  const name =
    revision.trim() !== '' && revision.trim().length <= longest ? `revision ${revision.trim()}` : 'the revision before';
  if (difference === null) return [heading(name), text('Not told: they were not worked out.')];
  const before = history.at(-1);
  const digest = before === undefined ? '' : `, SHA-256 ${before.digest}`;
  const compared = `Before is revision ${orNotStated(revision)} of ${orNotStated(date)}${digest}, worked out anew by the same version of Ferrule as this one. Sign-off begins anew with each revision and is left out.`;
  const told = difference.filter(({ group }) => group !== 'sign-off');
  if (told.length === 0) return [heading(name), text(`${compared} Nothing changed.`)];
  return [
    heading(name),
    { ...text(compared), keep: true },
    {
      kind: 'table',
      columns: [
        { title: 'Subject', share: 16 },
        { title: 'What', share: 24 },
        { title: 'Before', share: 30 },
        { title: 'After', share: 30 },
      ],
      rows: changeGroups.flatMap((group) => rows(group, told)),
    },
  ];
}

const heading = (before: string): Block => ({
  kind: 'heading',
  number: parts.changes,
  text: `Changes from ${before}`,
});

const rows = (group: Change['group'], difference: readonly Change[]): readonly Row[] =>
  difference
    .filter((change) => change.group === group)
    .map(({ what, before, after }, k) => {
      const subject = sentence(group).slice(0, -1);
      return {
        cells: [
          [{ spans: [k === 0 ? { text: subject, bold: true } : { text: subject, tone: 'muted' }] }],
          [plain(what)],
          [plain(before)],
          [plain(after)],
        ],
      };
    });
