/** Every file of the index starts with these letters once it is inflated. */
const MARK = new TextEncoder().encode('pagefind_dcd');

/** Inflates a file of the index and takes the mark off. Rejects where it is cut short or something else. */
export async function inflatePayload(gzip: Uint8Array<ArrayBuffer>): Promise<Uint8Array> {
  const inflated = new Blob([gzip]).stream().pipeThrough(new DecompressionStream('gzip'));
  const bytes = new Uint8Array(await new Response(inflated).arrayBuffer());
  if (MARK.some((byte, i) => bytes[i] !== byte)) {
    throw new RangeError('Search index: the mark at the start is missing');
  }
  return bytes.subarray(MARK.length);
}

/** Bytes from base64 (RFC 4648). Throws where it is not base64. */
export const bytesFromBase64 = (text: string): Uint8Array<ArrayBuffer> =>
  Uint8Array.from(atob(text), (letter) => letter.charCodeAt(0));
