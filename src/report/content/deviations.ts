import type { Check, Dossier } from '../../dossier.ts';
import { plain, text, type Block } from '../page/block.ts';
import { parts } from './parts.ts';
import { chosenOption, notStated, orNotStated, sentence } from './words.ts';

/** Requirements that the chosen network does not meet, and why that is accepted. */
export function deviations(dossier: Dossier): readonly Block[] {
  const { record, options, chosen } = dossier;
  const checks = chosenOption(options, chosen)?.checks ?? [];
  const unmet = checks.filter(({ verdict }) => verdict === 'falls short');
  const accepted = record.deviations;
  const heading: Block = { kind: 'heading', number: parts.deviations, text: 'Deviations' };
  const subjects = [
    ...unmet.map(({ subject }) => subject),
    ...accepted.map(({ subject }) => subject).filter((subject) => !unmet.some((check) => check.subject === subject)),
  ];
  if (subjects.length === 0) return [heading, text('None.')];
  return [
    heading,
    {
      kind: 'table',
      columns: [
        { title: 'Requirement', share: 20 },
        { title: 'How it is missed', share: 40 },
        { title: 'Why that is accepted', share: 40 },
      ],
      rows: subjects.map((subject) => {
        const written = accepted.filter((deviation) => deviation.subject === subject);
        return {
          cells: [
            [{ spans: [{ text: sentence(subject).slice(0, -1), bold: true }] }],
            [plain(missed(unmet.find((check) => check.subject === subject)))],
            written.length === 0
              ? [{ spans: [{ text: `${sentence(notStated)} Issuing needs it in writing.`, bold: true }] }]
              : written.map(({ reason }) => plain(orNotStated(reason))),
          ],
        };
      }),
    },
  ];
}

const missed = (check: Check | undefined): string =>
  check === undefined ? 'It is met as computed here.' : sentence(check.reason);

/** Whether each requirement that the chosen network falls short of is accepted in writing. */
export const allAccepted = ({ record, options, chosen }: Dossier): boolean =>
  (chosenOption(options, chosen)?.checks ?? []).every(
    ({ subject, verdict }) =>
      verdict === 'meets' ||
      record.deviations.some((deviation) => deviation.subject === subject && deviation.reason.trim() !== ''),
  );
