import type { APIRoute } from 'astro';
import { documentJsonSchema } from '../../../formulary/document-schema.ts';

/** JSON Schema of the documents in `data/formulas/`. */
export const GET: APIRoute = () =>
  new Response(`${JSON.stringify(documentJsonSchema(), null, 2)}\n`, {
    headers: { 'Content-Type': 'application/schema+json' },
  });
