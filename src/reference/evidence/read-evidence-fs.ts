import type { Problem } from '../../words/problem.ts';
import { openFile } from '../open-file.ts';
import { readText } from '../read-text-fs.ts';
import type { Reference } from '../reference.ts';
import { dataProblem } from '../report.ts';
import { evidenceSchema } from '../schema/evidence.ts';
import { reportUnknownSources } from '../sources.ts';
import { withPhrases } from '../translation.ts';
import type { EvidenceRow } from './evidence.ts';
import { evidenceRows } from './rows.ts';

/**
 * The evidence table from `evidence.yaml` of a data folder and from the fats. The records belong to the
 * models, so they are read from the packaged data, whatever shop is built.
 */
export function readEvidence(
  folder: string,
  reference: Reference,
): { readonly rows: readonly EvidenceRow[]; readonly problems: readonly Problem[] } {
  const problems: Problem[] = [];
  const file = `${folder.replace(/[/\\]+$/, '')}/evidence.yaml`;
  const read = readText(file);
  if (!read.ok) {
    problems.push(
      dataProblem(file, { line: 1, column: 1 }, 'data/unreadable', {
        found: 'a file that cannot be read',
        expected: 'the records of published values',
        advice: 'put the packaged file back',
      }),
    );
    return { rows: [], problems };
  }
  const opened = openFile(
    { name: 'evidence.yaml', file, text: read.text, packaged: true },
    evidenceSchema,
    problems,
  );
  if (!opened) return { rows: [], problems };
  reportUnknownSources(opened.value, reference.sources, opened.report);
  return {
    rows: evidenceRows(withPhrases(opened.value, reference.phrases), reference, opened.report),
    problems,
  };
}
