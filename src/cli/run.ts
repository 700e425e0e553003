import { formatProblem, InputError } from '../quantity/problem.ts';

/** Runs a command: exit 0 when computed; 2 for bad input, with one line on standard error. */
export async function run(command: (args: readonly string[]) => string | Promise<string>): Promise<void> {
  // Whoever reads only the head of a long answer has what was wanted.
  process.stdout.on('error', (error: NodeJS.ErrnoException) => {
    if (error.code !== 'EPIPE') throw error;
    process.exit(0);
  });
  try {
    process.stdout.write(await command(process.argv.slice(2)));
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const [first, ...more] = error.problems;
    const rest = more.length === 0 ? '' : ` (and ${String(more.length)} more)`;
    process.stderr.write(`${first === undefined ? error.message : formatProblem(first)}${rest}\n`);
    process.exitCode = 2;
  }
}
