import { createHash } from 'node:crypto';
import { globSync, readFileSync, statSync } from 'node:fs';
import { readFile, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { programOf, root, runNode, site } from './project.ts';

/** Holds the digest of the sources that the site was built from; written last, so that half a build never counts. */
const stamp = join(site, '.built');

const sources = ['src/**', 'components/**', 'public/**', 'astro.config.mjs', 'tsconfig.json', 'package-lock.json'];

/** SHA-256 over the names and contents of everything that the site is made from. */
function digestOfSources(): string {
  const hash = createHash('sha256').update(process.env['BASE_PATH'] ?? '/');
  for (const path of globSync(sources, { cwd: root }).sort()) {
    const file = join(root, path);
    if (statSync(file).isFile()) hash.update(`\0${path}\0`).update(readFileSync(file));
  }
  return hash.digest('hex');
}

export interface Built {
  readonly ok: boolean;
  /** False when the site was up to date already. */
  readonly fresh: boolean;
  readonly output: string;
}

/** Builds the site and what lets it work without a network, unless it stands there built from the same sources. */
export async function buildSite(): Promise<Built> {
  const digest = digestOfSources();
  if ((await readFile(stamp, 'utf8').catch(() => '')) === digest) return { ok: true, fresh: false, output: '' };
  await rm(site, { recursive: true, force: true });
  const quiet = { ASTRO_TELEMETRY_DISABLED: '1', NO_COLOR: '1' };
  const pages = await runNode(programOf('astro'), ['build'], quiet);
  if (!pages.ok) return { ...pages, fresh: true };
  const offline = await runNode('src/cli/build-offline.ts');
  if (offline.ok) await writeFile(stamp, digest);
  return { ok: offline.ok, fresh: true, output: pages.output + offline.output };
}
