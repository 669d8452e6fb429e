import { nearestId } from '../reference/nearest.ts';
import type { Known } from './known.ts';
import { TARGETS, type TargetName } from './target.ts';

/** What the text of a formula may print, and how often the formula has it. */
export interface AmountNames {
  readonly weights: ReadonlyMap<string, number>;
  readonly alkalis: ReadonlyMap<string, number>;
  readonly temperatures: ReadonlyMap<string, number>;
  readonly times: ReadonlyMap<string, number>;
  readonly heldBack: boolean;
  /** Ids that a misspelt id of the frontmatter was meant to be: one mistake, one problem. */
  readonly misspelt: ReadonlySet<string>;
}

/** Taken from the frontmatter as it stands, so that a mistake in one key is not told twice. */
export function amountNames(
  value: Readonly<Record<string, unknown>>,
  known: Known | null,
): AmountNames {
  const ids = [
    ...idsOf(value.fats, 'fat'),
    ...idsOf(value.fats, 'blend'),
    ...idsOf(value['after-cook-fats'], 'fat'),
    ...idsOf(value.additives, 'additive'),
    ...idsOf(value.liquids, 'liquid'),
  ];
  const weights = new Map<string, number>();
  for (const id of ids) weights.set(id, (weights.get(id) ?? 0) + 1);
  const candidates = known
    ? [...known.fats, ...known.blends, ...known.additives, ...known.liquids]
    : [];
  const exact = new Set(candidates.map(([id]) => id));
  const misspelt = ids
    .filter((id) => !exact.has(id))
    .flatMap((id) => nearestId(id, candidates) ?? []);

  const alkali = recordOf(value.alkali);
  const targets = Object.keys(recordOf(value.targets)).filter((name) =>
    Object.hasOwn(TARGETS, name),
  );
  const ofTarget = (of: 'temperature' | 'time') =>
    once(targets.filter((name) => TARGETS[name as TargetName].of === of));
  return {
    weights,
    alkalis: once(['sodium', 'potassium'].filter((name) => Number(alkali[name] ?? 0) > 0)),
    temperatures: ofTarget('temperature'),
    times: ofTarget('time'),
    heldBack: Number(recordOf(value.water)['hold-back'] ?? 0) > 0,
    misspelt: new Set(misspelt),
  };
}

const once = (names: readonly string[]) => new Map(names.map((name) => [name, 1]));

const recordOf = (value: unknown): Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null ? (value as Record<string, unknown>) : {};

function idsOf(list: unknown, key: string): string[] {
  if (!Array.isArray(list)) return [];
  return list.map((entry) => recordOf(entry)[key]).filter((id) => typeof id === 'string');
}
