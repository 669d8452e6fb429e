import type { FatRecord } from '../material-records.ts';
import type { DataReport } from '../report.ts';
import type { RawFat } from '../schema/fat.ts';
import type { LintCheck, LintContext } from './check.ts';
import { compositionSum } from './composition-sum.ts';
import { computedIodineValue } from './computed-iodine-value.ts';
import { computedSaponificationValue } from './computed-saponification-value.ts';
import { orderOfChoice } from './order-of-choice.ts';
import { unknownAcid } from './unknown-acid.ts';

export const CHECKS: readonly LintCheck[] = [
  unknownAcid,
  orderOfChoice,
  compositionSum,
  computedSaponificationValue,
  computedIodineValue,
];

/** Runs every check on one fat. An exception silences its check; one that silences nothing is itself wrong. */
export function lintFat(
  fat: FatRecord,
  exceptions: NonNullable<RawFat['exceptions']>,
  context: LintContext,
  report: DataReport,
): void {
  for (const { name, check } of CHECKS) {
    const findings = check(fat, context);
    const exception = exceptions.findIndex((entry) => entry.check === name);
    if (exception < 0) {
      for (const { path, ...parts } of findings) report.in(path, `data/${name}`, parts);
    } else if (findings.length === 0) {
      report.in(['exceptions', exception], 'data/stale-exception', {
        found: `an exception from "${name}"`,
        expected: 'no exception: the fat passes the check',
        advice: 'remove the exception',
      });
    }
  }
}
