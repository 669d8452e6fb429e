import type { ComputedFormula, Formulary } from '../formulary/formulary.ts';
import type { Reference } from '../reference/reference.ts';
import { fingerprintOf } from './fingerprint.ts';
import { lotsInForce, weightsDigest } from './weights-digest.ts';

/** Every formula with its fingerprint, and every batch that has weights with its weights digest. */
export function withDigests({ reference, formulas }: Formulary): Formulary {
  return { reference, formulas: formulas.map((computed) => digested(computed, reference)) };
}

/** The same for one formula: what `compute` prints of a single file. */
export function digested(computed: ComputedFormula, reference: Reference): ComputedFormula {
  const { formula, document } = computed;
  const fingerprint = fingerprintOf(formula, reference);
  const lots = lotsInForce(formula, reference);
  return {
    ...computed,
    document: {
      ...document,
      fingerprint,
      batches: document.batches.map((batch) => ({
        ...batch,
        digest: weightsDigest(formula, fingerprint, batch, lots),
      })),
    },
  };
}
