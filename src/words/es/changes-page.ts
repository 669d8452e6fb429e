import { dateText } from '../dates.ts';
import type { changesPage as english } from '../en/changes-page.ts';
import { fixed } from '../numbers.ts';
import type { SameShape } from '../same-shape.ts';

/** Words of the page of what an edition has new. */
export const changesPage: SameShape<typeof english> = {
  title: 'Cambios',
  about: 'lo nuevo de esta edición; las revisiones de cada fórmula',
  since: (id, asOf) => `Respecto a la edición ${id} del ${dateText(asOf)}.`,
  first:
    'No se indicó ninguna edición anterior al generar esta, así que no hay con qué comparar. Las revisiones de cada fórmula están más abajo.',
  nothing: 'Nada ha cambiado desde entonces.',
  addedTitle: 'Nuevas',
  back: 'de nuevo en uso',
  changedTitle: 'Cambiadas',
  changedLead: 'Gramos para 1000 g de grasas, con las partidas vigentes en cada momento.',
  reweighedTitle: 'Se pesan de otro modo',
  reweighedLead:
    'La fórmula es la misma; las partidas, las balanzas o los tamaños de lote no. Las hojas impresas antes quedan sustituidas.',
  withdrawnTitle: 'Retiradas',
  withdrawn: (on, reason) => `el ${dateText(on)}: ${reason}`,
  goneTitle: 'Ya no están',
  historyTitle: 'Revisiones',
  columns: {
    what: 'Qué',
    before: 'Antes',
    after: 'Ahora',
    revision: 'Revisión',
    date: 'Fecha',
    note: 'Cambio',
  },
  revisions: (before, now) => (before === now ? `revisión ${now}` : `revisión ${before} a ${now}`),
  none: '–',
  share: (name) => `${name}, proporción`,
  parts: { water: 'Agua', heldBack: 'Agua reservada' },
  superfat: 'Sobreengrasado, según la fórmula',
  lowestExpanded: 'Sobreengrasado mínimo, intervalo expandido',
  lowestWorstCase: 'Sobreengrasado mínimo, peor caso',
  profile: {
    saturated: 'Ácidos saturados',
    monounsaturated: 'Ácidos con un doble enlace, también el ricinoleico',
    polyunsaturated: 'Ácidos poliinsaturados',
    saponificationValue: 'Índice de saponificación de las grasas',
    iodineValue: 'Índice de yodo de las grasas',
    oxidisability: 'Oxidabilidad, COX',
    meanChainLength: 'Longitud media de cadena',
  },
  units: {
    saturated: '%',
    monounsaturated: '%',
    polyunsaturated: '%',
    saponificationValue: 'mg KOH/g',
    iodineValue: 'g I₂/100 g',
    oxidisability: '',
    meanChainLength: 'carbonos',
  },
  percent: (value) => `${fixed(value, 2)} %`,
};
