import { createReadStream, existsSync, mkdtempSync, rmSync, statSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { extname, join, normalize } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'vite';

/** The built page, served from a path below the root of its address. */
export interface BuiltPage {
  readonly address: string;
  close(): Promise<void>;
}

/** Builds the page into a folder of its own and serves it under /some/where/. */
export async function buildAndServePage(): Promise<BuiltPage> {
  const folder = mkdtempSync(join(tmpdir(), 'slow-ground-page-'));
  const configFile = fileURLToPath(new URL('../../vite.config.ts', import.meta.url));
  await build({ configFile, logLevel: 'error', build: { outDir: folder, emptyOutDir: true } });
  const server = createServer((request, response) => {
    const path = decodeURIComponent(new URL(request.url ?? '/', 'http://page').pathname);
    const inside = path.startsWith(SUB_PATH) ? normalize(path.slice(SUB_PATH.length) || 'index.html') : '';
    const file = join(folder, inside);
    if (inside === '' || inside.startsWith('..') || !existsSync(file) || !statSync(file).isFile()) {
      response.writeHead(404).end();
      return;
    }
    response.writeHead(200, { 'content-type': CONTENT_TYPES[extname(file)] ?? 'application/octet-stream' });
    createReadStream(file).pipe(response);
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const { port } = server.address() as AddressInfo;
  return {
    address: `http://127.0.0.1:${port}${SUB_PATH}`,
    close: async () => {
      server.closeAllConnections();
      await new Promise<void>((resolve) => server.close(() => resolve()));
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

const SUB_PATH = '/some/where/';

const CONTENT_TYPES: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript',
  '.css': 'text/css',
  '.json': 'application/json',
  '.svg': 'image/svg+xml',
};
