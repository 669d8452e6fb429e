import type { lostPage as english } from '../en/lost-page.ts';
import type { SameShape } from '../same-shape.ts';

export const lostPage: SameShape<typeof english> = {
  title: 'Esta página no existe',
  text: 'Esta dirección no tiene página en el manual. Puede que la indicara una fórmula que se retiró o una hoja de una edición anterior.',
  advice:
    'Vuelva al índice del manual y busque allí el código. No trabaje con un impreso antiguo hasta que lo haya encontrado.',
};
