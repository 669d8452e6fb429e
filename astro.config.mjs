import { defineConfig } from 'astro/config';
import { benchCards } from './src/site/integrations/bench-cards.ts';
import { formulaPictures } from './src/site/integrations/formula-pictures.ts';
import { keepPages } from './src/site/integrations/keep-pages.ts';
import { ownWords } from './src/site/integrations/own-words.ts';
import { pageClock } from './src/site/integrations/page-clock.ts';
import { printDocument } from './src/site/integrations/print-document.ts';
import { relativeLinks } from './src/site/integrations/relative-links.ts';
import { searchIndex } from './src/site/integrations/search-index.ts';
import { unusedScripts } from './src/site/integrations/unused-scripts.ts';

// Run through `npm run build` and `npm run dev`: they load the formulary that the pages are made from.
export default defineConfig({
  srcDir: './src/site',
  publicDir: './src/site/public',
  outDir: './dist',
  // true keeps the spaces between words, which the default takes out
  compressHTML: true,
  // links name files, so that the handbook also opens from a folder
  build: { format: 'preserve', assets: 'assets', inlineStylesheets: 'never' },
  devToolbar: { enabled: false },
  // pictures first: the links are checked against what is there
  integrations: [
    pageClock(),
    unusedScripts(),
    keepPages(),
    formulaPictures(),
    benchCards(),
    printDocument(),
    relativeLinks(),
    searchIndex(),
  ],
  vite: {
    build: { assetsInlineLimit: 0 },
    plugins: [ownWords()],
    worker: { plugins: () => [ownWords()] },
  },
});
