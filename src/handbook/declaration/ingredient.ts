/** Where a label is for; the European list names things as INCI does, the other some in English. */
export type Region = 'eu' | 'us';

/** A mass under one name of a label, before equal names are added up. [g] */
export interface Ingredient {
  readonly name: Readonly<Record<Region, string>>;
  readonly mass: number;
  /** Colours may stand last in any order. */
  readonly colour: boolean;
  /** No name is in the data: `name` says of what, and the label must not be printed so. */
  readonly nameless: boolean;
}

export interface DeclaredIngredient {
  readonly name: string;
  /** Percent of the whole by mass. */
  readonly percent: number;
  /** `descending` by mass; under one percent and among the colours the order is free. */
  readonly place: 'descending' | 'under-one-percent' | 'colour';
  readonly nameless: boolean;
}

/** An ingredient with one name everywhere, unless another is given for the United States. */
export const ingredient = (
  name: string,
  mass: number,
  more: {
    readonly us?: string | null;
    readonly colour?: boolean;
    readonly nameless?: boolean;
  } = {},
): Ingredient => ({
  name: { eu: name, us: more.us ?? name },
  mass,
  colour: more.colour ?? false,
  nameless: more.nameless ?? false,
});

/** Below this the order is free in both regions. [percent] */
const FREE_ORDER = 1;

/**
 * The list of a label: equal names added up, by falling mass; then what is under one percent, then the
 * colours. Where the order is free it is by mass too, so that two builds print the same.
 *
 * `whole` is what the shares are of. [g] Order: Regulation (EC) 1223/2009, article 19 (1) (g), and
 * 21 CFR 701.3, both from memory.
 */
export function declared(
  ingredients: readonly Ingredient[],
  region: Region,
  whole: number,
): readonly DeclaredIngredient[] {
  const sums = new Map<string, Ingredient>();
  for (const each of ingredients) {
    if (each.mass <= 0) continue;
    const name = each.name[region];
    sums.set(name, { ...each, mass: (sums.get(name)?.mass ?? 0) + each.mass });
  }
  const lines = [...sums].map(([name, { mass, colour, nameless }]): DeclaredIngredient => {
    const percent = (100 * mass) / whole;
    const place = colour ? 'colour' : percent < FREE_ORDER ? 'under-one-percent' : 'descending';
    return { name, percent, place, nameless };
  });
  const order = ['descending', 'under-one-percent', 'colour'];
  return lines.sort(
    (a, b) =>
      order.indexOf(a.place) - order.indexOf(b.place) ||
      b.percent - a.percent ||
      (a.name < b.name ? -1 : 1),
  );
}
