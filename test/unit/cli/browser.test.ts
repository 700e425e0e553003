import { chmod, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { findBrowser, provideBrowser } from '../../../src/cli/browser.ts';

let folder: string;
let chrome: string;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ferrule-browser-'));
  chrome = join(folder, 'google-chrome');
  await writeFile(chrome, '');
  await chmod(chrome, 0o755);
});

afterEach(() => {
  vi.unstubAllEnvs();
  vi.restoreAllMocks();
});
afterAll(() => rm(folder, { recursive: true }));

describe('findBrowser()', () => {
  it('takes the one that CHROME_PATH names before any on the path', () => {
    vi.stubEnv('CHROME_PATH', chrome);
    expect(findBrowser()).toBe(chrome);
  });

  it('takes the first on the path otherwise', () => {
    vi.stubEnv('CHROME_PATH', '');
    vi.stubEnv('PATH', folder);
    expect(findBrowser()).toBe(chrome);
  });

  it('is null when CHROME_PATH names nothing that runs', () => {
    vi.stubEnv('CHROME_PATH', join(folder, 'none'));
    expect(findBrowser()).toBeNull();
  });
});

describe('provideBrowser()', () => {
  it('says in one line what CHROME_PATH was and what would do', async () => {
    vi.stubEnv('CHROME_PATH', '/nowhere/chrome');
    await expect(provideBrowser()).rejects.toThrow(/^CHROME_PATH "\/nowhere\/chrome": no program there; install .+$/);
  });

  it('names what it looked for when there is none and none can be installed', async () => {
    vi.stubEnv('CHROME_PATH', '');
    vi.stubEnv('PATH', '');
    vi.spyOn(process, 'getuid').mockReturnValue(1000);
    await expect(provideBrowser()).rejects.toThrow(
      /^no browser for the tests on the PATH \(chromium, .+\); install .+$/,
    );
  });
});
