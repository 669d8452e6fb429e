import { z } from 'zod';
import { date } from './date.ts';
import { broken, line } from './value.ts';

const STATUS = ['quarantine', 'released', 'rejected'] as const;

const common = {
  lot: line,
  status: z.enum(STATUS),
  opened: date.optional(),
  'retest-by': date,
};

const fatLot = z
  .strictObject({
    fat: z.string(),
    'saponification-value': z.number().gte(60).lte(400).optional(),
    uncertainty: z.number().gt(0).lte(10).optional(),
    method: line.optional(),
    'acid-value': z.number().gte(0).lte(400).optional(),
    'acid-uncertainty': z.number().gt(0).lte(10).optional(),
    'acid-method': line.optional(),
    ...common,
  })
  .superRefine((lot, context) => {
    checkDates(lot, context);
    checkMeasured(lot, ['saponification-value', 'uncertainty', 'method'], context);
    checkMeasured(lot, ['acid-value', 'acid-uncertainty', 'acid-method'], context);
    if (lot['saponification-value'] === undefined && lot['acid-value'] === undefined) {
      context.addIssue(
        broken({
          rule: 'data/missing-key',
          found: 'a lot without a measured value',
          expected: '"saponification-value" or "acid-value"',
          advice: 'a lot enters the list when something of it was measured',
        }),
      );
    }
  });

const alkaliLot = z
  .strictObject({
    alkali: z.string(),
    form: z.enum(['solid', 'solution']),
    assay: z.number().gt(0).lte(100),
    uncertainty: z.number().gt(0).lte(5),
    carbonate: z.number().gte(0).lte(20),
    ...common,
  })
  .superRefine((lot, context) => {
    checkDates(lot, context);
    checkParts(lot, context);
  });

/** `data/lots.yaml`. */
export const lotsSchema = z.strictObject({
  fats: z.array(fatLot).optional(),
  alkalis: z.array(alkaliLot).optional(),
});

export type RawLots = z.infer<typeof lotsSchema>;

interface Context {
  addIssue(issue: ReturnType<typeof broken>): void;
}

/** A measured value stands with its uncertainty and its method, or not at all. */
function checkMeasured(
  lot: Readonly<Record<string, unknown>>,
  keys: readonly string[],
  context: Context,
): void {
  const absent = keys.filter((key) => lot[key] === undefined);
  if (absent.length === 0 || absent.length === keys.length) return;
  const quoted = (names: readonly string[]) => names.map((name) => `"${name}"`).join(' and ');
  context.addIssue(
    broken({
      rule: 'data/missing-key',
      found: `a lot without ${quoted(absent)}`,
      expected: `${quoted(keys)} together`,
      advice: 'add what is missing; a value without its uncertainty says nothing of the margin',
    }),
  );
}

function checkDates(
  lot: { readonly opened?: string | undefined; readonly 'retest-by': string },
  context: Context,
): void {
  if (lot.opened === undefined || lot.opened <= lot['retest-by']) return;
  context.addIssue(
    broken({
      rule: 'data/lot-dates',
      found: `opened ${lot.opened}, retest by ${lot['retest-by']}`,
      expected: 'the retest after the opening',
      advice: 'check both dates',
    }),
  );
}

/** A slip between solid and solution shows here: neither is sold outside these strengths. */
function checkParts(
  lot: { readonly form: 'solid' | 'solution'; readonly assay: number; readonly carbonate: number },
  context: Context,
): void {
  const [least, most] = lot.form === 'solid' ? [70, 100] : [5, 75];
  if (lot.assay < least || lot.assay > most) {
    context.addIssue(
      broken({
        rule: 'data/out-of-range',
        found: `assay ${lot.assay} of a ${lot.form}`,
        expected: `${least} to ${most} percent`,
        advice: 'check the assay and the form',
      }),
    );
  }
  if (lot.assay + lot.carbonate > 100) {
    context.addIssue(
      broken({
        rule: 'data/lot-sum',
        found: `assay ${lot.assay} and carbonate ${lot.carbonate}`,
        expected: 'at most 100 percent together',
        advice: 'the assay must be of hydroxide alone; a total alkali counts the carbonate too',
      }),
    );
  }
}
