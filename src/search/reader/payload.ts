/** Every file of the index starts with these letters once it is inflated. */
const MARK = new TextEncoder().encode('pagefind_dcd');

/** Inflates a file of the index and takes the mark off. Rejects where it is cut short or something else. */
export async function inflatePayload(gzip: Uint8Array<ArrayBuffer>): Promise<Uint8Array> {
  const { readable, writable } = new DecompressionStream('gzip');
  // written by hand: a Blob would go through the browser's store of files first
  const writer = writable.getWriter();
  const [inflated] = await Promise.all([
    new Response(readable).arrayBuffer(),
    writer.write(gzip),
    writer.close(),
  ]);
  const bytes = new Uint8Array(inflated);
  if (MARK.some((byte, i) => bytes[i] !== byte)) {
    throw new RangeError('Search index: the mark at the start is missing');
  }
  return bytes.subarray(MARK.length);
}

/** Bytes from base64 (RFC 4648). Throws where it is not base64. */
export function bytesFromBase64(text: string): Uint8Array<ArrayBuffer> {
  const letters = atob(text);
  const bytes = new Uint8Array(letters.length);
  for (let i = 0; i < letters.length; i++) bytes[i] = letters.charCodeAt(i);
  return bytes;
}
