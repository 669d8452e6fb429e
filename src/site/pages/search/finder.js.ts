import type { APIRoute } from 'astro';
import { finderData } from '../../find/finder-data.ts';
import { siteInput } from '../../input.ts';

/** The finder's data as a classic script: it works from a disk too, where nothing can be fetched. */
export const GET: APIRoute = () => {
  const { formulary, prices } = siteInput();
  return new Response(`self.handbookFinder=${JSON.stringify(finderData(formulary, prices))};\n`, {
    headers: { 'Content-Type': 'text/javascript; charset=utf-8' },
  });
};
