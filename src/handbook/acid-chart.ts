import type { FormulaDocument } from '../formulary/document.ts';
import type { Reference } from '../reference/reference.ts';

export type AcidClass = 'saturated' | 'monounsaturated' | 'polyunsaturated' | 'hydroxy';

export interface AcidBar {
  readonly id: string;
  readonly name: string;
  /** Percent of the fatty acids. */
  readonly share: number;
  /** Percent of the chart's width. */
  readonly width: number;
}

export interface AcidGroup {
  readonly name: AcidClass;
  readonly share: number;
  readonly bars: readonly AcidBar[];
}

const CLASSES: readonly AcidClass[] = [
  'saturated',
  'monounsaturated',
  'polyunsaturated',
  'hydroxy',
];

/**
 * The acid profile in groups, each in order of chain length; `null` where the document has no profile.
 * Acids below 0.05 % are counted in their group's sum but get no bar. Hydroxylated acids stand on their
 * own, so the group sums are not the document's sums by double bonds.
 */
export function acidChart(
  { profile }: FormulaDocument,
  { acids }: Reference,
): readonly AcidGroup[] | null {
  if (!profile) return null;
  const largest = Math.max(...Object.values(profile.acids));
  const groups = new Map<AcidClass, { share: number; bars: AcidBar[] }>();
  const sorted = Object.entries(profile.acids).map(([id, share]) => {
    const record = acids.get(id);
    if (!record) throw new Error(`No record of the acid ${id} in the reference data`);
    return { record, share };
  });
  sorted.sort(
    (a, b) =>
      a.record.acid.carbons - b.record.acid.carbons ||
      a.record.acid.doubleBonds - b.record.acid.doubleBonds,
  );
  for (const { record, share } of sorted) {
    const name = classOf(record.acid);
    const group = groups.get(name) ?? { share: 0, bars: [] };
    group.share += share;
    if (share >= 0.05) {
      const width = Number(((100 * share) / largest).toFixed(2));
      group.bars.push({ id: record.acid.id, name: record.name, share, width });
    }
    groups.set(name, group);
  }
  return CLASSES.flatMap((name) => {
    const group = groups.get(name);
    return group && group.bars.length > 0 ? [{ name, ...group }] : [];
  });
}

function classOf(acid: { readonly doubleBonds: number; readonly hydroxyls: number }): AcidClass {
  if (acid.hydroxyls > 0) return 'hydroxy';
  if (acid.doubleBonds === 0) return 'saturated';
  return acid.doubleBonds === 1 ? 'monounsaturated' : 'polyunsaturated';
}
