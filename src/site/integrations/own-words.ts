import type { Plugin } from 'vite';
import { voice } from '../../words/voice.ts';

/**
 * Gives the pages' scripts the words and the stemmer of one language: what they import from the English words comes
 * from the catalogue of the shop's language instead. Everything else takes its words from `src/words/catalogue.ts`.
 */
export const ownWords = (): Plugin => ({
  name: 'own-words',
  enforce: 'pre',
  resolveId(source, importer) {
    const { language } = voice();
    const own = source
      .replace('/words/en/', `/words/${language}/`)
      .replace('/stemmers/all.ts', `/stemmers/${language}.ts`);
    return own === source ? null : this.resolve(own, importer, { skipSelf: true });
  },
});
