import { stringify } from 'yaml';
import type { Known } from '../../src/formulary/known.ts';
import type { Chance } from '../support/chance.ts';

type Entry = Readonly<Record<string, unknown>>;

/**
 * A formula in which each value alone is allowed and all together may be nothing that anybody would make: from nearly
 * no alkali to nearly no water, 200 fats, salt by the pound.
 */
export function edgeFormula(known: Known, random: Chance): string {
  const maybe = <T>(oneIn: number, make: () => T): T | undefined =>
    random.below(oneIn) === 0 ? make() : undefined;
  const kind = random.pick(['bar', 'paste', 'liquid']);
  const process = random.pick(['cold', 'hot']);
  const stages = [
    'lye',
    'fats',
    'trace',
    ...(process === 'hot' ? ['after-cook'] : []),
    ...(kind === 'bar' ? [] : ['dilution']),
  ];
  const fats = usable(known.fats);
  const front = {
    code: 'QY-900',
    name: random.pick([
      'Edge',
      'Ünïcode Ωμέγα',
      '\u05E9\u05DE\u05DF 5 \u05D2',
      '<b>Bold</b> & "quoted"',
    ]),
    kind,
    process,
    revision: random.pick([1, 9999]),
    fats: shares(random.pick([1, 2, 3, 6, fats.length]), fats, random).map(([fat, share]) => ({
      fat,
      share,
    })),
    'after-cook-fats':
      process === 'hot'
        ? maybe(3, () => [
            { fat: random.pick(fats), 'percent-of-fats': random.pick([1e-6, 5, 25]) },
          ])
        : undefined,
    alkali: random.pick<Entry>([
      { sodium: 100 },
      { potassium: 100 },
      { sodium: 50, potassium: 50, basis: 'moles' },
      { sodium: 0.001, potassium: 99.999, basis: 'mass' },
      { sodium: 99.999999, potassium: 0.000001, basis: 'moles' },
    ]),
    superfat: random.pick([0, 0.000001, 0.5, 5, 12, 24.999, 25]),
    water: {
      ...random.pick<Entry>([
        { 'lye-concentration': random.pick([15, 25, 32, 40, 50]) },
        { 'per-alkali': random.pick([1, 1.0001, 2, 6]) },
        { 'percent-of-fats': random.pick([10, 25, 38, 80]) },
      ]),
      'hold-back': maybe(3, () => random.pick([0.001, 20, 50, 80])),
    },
    liquids: maybe(3, () =>
      shares(random.pick([1, 2, 3]), [...known.liquids.keys()], random).map(([liquid, share]) => ({
        liquid,
        'replaces-water': Math.max(share * random.pick([0.1, 0.5, 1]), 1e-6),
        at: random.pick(stages),
      })),
    ),
    additives: maybe(2, () =>
      shares(random.pick([1, 3, 8]), [...known.additives.keys()], random).map(([additive]) => ({
        additive,
        'percent-of-fats': random.pick([0.000001, 0.01, 1, 5, 30, 100]),
        at: random.pick(stages),
      })),
    ),
    rework: maybe(5, () => random.pick([0.001, 10, 50])),
    release: maybe(4, () => ({ moisture: random.pick([0, 12, 30]) })),
    concession: maybe(2, () => ({ reason: 'A trial.', by: 'Nobody', on: '2026-11-01' })),
    tags: ['edge'],
  };
  return `---\n${stringify(front, { aliasDuplicateObjects: false })}---\n${METHOD}`;
}

const METHOD = '\n## Method\n\n1. Stir the alkali into :water. Then :lye goes into the fats.\n';

const usable = (fats: Known['fats']) =>
  [...fats].flatMap(([id, { core }]) => (core === null ? [] : id));

/** Different ids with shares that sum to 100, some of them tiny. */
function shares(
  count: number,
  ids: readonly string[],
  random: Chance,
): readonly (readonly [string, number])[] {
  const left = [...ids];
  const picked = Array.from({ length: Math.min(count, left.length) }, () => {
    const [id = ''] = left.splice(random.below(left.length), 1);
    return [id, random.pick([1e-5, 1, 10, 50])] as const;
  });
  const sum = picked.reduce((total, [, weight]) => total + weight, 0);
  return picked.map(([id, weight]) => [id, (100 * weight) / sum] as const);
}
