import { existsSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { type Browser, chromium } from 'playwright-core';

/** Never playwright's own defaults: they switch web security off, and what must fail in `file://` would pass. */
const ARGUMENTS = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  // tests walk a thousand pages and never go back: no page is kept, no process made ready for the next
  '--disable-back-forward-cache',
  '--disable-features=RenderDocument,SpareRendererForSitePerProcess',
  '--remote-debugging-pipe',
];

const INSTALLED = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
  'C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe',
];

/**
 * Chromium from `CHROMIUM_PATH`, from the system, or from the npm package, in this order. Throws where there is none.
 */
export async function launch(): Promise<Browser> {
  const installed = [process.env.CHROMIUM_PATH ?? '', ...INSTALLED].find((path) =>
    existsSync(path),
  );
  const { executablePath, env } = installed
    ? { executablePath: installed, env: {} }
    : await packaged();
  return chromium.launch({
    executablePath,
    ignoreDefaultArgs: true,
    args: ARGUMENTS,
    env: { ...definedEnvironment(), ...env },
  });
}

/** The build in the npm package, unpacked once under `.cache` with the libraries it needs (Linux x64). */
async function packaged() {
  const cache = fileURLToPath(new URL('../../.cache/chromium', import.meta.url));
  mkdirSync(cache, { recursive: true });
  const before = process.env.TMPDIR;
  process.env.TMPDIR = cache;
  try {
    const { default: pack, inflate } = await import('@sparticuz/chromium');
    const executablePath = await pack.executablePath();
    const libraries = fileURLToPath(
      new URL('../../node_modules/@sparticuz/chromium/bin/al2023.tar.br', import.meta.url),
    );
    const unpacked = await inflate(libraries);
    return { executablePath, env: { LD_LIBRARY_PATH: join(unpacked, 'lib') } };
  } finally {
    if (before === undefined) delete process.env.TMPDIR;
    else process.env.TMPDIR = before;
  }
}

const definedEnvironment = () =>
  Object.fromEntries(
    Object.entries(process.env).flatMap(([key, value]) => (value ? [[key, value]] : [])),
  );
