import { NOT_KEPT } from './copy.ts';
import { fetchFile } from './fetch-file.ts';
import { isOfEdition, pathBelow } from './file-list.ts';
import type { HeldCopy } from './storage.ts';

/**
 * Answers a page of the handbook from one edition and no other: from the copy, or from the site where the file there
 * is still that of the edition. What belongs to another edition is not let through, but said.
 */
export async function answer(request: Request, scope: string, copy: HeldCopy): Promise<Response> {
  const path = pathBelow(scope, request.url);
  if (path === null) return fetch(request);
  const kept = await copy.cache.match(scope + path);
  if (kept) return marked(kept, copy);
  const isPage = request.mode === 'navigate';
  const notKept = () => (isPage ? Response.redirect(scope + NOT_KEPT, 302) : Response.error());
  if (!isOfEdition(path, copy.files))
    return isPage ? other(request, scope, notKept) : fetch(request);
  const fetched = await fetchFile(scope + path, copy.files.get(path) ?? '');
  if (!fetched.ok) return notKept();
  await copy.cache.put(scope + path, fetched.response.clone());
  return marked(fetched.response, copy);
}

/** Says in the page itself which copy it comes from, so that it is never without the notice. */
async function marked(response: Response, { edition }: HeldCopy): Promise<Response> {
  const type = response.headers.get('content-type') ?? '';
  if (!type.startsWith('text/html')) return response;
  const html = await response.text();
  const mark = ` data-kept="${edition.content.replace(/[^0-9a-f]/g, '')}" data-root="`;
  return new Response(html.replace(' data-root="', mark), { headers: { 'content-type': type } });
}

/** An address below the scope that the edition does not have: of its next edition, or of something else. */
async function other(request: Request, scope: string, notKept: () => Response): Promise<Response> {
  const response = await fetch(request).catch(() => null);
  if (!response) return notKept();
  if (!response.headers.get('content-type')?.startsWith('text/html')) return response;
  const root = /<html[^>]*\sdata-root="([^"]*)"/.exec(await response.clone().text())?.[1];
  const isOurs = root !== undefined && new URL(root, response.url).href === scope;
  return isOurs && response.ok ? notKept() : response;
}
