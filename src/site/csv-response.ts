/** A CSV file as the answer of a data page. */
export const csvResponse = (text: string): Response =>
  new Response(text, { headers: { 'Content-Type': 'text/csv; charset=utf-8' } });
