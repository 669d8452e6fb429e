import { createReadStream, existsSync, statSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { extname, join, normalize } from 'node:path';

const TYPES: Readonly<Record<string, string>> = {
  '.html': 'text/html; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.csv': 'text/csv; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.webmanifest': 'application/manifest+json',
  '.woff2': 'font/woff2',
  '.txt': 'text/plain; charset=utf-8',
};

/**
 * A plain web server for a folder, under a path such as `/` or `/shop/handbook/`; nothing is guessed. Port 0 is any
 * that is free.
 */
export async function serve(folder: string, base: string, port = 0) {
  const server = createServer((request, response) => {
    const path = decodeURIComponent(new URL(request.url ?? '/', 'http://localhost').pathname);
    const inside = path.startsWith(base) ? normalize(path.slice(base.length)) : '..';
    const named = inside === '.' || inside === '' ? 'index.html' : inside;
    // the page for lost addresses cannot know the way to an icon; browsers then ask for this one
    if (path === '/favicon.ico') {
      response.writeHead(204).end();
      return;
    }
    const file = join(folder, named);
    if (named.startsWith('..') || !existsSync(file) || !statSync(file).isFile()) {
      response.writeHead(404).end();
      return;
    }
    response.writeHead(200, { 'content-type': TYPES[extname(file)] ?? 'application/octet-stream' });
    createReadStream(file).pipe(response);
  });
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));
  const { port: open } = server.address() as AddressInfo;
  return {
    port: open,
    origin: `http://127.0.0.1:${open}${base}`,
    close: () =>
      new Promise<void>((resolve) => {
        server.close(() => resolve());
        server.closeAllConnections();
      }),
  };
}
