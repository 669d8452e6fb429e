import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { digestOf } from '../../src/edition/digest.ts';
import {
  ALPHABET,
  base32,
  checkCharacter,
  digestOfHash,
  readDigest,
} from '../../src/edition/digest-text.ts';

const hash = fc.uint8Array({ minLength: 32, maxLength: 32 });
const digest = hash.map(digestOfHash);
const bare = (text: string) => text.replaceAll('-', '');

describe('the check character is that of ISO/IEC 7064 MOD 37-2', () => {
  test.each([
    // a donation identification number of ISBT 128, which uses this system; from memory
    ['G123489654321', 'y'],
    // by the npm package @konfirm/iso7064 2.1.3, run once
    ['4F2A91C07BE3', 'o'],
    ['4F2A91C07BE4', 'm'],
    ['0000000000000', '1'],
    ['ZZZZZZZZZZZZ', 'r'],
  ])('%s %s', (text, check) => {
    expect(checkCharacter(text)).toBe(check);
  });

  test('by definition: characters times powers of two leave 1 modulo 37', () => {
    const characters = '0123456789abcdefghijklmnopqrstuvwxyz*';
    fc.assert(
      fc.property(fc.stringMatching(/^[0-9a-z]{1,20}$/), (text) => {
        const all = text + checkCharacter(text);
        const sum = [...all].reduce(
          (total, character, index) =>
            total + characters.indexOf(character) * 2 ** (all.length - 1 - index),
          0,
        );
        expect(sum % 37).toBe(1);
      }),
    );
  });

  test('refuses what is no letter or digit', () => {
    expect(() => checkCharacter('a-b')).toThrow(RangeError);
  });
});

test('base 32 takes five bits a symbol, the first bit first', () => {
  expect(base32(Uint8Array.of(0b00001_000, 0b10_11111_0))).toBe('12z');
  expect(ALPHABET).toHaveLength(32);
  expect(new Set(ALPHABET).size).toBe(32);
});

describe('digests as printed', () => {
  test('have no look-alike and pass their own check', () => {
    fc.assert(
      fc.property(digest, (text) => {
        expect(text).toMatch(/^([0-9a-hjkmnp-tv-z]{4}-){3}[0-9a-hjkmnp-tv-z]$/);
        expect(readDigest(text)).toEqual({ ok: true, digest: text });
      }),
    );
  });

  test('are read in either case, with any dashes and spaces, and with look-alikes', () => {
    const odd = (text: string) =>
      fc
        .array(fc.constantFrom('', ' ', '-', '\u2011', '.'), { minLength: 13, maxLength: 13 })
        .map((gaps) => [...bare(text)].map((symbol, index) => symbol + gaps[index]).join(''));
    fc.assert(
      fc.property(
        digest.chain((text) => fc.tuple(fc.constant(text), odd(text), fc.boolean())),
        ([text, typed, upper]) => {
          const look = typed.replaceAll('0', 'o').replaceAll('1', 'l').replaceAll('v', 'u');
          expect(readDigest(upper ? look.toUpperCase() : typed)).toEqual({
            ok: true,
            digest: text,
          });
        },
      ),
    );
  });

  test('show every single wrong symbol and every exchange of neighbours', () => {
    fc.assert(
      fc.property(
        digest,
        fc.nat(12),
        fc.constantFrom(...ALPHABET),
        fc.nat(11),
        (text, at, symbol, swap) => {
          const symbols = [...bare(text)];
          const wrong = symbols.with(at, symbol).join('');
          if (symbols[at] !== symbol)
            expect(readDigest(wrong)).toEqual({ ok: false, why: 'check' });
          const [a = '', b = ''] = symbols.slice(swap, swap + 2);
          const exchanged = symbols
            .with(swap, b)
            .with(swap + 1, a)
            .join('');
          if (a !== b) expect(readDigest(exchanged)).toEqual({ ok: false, why: 'check' });
        },
      ),
      { numRuns: 2000 },
    );
  });

  test.each([
    ['', 'length'],
    ['4f2a-91c0-7be4', 'length'],
    ['4f2a-91c0-7be4-mm', 'length'],
    ['4f2a-91c0-7b$4-m', 'symbol'],
    ['4f2a-91c0-7be4-n', 'check'],
  ])('"%s" cannot be one: %s', (typed, why) => {
    expect(readDigest(typed)).toEqual({ ok: false, why });
  });
});

test('published vectors of the digest, worked out by another program', () => {
  // SHA-256 by Python's hashlib, symbols and check by a script that follows the description in README.md
  expect(digestOf({})).toBe('8g9p-z8tn-pdkr-n');
  expect(digestOf({ b: [1, 'two'], a: null })).toBe('eg2t-8ap1-hvt3-j');
});
