import { createHash } from 'node:crypto';
import { type Canonical, canonicalText } from './canonical-text.ts';
import { digestOfHash } from './digest-text.ts';

/** The digest of some data: SHA-256 over the UTF-8 of its canonical text, as thirteen symbols. */
export function digestOf(value: Canonical): string {
  return digestOfHash(createHash('sha256').update(canonicalText(value), 'utf8').digest());
}
