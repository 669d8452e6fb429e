import type { z } from 'zod';
import type { DataRule } from '../words/en/problems-data.ts';
import type { Problem } from '../words/problem.ts';
import type { DataFile } from './data-files.ts';
import { hiddenPlaces } from './hidden-places.ts';
import { type DataReport, dataProblem, reportOn } from './report.ts';
import { fit } from './schema-problems.ts';
import { parseYaml } from './yaml.ts';
import type { YamlFault } from './yaml-faults.ts';

const RULE_OF_FAULT: Readonly<Record<YamlFault['kind'], DataRule>> = {
  syntax: 'data/yaml',
  tab: 'data/tab',
  'duplicate-key': 'data/duplicate-key',
  anchor: 'data/anchor',
  'hidden-character': 'data/hidden-character',
};

export interface OpenedFile<T> {
  readonly value: T;
  readonly report: DataReport;
  /** As of the file it was read from. */
  readonly packaged: boolean;
}

/** One file through YAML and its schema. `null` where it cannot be used; the problems say why. */
export function openFile<T>(
  { file, text, packaged }: DataFile,
  schema: z.ZodType<T>,
  problems: Problem[],
): OpenedFile<T> | null {
  const hidden = hiddenPlaces(text);
  for (const { place, name } of hidden) {
    problems.push(
      dataProblem(file, place, 'data/hidden-character', {
        found: `the invisible character ${name}`,
        expected: 'text that can be seen',
        advice: 'delete it and type the text around it again',
      }),
    );
  }
  if (hidden.length > 0) return null;
  const yaml = parseYaml(text);
  for (const { kind, line, column, ...parts } of yaml.faults) {
    problems.push(dataProblem(file, { line, column }, RULE_OF_FAULT[kind], parts));
  }
  if (yaml.faults.length > 0) return null;
  if (yaml.value === null) {
    problems.push(
      dataProblem(file, { line: 1, column: 1 }, 'data/empty-file', {
        found: 'nothing in the file',
        expected: 'keys with values',
        advice: 'write it, or remove the file',
      }),
    );
    return null;
  }
  const report = reportOn(file, yaml, problems);
  const value = fit(schema, yaml.value, report);
  return value === null ? null : { value, report, packaged };
}
