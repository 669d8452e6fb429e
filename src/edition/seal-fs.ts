import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { CHECKSUMS, writeChecksums } from './checksums-fs.ts';
import type { EditionDocument } from './edition-document.ts';

const EDITION = 'edition.json';

/** What a seal puts into a built folder; pages may link to them. */
export const SEAL_FILES = [EDITION, CHECKSUMS] as const;

/** Seals a built folder: `edition.json`, then the checksums of all that is in it. Nothing is written after it. */
export function sealEdition(folder: string, edition: EditionDocument): void {
  writeFileSync(join(folder, EDITION), `${JSON.stringify(edition, null, 2)}\n`);
  writeChecksums(folder);
}
