import type { AlkaliSupply, Fat } from '../chemistry/materials.ts';
import { fraction, type MgKohPerGram, mgKohPerGram, type Range } from '../chemistry/quantity.ts';
import type { AlkaliLot, FatLot, Measured } from '../reference/lot-records.ts';
import type { AlkaliRecord } from '../reference/material-records.ts';
import type { Reference } from '../reference/reference.ts';

/** The same data as if the shop had no lots: every value is the published or trade range's. */
export const withoutLots = (reference: Reference): Reference => ({
  ...reference,
  lots: { fats: [], alkalis: [] },
});

/**
 * The measured value that takes the place of the published saponification value: of a free acid its acid
 * value, where that was measured. `null` where the lot has none.
 */
export const decidingValue = (lot: FatLot, kind: Fat['kind']): Measured | null =>
  (kind === 'free-acid' ? lot.acidValue : null) ?? lot.saponificationValue;

/**
 * A fat as it will be weighed: with the released lot's measured values, or as published. `lot` is null where
 * no lot decides the saponification value.
 *
 * Free acidity adds nothing to the alkali, because a saponification value counts the free acids already. Of a
 * wax it replaces the published acid value, which is all that lower ends count in cold process.
 */
export function fatInForce(
  fat: Fat,
  reference: Reference,
): { readonly fat: Fat; readonly lot: FatLot | null } {
  const lot = reference.lots.fats.find((lot) => lot.fat === fat.id && lot.status === 'released');
  if (!lot) return { fat, lot: null };
  const deciding = decidingValue(lot, fat.kind);
  return {
    fat: {
      ...fat,
      saponificationValue: deciding ? measured(deciding) : fat.saponificationValue,
      acidValue: lot.acidValue ? measured(lot.acidValue) : fat.acidValue,
    },
    lot: deciding ? lot : null,
  };
}

/** No acid value is below zero, however wide its interval. */
const measured = ({ value, uncertainty }: Measured): Range<MgKohPerGram> => ({
  value: mgKohPerGram(value),
  low: mgKohPerGram(Math.max(0, value - uncertainty)),
  high: mgKohPerGram(value + uncertainty),
  spread: 'expanded',
});

/** An alkali as it will be weighed: by the released lot's certificate or titration, or by the trade range. */
export function alkaliInForce(
  alkali: AlkaliRecord,
  reference: Reference,
): { readonly supply: AlkaliSupply; readonly lot: AlkaliLot | null } {
  const lot =
    reference.lots.alkalis.find((lot) => lot.alkali === alkali.id && lot.status === 'released') ??
    null;
  if (!lot) return { supply: alkali.trade, lot };
  return {
    lot,
    supply: {
      ...alkali.trade,
      form: lot.form,
      assay: {
        value: fraction(lot.assay / 100),
        low: fraction((lot.assay - lot.uncertainty) / 100),
        high: fraction(Math.min(100, lot.assay + lot.uncertainty) / 100),
        spread: 'expanded',
      },
      carbonate: fraction(lot.carbonate / 100),
      remainder: lot.form === 'solution' ? 'water' : alkali.trade.remainder,
    },
  };
}
