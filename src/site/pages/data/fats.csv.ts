import type { APIRoute } from 'astro';
import { fatsCsv } from '../../../handbook/fats-csv.ts';
import { csvResponse } from '../../csv-response.ts';
import { siteInput } from '../../input.ts';

export const GET: APIRoute = () => csvResponse(fatsCsv(siteInput().formulary));
