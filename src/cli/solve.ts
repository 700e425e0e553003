import { chosenTwoPort, sweepCsv } from '../design/exports.ts';
import { design } from '../design.ts';
import { InputError } from '../quantity/problem.ts';
import { flatOptions } from './flat-options.ts';
import { readArguments } from './read-arguments.ts';
import { run } from './run.ts';
import { writeFile } from './write-file.ts';

/**
 * Two terminations, or a record, in; the dossier as JSON on standard output. `--s2p FILE` and `--csv FILE` write the
 * chosen network and its sweep too.
 */
await run((args) => {
  const { record, options } = readArguments(args, ['s2p', 'csv']);
  const dossier = design(record);
  for (const [option, content] of [
    ['s2p', chosenTwoPort],
    ['csv', sweepCsv],
  ] as const) {
    const file = options[option];
    if (file === undefined) continue;
    const text = content(dossier);
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
  return `${JSON.stringify(flatOptions(dossier), null, 1)}\n`;
});
