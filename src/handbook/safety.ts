import { lowestSuperfat } from '../cautions/lowest-superfat.ts';
import type { ComputedFormula, Formulary } from '../formulary/formulary.ts';

interface Named {
  readonly code: string;
  readonly name: string;
}

/** What in a formulary needs most care, by its own numbers. */
export interface MostCare {
  /** Formulas with a caution marked danger, by code, and what their dangers say. */
  readonly dangers: readonly (Named & { readonly texts: readonly string[] })[];
  /** Hottest lye first. [degC] */
  readonly hottest: readonly (Named & { readonly peak: number })[];
  /** Formulas whose lye heat has no number. */
  readonly unknownHeat: readonly Named[];
  /** Lowest superfat first, over the formula and its batches, the scale counted. [percent] */
  readonly lowest: readonly (Named & { readonly lowest: number; readonly batch: string })[];
}

/** The gravest of a formulary; of heat and superfat the first `count`. */
export function mostCare({ formulas }: Formulary, count: number): MostCare {
  const named = ({ document: { code, name } }: ComputedFormula): Named => ({ code, name });
  return {
    dangers: formulas.flatMap((computed) => {
      const texts = computed.document.cautions
        .filter(({ severity }) => severity === 'danger')
        .map(({ text }) => text);
      return texts.length > 0 ? [{ ...named(computed), texts }] : [];
    }),
    hottest: formulas
      .flatMap((computed) => {
        const peak = computed.document.lye.peakTemperature;
        return peak === null ? [] : [{ ...named(computed), peak }];
      })
      .toSorted((a, b) => b.peak - a.peak)
      .slice(0, count),
    unknownHeat: formulas
      .filter(({ document }) => document.lye.peakTemperature === null)
      .map(named),
    lowest: formulas
      .map((computed) => ({ ...named(computed), ...lowestSuperfat(computed.document) }))
      .toSorted((a, b) => a.lowest - b.lowest)
      .slice(0, count),
  };
}
