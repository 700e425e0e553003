import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { serve, type Served } from '../../../src/cli/serve.ts';

let folder: string;
let served: Served;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'ferrule-serve-'));
  await mkdir(join(folder, 'site/basis'), { recursive: true });
  await mkdir(join(folder, 'site/_astro'));
  await writeFile(join(folder, 'secret.txt'), 'secret');
  await writeFile(join(folder, 'site/index.html'), 'home');
  await writeFile(join(folder, 'site/404.html'), 'no such page');
  await writeFile(join(folder, 'site/.built'), 'hidden');
  await writeFile(join(folder, 'site/basis/index.html'), 'basis');
  await writeFile(join(folder, 'site/_astro/sheet.a1b2.js'), 'export {};');
  served = await serve({ root: join(folder, 'site'), port: 0 });
});

afterAll(async () => {
  await served.close();
  await rm(folder, { recursive: true });
});

const get = (path: string, init?: RequestInit) => fetch(new URL(path, served.url), { redirect: 'manual', ...init });

/** Sends a path as it stands: fetch() would tidy it first. */
const statusOf = (path: string) =>
  new Promise<number | undefined>((done, fail) => {
    request({ host: '127.0.0.1', port: served.port, path }, (response) => {
      response.resume();
      done(response.statusCode);
    })
      .on('error', fail)
      .end();
  });

describe('serve({ root, port })', () => {
  it('gives a folder its index', async () => {
    expect(await (await get('/')).text()).toBe('home');
    expect(await (await get('/basis/?a=1')).text()).toBe('basis');
  });

  it('sends a folder without its slash to the one with it', async () => {
    const response = await get('/basis');
    expect([response.status, response.headers.get('location')]).toEqual([308, '/basis/']);
  });

  it('answers what is not there with the page for it', async () => {
    const response = await get('/nowhere');
    expect([response.status, await response.text()]).toEqual([404, 'no such page']);
    expect(response.headers.get('content-type')).toBe('text/html; charset=utf-8');
  });

  it.each(['/../secret.txt', '/%2e%2e/secret.txt', '/basis/..%2f..%2fsecret.txt', '/..\\secret.txt'])(
    'never leaves its folder: %s',
    async (path) => {
      expect(await statusOf(path)).toBe(404);
    },
  );

  it.each(['/.built', '/%', '/%00', '//basis', '*'])('knows no file at %s', async (path) => {
    expect(await statusOf(path)).toBe(404);
  });

  it('says what a file is, and under _astro/ that it never changes', async () => {
    const { headers } = await get('/_astro/sheet.a1b2.js');
    expect(headers.get('content-type')).toBe('text/javascript; charset=utf-8');
    expect(headers.get('cache-control')).toContain('immutable');
    expect((await get('/')).headers.get('cache-control')).toBe('no-cache');
  });

  it('answers 304 to who has it already', async () => {
    const tag = (await get('/')).headers.get('etag') ?? '';
    const again = await get('/', { headers: { 'If-None-Match': tag } });
    expect([again.status, await again.text()]).toEqual([304, '']);
  });

  it('allows nothing from elsewhere', async () => {
    expect((await get('/')).headers.get('content-security-policy')).toMatch(/^default-src 'self';/);
  });

  it('answers HEAD without a body and refuses what would write', async () => {
    const head = await get('/', { method: 'HEAD' });
    expect([head.status, head.headers.get('content-length'), await head.text()]).toEqual([200, '4', '']);
    expect((await get('/', { method: 'POST', body: 'x' })).status).toBe(405);
  });

  it('takes the next port when its own is taken, if asked to', async () => {
    const root = join(folder, 'site');
    await expect(serve({ root, port: served.port })).rejects.toThrow('EADDRINUSE');
    const other = await serve({ root, port: served.port, orNext: true });
    expect(other.port).toBeGreaterThan(served.port);
    await other.close();
  });
});
