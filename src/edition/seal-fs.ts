import { createHash } from 'node:crypto';
import { rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { CHECKSUMS, checksumList, writeChecksums } from './checksums-fs.ts';
import type { EditionDocument } from './edition-document.ts';

const EDITION = 'edition.json';
/** What a copy on a device asks a site for, to learn whether it is still the site's. */
const KEPT_COPY = 'kept-copy.json';

/** What a seal puts into a built folder; pages may link to them. */
export const SEAL_FILES = [EDITION, KEPT_COPY, CHECKSUMS] as const;

/**
 * Seals a built folder: `edition.json`; `kept-copy.json`, which is small and tells this edition from any other and
 * from one of the same inputs that another program built; then the checksums of all that is in it. Nothing is
 * written after it.
 */
export function sealEdition(folder: string, edition: EditionDocument): void {
  writeFileSync(join(folder, EDITION), `${JSON.stringify(edition, null, 2)}\n`);
  const { id, asOf, proof } = edition;
  rmSync(join(folder, KEPT_COPY), { force: true });
  const content = createHash('sha256').update(checksumList(folder)).digest('hex');
  writeFileSync(join(folder, KEPT_COPY), `${JSON.stringify({ id, asOf, proof, content })}\n`);
  writeChecksums(folder);
}
