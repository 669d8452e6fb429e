import type { DataReport } from './report.ts';

const FORM = /^[a-z0-9]+(-[a-z0-9]+)*$/;
const LONGEST = 40;
/** Names that Windows keeps for devices, with any ending (Microsoft, "Naming Files, Paths, and Namespaces"). */
const DEVICE = /^(con|prn|aux|nul|com[0-9]|lpt[0-9])$/;

/** What an id must be, in words; `null` where it is. Ids become names of files, which must lie on any disk. */
export function whatIsWrongWith(id: string): string | null {
  if (!FORM.test(id) || id.length > LONGEST) {
    return `small letters, digits and single hyphens, at most ${LONGEST}`;
  }
  return DEVICE.test(id)
    ? 'an id that is no device of Windows, where no file can have its name'
    : null;
}

/**
 * The ids of one file, which are its keys. `taken` are those of everything else that is weighed: one id on a sheet
 * means one thing, and one page has its name.
 */
export function checkIds(
  ids: readonly string[],
  taken: ReadonlyMap<string, string>,
  report: DataReport,
): void {
  for (const id of ids) {
    const expected = whatIsWrongWith(id);
    const owner = taken.get(id);
    if (expected !== null) {
      report.inKey([id], 'data/text-form', {
        found: `the id "${id}"`,
        expected,
        advice: 'the name may be anything',
      });
    } else if (owner !== undefined) {
      report.inKey([id], 'data/repeated-entry', {
        found: `the id "${id}", which is also that of ${owner}`,
        expected: 'an id of its own',
        advice: 'give one of the two another id',
      });
    }
  }
}
