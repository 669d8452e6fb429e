/** Languages that have a catalogue beside this file, by their BCP 47 subtag. */
export const LANGUAGES = ['en', 'es'] as const;

export type Language = (typeof LANGUAGES)[number];

/** The language of a locale: `es` of `es-US`. Throws a `RangeError` where there is no catalogue for it. */
export function languageOf(locale: string): Language {
  const subtag = new Intl.Locale(locale).language;
  const language = LANGUAGES.find((known) => known === subtag);
  if (!language) throw new RangeError(`no words in the language "${subtag}"`);
  return language;
}
