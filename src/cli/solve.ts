import { design } from '../design.ts';
import { readArguments } from './read-arguments.ts';
import { run } from './run.ts';

/** Two terminations, or a record, in; the dossier as JSON on standard output. */
await run((args) => `${JSON.stringify(design(readArguments(args).record), null, 1)}\n`);
