import { massBalance, massIn } from '../chemistry/balance.ts';
import { fatWeighings } from '../chemistry/blend.ts';
import type { Charge } from '../chemistry/charge.ts';
import { superfatMargin } from '../chemistry/margin.ts';
import { type Breach, type Fraction, given, type Outcome, refused } from '../chemistry/quantity.ts';
import type { WeighedCharge } from '../chemistry/weigh.ts';
import { weighSize } from '../chemistry/weigh-size.ts';
import { yields } from '../chemistry/yields.ts';
import type { Reference } from '../reference/reference.ts';
import type { BatchSize, Scale, Shop } from '../reference/shop-records.ts';
import type { BatchDocument } from './document.ts';
import { percentRange } from './percent-range.ts';

/**
 * One batch size of a formula: rounded weights with their margin and yield, or the reason why there are none.
 * `driedTo` is the release moisture of a bar, `null` for a paste or liquid.
 */
export function computeBatch(
  charge: Charge,
  batch: BatchSize,
  driedTo: Fraction | null,
  reference: Reference,
): BatchDocument {
  const weighed = weighBatch(charge, batch, reference);
  if (!weighed.ok) return refusedBatch(batch, weighed.breach);
  const { charge: rounded, steps, superfat, weighing } = weighed.value;
  const margin = superfatMargin(rounded, reference.constants, weighing);
  if (!margin.ok) return refusedBatch(batch, margin.breach);
  const balance = massBalance(rounded, reference.constants);
  const kept = 1 - batch.losses;
  return {
    id: batch.id,
    label: batch.label,
    digest: null,
    fats: fatWeighings(rounded.fats).map(({ id, mass, lines: [first = 0] }) =>
      line(id, mass, steps.fats[first]),
    ),
    afterCookFats: rounded.afterCookFats.map(({ fat, mass }, i) =>
      line(fat.id, mass, steps.afterCookFats[i]),
    ),
    alkali: rounded.alkali.map(({ supply, weighedMass }, i) => ({
      ...line(supply.id, weighedMass, steps.alkali[i]),
      ...(supply.form === 'solution' && { solution: supply.assay.value * 100 }),
    })),
    weighedWater: rounded.water,
    waterStep: steps.water,
    weighedHeldBack: rounded.heldBack,
    heldBackStep: steps.heldBack,
    liquids: rounded.liquids.map(({ liquid, mass, at }, i) => ({
      ...line(liquid.id, mass, steps.liquids[i]),
      at,
    })),
    additives: rounded.additives.map(({ additive, mass, at }, i) => ({
      ...line(additive.id, mass, steps.additives[i]),
      at,
    })),
    massOfFats: rounded.fats.reduce((sum, { mass }) => sum + mass, 0),
    total: massIn(rounded),
    superfat: {
      weighed: superfat * 100,
      expanded: percentRange(margin.value.expanded),
      worstCase: percentRange(margin.value.worstCase),
    },
    bars: batch.size.by === 'bars' ? batch.size.count : null,
    yield: {
      poured: balance.total * kept,
      releasedMass: yields(balance, driedTo).releasedMass * kept,
      soap: balance.soap * kept,
    },
    refused: null,
  };
}

const line = (id: string, weighedMass: number, step = 0) => ({ id, weighedMass, step });

/** The core's answer for one batch size, before it is put into words. */
export function weighBatch(
  charge: Charge,
  batch: BatchSize,
  reference: Reference,
): Outcome<WeighedCharge> {
  const { shop, tables, constants } = reference;
  const scales = scalesOf(batch, shop);
  if (!scales.ok) return scales;
  const weighing = {
    scales: scales.value,
    losses: batch.losses,
    largestShift: shop.largestSuperfatShift / 100,
    lyeDensity: tables.lyeDensity,
  };
  return weighSize(charge, batch.size, weighing, constants);
}

/** The scales of a batch size. Refuses `scale-not-known` where the shop has none of that name. */
export function scalesOf(
  batch: Pick<BatchSize, 'scale' | 'fineScale'>,
  { scales }: Pick<Shop, 'scales'>,
): Outcome<{ readonly main: Scale; readonly fine: Scale | null }> {
  const main = scales.find(({ id }) => id === batch.scale);
  if (!main) return refused('scale-not-known');
  return given({ main, fine: scales.find(({ id }) => id === batch.fineScale) ?? null });
}

function refusedBatch(batch: BatchSize, breach: Breach): BatchDocument {
  return {
    id: batch.id,
    label: batch.label,
    digest: null,
    fats: [],
    afterCookFats: [],
    alkali: [],
    weighedWater: null,
    waterStep: 0,
    weighedHeldBack: null,
    heldBackStep: 0,
    liquids: [],
    additives: [],
    massOfFats: null,
    total: null,
    superfat: null,
    bars: null,
    yield: null,
    refused: breach,
  };
}
