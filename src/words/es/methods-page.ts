import type { methodsPage as english } from '../en/methods-page.ts';
import type { SameShape } from '../same-shape.ts';

export const methodsPage: SameShape<typeof english> = {
  title: 'Métodos',
  lead: 'Cada número de este manual procede de uno de los modelos que siguen. Cada modelo tiene su alcance; fuera de él, las páginas dan una razón y ningún número. Las masas están en gramos, las cantidades de sustancia en moles, y nada se redondea antes de pesarse o imprimirse.',
  contents: 'Modelos',
  evidence: 'Comprobación: lo que dan los modelos, junto a los valores publicados',
  contradictions: 'Contradicciones: donde las fuentes no coinciden',
  symbols: 'Símbolos',
  range: 'Alcance',
  ignores: 'Lo que deja fuera',
  source: 'Fuente',
  sourcesTitle: 'Fuentes de los datos de referencia',
  sourcesLead:
    'Las fuentes nunca se promedian. Donde varias dan un valor, se usa la primera según este orden de clases, y las demás quedan en la página de la grasa.',
  columns: { source: 'Fuente', kind: 'Clase', read: 'Leída el', address: 'Dirección' },
  notRead: 'no leída para este manual',
};
