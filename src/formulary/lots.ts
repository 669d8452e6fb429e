import type { AlkaliSupply, Fat } from '../chemistry/materials.ts';
import { fraction, mgKohPerGram, type Range } from '../chemistry/quantity.ts';
import type { AlkaliLot, AlkaliRecord, FatLot, Reference } from '../reference/reference.ts';

/** A fat as it will be weighed: with the released lot's measured value, or as published. */
export function fatInForce(
  fat: Fat,
  reference: Reference,
): { readonly fat: Fat; readonly lot: FatLot | null } {
  const lot =
    reference.lots.fats.find((lot) => lot.fat === fat.id && lot.status === 'released') ?? null;
  if (!lot) return { fat, lot };
  return { fat: { ...fat, saponificationValue: measured(lot, mgKohPerGram) }, lot };
}

const measured = <Q extends number>(lot: FatLot, typed: (x: number) => Q): Range<Q> => ({
  value: typed(lot.saponificationValue),
  low: typed(lot.saponificationValue - lot.uncertainty),
  high: typed(lot.saponificationValue + lot.uncertainty),
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
