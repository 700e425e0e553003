import { createHash } from 'node:crypto';
import { readFile, stat } from 'node:fs/promises';
import { createServer, type IncomingMessage, type Server, type ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { extname, join } from 'node:path';

export interface ServeOptions {
  /** Folder of the built site. */
  readonly root: string;
  /** 0: any free port. */
  readonly port: number;
  /** When the port is taken, try the next ones (at most 20) instead of failing. */
  readonly orNext?: boolean;
}

export interface Served {
  /** With a slash at the end. */
  readonly url: string;
  readonly port: number;
  close(): Promise<void>;
}

const host = '127.0.0.1';
const triesAfterTaken = 20;

const types: Readonly<Record<string, string>> = {
  '.css': 'text/css; charset=utf-8',
  '.csv': 'text/csv; charset=utf-8',
  '.html': 'text/html; charset=utf-8',
  '.ico': 'image/x-icon',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.mjs': 'text/javascript; charset=utf-8',
  '.pdf': 'application/pdf',
  '.png': 'image/png',
  '.svg': 'image/svg+xml',
  '.ttf': 'font/ttf',
  '.txt': 'text/plain; charset=utf-8',
  '.webmanifest': 'application/manifest+json; charset=utf-8',
  '.woff2': 'font/woff2',
  '.xml': 'application/xml; charset=utf-8',
};

/** The pages carry the same policy in a meta element; `frame-ancestors` works in a header only. */
const policy = [
  "default-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
  "img-src 'self' data:",
  "object-src 'none'",
  // The worker that draws networks writes its own loop as WebAssembly.
  "script-src 'self' 'wasm-unsafe-eval'",
].join('; ');

const always = {
  'Content-Security-Policy': policy,
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Referrer-Policy': 'no-referrer',
  'X-Content-Type-Options': 'nosniff',
};

/**
 * Serves a folder of files to this machine alone.
 *
 * @throws Error with `code` EADDRINUSE when the port (and with `orNext` those after it) is taken
 */
export async function serve({ root, port, orNext = false }: ServeOptions): Promise<Served> {
  const server = createServer((request, response) => {
    answer(root, request, response).catch(() => response.writeHead(500, always).end());
  });
  const bound = await listen(server, port, orNext ? triesAfterTaken : 0);
  return {
    url: `http://${host}:${bound}/`,
    port: bound,
    close: () =>
      new Promise((done) => {
        server.close(() => done());
        server.closeAllConnections();
      }),
  };
}

async function listen(server: Server, port: number, triesLeft: number): Promise<number> {
  try {
    await new Promise<void>((done, fail) => {
      server.once('error', fail);
      server.listen(port, host, () => {
        server.off('error', fail);
        done();
      });
    });
  } catch (error) {
    const taken = (error as NodeJS.ErrnoException).code === 'EADDRINUSE';
    if (taken && triesLeft > 0 && port < 65_535) return listen(server, port + 1, triesLeft - 1);
    throw error;
  }
  return (server.address() as AddressInfo).port;
}

async function answer(root: string, request: IncomingMessage, response: ServerResponse): Promise<void> {
  if (request.method !== 'GET' && request.method !== 'HEAD') {
    response.writeHead(405, { ...always, Allow: 'GET, HEAD' }).end();
    return;
  }
  const path = pathOf(request.url ?? '/');
  const found = path === null ? null : await fileAt(root, path);
  if (found?.isFolder) {
    response.writeHead(308, { ...always, Location: `${encodeURI(path!)}/` }).end();
    return;
  }
  const file = found?.path ?? null;
  const body = await readFile(file ?? join(root, '404.html')).catch(() => 'Not found\n');
  const tag = `"${createHash('sha256').update(body).digest('base64url').slice(0, 22)}"`;
  const headers = {
    ...always,
    'Content-Type': types[file === null ? '.html' : extname(file)] ?? 'application/octet-stream',
    // Names under _astro/ carry a hash of what is in them.
    'Cache-Control': path?.startsWith('/_astro/') && file ? 'public, max-age=31536000, immutable' : 'no-cache',
    ETag: tag,
  };
  if (file !== null && request.headers['if-none-match'] === tag) {
    response.writeHead(304, headers).end();
    return;
  }
  response.writeHead(file === null ? 404 : 200, { ...headers, 'Content-Length': Buffer.byteLength(body) });
  response.end(request.method === 'HEAD' ? undefined : body);
}

/** The address's path, decoded; null when it can't name a file of the site: broken, leaving the folder, or hidden. */
function pathOf(url: string): string | null {
  try {
    const path = decodeURIComponent(url.replace(/[?#].*$/, ''));
    const steps = path.split('/').slice(1);
    const outside = !path.startsWith('/') || /[\\\0]/.test(path) || steps.some((step) => step.startsWith('.'));
    return outside || steps.slice(0, -1).includes('') ? null : path;
  } catch {
    return null;
  }
}

/** What stands for a path: a file, or a folder when the path lacks its last slash; null when there is neither. */
async function fileAt(root: string, path: string): Promise<{ path: string; isFolder: boolean } | null> {
  const file = join(root, path.endsWith('/') ? `${path}index.html` : path);
  const found = await stat(file).catch(() => null);
  return found?.isFile() || found?.isDirectory() ? { path: file, isFolder: found.isDirectory() } : null;
}
