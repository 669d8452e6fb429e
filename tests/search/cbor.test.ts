import { describe, expect, test } from 'vitest';
import { decodeCbor } from '../../src/search/reader/cbor.ts';

const bytes = (hex: string) => Uint8Array.from(Buffer.from(hex, 'hex'));

describe('examples of RFC 8949, appendix A', () => {
  test.each([
    ['00', 0],
    ['17', 23],
    ['1818', 24],
    ['1903e8', 1000],
    ['1a000f4240', 1000000],
    ['1b000000e8d4a51000', 1000000000000],
    ['20', -1],
    ['3863', -100],
    ['3903e7', -1000],
    ['60', ''],
    ['6449455446', 'IETF'],
    ['62c3bc', 'ü'],
    ['63e6b0b4', '水'],
    ['64f0908591', '\u{10151}'],
    ['80', []],
    ['83010203', [1, 2, 3]],
    ['8301820203820405', [1, [2, 3], [4, 5]]],
  ])('%s', (hex, value) => expect(decodeCbor(bytes(hex))).toEqual(value));
});

describe('what is not in the subset is refused', () => {
  test.each([
    ['a map', 'a0'],
    ['bytes', '40'],
    ['a tag', 'c074323031332d30332d32315432303a30343a30305a'],
    ['a float', 'f93c00'],
    ['null', 'f6'],
    ['an indefinite list', '9fff'],
    ['an integer beyond 2^53', '1bffffffffffffffff'],
    ['bytes left over', '0000'],
    ['nothing', ''],
    ['a text cut short', '6449'],
    ['a list cut short', '8301'],
    ['a list that claims a billion items', '9a3b9aca00'],
    ['a number cut short', '1903'],
    ['a text that is not UTF-8', '61ff'],
    ['lists in lists without end', '81'.repeat(5000)],
  ])('%s', (_, hex) => expect(() => decodeCbor(bytes(hex))).toThrow());
});
