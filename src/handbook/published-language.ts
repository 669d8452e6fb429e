import { DATA_LANGUAGE } from '../reference/data-files.ts';
import { voice } from '../words/voice.ts';

/**
 * The language to mark what stays as published, as titles of sources and places in them; `null` on pages that are in
 * that language themselves. A reader aloud would pronounce it as the page's language without the mark.
 */
export const publishedLanguage = (): string | null =>
  voice().language === DATA_LANGUAGE ? null : DATA_LANGUAGE;
