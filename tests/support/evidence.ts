import type { ModelId } from '../../src/reference/evidence/models.ts';
import { evidenceRows } from '../../src/reference/evidence/rows.ts';
import type { Reference } from '../../src/reference/reference.ts';
import { reportOn } from '../../src/reference/report.ts';
import type { Problem } from '../../src/words/problem.ts';

const NOWHERE = { line: 1, column: 1 };

/** The problems of a table with one record, beside a reference without fats. */
export function rowsFrom(
  record: {
    readonly model: ModelId;
    readonly of: string;
    readonly published: number;
    readonly tolerance: number;
  },
  reference: Reference,
  disagreements: { id: string; reason: string }[] = [],
): { problems: readonly Problem[] } {
  const problems: Problem[] = [];
  const report = reportOn(
    'evidence.yaml',
    { placeOf: () => NOWHERE, placeOfKey: () => NOWHERE },
    problems,
  );
  evidenceRows(
    {
      records: [
        {
          ...record,
          subject: record.of,
          unit: 'g/mol',
          source: 'jecfa-koh',
          at: 'nowhere',
          how: 'handbook',
        },
      ],
      disagreements,
    },
    { ...reference, fats: new Map() },
    report,
  );
  return { problems };
}
