import type { APIRoute } from 'astro';
import { siteInput } from '../../input.ts';

/** The software that this handbook was built with. */
export const GET: APIRoute = () =>
  new Response(siteInput().software, {
    headers: { 'Content-Type': 'application/vnd.cyclonedx+json' },
  });
