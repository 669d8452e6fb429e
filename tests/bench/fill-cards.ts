import { copyFileSync, existsSync, mkdirSync } from 'node:fs';
import { performance } from 'node:perf_hooks';
import { loadSite } from '../../src/commands/load-site.ts';
import { speakFor } from '../../src/commands/speak-for.ts';
import type { ShopFolders } from '../../src/formulary/formulary.ts';
import { cardFiles, cardPaths } from '../../src/handbook/card-files-fs.ts';
import { benchCardContents } from '../../src/site/integrations/bench-cards.ts';

/** The day that the invented formulary is built for. */
export const AS_OF = '2026-12-01';

/**
 * Draws the first `sample` cards of a shop into a folder of kept cards, and puts copies of the last under the names of
 * all the others, so that a build finds every card drawn. What it then publishes is for measuring alone.
 *
 * @returns How long one card took to draw [ms], and how many cards there are.
 */
export async function fillCards(
  folders: ShopFolders,
  cache: string,
  sample: number,
): Promise<{ readonly milliseconds: number; readonly cards: number }> {
  speakFor(folders.data);
  const loaded = loadSite(folders, { asOf: AS_OF, drafts: true, last: null });
  if (!loaded.ok) throw new Error('the formulary for measuring has problems');
  const contents = [...benchCardContents(loaded.input).values()];
  const [drawn, others] = [contents.slice(0, sample), contents.slice(sample)];
  const last = drawn.at(-1);
  if (!last) throw new Error('no card to draw');
  const start = performance.now();
  for (const content of drawn) await cardFiles(content, cache);
  const milliseconds = (performance.now() - start) / drawn.length;
  mkdirSync(cache, { recursive: true });
  const from = cardPaths(last, cache);
  for (const content of others) {
    const to = cardPaths(content, cache);
    if (existsSync(to.svg)) continue;
    copyFileSync(from.svg, to.svg);
    copyFileSync(from.png, to.png);
  }
  return { milliseconds, cards: contents.length };
}
