import { alkaliInForce, fatInForce } from '../formulary/lots.ts';
import type { Reference } from '../reference/reference.ts';
import { fixed, plain, range } from '../words/numbers.ts';
import { alkaliPerHundred } from './fat-sheet.ts';

export interface FatAlkaliRow {
  readonly id: string;
  readonly name: string;
  /** Used, in mg KOH per g, and its range. */
  readonly value: string;
  readonly range: string;
  readonly lot: string | null;
  /** One text per alkali: g to weigh for 100 g of the fat, rounded down. */
  readonly alkali: readonly string[];
}

export interface FatAlkaliTable {
  readonly alkalis: readonly {
    readonly id: string;
    readonly name: string;
    /** Percent hydroxide that it is reckoned with. */
    readonly assay: string;
    readonly lot: string | null;
    readonly isSolution: boolean;
  }[];
  /** By name. */
  readonly rows: readonly FatAlkaliRow[];
}

/** Alkali as weighed for 100 g of each fat alone with nothing left over, by the lots in force. */
export function fatAlkaliTable(reference: Reference): FatAlkaliTable {
  const { hydroxide } = reference.constants;
  const alkalis = [...reference.alkalis.values()].map((record) => {
    const { supply, lot } = alkaliInForce(record, reference);
    return { record, supply, lot };
  });
  const rows = [...reference.fats.values()].flatMap((record): FatAlkaliRow[] => {
    if (!record.core) return [];
    const { fat, lot } = fatInForce(record.core, reference);
    const { value, low, high } = fat.saponificationValue;
    return [
      {
        id: record.id,
        name: record.name,
        value: plain(value, 1),
        range: range(low, high, 1),
        lot: lot?.lot ?? null,
        alkali: alkalis.map(({ record: { cation }, supply }) => {
          const pure = alkaliPerHundred(value, { KOH: hydroxide.K, alkali: hydroxide[cation] });
          return roundedDown(pure / supply.assay.value);
        }),
      },
    ];
  });
  return {
    alkalis: alkalis.map(({ record, supply, lot }) => ({
      id: record.id,
      name: record.name,
      assay: plain(supply.assay.value * 100, 1),
      lot: lot?.lot ?? null,
      isSolution: supply.form === 'solution',
    })),
    rows: rows.sort((a, b) => (a.name < b.name ? -1 : 1)),
  };
}

/** Never up: of two readings the one that leaves less free alkali. A digit is spared from binary fractions. */
const roundedDown = (grams: number) => fixed(Math.floor(grams * 100 + 1e-9) / 100, 2);
