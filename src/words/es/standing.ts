import type { standingWords as english } from '../en/standing.ts';
import type { SameShape } from '../same-shape.ts';

/** Why a printed leaf is not one to work from; shown in a frame where every leaf has its digest. */
export const standingWords: SameShape<typeof english> = {
  noDigest: 'Prueba, sin código de pesadas. No trabaje con esta hoja.',
  states: {
    'not-approved': 'Prueba: sin aprobar. No trabaje con ella.',
    'changed-since-approval': 'Prueba: cambiada desde su aprobación. No trabaje con ella.',
    'review-date-passed':
      'La fecha de su revisión ya pasó. No trabaje con ella hasta que se revise.',
  },
};
