import type { APIRoute } from 'astro';
import lockfile from '../../../../package-lock.json?raw';
import { billOfMaterials } from '../../../edition/bill-of-materials.ts';

/** The software that this handbook was built with. */
export const GET: APIRoute = () =>
  new Response(billOfMaterials(lockfile), {
    headers: { 'Content-Type': 'application/vnd.cyclonedx+json' },
  });
