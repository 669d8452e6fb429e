import type { lotsPage as english } from '../en/lots-page.ts';
import { plain } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

export const lotsPage: SameShape<typeof english> = {
  title: 'Partidas',
  lead: 'Lo que se midió en las grasas y los álcalis que hay en el taller. Una partida liberada decide las pesadas de las fórmulas que figuran junto a ella; la hoja la nombra, y el saco debe llevar el mismo número.',
  none: 'El taller no lleva partidas. Todas las pesadas se calculan con intervalos publicados y comerciales.',
  without:
    'Un material sin partida liberada se calcula con su intervalo publicado o comercial, que es más ancho: la página de cada fórmula muestra los dos.',
  sections: {
    released: 'Liberadas',
    quarantine: 'En cuarentena',
    rejected: 'Rechazadas',
  },
  notes: {
    released: 'Puede pesarse de ellas hasta la fecha de reanálisis.',
    quarantine: 'No pese de ellas. Las fórmulas se calculan como si no estuvieran.',
    rejected: 'Nunca pese de ellas.',
  },
  statuses: { released: 'liberada', quarantine: 'cuarentena', rejected: 'rechazada' },
  columns: {
    material: 'Material',
    lot: 'Partida',
    value: 'Medido, k = 2',
    opened: 'Abierta',
    retest: 'Reanalizar a más tardar',
    formulas: 'Fórmulas',
  },
  value: (name, value, uncertainty) =>
    `${name} ${plain(value, 2)} ± ${plain(uncertainty, 2)} mg KOH/g`,
  assay: (form, percent, uncertainty) =>
    `${form === 'solution' ? 'Solución' : 'Sólido'}, hidróxido ${plain(percent, 2)} ± ${plain(uncertainty, 2)} %`,
  carbonate: (percent) => `carbonato ${percent} %`,
  decides: 'decide las pesadas',
  freeAcid: 'solo se muestra: el índice de saponificación ya cuenta los ácidos libres',
  besideAcid: 'solo se muestra: en un ácido libre decide el índice de acidez',
  ofWax: 'cuenta en el extremo inferior del margen en proceso en frío',
  notOpened: 'sin abrir',
  retestPassed: 'la fecha ya pasó',
  noFormula: 'ninguna',
  link: 'Partidas en el taller',
  about: 'lo que se midió en cada partida, hasta cuándo vale y qué fórmulas se pesan de ella',
};
