import type { ComputedFormula, Formulary } from '../formulary/formulary.ts';
import { words } from '../words/catalogue.ts';

export interface ContentsGroup {
  readonly title: string;
  readonly formulas: readonly ComputedFormula[];
}

const KINDS = ['bar', 'paste', 'liquid'] as const;
const PROCESSES = ['cold', 'hot'] as const;

/** The formulas by kind and process; groups without formulas are left out. */
export function contentsGroups({ formulas }: Formulary): readonly ContentsGroup[] {
  return KINDS.flatMap((kind) =>
    PROCESSES.flatMap((process) => {
      const group = formulas.filter(
        ({ formula }) => formula.kind === kind && formula.process === process,
      );
      if (group.length === 0) return [];
      const key = `${kind} ${process}`;
      return [{ title: words.contentsPage.groups[key] ?? key, formulas: group }];
    }),
  );
}
