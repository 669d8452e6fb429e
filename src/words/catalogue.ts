import { english } from './en.ts';
import { spanish } from './es.ts';
import type { Language } from './languages.ts';
import type { SameShape } from './same-shape.ts';
import type { UnitSystem } from './units.ts';
import { setVoice, voice, voiceOf } from './voice.ts';

/** The shape that every catalogue has. The texts of cautions are typed without any language already. */
export type Catalogue = SameShape<Omit<typeof english, 'cautionTexts'>> &
  Pick<typeof english, 'cautionTexts'>;

const CATALOGUES: Readonly<Record<Language, Catalogue>> = { en: english, es: spanish };

/**
 * Every word that a page, a picture or a document shows, in the language of the shop. Read it where it is used, not
 * while modules load: `speak` changes it.
 */
export let words: Catalogue = CATALOGUES[voice().language];

/** Puts everything into the words, numbers and dates of a locale. Throws a `RangeError` for an unknown one. */
export function speak(locale: string, units: UnitSystem = 'metric'): void {
  setVoice(voiceOf(locale, units));
  words = CATALOGUES[voice().language];
}
