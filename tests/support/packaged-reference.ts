import { readReference } from '../../src/reference/read-reference-fs.ts';
import type { Reference } from '../../src/reference/reference.ts';

/** The packaged data with the demo shop, read once for each test file. */
export function packagedReference(): Reference {
  const { reference, problems } = readReference(['data']);
  if (!reference) throw new Error(JSON.stringify(problems, null, 2));
  return reference;
}
