import type { WeighedCharge } from '../chemistry/weigh.ts';
import { stepOf, type WeighingLine, weighingsOf } from '../chemistry/weighings.ts';
import { stepDecimals, weight } from '../words/measures.ts';
import type { AnySizeData, NamedLine } from './any-size-data.ts';

/** One thing to weigh, as it is shown. */
export interface ShownLine extends NamedLine {
  readonly line: WeighingLine;
  /** Place in the working order. */
  readonly place: number;
  /** To the scale's step, without unit. */
  readonly text: string;
  readonly step: number;
}

export interface ShownGroup {
  readonly title: string;
  readonly group: string;
  readonly lines: readonly ShownLine[];
}

/** The weights in working order, as the listed sizes show theirs. Throws for a material without a name. */
export function shownGroups(
  weighed: WeighedCharge,
  { groups, lines: names }: Pick<AnySizeData, 'groups' | 'lines'>,
): readonly ShownGroup[] {
  const shown = weighingsOf(weighed.charge).map((line, place): ShownLine => {
    const named = names.find(({ group, id }) => group === line.group && id === line.id);
    if (!named) throw new Error(`no name for ${line.id}`);
    const step = stepOf(weighed, line);
    return { ...named, line, place, step, text: weight(line.mass, step) };
  });
  return groups
    .map(({ group, title }) => ({
      group,
      title,
      lines: shown.filter((line) => line.group === group),
    }))
    .filter(({ lines }) => lines.length > 0);
}

/** The steps that the weights were rounded to, finest first. [g] */
export const stepsOf = (groups: readonly ShownGroup[]): readonly number[] =>
  [...new Set(groups.flatMap(({ lines }) => lines.map(({ step }) => step)))].sort((a, b) => a - b);

/** Most digits after the decimal sign in any line. */
export const decimalsIn = (groups: readonly ShownGroup[]): number =>
  Math.max(0, ...stepsOf(groups).map(stepDecimals));
