import type { ComputedFormula } from '../../formulary/formulary.ts';
import { dayOf } from '../../search/finder/finder-data.ts';
import type { FindProperty, findWords } from '../../words/en/find.ts';
import { degrees } from '../../words/measures.ts';

type Group = keyof typeof findWords.groups;

/** One property of the finder and where it is found in a formula. */
export interface NumberProperty {
  readonly id: FindProperty;
  readonly group: Group;
  readonly decimals: number;
  readonly format: 'number' | 'date';
  readonly value: (computed: ComputedFormula) => number | null;
}

const number =
  (group: Group) =>
  (
    id: FindProperty,
    decimals: number,
    value: (document: ComputedFormula['document']) => number | null,
  ): NumberProperty => ({
    id,
    group,
    decimals,
    format: 'number',
    value: ({ document }) => value(document),
  });

const superfat = number('superfat');
const fats = number('fats');
const lye = number('lye');
const soap = number('soap');

const date = (
  id: FindProperty,
  value: (formula: ComputedFormula['formula']) => string | undefined,
): NumberProperty => ({
  id,
  group: 'paper',
  decimals: 0,
  format: 'date',
  value: ({ formula }) => dayOf(value(formula) ?? ''),
});

/** All that a formula computes or declares as one number, single acids apart. */
export const NUMBER_PROPERTIES: readonly NumberProperty[] = [
  superfat('superfat', 1, (document) => document.superfat.written),
  superfat('lowest-superfat', 1, (document) => document.superfat.expanded[0]),
  superfat('final-superfat', 1, (document) => document.superfat.final),
  fats('saponification-value', 1, ({ profile }) => profile?.saponificationValue ?? null),
  fats('iodine-value', 1, ({ profile }) => profile?.iodineValue ?? null),
  fats('oxidisability', 2, ({ profile }) => profile?.oxidisability ?? null),
  fats('bis-allylic', 1, ({ profile }) => profile?.bisAllylicPositions ?? null),
  fats('chain-length', 2, ({ profile }) => profile?.meanChainLength ?? null),
  fats('saturated', 1, ({ profile }) => profile?.saturated ?? null),
  fats('monounsaturated', 1, ({ profile }) => profile?.monounsaturated ?? null),
  fats('polyunsaturated', 1, ({ profile }) => profile?.polyunsaturated ?? null),
  lye('lye-concentration', 1, (document) => document.lye.concentration),
  lye('lye-as-made', 1, (document) => document.lye.asMade),
  lye('lye-temperature', 0, ({ lye: { peakTemperature: peak } }) =>
    peak === null ? null : degrees(peak),
  ),
  soap('tfm-fresh', 1, (document) => document.yield.totalFattyMatter.fresh),
  soap('tfm-released', 1, (document) =>
    document.kind === 'bar' ? document.yield.totalFattyMatter.released : null,
  ),
  soap('glycerol-fresh', 1, (document) => document.yield.glycerolShare.fresh),
  soap('glycerol-released', 1, (document) =>
    document.kind === 'bar' ? document.yield.glycerolShare.released : null,
  ),
  soap('water-fresh', 1, (document) => document.yield.moisture.fresh),
  number('paper')('revision', 0, ({ revision }) => revision),
  date('approved-on', ({ approval }) => approval?.on),
  date('review-by', ({ approval }) => approval?.reviewBy),
];
