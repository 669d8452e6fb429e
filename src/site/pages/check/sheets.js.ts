import type { APIRoute } from 'astro';
import { siteInput } from '../../input.ts';

/** What sheets are checked against, as a classic script: it works from a disk too. */
export const GET: APIRoute = () =>
  new Response(`self.handbookSheets=${JSON.stringify(siteInput().edition.sheets)};\n`, {
    headers: { 'Content-Type': 'text/javascript; charset=utf-8' },
  });
