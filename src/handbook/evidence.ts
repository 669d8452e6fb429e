import {
  EVIDENCE_GROUPS,
  type EvidenceGroup,
  type EvidenceRow,
  type Published,
} from '../reference/evidence/evidence.ts';
import type { Reference } from '../reference/reference.ts';
import { words } from '../words/catalogue.ts';
import { fixed, plain } from '../words/numbers.ts';
import { sourceName } from './names.ts';

export interface EvidenceLine {
  readonly id: string;
  readonly subject: string;
  readonly computed: string;
  readonly published: string;
  readonly tolerance: string;
  readonly deviation: string;
  readonly agrees: boolean;
  readonly unit: string;
  readonly source: string;
  readonly how: string;
  readonly note: string | null;
}

/** The rows of the evidence in words, by group, in the order of the page. */
export function evidenceTables(
  rows: readonly EvidenceRow[],
  reference: Reference,
): readonly { readonly group: EvidenceGroup; readonly lines: readonly EvidenceLine[] }[] {
  return EVIDENCE_GROUPS.map((group) => ({
    group,
    lines: rows.filter((row) => row.group === group).map((row) => lineOf(row, reference)),
  })).filter(({ lines }) => lines.length > 0);
}

/** How many rows, against what kind of evidence; rows from memory are counted apart. */
export function evidenceCounts(rows: readonly EvidenceRow[]) {
  const read = rows.filter(({ how }) => how !== 'from memory' && how !== 'common practice');
  return {
    rows: rows.length,
    read: read.length,
    sources: new Set(read.map(({ source }) => source)).size,
    memory: rows.filter(({ how }) => how === 'from memory').length,
    practice: rows.filter(({ how }) => how === 'common practice').length,
    known: rows.filter(({ agrees }) => !agrees).length,
  };
}

function lineOf(row: EvidenceRow, reference: Reference): EvidenceLine {
  const decimals = decimalsFor(row.published);
  return {
    id: row.id,
    subject: row.subject,
    computed: fixed(row.computed, decimals),
    published: publishedText(row.published),
    tolerance: plain(row.tolerance, decimals + 1),
    deviation: row.deviation === 0 ? words.evidencePage.inside : fixed(row.deviation, decimals),
    agrees: row.agrees,
    unit: row.unit,
    source: `${sourceName(reference, row.source)}, ${row.at}`,
    how: words.frame.how[row.how],
    note: [row.note, row.disagreement].filter((part) => part !== null).join('. ') || null,
  };
}

/** One decimal more than the published figures show, so that rounding hides no deviation. */
function decimalsFor({ value, min, max }: Published): number {
  const decimals = [value, min, max].map((part) =>
    part === null ? 0 : (String(part).split('.')[1]?.length ?? 0),
  );
  return Math.max(...decimals) + 1;
}

function publishedText({ value, min, max }: Published): string {
  const { between, atLeast, atMost } = words.evidencePage;
  if (value !== null) return plain(value, 6);
  if (min !== null && max !== null) return between(plain(min, 6), plain(max, 6));
  return min !== null ? atLeast(plain(min, 6)) : atMost(plain(max ?? 0, 6));
}
