import { design } from '../design.ts';
import { InputError } from '../quantity/problem.ts';
import { report } from '../report/report.ts';
import { fontOf } from './font.ts';
import { readArguments } from './read-arguments.ts';
import { run } from './run.ts';
import { boardOptions, withBoard } from './with-board.ts';
import { writeFile } from './write-file.ts';

function paperOf(name: string): 'a4' | 'letter' {
  const paper = name.trim().toLowerCase();
  if (paper === 'a4' || paper === 'letter') return paper;
  throw problem('--paper', name, 'no such paper', 'give a4 or letter');
}

const problem = (field: string, read: string, why: string, would: string): InputError =>
  new InputError({ field, read, why, would });

/** Two terminations, or a record, in; the design report as a PDF file at --out. */
// Last in the file: it runs at once, and by then what it calls is defined.
await run(async (args) => {
  const { record, options } = readArguments(args, ['out', 'paper', ...boardOptions]);
  const { out } = options;
  if (out === undefined || out === '') {
    throw problem('--out', '', 'no file is named to write the report to', 'give one, as in --out report.pdf');
  }
  const paper = paperOf(options.paper ?? 'a4');
  const fonts = { regular: fontOf('regular'), bold: fontOf('bold') };
  writeFile('--out', out, await report(design(withBoard(record, options)), { paper, fonts }));
  return `Wrote ${out}\n`;
});
