import type { APIRoute } from 'astro';
import { sizesInUse } from '../../../handbook/batch-sizes.ts';
import { lyeCsv } from '../../../handbook/lye-csv.ts';
import { csvResponse } from '../../csv-response.ts';
import { siteInput } from '../../input.ts';

export function getStaticPaths() {
  return sizesInUse(siteInput().formulary).map(({ id }) => ({ params: { batch: id } }));
}

export const GET: APIRoute = ({ params }) =>
  csvResponse(lyeCsv(siteInput().formulary, params.batch ?? ''));
