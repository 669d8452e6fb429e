import type { Formulary } from '../../formulary/formulary.ts';
import { nameOf } from '../../handbook/names.ts';
import { bandsOf } from '../../search/finder/bands.ts';
import {
  dateOf,
  type FinderData,
  type Property,
  type Trait,
} from '../../search/finder/finder-data.ts';
import { words } from '../../words/catalogue.ts';
import { dateText, monthText } from '../../words/dates.ts';
import { fixed, plain } from '../../words/numbers.ts';

/** A list of formulas in a fixed order that needs no script. */
export interface FormulaList {
  readonly id: string;
  readonly title: string;
  readonly lead: string;
  /** Name of the property that the list is by. */
  readonly property?: string;
  readonly groups: readonly {
    readonly title: string;
    readonly href: string | null;
    readonly entries: readonly ListEntry[];
  }[];
}

export interface ListEntry {
  readonly code: string;
  readonly name: string;
  readonly note: string;
}

/** All lists: by fat, by kind, by caution, and one per property. */
export function listsOf(formulary: Formulary, data: FinderData): readonly FormulaList[] {
  const { listTitles, listLeads } = words.findWords;
  const trait = (id: string) => data.traits.find((each) => each.id === id);
  const lists: FormulaList[] = [
    { id: 'fats', title: listTitles.fats, lead: listLeads.fats, groups: byFat(formulary) },
    { id: 'kinds', title: listTitles.kinds, lead: listLeads.kinds, groups: byKind(formulary) },
    {
      id: 'cautions',
      title: listTitles.cautions,
      lead: listLeads.cautions,
      groups: byTrait(data, trait('cautions')),
    },
  ];
  const properties = data.properties.filter(({ values }) => values.some((value) => value !== null));
  return [...lists, ...properties.map((property) => propertyList(data, property))];
}

function byFat({ formulas, reference }: Formulary): FormulaList['groups'] {
  return [...reference.fats.keys()]
    .map((fat) => ({
      title: nameOf(reference, fat),
      href: `/fats/${fat}.html`,
      entries: formulas.flatMap(({ document }) => {
        const lines = [...document.fats, ...document.afterCookFats].filter(({ id }) => id === fat);
        const share = lines.reduce((sum, line) => sum + line.share, 0);
        const note = `${plain(share, 1)} ${words.findWords.percent}`;
        return lines.length > 0 ? [{ code: document.code, name: document.name, note }] : [];
      }),
    }))
    .filter(({ entries }) => entries.length > 0)
    .sort((a, b) => (a.title < b.title ? -1 : 1));
}

function byKind({ formulas }: Formulary): FormulaList['groups'] {
  const kinds = Object.keys(words.frame.kinds) as (keyof typeof words.frame.kinds)[];
  const processes = Object.keys(words.frame.processes) as (keyof typeof words.frame.processes)[];
  return kinds
    .flatMap((kind) =>
      processes.map((process) => ({
        title: `${words.frame.kinds[kind]}, ${words.frame.processes[process]}`,
        href: null,
        entries: formulas.flatMap(({ document }) =>
          document.kind === kind && document.process === process
            ? [{ code: document.code, name: document.name, note: '' }]
            : [],
        ),
      })),
    )
    .filter(({ entries }) => entries.length > 0);
}

function byTrait(data: FinderData, trait: Trait | undefined): FormulaList['groups'] {
  return (trait?.choices ?? []).map(({ name }, place) => ({
    title: name.charAt(0).toUpperCase() + name.slice(1),
    href: null,
    entries: [...data.codes.keys()]
      .filter((row) => trait?.members[row]?.includes(place))
      .map((row) => entryOf(data, row, '')),
  }));
}

function propertyList(data: FinderData, property: Property): FormulaList {
  const { id, name, unit, format, decimals } = property;
  const shown = (value: number) =>
    format === 'date' ? dateText(dateOf(value)) : fixed(value, decimals);
  const bands = bandsOf(property).map(({ from, to, rows }) => ({
    title:
      format === 'date'
        ? monthText(dateOf(from))
        : words.findWords.band(plain(from), plain(to), unit),
    href: null,
    entries: rows.map((row) => entryOf(data, row, shown(property.values[row] ?? 0))),
  }));
  const without = [...data.codes.keys()].filter((row) => (property.values[row] ?? null) === null);
  const none = {
    title: words.findWords.noNumber,
    href: null,
    entries: without.map((row) => entryOf(data, row, '')),
  };
  return {
    id: `by-${id}`,
    title: words.findWords.listTitles.property(name),
    lead: words.findWords.listLeads.property(unit),
    property: name,
    groups: without.length > 0 ? [...bands, none] : bands,
  };
}

const entryOf = (data: FinderData, row: number, note: string): ListEntry => ({
  code: data.codes[row] ?? '',
  name: data.names[row] ?? '',
  note,
});
