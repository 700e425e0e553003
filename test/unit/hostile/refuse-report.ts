import { readFileSync } from 'node:fs';
import { formatProblem, InputError } from '../../../src/quantity/problem.ts';
import { readFile } from '../../../src/recheck/read-file.ts';

/** What became of one hostile report. */
export interface ReportRefusal {
  /** One line a problem; null: it was taken. */
  readonly lines: readonly string[] | null;
  /** What was thrown, where it wasn't a refusal. */
  readonly thrown: string;
  /** Time that the process itself took. */
  readonly milliseconds: number;
  /** Most memory that the process has had so far, MB. */
  readonly megabytes: number;
}

async function refuse(path: string): Promise<ReportRefusal> {
  const start = process.cpuUsage();
  let lines: readonly string[] | null = null;
  let thrown = '';
  try {
    await readFile('report.pdf', new Uint8Array(readFileSync(path)));
  } catch (error) {
    if (error instanceof InputError) lines = error.problems.map(formatProblem);
    else thrown = String(error);
  }
  const { user, system } = process.cpuUsage(start);
  return { lines, thrown, milliseconds: (user + system) / 1000, megabytes: process.resourceUsage().maxRSS / 1024 };
}

// A process of its own, so that what it takes of memory can be told, outside of the heap too.
process.on('message', (path: string) => void refuse(path).then((refusal) => process.send!(refusal)));
