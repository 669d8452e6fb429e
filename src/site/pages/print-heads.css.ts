import type { APIRoute } from 'astro';
import { bookParts } from '../../handbook/book/chapters.ts';
import { runningHeads } from '../../handbook/book/running-heads.ts';
import { words } from '../../words/catalogue.ts';
import { siteInput } from '../input.ts';

/** Heads and feet of the printed handbook: they hold names and dates, so the build writes them. */
export const GET: APIRoute = () => {
  const { edition, formulary, asOf } = siteInput();
  const { frame, printPage } = words;
  const chapters = bookParts(formulary).flatMap((part) => part.chapters);
  const foot = [
    frame.edition(edition.id),
    frame.asOf(asOf),
    ...(edition.proof ? [printPage.proofMark] : []),
  ];
  const text = runningHeads(chapters, {
    shop: formulary.reference.shop.name,
    edition: foot.join(' · '),
    of: printPage.of,
  });
  return new Response(text, { headers: { 'Content-Type': 'text/css; charset=utf-8' } });
};
