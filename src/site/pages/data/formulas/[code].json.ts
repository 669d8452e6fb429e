import type { APIRoute } from 'astro';
import type { FormulaDocument } from '../../../../formulary/document.ts';
import { siteInput } from '../../../input.ts';

export function getStaticPaths() {
  return siteInput().formulary.formulas.map(({ document }) => ({
    params: { code: document.code },
    props: { document },
  }));
}

/** The computed formula, the same document that the compute command prints. */
export const GET: APIRoute<{ document: FormulaDocument }> = ({ props }) =>
  new Response(`${JSON.stringify(props.document, null, 2)}\n`, {
    headers: { 'Content-Type': 'application/json' },
  });
