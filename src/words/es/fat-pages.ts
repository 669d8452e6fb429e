import type { fatPages as english } from '../en/fat-pages.ts';
import { fixed, plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

export const fatPages: SameShape<typeof english> = {
  title: 'Grasas',
  lead: 'Todas las grasas que conocen los datos de referencia. Primero, las que están en uso.',
  used: 'En uso',
  unused: 'Conocidas, sin usar',
  columns: {
    name: 'Grasa',
    saponificationValue: 'IS',
    iodineValue: 'IY',
    formulas: 'Fórmulas',
    acid: 'Ácido',
    share: 'Usado',
    range: 'Intervalo publicado',
    value: 'Valor',
    what: 'Qué',
    source: 'Fuente',
    how: 'Cómo se sabe',
  },
  kinds: { glyceride: 'glicérido', 'free-acid': 'ácido graso libre', wax: 'éster de cera' },
  origins: { plant: 'vegetal', animal: 'animal' },
  palm: 'de la palma de aceite',
  allergens: (list) => `fuente de alérgenos: ${list.join(', ')}`,
  sections: {
    alkali: 'Álcali para 100 g',
    values: 'Valores usados',
    acids: 'Ácidos grasos',
    compositions: 'Ácidos grasos, fuente por fuente',
    records: 'Todos los valores publicados',
    notes: 'Notas',
  },
  notComputable:
    'No se conoce ningún índice de saponificación con intervalo para esta grasa. No se da álcali y ninguna fórmula puede usarla.',
  alkaliLead:
    'Para saponificar 100 g por completo, como hidróxido puro y sin sobreengrasado. Las pesadas de una fórmula están en su propia página; no componga un lote a partir de esta tabla.',
  alkaliColumns: {
    alkali: 'Álcali',
    value: 'Con el valor usado',
    range: 'En todo el intervalo',
  },
  wax: 'Una cera: en proceso en frío puede que apenas reaccione. En el sobreengrasado mínimo solo cuenta su ácido libre.',
  perHundred: (grams) => `${fixed(grams, 2)} g`,
  measures: {
    saponificationValue: 'Índice de saponificación',
    acidValue: 'Índice de acidez',
    iodineValue: 'Índice de yodo',
    relativeDensity: 'Densidad relativa',
    unsaponifiable: 'Materia insaponificable',
    composition: 'Ácidos grasos',
  },
  atMost: (value) => `como máximo ${plain(value)}`,
  atLeast: (value) => `como mínimo ${plain(value)}`,
  mean: (samples) => (samples ? `media de ${samples}` : 'media'),
  atTemperature: (celsius) => `a ${plain(celsius, 1)} °C`,
  usedHere: 'usado',
  lowersValue: 'reduce el valor usado',
  lot: (lot, measure, value, uncertainty, method) =>
    `Partida ${lot}, ${measure}: ${plain(value, 2)} ± ${plain(uncertainty, 2)} mg KOH/g, ${method}.`,
  lotDecides: 'Las fórmulas se calculan con ella.',
  lotShown: 'No consume álcali por su cuenta.',
  lotOfWax: 'Los extremos inferiores del margen la cuentan en proceso en frío.',
  compositionsLead:
    'Por ciento de todos los ácidos grasos. Las fuentes se mantienen separadas y siguen el orden de elección; se usa una entera, y ninguna se mezcla con otra.',
  recordsLead: (order) =>
    `En el orden de elección según la clase de la fuente: ${order.join(', ')}. Dentro de una clase, lo leído va antes que lo que se sabe de memoria.`,
  notListed: '–',
  computedFrom: 'Las proporciones usadas son los puntos medios del intervalo, llevados a 100 %.',
  asAfterCook: 'después de la cocción',
};
