import type { ComputedFormula, Formulary } from '../../formulary/formulary.ts';
import { nameOf } from '../../handbook/names.ts';
import type { Trait } from '../../search/finder/finder-data.ts';
import { allergenName } from '../../words/allergen-name.ts';
import { words } from '../../words/catalogue.ts';
import type { CautionId } from '../../words/en/cautions.ts';

interface TraitSource {
  readonly id: keyof typeof words.findWords.traits;
  readonly holds: 'one' | 'many';
  readonly only?: true;
  /** Known beside those in use, so that a kept search stays valid when the last formula with one goes. */
  readonly known?: Iterable<string>;
  readonly of: (computed: ComputedFormula) => readonly string[];
  readonly name: (id: string) => string;
}

/** What every formula of the formulary is or has. */
export function traitsOf({ formulas, reference }: Formulary): readonly Trait[] {
  const material = (id: string) => nameOf(reference, id);
  const labels = new Map(reference.shop.batches.map(({ id, label }) => [id, label]));
  const sources: readonly TraitSource[] = [
    {
      id: 'kind',
      holds: 'one',
      known: Object.keys(words.frame.kinds),
      of: ({ document }) => [document.kind],
      name: (id) => words.frame.kinds[id as keyof typeof words.frame.kinds],
    },
    {
      id: 'process',
      holds: 'one',
      known: Object.keys(words.frame.processes),
      of: ({ document }) => [document.process],
      name: (id) => words.frame.processes[id as keyof typeof words.frame.processes],
    },
    {
      id: 'fats',
      holds: 'many',
      only: true,
      known: reference.fats.keys(),
      of: fatsOf,
      name: material,
    },
    {
      id: 'additives',
      holds: 'many',
      known: [...reference.additives.keys(), ...reference.liquids.keys()],
      of: ({ document }) => [...document.additives, ...document.liquids].map(({ id }) => id),
      name: material,
    },
    {
      id: 'batches',
      holds: 'many',
      known: reference.shop.batches.map(({ id }) => id),
      of: ({ document }) => document.batches.filter(({ refused }) => !refused).map(({ id }) => id),
      name: (id) => labels.get(id) ?? id,
    },
    {
      id: 'lots',
      holds: 'many',
      known: [...reference.lots.fats, ...reference.lots.alkalis].map(({ lot }) => lot),
      of: lotsOf,
      name: (id) => id,
    },
    { id: 'tags', holds: 'many', of: ({ formula }) => formula.tags, name: (id) => id },
    {
      id: 'allergens',
      holds: 'many',
      of: (computed) => allergensOf(computed, reference),
      name: allergenName,
    },
    {
      id: 'cautions',
      holds: 'many',
      of: ({ document }) => document.cautions.map(({ id }) => id),
      name: (id) => words.cautionNames[id as CautionId],
    },
  ];
  return sources.map(({ id, holds, only = false, known = [], of, name }) => {
    const ids = formulas.map((computed) => [...new Set(of(computed))]);
    const choices = [...new Set([...known, ...ids.flat()])]
      .map((choice) => ({ id: choice, name: name(choice) }))
      .sort((a, b) => (a.name < b.name ? -1 : 1));
    const place = new Map(choices.map((choice, i) => [choice.id, i]));
    return {
      id,
      name: words.findWords.traits[id],
      holds,
      only,
      choices,
      members: ids.map((row) => row.map((each) => place.get(each) ?? 0).sort((a, b) => a - b)),
    };
  });
}

const fatsOf = ({ document }: ComputedFormula) =>
  [...document.fats, ...document.afterCookFats].map(({ id }) => id);

const lotsOf = ({ document }: ComputedFormula) => [
  ...[...document.fats, ...document.afterCookFats].flatMap(
    ({ saponificationValue: { lot } }) => lot ?? [],
  ),
  ...document.alkali.flatMap(({ assay: { lot } }) => lot ?? []),
];

function allergensOf({ document }: ComputedFormula, reference: Formulary['reference']) {
  const ids = [
    ...document.fats,
    ...document.afterCookFats,
    ...document.additives,
    ...document.liquids,
  ];
  return ids.flatMap(
    ({ id }) =>
      (reference.fats.get(id) ?? reference.additives.get(id) ?? reference.liquids.get(id))
        ?.allergens ?? [],
  );
}
