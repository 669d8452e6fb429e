import type { FatRecord } from '../reference/material-records.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { fromTo, plain } from '../words/numbers.ts';
import { sourceName } from './names.ts';

export interface CompositionTable {
  readonly sources: readonly {
    readonly name: string;
    readonly at: string;
    readonly how: string;
    readonly used: boolean;
  }[];
  readonly rows: readonly {
    readonly acid: string;
    readonly name: string;
    /** Percent per source; `null` where the source does not list the acid. */
    readonly shares: readonly (string | null)[];
  }[];
  readonly notes: readonly string[];
}

/** The fatty acids of a fat by each source, in the order of choice; acids in the order of their data file. */
export function compositionTable(fat: FatRecord, reference: Reference): CompositionTable {
  const { compositions, chosen } = fat;
  const listed = new Set(compositions.flatMap(({ acids }) => acids.map(({ acid }) => acid)));
  return {
    sources: compositions.map((composition) => ({
      name: sourceName(reference, composition.source),
      at: composition.at,
      how: words.frame.how[composition.how],
      used: composition === chosen.composition,
    })),
    rows: [...reference.acids]
      .filter(([id]) => listed.has(id))
      .map(([id, { name }]) => ({
        acid: id,
        name,
        shares: compositions.map(({ acids }) => {
          const share = acids.find(({ acid }) => acid === id);
          return share ? shareText(share) : null;
        }),
      })),
    notes: compositions.flatMap(({ source, note }) =>
      note === null ? [] : [`${sourceName(reference, source)}: ${note}`],
    ),
  };
}

function shareText({ min, max }: FatRecord['compositions'][number]['acids'][number]): string {
  if (min === null) return words.fatPages.atMost(max);
  return fromTo(plain(min), plain(max));
}
