import type { APIRoute } from 'astro';
import { siteInput } from '../../input.ts';
import { shoppingData } from '../../shopping/shopping-data.ts';

/** The batches as a classic script: it works from a disk too, where nothing can be fetched. */
export const GET: APIRoute = () => {
  const { formulary, prices } = siteInput();
  return new Response(
    `self.handbookShopping=${JSON.stringify(shoppingData(formulary, prices))};\n`,
    { headers: { 'Content-Type': 'text/javascript; charset=utf-8' } },
  );
};
