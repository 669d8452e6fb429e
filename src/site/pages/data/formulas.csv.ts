import type { APIRoute } from 'astro';
import { formulasCsv } from '../../../handbook/formulas-csv.ts';
import { csvResponse } from '../../csv-response.ts';
import { siteInput } from '../../input.ts';

export const GET: APIRoute = () => csvResponse(formulasCsv(siteInput().formulary));
