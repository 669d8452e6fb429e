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
    'saponification-value': z.number().gte(60).lte(400),
    uncertainty: z.number().gt(0).lte(10),
    method: line,
    ...common,
  })
  .superRefine((lot, context) => checkDates(lot, context));

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
