import type { EDITION_PROBLEMS as english } from '../en/problems-edition.ts';
import type { SameShape } from '../same-shape.ts';

/** Every rule about approvals, editions and publishing, with its title. An id is permanent once published. */
export const EDITION_PROBLEMS: SameShape<typeof english> = {
  'edition/not-approved': { title: 'Una fórmula sin aprobación' },
  'edition/changed-since-approval': { title: 'Una fórmula que no es la que se aprobó' },
  'edition/review-date-passed': { title: 'Una aprobación cuya fecha de revisión ya pasó' },
  'edition/approved-later': {
    title: 'Una aprobación con fecha posterior al día para el que es la edición',
  },
  'edition/lot-outside-window': {
    title: 'Una partida liberada fuera del intervalo que se aprobó',
  },
  'edition/same-revision': { title: 'Una revisión publicada que ahora dice otra cosa' },
  'edition/revision-went-back': { title: 'Una revisión por debajo de una que se publicó' },
  'edition/formula-vanished': { title: 'Una fórmula publicada que ya no está' },
  'edition/back-without-approval': {
    title: 'Una fórmula de nuevo en uso con una aprobación de antes',
  },
  'edition/as-of-date': { title: 'Una fecha de referencia que no existe' },
  'edition/ledger-unreadable': { title: 'El registro de ediciones no se puede leer' },
  'edition/ledger-line': { title: 'Una línea del registro de ediciones que no se entiende' },
  'edition/not-an-edition': { title: 'Ninguna edición donde debería haber una' },
  'edition/edition-unreadable': { title: 'Un edition.json que no se entiende' },
  'edition/edition-of-another-shop': { title: 'La edición de otro taller' },
  'edition/unknown-code': { title: 'Un código que no tiene ninguna fórmula' },
  'edition/code-twice': { title: 'Un código que tienen dos archivos' },
  'edition/formula-with-errors': {
    title: 'Una fórmula que no se puede aprobar porque tiene errores',
  },
  'edition/formula-withdrawn': { title: 'Una fórmula retirada que se pide aprobar' },
  'edition/approver-name': { title: 'Una aprobación de nadie' },
  'edition/approval-date': { title: 'Una fecha de aprobación o de revisión que no puede ser' },
  'edition/file-changed': { title: 'Un archivo que cambió mientras se aprobaba' },
  'edition/approval-place': {
    title: 'Un frontmatter en el que no se puede escribir la aprobación',
  },
  'edition/in-use': { title: 'Una carpeta que otro comando está escribiendo' },
  'edition/cannot-write': { title: 'Algo que no se puede escribir' },
  'edition/checksums': { title: 'Una lista de sumas de comprobación que no se puede usar' },
  'edition/not-whole': { title: 'Una edición que no está como se construyó' },
  'edition/proof': { title: 'Una edición de prueba donde corresponde una aprobada' },
  'edition/target': { title: 'Un lugar donde no se puede publicar una edición' },
};
