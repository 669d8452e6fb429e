import type { z } from 'zod';
import { voiceOf } from '../words/voice.ts';
import type { OpenedFile } from './open-file.ts';
import type { RawData } from './raw-data.ts';
import type { DataReport } from './report.ts';
import type { languageSchema } from './schema/language.ts';

type RawLanguage = z.infer<typeof languageSchema>;
type Section = Exclude<keyof RawLanguage, 'phrases'>;

/** Keys whose texts are sentences for the reader. Places in a source stay as the source is written. */
const PROSE: ReadonlySet<string> = new Set(['note', 'notes', 'because', 'reason', 'subject']);

/**
 * The phrases of a language as a locale writes them: `{0.5}` becomes `0,5` or `0.5`. What stands without braces, as
 * the number of a section, stays.
 */
export function phrasesIn(
  phrases: Readonly<Record<string, string>>,
  locale: string,
): Readonly<Record<string, string>> {
  const { decimalSign } = voiceOf(locale);
  const written = (text: string) =>
    text.replace(/\{(\d+)\.(\d+)\}/g, (_, whole, decimals) => `${whole}${decimalSign}${decimals}`);
  return Object.fromEntries(Object.entries(phrases).map(([key, text]) => [key, written(text)]));
}

/** A value of a data file with its prose in another language; what has no translation stays. */
export function withPhrases<T>(value: T, phrases: Readonly<Record<string, string>>): T {
  return changed(value, false, (text) =>
    Object.hasOwn(phrases, text) ? phrases[text] : text,
  ) as T;
}

/** Every text of a value that `withPhrases` looks up, in the order of the file. */
export function proseOf(value: unknown): readonly string[] {
  const found: string[] = [];
  changed(value, false, (text) => {
    found.push(text);
    return text;
  });
  return found;
}

/**
 * The packaged data with names and prose in another language. Files of a shop are taken as they stand, since they
 * are in the language of the shop already. No key moves, so places of problems stay right; no number, id or source is
 * touched, so digests stay the same. A packaged material without a name is a problem of the language's file.
 */
export function translated(
  raw: RawData,
  { value: language, report }: OpenedFile<RawLanguage>,
  phrases: Readonly<Record<string, string>>,
): RawData {
  const file = <T>(opened: OpenedFile<T> | null, name: (value: T) => T): OpenedFile<T> | null =>
    opened?.packaged ? { ...opened, value: withPhrases(name(opened.value), phrases) } : opened;
  const nameIn = (section: Section, id: string, english: string): string => {
    const name = language[section];
    if (Object.hasOwn(name, id)) return name[id] ?? english;
    reportMissing(section, id, english, report);
    return english;
  };
  const named =
    <T extends { readonly name: string }>(section: Section) =>
    (entries: Readonly<Record<string, T>>): Record<string, T> =>
      Object.fromEntries(
        Object.entries(entries).map(([id, entry]) => [
          id,
          { ...entry, name: nameIn(section, id, entry.name) },
        ]),
      );
  const each = <
    T extends { readonly name: string },
    Entry extends { readonly id: string; readonly opened: OpenedFile<T> | null },
  >(
    section: Section,
    entries: readonly Entry[],
  ): Entry[] =>
    entries.map((entry) => ({
      ...entry,
      opened: file<T>(entry.opened, (value) => ({
        ...value,
        name: nameIn(section, entry.id, value.name),
      })),
    }));
  return {
    ...raw,
    acids: file(raw.acids, (acids) =>
      Object.fromEntries(
        Object.entries(named<(typeof acids)[string]>('acids')(acids)).map(([id, acid]) => [
          id,
          {
            ...acid,
            'systematic-name': nameIn('systematic-names', id, acid['systematic-name']),
          },
        ]),
      ),
    ),
    additives: file(raw.additives, named('additives')),
    liquids: file(raw.liquids, named('liquids')),
    cautions: file(raw.cautions, (cautions) => cautions),
    soapGrades: file(raw.soapGrades, (grades) =>
      grades.map((grade) => ({ ...grade, name: nameIn('soap-grades', grade.name, grade.name) })),
    ),
    alkalis: each('alkalis', raw.alkalis),
    fats: each('fats', raw.fats),
    tables: Object.fromEntries(
      Object.entries(raw.tables).map(([name, table]) => [name, file(table, (value) => value)]),
    ) as RawData['tables'],
  };
}

function reportMissing(section: Section, id: string, english: string, report: DataReport): void {
  report.inKey([section], 'data/untranslated-name', {
    found: `no name for "${id}" (${english})`,
    expected: `one under "${section}" for all that the packaged data hold`,
    advice: `add it to "${section}" in the language of the shop`,
  });
}

/** Walks maps and lists and puts every text below a key of prose through `phrase`. */
function changed(
  value: unknown,
  isProse: boolean,
  phrase: (text: string) => string | undefined,
): unknown {
  if (typeof value === 'string') return isProse ? phrase(value) : value;
  if (Array.isArray(value)) return value.map((entry) => changed(entry, isProse, phrase));
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([key, inner]) => [key, changed(inner, PROSE.has(key), phrase)]),
  );
}
