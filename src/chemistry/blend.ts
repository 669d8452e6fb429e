import type { Charge } from './charge.ts';
import { type Grams, grams } from './quantity.ts';

type FatLine = Charge['fats'][number];

/** One thing to weigh on the side of the fats: a fat, or a blend that stands ready with all its parts. */
export interface FatWeighing {
  /** Of the fat or of the blend. */
  readonly id: string;
  readonly mass: Grams;
  /** Places of its fats in the list that it was made from. */
  readonly lines: readonly number[];
}

/**
 * The fats as they are weighed, in their order: the parts of a blend as one, every other fat by itself.
 * Masses of blends are kept to 12 digits, so that a sum of parts is the weight that a sheet prints. [g]
 */
export function fatWeighings(fats: readonly FatLine[]): readonly FatWeighing[] {
  const groups = new Map<string, { id: string; lines: number[] }>();
  fats.forEach(({ fat, blend }, index) => {
    const key = blend === undefined ? `fat ${index}` : `blend ${blend}`;
    const group = groups.get(key);
    if (group) group.lines.push(index);
    else groups.set(key, { id: blend ?? fat.id, lines: [index] });
  });
  return [...groups.values()].map(({ id, lines }) => {
    const masses = lines.map((index) => fats[index]?.mass ?? 0);
    const sum = masses.reduce<number>((total, mass) => total + mass, 0);
    return { id, lines, mass: grams(lines.length > 1 ? Number(sum.toPrecision(12)) : sum) };
  });
}

/** Mass of what a fat is weighed in: its own, or that of all parts of its blend. [g] */
export function massWeighedWith(line: FatLine, fats: readonly FatLine[]): Grams {
  if (line.blend === undefined) return line.mass;
  return grams(fats.reduce((sum, { blend, mass }) => (blend === line.blend ? sum + mass : sum), 0));
}

/** Each fat once, with the mass of all its lines: by itself and in blends. In order of first mention. [g] */
export function massByFat(fats: readonly FatLine[]): readonly Pick<FatLine, 'fat' | 'mass'>[] {
  // only a blend can name a fat a second time
  if (fats.every(({ blend }) => blend === undefined)) return fats;
  const sums = new Map<string, Pick<FatLine, 'fat' | 'mass'>>();
  for (const { fat, mass } of fats) {
    sums.set(fat.id, { fat, mass: grams((sums.get(fat.id)?.mass ?? 0) + mass) });
  }
  return [...sums.values()];
}
