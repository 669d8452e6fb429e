import type { Constants } from '../../chemistry/constants.ts';
import type { DataRule } from '../../words/en/problems-data.ts';
import type { FatRecord } from '../material-records.ts';
import type { ProblemParts } from '../report.ts';
import type { Source } from '../values.ts';
import type { YamlPath } from '../yaml.ts';

/** What a check may look at. */
export interface LintContext {
  readonly constants: Constants;
  /** Of all fatty acids that have a record, even a broken one: that is told where it stands. */
  readonly acidIds: ReadonlySet<string>;
  readonly sources: ReadonlyMap<string, Source>;
}

export interface LintFinding extends ProblemParts {
  readonly path: YamlPath;
}

/** One check of one fat. Its rule id is `data/` and its name. */
export interface LintCheck {
  readonly name: DataRule extends `data/${infer Name}` ? Name : never;
  readonly description: string;
  readonly check: (fat: FatRecord, context: LintContext) => readonly LintFinding[];
}
