import { mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath, pathToFileURL } from 'node:url';
import type { IndexFile } from '../../src/search/build/data-kinds.ts';

export interface StockResult {
  /** Hash of the page. */
  readonly id: string;
  readonly score: number;
  data(): Promise<{ readonly excerpt: string; readonly url: string }>;
}

export interface StockOptions {
  readonly filters?: Readonly<Record<string, string>>;
  readonly sort?: Readonly<Record<string, 'asc' | 'desc'>>;
}

export interface StockClient {
  search(query: string, options?: StockOptions): Promise<readonly StockResult[]>;
  close(): void;
}

/**
 * Pagefind's own client, as published, over the files of an index. `warmUp` are queries that load all chunks: what
 * the client finds depends on what it has loaded before.
 */
export async function openStockClient(
  files: readonly IndexFile[],
  warmUp: readonly string[],
): Promise<StockClient> {
  const folder = mkdtempSync(join(tmpdir(), 'stock-client-'));
  for (const { path, content } of files) {
    mkdirSync(dirname(join(folder, path)), { recursive: true });
    writeFileSync(join(folder, path), content);
  }
  const fetchBefore = globalThis.fetch;
  globalThis.fetch = async (address, options) =>
    String(address).startsWith('file:')
      ? new Response(readFileSync(fileURLToPath(String(address).split('?')[0] ?? '')))
      : fetchBefore(address, options);
  const basePath = `${pathToFileURL(folder).href}/`;
  const { createInstance } = await import(/* @vite-ignore */ `${basePath}pagefind.js`);
  const client = await createInstance({ basePath });
  const search = async (query: string, options: StockOptions = {}) =>
    (await client.search(query, options)).results;
  for (const query of warmUp) await search(query);
  return {
    search,
    close() {
      globalThis.fetch = fetchBefore;
      rmSync(folder, { recursive: true });
    },
  };
}
