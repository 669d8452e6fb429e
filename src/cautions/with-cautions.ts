import type { CautionDocument } from '../formulary/document.ts';
import type { ComputedFormula, Formulary } from '../formulary/formulary.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import type { CautionId } from '../words/en/cautions.ts';
import { type Basis, type CautionContext, SEVERITIES } from './rule.ts';
import { RULES } from './rules.ts';

/**
 * The formulary with the cautions of every formula in its document, gravest first.
 *
 * `asOf` is the day of the edition, `YYYY-MM-DD`; without it nothing is said of retest dates.
 */
export function withCautions(formulary: Formulary, asOf: string | null = null): Formulary {
  const { reference } = formulary;
  return {
    ...formulary,
    formulas: formulary.formulas.map((computed) => ({
      ...computed,
      document: { ...computed.document, cautions: cautionsOf(computed, reference, asOf) },
    })),
  };
}

/** The cautions of one formula, gravest first; those of one severity in the order of the rules. */
export function cautionsOf(
  computed: ComputedFormula,
  reference: Reference,
  asOf: string | null,
): readonly CautionDocument[] {
  const context = { ...computed, reference, thresholds: reference.cautionThresholds, asOf };
  const rank = (caution: CautionDocument) => SEVERITIES.indexOf(caution.severity);
  return (Object.keys(RULES) as CautionId[])
    .flatMap((id) => applied(id, context))
    .sort((a, b) => rank(a) - rank(b));
}

function applied<Id extends CautionId>(id: Id, context: CautionContext): CautionDocument[] {
  const { severity, basis, applies } = RULES[id];
  return applies(context).map((numbers) => ({
    id,
    severity,
    numbers: { ...numbers },
    ...words.cautionTexts[id](numbers),
    basis: basisText(basis, context.reference),
  }));
}

function basisText(basis: Basis, { cautionThresholds, tables }: Reference): string {
  const { limits, materials } = cautionThresholds;
  if (typeof basis === 'string') return basis;
  if ('table' in basis) {
    const sources = tables.sets[basis.table].filter(({ used }) => used).map(({ source }) => source);
    return [...new Set(sources)].join(', ');
  }
  return 'limit' in basis ? limits[basis.limit].basis : materials[basis.materials].basis;
}
