import { lacksForIssue } from '../../design/issuing.ts';
import type { Dossier } from '../../dossier.ts';
import type { Signature } from '../../record/design-record.ts';
import { plain, text, type Block, type Row } from '../page/block.ts';
import { parts } from './parts.ts';
import { stateWords } from './state.ts';
import { orNotStated, sentence } from './words.ts';

/** Room for a signature by hand, pt. */
const room = 29;

/** Name, role, date and remark of whoever signs, and room for the signature, by hand or by a program. */
export function signOff(dossier: Dossier): readonly Block[] {
  const { record } = dossier;
  const { prepared, checked, approved, state } = record.signOff;
  return [
    { kind: 'heading', number: parts.signOff, text: 'Sign-off' },
    {
      ...text(
        `Revision ${orNotStated(record.identity.revision)}. ${stateWords[state].says} The digest at the foot of every page is the SHA-256 (FIPS 180-4) of this design’s record in RFC 8785 form, its sign-off left out: the same inputs and decisions give the same digest.`,
      ),
      keep: true,
    },
    ...lacking(dossier),
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
    },
  ];
}

/** What is still to be done before it can be issued; a draft isn't asked. */
function lacking(dossier: Dossier): readonly Block[] {
  const { state } = dossier.record.signOff;
  const lacks = state === 'draft' ? [] : lacksForIssue(dossier);
  if (lacks.length === 0) return [];
  return [
    { kind: 'heading', text: 'What lacks before issue' },
    ...(state === 'issued' ? [{ ...text('It is marked as issued all the same.'), keep: true }] : []),
    { kind: 'list', entries: lacks.map((words) => ({ mark: '–', paragraph: plain(sentence(words)) })) },
    { kind: 'heading', text: 'Signatures' },
  ];
}

function row(duty: string, { name, role, date, remark }: Signature): Row {
  const by = name.trim() === '' ? '' : ` by ${name.trim()}`;
  return {
    cells: [
      [{ spans: [{ text: duty, bold: true }] }],
      [plain(name.trim())],
      [plain(role.trim())],
      [plain(date.trim())],
      [{ kind: 'signature', name: duty.toLowerCase(), label: `Signature, ${duty.toLowerCase()}${by}`, height: room }],
    ],
    ...(remark.trim() === '' ? {} : { below: { from: 1, paragraphs: [plain(`Remark: ${remark.trim()}`)] } }),
  };
}
