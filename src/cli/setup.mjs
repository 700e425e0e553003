// @ts-check
/**
 * First step of every npm script that runs the project's own code: installs the packages when they lack, then hands
 * over to a TypeScript file. Plain JavaScript without imports of its own, because it starts on the Node that is on the
 * machine (20 or later) and before anything is installed. Standard output belongs to the program that follows: all
 * that is said here goes to standard error.
 *
 *     node src/cli/setup.mjs src/cli/solve.ts --frequency 151.25M ...
 */
import { spawn, spawnSync } from 'node:child_process';
import { existsSync, readFileSync, statSync } from 'node:fs';
import module from 'node:module';
import { delimiter, join, resolve } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';

const root = resolve(fileURLToPath(import.meta.url), '../../..');
const modules = join(root, 'node_modules');
const wanted = join(root, 'package-lock.json');
/** npm's own note of what it has put in place, written last. */
const installed = join(modules, '.package-lock.json');
const node = join(modules, 'node', 'bin', process.platform === 'win32' ? 'node.exe' : 'node');

/** @param {string} file */
const packagesIn = (file) =>
  /** @type {Record<string, { version?: string, integrity?: string, optional?: boolean }>} */ (
    JSON.parse(readFileSync(file, 'utf8')).packages
  );

/** The dates decide when they can; only a lock file that is newer than the installation is read. */
function isInstalled() {
  if (!existsSync(installed) || !existsSync(node)) return false;
  if (statSync(installed).mtimeMs >= statSync(wanted).mtimeMs) return true;
  const present = packagesIn(installed);
  return Object.entries(packagesIn(wanted)).every(
    ([path, { version, integrity, optional }]) =>
      path === '' || optional || (present[path]?.version === version && present[path]?.integrity === integrity),
  );
}

/**
 * npm must not run on the Node that it is about to replace, so the packages' own programs leave the path.
 * @param {string} command
 * @param {string} cwd
 */
function run(command, cwd) {
  const path = (process.env['PATH'] ?? '').split(delimiter).filter((folder) => !folder.startsWith(modules));
  const env = { ...process.env, PATH: path.join(delimiter) };
  return spawnSync(command, { cwd, env, shell: true, stdio: ['ignore', 2, 2] }).status === 0;
}

function install() {
  console.error('Installing packages: once, a minute or so …');
  if (!run('npm ci --no-audit --no-fund --loglevel=error', root)) {
    console.error('Ferrule: the packages could not be installed; npm says why above; put that right and try again');
    process.exit(1);
  }
  // Where npm is set not to run the scripts of packages, the one that brings Node 24 is run here.
  if (!existsSync(node)) run('node installArchSpecificPackage.js', join(modules, 'node'));
  if (!existsSync(node)) {
    console.error(`Ferrule: the package "node" has no program for ${process.platform} ${process.arch}; none to run on`);
    process.exit(1);
  }
}

/** @param {string[]} command the TypeScript file and its arguments */
function handOver(command) {
  const child = spawn(node, [fileURLToPath(import.meta.url), ...command], { stdio: 'inherit' });
  // Ctrl-C reaches both; this one waits for the other to end in order.
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP']))
    process.on(signal, () => child.kill(signal));
  child.on('close', (code, signal) => process.exit(code ?? (signal === 'SIGINT' ? 130 : 143)));
}

const [file, ...args] = process.argv.slice(2);
if (file === undefined) {
  console.error('Ferrule: no program named; use one of the scripts that npm run lists');
  process.exit(2);
}
if (!isInstalled()) install();
if (process.versions.node.split('.')[0] === '24') {
  module.enableCompileCache(join(modules, '.cache', 'ferrule'));
  const program = resolve(root, file);
  process.argv.splice(1, process.argv.length, program, ...args);
  await import(pathToFileURL(program).href);
} else {
  handOver([file, ...args]);
}
