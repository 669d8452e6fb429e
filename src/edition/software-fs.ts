import { readFileSync } from 'node:fs';
import { billOfMaterials } from './bill-of-materials.ts';

/** The software that this program is made of, as CycloneDX, from the lockfile it was installed by. */
export const softwareOfBuild = (): string =>
  billOfMaterials(readFileSync(new URL('../../package-lock.json', import.meta.url), 'utf8'));
