import { execFileSync } from 'node:child_process';
import { mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { sitePages } from '../support/site-files.ts';
import { writeHostileShop } from './hostile-shop.ts';
import { sitePageFaults } from './site-page-faults.ts';

const folder = mkdtempSync(join(tmpdir(), 'hostile-'));
const site = join(folder, 'dist');
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('a whole handbook of a shop whose every text means harm', () => {
  beforeAll(() => {
    const { formulas, data } = writeHostileShop(folder);
    execFileSync(
      process.execPath,
      [
        'src/commands/run.js',
        'build',
        '--drafts',
        '--as-of',
        '2026-12-01',
        '--formulas',
        formulas,
        '--data',
        data,
        '--out',
        site,
      ],
      { stdio: ['ignore', 'ignore', 'inherit'], env: withoutRunner() },
    );
  }, 15 * 60_000);

  test('no page has a script, a style, a handler or an address that is not ours', () => {
    const pages = sitePages(site);
    expect(pages.length).toBeGreaterThan(200);
    const faults = pages.flatMap((page) =>
      sitePageFaults(readFileSync(join(site, page), 'utf8')).map((fault) => `${page}: ${fault}`),
    );
    expect(faults.slice(0, 10)).toEqual([]);
  });

  test('no picture has one either', () => {
    const cards = readdirSync(join(site, 'cards')).filter((name) => name.endsWith('.svg'));
    expect(cards.length).toBeGreaterThan(50);
    for (const name of cards) {
      const svg = readFileSync(join(site, 'cards', name), 'utf8');
      expect(sitePageFaults(svg)).toEqual([]);
      expect(svg).not.toMatch(/<(script|style|foreignObject|image|a|use)[\s>]/i);
    }
  });

  test('nothing was written beside the handbook', () => {
    expect(readdirSync(folder).sort()).toEqual(['data', 'dist', 'formulas']);
    for (const name of readdirSync(site, { recursive: true, encoding: 'utf8' })) {
      expect(name).toMatch(/^[A-Za-z0-9._/\\-]+$/);
    }
  });
});

/** What the test runner adds to the environment would make Astro build for tests. */
const withoutRunner = () =>
  Object.fromEntries(
    Object.entries(process.env).filter(([name]) => !/^(NODE_ENV|VITEST?(_.*)?)$/.test(name)),
  );
