import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The project's folder, whatever folder a command was typed in. */
export const root = fileURLToPath(new URL('../..', import.meta.url));

/** Where the built site goes. */
export const site = join(root, 'dist');

export interface Ran {
  readonly ok: boolean;
  /** Both streams as they came. */
  readonly output: string;
}

const longestMinutes = 15;

/** Runs a program in the project's folder, quietly; one that doesn't come to an end is stopped. */
export function run(
  command: string,
  args: readonly string[],
  env: Readonly<Record<string, string>> = {},
): Promise<Ran> {
  return new Promise((done) => {
    const child = spawn(command, args, {
      cwd: root,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
      timeout: longestMinutes * 60_000,
    });
    const chunks: Buffer[] = [];
    child.stdout.on('data', (chunk: Buffer) => chunks.push(chunk));
    child.stderr.on('data', (chunk: Buffer) => chunks.push(chunk));
    child.on('error', (error) => done({ ok: false, output: error.message }));
    child.on('close', (code, signal) => {
      const end = signal === null ? '' : `\nstopped by ${signal}, after ${longestMinutes} minutes or from outside`;
      done({ ok: code === 0, output: `${Buffer.concat(chunks).toString()}${end}` });
    });
  });
}

/** Runs a file of the project, or the program that an installed package brings, on the Node that runs this one. */
export const runNode = (file: string, args: readonly string[] = [], env?: Readonly<Record<string, string>>) =>
  run(process.execPath, [file, ...args], env);

/** Path of a package's program: `programOf('typescript', 'tsc')`. */
export function programOf(name: string, program = name): string {
  const folder = join(root, 'node_modules', name);
  const { bin } = JSON.parse(readFileSync(join(folder, 'package.json'), 'utf8')) as {
    bin: string | Record<string, string>;
  };
  const path = typeof bin === 'string' ? bin : bin[program];
  if (path === undefined) throw new Error(`the package ${name} brings no program ${program}`);
  return join(folder, path);
}
