import { type Language, languageOf } from './languages.ts';
import type { UnitSystem } from './units.ts';

/** How the handbook speaks: set once, from the shop's settings, before anything is put into words. */
export interface Voice {
  /** BCP 47 tag that numbers and dates follow, `es-US`. */
  readonly locale: string;
  /** The catalogue that words come from; the first part of the locale. */
  readonly language: Language;
  /** What stands between the whole and the decimals of a shown number. */
  readonly decimalSign: string;
  /** What weights, volumes and temperatures are shown in. */
  readonly units: UnitSystem;
}

/** The voice of a locale. Throws a `RangeError` where it is no BCP 47 tag or its language has no catalogue. */
export function voiceOf(locale: string, units: UnitSystem = 'metric'): Voice {
  const parts = new Intl.NumberFormat(locale).formatToParts(0.5);
  const decimalSign = parts.find(({ type }) => type === 'decimal')?.value ?? '.';
  return { locale, language: languageOf(locale), decimalSign, units };
}

/** Words in British English, decimal points, `1 Dec 2026`, grams. */
const DEFAULT = voiceOf('en-GB');

// pages are bundled apart from the command that starts the build; the process is all they share
const KEY = Symbol.for('formulary-handbook.voice');
const shared = globalThis as typeof globalThis & { [KEY]?: Voice };

export const voice = (): Voice => shared[KEY] ?? DEFAULT;

export function setVoice(next: Voice): void {
  shared[KEY] = next;
}
