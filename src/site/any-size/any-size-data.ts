import type { AnySizeData, NamedLine } from '../../browser/any-size-data.ts';
import { lowestSuperfat } from '../../cautions/lowest-superfat.ts';
import { vesselFillLimit } from '../../cautions/vessel-fill-limit.ts';
import type { ListedSize } from '../../chemistry/any-size.ts';
import { massOfFatsFor } from '../../chemistry/batch-size.ts';
import type { Formulation } from '../../chemistry/charge.ts';
import type { Fat } from '../../chemistry/materials.ts';
import { scalesOf } from '../../formulary/compute-batch.ts';
import type { FormulaDocument } from '../../formulary/document.ts';
import type { ComputedFormula } from '../../formulary/formulary.ts';
import { weightsTable } from '../../handbook/weights.ts';
import type { Reference } from '../../reference/reference.ts';
import type { Scale } from '../../reference/shop-records.ts';

type Listed = AnySizeData['limits']['listed'];

/**
 * What the page of a formula needs to reckon any size. `null` where the shop did not turn it on, or the formula has
 * no weights at any listed size: then there is nothing between which a size could lie.
 */
export function anySizeData(
  { charge, document }: ComputedFormula,
  reference: Reference,
): AnySizeData | null {
  const { shop, constants, cautionThresholds } = reference;
  const listed = shop.anySize ? listedSizes({ charge, document }, reference) : [];
  if (listed.length === 0) return null;
  const margin = cautionThresholds.limits['saturation-margin'].value;
  const { atStart } = document.lye.saturation;
  const tables = document.batches
    .filter(({ refused }) => !refused)
    .map((batch) => weightsTable(document, batch, reference));
  return {
    code: document.code,
    formulation: withoutCompositions(charge.formulation),
    constants,
    limits: {
      listed,
      largestShift: shop.largestSuperfatShift / 100,
      largestFill: vesselFillLimit(document.process, cautionThresholds) / 100,
      floors: floorsOf(document),
    },
    bars: barsOf(listed, reference),
    strongestLye: atStart === null ? null : (atStart - margin) / 100,
    thin: cautionThresholds.limits['superfat-margin'].value / 100,
    groups: uniqueBy(
      tables.flatMap(({ groups }) => groups.map(({ name, title }) => ({ group: name, title }))),
      ({ group }) => group,
    ),
    lines: uniqueBy(
      tables.flatMap(({ groups }) =>
        groups.flatMap(({ name: group, lines }) =>
          lines.map(({ id, name, lot }): NamedLine => ({ group, id, name, lot })),
        ),
      ),
      ({ group, id }) => `${group} ${id}`,
    ),
  };
}

/** The sizes with weights, by rising mass of fats. */
function listedSizes(
  { charge, document }: Pick<ComputedFormula, 'charge' | 'document'>,
  { shop, tables }: Reference,
): Listed {
  return document.batches
    .filter(({ refused }) => !refused)
    .flatMap(({ id, label }) => {
      const size = shop.batches.find((batch) => batch.id === id);
      if (!size) return [];
      const scales = scalesOf(size, shop);
      const fats = massOfFatsFor(size.size, charge, size.losses, tables.lyeDensity);
      if (!scales.ok || !fats.ok) return [];
      const { main, fine } = scales.value;
      const limits: ListedSize = {
        fats: fats.value,
        losses: size.losses,
        scales: { main: balance(main), fine: fine && balance(fine) },
        vessel: size.vessel ?? null,
        heatLimit: size.heatLimit ?? null,
      };
      return [{ id, label, ...limits }];
    })
    .sort((a, b) => a.fats - b.fats);
}

const balance = ({ step, error, capacity }: Scale) => ({ step, error, capacity });

/**
 * The release limit, or where a concession stands the lowest superfat that it was given for; and free alkali is
 * possible in no size where it is in none of the listed.
 */
function floorsOf(document: FormulaDocument): AnySizeData['limits']['floors'] {
  const { end, floor, lowest, met } = document.release;
  return [
    {
      end: end === 'expanded' ? 'expanded' : 'worstCase',
      floor: (met ? floor : Math.min(floor, lowest)) / 100,
    },
    { end: 'expanded', floor: Math.min(0, lowestSuperfat(document).lowest) / 100 },
  ];
}

function barsOf(listed: Listed, { shop }: Reference): AnySizeData['bars'] {
  const bars = listed.flatMap(({ id, label }) => {
    const size = shop.batches.find((batch) => batch.id === id)?.size;
    return size?.by === 'bars' ? [{ wetMass: size.wetMass, like: label }] : [];
  });
  return uniqueBy(bars, ({ wetMass }) => String(wetMass));
}

/** Weights and margins ask for no acids, no iodine and no density: they stay at home. */
function withoutCompositions(formulation: Formulation): Formulation {
  const bare = (fat: Fat): Fat => ({ ...fat, composition: null, iodineValue: null, density: null });
  return {
    ...formulation,
    fats: formulation.fats.map((line) => ({ ...line, fat: bare(line.fat) })),
    afterCookFats: formulation.afterCookFats.map((line) => ({ ...line, fat: bare(line.fat) })),
    liquids: formulation.liquids.map((line) => ({
      ...line,
      liquid: { ...line.liquid, fatData: line.liquid.fatData && bare(line.liquid.fatData) },
    })),
  };
}

function uniqueBy<T>(entries: readonly T[], keyOf: (entry: T) => string): readonly T[] {
  return [...new Map(entries.map((entry) => [keyOf(entry), entry])).values()];
}
