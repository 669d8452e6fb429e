const isSurrogate = (unit: number) => unit >= 0xd800 && unit <= 0xdfff;

/** Compares by code point, which is also the order of UTF-8 bytes; plain `<` compares UTF-16 units. */
export function byCodePoint(a: string, b: string): number {
  const length = Math.min(a.length, b.length);
  for (let i = 0; i < length; i++) {
    const [x, y] = [a.charCodeAt(i), b.charCodeAt(i)];
    if (x === y) continue;
    return isSurrogate(x) === isSurrogate(y) ? x - y : isSurrogate(x) ? 1 : -1;
  }
  return a.length - b.length;
}
