import type { Language } from '../words/languages.ts';

const HEADINGS: Readonly<Record<Language, string>> = { en: 'method', es: 'método' };

/** Whether a heading of a formula's text is that of its method, in any language that has a catalogue. */
export const isMethodHeading = (text: string): boolean =>
  Object.values(HEADINGS).includes(text.trim().normalize('NFC').toLowerCase());
