import type { BatchDocument } from '../formulary/document.ts';
import type { Formula } from '../formulary/formula.ts';
import { usersOfLot } from '../formulary/lot-users.ts';
import type { Reference } from '../reference/reference.ts';
import type { Canonical } from './canonical-text.ts';
import { digestOf } from './digest.ts';

/**
 * The digest of what one sheet prints to weigh, or `null` for a batch without weights. It changes with the
 * fingerprint, with any weight or step, and with the lots; not with a label or a telephone number.
 */
export function weightsDigest(
  formula: Formula,
  fingerprint: string,
  batch: BatchDocument,
  lots: readonly LotInForce[],
): string | null {
  return batch.refused ? null : digestOf(weighedContent(formula, fingerprint, batch, lots));
}

/** What a sheet prints to weigh, as the data whose canonical text is hashed. */
export function weighedContent(
  { code }: Formula,
  fingerprint: string,
  batch: BatchDocument,
  lots: readonly LotInForce[],
): Canonical {
  const lines = (of: BatchDocument['fats' | 'additives']): Canonical =>
    of.map((line) => ({
      id: line.id,
      mass: line.weighedMass,
      step: line.step,
      at: 'at' in line && typeof line.at === 'string' ? line.at : undefined,
    }));
  return {
    code,
    batch: batch.id,
    fingerprint,
    lots: lots.map(({ material, lot }) => ({ material, lot })),
    fats: lines(batch.fats),
    'after-cook-fats': lines(batch.afterCookFats),
    alkali: lines(batch.alkali),
    water: batch.weighedWater,
    'water-step': batch.waterStep,
    'held-back': batch.weighedHeldBack,
    liquids: lines(batch.liquids),
    additives: lines(batch.additives),
  };
}

export interface LotInForce {
  readonly material: string;
  readonly lot: string;
}

/** The released lots of what a formula weighs; sorted by material. */
export function lotsInForce(formula: Formula, { lots }: Reference): readonly LotInForce[] {
  return [...lots.fats, ...lots.alkalis]
    .filter((lot) => lot.status === 'released' && usersOfLot(lot, [formula]).length > 0)
    .map((lot) => ({ material: 'fat' in lot ? lot.fat : lot.alkali, lot: lot.lot }))
    .sort((a, b) => (a.material < b.material ? -1 : 1));
}
