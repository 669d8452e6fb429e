import type { FormulaDocument } from '../formulary/document.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { fixed, plain, range } from '../words/numbers.ts';
import { nameOf, sourceName } from './names.ts';

/** Where one number that decides the weights comes from, in words. */
export interface ProvenanceRow {
  readonly id: string;
  readonly name: string;
  /** The blend that it comes in. */
  readonly blend: string | null;
  readonly share: string;
  readonly value: string;
  readonly range: string;
  readonly source: string;
  /** `from memory, not checked against the print` and the like. */
  readonly how: string;
}

/** The saponification value of each fat as used: value, range, and its lot or published source. */
export function fatProvenance(
  document: FormulaDocument,
  reference: Reference,
): readonly ProvenanceRow[] {
  return document.fats.map(({ id, blend, share, saponificationValue: used }) => {
    const record = reference.fats.get(id);
    const chosen = record?.chosen.saponificationValue ?? null;
    const lowered = record?.chosen.loweredBy ?? null;
    const published = [sourceName(reference, used.source), chosen?.at ?? ''].filter(Boolean);
    if (lowered) {
      published.push(words.formulaPage.provenance.loweredBy(sourceName(reference, lowered.source)));
    }
    return {
      id,
      name: nameOf(reference, id),
      blend: blend === undefined ? null : nameOf(reference, blend),
      share: `${plain(share, 2)} %`,
      value: fixed(used.value, 1),
      range: range(used.low, used.high, 1),
      source: used.lot
        ? words.formulaPage.provenance.lot(used.lot, used.source)
        : published.join('; '),
      how: used.lot ? words.frame.how.measured : chosen ? words.frame.how[chosen.how] : '',
    };
  });
}

/** The assay of each alkali as used, in percent. */
export function alkaliProvenance(
  document: FormulaDocument,
  reference: Reference,
): readonly Omit<ProvenanceRow, 'share' | 'blend'>[] {
  return document.alkali.map(({ id, assay }) => {
    const records = reference.alkalis.get(id)?.assays ?? [];
    return {
      id,
      name: nameOf(reference, id),
      value: `${fixed(assay.value, 1)} %`,
      range: range(assay.low, assay.high, 1),
      source: assay.lot
        ? words.formulaPage.lot(assay.lot)
        : [
            words.formulaPage.noLot,
            ...new Set(records.map(({ source }) => sourceName(reference, source))),
          ].join('; '),
      how: assay.lot
        ? words.frame.how.measured
        : [...new Set(records.map(({ how }) => words.frame.how[how]))].join('; '),
    };
  });
}
