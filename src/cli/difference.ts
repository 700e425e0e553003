import { differenceMarkdown, differenceText } from '../design/difference-text.ts';
import { dossierDifference } from '../design/dossier-difference.ts';
import { design } from '../design.ts';
import { InputError } from '../quantity/problem.ts';
import { recordDifference } from '../record/difference.ts';
import { readRecord } from '../record/read-record.ts';
import { readTextFile } from './read-arguments.ts';
import { run } from './run.ts';

/** Two records in, the earlier one first; what is otherwise in the later one out, as text or with `--markdown`. */
await run((args) => {
  const files = args.filter((arg) => arg !== '--markdown');
  const [earlier, later] = files;
  if (earlier === undefined || later === undefined || files.length > 2) {
    throw new InputError({
      field: 'command line',
      read: files.join(' '),
      why: 'two records are compared',
      would: 'give the file of the earlier one, then that of the later one',
    });
  }
  const [before, after] = [readRecord(readTextFile(earlier)), readRecord(readTextFile(later))];
  const changes = [...recordDifference(before, after), ...dossierDifference(design(before), design(after))];
  return args.includes('--markdown') ? differenceMarkdown(changes) : differenceText(changes);
});
