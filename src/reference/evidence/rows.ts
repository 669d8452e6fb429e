import type { z } from 'zod';
import type { Reference } from '../reference.ts';
import type { DataReport } from '../report.ts';
import type { evidenceSchema } from '../schema/evidence.ts';
import { EVIDENCE_GROUPS, type EvidenceRow, judged } from './evidence.ts';
import { fatRows } from './fat-rows.ts';
import { type Context, MODELS } from './models.ts';

/**
 * The whole table of computed against published. A record whose model gives no number, a row that does not
 * agree and is not listed with its reason, and a listed one that agrees after all are problems: the table
 * can neither hide a failure nor keep an excuse.
 */
export function evidenceRows(
  raw: z.infer<typeof evidenceSchema>,
  reference: Reference,
  report: DataReport,
): readonly EvidenceRow[] {
  const disagreements = new Map(raw.disagreements.map(({ id, reason }) => [id, reason]));
  const weights = new Map(
    [...reference.elements].flatMap(([symbol, { value }]) =>
      value === null ? [] : [[symbol, value] as const],
    ),
  );
  const context: Context = { reference, weights };
  const listed = raw.records.flatMap((record, index): EvidenceRow[] => {
    const { group, compute } = MODELS[record.model];
    const computed = compute({ of: record.of, inputs: record.inputs ?? {} }, context);
    if (computed === null || Number.isNaN(computed)) {
      report.in(['records', index, 'of'], 'data/evidence-without-number', {
        found: `"${record.of}", for which the model ${record.model} gives no number`,
        expected: 'something that the data know, inside the range of the model',
        advice: 'mend the record or take it out',
      });
      return [];
    }
    return [
      judged(
        {
          id: `${record.model}/${record.of}/${record.source}`,
          group,
          subject: record.subject,
          computed,
          published: { value: record.published, min: null, max: null },
          unit: record.unit,
          tolerance: record.tolerance,
          source: record.source,
          at: record.at,
          how: record.how,
          note: record.note ?? null,
        },
        disagreements,
      ),
    ];
  });
  const rows = [...listed, ...fatRows(reference, disagreements)].sort(
    (a, b) => EVIDENCE_GROUPS.indexOf(a.group) - EVIDENCE_GROUPS.indexOf(b.group),
  );
  reportDisagreements(rows, raw.disagreements, report);
  return rows;
}

function reportDisagreements(
  rows: readonly EvidenceRow[],
  known: readonly { readonly id: string }[],
  report: DataReport,
): void {
  for (const row of rows) {
    if (row.agrees || row.disagreement) continue;
    report.in(['disagreements'], 'data/evidence-disagrees', {
      found: `${row.id}: computed ${row.computed.toPrecision(5)}, off by ${row.deviation.toPrecision(3)} ${row.unit}`,
      expected: `at most ${row.tolerance.toPrecision(3)} off what is published`,
      advice: 'find out why; if it is known not to agree, list the id with its reason',
    });
  }
  known.forEach(({ id }, index) => {
    if (rows.some((row) => row.id === id && !row.agrees)) return;
    report.in(['disagreements', index, 'id'], 'data/stale-exception', {
      found: `"${id}", which agrees or is not there`,
      expected: 'only rows that do not agree',
      advice: 'take it out',
    });
  });
}
