import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { run } from './project.ts';

const names = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];

function isProgram(path: string): boolean {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/** Path of a browser: the one CHROME_PATH names, else the first on the path; null when there is none. */
export function findBrowser(): string | null {
  const named = process.env['CHROME_PATH'];
  if (named !== undefined && named !== '') return isProgram(named) ? named : null;
  const folders = (process.env['PATH'] ?? '').split(delimiter);
  return names.flatMap((name) => folders.map((folder) => join(folder, name))).find(isProgram) ?? null;
}

/**
 * The browser that is there, or Debian's package put in place where that is possible.
 *
 * @throws Error that says in one line what is missing and what would do
 */
export async function provideBrowser(): Promise<string> {
  const present = findBrowser();
  if (present !== null) return present;
  const would = 'install Chromium or Chrome, or name one in CHROME_PATH';
  const named = process.env['CHROME_PATH'];
  if (named) throw new Error(`CHROME_PATH "${named}": no program there; ${would}`);
  if (process.getuid?.() !== 0 || !isProgram('/usr/bin/apt-get')) {
    throw new Error(`no browser for the tests on the PATH (${names.join(', ')}); ${would}`);
  }
  console.error("Installing Debian's package chromium: once, a minute or so …");
  await run('apt-get', ['update', '-q']);
  const packages = ['install', '-qy', '--no-install-recommends', 'chromium'];
  const { ok, output } = await run('apt-get', packages, { DEBIAN_FRONTEND: 'noninteractive' });
  const browser = findBrowser();
  if (!ok || browser === null) throw new Error(`${output}\napt-get could not install chromium; ${would}`);
  return browser;
}

/** What a headless browser needs to start anywhere and to call nobody. */
export const browserFlags = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];
