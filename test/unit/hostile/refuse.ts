import { parentPort } from 'node:worker_threads';
import { measuredTermination } from '../../../src/measured/measured-termination.ts';
import { readStockList } from '../../../src/parts/read-stock-list.ts';
import { formatProblem, InputError } from '../../../src/quantity/problem.ts';
import { readRecord } from '../../../src/record/read-record.ts';
import { hostileFiles } from './files.ts';

/** What became of a hostile file. */
export interface Refusal {
  /** One line a problem; null: it was taken. */
  readonly lines: readonly string[] | null;
  /** What was thrown, where it wasn't a refusal. */
  readonly thrown: string;
  /** Time that the thread itself took. */
  readonly milliseconds: number;
  /** Something was smuggled into what every object inherits. */
  readonly polluted: boolean;
}

function read(name: string, text: string): void {
  if (name.endsWith('.csv')) readStockList(text, name);
  else if (name.endsWith('.json')) readRecord(text);
  else measuredTermination(text, name.endsWith('.txt') ? 'table' : name);
}

function refuse(name: string, text: string): Refusal {
  const start = process.threadCpuUsage();
  let lines: readonly string[] | null = null;
  let thrown = '';
  try {
    read(name, text);
  } catch (error) {
    if (error instanceof InputError) lines = error.problems.map(formatProblem);
    else thrown = String(error);
  }
  const { user, system } = process.threadCpuUsage(start);
  return { lines, thrown, milliseconds: (user + system) / 1000, polluted: 'polluted' in {} };
}

// A worker of its own, so that what it may take of memory can be held to a limit.
parentPort?.on('message', (index: number) => {
  const { name, text } = hostileFiles[index]!;
  parentPort!.postMessage(refuse(name, text()));
});
