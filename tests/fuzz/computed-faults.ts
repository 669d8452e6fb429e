import { cautionsOf } from '../../src/cautions/with-cautions.ts';
import { digested } from '../../src/edition/with-digests.ts';
import { computeFormula } from '../../src/formulary/compute.ts';
import type { Formula } from '../../src/formulary/formula.ts';
import type { ComputedFormula } from '../../src/formulary/formulary.ts';
import { releaseProblems } from '../../src/formulary/release.ts';
import { cardContent } from '../../src/handbook/card-content.ts';
import { declarationOf } from '../../src/handbook/declaration/declaration.ts';
import { methodHtml } from '../../src/handbook/method-html.ts';
import { benchSheet } from '../../src/handbook/sheet.ts';
import { stepMathml } from '../../src/handbook/working/step-mathml.ts';
import { workingSections } from '../../src/handbook/working/working.ts';
import type { Reference } from '../../src/reference/reference.ts';
import { documentFaults } from './document-faults.ts';
import { pieceFaults } from './page-faults.ts';
import { problemFaults } from './problem-faults.ts';

const AS_OF = '2026-12-01';

/** From a formula that was accepted to everything that pages show of it: what is wrong with any of that. */
export function computedFaults(
  formula: Formula,
  reference: Reference,
  text: string,
): readonly string[] {
  const { computed, problems } = computeFormula(formula, reference);
  const refused = problems.flatMap((problem) => problemFaults(problem, text));
  if (!computed) return problems.length > 0 ? refused : ['not computed without a reason'];
  const { release } = computed.document;
  const limits = releaseProblems(formula, computed.document);
  const published = !release.met && !release.concession && limits.length === 0;
  const finished = digested(
    {
      ...computed,
      document: { ...computed.document, cautions: cautionsOf(computed, reference, AS_OF) },
    },
    reference,
  );
  return [
    ...refused,
    ...limits.flatMap((problem) => problemFaults(problem, text)),
    ...(published ? ['free alkali is published without a concession'] : []),
    ...documentFaults(finished.document),
    ...piecesOf(finished, reference).flatMap(pieceFaults),
  ];
}

/** All that goes into pages as markup. What Astro escapes is looked at in a whole site. */
function piecesOf(computed: ComputedFormula, reference: Reference): readonly string[] {
  const { formula, document } = computed;
  declarationOf(computed, reference);
  for (const batch of document.batches) {
    if (!batch.refused) benchSheet(computed, batch, reference);
    cardContent(computed, batch, reference, AS_OF);
  }
  return [
    ...[null, ...document.batches].map((batch) => methodHtml(formula, batch)),
    ...workingSections(computed, reference).flatMap(({ steps }) => steps.map(stepMathml)),
  ];
}
