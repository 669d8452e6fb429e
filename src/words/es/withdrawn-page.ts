import { dateText } from '../dates.ts';
import type { withdrawnPage as english } from '../en/withdrawn-page.ts';
import type { SameShape } from '../same-shape.ts';

/** What stands in place of a formula that was taken out of use. */
export const withdrawnPage: SameShape<typeof english> = {
  title: 'Retirada. No la elabore.',
  by: (on, by) => `Retirada del uso el ${dateText(on)} por ${by}.`,
  advice:
    'Ya no hay pesadas de ella. Las hojas y tarjetas que todavía circulen van a la basura. Si hay un lote en elaboración, deténgase y pregunte a quien formula.',
};
