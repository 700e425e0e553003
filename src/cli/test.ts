import { readFileSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { provideBrowser } from './browser.ts';
import { buildSite } from './build-site.ts';
import { programOf, runNode, type Ran } from './project.ts';

/** What one stage came to; `note` stands beside its time. */
interface Outcome extends Ran {
  readonly passed: number;
  readonly failed: number;
  readonly note?: string;
}

const quiet = { ASTRO_TELEMETRY_DISABLED: '1', NO_COLOR: '1' };
const say = (line: string) => process.stdout.write(`${line}\n`);

const folder = await mkdtemp(join(tmpdir(), 'ferrule-test-'));

/** A stage that either holds or doesn't counts as one test. */
const asOne = ({ ok, output }: Ran, note?: string): Outcome => ({
  ok,
  output,
  passed: Number(ok),
  failed: Number(!ok),
  ...(note === undefined ? {} : { note }),
});

/** Runs folders of test/ and counts the tests in them. */
async function vitest(projects: readonly string[], env: Readonly<Record<string, string>> = {}): Promise<Outcome> {
  const file = join(folder, `${projects.join('-')}.json`);
  const args = ['run', '--config', 'test/vitest.config.ts', '--reporter=default', '--reporter=json'];
  const where = [`--outputFile.json=${file}`, ...projects.map((project) => `--project=${project}`)];
  const { ok, output } = await runNode(programOf('vitest'), [...args, ...where], { ...quiet, ...env });
  const { numPassedTests: passed, numFailedTests: failed } = readCounts(file);
  // A file that doesn't even load holds no test that could fail.
  return { ok, output, passed, failed: ok ? failed : Math.max(1, failed), note: `${passed} tests` };
}

function readCounts(file: string): { numPassedTests: number; numFailedTests: number } {
  try {
    return JSON.parse(readFileSync(file, 'utf8')) as { numPassedTests: number; numFailedTests: number };
  } catch {
    return { numPassedTests: 0, numFailedTests: 0 };
  }
}

/** The check of Astro's pages covers every TypeScript file that tsconfig.json names. */
const types = (): Promise<Ran> => runNode(programOf('astro'), ['check', '--minimumFailingSeverity', 'warning'], quiet);

async function site(): Promise<Outcome> {
  const { fresh, ...built } = await buildSite();
  return asOne(built, fresh ? undefined : 'up to date');
}

const stages: readonly (readonly [name: string, (browser: string) => Promise<Outcome>])[] = [
  ['format', async () => asOne(await runNode(programOf('prettier'), ['--check', '--log-level', 'warn', '.']))],
  ['lint', async () => asOne(await runNode(programOf('eslint'), ['--config', '.config/eslint.config.js', '.']))],
  ['types', async () => asOne(await types())],
  ['unit', () => vitest(['house', 'unit'])],
  ['published', () => vitest(['published'])],
  ['property', () => vitest(['property'])],
  ['build', site],
  ['browser', (browser) => vitest(['browser'], { CHROME_PATH: browser })],
];

/** Every stage in turn, up to the first that fails. */
async function test(): Promise<boolean> {
  const browser = await provideBrowser();
  const sum = { passed: 0, failed: 0 };
  for (const [name, stage] of stages) {
    const start = performance.now();
    const { ok, output, passed, failed, note = '' } = await stage(browser);
    const seconds = ((performance.now() - start) / 1000).toFixed(1);
    say(`${name.padEnd(10)} ${ok ? 'ok    ' : 'FAILED'} ${seconds.padStart(6)} s  ${note}`.trimEnd());
    sum.passed += passed;
    sum.failed += failed;
    if (!ok) say(`\n${output.trim()}\n`);
    if (!ok) break;
  }
  say(`${sum.passed} passed, ${sum.failed} failed`);
  return sum.failed === 0;
}

try {
  process.exitCode = (await test()) ? 0 : 1;
} catch (error) {
  console.error(`Ferrule: ${error instanceof Error ? error.message : String(error)}`);
  process.exitCode = 1;
} finally {
  await rm(folder, { recursive: true, force: true });
}
