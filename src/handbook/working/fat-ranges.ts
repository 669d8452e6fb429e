import { expandedHalfWidth } from '../../chemistry/margin.ts';
import type { Range } from '../../chemistry/quantity.ts';
import { isBeforeSaponification, rangeThatCounts } from '../../chemistry/saponification.ts';
import type { Working } from './context.ts';
import { exact, figure, fractionOf, minus, product, rootOf, type Term } from './term.ts';

export interface FatRange {
  /** As in the budget of the margin. */
  readonly id: string;
  /** The fat or the liquid that carries it. */
  readonly of: string;
  readonly mass: number;
  readonly range: Range<number>;
}

/** Every fat that meets the alkali, with the range that its doubt comes from. */
export function fatRanges({ charge }: Working, waxAsAcids: boolean): readonly FatRange[] {
  return [
    ...charge.fats.map(({ fat, mass }) => ({
      id: `fat:${fat.id}`,
      of: fat.id,
      mass,
      range: rangeThatCounts(fat, waxAsAcids),
    })),
    ...charge.liquids.flatMap(({ liquid, mass, at }) =>
      liquid.fatData && isBeforeSaponification(at)
        ? [
            {
              id: `liquid:${liquid.id}`,
              of: liquid.id,
              mass: mass * liquid.fat,
              range: rangeThatCounts(liquid.fatData, waxAsAcids),
            },
          ]
        : [],
    ),
  ];
}

/** Half of the range, times 2/√3 where every value in it is equally likely. */
export function halfWidth(range: Range<number>): Term {
  if (range.spread === 'expanded') return figure(expandedHalfWidth(range));
  return fractionOf(
    product(exact(2), fractionOf(minus(figure(range.high, 8), figure(range.low, 8)), exact(2))),
    rootOf(exact(3)),
  );
}
