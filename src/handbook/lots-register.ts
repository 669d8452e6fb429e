import type { Formulary } from '../formulary/formulary.ts';
import { usersOfLot } from '../formulary/lot-users.ts';
import { decidingValue } from '../formulary/lots.ts';
import type { AlkaliLot, FatLot, LotStatus, Measured } from '../reference/lot-records.ts';
import { words } from '../words/catalogue.ts';
import { plain } from '../words/numbers.ts';
import { nameOf } from './names.ts';

/** One lot of the shop as its register shows it. */
export interface LotRow {
  readonly material: string;
  /** Page of the material. */
  readonly page: string;
  readonly lot: string;
  readonly status: LotStatus;
  /** Each measured value with its uncertainty, its method and what it does to the weights. */
  readonly values: readonly { readonly text: string; readonly how: string }[];
  readonly opened: string | null;
  readonly retestBy: string;
  readonly retestPassed: boolean;
  /** Formulas weighed from it; empty where it is not released. */
  readonly formulas: readonly { readonly code: string; readonly name: string }[];
}

/** All lots, alkalis first; by material, the released one before the others. */
export function lotRows({ reference, formulas }: Formulary, asOf: string): readonly LotRow[] {
  const inUse = formulas.map(({ formula }) => formula);
  const row = (lot: FatLot | AlkaliLot): LotRow => {
    const id = 'fat' in lot ? lot.fat : lot.alkali;
    return {
      material: nameOf(reference, id),
      page: `/${'fat' in lot ? 'fats' : 'materials'}/${id}.html`,
      lot: lot.lot,
      status: lot.status,
      values: 'fat' in lot ? fatValues(lot, reference.fats.get(id)?.kind) : alkaliValues(lot),
      opened: lot.opened,
      retestBy: lot.retestBy,
      retestPassed: lot.retestBy < asOf,
      formulas:
        lot.status === 'released'
          ? usersOfLot(lot, inUse).map(({ code, name }) => ({ code, name }))
          : [],
    };
  };
  const ordered = (lots: readonly (FatLot | AlkaliLot)[]) =>
    lots
      .map(row)
      .toSorted(
        (a, b) =>
          compare(a.material, b.material) ||
          RANK[a.status] - RANK[b.status] ||
          compare(a.lot, b.lot),
      );
  return [...ordered(reference.lots.alkalis), ...ordered(reference.lots.fats)];
}

const RANK: Readonly<Record<LotStatus, number>> = { released: 0, quarantine: 1, rejected: 2 };

const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);

function fatValues(lot: FatLot, kind: 'glyceride' | 'free-acid' | 'wax' = 'glyceride') {
  const { saponificationValue, acidValue } = words.fatPages.measures;
  const text = words.lotsPage;
  const deciding = decidingValue(lot, kind);
  const entry = (name: string, measured: Measured | null, otherwise: string) =>
    measured
      ? [
          {
            text: text.value(name, measured.value, measured.uncertainty),
            how: roleOf(measured.method, lot, measured === deciding ? text.decides : otherwise),
          },
        ]
      : [];
  return [
    ...entry(saponificationValue, lot.saponificationValue, text.besideAcid),
    ...entry(acidValue, lot.acidValue, kind === 'wax' ? text.ofWax : text.freeAcid),
  ];
}

function alkaliValues(lot: AlkaliLot) {
  const { form, assay, uncertainty, carbonate } = lot;
  const text = words.lotsPage;
  return [
    {
      text: text.assay(form, assay, uncertainty),
      how: roleOf(text.carbonate(plain(carbonate, 2)), lot, text.decides),
    },
  ];
}

/** A lot that is not released does nothing to any weight, so nothing is said of what it does. */
const roleOf = (what: string, { status }: FatLot | AlkaliLot, role: string) =>
  status === 'released' ? `${what}; ${role}` : what;
