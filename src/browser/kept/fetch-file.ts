/** A file of the edition that was asked for, or why it cannot be had. */
export type Fetched =
  | { readonly ok: true; readonly response: Response }
  | { readonly ok: false; readonly why: 'unreachable' | 'other' };

/**
 * One file from the site, if it has this SHA-256: so nothing of another edition gets in between.
 *
 * @param hash 64 hexadecimal digits.
 */
export async function fetchFile(address: string, hash: string): Promise<Fetched> {
  const answer = await fetch(address, { cache: 'no-cache' }).catch(() => null);
  if (!answer) return { ok: false, why: 'unreachable' };
  const bytes = await answer.arrayBuffer().catch(() => null);
  if (!bytes) return { ok: false, why: 'unreachable' };
  if (!answer.ok || (await sha256(bytes)) !== hash) return { ok: false, why: 'other' };
  const type = answer.headers.get('content-type') ?? 'application/octet-stream';
  return { ok: true, response: new Response(bytes, { headers: { 'content-type': type } }) };
}

/** SHA-256 in hexadecimal digits. */
export async function sha256(bytes: BufferSource): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', bytes);
  return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
}
