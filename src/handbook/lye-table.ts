import type { BatchDocument, FormulaDocument } from '../formulary/document.ts';
import type { Formulary } from '../formulary/formulary.ts';
import { words } from '../words/catalogue.ts';
import { stepDecimals, weight } from '../words/measures.ts';
import { nameOf } from './names.ts';
import { alkaliName } from './weights.ts';

/** One formula's line at one batch size. Cells are in the order of the table's columns. */
export interface LyeRow {
  readonly code: string;
  readonly name: string;
  readonly kind: FormulaDocument['kind'];
  readonly revision: number;
  /** One of its cautions is a danger. */
  readonly danger: boolean;
  /** One text per alkali column, `null` where the formula does not use that alkali. */
  readonly alkali: readonly (string | null)[];
  readonly water: string | null;
  readonly heldBack: string | null;
  /** Acids, salts and liquids that go into the lye: leaving one out changes the superfat. */
  readonly also: readonly { readonly name: string; readonly text: string }[];
  /** In place of the weights, where the size was refused. */
  readonly refused: string | null;
}

export interface LyeTable {
  readonly batch: string;
  readonly label: string;
  readonly alkalis: readonly { readonly id: string; readonly name: string }[];
  /** Of a stock lye in the table: its own water is counted. */
  readonly notes: readonly string[];
  readonly hasHeldBack: boolean;
  readonly hasAlso: boolean;
  readonly decimals: number;
  readonly rows: readonly LyeRow[];
}

/** Alkali and water of all formulas at one batch size, sorted by code. */
export function lyeTable({ reference, formulas }: Formulary, batchId: string): LyeTable {
  const entries = formulas.flatMap(({ document }) => {
    const batch = document.batches.find(({ id }) => id === batchId);
    return batch ? [{ document, batch }] : [];
  });
  const used = new Set(entries.flatMap(({ document }) => document.alkali.map(({ id }) => id)));
  const alkalis = [...reference.alkalis.values()]
    .filter(({ id }) => used.has(id))
    .map(({ id }) => {
      // every formula weighs an alkali from the one lot in force, so one name holds for the column
      const [user] = entries.filter(({ document }) =>
        document.alkali.some((line) => line.id === id),
      );
      return { id, name: user ? alkaliName(user.document, id, reference) : nameOf(reference, id) };
    });
  const rows = entries.map(({ document, batch }): LyeRow => {
    const { code, name, kind, revision } = document;
    return {
      code,
      name,
      kind,
      revision,
      danger: document.cautions.some(({ severity }) => severity === 'danger'),
      ...cellsOf(batch, alkalis, (id) => nameOf(reference, id)),
    };
  });
  const steps = entries.flatMap(({ batch }) => [
    batch.waterStep,
    batch.heldBackStep,
    ...batch.alkali.map(({ step }) => step),
  ]);
  return {
    batch: batchId,
    label: reference.shop.batches.find(({ id }) => id === batchId)?.label ?? batchId,
    alkalis,
    notes: alkalis
      .filter(({ id }) =>
        entries.some(({ document }) =>
          document.alkali.some((line) => line.id === id && line.form === 'solution'),
        ),
      )
      .map(({ id }) => words.formulaPage.stockNote(nameOf(reference, id))),
    hasHeldBack: rows.some(({ heldBack }) => heldBack !== null),
    hasAlso: rows.some(({ also }) => also.length > 0),
    decimals: Math.max(0, ...steps.map(stepDecimals)),
    rows,
  };
}

/** The rows of each kind under its heading, in the order of `KINDS`; kinds without a row are left out. */
export function rowsByKind(
  rows: readonly LyeRow[],
): readonly { readonly kind: LyeRow['kind']; readonly rows: readonly LyeRow[] }[] {
  return KINDS.map((kind) => ({ kind, rows: rows.filter((row) => row.kind === kind) })).filter(
    (group) => group.rows.length > 0,
  );
}

const KINDS: readonly LyeRow['kind'][] = ['bar', 'paste', 'liquid'];

function cellsOf(
  batch: BatchDocument,
  alkalis: LyeTable['alkalis'],
  name: (id: string) => string,
): Omit<LyeRow, 'code' | 'name' | 'kind' | 'revision' | 'danger'> {
  if (batch.refused) {
    const reason = words.breachText(batch.refused.rule, batch.refused.numbers);
    const alkali = alkalis.map(() => null);
    return { alkali, water: null, heldBack: null, also: [], refused: reason };
  }
  const heldBack = batch.weighedHeldBack ?? 0;
  return {
    alkali: alkalis.map(({ id }) => {
      const line = batch.alkali.find((each) => each.id === id);
      return line ? weight(line.weighedMass, line.step) : null;
    }),
    water:
      batch.weighedWater === null ? null : weight(batch.weighedWater - heldBack, batch.waterStep),
    heldBack: heldBack > 0 ? weight(heldBack, batch.heldBackStep) : null,
    also: [...batch.liquids, ...batch.additives]
      .filter(({ at }) => at === 'lye')
      .map(({ id, weighedMass, step }) => ({ name: name(id), text: weight(weighedMass, step) })),
    refused: null,
  };
}
