/**
 * How a digest is written for people: twelve symbols that say it and one that checks them, `k7f2-91c0-7be3-x`.
 * No import, because the page that checks a sheet reads digests in the browser.
 */

/** The ten digits and the letters without I, L, O and U, which are read as 1, 1, 0 and V. */
export const ALPHABET = '0123456789abcdefghjkmnpqrstvwxyz';

/** Symbols that say something; with 5 bits each, 60 bits. */
export const SYMBOLS = 12;

const GROUP = 4;

/** The 37 characters of ISO/IEC 7064 MOD 37-2, by value; the last is its supplementary check character. */
const STANDARD_CHARACTERS = '0123456789abcdefghijklmnopqrstuvwxyz*';

/**
 * The check character of ISO/IEC 7064 MOD 37-2 (a pure system with modulus 37 and radix 2) for letters and
 * digits in any case. It finds every single wrong character and every exchange of two neighbours.
 *
 * @throws RangeError for a character that is not a letter or digit.
 */
export function checkCharacter(text: string): string {
  let sum = 0;
  for (const character of text.toLowerCase()) {
    const value = STANDARD_CHARACTERS.indexOf(character);
    if (value < 0 || value > 35) throw new RangeError(`"${character}" is no letter or digit`);
    sum = ((sum + value) * 2) % 37;
  }
  // the check character c has weight 1, and sum + c must leave 1
  return STANDARD_CHARACTERS.charAt((38 - sum) % 37);
}

/** A hash as base 32: five bits a symbol from the first bit on; bits that fill no symbol are left. */
export function base32(bytes: Uint8Array): string {
  let text = '';
  let held = 0;
  let bits = 0;
  for (const byte of bytes) {
    held = (held << 8) | byte;
    bits += 8;
    while (bits >= 5) {
      bits -= 5;
      text += ALPHABET.charAt((held >> bits) & 31);
      held &= (1 << bits) - 1;
    }
  }
  return text;
}

/**
 * The digest of a hash: the first twelve symbols in a row whose check character is itself in the alphabet,
 * so that no look-alike is printed. Of the 40 places in a SHA-256 nearly always one of the first two serves.
 *
 * @throws RangeError where none does (chance below 1e-34).
 */
export function digestOfHash(bytes: Uint8Array): string {
  const text = base32(bytes);
  for (let start = 0; start + SYMBOLS <= text.length; start++) {
    const said = text.slice(start, start + SYMBOLS);
    const check = checkCharacter(said);
    if (ALPHABET.includes(check)) return grouped(said + check);
  }
  throw new RangeError('a hash without a place that can be checked');
}

/** What somebody typed: a digest as it is printed, or why it cannot be one. */
export type DigestRead =
  | { readonly ok: true; readonly digest: string }
  | { readonly ok: false; readonly why: 'length' | 'symbol' | 'check' };

/** Reads a digest in either case, with or without dashes and spaces, with look-alikes read for what they are. */
export function readDigest(typed: string): DigestRead {
  const text = typed
    .toLowerCase()
    .replaceAll(/[\s\p{Pd}.]/gu, '')
    .replaceAll('o', '0')
    .replaceAll(/[il]/g, '1')
    .replaceAll('u', 'v');
  if (text.length !== SYMBOLS + 1) return { ok: false, why: 'length' };
  for (const symbol of text) {
    if (!ALPHABET.includes(symbol)) return { ok: false, why: 'symbol' };
  }
  return checkCharacter(text.slice(0, SYMBOLS)) === text.slice(SYMBOLS)
    ? { ok: true, digest: grouped(text) }
    : { ok: false, why: 'check' };
}

function grouped(text: string): string {
  const groups: string[] = [];
  for (let start = 0; start < text.length; start += GROUP) {
    groups.push(text.slice(start, start + GROUP));
  }
  return groups.join('-');
}
