import { readFileSync, statSync } from 'node:fs';
import { basename } from 'node:path';
import { design } from '../design.ts';
import { InputError } from '../quantity/problem.ts';
import { mostBytes, readFile } from '../recheck/read-file.ts';
import { recheckText } from '../recheck/recheck-words.ts';
import { recheck, type Recheck } from '../recheck/recheck.ts';
import { flatRecheck } from './flat-recheck.ts';
import { fontOf } from './font.ts';
import { fromHere } from './read-arguments.ts';
import { run } from './run.ts';

const problem = (field: string, read: string, why: string, would: string): InputError =>
  new InputError({ field, read, why, would });

function readArguments(args: readonly string[]): { readonly file: string; readonly json: boolean } {
  const options = args.filter((each) => each.startsWith('-'));
  const files = args.filter((each) => !each.startsWith('-'));
  const unknown = options.find((option) => option !== '--json');
  if (unknown !== undefined)
    throw problem('command line', unknown, 'this option is unknown', 'give a file, and --json');
  const [file] = files;
  if (file === undefined || files.length > 1) {
    throw problem(
      'command line',
      files.join(' '),
      'one file is rechecked at a time',
      'give a report (PDF) or a record',
    );
  }
  return { file, json: options.length > 0 };
}

function bytesOf(file: string): Uint8Array {
  const path = fromHere(file);
  try {
    // What is too large is refused by its first bytes too many, and never read whole.
    return statSync(path).size > mostBytes ? new Uint8Array(mostBytes + 1) : new Uint8Array(readFileSync(path));
  } catch (error) {
    const code = (error as NodeJS.ErrnoException).code ?? 'unknown';
    const reasons: Partial<Record<string, string>> = { ENOENT: 'no such file', EISDIR: 'this is a folder' };
    throw problem('file', file, reasons[code] ?? `it can't be read (${code})`, 'give the path of a file');
  }
}

/** What a script asks: 0 the figures are the same, within rounding too, or a record alone computes; 1 they aren't. */
const codeOf = ({ verdict }: Recheck): number => (verdict === 'differs' ? 1 : 0);

/** A report or a record in; whether it says what its record gives today, as text or (`--json`) as JSON. */
await run(async (args) => {
  const { file, json } = readArguments(args);
  const found = await readFile(basename(file), bytesOf(file));
  const fonts = { regular: fontOf('regular'), bold: fontOf('bold') };
  const outcome = await recheck(found, design(found.record), fonts);
  process.exitCode = codeOf(outcome);
  return json ? `${JSON.stringify(flatRecheck(outcome), null, 1)}\n` : recheckText(outcome);
});
