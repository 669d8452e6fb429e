import type { z } from 'zod';
import { fraction } from '../chemistry/quantity.ts';
import { firstClosedRange, isClosedRange } from './choice.ts';
import type { AlkaliRecord } from './material-records.ts';
import type { DataReport } from './report.ts';
import type { alkaliSchema } from './schema/chemicals.ts';
import { middleOf, valueRecord } from './schema/value.ts';
import type { ValueRecord } from './values.ts';

/**
 * An alkali without a lot: reckoned at the top of the envelope of its closed trade ranges, since stronger
 * alkali is what makes a soap caustic. Its carbonate is the middle of the first record, as far as room is left.
 */
export function alkaliRecord(
  id: AlkaliRecord['id'],
  raw: z.infer<typeof alkaliSchema>,
  report: DataReport,
): AlkaliRecord | null {
  const assays = raw.assay.map(valueRecord);
  const ranges = assays.filter(isClosedRange);
  if (firstClosedRange(assays) === null) {
    report.in(['assay'], 'data/no-trade-range', {
      found: 'no assay with both ends',
      expected: 'at least one trade range with "min" and "max"',
      advice: 'add the range in which the alkali is sold',
    });
    return null;
  }
  const low = Math.min(...ranges.map(({ min }) => min)) / 100;
  const high = Math.max(...ranges.map(({ max }) => max)) / 100;
  const [carbonate] = (raw.carbonate ?? [])
    .map(valueRecord)
    .map((record: ValueRecord) => middleOf(record) ?? 0);
  return {
    id,
    name: raw.name,
    inci: raw.inci,
    formula: raw.formula,
    cation: raw.cation,
    assays,
    trade: {
      id,
      cation: raw.cation,
      form: 'solid',
      assay: { value: fraction(high), low: fraction(low), high: fraction(high) },
      carbonate: fraction(Math.min((carbonate ?? 0) / 100, 1 - high)),
      remainder: raw.remainder,
    },
    notes: raw.notes ?? [],
  };
}
