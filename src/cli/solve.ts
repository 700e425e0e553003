import { chosenTwoPort, sweepCsv } from '../design/exports.ts';
import { ticketMarkdown, ticketText } from '../design/ticket.ts';
import { design } from '../design.ts';
import type { Dossier } from '../dossier.ts';
import { InputError } from '../quantity/problem.ts';
import { flatOptions } from './flat-options.ts';
import { readArguments } from './read-arguments.ts';
import { run } from './run.ts';
import { boardOptions, withBoard } from './with-board.ts';
import { writeFile } from './write-file.ts';

/** What else is written, by the option that names its file; null: there is nothing to write. */
const files: Readonly<Record<'s2p' | 'csv', (dossier: Dossier) => string | null>> = {
  s2p: chosenTwoPort,
  csv: sweepCsv,
};

/**
 * Two terminations, or a record, in; the dossier as JSON on standard output. `--s2p FILE` and `--csv FILE` write the
 * chosen network and its sweep too. `--ticket` prints a summary for a change ticket instead, `--ticket-markdown` the same
 * in Markdown.
 */
await run((args) => {
  const { record, options } = readArguments(args, ['s2p', 'csv', 'ticket-text', 'ticket-markdown', ...boardOptions]);
  const dossier = design(withBoard(record, options));
  for (const option of ['s2p', 'csv'] as const) {
    const file = options[option];
    if (file === undefined) continue;
    const text = files[option](dossier);
    if (text === null) {
      throw new InputError({
        field: `--${option}`,
        read: file,
        why: 'no network was found',
        would: 'change what is asked',
      });
    }
    writeFile(`--${option}`, file, text);
  }
  if (options['ticket-markdown'] !== undefined) return ticketMarkdown(dossier);
  if (options['ticket-text'] !== undefined) return ticketText(dossier);
  return `${JSON.stringify(flatOptions(dossier), null, 1)}\n`;
});
