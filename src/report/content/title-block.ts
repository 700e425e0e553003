import type { Dossier } from '../../dossier.ts';
import { plain, type Block } from '../page/block.ts';
import { stateWords } from './state.ts';
import { orNotStated, titleOf } from './words.ts';

/** The data fields of a title block by ISO 7200, mandatory ones first. */
export function titleBlock({ record }: Dossier): readonly Block[] {
  const { identity, signOff } = record;
  return [
    { kind: 'text', paragraph: { spans: [{ text: titleOf(record), bold: true }], style: 'display' }, keep: true },
    {
      kind: 'facts',
      columns: 4,
      entries: [
        { name: 'Document number', value: orNotStated(identity.number) },
        { name: 'Revision', value: orNotStated(identity.revision) },
        { name: 'Document status', value: stateWords[signOff.state].name },
        { name: 'Date of issue', value: orNotStated(identity.date) },
        { name: 'Sheet', value: ({ sheets }) => `1 of ${String(sheets)}` },
        { name: 'Document type', value: 'Design report' },
        { name: 'Legal owner', value: orNotStated(identity.owner) },
        { name: 'Language', value: 'en' },
        { name: 'Change ticket', value: orNotStated(identity.ticket) },
        { name: 'Prepared by', value: orNotStated(signOff.prepared.name) },
        { name: 'Checked by', value: orNotStated(signOff.checked.name) },
        { name: 'Approved by', value: orNotStated(signOff.approved.name) },
      ],
    },
  ];
}

/** Said once where a name or a text holds letters that the typeface lacks. */
export const missingNote = (mark: string): Block => ({
  kind: 'text',
  paragraph: plain(
    `${mark} stands for a character that this report’s typeface does not hold; the record holds the text in full.`,
    'small',
  ),
});
