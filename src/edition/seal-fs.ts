import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { writeChecksums } from './checksums-fs.ts';
import type { EditionDocument } from './edition-document.ts';

/** Seals a built folder: `edition.json`, then the checksums of all that is in it. Nothing is written after it. */
export function sealEdition(folder: string, edition: EditionDocument): void {
  writeFileSync(join(folder, 'edition.json'), `${JSON.stringify(edition, null, 2)}\n`);
  writeChecksums(folder);
}
