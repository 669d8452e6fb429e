/** What the index files hold: whole numbers, texts and lists, nothing else. */
export type CborValue = number | string | readonly CborValue[];

const DEEPEST = 16;

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
        const text = texts.decode(bytes.subarray(at, at + value));
        at += value;
        return text;
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
