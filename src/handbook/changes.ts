import type { FormulaChange } from '../edition/changes.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { plain } from '../words/numbers.ts';
import { nameOf } from './names.ts';

export interface ChangeLine {
  readonly what: string;
  readonly before: string;
  readonly after: string;
  readonly moved: boolean;
}

/** Old and new of one formula side by side: weights, shares, superfat and profile, in that order. */
export function changeLines(change: FormulaChange, reference: Reference): readonly ChangeLine[] {
  const text = words.changesPage;
  const line = (
    what: string,
    before: number | null,
    after: number | null,
    unit: string,
    decimals = 2,
  ): ChangeLine => {
    const shown = (value: number | null) =>
      value === null ? text.none : `${plain(value, decimals)}${unit && ` ${unit}`}`;
    return {
      what,
      before: shown(before),
      after: shown(after),
      moved: shown(before) !== shown(after),
    };
  };
  const percent = (what: string, [before, after]: readonly [number, number]) =>
    line(what, before, after, words.frame.percent);
  const { superfat } = change;
  return [
    ...change.weights.map(({ part, id, at, before, after }) => {
      const name = text.parts[part] ?? materialName(reference, id);
      const stage = at ? `, ${words.frame.stages[at] ?? at}` : '';
      return line(name + stage, before, after, 'g');
    }),
    ...change.shares.map(({ id, before, after }) =>
      line(text.share(materialName(reference, id)), before, after, words.frame.percent),
    ),
    percent(text.superfat, superfat.written),
    percent(text.lowestExpanded, superfat.lowestExpanded),
    percent(text.lowestWorstCase, superfat.lowestWorstCase),
    ...change.profile.map(({ id, before, after }) =>
      line(text.profile[id], before, after, text.units[id]),
    ),
  ];
}

/** An earlier edition may name what the data no longer hold. */
function materialName(reference: Reference, id: string): string {
  const known = [reference.fats, reference.alkalis, reference.additives, reference.liquids];
  return known.some((records) => records.has(id)) ? nameOf(reference, id) : id;
}
