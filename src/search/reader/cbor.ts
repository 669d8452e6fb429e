/** What the index files hold: whole numbers, texts and lists, nothing else. */
export type CborValue = number | string | readonly CborValue[];

const DEEPEST = 16;
/** [bytes] */
const LONGEST_ASCII = 32;

/**
 * Decodes one CBOR item (RFC 8949) of the subset that Pagefind writes: unsigned and negative integers, texts and
 * arrays of definite length. Throws a `RangeError` on anything else, on a cut-off item and on bytes left over.
 */
export function decodeCbor(bytes: Uint8Array): CborValue {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const texts = new TextDecoder('utf-8', { fatal: true, ignoreBOM: true });
  let at = 0;

  const argument = (short: number): number => {
    if (short < 24) return short;
    const size = 2 ** (short - 24);
    if (short > 27) throw new RangeError(`CBOR: length form ${short} is not in the subset`);
    const start = at;
    at += size;
    if (size === 1) return view.getUint8(start);
    if (size === 2) return view.getUint16(start);
    if (size === 4) return view.getUint32(start);
    const large = Number(view.getBigUint64(start));
    if (!Number.isSafeInteger(large)) throw new RangeError('CBOR: number too large');
    return large;
  };

  const item = (depth: number): CborValue => {
    const first = view.getUint8(at++);
    const value = argument(first & 31);
    switch (first >> 5) {
      case 0:
        return value;
      case 1:
        return -1 - value;
      case 3: {
        if (value > bytes.length - at) throw new RangeError('CBOR: text is cut off');
        const start = at;
        at += value;
        return asciiText(bytes, start, at) ?? texts.decode(bytes.subarray(start, at));
      }
      case 4: {
        if (value > bytes.length - at || depth > DEEPEST) {
          throw new RangeError('CBOR: list is cut off or too deep');
        }
        const list: CborValue[] = [];
        for (let i = 0; i < value; i++) list.push(item(depth + 1));
        return list;
      }
      default:
        throw new RangeError(`CBOR: major type ${first >> 5} is not in the subset`);
    }
  };

  const whole = item(0);
  if (at !== bytes.length) throw new RangeError(`CBOR: ${bytes.length - at} bytes left over`);
  return whole;
}

/** Most texts of an index are short and plain, and a decoder's call costs more than their letters. */
function asciiText(bytes: Uint8Array, start: number, end: number): string | null {
  if (end - start > LONGEST_ASCII) return null;
  let text = '';
  for (let at = start; at < end; at++) {
    const letter = bytes[at] ?? 0;
    if (letter > 127) return null;
    text += String.fromCharCode(letter);
  }
  return text;
}
